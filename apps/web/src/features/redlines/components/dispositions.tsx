import { OUTCOME_LABELS, type Disposition } from '@coldfill/contract'
import { ToneSign } from '#components/ui/state-word.tsx'
import { day } from '#lib/format.ts'
import { outcomeTone, revisionPhrase } from '#lib/words.ts'

const BrokenRing = () => (
  <svg width="14" height="14" viewBox="0 0 14 14" aria-hidden="true" className="keeps-colour inline-block shrink-0">
    <circle cx="7" cy="7" r="5" className="fill-none stroke-ochre" strokeWidth="1.8" strokeDasharray="5 2.5" />
  </svg>
)

/** What reviewers decided, with the reason; one that was set on other content says so. */
export const Dispositions = ({ dispositions }: { readonly dispositions: readonly Disposition[] }) => (
  <ul className="border-t border-hair">
    {dispositions.map((disposition) => (
      <li key={`${disposition.reviewer.id} ${disposition.at}`} className="border-b border-hair py-2">
        <p className="flex flex-wrap items-center gap-x-2">
          <ToneSign tone={outcomeTone(disposition.outcome)} />
          <strong className="font-semibold">{OUTCOME_LABELS[disposition.outcome]}</strong>
          <span>{disposition.reviewer.name}</span>
          <span className="figures text-pencil">{day(disposition.at)}</span>
          {disposition.stale ? (
            <span className="inline-flex items-center gap-1 text-ochre">
              <BrokenRing />
              Stale: set on the content of {revisionPhrase(disposition.revision)}
            </span>
          ) : null}
        </p>
        {disposition.reason ? <p className="mt-1 whitespace-pre-wrap">{disposition.reason}</p> : null}
      </li>
    ))}
  </ul>
)
