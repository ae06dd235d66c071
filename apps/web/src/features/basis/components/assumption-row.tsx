import type { ProjectResult, Results } from '@coldfill/contract'
import type { ReactNode } from 'react'
import { WasNow } from '#components/ui/review-marks.tsx'
import { capital, day } from '#lib/format.ts'
import { citationWords, type UsedAssumption } from '#lib/sized-project.ts'

interface Props {
  readonly assumption: UsedAssumption
  readonly sources: ProjectResult['sources']
  /** Who put a value in its place, where that is known. */
  readonly change: Results['assumptionChanges'][number] | undefined
  readonly chosen: boolean
  readonly onChoose: () => void
  readonly flags: ReactNode
}

/** One assumption, to be argued with: value, source, reason, and whom it touches. */
export const AssumptionRow = ({ assumption, sources, change, chosen, onChoose, flags }: Props) => (
  <li
    id={assumption.id}
    className={`grid scroll-mt-4 gap-x-4 border-b border-hair py-2.5 desk:grid-cols-[2.5rem_minmax(0,1fr)_9rem] ${chosen ? 'bg-steel-wash' : ''}`}
  >
    <span className="font-mono font-semibold">{assumption.number}</span>
    <div className="min-w-0">
      <button
        type="button"
        onClick={onChoose}
        aria-pressed={chosen}
        className="text-left font-semibold hover:text-steel hover:underline"
      >
        {capital(assumption.name)}
      </button>
      {flags ? <span className="ml-2 inline-flex gap-1">{flags}</span> : null}
      <p className="max-w-[80ch] text-read">
        {assumption.overridden && assumption.reason ? assumption.reason : assumption.because}
      </p>
      {change ? (
        <p className="text-cell text-pencil">
          Set by {change.by}, <span className="figures">{day(change.at)}</span>
        </p>
      ) : null}
      <p className="text-cell text-pencil">{citationWords(assumption.source, sources)}</p>
      <p className="text-cell text-pencil">
        Used by <span className="font-mono">{assumption.usedBy.join(', ') || 'no vessel'}</span>
      </p>
    </div>
    <p className="figures font-mono desk:text-right">
      {assumption.overridden && assumption.value !== assumption.defaultValue ? (
        <WasNow was={assumption.defaultValue} now={assumption.value} />
      ) : (
        assumption.value
      )}
      <span className="block font-sans text-cell text-pencil">
        {assumption.overridden ? 'set by the project' : 'documented default'}
      </span>
    </p>
  </li>
)
