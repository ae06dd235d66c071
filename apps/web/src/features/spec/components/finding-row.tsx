import type { Range } from '@coldfill/spec'
import { memo, useId, useRef, useState, type FormEvent } from 'react'
import { Link } from 'react-router-dom'
import { Button } from '#components/ui/button.tsx'
import { TextField } from '#components/ui/field.tsx'
import { Prose } from '#components/ui/prose.tsx'
import { SeverityMark } from '#components/ui/severity-mark.tsx'
import { paths } from '#config/paths.ts'
import type { Finding } from '#lib/sized-project.ts'
import { FixPreview } from './fix-preview.tsx'

interface Props {
  /** The text that the finding is about, to show what a fix would change. */
  readonly textOf: () => string
  readonly finding: Finding
  /** Why the code matters, from the reference. */
  readonly why: string | undefined
  readonly readOnly: boolean
  readonly chosen: boolean
  readonly onJump: (range: Range) => void
  readonly onFix: (fix: Finding['fixes'][number]) => void
  readonly onAccept: (finding: Finding, reason: string) => void
}

const Accept = ({
  onAccept,
  onCancel,
}: {
  readonly onAccept: (reason: string) => void
  readonly onCancel: () => void
}) => {
  const [reason, setReason] = useState('')
  return (
    <form
      className="flex max-w-xl items-end gap-2 pt-1"
      onSubmit={(event: FormEvent) => {
        event.preventDefault()
        if (reason.trim() !== '') onAccept(reason)
      }}
    >
      <div className="flex-1">
        <TextField
          label="Accepted because"
          value={reason}
          onChange={(event) => setReason(event.target.value)}
          autoFocus
        />
      </div>
      <Button type="submit" why={reason.trim() === '' ? 'The reason is printed with the warning.' : null}>
        Accept
      </Button>
      <Button look="quiet" onClick={onCancel}>
        Cancel
      </Button>
    </form>
  )
}

const Row = ({ textOf, finding, why, readOnly, chosen, onJump, onFix, onAccept }: Props) => {
  const [accepting, setAccepting] = useState(false)
  // A fix is known by its title: each reading of the text makes the fixes anew.
  const [looked, setLooked] = useState<string | null>(null)
  const shown = readOnly ? undefined : finding.fixes.find(({ title }) => title === looked)
  const id = useId()
  const buttons = useRef<HTMLDivElement>(null)
  return (
    <li className={`flex gap-2.5 border-b border-hair px-3 py-1.5 ${chosen ? 'bg-steel-wash' : ''}`}>
      <span className="pt-0.5">
        <SeverityMark severity={finding.severity} />
      </span>
      <div className="min-w-0 flex-1">
        <button type="button" onClick={() => onJump(finding.range)} className="text-left hover:underline">
          <span className="figures mr-2 text-pencil">Line {finding.range.start.line + 1}</span>
          <Prose text={finding.message} />
        </button>
        {finding.accepted === undefined ? (
          <p className="text-cell">
            <Prose text={finding.hint} />
            {why ? (
              <span className="text-pencil">
                {' '}
                <Prose text={why} />
              </span>
            ) : null}
          </p>
        ) : (
          <p className="text-cell text-pencil">Accepted because {finding.accepted}</p>
        )}
        {accepting ? (
          <Accept
            onAccept={(reason) => {
              setAccepting(false)
              onAccept(finding, reason)
            }}
            onCancel={() => setAccepting(false)}
          />
        ) : null}
        {readOnly || accepting || finding.accepted !== undefined ? null : (
          <div ref={buttons} className="flex flex-wrap gap-2 empty:hidden">
            {finding.fixes.map((fix) => (
              <Button
                key={fix.title}
                small
                className="mt-1"
                aria-expanded={shown === fix}
                aria-controls={shown === fix ? id : undefined}
                onClick={() => setLooked(shown === fix ? null : fix.title)}
              >
                <Prose text={fix.title} />
              </Button>
            ))}
            {finding.severity === 'warning' ? (
              <Button small className="mt-1" onClick={() => setAccepting(true)}>
                Accept with a reason…
              </Button>
            ) : null}
          </div>
        )}
        {shown ? (
          <FixPreview
            key={shown.title}
            id={id}
            text={textOf()}
            fix={shown}
            onMake={() => {
              setLooked(null)
              onFix(shown)
            }}
            onCancel={() => {
              setLooked(null)
              buttons.current?.querySelector<HTMLElement>('[aria-expanded=true]')?.focus()
            }}
          />
        ) : null}
      </div>
      <Link
        to={paths.help(finding.code)}
        className="self-start font-mono text-cell"
        aria-label={`${finding.code}: help`}
      >
        {finding.code}
      </Link>
    </li>
  )
}

const sameFinding = (a: Finding, b: Finding): boolean => a === b || JSON.stringify(a) === JSON.stringify(b)

/**
 * A finding in words: what, why, how to mend it, and the way to its place. Each reading of the text finds everything anew; a row
 * is drawn again only where it says something else.
 */
export const FindingRow = memo(
  Row,
  (was, now) =>
    was.why === now.why &&
    was.readOnly === now.readOnly &&
    was.chosen === now.chosen &&
    was.textOf === now.textOf &&
    was.onJump === now.onJump &&
    was.onFix === now.onFix &&
    was.onAccept === now.onAccept &&
    sameFinding(was.finding, now.finding),
)
