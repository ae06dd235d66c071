import { revisionSegment, revisionTitle, type Project } from '@coldfill/contract'
import type { UnitSystem } from '@coldfill/units'
import { useQuery } from '@tanstack/react-query'
import { useMemo, useRef, useState } from 'react'
import { Link } from 'react-router-dom'
import { Sheet } from '#components/layouts/sheet.tsx'
import { Loaded } from '#components/loaded.tsx'
import { SectionHeading } from '#components/ui/heading.tsx'
import { paths, withQuery } from '#config/paths.ts'
import { useProject } from '#features/projects/api/projects.ts'
import { resultsQuery } from '#features/results/api/results.ts'
import { ResultChangesTable } from '#features/results/components/result-changes-table.tsx'
import { UnitsSwitch } from '#features/results/components/units-switch.tsx'
import { resultChanges } from '#features/results/result-changes.ts'
import { specQuery } from '#features/spec/api/spec.ts'
import { CompareBar } from '#features/spec/components/compare-bar.tsx'
import { CompareEditor, type CompareEditorHandle } from '#features/spec/components/compare-editor.tsx'
import type { ComparePlace } from '#features/spec/editor/compare-view.ts'
import { plural } from '#lib/format.ts'
import { useProjectNumber } from '#lib/route-params.ts'
import { useAddress, useUnits } from '#lib/search-params.ts'
import { stateWord } from '#lib/words.ts'

/** The working copy, in the choices and never in an address. */
const WORKING = ''

interface Content {
  /** Part of the address; empty for the working copy. */
  readonly segment: string
  readonly title: string
  readonly state: string
}

const rev = ({ segment }: Content): string | null => (segment === WORKING ? null : segment)

/** Everything that may be compared, newest first. */
const contentsOf = (project: Project): readonly Content[] => [
  ...(project.permissions.seeWorkingCopy.allowed ? [{ segment: WORKING, title: 'Working copy', state: '' }] : []),
  ...project.revisions.map(({ label, state }) => ({
    segment: revisionSegment(label),
    title: revisionTitle(label),
    state: stateWord(state),
  })),
]

const Picker = ({
  label,
  contents,
  value,
  onChoose,
}: {
  readonly label: string
  readonly contents: readonly Content[]
  readonly value: string
  readonly onChoose: (segment: string) => void
}) => (
  <label className="inline-flex items-center gap-2 text-cell">
    <span className="font-semibold">{label}</span>
    <select
      value={value}
      onChange={(event) => onChoose(event.target.value)}
      className="h-8 max-w-48 border border-rule bg-sheet px-1.5 text-ink"
    >
      {contents.map(({ segment, title, state }) => (
        <option key={segment} value={segment}>
          {state === '' ? title : `${title} · ${state}`}
        </option>
      ))}
    </select>
  </label>
)

const Compared = ({
  project,
  was,
  now,
  units,
}: {
  readonly project: Project
  readonly units: UnitSystem
  readonly was: Content
  readonly now: Content
}) => {
  const { number } = project
  const texts = [useQuery(specQuery(number, rev(was))), useQuery(specQuery(number, rev(now)))] as const
  const results = [useQuery(resultsQuery(number, rev(was))), useQuery(resultsQuery(number, rev(now)))] as const
  const editor = useRef<CompareEditorHandle>(null)
  const [place, setPlace] = useState<ComparePlace>({ count: 0, at: 0 })
  const [before, after] = [results[0].data?.result, results[1].data?.result]
  const changes = useMemo(() => (before && after ? resultChanges(before, after, units) : null), [before, after, units])
  const vessels = new Set(after?.vessels.map(({ system, mark }) => `${system}/${mark}`))
  return (
    <div className="flex min-h-0 flex-1 flex-col border-t-2 border-ink bench:flex-row">
      <section
        aria-label="Spec"
        className="flex min-h-0 min-w-0 flex-[3] flex-col max-bench:border-b-2 max-bench:border-ink bench:border-r-2 bench:border-ink"
      >
        <Loaded query={texts[0]} what={`Loading the spec of ${was.title}`}>
          {(left) => (
            <Loaded query={texts[1]} what={`Loading the spec of ${now.title}`}>
              {(right) => (
                <>
                  <CompareBar editor={editor} place={place} />
                  <CompareEditor
                    ref={editor}
                    left={{ title: was.title, text: left.text }}
                    right={{ title: now.title, text: right.text }}
                    readOnly
                    sideBySideFrom={1600}
                    onPlace={setPlace}
                  />
                </>
              )}
            </Loaded>
          )}
        </Loaded>
      </section>
      <section aria-label="Results" className="min-h-0 min-w-0 flex-[2] overflow-y-auto px-4 pt-3 pb-6" tabIndex={0}>
        <SectionHeading note={changes && changes.length > 0 ? 'the largest change first' : ''}>
          {changes ? plural(changes.length, 'result that moved', 'results that moved') : 'Results that moved'}
        </SectionHeading>
        <Loaded query={results[0]} what={`Loading the results of ${was.title}`}>
          {() => (
            <Loaded query={results[1]} what={`Loading the results of ${now.title}`}>
              {() => (
                <ResultChangesTable
                  changes={changes ?? []}
                  was={was.title}
                  now={now.title}
                  traceOf={(system, mark) =>
                    vessels.has(`${system}/${mark}`)
                      ? withQuery(paths.trace(number, mark), { system, rev: rev(now), units: units.toLowerCase() })
                      : null
                  }
                />
              )}
            </Loaded>
          )}
        </Loaded>
      </section>
    </div>
  )
}

/** Two contents beside each other: what was written differently, and which results that moved. `a` is the older one. */
export function Component() {
  const number = useProjectNumber()
  const project = useProject(number)
  const { get, change } = useAddress()
  const contents = contentsOf(project)
  const find = (segment: string | null) => contents.find((each) => each.segment === segment)
  const now = find(get('b')) ?? contents[0]
  const shown = useQuery({ ...resultsQuery(number, now ? rev(now) : null), enabled: now !== undefined })
  const { units, setUnits } = useUnits(shown.data?.result.project.units)
  const behind = contents[contents.findIndex((each) => each === now) + 1]
  const was = find(get('a')) ?? behind ?? contents.find((each) => each !== now)
  if (!now || !was)
    return (
      <Sheet title="Compare">
        <p className="border-t-[3px] border-ink pt-3 text-read">
          {project.revisions.length === 0
            ? 'Nothing is issued yet, so there is nothing to compare with.'
            : 'There is one issue alone, so there is nothing to compare it with.'}{' '}
          <Link to={paths.cover(number)}>Go to the cover</Link>
        </p>
      </Sheet>
    )
  return (
    <Sheet
      title="Compare"
      fills
      actions={
        <>
          <Picker label="From" contents={contents} value={was.segment} onChoose={(segment) => change({ a: segment })} />
          <Picker
            label="to"
            contents={contents}
            value={now.segment}
            onChoose={(segment) => change({ b: segment === WORKING ? null : segment })}
          />
          <UnitsSwitch units={units} onChoose={setUnits} />
        </>
      }
    >
      <Compared key={`${was.segment} ${now.segment}`} project={project} was={was} now={now} units={units} />
    </Sheet>
  )
}
