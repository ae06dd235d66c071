import { leadIn } from '../docx/paragraph.ts'
import { table } from '../docx/table.ts'
import { FROM_MEMORY, numberedSources } from '../words/source-words.ts'
import type { Section } from './section.ts'

/** Every publication that the calculations and assumptions cite, under the number they cite it by. */
export const sources: Section = ({ result, headings, captions, width }) => {
  const list = [...numberedSources(result).values()]
  if (list.length === 0) return []
  return [
    headings.heading('Sources', 1),
    leadIn(`Where a place is marked "from memory", read: ${FROM_MEMORY}.`),
    captions.next('Sources'),
    table({
      title: 'Sources',
      description: 'Number, publisher, title and edition of every source that is cited',
      width,
      strongFirst: true,
      columns: [
        { heading: 'No.', width: 7 },
        { heading: 'Publisher', width: 20 },
        { heading: 'Title', width: 45 },
        { heading: 'Edition', width: 28 },
      ],
      rows: list.map((source) => [source.number, source.publisher || '—', source.title, source.edition || '—']),
    }),
  ]
}
