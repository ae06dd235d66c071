import { leadIn, paragraph } from '../docx/paragraph.ts'
import { table } from '../docx/table.ts'
import { changedWords, changeInPercent, comparisonTitle } from '../words/change-words.ts'
import type { Section } from './section.ts'

/** What differs from the issue before this one, where there is one. */
export const comparison: Section = ({ options, headings, captions, width }) => {
  const { comparison: compared, units } = options
  if (compared === undefined) return []
  const title = comparisonTitle(compared.revision)
  if (compared.changed.length === 0) {
    return [headings.heading(title, 1), paragraph('No result of any vessel differs.')]
  }
  return [
    headings.heading(title, 1),
    leadIn('Every result of a vessel that differs. What is not listed has not changed.'),
    captions.next(title, 'comparison'),
    table({
      title,
      description:
        'Mark, result, value in the earlier issue, value now and change in per cent of every result that differs',
      width,
      strongFirst: true,
      columns: [
        { heading: 'Mark', width: 14 },
        { heading: 'System', width: 12 },
        { heading: 'Result', width: 28 },
        { heading: 'Was', width: 18, align: 'right' },
        { heading: 'Now', width: 18, align: 'right' },
        { heading: 'Change', width: 10, align: 'right' },
      ],
      rows: compared.changed.map((entry) => [
        entry.mark,
        entry.system,
        entry.name,
        changedWords(entry.was, entry.kind, units),
        changedWords(entry.now, entry.kind, units),
        changeInPercent(entry),
      ]),
    }),
  ]
}
