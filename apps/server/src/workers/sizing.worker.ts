import { parentPort } from 'node:worker_threads'
import { sizeSpec } from '@coldfill/sizing'
import type { SizingAnswer, SizingQuestion } from '../sizing-service.ts'

const port = parentPort
if (!port) throw new Error('This module runs in a worker thread.')

port.on('message', ({ id, text }: SizingQuestion) => {
  const answer: SizingAnswer = { id, json: JSON.stringify(sizeSpec(text)) }
  port.postMessage(answer)
})
port.postMessage('ready')
