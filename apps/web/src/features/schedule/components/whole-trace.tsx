import { useMemo, useState } from 'react'
import { SectionHeading } from '#components/ui/heading.tsx'
import { capital, plural } from '#lib/format.ts'
import type { TraceEntry, TraceInput, TraceSection, Vessel } from '#lib/sized-project.ts'
import { upstream } from '../upstream.ts'
import { Input, Step, type TraceContext } from './trace-panel.tsx'

type Run = { readonly inputs: readonly TraceInput[] } | { readonly step: Extract<TraceEntry, { entry: 'step' }> }

/** Inputs that follow each other stand in one list. */
const runsOf = (section: TraceSection): readonly Run[] => {
  const runs: Run[] = []
  for (const entry of section.entries) {
    const last = runs.at(-1)
    if (entry.entry === 'step') runs.push({ step: entry })
    else if (last && 'inputs' in last) runs[runs.length - 1] = { inputs: [...last.inputs, entry] }
    else runs.push({ inputs: [entry] })
  }
  return runs
}

const marked = 'border-l-[3px] border-l-steel bg-steel-wash pl-3'
const unmarked = 'border-l-[3px] border-l-transparent pl-3'

/** The whole calculation of a vessel from the top down. A step that is chosen points out everything that it rests on. */
export const WholeTrace = ({ vessel, context }: { readonly vessel: Vessel; readonly context: TraceContext }) => {
  const [chosen, setChosen] = useState<string | null>(null)
  const beneath = useMemo(
    () => new Set(chosen === null ? [] : upstream(vessel.trace, chosen).map((entry) => entry.id)),
    [vessel, chosen],
  )
  return (
    <div className="flex flex-col gap-7">
      {vessel.trace.map((section) => (
        <section key={section.title}>
          <SectionHeading note={plural(section.entries.length, 'line')}>{section.title}</SectionHeading>
          <div className="border-t-2 border-ink">
            {runsOf(section).map((run) =>
              'step' in run ? (
                <div
                  key={run.step.id}
                  id={run.step.id}
                  tabIndex={-1}
                  className={`scroll-mt-4 border-b border-b-hair ${beneath.has(run.step.id) ? marked : unmarked}`}
                >
                  <button
                    type="button"
                    aria-pressed={run.step.id === chosen}
                    title="Points out what this rests on"
                    onClick={() => setChosen(run.step.id === chosen ? null : run.step.id)}
                    className="mt-2 min-h-6 text-left font-semibold text-steel hover:text-ink print:text-ink"
                  >
                    {capital(run.step.name)}
                  </button>
                  <Step step={run.step} context={context} named={false} />
                </div>
              ) : (
                <ul key={run.inputs[0]?.id}>
                  {run.inputs.map((input) => (
                    <Input key={input.id} input={input} context={context} marked={beneath.has(input.id)} />
                  ))}
                </ul>
              ),
            )}
          </div>
        </section>
      ))}
    </div>
  )
}
