// A worker thread does not inherit the loader of the main thread, so it registers its own before it loads TypeScript.
import { workerData } from 'node:worker_threads'
import { register } from 'tsx/esm/api'

register()
await import(workerData.module)
