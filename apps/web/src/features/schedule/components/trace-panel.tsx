import type { ProjectResult } from '@coldfill/contract'
import type { UnitSystem } from '@coldfill/units'
import { useMemo, type ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { Formula } from '#components/ui/math.tsx'
import { paths, withQuery } from '#config/paths.ts'
import { capital } from '#lib/format.ts'
import { citationWords, type TraceEntry, type TraceInput, type TraceStep, type Vessel } from '#lib/sized-project.ts'
import { drawnSymbol, drawStep, shownValue } from '../drawn-step.ts'
import { upstream } from '../upstream.ts'

interface Context {
  readonly project: string
  readonly result: ProjectResult
  readonly units: UnitSystem
  readonly all: readonly TraceEntry[]
  /** Whether this person has the Spec sheet to be led to. */
  readonly hasSpec: boolean
}

/** Where an input comes from, as a link where there is a place to go. */
const Source = ({ input, context }: { readonly input: TraceInput; readonly context: Context }) => {
  const { origin } = input
  if (origin.from === 'catalogue') return 'chosen vessel'
  if (origin.from === 'table') return citationWords(origin.citation, context.result.sources)
  if (origin.from === 'assumption') {
    const used = context.result.assumptions.find((assumption) => assumption.id === origin.id)
    return (
      <Link to={withQuery(paths.basis(context.project), { assumption: origin.id })}>
        {`assumption ${used?.number ?? origin.id}`}
      </Link>
    )
  }
  const words = input.authored ? `spec: ${input.authored}` : 'spec'
  return context.hasSpec ? (
    <Link to={withQuery(paths.spec(context.project), { path: origin.path })}>{words}</Link>
  ) : (
    words
  )
}

const Input = ({ input, context }: { readonly input: TraceInput; readonly context: Context }) => (
  <li className="border-b border-hair py-1.5">
    <div className="flex items-baseline justify-between gap-3">
      <span className="min-w-0">
        <Formula markup={drawnSymbol(input.symbol)} /> <span className="text-cell">{input.name}</span>
      </span>
      <span className="figures font-mono text-cell whitespace-nowrap">{shownValue(input, context.units)}</span>
    </div>
    <p className="text-cell text-pencil">
      <Source input={input} context={context} />
    </p>
  </li>
)

const Step = ({
  step,
  context,
  chosen = false,
}: {
  readonly step: TraceStep
  readonly context: Context
  readonly chosen?: boolean
}) => {
  const drawn = useMemo(() => drawStep(step, context.all, context.units), [step, context])
  const source = citationWords(step.source, context.result.sources)
  return (
    <div className={chosen ? 'border-t-[3px] border-ink pt-2' : 'border-b border-hair py-2'}>
      {chosen ? null : <p className="text-cell font-semibold">{capital(step.name)}</p>}
      {drawn ? (
        <>
          <Formula block markup={drawn.symbols} />
          <Formula block markup={drawn.numbers} />
        </>
      ) : (
        <p className="py-1 font-mono text-cell break-words">
          {step.symbol} = {step.formula} = {shownValue(step, context.units)}
        </p>
      )}
      <p className="text-cell text-pencil">{source}</p>
    </div>
  )
}

interface Props {
  readonly project: string
  readonly result: ProjectResult
  readonly vessel: Vessel
  /** Id of the trace entry behind the chosen cell; null where there is none. */
  readonly entry: string | null
  readonly heading: string
  readonly units: UnitSystem
  readonly hasSpec: boolean
  /** Said where the cell has no calculation behind it. */
  readonly without: ReactNode
}

/** The worked calculation of one number: the line itself, then what it was computed from. */
export const TracePanel = ({ project, result, vessel, entry, heading, units, hasSpec, without }: Props) => {
  const all = useMemo(() => vessel.trace.flatMap((section) => section.entries), [vessel])
  const context = useMemo<Context>(
    () => ({ project, result, units, all, hasSpec }),
    [project, result, units, all, hasSpec],
  )
  const line = useMemo(() => (entry === null ? [] : upstream(vessel.trace, entry)), [vessel, entry])
  const chosen = line.at(-1)
  if (!chosen) return <div className="text-cell text-pencil">{without}</div>
  const before = line.slice(0, -1)
  const inputs = before.filter((one) => one.entry === 'input')
  const steps = before.filter((one) => one.entry === 'step')
  return (
    <div className="flex flex-col gap-4">
      <div>
        <p className="font-mono text-cell text-pencil">{vessel.mark}</p>
        <p className="mb-2 flex items-baseline justify-between gap-3">
          <strong className="font-semibold">{heading}</strong>
          <span className="figures font-mono font-semibold whitespace-nowrap">{shownValue(chosen, units)}</span>
        </p>
        {chosen.entry === 'step' ? (
          <Step step={chosen} context={context} chosen />
        ) : (
          <ul className="border-t-[3px] border-ink">
            <Input input={chosen} context={context} />
          </ul>
        )}
      </div>
      {steps.length > 0 ? (
        <section aria-label="Steps before it">
          <h3 className="border-b-2 border-ink pb-1 font-semibold">Steps before it</h3>
          {steps.map((step) => (
            <Step key={step.id} step={step} context={context} />
          ))}
        </section>
      ) : null}
      {inputs.length > 0 ? (
        <section aria-label="Inputs">
          <h3 className="border-b-2 border-ink pb-1 font-semibold">Inputs</h3>
          <ul>
            {inputs.map((input) => (
              <Input key={input.id} input={input} context={context} />
            ))}
          </ul>
        </section>
      ) : null}
    </div>
  )
}
