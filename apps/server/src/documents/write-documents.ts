import type { Worker } from 'node:worker_threads'
import type { DocumentOptions } from '@coldfill/documents'
import type { ProjectResult } from '@coldfill/sizing'
import { describeError } from '../describe-error.ts'
import { startWorker } from '../workers/start-worker.ts'
import type { Printer } from './printer.ts'

export interface DocumentOrder {
  /** Schedule, submittal and its print; or the review copy alone. */
  readonly write: 'files' | 'review copy'
  readonly result: ProjectResult
  readonly options: DocumentOptions
  /** Has the thread run the verification manual and put it in. */
  readonly withVerification: boolean
}

export interface WrittenFile {
  readonly kind: 'schedule' | 'submittal' | 'pdf' | 'review-copy'
  readonly name: string
  readonly content: Uint8Array
}

export interface Written {
  readonly files: readonly WrittenFile[]
  /** Why the contents list of the submittal has no page numbers; null where it has them. */
  readonly noPages: string | null
  /** Why there is no PDF; null where there is one. */
  readonly noPdf: string | null
}

/** What the thread is given: the order, and the answers to what it asks to be laid out. */
export type ToWriter =
  | { readonly order: DocumentOrder; readonly noPrinter: string | null }
  | { readonly pdf: Uint8Array }
  | { readonly noPdf: string }

/** `stage` is a place in MAKING_STAGES; `print` a file that the thread waits to have printed. */
export type FromWriter =
  | { readonly stage: number }
  | { readonly print: Uint8Array }
  | { readonly written: Written }
  | { readonly problem: string }

/** Of the thread's own work; a print has its own limit and does not count. */
const LIMIT_MS = 120_000
const MEBIBYTES = 1_536

/** A thread that has loaded the document libraries and waits for the next order; loading takes longer than writing. */
let idle: Worker | null = null

const startWriter = (): Worker => {
  const worker = startWorker(new URL('../workers/documents.worker.ts', import.meta.url), {
    limits: { maxOldGenerationSizeMb: MEBIBYTES },
  })
  // A thread that fails or dies while it waits must not end the process, and is not handed out again.
  worker.on('error', () => undefined)
  worker.on('exit', () => {
    if (idle === worker) idle = null
  })
  return worker
}

/**
 * Writes documents in a thread of its own, so that the server goes on answering. The thread stays for the next order; one that
 * failed, took too long or was stopped is ended, and the next order gets a new one. The same content gives the same bytes whatever the
 * thread has written before. Printing is done from here and not from the thread, which could be ended without ending LibreOffice.
 */
export const writeDocuments = async (
  order: DocumentOrder,
  printer: Printer,
  onStage: (stage: number) => void,
  signal: AbortSignal,
): Promise<Written> => {
  const noPrinter = await printer.missing()
  signal.throwIfAborted()
  return new Promise((resolve, reject) => {
    const worker = idle ?? startWriter()
    idle = null
    // A thread that works keeps the process; one that waits does not.
    worker.ref()
    const printing = new AbortController()
    let timer: NodeJS.Timeout | undefined
    const stop = (act: () => void, keep: boolean): void => {
      clearTimeout(timer)
      signal.removeEventListener('abort', abort)
      worker.off('message', progressed)
      worker.off('error', fail)
      worker.off('exit', ended)
      if (keep && !idle) {
        idle = worker
        worker.unref()
      } else void worker.terminate()
      printing.abort(new Error('the files are not wanted any more'))
      act()
    }
    const fail = (error: Error): void => stop(() => reject(error), false)
    const startClock = (): void => {
      clearTimeout(timer)
      timer = setTimeout(() => fail(new Error(`writing the files took longer than ${LIMIT_MS / 1000} s`)), LIMIT_MS)
    }
    const send = (message: ToWriter): void => {
      startClock()
      worker.postMessage(message)
    }
    const abort = (): void => fail(new Error('the server is closing'))
    signal.addEventListener('abort', abort)
    const print = (docx: Uint8Array): void => {
      clearTimeout(timer)
      printer.print(docx, printing.signal).then(
        (pdf) => send({ pdf }),
        (error: unknown) => {
          if (!printing.signal.aborted) send({ noPdf: error instanceof Error ? error.message : describeError(error) })
        },
      )
    }
    const progressed = (progress: FromWriter): void => {
      if ('written' in progress) stop(() => resolve(progress.written), true)
      else if ('problem' in progress) fail(new Error(progress.problem))
      else if ('print' in progress) print(progress.print)
      else onStage(progress.stage)
    }
    const ended = (): void => fail(new Error('the thread that writes the files ended early'))
    worker.on('message', progressed)
    worker.on('error', fail)
    worker.on('exit', ended)
    send({ order, noPrinter })
  })
}
