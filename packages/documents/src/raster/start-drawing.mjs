// A worker thread does not inherit the loader of the main thread, so it registers its own before it loads TypeScript.
import { register } from 'tsx/esm/api'

register()
await import('./drawing.worker.ts')
