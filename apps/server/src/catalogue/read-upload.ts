import type { CatalogueReading } from '@coldfill/sizing'
import { AppError } from '../errors.ts'
import { startWorker } from '../workers/start-worker.ts'

const START_LIMIT_MS = 60_000
const READ_LIMIT_MS = 15_000
const MEBIBYTES = 512

const unreadable = (): AppError =>
  new AppError(
    422,
    'catalogue_unreadable',
    'The catalogue cannot be read',
    'Reading it was stopped: it takes too long or needs too much memory. Nothing was stored. Save it as CSV, or with fewer rows.',
  )

/** Reads the bytes of a catalogue in a thread of its own, which a hostile workbook can end without harm. @throws {AppError} 422 */
export const readUpload = (bytes: Uint8Array): Promise<CatalogueReading> =>
  new Promise((resolve, reject) => {
    const worker = startWorker(new URL('../workers/catalogue.worker.ts', import.meta.url), {
      data: bytes,
      limits: { maxOldGenerationSizeMb: MEBIBYTES },
    })
    const stop = (act: () => void): void => {
      clearTimeout(timer)
      worker.removeAllListeners()
      // A late error of the thread being ended must not end the process.
      worker.on('error', () => undefined)
      act()
      void worker.terminate()
    }
    const fail = (): void => stop(() => reject(unreadable()))
    let timer = setTimeout(fail, START_LIMIT_MS)
    worker.on('message', (message: CatalogueReading | 'ready') => {
      if (message !== 'ready') {
        stop(() => resolve(message))
        return
      }
      clearTimeout(timer)
      timer = setTimeout(fail, READ_LIMIT_MS)
    })
    worker.on('error', fail)
    worker.on('exit', fail)
  })
