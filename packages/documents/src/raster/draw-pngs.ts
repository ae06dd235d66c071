import { Worker } from 'node:worker_threads'
import { pngRenderer } from './png-of-svg.ts'

export interface DrawOrder {
  readonly svgs: readonly string[]
  /** Pixels across. */
  readonly width: number
}

/** More than these are drawn in a thread of their own, which takes as long to start as some forty take to draw. */
const FEW = 40

const starter = new URL('./start-drawing.mjs', import.meta.url)

const drawElsewhere = (order: DrawOrder): Promise<readonly Uint8Array[]> =>
  new Promise((resolve, reject) => {
    const worker = new Worker(starter, { workerData: order, execArgv: [] })
    worker.on('message', resolve)
    worker.on('error', reject)
    worker.on('exit', (code) => reject(new Error(`the thread that draws ended with ${code}`)))
  })

/** Draws SVGs as PNGs, in their order. The bytes are the same wherever they are drawn. */
export const drawPngs = async (order: DrawOrder): Promise<readonly Uint8Array[]> => {
  if (order.svgs.length > FEW) return drawElsewhere(order)
  const draw = await pngRenderer()
  return order.svgs.map((svg) => draw(svg, order.width))
}
