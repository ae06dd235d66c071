import type { ContentsChoice, Project, Revision } from '@coldfill/contract'
import { useQuery } from '@tanstack/react-query'
import { useState, type FormEvent } from 'react'
import { Failure } from '#components/failure.tsx'
import { Loaded } from '#components/loaded.tsx'
import { Button } from '#components/ui/button.tsx'
import { TextArea } from '#components/ui/field.tsx'
import { SectionHeading } from '#components/ui/heading.tsx'
import { revisionPhrase } from '#lib/words.ts'
import { useAction } from '#lib/use-action.ts'
import { gatesQuery, issueForConstruction } from '../api/issue.ts'
import { ContentsPicker } from './contents-picker.tsx'
import { GateTable } from './gate-table.tsx'

/** Hands the newest revision to the contractor, once every gate is clear or overridden with a reason. */
export const ConstructionIssue = ({
  project,
  revision,
}: {
  readonly project: Project
  readonly revision: Revision
}) => {
  const gates = useQuery(gatesQuery(project.number, 'construction'))
  const { busy, error, run } = useAction()
  const [reason, setReason] = useState('')
  const reviewed = revision.sets.find(({ set }) => set === 'review')?.contents
  const [chosen, setChosen] = useState<ContentsChoice | null>(null)
  const contents = chosen ?? reviewed ?? {}
  const { issueForConstruction: permission } = project.permissions
  const held = gates.data?.filter((gate) => gate.state === 'hold') ?? []
  const overridable = gates.data?.filter((gate) => gate.state === 'overridable') ?? []
  const why = permission.allowed
    ? held.length > 0
      ? `On hold: ${held.map((gate) => gate.title).join(', ')}`
      : overridable.length > 0 && reason.trim() === ''
        ? 'Settle what is on hold, or give a reason to override it.'
        : null
    : (permission.why ?? 'Consultants issue revisions.')

  const onSubmit = async (event: FormEvent) => {
    event.preventDefault()
    if (
      await run(() =>
        issueForConstruction(project.number, revision.label, overridable.length > 0 ? reason.trim() : null, contents),
      )
    )
      setReason('')
  }
  return (
    <section className="flex flex-col">
      <SectionHeading note={`Of ${revisionPhrase(revision.label)}, as it was reviewed`}>
        Issue for construction
      </SectionHeading>
      <Loaded query={gates} what="Checking the gates" rows={4}>
        {(list) => <GateTable gates={list} />}
      </Loaded>
      <form onSubmit={(event) => void onSubmit(event)} className="mt-4 flex max-w-2xl flex-col gap-3">
        <Failure error={error} />
        {overridable.length > 0 ? (
          <TextArea
            label="Reason to override"
            hint="It is recorded, and printed with the issue."
            value={reason}
            onChange={(event) => setReason(event.target.value)}
            rows={2}
            maxLength={2000}
          />
        ) : null}
        <ContentsPicker
          of="files for construction"
          contents={contents}
          onChange={setChosen}
          hint="As in the files that were reviewed, until you choose otherwise. The contractor reads all that stands in them."
        />
        <div>
          <Button type="submit" look="main" busy={busy} why={why} showWhy>
            Issue for construction
          </Button>
        </div>
      </form>
    </section>
  )
}
