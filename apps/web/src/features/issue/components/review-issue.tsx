import type { ContentsChoice, Project } from '@coldfill/contract'
import { useQuery } from '@tanstack/react-query'
import { useState, type FormEvent } from 'react'
import { Failure } from '#components/failure.tsx'
import { Loaded } from '#components/loaded.tsx'
import { Button } from '#components/ui/button.tsx'
import { TextArea } from '#components/ui/field.tsx'
import { SectionHeading } from '#components/ui/heading.tsx'
import { revisionPhrase } from '#lib/words.ts'
import { useAction } from '#lib/use-action.ts'
import { gatesQuery, issueForReview } from '../api/issue.ts'
import { ContentsPicker } from './contents-picker.tsx'
import { GateTable } from './gate-table.tsx'

/** Freezes the working copy as the next revision and sends it to the reviewers. */
export const ReviewIssue = ({ project }: { readonly project: Project }) => {
  const gates = useQuery(gatesQuery(project.number, 'review'))
  const { busy, error, run } = useAction()
  const [note, setNote] = useState('')
  const [contents, setContents] = useState<ContentsChoice>({})
  const { issueForReview: permission } = project.permissions
  const held = gates.data?.filter((gate) => gate.state !== 'pass') ?? []
  const why = permission.allowed
    ? held.length > 0
      ? `On hold: ${held.map((gate) => gate.title).join(', ')}`
      : null
    : (permission.why ?? 'Consultants issue revisions.')

  const onSubmit = async (event: FormEvent) => {
    event.preventDefault()
    if (await run(() => issueForReview(project.number, note, contents))) setNote('')
  }
  return (
    <section className="flex flex-col">
      <SectionHeading note={`It will be ${revisionPhrase(project.nextRevision)}`}>Issue for review</SectionHeading>
      <Loaded query={gates} what="Checking the gates" rows={3}>
        {(list) => <GateTable gates={list} />}
      </Loaded>
      <form onSubmit={(event) => void onSubmit(event)} className="mt-4 flex max-w-2xl flex-col gap-3">
        <Failure error={error} />
        <TextArea
          label="Note"
          hint="What changed and why; it stands in the revision block and in the mail."
          value={note}
          onChange={(event) => setNote(event.target.value)}
          rows={2}
          maxLength={2000}
        />
        <ContentsPicker
          of="files for review"
          contents={contents}
          onChange={setContents}
          hint="Issued files keep what was chosen. Pending redlines and those for the office only are never in them."
        />
        <div>
          <Button type="submit" look="main" busy={busy} why={why} showWhy>
            Issue for review
          </Button>
        </div>
      </form>
    </section>
  )
}
