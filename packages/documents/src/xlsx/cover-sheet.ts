import type { ProjectResult } from '@coldfill/sizing'
import type { Workbook } from 'exceljs'
import { peopleOf, revisionWords, type DocumentOptions } from '../document-options.ts'
import { OCHRE, PENCIL } from '../look.ts'
import { cautions } from '../words/cautions.ts'
import { gaugeRemark } from '../words/pressure-words.ts'
import { putCell, type CellContent } from './put-cell.ts'
import { addSheet, fitHeight, font, HEAD_BORDERS, ROW_BORDERS, WELL_FILL, wrapped } from './sheet.ts'

/** A sheet of the workbook and what stands on it. */
export interface ContentsEntry {
  readonly sheet: string
  readonly about: string
}

const WIDTHS = [24, 16, 60, 22]

/** The library gives a picture a number for a name; a reader who cannot see it needs words. */
export const withLogoWords = (xml: string, { titleBlock }: DocumentOptions): string =>
  xml.replace(/(<xdr:cNvPr id="\d+" name=")[^"]*"/, (_, head: string) => {
    const words = `Logo of ${titleBlock.office}`.replace(/[<>&"]/g, (sign) => `&#${sign.charCodeAt(0)};`)
    return `${head}Logo" descr="${words}"`
  })

/** Most room for a logo, in pixels of 96 to the inch: the last column, beside title and subtitle. */
const [LOGO_WIDTH, LOGO_HEIGHT] = [150, 58]

/** Title block, revision block, contents, legend and cautions: the first sheet of the workbook. */
export const writeCover = (
  workbook: Workbook,
  name: string,
  result: ProjectResult,
  options: DocumentOptions,
  entries: readonly ContentsEntry[],
): void => {
  const { project } = result
  const { titleBlock, revisions, contentHash } = options
  const sheet = addSheet(workbook, name, project, options, { orientation: 'portrait', widths: WIDTHS })
  let at = 1

  const heading = (text: string) => {
    at += 1
    const cell = sheet.getCell(at, 1)
    putCell(cell, { text })
    cell.font = font(9, { bold: true }, PENCIL)
    at += 1
  }
  const tableRow = (contents: readonly CellContent[], head = false) => {
    const row = sheet.getRow(at)
    WIDTHS.forEach((_, index) => {
      const cell = row.getCell(index + 1)
      const content = contents[index]
      if (content) putCell(cell, content)
      cell.font = font(9, { bold: head })
      cell.border = head ? HEAD_BORDERS : ROW_BORDERS
      cell.alignment = wrapped()
      if (head) cell.fill = WELL_FILL
    })
    at += 1
    return row
  }
  /** Text that runs on over the empty cells to its right. */
  const running = (text: string) => {
    const cell = sheet.getCell(at, 1)
    putCell(cell, { text })
    cell.font = font(9)
    at += 1
  }

  if (options.logo) {
    const { data, type, width, height } = options.logo
    const scale = Math.min(LOGO_WIDTH / width, LOGO_HEIGHT / height)
    const buffer = Buffer.from(data)
    sheet.addImage(workbook.addImage({ buffer: buffer as never, extension: type === 'png' ? 'png' : 'jpeg' }), {
      tl: { col: WIDTHS.length - 1, row: 0 },
      ext: { width: Math.round(width * scale), height: Math.round(height * scale) },
      editAs: 'absolute',
    })
  }
  const title = sheet.getCell(at, 1)
  putCell(title, { text: project.title })
  title.font = font(20, { bold: true })
  sheet.getRow(at).height = 30
  at += 1
  putCell(sheet.getCell(at, 1), { text: 'Equipment schedule: vessels, with the calculation behind every number' })
  sheet.getCell(at, 1).font = font(11, {}, PENCIL)
  at += 1
  if (titleBlock.status !== '') {
    putCell(sheet.getCell(at, 1), { text: titleBlock.status })
    sheet.getCell(at, 1).font = font(10, { bold: true }, OCHRE)
    at += 1
  }

  heading('TITLE BLOCK')
  const sections = Object.entries(project.specSections).map(([kind, section]) => `${section} (${kind})`)
  const codes = Object.entries(project.codes).map(([kind, code]) => `${code} (${kind})`)
  const people = peopleOf(titleBlock)
  const address = titleBlock.lines?.join(' · ') ?? ''
  const fields: (readonly [string, string])[] = [
    ['Project number', project.number],
    ['Client', project.client],
    ['Location', project.location],
    ['Spec sections', sections.join(', ')],
    ['Adopted codes', codes.join(', ')],
    ['Office', titleBlock.office],
    ...(address === '' ? [] : [['Address', address] as const]),
    ...people,
    ['Date of issue', titleBlock.date.slice(0, 10)],
    ['Revision', revisionWords(titleBlock.revision)],
    ['Status', titleBlock.status],
    ['Units', options.units],
    ['Sized with', `Coldfill engine ${result.engine}, spec version ${result.spec}`],
    ...(contentHash === undefined ? [] : [['Content hash', `SHA-256 ${contentHash}`] as [string, string]]),
  ]
  for (const [label, value] of fields) {
    const row = sheet.getRow(at)
    putCell(row.getCell(1), { text: label })
    putCell(row.getCell(2), { text: value })
    row.getCell(1).font = font(9, { bold: true })
    row.getCell(2).font = font(9)
    for (let column = 1; column <= WIDTHS.length; column += 1) row.getCell(column).border = ROW_BORDERS
    at += 1
  }

  heading('REVISIONS')
  tableRow([{ text: 'Rev' }, { text: 'Date' }, { text: 'Purpose' }, { text: 'By' }], true)
  if (revisions.length === 0) tableRow([{ text: '–' }, { text: '' }, { text: 'Not issued yet' }, { text: '' }])
  for (const entry of revisions) {
    const texts = [entry.revision || '–', entry.date.slice(0, 10), entry.purpose, entry.by]
    fitHeight(tableRow(texts.map((text) => ({ text }))), texts, WIDTHS, 9)
  }

  heading('CONTENTS')
  for (const { sheet: target, about } of entries) {
    const row = sheet.getRow(at)
    putCell(row.getCell(1), { text: target, sheet: target })
    putCell(row.getCell(2), { text: about })
    row.getCell(1).font = font(9, { underline: true }, '1F5673')
    row.getCell(2).font = font(9)
    at += 1
  }

  heading('HOW TO READ THIS WORKBOOK')
  running(
    'Input cells are outlined; each key of the spec has one. Change it, and every step and schedule row follows, fluid properties included.',
  )
  running('A changed workbook is no longer the issued document: issue a revision instead.')
  running(gaugeRemark(options.units))
  running('— does not apply; ? an input is missing; no size: no vessel can do it, the note says why.')

  heading('CAUTIONS')
  for (const sentence of cautions) {
    running(sentence)
  }
  sheet.pageSetup.printArea = `A1:D${at}`
}
