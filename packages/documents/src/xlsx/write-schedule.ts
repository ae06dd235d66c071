import type { ProjectResult } from '@coldfill/sizing'
import ExcelJS from 'exceljs'
import { fixedArchive, partText } from '../archive/fixed-archive.ts'
import { fluidOf } from '../calculation/fluid-of.ts'
import { vesselCalculation } from '../calculation/vessel-calculation.ts'
import { dateOf, revisionWords, type DocumentOptions } from '../document-options.ts'
import { scheduleKinds, scheduleTable, sentenceCase } from '@coldfill/presentation'
import { writeAssumptions } from './assumptions-sheet.ts'
import { writeCalculation, type WrittenCalculation } from './calculation-sheet.ts'
import { namedCells, withNames } from './cell-names.ts'
import { writeChanges } from './changes-sheet.ts'
import { withLogoWords, writeCover, type ContentsEntry } from './cover-sheet.ts'
import { writeFindings } from './findings-sheet.ts'
import { writeFluidData } from './fluid-data-sheet.ts'
import { cellText } from './plain-text.ts'
import { asksForSteam } from './property-laws.ts'
import { writeReadings } from './readings-sheet.ts'
import { writeScheduleSheet, type VesselCells } from './schedule-sheet.ts'
import { withFontsInOrder, withoutEditAs } from './schema-order.ts'
import { SharedInputs } from './shared-inputs.ts'
import { Palette, paletteNumbers, withRows } from './sheet-xml.ts'
import { SheetNames } from './sheet-names.ts'
import { writeSources } from './sources-sheet.ts'

