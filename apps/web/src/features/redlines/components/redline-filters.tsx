import type { Redline } from '@coldfill/contract'
import { FILTERS, filterLabels, passes, type Filter } from '../filters.ts'

interface Props {
  readonly redlines: readonly Redline[]
  readonly filter: Filter
  readonly onChoose: (filter: Filter) => void
}

export const RedlineFilters = ({ redlines, filter, onChoose }: Props) => (
  <div className="flex flex-wrap gap-1.5" role="group" aria-label="Show">
    {FILTERS.map((one) => (
      <button
        key={one}
        type="button"
        aria-pressed={filter === one}
        onClick={() => onChoose(one)}
        className={`h-7 border-[1.5px] px-2.5 text-cell font-medium ${filter === one ? 'border-ink bg-ink text-sheet' : 'border-rule hover:border-ink'}`}
      >
        {filterLabels[one]} <span className="figures">{redlines.filter((redline) => passes(redline, one)).length}</span>
      </button>
    ))}
  </div>
)
