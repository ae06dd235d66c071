import { parentPort } from 'node:worker_threads'
import { type SizingOptions, sizeSpec } from '@coldfill/sizing'
import type { SizingAnswer, SizingQuestion } from '../sizing-service.ts'

const port = parentPort
if (!port) throw new Error('This module runs in a worker thread.')

/** The catalogue of the last question that brought one: most questions in a row are of the same office. */
let kept: { hash: string; catalogue: NonNullable<SizingOptions['catalogue']> } | null = null

const optionsOf = ({ catalogue }: SizingQuestion): SizingOptions => {
  if (catalogue === null) return {}
  if (catalogue.rowsJson !== undefined)
    kept = {
      hash: catalogue.hash,
      catalogue: JSON.parse(catalogue.rowsJson) as NonNullable<SizingOptions['catalogue']>,
    }
  if (kept?.hash !== catalogue.hash) throw new Error('The rows of the catalogue were not sent.')
  return { catalogue: kept.catalogue }
}

port.on('message', (question: SizingQuestion) => {
  const result = sizeSpec(question.text, optionsOf(question))
  port.postMessage({ id: question.id, json: JSON.stringify(result) } satisfies SizingAnswer)
})
// The first sizing loads tables and compiles formulas; no text of a person pays for that out of its time limit.
sizeSpec('')
port.postMessage('ready')
