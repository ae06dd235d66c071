// Builds the client unless what it is made of has not changed since the last build.
import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { root, run } from './setup.mjs'

const parts = [
  'apps/web/src',
  'apps/web/index.html',
  'apps/web/vite.config.ts',
  'apps/web/public',
  'packages/units/src',
  'packages/formula/src',
  'packages/spec/src',
  'packages/contract/src',
  'packages/presentation/src',
  'pnpm-lock.yaml',
]

const filesOf = (path) => {
  if (!existsSync(path)) return []
  try {
    return readdirSync(path, { withFileTypes: true, recursive: true })
      .filter((entry) => entry.isFile())
      .map((entry) => join(entry.parentPath ?? entry.path, entry.name))
      .sort()
  } catch {
    return [path]
  }
}

export const build = () => {
  const hash = createHash('sha256')
  for (const part of parts) for (const file of filesOf(`${root}${part}`)) hash.update(file).update(readFileSync(file))
  const wanted = hash.digest('hex')
  const stamp = `${root}apps/web/dist/.built-from`
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return
  console.error('Building the client …')
  const status = run(process.execPath, ['node_modules/vite/bin/vite.js', 'build', '--logLevel', 'warn'], {
    cwd: `${root}apps/web`,
  })
  if (status !== 0) process.exit(status)
  writeFileSync(stamp, wanted)
}
