import { numberedNote, paragraph } from '../docx/paragraph.ts'
import { STYLE } from '../docx/styles.ts'
import { table } from '../docx/table.ts'
import { headerText, scheduleKinds, scheduleTable } from '../schedules/schedule-table.ts'
import { gaugeRemark } from '../words/pressure-words.ts'
import type { Section } from './section.ts'

/** One schedule a kind of vessel, with its keyed notes under it. Stands in a landscape section. */
export const schedules: Section = ({ result, options, headings, captions, width }) => [
  headings.heading('Schedules', 1),
  ...scheduleKinds(result).flatMap((kind) => {
    const schedule = scheduleTable(result, kind, options.units)
    const section = result.project.specSections[kind]
    return [
      headings.heading(schedule.title, 2),
      paragraph([...(section ? [`Spec section ${section}.`] : []), schedule.purpose].join(' ')),
      captions.next(`${schedule.title} schedule`),
      table({
        title: `${schedule.title} schedule`,
        description: schedule.purpose,
        width,
        size: 'schedule',
        strongFirst: true,
        columns: schedule.columns.map((column) => ({
          heading: headerText(column),
          width: column.width,
          align: column.align,
        })),
        rows: schedule.rows.map((row) => schedule.columns.map((column) => row.cells[column.key]?.text ?? '')),
      }),
      paragraph(`${gaugeRemark(options.units)} — does not apply; ? an input is missing.`, STYLE.remark),
      ...schedule.notes.map(({ number, text }) => numberedNote(`${number}`, text)),
    ]
  }),
]
