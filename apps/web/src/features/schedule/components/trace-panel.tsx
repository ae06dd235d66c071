import type { ProjectResult } from '@coldfill/contract'
import type { UnitSystem } from '@coldfill/units'
import { useMemo, useState, type ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { Formula } from '#components/ui/math.tsx'
import { paths, withQuery } from '#config/paths.ts'
import { capital, plural } from '#lib/format.ts'
import { useKept } from '#lib/search-params.ts'
import { citationWords, type TraceEntry, type TraceInput, type TraceStep, type Vessel } from '#lib/sized-project.ts'
import { drawnSymbol, drawStep, shownValue } from '../drawn-step.ts'
import { operands, upstream } from '../upstream.ts'

export interface TraceContext {
  readonly project: string
  readonly result: ProjectResult
  readonly units: UnitSystem
  readonly all: readonly TraceEntry[]
  /** Whether this person has the Spec sheet to be led to. */
  readonly hasSpec: boolean
}

/** Where an input comes from, as a link where there is a place to go. */
const Source = ({ input, context }: { readonly input: TraceInput; readonly context: TraceContext }) => {
  const kept = useKept()
  const { origin } = input
  if (origin.from === 'catalogue') return 'chosen vessel'
  if (origin.from === 'table') return citationWords(origin.citation, context.result.sources)
  if (origin.from === 'assumption') {
    const used = context.result.assumptions.find((assumption) => assumption.id === origin.id)
    return (
      <Link to={withQuery(paths.basis(context.project), { ...kept, assumption: origin.id })}>
        {`assumption ${used?.number ?? origin.id}`}
      </Link>
    )
  }
  const words = input.authored ? `spec: ${input.authored}` : 'spec'
  return context.hasSpec ? (
    <Link to={withQuery(paths.spec(context.project), { ...kept, path: origin.path })}>{words}</Link>
  ) : (
    words
  )
}

export const Input = ({
  input,
  context,
  marked,
}: {
  readonly input: TraceInput
  readonly context: TraceContext
  /** Pointed out as something that a chosen step rests on; left out where nothing is pointed out. */
  readonly marked?: boolean
}) => (
  <li
    id={marked === undefined ? undefined : input.id}
    tabIndex={marked === undefined ? undefined : -1}
    className={`border-b border-hair py-1.5 ${marked === undefined ? '' : `scroll-mt-4 border-l-[3px] pl-3 ${marked ? 'border-l-steel bg-steel-wash' : 'border-l-transparent'}`}`}
  >
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

export const Step = ({
  step,
  context,
  chosen = false,
  named = true,
}: {
  readonly step: TraceStep
  readonly context: TraceContext
  readonly chosen?: boolean
  /** Whether its name stands above it. */
  readonly named?: boolean
}) => {
  const drawn = useMemo(() => drawStep(step, context.all, context.units), [step, context])
  const source = citationWords(step.source, context.result.sources)
  return (
    <div className={chosen ? 'border-t-[3px] border-ink pt-2' : named ? 'border-b border-hair py-2' : 'pt-0.5 pb-2'}>
      {chosen || !named ? null : <p className="text-cell font-semibold">{capital(step.name)}</p>}
      {drawn ? (
        <>
          <Formula block markup={drawn.symbols} />
          <div className="flex flex-wrap items-center gap-x-1.5">
            <Formula block markup={drawn.numbers} />
            <span className="figures py-1 whitespace-nowrap">
              = <strong className="font-semibold">{drawn.result}</strong>
            </span>
          </div>
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

/** A step that the chosen one uses, as a way to it. */
const UsedStep = ({
  step,
  context,
  onWalk,
}: {
  readonly step: TraceStep
  readonly context: TraceContext
  readonly onWalk: () => void
}) => (
  <li className="border-b border-hair">
    <button
      type="button"
      onClick={onWalk}
      className="flex w-full items-baseline justify-between gap-3 py-1.5 text-left hover:bg-steel-wash"
    >
      <span className="min-w-0">
        <Formula markup={drawnSymbol(step.symbol)} />{' '}
        <span className="text-cell text-steel underline underline-offset-3">{step.name}</span>
      </span>
      <span className="figures font-mono text-cell whitespace-nowrap">{shownValue(step, context.units)}</span>
    </button>
  </li>
)

/** The worked calculation of one number: the line itself, what it was computed from, and the way back through all of it. */
export const TracePanel = ({ project, result, vessel, entry, heading, units, hasSpec, without }: Props) => {
  const [walked, setWalked] = useState<string | null>(null)
  const all = useMemo(() => vessel.trace.flatMap((section) => section.entries), [vessel])
  const context = useMemo<TraceContext>(
    () => ({ project, result, units, all, hasSpec }),
    [project, result, units, all, hasSpec],
  )
  const at = walked ?? entry
  const line = useMemo(() => (at === null ? [] : upstream(vessel.trace, at)), [vessel, at])
  const chosen = line.at(-1)
  if (!chosen) return <div className="text-cell">{without}</div>
  const before = line.slice(0, -1)
  const direct = chosen.entry === 'step' ? operands(chosen, before) : []
  const steps = before.filter((one) => one.entry === 'step')
  const inputs = before.filter((one) => one.entry === 'input')
  return (
    <div className="flex flex-col gap-4">
      <div>
        <p className="flex justify-between gap-3 text-cell">
          <span className="font-mono text-pencil">{vessel.mark}</span>
          {walked === null ? null : (
            <button type="button" className="text-steel underline underline-offset-3" onClick={() => setWalked(null)}>
              Back to {heading.toLowerCase()}
            </button>
          )}
        </p>
        <p className="mb-2 flex items-baseline justify-between gap-3">
          <strong className="font-semibold">{walked === null ? heading : capital(chosen.name)}</strong>
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
      {direct.length > 0 ? (
        <section aria-label="Computed from">
          <h3 className="border-b-2 border-ink pb-1 font-semibold">Computed from</h3>
          <ul>
            {direct.map((one) =>
              one.entry === 'input' ? (
                <Input key={one.id} input={one} context={context} />
              ) : (
                <UsedStep key={one.id} step={one} context={context} onWalk={() => setWalked(one.id)} />
              ),
            )}
          </ul>
        </section>
      ) : null}
      {steps.length > 0 ? (
        <details>
          <summary className="cursor-pointer font-semibold text-steel">
            All {plural(steps.length, 'step')} before it
          </summary>
          {steps.map((step) => (
            <Step key={step.id} step={step} context={context} />
          ))}
          <h3 className="mt-3 border-b-2 border-ink pb-1 font-semibold">Inputs</h3>
          <ul>
            {inputs.map((input) => (
              <Input key={input.id} input={input} context={context} />
            ))}
          </ul>
        </details>
      ) : null}
    </div>
  )
}
