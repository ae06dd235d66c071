import type { FileChild } from 'docx'
import { numberedNote, leadIn, paragraph } from '../docx/paragraph.ts'
import { STYLE } from '../docx/styles.ts'
import { stackedParts } from '../docx/stacked-tables.ts'
import type { ReviewComments } from '../docx/review-comments.ts'
import { table } from '../docx/table.ts'
import { headerText, scheduleKinds, scheduleTable, type ScheduleTable } from '@coldfill/presentation'
import { gaugeRemark } from '../words/pressure-words.ts'
import type { Section, SubmittalContext } from './section.ts'

/** The key by which words refer to the schedule of a kind. */
export const scheduleKey = (kind: string): string => `schedule of ${kind}`

/** Redlines on a cell: those of the cell itself, and at the mark those of the row and of results that have no column. */
const commentsOn = (schedule: ScheduleTable, comments: ReviewComments, row: number, place: number): number[] => {
  const [mark, column] = [schedule.rows[row]?.mark, schedule.columns[place]?.key]
  const isColumn = (key: string) => schedule.columns.some((each) => each.key === key)
  return comments.place((anchor) => {
    if (anchor.type === 'row') return anchor.mark === mark && column === 'mark'
    if (anchor.type !== 'cell' || anchor.mark !== mark) return false
    return anchor.column === column || (column === 'mark' && !isColumn(anchor.column))
  })
}

/** The longest name of a method that is not broken in its column, in characters. */
const WHOLE_METHOD = 12

/** Words of a cell as the page has them: `EN 12828` stays on one line. */
const cellWords = (key: string, text: string): string =>
  key === 'method' && text.length <= WHOLE_METHOD ? text.replaceAll(' ', '\u00A0') : text

/** The schedule as one table, or where the page is too narrow for it as tables under each other that repeat the mark. */
const scheduleTables = (
  schedule: ScheduleTable,
  { captions, comments, width }: Pick<SubmittalContext, 'captions' | 'comments' | 'width'>,
): FileChild[] => {
  const columns = schedule.columns.map((column) => ({
    heading: headerText(column),
    width: column.width,
    align: column.align,
  }))
  const rows = schedule.rows.map((row) =>
    schedule.columns.map((column) => cellWords(column.key, row.cells[column.key]?.text ?? '')),
  )
  const chosen = schedule.columns.findIndex((column) => column.part === 'selection')
  const parts = stackedParts(columns, rows, width, chosen > 0 ? [chosen] : [])
  return parts.flatMap((part, index) => {
    const which = parts.length > 1 ? `, part ${index + 1} of ${parts.length}` : ''
    return [
      captions.next(`${schedule.title} schedule${which}`, index === 0 ? scheduleKey(schedule.kind) : undefined),
      table({
        title: `${schedule.title} schedule${which}`,
        description: schedule.purpose,
        width,
        size: part.size,
        strongFirst: true,
        ...(comments
          ? { comments: (row, place) => commentsOn(schedule, comments, row, part.columns[place] ?? 0) }
          : {}),
        columns: part.columns.flatMap((place) => columns[place] ?? []),
        rows: rows.map((row) => part.columns.map((place) => row[place] ?? '')),
      }),
    ]
  })
}

/** One schedule a kind of vessel, with its keyed notes under it. Stands in a landscape section. */
export const schedules: Section = (context) => [
  context.headings.heading('Schedules', 1),
  ...scheduleKinds(context.result).flatMap((kind) => {
    const { result, options, headings } = context
    const schedule = scheduleTable(result, kind, options.units)
    const section = result.project.specSections[kind]
    return [
      headings.heading(schedule.title, 2),
      leadIn([...(section ? [`Spec section ${section}.`] : []), schedule.purpose].join(' ')),
      ...scheduleTables(schedule, context),
      paragraph(`${gaugeRemark(options.units)} — does not apply; ? an input is missing.`, STYLE.remark),
      ...schedule.notes.map(({ number, text }) => numberedNote(`${number}`, text)),
    ]
  }),
]
