import { parentPort } from 'node:worker_threads'
import type { SizingQuestion } from '../sizing-service.ts'

parentPort?.on('message', ({ id, text }: SizingQuestion) => {
  if (text === 'die') throw new Error('as asked')
  if (text === 'hang')
    for (;;) {
      // Never answers.
    }
  parentPort?.postMessage({ id, json: JSON.stringify(text) })
})
parentPort?.postMessage('ready')
