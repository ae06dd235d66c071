import { createHash } from 'node:crypto'
import type { Worker } from 'node:worker_threads'
import { SPEC_LIMIT } from '@coldfill/contract'
import type { ProjectResult } from '@coldfill/sizing'
import { AppError } from './errors.ts'
import { startWorker } from './workers/start-worker.ts'

export interface SizingQuestion {
  readonly id: number
  readonly text: string
  /** Rows as JSON text; left out where the thread had those of this hash with the question before. */
  readonly catalogue: { readonly hash: string; readonly rowsJson?: string } | null
}
export interface SizingAnswer {
  readonly id: number
  /** ProjectResult as JSON text: what is frozen and hashed with a revision. */
  readonly json: string
}

/** A result with the JSON text it was read from. */
export interface Sized {
  readonly result: ProjectResult
  readonly json: string
}

/** The catalogue that vessels are chosen from. */
export interface SizingCatalogue {
  /** SHA-256 of the rows: the same hash is the same rows. */
  readonly hash: string
  /** CatalogueRow[] as JSON text. */
  readonly rowsJson: () => Promise<string>
}

export interface SizingService {
  /** Without a catalogue no vessel is chosen. @throws {AppError} 413 above SPEC_LIMIT bytes, 422 where the text takes longer than the limit. */
  size(text: string, catalogue?: SizingCatalogue | null): Promise<Sized>
  close(): Promise<void>
}

const MEBIBYTES = 512
const KEPT_RESULTS = 64
const KEPT_CATALOGUES = 4

const tooLong = (limit: number): AppError =>
  new AppError(
    422,
    'sizing_too_long',
    'The spec takes too long to size',
    `Sizing was stopped after ${limit / 1000} s. Nothing was lost. Make the spec smaller, or split it in two projects.`,
  )

const failed = (): AppError =>
  new AppError(
    422,
    'sizing_failed',
    'The spec could not be sized',
    'Sizing stopped. Nothing was lost, the text is as you typed it.',
  )

/** Marks an entry as just used and lets the longest unused ones go. */
const keep = <T>(kept: Map<string, T>, key: string, value: T, most: number): void => {
  kept.delete(key)
  kept.set(key, value)
  for (const oldest of kept.keys()) {
    if (kept.size <= most) break
    kept.delete(oldest)
  }
}

interface Waiting {
  readonly text: string
  readonly catalogue: { readonly hash: string; readonly rowsJson: string } | null
  readonly resolve: (json: string) => void
  readonly reject: (error: Error) => void
}

/**
 * Sizes texts one after the other in a thread of its own. A text that takes longer than `limit` milliseconds ends that thread and
 * nothing else: requests go on, and the next text gets a new thread.
 */
export const createSizingService = ({
  limit = 2_000,
  module = new URL('./workers/sizing.worker.ts', import.meta.url),
}: { limit?: number; module?: URL } = {}): SizingService => {
  const kept = new Map<string, Sized>()
  const catalogues = new Map<string, string>()
  const queue: Waiting[] = []
  let worker: Worker | null = null
  let ready = false
  let current: { id: number; waiting: Waiting; timer: NodeJS.Timeout } | null = null
  let lastId = 0
  /** Hash of the catalogue that the thread holds. */
  let held: string | null = null
  let closed = false

  const settle = (act: (waiting: Waiting) => void): void => {
    if (!current) return
    const { waiting, timer } = current
    clearTimeout(timer)
    current = null
    act(waiting)
  }

  const drop = (error: AppError): void => {
    const old = worker
    worker = null
    ready = false
    held = null
    old?.removeAllListeners()
    // A late error of the thread being ended must not end the process.
    old?.on('error', () => undefined)
    void old?.terminate()
    settle((waiting) => waiting.reject(error))
    next()
  }

  const start = (): void => {
    ready = false
    const started = startWorker(module, { limits: { maxOldGenerationSizeMb: MEBIBYTES } })
    worker = started
    started.unref()
    started.on('message', (message: SizingAnswer | 'ready') => {
      if (message === 'ready') ready = true
      else if (message.id === current?.id) settle((waiting) => waiting.resolve(message.json))
      next()
    })
    started.on('error', (error: Error) => {
      // A thread that cannot even start would be started for ever: what waits is answered first.
      if (!ready) for (const waiting of queue.splice(0)) waiting.reject(error)
      drop(failed())
    })
  }

  const next = (): void => {
    if (closed || current || queue.length === 0) return
    if (!worker) start()
    if (!ready || !worker) return
    const waiting = queue.shift()
    if (!waiting) return
    const id = ++lastId
    current = { id, waiting, timer: setTimeout(() => drop(tooLong(limit)), limit) }
    const { text, catalogue } = waiting
    const known = catalogue !== null && catalogue.hash === held
    if (catalogue) held = catalogue.hash
    worker.postMessage({
      id,
      text,
      catalogue: catalogue && known ? { hash: catalogue.hash } : catalogue,
    } satisfies SizingQuestion)
  }

  return {
    size: async (text, catalogue = null) => {
      if (Buffer.byteLength(text) > SPEC_LIMIT)
        throw new AppError(413, 'spec_too_large', 'The spec is too large', `A spec may have ${SPEC_LIMIT / 1024} kB.`)
      const hash = catalogue?.hash ?? ''
      const key = createHash('sha256')
        .update(JSON.stringify([hash, text]))
        .digest('hex')
      const known = kept.get(key)
      if (known) {
        keep(kept, key, known, KEPT_RESULTS)
        return known
      }
      const rowsJson = catalogue && (catalogues.get(hash) ?? (await catalogue.rowsJson()))
      if (rowsJson !== null) keep(catalogues, hash, rowsJson, KEPT_CATALOGUES)
      const json = await new Promise<string>((resolve, reject) => {
        queue.push({ text, catalogue: rowsJson === null ? null : { hash, rowsJson }, resolve, reject })
        next()
      })
      const sized: Sized = { json, result: JSON.parse(json) as ProjectResult }
      keep(kept, key, sized, KEPT_RESULTS)
      return sized
    },
    close: async () => {
      closed = true
      const error = failed()
      for (const waiting of queue.splice(0)) waiting.reject(error)
      settle((waiting) => waiting.reject(error))
      await worker?.terminate()
    },
  }
}
