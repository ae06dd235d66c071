import { numberText } from '@coldfill/presentation'
import { leadIn } from '../docx/paragraph.ts'
import { table } from '../docx/table.ts'
import type { Section } from './section.ts'

/** Deviations below this are the noise of floating point. */
const NOISE = 1e-9

const percent = (deviation: number | null): string => {
  if (deviation === null) return '—'
  if (Math.abs(deviation) < NOISE) return '0 %'
  return `${deviation > 0 ? '+' : ''}${numberText(Number((deviation * 100).toPrecision(2)))} %`
}

/** Published cases and worked examples as this engine computes them, beside the figures of their sources. */
export const verification: Section = ({ result, options, headings, captions, width }) => {
  const { verification: rows } = options
  if (rows === undefined || rows.length === 0) return []
  const { verifiedWith = result.engine } = options
  const ranBy =
    verifiedWith === result.engine
      ? `the engine of this submittal (${result.engine})`
      : `engine ${verifiedWith}; this submittal was sized by engine ${result.engine}`
  return [
    headings.heading('Verification', 1),
    leadIn(`Cases with a known answer, run by ${ranBy}. Deviation is computed over expected less one.`),
    captions.next('Verification'),
    table({
      title: 'Verification',
      description:
        'Case, source, figure, expected and computed value and deviation of every case of the verification manual',
      width,
      size: 'schedule',
      columns: [
        { heading: 'Case', width: 26 },
        { heading: 'Source', width: 42 },
        { heading: 'Figure', width: 16 },
        { heading: 'Expected', width: 12, align: 'right' },
        { heading: 'Computed', width: 12, align: 'right' },
        { heading: 'Deviation', width: 10, align: 'right' },
      ],
      rows: rows.map((row) => [
        row.title,
        row.source,
        row.what,
        row.shown.expected,
        row.shown.computed,
        percent(row.deviation),
      ]),
    }),
  ]
}
