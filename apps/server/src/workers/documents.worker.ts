import { parentPort } from 'node:worker_threads'
import { fileName, printSubmittal, writeReviewCopy, writeSchedule, writeSubmittal } from '@coldfill/documents'
import { verificationRows } from '@coldfill/engine'
import { engineVersion } from '@coldfill/sizing'
import { describeError } from '../describe-error.ts'
import type { DocumentOrder, FromWriter, ToWriter, Written, WrittenFile } from '../documents/write-documents.ts'

const port = parentPort
if (!port) throw new Error('This module runs in a worker thread.')
const tell = (progress: FromWriter): void => port.postMessage(progress)

/** The print that is waited for. One file is printed at a time. */
let waiting: { resolve(pdf: Uint8Array): void; reject(error: Error): void } | null = null

const print = (docx: Uint8Array): Promise<Uint8Array> =>
  new Promise((resolve, reject) => {
    waiting = { resolve, reject }
    tell({ print: docx })
  })

const write = async (order: DocumentOrder, noPrinter: string | null): Promise<Written> => {
  const { result } = order
  const options = order.withVerification
    ? { ...order.options, verification: verificationRows(), verifiedWith: engineVersion }
    : order.options
  const file = (kind: WrittenFile['kind'], content: Uint8Array): WrittenFile => ({
    kind,
    name: fileName(result, options.titleBlock.revision, kind),
    content,
  })
  if (order.write === 'review copy')
    return { files: [file('review-copy', await writeReviewCopy(result, options))], noPages: null, noPdf: null }
  tell({ stage: 1 })
  const schedule = file('schedule', await writeSchedule(result, options))
  tell({ stage: 2 })
  if (noPrinter !== null) {
    const submittal = file('submittal', await writeSubmittal(result, options))
    return { files: [schedule, submittal], noPages: noPrinter, noPdf: noPrinter }
  }
  const { docx, pdf, noPages, noPdf } = await printSubmittal(result, options, print, (stage) =>
    tell({ stage: stage === 'pages' ? 3 : 4 }),
  )
  return { files: [schedule, file('submittal', docx), ...(pdf ? [file('pdf', pdf)] : [])], noPages, noPdf }
}

port.on('message', (message: ToWriter) => {
  if ('order' in message)
    write(message.order, message.noPrinter).then(
      (written) => tell({ written }),
      (error: unknown) => tell({ problem: describeError(error) }),
    )
  else if ('pdf' in message) waiting?.resolve(message.pdf)
  else waiting?.reject(new Error(message.noPdf))
})
