import { water } from '@coldfill/engine'
import { displayUnit, fromSi } from '@coldfill/units'
import ExcelJS from 'exceljs'
import { strFromU8, unzipSync } from 'fflate'
import { beforeAll, describe, expect, it } from 'vitest'
import { headerText, scheduleTable } from '@coldfill/presentation'
import { clinicProject, documentOptions, reviewedOptions } from '../testing/index.ts'
import { writeSchedule } from './write-schedule.ts'

const project = clinicProject(water.functions)
const options = documentOptions('US')

const read = async (bytes: Uint8Array): Promise<ExcelJS.Workbook> => {
  const workbook = new ExcelJS.Workbook()
  await workbook.xlsx.load(bytes as never)
  return workbook
}
const partsOf = (bytes: Uint8Array): Map<string, string> =>
  new Map(Object.entries(unzipSync(bytes)).map(([name, part]) => [name, strFromU8(part)]))

const relativeError = (found: unknown, expected: number): number =>
  Math.abs(Number(found) - expected) / Math.abs(expected)

describe('the schedule workbook', () => {
  let bytes: Uint8Array
  let workbook: ExcelJS.Workbook
  let parts: Map<string, string>
  const sheet = (name: string): ExcelJS.Worksheet => {
    const found = workbook.getWorksheet(name)
    if (!found) throw new Error(`no sheet ${name}`)
    return found
  }
  beforeAll(async () => {
    bytes = await writeSchedule(project, options)
    workbook = await read(bytes)
    parts = partsOf(bytes)
  })

  it('has its sheets in the order in which a reader turns to them', () => {
    expect(workbook.worksheets.map((each) => each.name)).toEqual([
      'Cover',
      'Expansion tanks',
      'Thermal expansion tanks',
      'ET-1',
      'TET-1',
      'Revision changes',
      'Readings',
      'Assumptions',
      'Checks',
      'Sources',
      'Fluid data',
    ])
    expect(workbook.views[0]?.activeTab).toBe(0)
  })

  describe.each([
    ['Expansion tanks', 'expansion tank'],
    ['Thermal expansion tanks', 'thermal expansion tank'],
  ])('on the sheet %s', (name, kind) => {
    const table = scheduleTable(project, kind, 'US')

    it('has a title in A1, a purpose in A2 and one unique head row, marked up as a named table', () => {
      expect(sheet(name).getCell('A1').value).toBe(`${table.title} schedule`)
      expect(sheet(name).getCell('A2').text).toContain(table.purpose)
      const head = (sheet(name).getRow(5).values as unknown[]).slice(1)
      expect(head).toEqual(table.columns.map(headerText))
      expect(new Set(head).size).toBe(head.length)
      const [marked] = Object.values(
        sheet(name).getTables() as unknown as { table: { ref: string; tableRef: string; name: string } }[],
      )
      expect(marked?.table.name).toMatch(/^tbl[A-Za-z]+$/)
      expect(marked?.table.tableRef).toMatch(new RegExp(`^A5:[A-Z]+${5 + table.rows.length}$`))
    })

    it('merges nothing', () => {
      expect((sheet(name).model as { merges?: unknown[] }).merges ?? []).toEqual([])
    })

    it('keeps head and Mark in view and repeats the head on a page that fits the width', () => {
      expect(sheet(name).views[0]).toMatchObject({ state: 'frozen', xSplit: 1, ySplit: 5 })
      expect(sheet(name).pageSetup).toMatchObject({
        orientation: 'landscape',
        fitToWidth: 1,
        fitToHeight: 0,
        printTitlesRow: '5:5',
      })
      expect(sheet(name).pageSetup.printArea).toMatch(/^A1:[A-Z]+\d+$/)
    })

    it('says project, revision and page in the footer, and that it is no construction issue in the head', () => {
      const { oddFooter, oddHeader } = sheet(name).headerFooter
      for (const words of ['FC-241', 'Rev A', 'Page &P of &N', 'a3f5c0de9b7d41e2']) expect(oddFooter).toContain(words)
      expect(oddHeader).toContain('NOT FOR CONSTRUCTION')
    })

    it('holds real numbers, live where a calculation stands behind them, each with a fixed number of decimals', () => {
      const cells = table.rows.flatMap((row, index) =>
        table.columns.map((column, at) => ({
          cell: sheet(name).getCell(6 + index, at + 1),
          expected: row.cells[column.key],
          format: column.decimals ? `0.${'0'.repeat(column.decimals)}` : '0',
        })),
      )
      for (const { cell, expected } of cells.filter((each) => each.expected?.value === null)) {
        expect(cell.text).toBe(expected?.text)
      }
      const numbers = cells.filter((each) => typeof each.expected?.value === 'number')
      expect(numbers.length).toBeGreaterThan(10)
      for (const { cell, expected, format } of numbers) {
        expect(cell.result ?? cell.value).toBe(expected?.value)
        expect(cell.numFmt).toBe(format)
      }
      const live = numbers.filter((each) => each.expected?.entry !== null)
      expect(live.length).toBeGreaterThan(7)
      for (const { cell } of live) expect(cell.formula).toMatch(/^'T?ET-1'!\$C\$\d+$/)
    })
  })

  it('has the value of the engine cached in every step of a calculation', () => {
    const cached = new Map<string, unknown>()
    sheet('ET-1').eachRow((row) => {
      if (row.getCell(3).formula) cached.set(row.getCell(2).text.toLowerCase(), row.getCell(3).result)
    })
    const steps = project.vessels[0]?.trace.flatMap((section) =>
      section.entries.filter((entry) => entry.entry === 'step'),
    )
    expect(steps?.length).toBeGreaterThan(10)
    const wrong = (steps ?? []).filter((step) => {
      const expected = fromSi(step.value, displayUnit(step.kind, 'US'))
      return !(relativeError(cached.get(step.name.toLowerCase()), expected) < 1e-12)
    })
    expect(wrong.map((step) => step.name)).toEqual([])
  })

  it('names the cell of every input and result by mark and key', () => {
    const vessel = project.vessels.find((each) => each.mark === 'ET-1')
    const names = new Map(
      [
        ...(parts.get('xl/workbook.xml') ?? '').matchAll(
          /<definedName name="([^"]+)">&apos;([^&]+)&apos;!\$(\w+)\$(\d+)</g,
        ),
      ].map(([, name, on, column, row]) => [name, { on, cell: `${column}${row}` }]),
    )
    const keyed = Object.entries(vessel?.results ?? {})
    expect(keyed.length).toBeGreaterThan(4)
    for (const [key, value] of keyed) {
      const found = names.get(`ET_1_${key.replaceAll('-', '_')}`)
      const cell = sheet(found?.on ?? '').getCell(found?.cell ?? 'A1')
      expect(relativeError(cell.result, fromSi(value.value, displayUnit(value.kind, 'US')))).toBeLessThan(1e-9)
    }
    const inputs = vessel?.trace.flatMap((section) => section.entries).filter((entry) => entry.entry === 'input') ?? []
    for (const { id } of inputs) expect(names.has(id.replace(/[^A-Za-z0-9]+/g, '_'))).toBe(true)
  })

  it('has cells for readings in the field, with rules, help and a key that finds the row again', () => {
    const readings = sheet('Readings')
    const head = (readings.getRow(5).values as unknown[]).slice(1)
    expect(head).toEqual(expect.arrayContaining(['Mark', 'Required (psig)', 'Read (psig)', 'Date', 'Row key']))
    expect(readings.getCell('M6').value).toMatch(/^[A-Z]+\/ET-1\/precharge$/)
    expect(readings.getCell('E6').formula).toMatch(/^'ET-1'!\$C\$\d+$/)
    expect(readings.getCell('G6').formula).toBe('IF(ISNUMBER(F6),F6-E6,"")')
    expect(readings.getCell('F6').value).toBeNull()
    const xml = [...parts.values()].find(
      (part) => part.includes('Isolated and drained') && part.includes('dataValidation'),
    )
    const rules = xml?.match(/<dataValidation .*?<\/dataValidation>/gs) ?? []
    expect(rules.map((rule) => /type="(\w+)"/.exec(rule)?.[1])).toEqual(
      expect.arrayContaining(['decimal', 'list', 'date', 'textLength']),
    )
    for (const rule of rules) {
      expect(rule).toMatch(/prompt="[^"]+"/)
      expect(rule).toMatch(/error="[^"]+"/)
      expect(rule).toMatch(/sqref="[A-Z]6:[A-Z]\d+"/)
    }
  })

  it('lists what differs from the issue before, as numbers with the letter of this revision', async () => {
    const reviewed = await read(await writeSchedule(project, reviewedOptions('US')))
    const changes = reviewed.getWorksheet('Revision changes')
    expect(changes?.getCell('A1').value).toBe('Changes since the first issue')
    const values = (row: number) => ((changes?.getRow(row).values ?? []) as unknown[]).slice(1)
    expect(values(6)).toEqual([
      'ET-1',
      'HWS',
      'A',
      'Precharge',
      expect.closeTo(12, 9),
      expect.closeTo(15, 9),
      'psig',
      '+25 %',
    ])
    expect(values(7).slice(3, 6)).toEqual(['Status', 'Blocked', 'Sized'])
  })

  it('is recalculated on opening, with results in place for viewers that do not', () => {
    expect(parts.get('xl/workbook.xml')).toMatch(/<calcPr[^>]*fullCalcOnLoad="1"/)
    for (const [name, xml] of parts) {
      if (!name.startsWith('xl/worksheets/sheet')) continue
      for (const [cell] of xml.matchAll(/<c [^>]*><f>.*?<\/c>/g)) expect(cell).toContain('<v>')
    }
  })

  it('gives the same bytes for the same result, whenever it is written', async () => {
    expect(Buffer.from(await writeSchedule(project, options)).equals(Buffer.from(bytes))).toBe(true)
  })

  it('lets no text of a user become a formula, and survives any name', async () => {
    const hostile = '=HYPERLINK("http://evil.example")'
    const names = ["=1+1'[x]", "D'Arcy*?/\\:", '']
    const vessels = project.vessels.map((vessel, index) => ({
      ...vessel,
      mark: names[index] ?? vessel.mark,
      serves: hostile,
      notes: [hostile, '@cmd', '\u0007bell'],
      trace: vessel.trace.map((section) => ({ ...section, title: hostile })),
    }))
    const attacked = {
      ...project,
      vessels,
      project: { ...project.project, title: `${hostile}&D&"x"`, client: hostile, number: '241&A' },
    }
    const written = await read(await writeSchedule(attacked, options))
    const formulas: string[] = []
    for (const each of written.worksheets) {
      expect(each.name).toMatch(/^[A-Za-z0-9 .()_-]{1,31}$/)
      each.eachRow((row) => {
        row.eachCell((cell) => {
          if (cell.formula) formulas.push(cell.formula)
        })
      })
    }
    expect(formulas.length).toBeGreaterThan(50)
    expect(formulas.filter((formula) => /HYPERLINK|cmd/.test(formula))).toEqual([])
    expect(written.getWorksheet('Cover')?.headerFooter.oddFooter).toContain('&&D&&')
  })

  it('writes a project without vessels', async () => {
    const empty = { ...project, vessels: [], systems: [], assumptions: [], findings: [], sources: {} }
    const written = await read(await writeSchedule(empty, options))
    expect(written.worksheets.map((each) => each.name)).toContain('Cover')
  })
})
