import { useEffect, useRef } from 'react'
import { Sheet } from '#components/layouts/sheet.tsx'
import { SectionHeading } from '#components/ui/heading.tsx'
import { ConstructionIssue } from '#features/issue/components/construction-issue.tsx'
import { ReviewIssue } from '#features/issue/components/review-issue.tsx'
import { RevisionEntry } from '#features/issue/components/revision-entry.tsx'
import { useProject } from '#features/projects/api/projects.ts'
import { ReviewCopy } from '#features/review-copy/components/review-copy.tsx'
import { refreshProject } from '#lib/refresh.ts'
import { useProjectNumber } from '#lib/route-params.ts'

export function Component() {
  const number = useProjectNumber()
  const project = useProject(number)
  const newest = project.revisions[0]
  const open =
    newest &&
    newest.state !== 'issued for construction' &&
    newest.state !== 'withdrawn' &&
    newest.state !== 'superseded'
  const consultant = project.roles.includes('consultant')
  // The gates look at the files: ask again once they are made.
  const making = project.revisions.some((revision) => revision.making !== null)
  const before = useRef(making)
  useEffect(() => {
    if (before.current && !making) void refreshProject(number)
    before.current = making
  }, [making, number])
  return (
    <Sheet title="Issue">
      <div className="flex max-w-5xl flex-col gap-10">
        {consultant && open ? <ConstructionIssue key={newest.id} project={project} revision={newest} /> : null}
        {consultant ? <ReviewIssue project={project} /> : null}
        <section>
          <SectionHeading>Revisions</SectionHeading>
          {project.revisions.length === 0 ? (
            <p className="border-t-2 border-ink pt-2 text-pencil">Nothing is issued yet.</p>
          ) : null}
          {project.revisions.map((revision) => (
            <RevisionEntry key={revision.id} project={project} revision={revision}>
              {revision.id === newest?.id && revision.files.length > 0 ? (
                <div className="mt-4">
                  <h4 className="mb-1 font-semibold">Review copy</h4>
                  <ReviewCopy project={number} label={revision.label} />
                </div>
              ) : null}
            </RevisionEntry>
          ))}
        </section>
      </div>
    </Sheet>
  )
}
