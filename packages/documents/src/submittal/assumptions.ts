import { leadIn, paragraph } from '../docx/paragraph.ts'
import { table } from '../docx/table.ts'
import { changedBy } from '../words/assumption-words.ts'
import { citationWords } from '../words/source-words.ts'
import { sentenceCase } from '@coldfill/presentation'
import type { ProjectResult } from '@coldfill/sizing'
import type { DocumentOptions } from '../document-options.ts'
import type { Section } from './section.ts'

const changeWords = (assumption: ProjectResult['assumptions'][number], options: DocumentOptions): string => {
  const by = changedBy(assumption, options)
  return by === '' ? `Set in the spec: ${assumption.reason}` : `Set in the spec by ${by}: ${assumption.reason}`
}

/** The numbered register of every default that the results lean on, and of what replaced one. */
export const assumptions: Section = ({ result, options, headings, captions, comments, width }) => {
  const { assumptions: used } = result
  if (used.length === 0) {
    return [
      headings.heading('Assumptions', 1, true),
      paragraph('Every value is given in the spec; nothing is assumed.'),
    ]
  }
  return [
    headings.heading('Assumptions', 1, true),
    leadIn(
      'Each stands in where the spec is silent, or was changed there with a reason. The numbers are those of the schedules.',
    ),
    captions.next('Assumptions', 'assumptions'),
    table({
      title: 'Assumptions',
      description: 'Number, name, value, source and reason of every assumption, and the vessels that lean on it',
      width,
      strongFirst: true,
      ...(comments
        ? {
            comments: (row, column) =>
              comments.place(
                (anchor) =>
                  column === 0 &&
                  anchor.type === 'assumption' &&
                  [used[row]?.id, used[row]?.number].includes(anchor.assumption),
              ),
          }
        : {}),
      columns: [
        { heading: 'No.', width: 6 },
        { heading: 'Assumption', width: 20 },
        { heading: 'Value', width: 11 },
        { heading: 'Source', width: 24 },
        { heading: 'Why', width: 32 },
        { heading: 'Used by', width: 11 },
      ],
      rows: used.map((assumption) => [
        assumption.number,
        sentenceCase(assumption.name),
        assumption.value === assumption.defaultValue
          ? assumption.value
          : `${assumption.value} (default ${assumption.defaultValue})`,
        citationWords(assumption.source, result),
        assumption.overridden && assumption.reason ? changeWords(assumption, options) : assumption.because,
        assumption.usedBy.join(', '),
      ]),
    }),
  ]
}
