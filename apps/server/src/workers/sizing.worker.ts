import { parentPort } from 'node:worker_threads'
import { sizeSpec } from '@coldfill/sizing'
import type { SizingAnswer, SizingQuestion } from '../sizing-service.ts'

const port = parentPort
if (!port) throw new Error('This module runs in a worker thread.')

port.on('message', ({ id, text }: SizingQuestion) => {
  const answer: SizingAnswer = { id, json: JSON.stringify(sizeSpec(text)) }
  port.postMessage(answer)
})
// The first sizing loads tables and compiles formulas; no text of a person pays for that out of its time limit.
sizeSpec('')
port.postMessage('ready')
