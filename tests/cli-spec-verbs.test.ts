import {
  chmodSync,
  lstatSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  statSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { exampleText } from './golden/examples.ts'
import { coldfill } from './run-coldfill.ts'

let folder = ''
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'coldfill-verbs-'))
})
afterAll(() => {
  rmSync(folder, { recursive: true, force: true })
})

const put = (name: string, text: string): string => {
  const path = join(folder, name)
  writeFileSync(path, text)
  return path
}
const read = (path: string): string => readFileSync(path, 'utf8')

const spec = `coldfill: 1
project: { number: T-1, title: Test, units: US }
systems:
  HWS:
    service: heating water
    temperatures: { low: 50 °F, high: 180 °F }
    pressure: { static-height: 42 ft, relief-valve: 50 psi }
    contents:
      - volume: 200 gal
    vessels:
      ET-1: { kind: expansion tank, material: steel }
`
const change = (...pairs: readonly (readonly [string, string])[]): string =>
  pairs.reduce((text, [from, to]) => {
    if (!text.includes(from)) throw new Error(`the spec has no "${from}"`)
    return text.replace(from, () => to)
  }, spec)

const untidy = change(
  ['project: {', '# kept\n\nproject:   {'],
  ['    contents:\n      - volume', '    contents:\n        -   volume'],
)
const tidy = change(['project: {', '# kept\n\nproject: {'])

describe('format', () => {
  it('prints the tidied text and leaves the file alone', async () => {
    const path = put('untidy.yaml', untidy)
    const run = await coldfill('format', path)
    expect(run).toEqual({ status: 0, out: tidy, err: '' })
    expect(read(path)).toBe(untidy)
  })

  it('writes the file, and a second time finds nothing to do', async () => {
    const path = put('write.yaml', untidy)
    chmodSync(path, 0o640)
    const first = await coldfill('format', path, '--write')
    expect(first).toMatchObject({ status: 0, out: '' })
    expect(first.err).toContain('formatted')
    expect(read(path)).toBe(tidy)
    expect(statSync(path).mode & 0o777).toBe(0o640)
    const second = await coldfill('format', path, '--write')
    expect(second.err).toContain('no change needed')
    expect(readdirSync(folder).filter((name) => name.includes('.part'))).toEqual([])
  })

  it('writes through a link and keeps it', async () => {
    const path = put('behind.yaml', untidy)
    const link = join(folder, 'link.yaml')
    symlinkSync(path, link)
    await coldfill('format', link, '--write')
    expect(lstatSync(link).isSymbolicLink()).toBe(true)
    expect(read(path)).toBe(tidy)
  })

  it('says with 65 what cannot be read, with 66 what is not there, with 64 what it does not take', async () => {
    const path = put('broken.yaml', 'coldfill: 1\nsystems: [\n')
    const broken = await coldfill('format', path, '--write')
    expect(broken.status).toBe(65)
    expect(broken.out).toBe('')
    expect(broken.err).toContain('CF-Y002')
    expect(read(path)).toBe('coldfill: 1\nsystems: [\n')
    expect((await coldfill('format', join(folder, 'none.yaml'))).status).toBe(66)
    expect((await coldfill('format', path, '--fix')).status).toBe(64)
  })
})

describe('check --fix', () => {
  it('mends what leaves nothing to choose, shows each edit and then checks', async () => {
    const path = put('fix.yaml', change(['material: steel', 'material: steal'], ['200 gal', '1,200 gal']))
    const run = await coldfill('check', path, '--fix')
    expect(read(path)).toBe(change(['200 gal', '1200 gal']))
    expect(run.status).toBe(0)
    expect(run.err).toContain('-       - volume: 1,200 gal\n  +       - volume: 1200 gal')
    expect(run.err).toContain('CF-S007: Write steel')
    expect(run.err).toContain('2 edits made')
  })

  it('never chooses a value and leaves a file without anything to mend as it is', async () => {
    const text = change(['relief-valve: 50 psi', 'relief-valve: 50'])
    const path = put('choose.yaml', text)
    const before = statSync(path).mtimeMs
    const run = await coldfill('check', path, '--fix', '--format', 'json')
    expect(run.status).toBe(1)
    expect(read(path)).toBe(text)
    expect(statSync(path).mtimeMs).toBe(before)
    expect(run.err).toContain('nothing to mend; 1 error left for you to decide')
    const { findings } = JSON.parse(run.out) as { findings: { code: string }[] }
    expect(findings.map(({ code }) => code)).toContain('CF-S008')
  })

  it('puts a missing key in to be filled in, which is an error still', async () => {
    const path = put('missing.yaml', change([', relief-valve: 50 psi', '']))
    const run = await coldfill('check', path, '--fix')
    expect(run.status).toBe(1)
    expect(read(path)).toContain('{ relief-valve: …, static-height: 42 ft }')
    expect(run.out).toContain('CF-S019')
  })
})

