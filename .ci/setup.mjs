// Installs the pinned dependencies unless they are there already. Run alone, or by start, dev and test.
import { spawnSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'

export const root = fileURLToPath(new URL('..', import.meta.url))
const stampFile = `${root}node_modules/.coldfill-setup`

const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
if (major < 20 || (major === 20 && minor < 19)) {
  console.error(`Coldfill needs Node 20.19 or newer; this is ${process.versions.node}.`)
  process.exit(1)
}

const read = (name) => readFileSync(`${root}${name}`, 'utf8')
const wanted = createHash('sha256')
  .update([process.version, read('pnpm-lock.yaml'), read('pnpm-workspace.yaml'), read('package.json')].join('\0'))
  .digest('hex')

export const run = (command, args, options = {}) => {
  const done = spawnSync(command, args, { cwd: root, stdio: 'inherit', ...options })
  if (done.error) throw done.error
  return done.status ?? 1
}

export const setup = () => {
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === wanted) return
  const { packageManager } = JSON.parse(read('package.json'))
  console.error('Installing the pinned dependencies …')
  const status = run(
    process.platform === 'win32' ? 'npx.cmd' : 'npx',
    ['--yes', packageManager, 'install', '--frozen-lockfile', '--reporter=append-only'],
    // Standard output belongs to whatever runs next; CI=true keeps the installer from asking.
    { env: { ...process.env, CI: 'true' }, stdio: ['ignore', 2, 2] },
  )
  if (status !== 0) process.exit(status)
  writeFileSync(stampFile, wanted)
}

if (process.argv[1] && fileURLToPath(import.meta.url) === process.argv[1]) setup()
