import { OUTCOME_LABELS, revisionSegment, revisionTitle, type Project } from '@coldfill/contract'
import { Link } from 'react-router-dom'
import { Cell, HeadCell, RowHead, RuledTable } from '#components/ui/ruled-table.tsx'
import { RevisionTriangle } from '#components/ui/review-marks.tsx'
import { StateWord } from '#components/ui/state-word.tsx'
import { comparePath, paths, withQuery } from '#config/paths.ts'
import { day } from '#lib/format.ts'

/** The way to what changed since the revision before, which stands below it. */
const WhatChanged = ({ project, place }: { readonly project: Project; readonly place: number }) => {
  const [revision, before] = [project.revisions[place], project.revisions[place + 1]]
  if (!revision || !before) return null
  return (
    <Link
      className="block"
      to={comparePath(project.number, revisionSegment(before.label), revisionSegment(revision.label))}
    >
      Changes since {revisionTitle(before.label)}
    </Link>
  )
}

/** Revision block of a title block: newest first. */
export const RevisionBlock = ({ project }: { readonly project: Project }) => (
  <RuledTable
    caption="Revisions"
    className="min-w-150"
    head={
      <tr>
        <HeadCell>Rev</HeadCell>
        <HeadCell>Date</HeadCell>
        <HeadCell>Note</HeadCell>
        <HeadCell>Status</HeadCell>
        <HeadCell>Prepared</HeadCell>
        <HeadCell>Disposition</HeadCell>
      </tr>
    }
  >
    {project.revisions.map((revision, place) => (
      <tr key={revision.id}>
        <RowHead className="font-mono">
          <Link
            to={withQuery(paths.schedule(project.number), { rev: revisionSegment(revision.label) })}
            className="inline-flex items-center gap-1.5"
          >
            {revision.label === '' ? 'First' : <RevisionTriangle letter={revision.label} />}
          </Link>
        </RowHead>
        <Cell figures={false} className="figures whitespace-nowrap">
          {day(revision.issuedAt)}
        </Cell>
        <Cell className="max-w-[40ch]">
          {revision.note || '—'}
          <WhatChanged project={project} place={place} />
        </Cell>
        <Cell>
          <StateWord state={revision.state} />
        </Cell>
        <Cell>{revision.issuedBy.name}</Cell>
        <Cell>
          {revision.dispositions.length === 0
            ? '—'
            : revision.dispositions.map((disposition) => (
                <span key={disposition.reviewer.id} className="block">
                  {OUTCOME_LABELS[disposition.outcome]}, {disposition.reviewer.initials}
                  {disposition.stale ? ', stale' : ''}
                </span>
              ))}
        </Cell>
      </tr>
    ))}
  </RuledTable>
)
