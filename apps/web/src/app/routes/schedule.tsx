import { useQuery } from '@tanstack/react-query'
import type { Anchor } from '@coldfill/contract'
import { useMemo, useState } from 'react'
import { Link } from 'react-router-dom'
import { Sheet } from '#components/layouts/sheet.tsx'
import { marginOpen } from '#components/layouts/margin.tsx'
import { Loaded } from '#components/loaded.tsx'
import { Flag, RevisionTriangle, Scallop, WasNow } from '#components/ui/review-marks.tsx'
import { buttonClass } from '#components/ui/button.tsx'
import { paths, withQuery } from '#config/paths.ts'
import { useProject } from '#features/projects/api/projects.ts'
import { redlinesQuery } from '#features/redlines/api/redlines.ts'
import { redlinesByPlace } from '#features/redlines/filters.ts'
import { resultsQuery } from '#features/results/api/results.ts'
import { ContentBand } from '#features/results/components/content-band.tsx'
import { RevisionSwitch } from '#features/results/components/revision-switch.tsx'
import { UnitsSwitch } from '#features/results/components/units-switch.tsx'
import { changesByPlace, changeWords } from '#features/schedule/changes.ts'
import { ColumnMenu } from '#features/schedule/components/column-menu.tsx'
import { KeyedNotes } from '#features/schedule/components/keyed-notes.tsx'
import { ScheduleGrid, type CellMarks } from '#features/schedule/components/schedule-grid.tsx'
import { schedules, type Row } from '#features/schedule/schedule-table.ts'
import { useProjectNumber } from '#lib/route-params.ts'
import { revisionPhrase } from '#lib/words.ts'
import { useAddress, useUnits } from '#lib/search-params.ts'
import { ScheduleMargin } from './schedule-margin.tsx'

