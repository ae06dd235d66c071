import { spawn } from 'node:child_process'
import { existsSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import ExcelJS from 'exceljs'
import { unzipSync } from 'fflate'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { et1 } from './golden/fernhollow.by-hand.ts'
import { exampleText } from './golden/examples.ts'
import { hasOffice, leftOut } from './office/office.ts'

const root = fileURLToPath(new URL('..', import.meta.url))
const clinic = 'examples/fernhollow/spec.yaml'
let folder = ''

interface Run {
  readonly status: number | null
  readonly out: string
  readonly err: string
}

const start = (command: string, args: readonly string[], cwd: string, settings: object = {}): Promise<Run> =>
  new Promise((done, fail) => {
    const environment: NodeJS.ProcessEnv = { ...process.env, ...settings }
    delete environment['INIT_CWD']
    const child = spawn(command, args, { cwd, env: environment })
    const out: Buffer[] = []
    const err: Buffer[] = []
    child.stdout.on('data', (bytes: Buffer) => out.push(bytes))
    child.stderr.on('data', (bytes: Buffer) => err.push(bytes))
    child.on('error', fail)
    child.on('close', (status) => {
      done({ status, out: Buffer.concat(out).toString('utf8'), err: Buffer.concat(err).toString('utf8') })
    })
  })

/** The command without npm around it, which costs half a second a run. */
const coldfill = (...args: string[]): Promise<Run> =>
  start(process.execPath, ['--import', 'tsx', 'apps/cli/src/main.ts', ...args], root)

/** The command with another LibreOffice than none; '' is the one of this machine. */
const withOffice = (office: string, ...args: string[]): Promise<Run> =>
  start(process.execPath, ['--import', 'tsx', 'apps/cli/src/main.ts', ...args], root, { COLDFILL_OFFICE: office })

const throughNpm = (...args: string[]): Promise<Run> =>
  start('npm', ['run', '--silent', 'coldfill', '--', ...args], root)

const put = (name: string, text: string): string => {
  const path = join(folder, name)
  writeFileSync(path, text)
  return path
}

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'coldfill-cli-'))
})
afterAll(() => {
  rmSync(folder, { recursive: true, force: true })
})

/** `systems:` of one heating loop; `change` edits the text. */
const loop = (change: (text: string) => string = (text) => text): string =>
  change(`coldfill: 1
project: { number: T-1, title: Test }
systems:
  HWS:
    service: heating water
    temperatures: { low: 50 °F, high: 180 °F }
    pressure: { static-height: 42 ft, relief-valve: 50 psi }
    contents: [{ volume: 200 gal }]
    vessels:
      ET-1: { kind: expansion tank, material: steel }
`)

interface JsonFinding {
  code: string
  severity: string
  path: string
  message: string
  range: { start: { line: number; character: number }; end: { line: number; character: number } }
  accepted?: string
}
interface SizeJson {
  engine: string
  spec: number
  vessels: {
    system: string
    mark: string
    kind: string
    method: string
    status: string
    reason?: string
    results: Record<string, { value: number; unit: string }>
    selected: unknown
    steps: { id: string; symbol: string; formula: string; value: number; unit: string; source: string }[]
    assumptions: string[]
  }[]
  findings: JsonFinding[]
  assumptions: { id: string; value: string; source: string; because: string; 'used-by': string[] }[]
}

