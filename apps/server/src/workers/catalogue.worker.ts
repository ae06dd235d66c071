import { parentPort, workerData } from 'node:worker_threads'
import { readCatalogueFile } from '@coldfill/documents/catalogue'

const port = parentPort
if (!port) throw new Error('This module runs in a worker thread.')

// Loading this module is not the fault of the file: its time runs from here.
port.postMessage('ready')
port.postMessage(await readCatalogueFile((workerData as { data: Uint8Array }).data))
