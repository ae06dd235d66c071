import { createHash } from 'node:crypto'
import type { Worker } from 'node:worker_threads'
import { SPEC_LIMIT } from '@coldfill/contract'
import type { ProjectResult } from '@coldfill/sizing'
import { AppError } from './errors.ts'
import { startWorker } from './workers/start-worker.ts'

export interface SizingQuestion {
  readonly id: number
  readonly text: string
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

export interface SizingService {
  /** @throws {AppError} 413 above SPEC_LIMIT bytes, 422 where the text takes longer than the limit. */
  size(text: string): Promise<Sized>
  close(): Promise<void>
}

const MEBIBYTES = 512
const KEPT_RESULTS = 64

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

interface Waiting {
  readonly text: string
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
  const queue: Waiting[] = []
  let worker: Worker | null = null
  let ready = false
  let current: { id: number; waiting: Waiting; timer: NodeJS.Timeout } | null = null
  let lastId = 0
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
    worker.postMessage({ id, text: waiting.text } satisfies SizingQuestion)
  }

  return {
    size: async (text) => {
      if (Buffer.byteLength(text) > SPEC_LIMIT)
        throw new AppError(413, 'spec_too_large', 'The spec is too large', `A spec may have ${SPEC_LIMIT / 1024} kB.`)
      const key = createHash('sha256').update(text).digest('hex')
      const known = kept.get(key)
      if (known) {
        kept.delete(key)
        kept.set(key, known)
        return known
      }
      const json = await new Promise<string>((resolve, reject) => {
        queue.push({ text, resolve, reject })
        next()
      })
      const sized: Sized = { json, result: JSON.parse(json) as ProjectResult }
      kept.set(key, sized)
      for (const oldest of kept.keys()) {
        if (kept.size <= KEPT_RESULTS) break
        kept.delete(oldest)
      }
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
