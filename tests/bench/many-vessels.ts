import { readFileSync } from 'node:fs'
import { sizeSpec } from '@coldfill/sizing'

type Result = ReturnType<typeof sizeSpec>

/** The heating loop of the clinic as `count` systems, each with its expansion tank, sized from one spec. */
export const manyVessels = (count: number): Result => {
  const text = readFileSync(new URL('../../examples/fernhollow/spec.yaml', import.meta.url), 'utf8')
  const { engine, spec, readable, project, systems, vessels, assumptions, sources } = sizeSpec(text)
  const copy = <T>(thing: T, n: number): T =>
    JSON.parse(JSON.stringify(thing).replaceAll('HWS', `S${n}`).replaceAll('ET-1', `ET-${n}`)) as T
  const [system, vessel] = [systems[0], vessels[0]]
  if (!system || !vessel) throw new Error('the clinic has a heating loop with a vessel')
  const numbers = Array.from({ length: count }, (_, n) => n + 1)
  return {
    engine,
    spec,
    readable,
    project,
    systems: numbers.map((n) => copy(system, n)),
    vessels: numbers.map((n) => copy(vessel, n)),
    assumptions,
    sources,
    findings: [],
  }
}
