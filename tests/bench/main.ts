// npm run bench: ratios measured in one run. Each figure is the best of several rounds, so that a busy machine hurts less, and
// each figure begins with a collected heap, so that none pays for the garbage of another.
import { performance } from 'node:perf_hooks'
import { readSpec } from '@coldfill/spec'
import { sizeProject, vocabulary } from '@coldfill/sizing'
import { type StraightJob, straightTank } from './straight-arithmetic.ts'

/** There with --expose-gc, as `npm run bench` starts it. */
const collect = (globalThis as { gc?: () => void }).gc

const timeOf = (run: () => void): number => {
  const start = performance.now()
  run()
  return performance.now() - start
}

const best = (rounds: number, run: () => void): number => {
  let least = Infinity
  collect?.()
  for (let n = 0; n < rounds; n += 1) least = Math.min(least, timeOf(run))
  return least
}

const jobs = (count: number): readonly StraightJob[] =>
  Array.from({ length: count }, (_, n) => ({
    volume: 0.5 + (n % 97) * 0.05,
    low: 278.15 + (n % 7),
    high: 345.15 + (n % 11),
    height: 6 + (n % 13),
    relief: (2.6 + (n % 5) * 0.4) * 1e5,
    elevationFeet: 3000,
  }))

const modelOf = (count: number) => {
  const [base] = [
    readSpec(
      `coldfill: 1
project: { number: B, elevation: 3000 ft }
systems:
  S:
    service: heating water
    temperatures: { low: 5 °C, high: 72 °C }
    pressure: { static-height: 6 m, relief-valve: 3 bar, relief-height: 0 m, vessel-connection: pump suction }
    contents:
      - volume: 1000 L
    vessels:
      ET: { kind: expansion tank, construction: bladder, method: ashrae, material: steel }
`,
      vocabulary,
    ).model,
  ]
  const system = base?.systems[0]
  const vessel = system?.vessels[0]
  if (!base || !system || !vessel) throw new Error('the benchmark spec does not read')
  const systems = jobs(count).map((job, n) => {
    const move = <T extends { readonly value: { readonly value: number } }>(
      located: T | undefined,
      value: number,
    ): T => {
      if (!located) throw new Error('not in the benchmark spec')
      return { ...located, value: { ...located.value, value } }
    }
    const [line] = system.contents
    if (line?.holds !== 'volume') throw new Error('not in the benchmark spec')
    return {
      ...system,
      id: `S${n}`,
      temperatures: {
        ...system.temperatures,
        low: move(system.temperatures.low, job.low),
        high: move(system.temperatures.high, job.high),
      },
      pressure: {
        ...system.pressure,
        'static-height': move(system.pressure['static-height'], job.height),
        'relief-valve': move(system.pressure['relief-valve'], job.relief),
      },
      contents: [{ ...line, volume: move(line.volume, job.volume) }],
      vessels: [{ ...vessel, mark: `ET-${n}` }],
    }
  })
  return { ...base, systems }
}

const thousand = modelOf(1000)
const tenThousand = modelOf(10_000)
const straightJobs = jobs(1000)

const sized = sizeProject(thousand)
const worst = Math.max(
  ...sized.vessels.map((vessel, n) => {
    const job = straightJobs[n]
    return job ? Math.abs((vessel.results['required-volume']?.value ?? Number.NaN) / straightTank(job) - 1) : Number.NaN
  }),
)

let sum = 0
const straight = best(30, () => {
  for (const job of straightJobs) sum += straightTank(job)
})
const engine = best(15, () => sizeProject(thousand))
// The best of many single runs is one in which no garbage was collected; a run of 10,000 never gets by without. So both
// pay for their own: ten runs of 1,000 in succession against one of 10,000. The stricter figure, best against best, stands beside it.
let inARow = Infinity
let engineTen = Infinity
for (let round = 0; round < 8; round += 1) {
  collect?.()
  const ofThousand = timeOf(() => {
    for (let n = 0; n < 10; n += 1) sizeProject(thousand)
  })
  collect?.()
  inARow = Math.min(inARow, ofThousand)
  engineTen = Math.min(
    engineTen,
    timeOf(() => sizeProject(tenThousand)),
  )
}

const heap = () => {
  collect?.()
  return process.memoryUsage().heapUsed / 1e6
}
const before = heap()
for (let n = 0; n < 20; n += 1) sizeProject(thousand)
const after = heap()

const rows: readonly (readonly [string, string, boolean])[] = [
  ['the engine agrees with the straight arithmetic', `worst ${worst.toExponential(1)}`, worst < 1e-12],
  ['1,000 vessels with full trace, under 150 ms', `${engine.toFixed(1)} ms`, engine < 150],
  [
    '… within 25 times the same arithmetic straight out',
    `${(engine / straight).toFixed(1)} × (${straight.toFixed(2)} ms)`,
    engine < 25 * straight,
  ],
  [
    '10,000 within 11 times of 1,000 (the best single run of each)',
    `${(engineTen / engine).toFixed(1)} ×`,
    engineTen < 11 * engine,
  ],
  [
    '10,000 within 11 times of 1,000 (the mean of ten in succession)',
    `${((10 * engineTen) / inARow).toFixed(1)} ×`,
    10 * engineTen < 11 * inARow,
  ],
  [
    'memory flat over 20 more runs (needs --expose-gc)',
    `${(after - before).toFixed(1)} MB`,
    !collect || after - before < 5,
  ],
]
for (const [what, figure, holds] of rows) console.log(`${holds ? 'holds' : 'FAILS'}  ${what}: ${figure}`)
if (!Number.isFinite(sum) || rows.some(([, , holds]) => !holds)) process.exitCode = 1
