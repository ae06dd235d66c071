import type { MergeChange } from '@coldfill/spec'
import { useState } from 'react'
import { Button } from '#components/ui/button.tsx'

interface Props {
  readonly conflicts: readonly MergeChange[]
  readonly onJump: (conflict: MergeChange) => void
  readonly onTakeTheirs: (path: string) => boolean
  readonly onKeepMine: (path: string) => void
}

const Value = ({ title, text }: { readonly title: string; readonly text: string | null }) => (
  <span className="min-w-0">
    <span className="text-pencil">{title} </span>
    <code className="font-mono break-words">{text ?? 'nothing'}</code>
  </span>
)

/** Each place that both changed, by path, with both values until one is chosen. */
export const ConflictList = ({ conflicts, onJump, onTakeTheirs, onKeepMine }: Props) => {
  const [refused, setRefused] = useState<string | null>(null)
  if (conflicts.length === 0) return <p className="px-3 py-2 text-pencil">Every place is chosen.</p>
  return (
    <ul>
      {conflicts.map((conflict) => (
        <li
          key={conflict.path}
          className="flex flex-wrap items-baseline gap-x-4 gap-y-1 border-b border-hair px-3 py-1.5"
        >
          <button
            type="button"
            onClick={() => onJump(conflict)}
            className="text-left font-mono font-semibold break-words hover:underline"
          >
            {conflict.path}
          </button>
          <Value title="yours" text={conflict.mine} />
          <Value title="theirs" text={conflict.theirs} />
          <span className="flex gap-2">
            <Button
              small
              onClick={() => {
                if (!onTakeTheirs(conflict.path)) setRefused(conflict.path)
              }}
            >
              Take theirs
            </Button>
            <Button small onClick={() => onKeepMine(conflict.path)}>
              Keep mine
            </Button>
          </span>
          {refused === conflict.path ? (
            <p role="status" className="w-full text-cell text-fault">
              Theirs does not fit into your text by itself. Take it line by line where the texts stand beside each
              other.
            </p>
          ) : null}
        </li>
      ))}
    </ul>
  )
}
