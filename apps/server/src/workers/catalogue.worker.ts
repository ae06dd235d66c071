import { parentPort, workerData } from 'node:worker_threads'
import { readCatalogueFile } from '@coldfill/documents/catalogue'

const port = parentPort
if (!port) throw new Error('This module runs in a worker thread.')

port.postMessage(await readCatalogueFile((workerData as { data: Uint8Array }).data))
