import { changedLines } from '@coldfill/spec'
import { useMemo } from 'react'
import { Button } from '#components/ui/button.tsx'
import type { Finding } from '#lib/sized-project.ts'

interface Props {
  readonly id: string
  readonly text: string
  readonly fix: Finding['fixes'][number]
  readonly onMake: () => void
  readonly onCancel: () => void
}

const MOST_SHOWN = 12

/** The lines that a fix takes out and puts in, and then makes. */
export const FixPreview = ({ id, text, fix, onMake, onCancel }: Props) => {
  const lines = useMemo(
    () =>
      changedLines(text, fix.edits).flatMap(({ line, was, now }) => [
        ...was.map((each, at) => ({ sign: '−', number: line + 1 + at, text: each, tone: 'bg-fault-wash' })),
        ...now.map((each, at) => ({ sign: '+', number: line + 1 + at, text: each, tone: 'bg-verdigris-wash' })),
      ]),
    [text, fix],
  )
  // What all lines are indented by says nothing here.
  const inset = Math.min(...lines.map((line) => (line.text.trim() === '' ? Infinity : line.text.search(/\S/u))))
  const rest = lines.length - MOST_SHOWN
  return (
    <div
      id={id}
      className="mt-1.5 max-w-3xl"
      role="group"
      aria-label={`What would change: ${fix.title}`}
      onKeyDown={(event) => {
        if (event.key !== 'Escape') return
        event.preventDefault()
        onCancel()
      }}
    >
      <ol className="border border-hair font-mono text-[12.5px] leading-[18px]">
        {lines.slice(0, MOST_SHOWN).map((line) => (
          <li key={`${line.sign} ${line.number}`} className={`flex gap-2 px-1 ${line.tone}`}>
            <span className="figures w-8 shrink-0 text-right text-pencil select-none">{line.number}</span>
            <span className="select-none" aria-hidden="true">
              {line.sign}
            </span>
            <span className="sr-only">{line.sign === '−' ? 'was' : 'now'}</span>
            <span className="min-w-0 break-words whitespace-pre-wrap">
              {Number.isFinite(inset) ? line.text.slice(inset) : line.text}
            </span>
          </li>
        ))}
        {rest > 0 ? <li className="px-1 text-pencil">and {rest} more lines</li> : null}
      </ol>
      <div className="mt-1.5 flex gap-2">
        <Button small look="main" autoFocus onClick={onMake}>
          Make the change
        </Button>
        <Button small look="quiet" onClick={onCancel}>
          Cancel
        </Button>
      </div>
    </div>
  )
}
