import type { Range } from '@coldfill/spec'
import { useState, type ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { SeverityMark } from '#components/ui/severity-mark.tsx'
import type { Finding } from '#lib/sized-project.ts'
import type { MarginEntry } from '../margin-lines.ts'
import { FindingRow } from './finding-row.tsx'
import { TrayTabs } from './tray-tabs.tsx'

interface Props {
  /** The text that the findings are about, to show what a fix would change. */
  readonly textOf: () => string
  readonly findings: readonly Finding[]
  readonly reasons: Readonly<Record<string, { readonly why: string }>>
  readonly entries: readonly MarginEntry[]
  readonly stale: boolean
  readonly readOnly: boolean
  /** Zero-based line whose findings are pointed out. */
  readonly line: number | null
  readonly status: ReactNode
  readonly onJump: (range: Range) => void
  readonly onFix: (fix: Finding['fixes'][number]) => void
  readonly onAccept: (finding: Finding, reason: string) => void
}

const counted = (findings: readonly Finding[]) =>
  (['error', 'warning', 'note'] as const).map((severity) => ({
    severity,
    count: findings.filter((finding) => finding.severity === severity && finding.accepted === undefined).length,
  }))

/** Under the editor: findings with why and fix, and the sized results in words. */
export const Tray = ({
  textOf,
  findings,
  reasons,
  entries,
  stale,
  readOnly,
  line,
  status,
  onJump,
  onFix,
  onAccept,
}: Props) => {
  const [tab, setTab] = useState<'findings' | 'results' | null>('findings')
  const tabs = [
    { id: 'findings' as const, label: `Findings ${findings.length}` },
    { id: 'results' as const, label: `Results ${entries.length}` },
  ]
  return (
    <TrayTabs
      label="Findings and results"
      tabs={tabs}
      open={tab}
      onOpen={setTab}
      beside={
        <>
          <p className="flex items-center gap-2 text-cell" aria-live="polite">
            {counted(findings)
              .filter(({ count }) => count > 0)
              .map(({ severity, count }) => (
                <span key={severity} className="inline-flex items-center gap-1">
                  <SeverityMark severity={severity} />
                  <span className="figures">{count}</span>
                </span>
              ))}
          </p>
          <p className="ml-auto py-1 text-cell text-pencil">{status}</p>
        </>
      }
    >
      {tab === 'findings' ? (
        findings.length === 0 ? (
          <p className="px-3 py-2 text-pencil">No finding.</p>
        ) : (
          <ul>
            {findings.map((finding) => (
              <FindingRow
                key={`${finding.code} ${finding.path} ${finding.range.start.line} ${finding.range.start.character} ${finding.message}`}
                textOf={textOf}
                finding={finding}
                why={reasons[finding.code]?.why}
                readOnly={readOnly}
                chosen={finding.range.start.line === line}
                onJump={onJump}
                onFix={onFix}
                onAccept={onAccept}
              />
            ))}
          </ul>
        )
      ) : (
        <ul aria-busy={stale} className={stale ? 'opacity-60' : ''}>
          {entries.map((entry) => (
            <li key={entry.mark} className="flex flex-wrap items-baseline gap-x-4 border-b border-hair px-3 py-1.5">
              <button
                type="button"
                className="w-24 text-left font-mono hover:underline"
                onClick={() =>
                  onJump({ start: { line: entry.line, character: 0 }, end: { line: entry.line, character: 0 } })
                }
              >
                {entry.mark}
              </button>
              <strong className={`figures font-mono font-semibold ${entry.sized ? '' : 'text-fault'}`}>
                {entry.size}
              </strong>
              {entry.was === null ? null : (
                <span className="text-cell text-pencil">
                  <del>{entry.was}</del> in the last issue
                </span>
              )}
              <span className="figures text-cell text-pencil">{entry.details.join(' · ')}</span>
              {entry.trace === null ? null : (
                <Link to={entry.trace} className="text-cell" aria-label={`Trace of ${entry.mark}, as saved`}>
                  Trace
                </Link>
              )}
            </li>
          ))}
        </ul>
      )}
    </TrayTabs>
  )
}
