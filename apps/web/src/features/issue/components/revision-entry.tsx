import { revisionSegment, revisionTitle, type Project, type Revision } from '@coldfill/contract'
import { useState, type FormEvent, type ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { Failure } from '#components/failure.tsx'
import { Button } from '#components/ui/button.tsx'
import { TextArea } from '#components/ui/field.tsx'
import { RevisionTriangle } from '#components/ui/review-marks.tsx'
import { StateWord } from '#components/ui/state-word.tsx'
import { comparePath } from '#config/paths.ts'
import { clock, day } from '#lib/format.ts'
import { useAction } from '#lib/use-action.ts'
import { withdraw } from '../api/issue.ts'
import { FileSet } from './file-set.tsx'
import { MakingBand } from './making-band.tsx'

const Withdraw = ({ project, revision }: { readonly project: Project; readonly revision: Revision }) => {
  const { busy, error, run } = useAction()
  const [open, setOpen] = useState(false)
  const [reason, setReason] = useState('')
  const { withdraw: permission } = project.permissions
  if (revision.state === 'withdrawn' || revision.state === 'superseded') return null
  if (!open) {
    return (
      <Button
        small
        why={permission.allowed ? null : (permission.why ?? 'A consultant or the administrator withdraws a revision.')}
        aria-expanded={false}
        onClick={() => setOpen(true)}
      >
        Withdraw…
      </Button>
    )
  }
  return (
    <form
      className="flex w-full max-w-xl flex-col gap-2"
      onSubmit={(event: FormEvent) => {
        event.preventDefault()
        void run(() => withdraw(project.number, revision.label, reason.trim()))
      }}
    >
      <Failure error={error} />
      <TextArea
        label={`Reason to withdraw ${revisionTitle(revision.label)}`}
        value={reason}
        onChange={(event) => setReason(event.target.value)}
        rows={2}
        maxLength={2000}
      />
      <div className="flex gap-2">
        <Button type="submit" look="main" busy={busy} why={reason.trim() === '' ? 'Give a reason.' : null}>
          Withdraw {revisionTitle(revision.label)}
        </Button>
        <Button onClick={() => setOpen(false)}>Keep it</Button>
      </div>
    </form>
  )
}

/** One revision with its files. Files of the latest making stand first. */
export const RevisionEntry = ({
  project,
  revision,
  children,
}: {
  readonly project: Project
  readonly revision: Revision
  readonly children?: ReactNode
}) => {
  const sets = (['construction', 'review'] as const).flatMap((set) => {
    const files = revision.files.filter((file) => file.set === set)
    return files.length > 0 ? [{ set, files }] : []
  })
  const before = project.revisions[project.revisions.findIndex(({ id }) => id === revision.id) + 1]
  return (
    <article aria-label={revisionTitle(revision.label)} className="mb-8 border-t-[3px] border-ink pt-3">
      <header className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2">
        <h3 className="flex items-center gap-2 text-lead font-semibold">
          {revision.label ? <RevisionTriangle letter={revision.label} /> : null}
          {revisionTitle(revision.label)}
          <span className="text-body font-normal">
            <StateWord state={revision.state} />
          </span>
        </h3>
        <Withdraw project={project} revision={revision} />
      </header>
      <p className="text-pencil">
        Issued for review <span className="figures">{clock(revision.issuedAt)}</span> by {revision.issuedBy.name}
        {revision.constructionIssue ? (
          <>
            {' · '}for construction <span className="figures">{day(revision.constructionIssue.at)}</span> by{' '}
            {revision.constructionIssue.by.name}
          </>
        ) : null}
        {' · '}engine {revision.engine}
        {before ? (
          <>
            {' · '}
            <Link to={comparePath(project.number, revisionSegment(before.label), revisionSegment(revision.label))}>
              changes since {revisionTitle(before.label)}
            </Link>
          </>
        ) : null}
      </p>
      {revision.note ? <p className="mt-1 max-w-[80ch] whitespace-pre-wrap">{revision.note}</p> : null}
      {revision.constructionIssue?.override ? (
        <p className="mt-1">Overridden because: {revision.constructionIssue.override.reason}</p>
      ) : null}
      {revision.withdrawal ? (
        <p className="mt-1">
          Withdrawn {day(revision.withdrawal.at)} by {revision.withdrawal.by.name}: {revision.withdrawal.reason}
        </p>
      ) : null}
      <p className="mt-1 font-mono text-zone break-all text-pencil">Content {revision.contentHash}</p>
      {revision.making ? (
        <div className="mt-2">
          <MakingBand project={project.number} revision={revision} />
        </div>
      ) : null}
      {sets.map(({ set, files }) => (
        <FileSet key={set} set={set} files={files} made={revision.sets.find((made) => made.set === set)} />
      ))}
      {children}
    </article>
  )
}
