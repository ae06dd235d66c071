import type { Worker } from 'node:worker_threads'
import type { DocumentOptions } from '@coldfill/documents'
import type { ProjectResult } from '@coldfill/sizing'
import { startWorker } from '../workers/start-worker.ts'

export interface DocumentOrder {
  readonly result: ProjectResult
  readonly options: DocumentOptions
}

export interface WrittenFile {
  readonly kind: 'schedule' | 'submittal'
  readonly name: string
  readonly content: Uint8Array
}

/** `stage` is a place in MAKING_STAGES. */
export type DocumentProgress =
  { readonly stage: number } | { readonly files: readonly WrittenFile[] } | { readonly problem: string }

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
 * Writes the schedule and the submittal in a thread of its own, so that the server goes on answering. The thread stays for the next
 * order; one that failed, took too long or was stopped is ended, and the next order gets a new one. The same content gives the same
 * bytes whatever the thread has written before.
 */
export const writeDocuments = (
  order: DocumentOrder,
  onStage: (stage: number) => void,
  signal: AbortSignal,
): Promise<readonly WrittenFile[]> =>
  new Promise((resolve, reject) => {
    const worker = idle ?? startWriter()
    idle = null
    // A thread that works keeps the process; one that waits does not.
    worker.ref()
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
      act()
    }
    const fail = (error: Error): void => stop(() => reject(error), false)
    const timer = setTimeout(() => fail(new Error(`writing the files took longer than ${LIMIT_MS / 1000} s`)), LIMIT_MS)
    const abort = (): void => fail(new Error('the server is closing'))
    signal.addEventListener('abort', abort)
    const progressed = (progress: DocumentProgress): void => {
      if ('files' in progress) stop(() => resolve(progress.files), true)
      else if ('problem' in progress) fail(new Error(progress.problem))
      else onStage(progress.stage)
    }
    const ended = (): void => fail(new Error('the thread that writes the files ended early'))
    worker.on('message', progressed)
    worker.on('error', fail)
    worker.on('exit', ended)
    worker.postMessage(order)
  })
