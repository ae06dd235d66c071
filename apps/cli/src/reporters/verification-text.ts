import type { VerificationRow } from '@coldfill/engine'
import { textTable } from './text-table.ts'

const percent = (ratio: number | null): string => (ratio === null ? '' : `${(ratio * 100).toFixed(2)} %`)

const columns = [
  { heading: 'Case', align: 'left' },
  { heading: 'What', align: 'left' },
  { heading: 'Expected', align: 'right' },
  { heading: 'Computed', align: 'right' },
  { heading: 'Deviation', align: 'right' },
  { heading: 'Tolerance', align: 'right' },
  { heading: 'Origin', align: 'left' },
  { heading: 'Verdict', align: 'left' },
] as const

const cells = (row: VerificationRow): readonly string[] => [
  row.id,
  row.what,
  row.shown.expected,
  row.shown.computed,
  percent(row.deviation),
  row.expected === null ? '' : percent(row.tolerance),
  row.origin,
  row.verdict,
]

/** Rows by the publication they come from, in order of first appearance. */
const bySource = (rows: readonly VerificationRow[]): ReadonlyMap<string, readonly VerificationRow[]> => {
  const groups = new Map<string, VerificationRow[]>()
  for (const row of rows) groups.set(row.source, [...(groups.get(row.source) ?? []), row])
  return groups
}

const group = (source: string, rows: readonly VerificationRow[]): string => {
  const reasons = new Map(rows.flatMap(({ id, reason }) => (reason === undefined ? [] : [[reason, id] as const])))
  return [
    source,
    textTable(columns, rows.map(cells)),
    ...[...reasons].map(([reason, id]) => `Known wrong, ${id.replace(/\.\d$/u, '')}: ${reason}`),
  ].join('\n')
}

const titles = { 'published cases': 'Published cases', 'worked examples': 'Worked examples of the methods' } as const

/** The verification manual for a terminal: one table a publication. */
export const verificationText = (
  rows: readonly VerificationRow[],
  notRun: readonly { readonly id: string; readonly title: string; readonly reason: string }[],
): string =>
  [
    ...(['published cases', 'worked examples'] as const).flatMap((part) => [
      titles[part].toUpperCase(),
      ...[...bySource(rows.filter((row) => row.part === part))].map(([source, own]) => group(source, own)),
    ]),
    ['NOT RUN', ...notRun.map(({ id, title, reason }) => `${id}: ${title}. ${reason}`)].join('\n'),
    (['holds', 'known wrong', 'fails'] as const)
      .map((verdict) => `${rows.filter((row) => row.verdict === verdict).length} ${verdict}`)
      .join(', '),
  ].join('\n\n')
