// node --import tsx tests/bench/documents.ts: the two documents against the libraries that write them, each in a process of
// its own, ratios of one run.
import { spawnSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { performance } from 'node:perf_hooks'
import { fileURLToPath } from 'node:url'
import { strFromU8, unzipSync } from 'fflate'

interface Measure {
  readonly ms: number
  /** Most memory the process held, MB. */
  readonly memory: number
}

const VESSELS = { workbook: 500, submittal: 100 }

/** Runs one job; what it needs is loaded before the clock starts. */
const jobs: Record<string, (file: string) => Promise<() => Promise<Uint8Array>>> = {
  workbook: async () => {
    const { writeSchedule } = await import('@coldfill/documents')
    const { documentOptions } = await import('@coldfill/documents/testing')
    const { manyVessels } = await import('./many-vessels.ts')
    const result = manyVessels(VESSELS.workbook)
    return () => writeSchedule(result, documentOptions('US'))
  },
  'same workbook': async (file) => {
    const { readCells, writeSameCells } = await import('./same-workbook.ts')
    const cells = await readCells(readFileSync(file))
    return () => writeSameCells(cells)
  },
  submittal: async () => {
    const { writeSubmittal } = await import('@coldfill/documents')
    const { documentOptions } = await import('@coldfill/documents/testing')
    const { manyVessels } = await import('./many-vessels.ts')
    const result = manyVessels(VESSELS.submittal)
    return () => writeSubmittal(result, documentOptions('US'))
  },
  'same submittal': async (file) => {
    const { parseBody, writeSame } = await import('./same-document.ts')
    const parts = unzipSync(readFileSync(file))
    const body = parseBody(strFromU8(parts['word/document.xml'] ?? new Uint8Array()))
    const media = (end: string) =>
      Object.entries(parts).flatMap(([name, part]) =>
        name.startsWith('word/media/') && name.endsWith(end) ? [part] : [],
      )
    const pngs = media('.png')
    const images = media('.svg').map((svg, index) => ({ svg, png: pngs[index] ?? svg }))
    return () => writeSame(body, images)
  },
}

const [, , job, file = ''] = process.argv
if (job !== undefined) {
  const ready = jobs[job]
  if (!ready) throw new Error(`no job ${job}`)
  const run = await ready(file)
  const start = performance.now()
  const bytes = await run()
  const ms = performance.now() - start
  if (!job.startsWith('same')) writeFileSync(file, bytes)
  console.log(JSON.stringify({ ms, memory: process.resourceUsage().maxRSS / 1024 }))
  process.exit(0)
}

const folder = mkdtempSync(join(tmpdir(), 'coldfill-bench-'))
const measure = (name: string, path: string): Measure => {
  const run = spawnSync(process.execPath, ['--import', 'tsx', fileURLToPath(import.meta.url), name, path], {
    encoding: 'utf8',
    stdio: ['ignore', 'pipe', 'inherit'],
  })
  return JSON.parse(run.stdout) as Measure
}
/** The best of three, so that a busy machine hurts less; of memory the most. */
const best = (name: string, path: string): Measure => {
  const runs = [1, 2, 3].map(() => measure(name, path))
  return { ms: Math.min(...runs.map(({ ms }) => ms)), memory: Math.max(...runs.map(({ memory }) => memory)) }
}
try {
  const [xlsx, docx] = [join(folder, 'schedule.xlsx'), join(folder, 'submittal.docx')]
  const workbook = best('workbook', xlsx)
  const sameWorkbook = best('same workbook', xlsx)
  const submittal = best('submittal', docx)
  const sameSubmittal = best('same submittal', docx)
  const ratio = (a: Measure, b: Measure) =>
    `${(a.ms / b.ms).toFixed(2)} × (${a.ms.toFixed(0)} against ${b.ms.toFixed(0)} ms)`
  const rows: readonly (readonly [string, string, boolean])[] = [
    [
      `workbook of ${VESSELS.workbook} vessels within 1.5 times the library writing the same cells`,
      ratio(workbook, sameWorkbook),
      workbook.ms < 1.5 * sameWorkbook.ms,
    ],
    ['… under 300 MB, the whole process', `${workbook.memory.toFixed(0)} MB`, workbook.memory < 300],
    [
      `submittal of ${VESSELS.submittal} vessels within 2 times the library writing the same content`,
      ratio(submittal, sameSubmittal),
      submittal.ms < 2 * sameSubmittal.ms,
    ],
    ['… memory, the whole process', `${submittal.memory.toFixed(0)} MB`, true],
  ]
  for (const [what, figure, holds] of rows) console.log(`${holds ? 'holds' : 'FAILS'}  ${what}: ${figure}`)
  if (rows.some(([, , holds]) => !holds)) process.exitCode = 1
} finally {
  rmSync(folder, { recursive: true, force: true })
}
