import { useQuery } from '@tanstack/react-query'
import { revisionSegment, type Project, type Redline } from '@coldfill/contract'
import { useEffect } from 'react'
import { Sheet } from '#components/layouts/sheet.tsx'
import { Loaded } from '#components/loaded.tsx'
import { SectionHeading } from '#components/ui/heading.tsx'
import { useProject } from '#features/projects/api/projects.ts'
import { redlinesQuery } from '#features/redlines/api/redlines.ts'
import { Dispositions } from '#features/redlines/components/dispositions.tsx'
import { RedlineFilters } from '#features/redlines/components/redline-filters.tsx'
import { RedlineList } from '#features/redlines/components/redline-list.tsx'
import { RedlineThread } from '#features/redlines/components/redline-thread.tsx'
import { SendReview } from '#features/redlines/components/send-review.tsx'
import { isFilter, passes } from '#features/redlines/filters.ts'
import { ReviewCopy } from '#features/review-copy/components/review-copy.tsx'
import { RevisionSwitch } from '#features/results/components/revision-switch.tsx'
import { useProjectNumber } from '#lib/route-params.ts'
import { revisionPhrase } from '#lib/words.ts'
import { useAddress } from '#lib/search-params.ts'

const ReviewMargin = ({
  project,
  redlines,
  onSent,
}: {
  readonly project: Project
  readonly redlines: readonly Redline[]
  readonly onSent: () => void
}) => {
  const { dispose } = project.permissions
  const newest = project.revisions[0]
  if (!newest)
    return <p className="text-pencil">Nothing is issued for review yet, so there is nothing to set a disposition on.</p>
  return (
    <SendReview
      project={project.number}
      newest={newest}
      pending={redlines.filter((redline) => redline.state === 'pending')}
      why={dispose.allowed ? null : (dispose.why ?? 'Reviewers set the disposition.')}
      onSent={onSent}
    />
  )
}

export function Component() {
  const number = useProjectNumber()
  const project = useProject(number)
  const { get, change } = useAddress()
  const rev = get('rev')
  const query = useQuery(redlinesQuery(number, rev))
  const asked = get('filter')
  const filter = isFilter(asked) ? asked : 'open'
  const chosen = Number(get('thread')) || null
  const looked = project.revisions.find((revision) => revisionSegment(revision.label) === rev) ?? project.revisions[0]

  const list = query.data?.filter((redline) => passes(redline, filter)) ?? []
  const thread = query.data?.find((redline) => redline.number === chosen) ?? null
  const first = list[0]?.number
  useEffect(() => {
    if (chosen !== null || first === undefined) return
    if (window.matchMedia('(width >= 1100px)').matches) change({ thread: String(first) }, { replace: true })
  }, [chosen, first, change])

  return (
    <Sheet
      title="Redlines"
      actions={<RevisionSwitch project={project} />}
      {...(project.roles.includes('reviewer')
        ? {
            margin: {
              title: 'Review',
              content: (
                <ReviewMargin
                  project={project}
                  redlines={query.data ?? []}
                  onSent={() => change({ filter: null, thread: null })}
                />
              ),
            },
          }
        : {})}
    >
      <Loaded query={query} what="Loading the redlines">
        {(redlines) => (
          <div className="flex flex-col gap-6">
            {looked && looked.dispositions.length > 0 ? (
              <section>
                <SectionHeading>Disposition of {revisionPhrase(looked.label)}</SectionHeading>
                <Dispositions dispositions={looked.dispositions} />
              </section>
            ) : null}
            <RedlineFilters
              redlines={redlines}
              filter={filter}
              onChoose={(one) => change({ filter: one, thread: null }, { replace: true })}
            />
            {list.length === 0 ? (
              <div className="border-t-[3px] border-ink pt-3">
                <p className="text-read">{filter === 'waiting' ? 'Nothing waits on you.' : 'No redline here.'}</p>
                {project.revisions.length > 1 && (filter === 'closed' || filter === 'all') ? (
                  <p className="mt-1 text-pencil">
                    A closed redline stays with the revisions up to the one it was closed on: choose one under Content.
                  </p>
                ) : null}
                {project.waitingOn.map(({ who, what }) => (
                  <p key={`${who} ${what}`} className="mt-1 text-pencil">
                    Waiting on {who}: {what}
                  </p>
                ))}
              </div>
            ) : (
              <div className="grid gap-x-8 gap-y-6 zones:grid-cols-[minmax(0,20rem)_minmax(0,1fr)]">
                <RedlineList
                  redlines={list}
                  chosen={thread?.number ?? null}
                  onChoose={(one) => change({ thread: String(one) })}
                />
                <div className="border-t-[3px] border-ink pt-3">
                  {thread ? (
                    <RedlineThread key={thread.number} project={number} redline={thread} rev={rev} />
                  ) : (
                    <p className="text-pencil">
                      {chosen === null
                        ? 'Choose a redline to read it.'
                        : `Redline ${chosen} is not among these. A closed one stays with the revisions up to the one it was closed on.`}
                    </p>
                  )}
                </div>
              </div>
            )}
            {looked ? (
              <section>
                <SectionHeading>Review copy</SectionHeading>
                <ReviewCopy key={looked.id} project={number} label={looked.label} />
              </section>
            ) : null}
          </div>
        )}
      </Loaded>
    </Sheet>
  )
}
