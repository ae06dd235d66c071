import { Link } from 'react-router-dom'
import { Cell, HeadCell, RowHead, RuledTable } from '#components/ui/ruled-table.tsx'
import { capital } from '#lib/format.ts'
import type { ResultChange } from '../result-changes.ts'

interface Props {
  readonly changes: readonly ResultChange[]
  readonly was: string
  readonly now: string
  /** Place of a vessel: its trace. */
  readonly traceOf?: (system: string, mark: string) => string | null
}

const partWords = (part: number | null): string => {
  if (part === null) return ''
  const percent = Math.abs(part * 100)
  const digits = percent < 1 ? 2 : percent < 10 ? 1 : 0
  return `${part < 0 ? '−' : '+'}${percent.toFixed(digits)} %`
}

/** Which results moved, and by how much; the largest change first. */
export const ResultChangesTable = ({ changes, was, now, traceOf }: Props) =>
  changes.length === 0 ? (
    <p className="py-2">Every result is the same.</p>
  ) : (
    <RuledTable
      caption={`Results that differ between ${was} and ${now}, the largest change first`}
      head={
        <tr>
          <HeadCell>Vessel</HeadCell>
          <HeadCell>Result</HeadCell>
          <HeadCell figures>{was}</HeadCell>
          <HeadCell figures>{now}</HeadCell>
          <HeadCell figures>Moved by</HeadCell>
        </tr>
      }
    >
      {changes.map((change) => {
        const nowrap = change.moved === null ? '' : 'whitespace-nowrap'
        const to = traceOf?.(change.system, change.mark) ?? null
        return (
          <tr key={`${change.system}/${change.mark} ${change.key}`}>
            <RowHead className="font-mono whitespace-nowrap">
              {to === null ? change.mark : <Link to={to}>{change.mark}</Link>}
              <span className="ml-2 font-sans font-normal text-pencil">{change.system}</span>
            </RowHead>
            <Cell>{capital(change.name)}</Cell>
            <Cell figures className={nowrap}>
              {change.was ?? '–'}
            </Cell>
            <Cell figures className={nowrap}>
              <strong className="font-semibold">{change.now ?? '–'}</strong>
            </Cell>
            <Cell figures className="whitespace-nowrap">
              {change.moved}
              {change.part === null ? null : <span className="ml-2 text-pencil">{partWords(change.part)}</span>}
            </Cell>
          </tr>
        )
      })}
    </RuledTable>
  )
