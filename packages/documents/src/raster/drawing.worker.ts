import { parentPort, workerData } from 'node:worker_threads'
import type { DrawOrder } from './draw-pngs.ts'
import { pngRenderer } from './png-of-svg.ts'

const port = parentPort
if (!port) throw new Error('This module runs in a worker thread.')
const { svgs, width } = workerData as DrawOrder
const draw = await pngRenderer()
port.postMessage(svgs.map((svg) => draw(svg, width)))