describe('size --format json', () => {
  let run: Run
  let json: SizeJson
  beforeAll(async () => {
    run = await throughNpm('size', clinic, '--format', 'json')
    json = JSON.parse(run.out) as SizeJson
  })

  it('ends with 0 and has nothing but data on standard output', () => {
    expect(run.status).toBe(0)
    expect(run.out.trimStart().startsWith('{')).toBe(true)
  })

  it('has the documented keys', () => {
    expect(Object.keys(json)).toEqual(['engine', 'spec', 'vessels', 'findings', 'assumptions'])
    expect(json.engine).toMatch(/^\d+\.\d+\.\d+$/u)
    expect(json.spec).toBe(1)
    const [vessel] = json.vessels
    expect(Object.keys(vessel ?? {})).toEqual([
      'system',
      'mark',
      'kind',
      'method',
      'status',
      'results',
      'selected',
      'steps',
      'assumptions',
    ])
    expect(vessel).toMatchObject({
      system: 'HWS',
      mark: 'ET-1',
      kind: 'expansion tank',
      method: 'ashrae',
      status: 'sized',
    })
    for (const step of vessel?.steps ?? [])
      expect(Object.keys(step)).toEqual(['id', 'symbol', 'formula', 'value', 'unit', 'source'])
    for (const assumption of json.assumptions)
      expect(Object.keys(assumption)).toEqual(['id', 'value', 'source', 'because', 'used-by'])
    expect(json.assumptions.map(({ id }) => id)).toContain('relief-margin.hydronic')
    expect(json.assumptions.find(({ id }) => id === 'relief-margin.hydronic')?.['used-by']).toEqual([
      'HWS/ET-1',
      'PHG/ET-2',
    ])
  })

  it('has the documented result names in SI units', () => {
    const results = json.vessels[0]?.results ?? {}
    expect(Object.keys(results)).toEqual(
      expect.arrayContaining([
        'required-volume',
        'system-volume',
        'expansion-volume',
        'fill-pressure',
        'maximum-pressure',
        'precharge',
        'code-minimum-volume',
      ]),
    )
    expect(results['required-volume']?.unit).toBe('L')
    expect(results['precharge']?.unit).toBe('kPa')
    // By hand, see golden/fernhollow.by-hand.ts; seven-digit fluid values make 1e-4 of the result.
    expect((results['required-volume']?.value ?? 0) / (et1.required * 3.785411784)).toBeCloseTo(1, 4)
    expect((results['precharge']?.value ?? 0) / (et1.fill * 6.894757293)).toBeCloseTo(1, 4)
  })

  it('has findings with code, severity, path, message and a zero-based range', () => {
    const finding = json.findings.find(({ code }) => code === 'CF-E043')
    expect(finding).toMatchObject({ severity: 'warning', path: 'systems.PHG.pressure.vessel-connection' })
    const lines = exampleText('fernhollow').split('\n')
    const start = finding?.range.start ?? { line: 0, character: 0 }
    const end = finding?.range.end ?? start
    expect(lines[start.line]?.slice(start.character, end.character)).toMatch(/^(vessel-connection|pump discharge)$/u)
    expect(finding?.accepted).toContain('HX-1')
  })
})

describe.concurrent('exit statuses', () => {
  it('1 where there is an error finding, and 0 where it is a warning and nothing asks for more', async () => {
    const bad = put(
      'error.yaml',
      loop((text) => text.replace('180 °F', '180')),
    )
    const warned = put(
      'warned.yaml',
      loop((text) => text.replace('static-height: 42 ft,', 'fill: 20 psi, static-height: 42 ft,')),
    )
    const [error, warning, failing, accepted] = await Promise.all([
      coldfill('check', bad),
      coldfill('check', warned),
      coldfill('check', warned, '--fail-on', 'warning'),
      coldfill('check', clinic, '--fail-on', 'warning'),
    ])
    expect(error.status).toBe(1)
    expect(error.out).toContain('CF-S008')
    expect(warning.out).toContain('CF-E041')
    expect(warning.status).toBe(0)
    expect(failing.status).toBe(1)
    expect(accepted.status).toBe(0)
  })

  it('64 for wrong usage, said on standard error', async () => {
    const runs = await Promise.all([
      coldfill(),
      coldfill('fill', clinic),
      coldfill('size'),
      coldfill('size', clinic, clinic),
      coldfill('size', clinic, '--format', 'xml'),
      coldfill('size', clinic, '--colour'),
      coldfill('schedule', clinic),
      coldfill('schedule', clinic, '--out', join(folder, 'schedule.txt')),
    ])
    for (const { status, out, err } of runs) {
      expect(status).toBe(64)
      expect(out).toBe('')
      expect(err).not.toBe('')
    }
  })

  it('0 for help, asked for alone or after a verb', async () => {
    for (const args of [['--help'], ['size', '--help'], ['submittal', '-h'], ['help']]) {
      const { status, out, err } = await coldfill(...args)
      expect([status, err], args.join(' ')).toEqual([0, ''])
      expect(out).toContain('Exit status: 0 no error finding')
    }
  })

  it('65 for text that is no YAML and for a spec of another version', async () => {
    const [broken, other] = await Promise.all([
      coldfill('size', put('broken.yaml', 'coldfill: 1\nproject: { number: "T-1\n'), '--format', 'json'),
      coldfill(
        'size',
        put(
          'other.yaml',
          loop((text) => text.replace('coldfill: 1', 'coldfill: 7')),
        ),
        '--format',
        'json',
      ),
    ])
    expect(broken.status).toBe(65)
    expect((JSON.parse(broken.out) as SizeJson).findings.some(({ code }) => code.startsWith('CF-Y'))).toBe(true)
    expect(other.status).toBe(65)
    expect((JSON.parse(other.out) as SizeJson).findings[0]).toMatchObject({ code: 'CF-S002', path: 'coldfill' })
  })

  it('66 where there is no such file', async () => {
    const { status, out, err } = await coldfill('size', join(folder, 'absent.yaml'))
    expect(status).toBe(66)
    expect(out).toBe('')
    expect(err).toContain('absent.yaml')
  })

  it('73 where a document cannot be written, and leaves no half of it behind', async () => {
    const place = join(folder, 'place')
    mkdirSync(join(place, 'taken.xlsx'), { recursive: true })
    const { status, err } = await coldfill('schedule', clinic, '--out', join(place, 'taken.xlsx'))
    expect(status).toBe(73)
    expect(err).toContain('cannot be written')
    expect(readdirSync(place)).toEqual(['taken.xlsx'])
  })

  it('passes through npm, from another folder too', async () => {
    const missing = await throughNpm('size', 'absent.yaml')
    expect(missing.status).toBe(66)
  })
})

