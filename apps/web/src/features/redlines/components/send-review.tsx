import { OUTCOME_LABELS, revisionTitle, type Outcome, type Redline, type Revision } from '@coldfill/contract'
import { useState, type FormEvent } from 'react'
import { Failure } from '#components/failure.tsx'
import { Band } from '#components/ui/band.tsx'
import { Button } from '#components/ui/button.tsx'
import { TextArea } from '#components/ui/field.tsx'
import { Flag } from '#components/ui/review-marks.tsx'
import { fieldError, isStatus } from '#lib/api-error.ts'
import { plural } from '#lib/format.ts'
import { useAction } from '#lib/use-action.ts'
import { anchorWords } from '../anchor-words.ts'
import { sendReview } from '../api/redlines.ts'

interface Props {
  readonly project: string
  /** The newest revision. The form keeps the one it was opened on until the reviewer turns to the newer. */
  readonly newest: Revision
  readonly pending: readonly Redline[]
  /** Why this person may not set a disposition. */
  readonly why: string | null
  readonly onSent: () => void
}

const says: Readonly<Record<Outcome, string>> = {
  accepted: 'May be issued for construction',
  accepted_noted: 'May be issued; the notes are to be followed',
  revise: 'Changes and a new issue for review are needed',
  rejected: 'Not to be carried on in this form',
  information: 'Seen; no decision',
}
const outcomes: readonly Outcome[] = ['accepted', 'accepted_noted', 'revise', 'rejected', 'information']

/** Publishes what is pending and sets the disposition, in one act. */
export const SendReview = ({ project, newest, pending, why, onSent }: Props) => {
  const { busy, error, run } = useAction()
  const [revision, setRevision] = useState(newest)
  const overtaken = revision.id !== newest.id
  const [outcome, setOutcome] = useState<Outcome | null>(null)
  const [reason, setReason] = useState('')
  const needsReason = outcome === 'revise' || outcome === 'rejected'
  const held =
    why ??
    (overtaken ? `${revisionTitle(newest.label)} was issued meanwhile.` : null) ??
    (outcome === null
      ? 'Choose a disposition.'
      : needsReason && reason.trim() === ''
        ? 'Give the reason: it goes into the mail and on the sheet.'
        : null)

  const onSubmit = async (event: FormEvent) => {
    event.preventDefault()
    if (outcome === null || held) return
    if (await run(() => sendReview(project, revision.label, { outcome, reason, contentHash: revision.contentHash }))) {
      setOutcome(null)
      setReason('')
      onSent()
    }
  }

  return (
    <form aria-label="Send review" onSubmit={(event) => void onSubmit(event)} className="flex flex-col gap-4">
      <p className="font-semibold">{revisionTitle(revision.label)}</p>
      {overtaken ? (
        <Band
          tone="warning"
          live="alert"
          title={`${revisionTitle(newest.label)} was issued meanwhile.`}
          actions={<Button onClick={() => setRevision(newest)}>Review {revisionTitle(newest.label)}</Button>}
        >
          Look at it first. What you wrote is kept.
        </Band>
      ) : null}
      {isStatus(error, 409) ? (
        <Band tone="warning" live="alert" title="The content has changed since you looked at it.">
          Look at it again, then set the disposition. Your pending redlines and your reason are kept.
        </Band>
      ) : (
        <Failure error={error} />
      )}
      <div>
        <p className="mb-1 font-semibold">
          {pending.length === 0
            ? 'No redline is pending'
            : `${plural(pending.length, 'pending redline')} will be published`}
        </p>
        <ul className="text-cell">
          {pending.map((redline) => (
            <li key={redline.number} className="flex gap-2 py-0.5">
              <Flag number={redline.number} state="pending" />
              <span className="min-w-0 truncate">
                <span className="font-semibold">{anchorWords(redline.anchor)}</span> {redline.messages[0]?.text}
              </span>
            </li>
          ))}
        </ul>
      </div>
      <fieldset className="flex flex-col gap-1">
        <legend className="mb-1 font-semibold">Disposition</legend>
        {outcomes.map((choice) => (
          <div key={choice} className="flex min-h-6 items-baseline gap-2">
            <input
              type="radio"
              id={`outcome-${choice}`}
              name="outcome"
              value={choice}
              checked={outcome === choice}
              onChange={() => setOutcome(choice)}
              aria-describedby={`outcome-${choice}-says`}
              className="translate-y-0.5 accent-steel"
            />
            <div>
              <label htmlFor={`outcome-${choice}`} className="font-medium">
                {OUTCOME_LABELS[choice]}
              </label>
              <p id={`outcome-${choice}-says`} className="text-cell text-pencil">
                {says[choice]}
              </p>
            </div>
          </div>
        ))}
      </fieldset>
      <TextArea
        label={needsReason ? 'Reason' : 'Reason or remarks'}
        value={reason}
        onChange={(event) => setReason(event.target.value)}
        required={needsReason}
        error={fieldError(error, '/reason')}
        rows={3}
      />
      <Button type="submit" look="main" busy={busy} why={held} showWhy className="self-start">
        Send review
      </Button>
    </form>
  )
}
