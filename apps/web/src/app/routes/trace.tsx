import { useQuery } from '@tanstack/react-query'
import type { Project, ProjectResult } from '@coldfill/contract'
import { drawAcceptance, drawPressures, ON_PAPER } from '@coldfill/presentation'
import { formatQuantity, type UnitSystem } from '@coldfill/units'
import { useEffect, useMemo } from 'react'
import { Link, useLocation, useNavigate, useParams } from 'react-router-dom'
import { Sheet } from '#components/layouts/sheet.tsx'
import { Loaded } from '#components/loaded.tsx'
import { Band } from '#components/ui/band.tsx'
import { SectionHeading } from '#components/ui/heading.tsx'
import { paths, withQuery } from '#config/paths.ts'
import { useProject } from '#features/projects/api/projects.ts'
import { resultsQuery } from '#features/results/api/results.ts'
import { ContentBand } from '#features/results/components/content-band.tsx'
import { RevisionSwitch } from '#features/results/components/revision-switch.tsx'
import { UnitsSwitch } from '#features/results/components/units-switch.tsx'
import { ChosenVessel } from '#features/schedule/components/chosen-vessel.tsx'
import { DrawingFigure } from '#features/schedule/components/drawing-figure.tsx'
import { HeadroomTable } from '#features/schedule/components/headroom-table.tsx'
import { WholeTrace } from '#features/schedule/components/whole-trace.tsx'
import { capital } from '#lib/format.ts'
import { requireParam, useProjectNumber } from '#lib/route-params.ts'
import { useAddress, useKept, useUnits } from '#lib/search-params.ts'
import type { Vessel } from '#lib/sized-project.ts'

/** Results at the head of the page, where the vessel has them. */
const HEAD = ['required-volume', 'storage-volume', 'precharge', 'fill-pressure', 'maximum-pressure', 'final-pressure']

const Head = ({ vessel, units }: { readonly vessel: Vessel; readonly units: UnitSystem }) => {
  const shown = HEAD.flatMap((key) => {
    const found = vessel.results[key]
    return found ? [{ key, name: found.name, text: formatQuantity(found, units) }] : []
  })
  return (
    <div>
      <p className="text-read">
        {vessel.serves}: {vessel.kind}
        {vessel.quantity > 1 ? ` × ${vessel.quantity}` : ''}
        {vessel.construction ? `, ${vessel.construction}` : ''}. Method: {vessel.methodTitle}.
      </p>
      <dl className="mt-3 grid grid-cols-2 border-y-2 border-ink desk:flex">
        {shown.map(({ key, name, text }) => (
          <div key={key} className="flex-1 border-hair py-2 desk:px-3 desk:not-first:border-l desk:first:pl-0">
            <dt className="text-cell text-pencil">{capital(name)}</dt>
            <dd className="figures font-mono text-lead font-semibold whitespace-nowrap">{text}</dd>
          </div>
        ))}
      </dl>
    </div>
  )
}