describe('reports', () => {
  const bad = () =>
    put(
      'report.yaml',
      loop((text) => text.replace('180 °F', '180, hihg: 3')),
    )

  it('github: one annotation a finding with a place counted from one, nothing for an accepted one', async () => {
    const file = bad()
    const [broken, accepted] = await Promise.all([
      coldfill('check', file, '--format', 'github'),
      coldfill('check', clinic, '--format', 'github'),
    ])
    const lines = broken.out.trim().split('\n')
    expect(lines.length).toBeGreaterThanOrEqual(2)
    for (const line of lines)
      expect(line).toMatch(
        /^::(error|warning|notice) file=.+,line=\d+,endLine=\d+,col=\d+,endColumn=\d+,title=CF-[YSE]\d{3}::.+$/u,
      )
    expect(broken.out).toContain('line=6,')
    expect(accepted.out).not.toContain('CF-E043')
    expect(accepted.out).toMatch(/^::notice /u)
  })

  it('sarif: a 2.1.0 log with rules, places and the accepted warning as suppressed', async () => {
    const { out, status } = await coldfill('check', clinic, '--format', 'sarif')
    expect(status).toBe(0)
    const log = JSON.parse(out) as {
      version: string
      runs: {
        tool: { driver: { name: string; rules: { id: string }[] } }
        results: {
          ruleId: string
          ruleIndex: number
          level: string
          locations: {
            physicalLocation: { artifactLocation: { uri: string }; region: { startLine: number; startColumn: number } }
          }[]
          suppressions?: { justification: string }[]
        }[]
      }[]
    }
    expect(log.version).toBe('2.1.0')
    const [run] = log.runs
    expect(run?.tool.driver.name).toBe('coldfill')
    for (const result of run?.results ?? []) expect(run?.tool.driver.rules[result.ruleIndex]?.id).toBe(result.ruleId)
    const suppressed = run?.results.find(({ ruleId }) => ruleId === 'CF-E043')
    expect(suppressed?.suppressions?.[0]?.justification).toContain('HX-1')
    expect(suppressed?.locations[0]?.physicalLocation.artifactLocation.uri).toBe(clinic)
    expect(suppressed?.locations[0]?.physicalLocation.region.startLine).toBeGreaterThan(1)
  })

  it('text: the table on standard output, findings on standard error, in the units asked for', async () => {
    const [us, si] = await Promise.all([coldfill('size', clinic), coldfill('size', clinic, '--units', 'si')])
    // 18.622 gal by hand; 70.49 L.
    expect(us.out).toMatch(/ET-1 .*18\.6 gal.*22\.2 psig/u)
    expect(si.out).toMatch(/ET-1 .*70\.5 L.*153 kPa/u)
    expect(us.out).not.toContain('warning CF-')
    expect(us.err).toContain('warning CF-E043')
  })
})

