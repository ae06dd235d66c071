import type { Gate } from '@coldfill/contract'
import { Link } from 'react-router-dom'
import { ToneSign } from '#components/ui/state-word.tsx'

const words: Record<Gate['state'], string> = { pass: 'Pass', hold: 'Hold', overridable: 'Hold, may be overridden' }

/** What must hold before an issue, each with the place where it is settled. */
export const GateTable = ({ gates }: { readonly gates: readonly Gate[] }) => (
  <ul aria-label="Gate list" className="border-t-2 border-ink">
    {gates.map((gate) => (
      <li key={gate.id} className="grid gap-x-4 border-b border-hair py-2 desk:grid-cols-[11rem_minmax(0,1fr)_auto]">
        <span
          className={`inline-flex items-center gap-1.5 self-start font-medium ${gate.state === 'pass' ? 'text-verdigris' : 'text-ochre'}`}
        >
          {gate.state === 'pass' ? (
            <ToneSign tone="good" />
          ) : (
            <svg width="14" height="14" viewBox="0 0 14 14" aria-hidden="true" className="keeps-colour shrink-0">
              <path d="M2 7h10" className="stroke-ochre" strokeWidth="2.5" />
            </svg>
          )}
          {words[gate.state]}
        </span>
        <span>
          <span className="font-semibold">{gate.title}</span>
          {gate.detail ? <span className="block text-pencil">{gate.detail}</span> : null}
        </span>
        {gate.link && gate.state !== 'pass' ? <Link to={gate.link}>Settle it</Link> : null}
      </li>
    ))}
  </ul>
)