const Page = ({
  project,
  result,
  vessel,
  units,
}: {
  readonly project: Project
  readonly result: ProjectResult
  readonly vessel: Vessel
  readonly units: UnitSystem
}) => {
  const hasSpec = project.sheets.includes('spec')
  const context = useMemo(
    () => ({
      project: project.number,
      result,
      units,
      all: vessel.trace.flatMap((section) => section.entries),
      hasSpec,
    }),
    [project.number, result, units, vessel, hasSpec],
  )
  const kept = useKept()
  const { hash } = useLocation()
  useEffect(() => {
    const target = hash === '' ? null : document.getElementById(decodeURIComponent(hash.slice(1)))
    target?.scrollIntoView({ block: 'center' })
    target?.focus({ preventScroll: true })
  }, [hash])
  const system = result.systems.find((one) => one.id === vessel.system)
  const hasDrawing = (system?.pressures.length ?? 0) > 0
  const hasGas = drawAcceptance(vessel, units, ON_PAPER) !== null
  const parts = [
    { id: 'calculation', name: 'Calculation', shown: vessel.trace.length > 0 },
    { id: 'chosen', name: 'Chosen vessel', shown: vessel.status === 'sized' },
    { id: 'headroom', name: 'Headroom', shown: vessel.headroom.length > 0 },
    { id: 'acceptance', name: 'Water in the vessel', shown: hasGas },
    { id: 'pressures', name: 'Pressures', shown: hasDrawing },
  ].filter(({ shown }) => shown)
  return (
    <div className="flex max-w-4xl flex-col gap-9">
      <div className="flex flex-col gap-3">
        {vessel.status === 'sized' ? null : (
          <Band
            tone="error"
            title={vessel.status === 'infeasible' ? 'No vessel can do it.' : 'Not sized: an input is missing or wrong.'}
          >
            {vessel.reason}
          </Band>
        )}
        <Head vessel={vessel} units={units} />
        <nav aria-label="On this page" className="flex flex-wrap gap-x-5 gap-y-1 print:hidden">
          {parts.map(({ id, name }) => (
            <a key={id} href={`#${id}`}>
              {name}
            </a>
          ))}
          {hasSpec ? (
            <Link to={withQuery(paths.spec(project.number), { ...kept, path: vessel.path })}>
              {vessel.mark} in the spec
            </Link>
          ) : null}
          <Link to={withQuery(paths.schedule(project.number), { ...kept, row: vessel.mark })}>
            {vessel.mark} in the schedule
          </Link>
        </nav>
      </div>
      {vessel.trace.length > 0 ? (
        <div id="calculation" tabIndex={-1} className="scroll-mt-4 outline-none">
          <WholeTrace vessel={vessel} context={context} />
        </div>
      ) : null}
      {vessel.status === 'sized' ? (
        <section id="chosen" tabIndex={-1} className="scroll-mt-4 outline-none">
          <SectionHeading>Chosen vessel</SectionHeading>
          <ChosenVessel vessel={vessel} findings={result.findings} units={units} />
        </section>
      ) : null}
      {vessel.headroom.length > 0 ? (
        <section id="headroom" tabIndex={-1} className="scroll-mt-4 outline-none">
          <SectionHeading>Headroom</SectionHeading>
          <HeadroomTable vessel={vessel} units={units} />
        </section>
      ) : null}
      {hasGas ? (
        <section id="acceptance" tabIndex={-1} className="scroll-mt-4 break-inside-avoid outline-none">
          <SectionHeading
            note={vessel.selected ? 'the chosen vessel and the least that would do' : 'the least vessel that would do'}
          >
            Water in the vessel
          </SectionHeading>
          <div className="border-t-2 border-ink pt-3">
            <DrawingFigure
              draw={(look) => drawAcceptance(vessel, units, look)}
              name={`${vessel.system}-${vessel.mark}-water-in-the-vessel`}
            />
          </div>
        </section>
      ) : null}
      {system && hasDrawing ? (
        <section id="pressures" tabIndex={-1} className="scroll-mt-4 break-inside-avoid outline-none">
          <SectionHeading note={`${system.title} filled with ${system.fluid}`}>Pressures</SectionHeading>
          <div className="border-t-2 border-ink pt-3">
            <DrawingFigure
              draw={(look) => drawPressures(system, units, look, result.vessels)}
              name={`${system.id}-pressures`}
            />
          </div>
        </section>
      ) : null}
    </div>
  )
}

/** Another vessel of the project. Marks may stand twice, in different systems. */
const VesselPicker = ({
  vessels,
  chosen,
  number,
}: {
  readonly vessels: readonly Vessel[]
  readonly chosen: Vessel | null
  readonly number: string
}) => {
  const navigate = useNavigate()
  const kept = useKept()
  if (vessels.length < 2) return null
  return (
    <label className="inline-flex items-center gap-2 text-cell print:hidden">
      <span className="font-semibold">Vessel</span>
      <select
        value={chosen?.path ?? ''}
        onChange={(event) => {
          const to = vessels.find((vessel) => vessel.path === event.target.value)
          if (to) void navigate(withQuery(paths.trace(number, to.mark), { ...kept, system: to.system }))
        }}
        className="h-8 max-w-48 border border-rule bg-sheet px-1.5 text-ink"
      >
        {chosen ? null : <option value="">–</option>}
        {vessels.map((vessel) => (
          <option key={vessel.path} value={vessel.path}>
            {vessel.mark} · {vessel.system}
          </option>
        ))}
      </select>
    </label>
  )
}

export function Component() {
  const number = useProjectNumber()
  const mark = requireParam(useParams(), 'mark')
  const project = useProject(number)
  const { get } = useAddress()
  const kept = useKept()
  const results = useQuery(resultsQuery(number, get('rev')))
  const { units, setUnits } = useUnits(results.data?.result.project.units)
  const vessels = results.data?.result.vessels ?? []
  const called = vessels.filter((vessel) => vessel.mark === mark)
  const vessel = called.find((one) => one.system === get('system')) ?? called[0] ?? null
  return (
    <Sheet
      title={`Trace ${mark}`}
      actions={
        <>
          <VesselPicker vessels={vessels} chosen={vessel} number={number} />
          <RevisionSwitch project={project} />
          <UnitsSwitch units={units} onChoose={setUnits} />
        </>
      }
      bands={<ContentBand project={project} shown={results.data} />}
    >
      <Loaded query={results} what="Loading the trace">
        {({ result }) =>
          vessel ? (
            <Page key={vessel.path} project={project} result={result} vessel={vessel} units={units} />
          ) : (
            <div className="border-t-[3px] border-ink pt-3 text-read">
              <p>There is no {mark} in this content.</p>
              <p className="mt-2">
                <Link to={withQuery(paths.schedule(number), kept)}>Go to the schedule</Link>
              </p>
            </div>
          )
        }
      </Loaded>
    </Sheet>
  )
}
