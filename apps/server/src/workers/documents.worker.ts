import { parentPort } from 'node:worker_threads'
import { fileName, writeSchedule, writeSubmittal } from '@coldfill/documents'
import { describeError } from '../describe-error.ts'
import type { DocumentOrder, DocumentProgress, WrittenFile } from '../documents/write-documents.ts'

const port = parentPort
if (!port) throw new Error('This module runs in a worker thread.')
const tell = (progress: DocumentProgress): void => port.postMessage(progress)

const write = async ({ result, options }: DocumentOrder): Promise<void> => {
  const file = (kind: WrittenFile['kind'], content: Uint8Array): WrittenFile => ({
    kind,
    name: fileName(result, options.titleBlock.revision, kind),
    content,
  })
  tell({ stage: 1 })
  const schedule = file('schedule', await writeSchedule(result, options))
  tell({ stage: 2 })
  const submittal = file('submittal', await writeSubmittal(result, options))
  tell({ files: [schedule, submittal] })
}

port.on('message', (order: DocumentOrder) => {
  write(order).catch((error: unknown) => tell({ problem: describeError(error) }))
})