interface ComparisonJson {
  spec: { change: string; path: string; was: string | null; now: string | null }[]
  vessels: {
    change: string
    mark: string
    results: {
      name: string
      was: { value: number; unit: string } | null
      now: { value: number } | null
      percent: number | null
    }[]
    inputs: { name: string; from: string; 'was-written'?: string; 'now-written'?: string }[]
  }[]
}

describe('compare', () => {
  const compared = async (now: string, ...options: string[]) =>
    coldfill('compare', put('old.yaml', spec), put('new.yaml', now), ...options)

  it('tells the spec by path, the results with their change, and the inputs that moved them', async () => {
    const run = await compared(change(['200 gal', '300 gal']))
    expect(run.status).toBe(0)
    expect(run.out).toMatch(/changed\s+systems\.HWS\.contents\.0\.volume\s+200 gal\s+300 gal/u)
    // Everything is proportional to the content of the system: half as much again.
    expect(run.out).toMatch(/ET-1\s+required volume\s+\S+ gal\s+\S+ gal\s+\+50\.0 %/u)
    expect(run.out).toMatch(/ET-1\s.*\s200 gal\s+300 gal\s+systems\.HWS\.contents\.0\.volume/u)
  })

  it('gives the same as data', async () => {
    const run = await compared(change(['200 gal', '300 gal']), '--format', 'json')
    const { spec: changes, vessels } = JSON.parse(run.out) as ComparisonJson
    expect(changes).toEqual([
      { change: 'changed', path: 'systems.HWS.contents.0.volume', was: '200 gal', now: '300 gal' },
    ])
    const required = vessels[0]?.results.find(({ name }) => name === 'required-volume')
    expect(required?.was?.unit).toBe('L')
    expect(required?.percent).toBeCloseTo(50, 9)
    expect((required?.now?.value ?? 0) / (required?.was?.value ?? 1)).toBeCloseTo(1.5, 12)
    expect(vessels[0]?.inputs).toHaveLength(1)
    expect(vessels[0]?.inputs[0]).toMatchObject({ 'was-written': '200 gal', 'now-written': '300 gal' })
  })

  it('tells vessels that came and went', async () => {
    const now = change([
      '      ET-1: { kind: expansion tank, material: steel }',
      '      ET-2: { kind: expansion tank, material: none }',
    ])
    const { vessels } = JSON.parse((await compared(now, '--format', 'json')).out) as ComparisonJson
    expect(vessels.map(({ change: sort, mark }) => `${mark} ${sort}`)).toEqual(['ET-2 added', 'ET-1 removed'])
    expect(vessels[0]?.results.find(({ name }) => name === 'required-volume')?.was).toBeNull()
  })

  it('finds nothing in another spelling of the same', async () => {
    const now = change(['200 gal', '757.0823568 L'], ['project: {', '# a comment\nproject: {'])
    const run = await compared(now)
    expect(run.out).toContain('200 gal')
    expect(run.out).toContain('No vessel changes.')
    expect((await compared(change(['project: {', '# a comment\nproject: {']))).out).toContain('say the same')
  })

  it('is quiet about an example compared with itself', async () => {
    const path = put('example.yaml', exampleText('fernhollow'))
    const { spec: changes, vessels } = JSON.parse(
      (await coldfill('compare', path, path, '--format', 'json')).out,
    ) as ComparisonJson
    expect([changes, vessels]).toEqual([[], []])
  })

  it('ends as the findings of the new spec ask for', async () => {
    expect((await compared(change(['relief-valve: 50 psi', 'relief-valve: 50']))).status).toBe(1)
    const unreadable = await compared('coldfill: 1\nsystems: [\n')
    expect(unreadable.status).toBe(65)
    expect(unreadable.out).toBe('')
    expect(unreadable.err).toContain('new.yaml')
    expect((await coldfill('compare', put('one.yaml', spec))).status).toBe(64)
    expect((await compared(spec, '--format', 'sarif')).status).toBe(64)
  })
})
