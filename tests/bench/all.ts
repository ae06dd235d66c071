// npm run bench: every part runs, also where an earlier one fails; the exit status says whether all held.
import { spawnSync } from 'node:child_process'
import { fileURLToPath } from 'node:url'

const root = fileURLToPath(new URL('../..', import.meta.url))

const parts: readonly (readonly [title: string, args: readonly string[]])[] = [
  ['Sizing', ['--expose-gc', '--import', 'tsx', 'tests/bench/main.ts']],
  ['Documents', ['--import', 'tsx', 'tests/bench/documents.ts']],
  ['The client, built', ['--input-type=module', '-e', "import('./.ci/build.mjs').then((m) => m.build())"]],
  ['The editor', ['--import', 'tsx', 'tests/bench/editor.ts']],
]

for (const [title, args] of parts) {
  console.log(`\n${title}`)
  const { status } = spawnSync(process.execPath, args, { cwd: root, stdio: 'inherit' })
  if (status !== 0) process.exitCode = 1
}
