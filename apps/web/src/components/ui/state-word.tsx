import type { ProjectState, RevisionState } from '@coldfill/contract'
import { stateTone, stateWord } from '#lib/words.ts'

const signs = {
  good: <path d="m2.5 7.5 3 3 6-7" className="fill-none stroke-verdigris" strokeWidth="2" />,
  held: <path d="M7 2v6M7 10.2v1.8" className="fill-none stroke-redline" strokeWidth="2.2" />,
  plain: <circle cx="7" cy="7" r="4.5" className="fill-none stroke-rule" strokeWidth="1.6" />,
}
const inks = { good: 'text-verdigris', held: 'text-redline', plain: 'text-ink' }

export const ToneSign = ({ tone }: { readonly tone: 'good' | 'held' | 'plain' }) => (
  <svg width="14" height="14" viewBox="0 0 14 14" aria-hidden="true" className="keeps-colour inline-block shrink-0">
    {signs[tone]}
  </svg>
)

/** Where a project or revision stands: a sign and its word. */
export const StateWord = ({ state }: { readonly state: ProjectState | RevisionState }) => {
  const tone = stateTone(state)
  return (
    <span className={`inline-flex items-center gap-1.5 font-medium whitespace-nowrap ${inks[tone]}`}>
      <ToneSign tone={tone} />
      {stateWord(state)}
    </span>
  )
}