/** The equipment schedule as an .xlsx file. The same result and options give the same bytes. */
export const writeSchedule = async (result: ProjectResult, options: DocumentOptions): Promise<Uint8Array> => {
  const { project } = result
  const workbook = new ExcelJS.Workbook()
  const date = dateOf(options.titleBlock)
  Object.assign(workbook, {
    created: date,
    modified: date,
    creator: cellText(options.titleBlock.preparedBy || options.titleBlock.office),
    lastModifiedBy: cellText(options.titleBlock.preparedBy || options.titleBlock.office),
    company: cellText(options.titleBlock.office),
    title: cellText(`${project.number} ${project.title}: equipment schedule`),
    subject: 'Vessel schedule with calculations',
    keywords: cellText(`${project.number}, ${revisionWords(options.titleBlock.revision)}`),
    description: options.contentHash === undefined ? '' : `Content hash ${options.contentHash}`,
  })
  workbook.calcProperties.fullCalcOnLoad = true

  const names = new SheetNames()
  const cover = names.take('Cover')
  const schedules = scheduleKinds(result).map((kind) => {
    const table = scheduleTable(result, kind, options.units)
    return { table, name: names.take(table.title) }
  })
  const calculations = result.vessels
    .filter((vessel) => vessel.trace.length > 0)
    .map((vessel) => ({ name: names.take(vessel.mark), vessel }))
  const changes = names.take('Revision changes')
  const readings = names.take('Readings')
  const assumptions = names.take('Assumptions')
  const findings = names.take('Checks')
  const sources = names.take('Sources')
  const fluidData = names.take('Fluid data')
  const contents: ContentsEntry[] = [
    ...schedules.map(({ name, table }) => ({
      sheet: name,
      about: `Schedule of ${table.rows.length} ${table.rows.length === 1 ? 'vessel' : 'vessels'}`,
    })),
    ...calculations.map(({ name, vessel }) => ({
      sheet: name,
      about: `Calculation of ${vessel.mark}, ${sentenceCase(vessel.kind).toLowerCase()}, ${vessel.serves}`,
    })),
    { sheet: changes, about: 'Results that differ from the issue before this one' },
    { sheet: readings, about: 'What is to be read on site, with cells to write it into' },
    { sheet: assumptions, about: 'Numbered register of the defaults that the results lean on' },
    { sheet: findings, about: 'What the checks found, and what was accepted with a reason' },
    { sheet: sources, about: 'Every publication cited, under the number it is cited by' },
    { sheet: fluidData, about: 'Coefficients of the equations for fluid properties' },
  ]

  // Sheets stand in the order in which a reader turns to them, but each can only be written when what it refers to is.
  writeCover(workbook, cover, result, options, contents)
  const bases = [
    ...new Set(
      calculations.flatMap(({ vessel: { solution } }) =>
        solution.base !== 'water' && solution.massFraction > 0 ? [solution.base] : [],
      ),
    ),
  ]
  const steam = calculations.some(({ vessel }) => asksForSteam(vessel))
  const fluidCells = writeFluidData(workbook, fluidData, project, options, { bases, steam })
  const inputs = new SharedInputs()
  const vessels = new Map<string, VesselCells>()
  const palette = new Palette()
  const written = new Map<string, WrittenCalculation>()
  for (const { name, vessel } of calculations) {
    // One calculation is in memory at a time; of each only the rows of its sheet are kept.
    const fluid = fluidOf(vessel)
    const calculation = vesselCalculation(vessel, result, options.units, fluid.functions)
    const sheet = writeCalculation(
      workbook,
      { name, vessel, fluid, calculation },
      project,
      options,
      fluidCells,
      inputs,
      palette,
    )
    written.set(name, sheet)
    vessels.set(`${vessel.system}/${vessel.mark}`, { sheet: name, cells: sheet.cells })
  }
  for (const { table, name } of schedules) writeScheduleSheet(workbook, name, table, vessels, project, options)
  writeChanges(workbook, changes, result, options)
  writeReadings(workbook, readings, result, options, vessels)
  const cellNames = namedCells(result, vessels)
  writeAssumptions(workbook, assumptions, result, options)
  writeFindings(workbook, findings, result, options)
  writeSources(workbook, sources, result, options)
  inOrder(workbook, [cover, ...contents.map((entry) => entry.sheet)])

  const [sample] = calculations
  const sampleSheet = sample && workbook.getWorksheet(sample.name)
  if (sampleSheet) palette.writeInto(sampleSheet)
  // The library names the part of a sheet by its id.
  const partOf = new Map(workbook.worksheets.map(({ id, name }) => [`xl/worksheets/sheet${id}.xml`, name]))
  const bytes = new Uint8Array(await workbook.xlsx.writeBuffer(STORED))
  const samplePart = [...partOf].find(([, name]) => name === sample?.name)?.[0]
  const numbers = samplePart === undefined ? new Map<string, string>() : paletteNumbers(partText(bytes, samplePart))
  return fixedArchive(bytes, (part, xml) => {
    if (part === 'xl/workbook.xml') return withNames(xml, cellNames)
    if (part === 'xl/styles.xml') return withFontsInOrder(xml)
    if (part.startsWith('xl/drawings/drawing')) return withoutEditAs(withLogoWords(xml, options))
    const name = partOf.get(part) ?? ''
    const calculation = written.get(name)
    if (!calculation) return xml
    written.delete(name)
    return withRows(xml, new TextDecoder().decode(calculation.rows), numbers, calculation.range)
  })
}

/** The archive is packed again, so its first packing need not be small. The library hands these on to its packer; its types do not list them. */
const STORED = { zip: { compression: 'STORE' } } as Partial<ExcelJS.XlsxWriteOptions>

/** Sorts the sheets, first one shown on opening. */
const inOrder = (workbook: ExcelJS.Workbook, names: readonly string[]): void => {
  names.forEach((name, index) => {
    const sheet = workbook.getWorksheet(name)
    // The library sorts by this field when it writes; its types do not list it.
    if (sheet) (sheet as unknown as { orderNo: number }).orderNo = index
  })
  workbook.views = [{ x: 0, y: 0, width: 24_000, height: 14_000, firstSheet: 0, activeTab: 0, visibility: 'visible' }]
}
