import type { CatalogueRow } from '@coldfill/engine'
import { isVesselKind } from '@coldfill/spec'
import { type Kind, parseQuantity } from '@coldfill/units'
import { catalogueColumns, type CatalogueHeading } from './catalogue-columns.ts'

/** What is wrong with a catalogue, by line (the head is line 1) and column heading. */
export interface CatalogueProblem {
  readonly line: number
  readonly column: string
  readonly message: string
}

export interface CatalogueReading {
  readonly rows: readonly CatalogueRow[]
  readonly problems: readonly CatalogueProblem[]
}

interface Heading {
  readonly heading: CatalogueHeading
  readonly unit: string | undefined
}

const readHead = (cells: readonly string[], problems: CatalogueProblem[]): readonly (Heading | null)[] => {
  const seen = new Set<string>()
  const head = cells.map((cell) => {
    const match = /^\s*([^(]*?)\s*(?:\(([^)]*)\))?\s*$/u.exec(cell)
    const name = (match?.[1] ?? cell).toLowerCase().replace(/[\s_-]+/gu, ' ')
    const column = catalogueColumns.find(({ heading }) => heading === name)
    if (!column) {
      if (name !== '')
        problems.push({ line: 1, column: cell, message: `"${cell}" is no column of a catalogue; it is ignored.` })
      return null
    }
    if (seen.has(column.heading)) {
      problems.push({
        line: 1,
        column: cell,
        message: `The column "${column.heading}" stands twice; the first is used.`,
      })
      return null
    }
    seen.add(column.heading)
    return { heading: column.heading, unit: match?.[2]?.trim() }
  })
  for (const { heading, required } of catalogueColumns)
    if (required && !seen.has(heading))
      problems.push({ line: 1, column: heading, message: `The column "${heading}" is missing.` })
  return head
}

const yes = new Set(['yes', 'y', 'true', '1', 'x'])
const no = new Set(['no', 'n', 'false', '0', ''])

/**
 * Reads a catalogue from a table of cells as text, its first line the head. A cell may carry its unit (`35 gal`), or the head
 * does (`volume (gal)`). A line with a mistake is left out, with a problem that says what is wrong.
 */
export const readCatalogue = (table: readonly (readonly string[])[]): CatalogueReading => {
  const problems: CatalogueProblem[] = []
  const [headCells, ...lines] = table
  if (!headCells) return { rows: [], problems: [{ line: 1, column: '', message: 'The catalogue is empty.' }] }
  const head = readHead(headCells, problems)
  const missing = catalogueColumns.some(
    ({ heading, required }) => required && !head.some((h) => h?.heading === heading),
  )
  if (missing) return { rows: [], problems }
  const rows: CatalogueRow[] = []
  for (const [index, cells] of lines.entries()) {
    if (cells.every((cell) => cell.trim() === '')) continue
    const line = index + 2
    const before = problems.length
    const say = (column: string, message: string) => problems.push({ line, column, message })
    const cell = (heading: CatalogueHeading): { text: string; unit: string | undefined } => {
      const at = head.findIndex((h) => h?.heading === heading)
      return { text: (cells[at] ?? '').trim(), unit: head[at]?.unit }
    }
    const text = (heading: CatalogueHeading, required: boolean): string | null => {
      const { text: found } = cell(heading)
      if (found === '' && required) say(heading, `The ${heading} is missing.`)
      return found === '' ? null : found
    }
    const number = (heading: CatalogueHeading, kind: Kind, required: boolean): number | null => {
      const { text: found, unit } = cell(heading)
      if (found === '') {
        if (required) say(heading, `The ${heading} is missing.`)
        return null
      }
      const parsed = parseQuantity(unit !== undefined && /^[-+.\d\s/eE]+$/u.test(found) ? `${found} ${unit}` : found, [
        kind,
      ])
      if (!parsed.ok) {
        say(heading, parsed.problem.message)
        return null
      }
      if (parsed.quantity.value <= 0) say(heading, `The ${heading} must be above zero.`)
      return parsed.quantity.value
    }
    const flag = (heading: CatalogueHeading): boolean => {
      const found = cell(heading).text.toLowerCase()
      if (!yes.has(found) && !no.has(found)) say(heading, `"${found}" is neither yes nor no.`)
      return yes.has(found)
    }
    const choice = (heading: 'construction' | 'mounting'): string | null => {
      const found = cell(heading).text.toLowerCase()
      if (found === '') return null
      const column = catalogueColumns.find((c) => c.heading === heading)
      const choices: readonly string[] =
        column && typeof column.holds === 'object' && 'choice' in column.holds ? column.holds.choice : []
      if (!choices.includes(found)) say(heading, `"${found}" is not one of ${choices.join(', ')}.`)
      return found
    }
    const kinds = cell('kind')
      .text.toLowerCase()
      .split(/\s*;\s*/u)
      .filter((kind) => kind !== '')
    for (const kind of kinds) if (!isVesselKind(kind)) say('kind', `"${kind}" is no kind of vessel.`)
    if (kinds.length === 0) say('kind', 'The kind is missing.')
    const volume = number('volume', 'volume', true)
    const acceptance = number('acceptance volume', 'volume', false)
    if (volume !== null && acceptance !== null && acceptance > volume)
      say('acceptance volume', 'The acceptance volume is larger than the vessel.')
    const row = {
      maker: text('maker', true),
      model: text('model', true),
      kinds,
      construction: choice('construction'),
      volume,
      acceptance,
      maxPressure: number('maximum pressure', 'gauge pressure', true),
      maxTemperature: number('maximum temperature', 'temperature', true),
      potable: flag('potable'),
      stamped: flag('stamp'),
      mounting: choice('mounting'),
      diameter: number('diameter', 'diameter', false),
      height: number('height', 'diameter', false),
      weightEmpty: number('weight empty', 'mass', false),
      connection: text('connection', false),
      line,
    }
    if (problems.length === before) rows.push(row as CatalogueRow)
  }
  return { rows, problems }
}