export function Component() {
  const number = useProjectNumber()
  const project = useProject(number)
  const { get, change } = useAddress()
  const rev = get('rev')
  const results = useQuery(resultsQuery(number, rev))
  const redlines = useQuery({ ...redlinesQuery(number, rev), enabled: project.sheets.includes('redlines') })
  const { units, setUnits } = useUnits(results.data?.result.project.units)
  const [composing, setComposing] = useState<Anchor | null>(null)

  const hidden = useMemo(() => new Set((get('hide') ?? '').split(',').filter(Boolean)), [get])
  const tables = useMemo(() => (results.data ? schedules(results.data.result, units) : []), [results.data, units])
  const places = useMemo(() => redlinesByPlace(redlines.data ?? []), [redlines.data])
  const changed = results.data?.changedSince ?? null
  const showChanges = get('changed') !== '0'
  const changes = useMemo(
    () => (changed && showChanges ? changesByPlace(changed.vessels) : null),
    [changed, showChanges],
  )
  const letter = results.data?.revision ?? project.nextRevision

  // A row of the address is a mark, or a system and a mark where two systems use the same one.
  const asked = get('row')
  const rows = tables.flatMap((table) => table.rows)
  const row = rows.find((one) => one.id === asked) ?? rows.find((one) => one.vessel.mark === asked) ?? null
  const column = get('col') ?? 'mark'
  const table = tables.find((one) => row && one.rows.includes(row))

  const choose = (to: Row, key: string) => {
    if (composing) setComposing(null)
    const name = rows.filter((one) => one.vessel.mark === to.vessel.mark).length > 1 ? to.id : to.vessel.mark
    change({ row: name, col: key === 'mark' ? null : key }, { replace: true })
  }
  const anchorOf = (to: Row, key: string): Anchor =>
    tables.flatMap((one) => one.columns).some((one) => one.key === key && one.isResult) && to.vessel.results[key]
      ? { type: 'cell', mark: to.vessel.mark, column: key }
      : { type: 'row', mark: to.vessel.mark }
  const startRedline = (to: Row, key: string) => {
    choose(to, key)
    marginOpen.set(true)
    const { redline, officeRedline } = project.permissions
    if (redline.allowed || officeRedline.allowed) setComposing(anchorOf(to, key))
  }
  const toCell = () => {
    requestAnimationFrame(() => document.querySelector<HTMLElement>('[role="grid"] [aria-selected="true"]')?.focus())
  }
  const toTrace = () => {
    marginOpen.set(true)
    requestAnimationFrame(() => document.getElementById('margin')?.focus())
  }

  const marks = (of: Row, key: string): CellMarks => {
    const flags = (places.get(key === 'mark' ? `row ${of.vessel.mark}` : `cell ${of.vessel.mark} ${key}`) ?? []).map(
      (redline) => <Flag key={redline.number} number={redline.number} state={redline.state} />,
    )
    const ownChanges = changes?.get(of.id)
    const own = ownChanges?.get(key)
    if (key === 'mark')
      return {
        after:
          ownChanges || flags.length ? (
            <>
              {ownChanges ? <RevisionTriangle letter={letter} /> : null}
              {flags}
            </>
          ) : null,
      }
    const now = of.cells[key]?.text ?? '—'
    return {
      ...(own ? { around: <Scallop />, value: <WasNow was={changeWords(own, units, now)} now={now} /> } : {}),
      ...(flags.length ? { after: flags } : {}),
    }
  }

  return (
    <Sheet
      title="Schedule"
      actions={
        <>
          <RevisionSwitch project={project} />
          {changed && changed.vessels.length === 0 ? (
            <span className="text-cell text-pencil">No size changed since {revisionPhrase(changed.revision)}</span>
          ) : null}
          {changed && changed.vessels.length > 0 ? (
            <label className="inline-flex h-8 items-center gap-1.5 text-cell font-semibold">
              <input
                type="checkbox"
                className="size-4 accent-steel"
                checked={showChanges}
                onChange={(event) => change({ changed: event.target.checked ? null : '0' }, { replace: true })}
              />
              Changed since {revisionPhrase(changed.revision)} ({changed.vessels.length})
            </label>
          ) : null}
          <ColumnMenu
            tables={tables}
            hidden={hidden}
            onChange={(next) => change({ hide: [...next].join(',') || null }, { replace: true })}
          />
          <UnitsSwitch units={units} onChoose={setUnits} />
        </>
      }
      bands={<ContentBand project={project} shown={results.data} />}
      margin={{
        title: composing ? 'New redline' : 'Trace',
        onEscape: toCell,
        content: (
          <ScheduleMargin
            project={project}
            result={results.data?.result}
            units={units}
            rev={rev}
            row={row}
            column={column}
            heading={table?.columns.find((one) => one.key === column)?.heading ?? 'Mark'}
            anchor={row ? anchorOf(row, column) : null}
            redlines={redlines.data ?? []}
            composing={composing}
            onCompose={() => row && startRedline(row, column)}
            onComposed={() => {
              setComposing(null)
              toCell()
            }}
            sought={asked !== null && row === null && rows.length > 0 ? asked : null}
          />
        ),
      }}
    >
      <Loaded query={results} what="Sizing the vessels">
        {() =>
          tables.length === 0 ? (
            <div className="border-t-[3px] border-ink pt-3 text-read">
              <p>No vessels declared yet.</p>
              {project.sheets.includes('spec') ? (
                <Link
                  className={`${buttonClass('plain')} mt-3`}
                  to={withQuery(paths.spec(number), { path: 'systems' })}
                >
                  Declare one in the spec
                </Link>
              ) : null}
            </div>
          ) : (
            <div className="flex flex-col gap-10">
              {tables.map((one) => (
                <section key={one.kind} aria-label={one.title}>
                  <h2 className="mb-2 text-lead font-semibold">{one.title}</h2>
                  <ScheduleGrid
                    schedule={one}
                    hidden={hidden}
                    chosen={row ? { row: row.id, column } : null}
                    onChoose={choose}
                    onTrace={toTrace}
                    onRedline={startRedline}
                    marks={marks}
                  />
                  <KeyedNotes schedule={one} hidden={hidden} />
                </section>
              ))}
            </div>
          )
        }
      </Loaded>
    </Sheet>
  )
}
