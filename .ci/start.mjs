// npm start: dependencies, client, then the one server that serves the client and the API.
import { spawn } from 'node:child_process'
import { build } from './build.mjs'
import { root, setup } from './setup.mjs'

setup()
build()
const server = spawn(process.execPath, ['--import', 'tsx', 'apps/server/src/main.ts'], { cwd: root, stdio: 'inherit' })
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => server.kill(signal))
server.on('exit', (code, signal) => process.exit(code ?? (signal ? 1 : 0)))
