import type { Anchor, Project, ProjectResult, Redline } from '@coldfill/contract'
import type { UnitSystem } from '@coldfill/units'
import { Link } from 'react-router-dom'
import { Button } from '#components/ui/button.tsx'
import { paths, withQuery } from '#config/paths.ts'
import { RedlineComposer } from '#features/redlines/components/redline-composer.tsx'
import { RedlineThread } from '#features/redlines/components/redline-thread.tsx'
import { placeOf } from '#features/redlines/filters.ts'
import { TracePanel } from '#features/schedule/components/trace-panel.tsx'
import { shownValue } from '#features/schedule/drawn-step.ts'
import type { Row } from '#features/schedule/schedule-table.ts'
import { useKept } from '#lib/search-params.ts'

interface Props {
  readonly project: Project
  readonly result: ProjectResult | undefined
  readonly units: UnitSystem
  readonly rev: string | null
  readonly row: Row | null
  readonly column: string
  readonly heading: string
  /** Where a redline on the chosen cell would stand. */
  readonly anchor: Anchor | null
  readonly redlines: readonly Redline[]
  readonly composing: Anchor | null
  readonly onCompose: () => void
  readonly onComposed: () => void
  /** Row of the address that this content does not have. */
  readonly sought: string | null
}

/** Margin of the schedule: the trace of the chosen cell, and the redlines that stand on it. */
export const ScheduleMargin = (props: Props) => {
  const {
    project,
    result,
    units,
    rev,
    row,
    column,
    heading,
    anchor,
    redlines,
    composing,
    onCompose,
    onComposed,
    sought,
  } = props
  if (sought !== null)
    return <p>There is no {sought} in this content. Its redlines are kept on the Redlines sheet, adrift.</p>
  if (!result || !row || !anchor)
    return <p className="text-pencil">Choose a cell to see how its number was worked out.</p>

  const value = row.vessel.results[column]
  const quoted = (of: Anchor): string => {
    if (of.type !== 'cell') return ''
    const found = row.vessel.results[of.column]
    return found ? shownValue(found, units) : ''
  }
  const { redline, officeRedline } = project.permissions
  const here = redlines.filter((one) => one.state !== 'closed' && placeOf(one.anchor) === placeOf(anchor))

  return (
    <div className="flex flex-col gap-5">
      {composing ? (
        <RedlineComposer
          key={placeOf(composing)}
          project={project.number}
          anchor={composing}
          quoted={quoted(composing)}
          permissions={project.permissions}
          onDone={onComposed}
        />
      ) : (
        <>
          <TracePanel
            key={`${row.id} ${column}`}
            project={project.number}
            result={result}
            vessel={row.vessel}
            entry={value?.entry ?? row.cells[column]?.entry ?? null}
            heading={heading}
            units={units}
            hasSpec={project.sheets.includes('spec')}
            without={<WithoutTrace row={row} column={column} heading={heading} project={project} />}
          />
          <Link
            to={withQuery(paths.trace(project.number, row.vessel.mark), {
              system: row.vessel.system,
              rev,
              units: units.toLowerCase(),
            })}
          >
            Whole calculation of {row.vessel.mark}
          </Link>
          <div className="border-t-2 border-ink pt-3">
            <Button
              why={redline.allowed || officeRedline.allowed ? null : (redline.why ?? 'Reviewers write redlines.')}
              showWhy
              onClick={onCompose}
            >
              {redline.allowed || !officeRedline.allowed ? 'Start a redline' : 'Start a redline for the office'}
            </Button>
          </div>
        </>
      )}
      {here.map((one) => (
        <div key={one.number} className="border-t border-hair pt-3">
          <RedlineThread project={project.number} redline={one} rev={rev} showPlace={false} />
        </div>
      ))}
    </div>
  )
}

/** What to say of a cell that has no calculation: why there is no size, or simply what it shows. */
const WithoutTrace = ({
  row,
  column,
  heading,
  project,
}: {
  readonly row: Row
  readonly column: string
  readonly heading: string
  readonly project: Project
}) => {
  const kept = useKept()
  const { vessel } = row
  const text = row.cells[column]?.text
  return (
    <div className="flex flex-col gap-2 text-ink">
      <p className="font-mono text-cell text-pencil">{vessel.mark}</p>
      {column === 'mark' ? (
        <p className="font-semibold">{vessel.serves}</p>
      ) : (
        <p className="flex justify-between gap-3">
          <strong className="font-semibold">{heading}</strong>
          <span>{text}</span>
        </p>
      )}
      {vessel.status === 'sized' ? null : (
        <p>
          <strong className="font-semibold text-fault">
            {vessel.status === 'infeasible' ? 'No vessel can do it.' : 'Not sized: an input is missing or wrong.'}
          </strong>{' '}
          {vessel.reason}
        </p>
      )}
      {column === 'mark' ? (
        <p className="text-pencil">
          {vessel.methodTitle}, method {vessel.method}
        </p>
      ) : null}
      {project.sheets.includes('spec') ? (
        <Link to={withQuery(paths.spec(project.number), { ...kept, path: vessel.path })}>
          Go to {vessel.mark} in the spec
        </Link>
      ) : null}
    </div>
  )
}
