// npm run dev: the server restarts and the client reloads when a file is saved.
import { spawn } from 'node:child_process'
import { root } from './setup.mjs'

const port = process.env.PORT ?? '4173'
const children = [
  spawn(process.execPath, ['--watch', '--import', 'tsx', 'apps/server/src/main.ts'], {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, PORT: port },
  }),
  spawn(process.execPath, ['node_modules/vite/bin/vite.js'], {
    cwd: `${root}apps/web`,
    stdio: 'inherit',
    env: { ...process.env, PORT: port },
  }),
]
const stop = (signal) => {
  for (const child of children) child.kill(signal)
}
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => stop(signal))
for (const child of children) child.on('exit', (code) => (stop('SIGTERM'), process.exit(code ?? 0)))
