// npm test: set-up, type check, lint, then every test. The last line counts what the runner counted.
import { spawnSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { build } from './build.mjs'
import { root, run, setup } from './setup.mjs'

setup()
build()

const bin = (name) => `${root}node_modules/.bin/${name}`
const stages = [
  ['type check', process.execPath, ['.ci/typecheck.mjs']],
  ['lint', bin('oxlint'), ['--type-aware', '--quiet', 'apps', 'packages', 'tests']],
  ['format', bin('prettier'), ['--check', '--log-level', 'warn', 'apps', 'packages', 'tests', '.ci']],
]
const broken = stages.filter(([name, command, args]) => {
  console.error(`\n== ${name}`)
  return run(command, args) !== 0
})

console.error('\n== tests')
const folder = mkdtempSync(join(tmpdir(), 'coldfill-test-'))
const report = join(folder, 'report.json')
const status = run(process.execPath, [
  'node_modules/vitest/vitest.mjs',
  'run',
  '--config',
  'tests/vitest.config.ts',
  '--reporter=default',
  '--reporter=json',
  `--outputFile.json=${report}`,
  ...process.argv.slice(2),
])
const counts = (() => {
  try {
    const {
      numPassedTests: passed,
      numFailedTests: failed,
      numPendingTests: skipped,
    } = JSON.parse(readFileSync(report, 'utf8'))
    return { passed, failed, skipped }
  } catch {
    return { passed: 0, failed: 1, skipped: 0 }
  }
})()
rmSync(folder, { recursive: true, force: true })

const office = spawnSync('soffice', ['--version'], { stdio: 'ignore' })
if (office.error || office.status !== 0)
  console.error(
    '\nLeft out for want of LibreOffice (soffice): the forced recalculation of workbooks and the rendering of documents.',
  )
for (const [name] of broken) console.error(`\nThe ${name} failed.`)

const failed = counts.failed + broken.length + (status !== 0 && counts.failed === 0 ? 1 : 0)
console.log(`\n${counts.passed} passed, ${failed} failed${counts.skipped > 0 ? `, ${counts.skipped} skipped` : ''}`)
process.exit(failed > 0 ? 1 : 0)
