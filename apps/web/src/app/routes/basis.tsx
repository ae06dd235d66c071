import { useQuery } from '@tanstack/react-query'
import { useEffect, useMemo, useState } from 'react'
import { Link } from 'react-router-dom'
import { marginOpen } from '#components/layouts/margin.tsx'
import { Sheet } from '#components/layouts/sheet.tsx'
import { Loaded } from '#components/loaded.tsx'
import { Button } from '#components/ui/button.tsx'
import { SectionHeading } from '#components/ui/heading.tsx'
import { Flag } from '#components/ui/review-marks.tsx'
import { Prose } from '#components/ui/prose.tsx'
import { SeverityMark } from '#components/ui/severity-mark.tsx'
import { paths, withQuery } from '#config/paths.ts'
import { AssumptionRow } from '#features/basis/components/assumption-row.tsx'
import { groupAssumptions } from '#features/basis/group-assumptions.ts'
import { useProject } from '#features/projects/api/projects.ts'
import { redlinesQuery } from '#features/redlines/api/redlines.ts'
import { RedlineComposer } from '#features/redlines/components/redline-composer.tsx'
import { RedlineThread } from '#features/redlines/components/redline-thread.tsx'
import { redlinesByPlace } from '#features/redlines/filters.ts'
import { resultsQuery } from '#features/results/api/results.ts'
import { ContentBand } from '#features/results/components/content-band.tsx'
import { RevisionSwitch } from '#features/results/components/revision-switch.tsx'
import { capital } from '#lib/format.ts'
import { useProjectNumber } from '#lib/route-params.ts'
import { useAddress, useKept } from '#lib/search-params.ts'

export function Component() {
  const number = useProjectNumber()
  const project = useProject(number)
  const { get, change } = useAddress()
  const kept = useKept()
  const rev = get('rev')
  const results = useQuery(resultsQuery(number, rev))
  const redlines = useQuery({ ...redlinesQuery(number, rev), enabled: project.sheets.includes('redlines') })
  const [composing, setComposing] = useState(false)
  const places = useMemo(() => redlinesByPlace(redlines.data ?? []), [redlines.data])
  const chosenId = get('assumption')
  const used = results.data?.result.assumptions ?? []
  const chosen = used.find((assumption) => assumption.id === chosenId) ?? null
  const accepted = (results.data?.result.findings ?? []).filter((finding) => finding.accepted !== undefined)
  const { redline, officeRedline } = project.permissions
  const loaded = results.data !== undefined

  useEffect(() => {
    if (loaded && chosenId) document.getElementById(chosenId)?.scrollIntoView({ block: 'nearest' })
  }, [loaded, chosenId])

  const choose = (id: string) => {
    setComposing(false)
    change({ assumption: id }, { replace: true })
  }

  return (
    <Sheet
      title="Basis"
      actions={<RevisionSwitch project={project} />}
      bands={<ContentBand project={project} shown={results.data} />}
      margin={{
        title: chosen ? `Assumption ${chosen.number}` : 'Assumption',
        content: chosen ? (
          <div className="flex flex-col gap-4">
            {composing ? (
              <RedlineComposer
                project={number}
                anchor={{ type: 'assumption', assumption: chosen.id }}
                quoted={chosen.value}
                permissions={project.permissions}
                onDone={() => setComposing(false)}
              />
            ) : (
              <>
                <div>
                  <p className="font-semibold">{capital(chosen.name)}</p>
                  <p className="mt-1 font-mono text-cell break-words text-pencil">{chosen.id}</p>
                </div>
                {project.sheets.includes('spec') ? (
                  <p className="text-cell">
                    {chosen.overridden ? 'Set at ' : 'Replaced by writing '}
                    <Link
                      className="font-mono break-words"
                      to={withQuery(paths.spec(number), { ...kept, path: chosen.path })}
                    >
                      {chosen.path}
                    </Link>
                  </p>
                ) : null}
                <Button
                  why={redline.allowed || officeRedline.allowed ? null : (redline.why ?? 'Reviewers write redlines.')}
                  showWhy
                  onClick={() => setComposing(true)}
                >
                  {redline.allowed || !officeRedline.allowed ? 'Start a redline' : 'Start a redline for the office'}
                </Button>
              </>
            )}
            {(places.get(`assumption ${chosen.id}`) ?? []).map((one) => (
              <div key={one.number} className="border-t border-hair pt-3">
                <RedlineThread project={number} redline={one} rev={rev} showPlace={false} />
              </div>
            ))}
          </div>
        ) : (
          <p className="text-pencil">Choose an assumption to read its redlines or to start one.</p>
        ),
      }}
    >
      <Loaded query={results} what="Loading the basis">
        {({ result, assumptionChanges }) => (
          <div className="flex max-w-5xl flex-col gap-8">
            <p className="text-read">
              Every value that the spec leaves open, with its source and its reason. A value written in the spec takes
              the place of its assumption.
            </p>
            {used.length === 0 ? (
              <p className="border-t-[3px] border-ink pt-3">Uses no assumption: every value is written in the spec.</p>
            ) : null}
            {groupAssumptions(used).map((group) => (
              <section key={group.title}>
                <SectionHeading>{group.title}</SectionHeading>
                <ul className="border-t-2 border-ink">
                  {group.assumptions.map((assumption) => (
                    <AssumptionRow
                      key={assumption.id}
                      assumption={assumption}
                      sources={result.sources}
                      change={assumptionChanges.find((change) => change.assumption === assumption.id)}
                      chosen={assumption.id === chosenId}
                      onChoose={() => {
                        choose(assumption.id)
                        marginOpen.set(true)
                      }}
                      flags={(places.get(`assumption ${assumption.id}`) ?? []).map((one) => (
                        <Flag key={one.number} number={one.number} state={one.state} />
                      ))}
                    />
                  ))}
                </ul>
              </section>
            ))}
            <section>
              <SectionHeading>Accepted warnings</SectionHeading>
              {accepted.length === 0 ? (
                <p className="border-t-2 border-ink pt-2 text-pencil">None.</p>
              ) : (
                <ul className="border-t-2 border-ink">
                  {accepted.map((finding) => (
                    <li key={`${finding.code} ${finding.path}`} className="flex gap-3 border-b border-hair py-2.5">
                      <SeverityMark severity={finding.severity} />
                      <div className="min-w-0">
                        <p>
                          <Link to={paths.help(finding.code)} className="font-mono">
                            {finding.code}
                          </Link>{' '}
                          <Prose text={finding.message} />
                        </p>
                        <p className="text-read">
                          <span className="text-pencil">Accepted because</span> {finding.accepted}
                        </p>
                        <p className="font-mono text-cell break-words text-pencil">{finding.path}</p>
                      </div>
                    </li>
                  ))}
                </ul>
              )}
            </section>
          </div>
        )}
      </Loaded>
    </Sheet>
  )
}
