// Type check of every workspace package, two at a time.
import { spawn } from 'node:child_process'
import { existsSync, readdirSync } from 'node:fs'
import { root } from './setup.mjs'

const projects = ['packages', 'apps']
  .flatMap((group) => readdirSync(`${root}${group}`).map((name) => `${group}/${name}`))
  .concat('tests')
  .filter((project) => existsSync(`${root}${project}/tsconfig.json`))

const check = (project) =>
  new Promise((resolve) => {
    const tsc = spawn(process.execPath, ['node_modules/typescript/bin/tsc', '-p', project], {
      cwd: root,
      stdio: 'inherit',
    })
    tsc.on('exit', (code) => resolve(code === 0 ? null : project))
  })

const failed = []
const queue = [...projects]
await Promise.all(
  [0, 1].map(async () => {
    for (let project = queue.shift(); project; project = queue.shift()) {
      const problem = await check(project)
      if (problem) failed.push(problem)
    }
  }),
)
if (failed.length > 0) console.error(`Type errors in ${failed.join(', ')}`)
else console.error(`Type check of ${projects.length} packages passed`)
process.exit(failed.length > 0 ? 1 : 0)
