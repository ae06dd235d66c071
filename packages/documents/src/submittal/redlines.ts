import { paragraph } from '../docx/paragraph.ts'
import { table } from '../docx/table.ts'
import { anchorWords, messageHead, redlineAsks, stateWords } from '../words/redline-words.ts'
import { sentenceCase } from '@coldfill/presentation'
import type { Section } from './section.ts'

/** What reviewers wrote and what was answered, one row a redline. */
export const redlines: Section = ({ result, options, headings, captions, comments, width }) => {
  const { redlines: entries } = options
  if (entries === undefined) return []
  if (entries.length === 0) return [headings.heading('Redlines and answers', 1), paragraph('No redline was written.')]
  return [
    headings.heading('Redlines and answers', 1),
    captions.next('Redlines and answers'),
    table({
      title: 'Redlines and answers',
      description: 'Number, place, text, answers and state of every redline',
      width,
      strongFirst: true,
      // Redlines on the spec, and those whose place is gone, have no other place in the file than their row here.
      ...(comments
        ? {
            comments: (row, column) => comments.place((_, number) => column === 0 && number === entries[row]?.number),
          }
        : {}),
      columns: [
        { heading: 'No.', width: 6 },
        { heading: 'Where', width: 18 },
        { heading: 'Redline', width: 34 },
        { heading: 'Answers', width: 32 },
        { heading: 'State', width: 10 },
      ],
      rows: entries.map((redline) => {
        const [first, ...answers] = redline.messages
        const asks = redlineAsks(redline)
        return [
          String(redline.number),
          anchorWords(redline.anchor, result),
          [
            ...(first ? [`${messageHead(first)}: ${first.text}`] : []),
            ...(asks ? [`(${sentenceCase(asks)}.)`] : []),
          ].join(' '),
          answers.map((answer) => `${messageHead(answer)}: ${answer.text}`).join(' — '),
          stateWords(redline),
        ]
      }),
    }),
  ]
}