describe('documents', () => {
  it('writes a schedule whose cells hold the sized numbers, and a submittal that opens as a package', async () => {
    const [schedule, submittal] = [join(folder, 'out', 'clinic.xlsx'), join(folder, 'clinic.docx')]
    const runs = await Promise.all([
      coldfill('schedule', clinic, '--out', schedule),
      coldfill('submittal', clinic, '--out', submittal, '--units', 'SI'),
    ])
    for (const { status, out } of runs) {
      expect(status).toBe(0)
      expect(out).toBe('')
    }
    expect(runs[1].err).toContain('has no page numbers. LibreOffice is not used (COLDFILL_OFFICE=none).')
    const book = new ExcelJS.Workbook()
    await book.xlsx.readFile(schedule)
    const values = book.worksheets.flatMap((sheet) => {
      const found: unknown[] = []
      sheet.eachRow((row) => {
        row.eachCell((cell) => found.push(cell.result ?? cell.value))
      })
      return found
    })
    expect(values).toContain('ET-1')
    expect(values.some((value) => typeof value === 'number' && Math.abs(value / et1.required - 1) < 1e-4)).toBe(true)
    const parts = unzipSync(new Uint8Array(readFileSync(submittal)))
    const text = new TextDecoder().decode(parts['word/document.xml'])
    expect(text).toContain('TET-1')
    expect(text).toContain('70.5')
  })

  it('says why there is no PDF, and writes the document all the same', async () => {
    const [docx, pdf] = [join(folder, 'alone.docx'), join(folder, 'alone.pdf')]
    const run = await withOffice(join(folder, 'no-such-command'), 'submittal', clinic, '--out', docx, '--pdf', pdf)
    expect(run.status).toBe(73)
    expect(run.err).toContain('alone.pdf cannot be written. LibreOffice is not installed.')
    expect([existsSync(docx), existsSync(pdf)]).toEqual([true, false])
    expect((await coldfill('submittal', clinic, '--out', docx, '--pdf', docx)).status).toBe(64)
    expect((await coldfill('schedule', clinic, '--out', join(folder, 'a.xlsx'), '--pdf', pdf)).status).toBe(64)
  })

  it.skipIf(!hasOffice)(`writes a submittal with page numbers and a print of it${leftOut}`, async () => {
    const [docx, pdf] = [join(folder, 'paged.docx'), join(folder, 'paged.pdf')]
    const run = await withOffice('', 'submittal', clinic, '--out', docx, '--pdf', pdf)
    expect(run).toMatchObject({ status: 0, out: '' })
    expect(run.err).not.toContain('page numbers')
    const xml = new TextDecoder().decode(unzipSync(new Uint8Array(readFileSync(docx)))['word/document.xml'])
    const [entry = ''] = xml.match(/<w:p>(?:(?!<\/w:p>).)*w:val="TOC1".*?<\/w:p>/s) ?? []
    // The summary stands on the page of the contents list, behind the cover, or on the next.
    expect(entry).toMatch(/<w:t [^>]*>[23]<\/w:t>/)
    expect(readFileSync(pdf).subarray(0, 5).toString()).toBe('%PDF-')
  })
})

describe('fluid and schema', () => {
  it('gives the density of water that the steam tables have', async () => {
    const { out, status } = await coldfill(
      'fluid',
      '--fluid',
      'water',
      '--temperature',
      '27 °C',
      '--pressure',
      '30 bar abs',
      '--format',
      'json',
    )
    expect(status).toBe(0)
    const json = JSON.parse(out) as Record<string, { value: number; unit: string }>
    expect(Object.keys(json)).toEqual(['density', 'specific-volume', 'freezing'])
    // IAPWS R7-97(2012), table 5: 0.100215168e-2 m3/kg at 300 K and 3 MPa. 27 °C is 300.15 K; water grows 2.8e-4 per K there.
    expect((json['specific-volume']?.value ?? 0) / (1.00215168e-3 * (1 + 0.15 * 2.76e-4))).toBeCloseTo(1, 6)
  })

  it('refuses what lies outside the data, with a finding', async () => {
    const { out, status } = await coldfill(
      'fluid',
      '--fluid',
      'propylene glycol 40 % mass',
      '--temperature',
      '150 °C',
      '--format',
      'json',
    )
    expect(status).toBe(1)
    expect((JSON.parse(out) as SizeJson).findings[0]?.code).toBe('CF-E003')
  })

  it('prints a JSON Schema', async () => {
    const { out, status } = await coldfill('schema')
    expect(status).toBe(0)
    expect(JSON.parse(out)).toMatchObject({ $id: expect.stringContaining('coldfill-1') as unknown })
  })
})

