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
export type DocumentProgress = { readonly stage: number } | { readonly files: readonly WrittenFile[] }

const LIMIT_MS = 120_000
const MEBIBYTES = 1_536

/**
 * Writes the schedule and the submittal in a thread of its own: a fresh one each time, since the same content must give the same bytes
 * and the document library counts its bookmarks through the life of a thread.
 */
export const writeDocuments = (
  order: DocumentOrder,
  onStage: (stage: number) => void,
  signal: AbortSignal,
): Promise<readonly WrittenFile[]> =>
  new Promise((resolve, reject) => {
    const worker = startWorker(new URL('../workers/documents.worker.ts', import.meta.url), {
      data: order,
      limits: { maxOldGenerationSizeMb: MEBIBYTES },
    })
    const stop = (act: () => void): void => {
      clearTimeout(timer)
      signal.removeEventListener('abort', abort)
      act()
      void worker.terminate()
    }
    const timer = setTimeout(
      () => stop(() => reject(new Error(`writing the files took longer than ${LIMIT_MS / 1000} s`))),
      LIMIT_MS,
    )
    const abort = (): void => stop(() => reject(new Error('the server is closing')))
    signal.addEventListener('abort', abort)
    worker.on('message', (progress: DocumentProgress) => {
      if ('files' in progress) stop(() => resolve(progress.files))
      else onStage(progress.stage)
    })
    worker.on('error', (error: Error) => stop(() => reject(error)))
    worker.on('exit', () => stop(() => reject(new Error('the thread that writes the files ended early'))))
  })
