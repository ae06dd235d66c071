import { paragraph } from '../docx/paragraph.ts'
import { table } from '../docx/table.ts'
import { pathWords } from '../words/path-words.ts'
import { findingWords, sentenceCase } from '@coldfill/presentation'
import type { ProjectResult } from '@coldfill/sizing'
import type { Section } from './section.ts'

/** Open findings, and warnings that a person accepted with a reason. */
export const findings: Section = ({ result, options, headings, captions, width }) => {
  const accepted = result.findings.filter((finding) => finding.accepted !== undefined)
  const open = result.findings.filter((finding) => finding.accepted === undefined)
  const columns = [
    { heading: 'Code', width: 11 },
    { heading: 'Severity', width: 10 },
    { heading: 'Where', width: 23 },
    { heading: 'Finding', width: 32 },
  ]
  const message = (finding: ProjectResult['findings'][number]) => findingWords(finding, options.units).message
  const hint = (finding: ProjectResult['findings'][number]) => findingWords(finding, options.units).hint
  return [
    headings.heading('Findings', 1),
    ...(open.length === 0
      ? [paragraph('No check found anything that is not accepted below.')]
      : [
          captions.next('Findings'),
          table({
            title: 'Findings',
            description: 'Code, severity, place, message and way out of every open finding',
            width,
            strongFirst: true,
            columns: [...columns, { heading: 'What to do', width: 24 }],
            rows: open.map((f) => [f.code, sentenceCase(f.severity), pathWords(f.path), message(f), hint(f)]),
          }),
        ]),
    ...(accepted.length === 0
      ? []
      : [
          headings.heading('Accepted warnings', 2),
          captions.next('Accepted warnings'),
          table({
            title: 'Accepted warnings',
            description: 'Code, place, message and the reason for which a person accepted the warning',
            width,
            strongFirst: true,
            columns: [...columns, { heading: 'Accepted because', width: 24 }],
            rows: accepted.map((f) => [
              f.code,
              sentenceCase(f.severity),
              pathWords(f.path),
              message(f),
              f.accepted ?? '',
            ]),
          }),
        ]),
  ]
}
