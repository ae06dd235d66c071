// npm run stress [-- COUNT [SEED]]: mutated specs without a throw or a stall. The same count and seed give the same specs.
import * as fc from 'fast-check'
import { mutatedSpec } from './mutated-spec.ts'
import { withstand } from './withstand.ts'

const BATCH = 1_000
/** Longest that one spec may take, ms of processor time: others share the machine. */
const STALL = 1_000

const [count = 100_000, seed = 1] = process.argv.slice(2).map(Number)

interface Failure {
  readonly index: number
  readonly text: string
  readonly message: string
}
const failures: Failure[] = []
let slowest = { index: 0, milliseconds: 0 }
const took: number[] = []

for (let batch = 0; batch * BATCH < count; batch++) {
  const specs = fc.sample(mutatedSpec, { numRuns: Math.min(BATCH, count - batch * BATCH), seed: seed + batch })
  for (const [at, text] of specs.entries()) {
    const index = batch * BATCH + at
    const before = process.cpuUsage()
    try {
      withstand(text, index)
    } catch (error) {
      failures.push({ index, text, message: error instanceof Error ? error.message : String(error) })
    }
    const { user, system } = process.cpuUsage(before)
    const milliseconds = (user + system) / 1_000
    took.push(milliseconds)
    if (milliseconds > slowest.milliseconds) slowest = { index, milliseconds }
    if (milliseconds > STALL) failures.push({ index, text, message: `took ${milliseconds.toFixed(0)} ms` })
  }
  process.stderr.write(`${Math.min(count, (batch + 1) * BATCH)} specs, ${failures.length} failures\n`)
}

const sorted = took.toSorted((a, b) => a - b)
const part = (share: number): string => (sorted[Math.floor(share * (sorted.length - 1))] ?? 0).toFixed(1)
for (const { index, message, text } of failures.slice(0, 5))
  console.log(`\nSpec ${index}: ${message}\n${JSON.stringify(text)}`)
const byMessage = new Map<string, number[]>()
for (const { index, message } of failures) {
  const alike = message.replace(/\d+/gu, 'n')
  byMessage.set(alike, [...(byMessage.get(alike) ?? []), index])
}
for (const [message, own] of byMessage) console.log(`${own.length} × ${message}, first in spec ${own[0]}`)
console.log(
  `${took.length} specs, ${failures.length} failures; half within ${part(0.5)} ms, 99 % within ${part(0.99)} ms, slowest ${slowest.milliseconds.toFixed(0)} ms (spec ${slowest.index})`,
)
process.exit(failures.length > 0 ? 1 : 0)
