import { parentPort } from 'node:worker_threads'
import type { SizingQuestion } from '../sizing-service.ts'

parentPort?.on('message', ({ id, text, catalogue }: SizingQuestion) => {
  if (text === 'die') throw new Error('as asked')
  if (text === 'hang')
    for (;;) {
      // Never answers.
    }
  parentPort?.postMessage({
    id,
    json: JSON.stringify(catalogue ? { text, rowsSent: catalogue.rowsJson !== undefined } : text),
  })
})
parentPort?.postMessage('ready')