describe.concurrent('bad input, through npm as a person types it', () => {
  const check = async (name: string, text: string): Promise<{ run: Run; findings: JsonFinding[] }> => {
    const run = await throughNpm('check', put(name, text), '--format', 'json')
    return { run, findings: (JSON.parse(run.out) as SizeJson).findings }
  }

  it('a file of 5 MB is refused at once', async () => {
    const run = await throughNpm('size', put('huge.yaml', `${loop()}# ${'x'.repeat(5_000_000)}\n`))
    expect(run.status).toBe(65)
    expect(run.out).toBe('')
    expect(run.err).toMatch(/5000\d{3} bytes/u)
  })

  it('a bomb of aliases is refused, with a place', async () => {
    const levels = Array.from({ length: 12 }, (_, n) =>
      n === 0
        ? 'a0: &a0 [x, x, x, x, x, x, x, x, x]'
        : `a${n}: &a${n} [${Array<string>(9)
            .fill(`*a${n - 1}`)
            .join(', ')}]`,
    )
    const { run, findings } = await check('bomb.yaml', `coldfill: 1\n${levels.join('\n')}\n`)
    expect(run.status).toBe(65)
    expect(findings.every(({ code }) => code.startsWith('CF-'))).toBe(true)
    expect(findings[0]?.range.start.line).toBeGreaterThan(0)
  })

  it('broken YAML has its place', async () => {
    const { run, findings } = await check(
      'broken-2.yaml',
      loop((text) => text.replace('contents: [{ volume: 200 gal }]', 'contents: [{ volume: 200 gal }')),
    )
    expect(run.status).toBe(65)
    expect(findings[0]?.code).toMatch(/^CF-Y/u)
    expect(findings[0]?.range.start.line).toBeGreaterThanOrEqual(7)
  })

  it('an unknown key is named at the key, with the nearest known one', async () => {
    const { run, findings } = await check(
      'key.yaml',
      loop((text) => text.replace('relief-valve:', 'releif-valve:')),
    )
    expect(run.status).toBe(1)
    const finding = findings.find(({ path }) => path.includes('releif-valve'))
    expect(finding?.severity).toBe('error')
    expect(`${finding?.message} ${JSON.stringify(finding)}`).toContain('relief-valve')
    expect(finding?.range.start).toEqual({ line: 6, character: 38 })
  })

  it('a wrong unit is named at the value', async () => {
    const { run, findings } = await check(
      'unit.yaml',
      loop((text) => text.replace('42 ft', '42 gal')),
    )
    expect(run.status).toBe(1)
    expect(findings[0]).toMatchObject({ severity: 'error', path: 'systems.HWS.pressure.static-height' })
    expect(findings[0]?.range).toEqual({ start: { line: 6, character: 31 }, end: { line: 6, character: 37 } })
  })

  it('pressures that no vessel can meet make it infeasible, not negative', async () => {
    const run = await throughNpm(
      'size',
      put(
        'pressures.yaml',
        loop((text) => text.replace('relief-valve: 50 psi', 'relief-valve: 20 psi')),
      ),
      '--format',
      'json',
    )
    const json = JSON.parse(run.out) as SizeJson
    expect(run.status).toBe(1)
    expect(json.vessels[0]).toMatchObject({ status: 'infeasible' })
    expect(json.vessels[0]?.reason).toBeTruthy()
    expect(json.vessels[0]?.results['required-volume']).toBeUndefined()
    expect(json.findings.map(({ code }) => code)).toContain('CF-E020')
  })
})
