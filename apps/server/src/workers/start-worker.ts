import { type ResourceLimits, Worker } from 'node:worker_threads'

const starter = new URL('./start.mjs', import.meta.url)

/** Starts a TypeScript module of this folder in a thread of its own. `data` is its `workerData.data`. */
export const startWorker = (module: URL, options: { data?: unknown; limits?: ResourceLimits } = {}): Worker =>
  new Worker(starter, {
    workerData: { module: module.href, data: options.data },
    execArgv: [],
    ...(options.limits ? { resourceLimits: options.limits } : {}),
  })
