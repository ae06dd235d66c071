import { Calculation, type CatalogueRow, type Fluid, fluid as fluidOf, site, sources } from '@coldfill/engine'
import type { Acceptance, Finding, FluidModel, SpecModel } from '@coldfill/spec'
import { AssumptionRegister } from './assumption-register.ts'
import { checkSystem } from './checks/check-system.ts'
import { acceptFindings, inReadingOrder } from './collect-findings.ts'
import { engineVersion } from './engine-version.ts'
import { engineeringCodes } from './engineering-codes.ts'
import type { ProjectHeader, ProjectResult, SystemResult, VesselResult } from './result.ts'
import { sizeVessel } from './size-vessel.ts'
import { systemResult } from './system-result.ts'

const textsOf = (map: SpecModel['project']['codes']): Record<string, string> =>
  Object.fromEntries(Object.entries(map).map(([key, located]) => [key, located.value]))

/** Atmospheric pressure at an elevation in m, Pa abs; sea level where the spec is silent. */
const atmosphereAt = (elevation: number): number => {
  const calculation = new Calculation('site', {})
  calculation.section('Site')
  calculation.run(site, { Z: { value: elevation, origin: { from: 'spec', path: 'project.elevation' } } })
  return calculation.value('P_a')
}

const header = (spec: SpecModel, elevation: number, atmosphere: number): ProjectHeader => ({
  number: spec.project.number?.value ?? '',
  title: spec.project.title?.value ?? '',
  client: spec.project.client?.value ?? '',
  location: spec.project.location?.value ?? '',
  units: spec.project.units?.value ?? 'US',
  elevation,
  atmosphere,
  codes: textsOf(spec.project.codes),
  specSections: textsOf(spec.project.specSections),
})

type FluidChoice = { readonly fluid: Fluid } | { readonly finding: Finding | null }

const chooseFluid = (model: FluidModel | null | undefined): FluidChoice => {
  if (model === null) return { finding: null }
  const strength = model?.strength && { value: model.strength.value, by: model.strength.by }
  const choice = fluidOf(model?.base ?? 'water', strength)
  if (choice.ok) return { fluid: choice.fluid }
  if (!model) throw new Error(`water is not available: ${choice.message}`)
  return {
    finding: {
      code: 'CF-E003',
      severity: engineeringCodes['CF-E003'].severity,
      message: choice.message,
      hint: 'Check the strength of the solution.',
      path: model.path,
      range: model.range,
      related: [],
      fixes: [],
    },
  }
}

const noteCited = (vessel: VesselResult, cited: Set<string>): void => {
  for (const section of vessel.trace)
    for (const entry of section.entries) {
      if (entry.entry === 'step') cited.add(entry.source.source)
      else if (entry.origin.from === 'table') cited.add(entry.origin.citation.source)
    }
}

const titlesOf = (cited: ReadonlySet<string>): ProjectResult['sources'] =>
  Object.fromEntries(
    [...cited].sort().map((id) => {
      const source = sources[id]
      if (!source) throw new Error(`a result cites ${id}, which is not among the sources`)
      return [id, { title: source.title, edition: source.edition, publisher: source.publisher }]
    }),
  )

/**
 * Sizes every vessel of a spec that has been read. `read` are the findings of reading it; the result has them with those
 * of sizing, in reading order. A system with an error leaves the others sized.
 */
export const sizeProject = (
  spec: SpecModel,
  read: readonly Finding[] = [],
  acceptances: readonly Acceptance[] = [],
  catalogue?: readonly CatalogueRow[],
): ProjectResult => {
  const register = new AssumptionRegister(spec.assumptions)
  const elevation = spec.project.elevation?.value.value ?? register.peek('elevation')
  const atmosphere = atmosphereAt(elevation)
  const findings: Finding[] = [...read]
  const vessels: VesselResult[] = []
  const systems: SystemResult[] = []
  const cited = new Set<string>()
  const water = chooseFluid(undefined)
  if (!('fluid' in water)) throw new Error('water is always there')
  for (const system of spec.systems) {
    const choice = chooseFluid(system.fluid)
    const usable = 'fluid' in choice
    if (!usable && choice.finding) findings.push(choice.finding)
    const fluid = usable ? choice.fluid : water.fluid
    const sizable = usable ? system : { ...system, sound: false }
    let held: Parameters<typeof systemResult>[2] = null
    for (const vessel of system.vessels) {
      const sized = sizeVessel({ spec, system: sizable, vessel, fluid, register, atmosphere, catalogue })
      vessels.push(sized.result)
      noteCited(sized.result, cited)
      if (sized.pressures) held ??= { mark: vessel.mark, model: sized.pressures }
      findings.push(...sized.findings)
    }
    findings.push(...checkSystem(spec, system, atmosphere))
    systems.push(systemResult(system, fluid, held, atmosphere))
  }
  const assumptions = register.list()
  for (const { source } of assumptions) cited.add(source.source)
  return {
    engine: engineVersion,
    spec: 1,
    readable: true,
    project: header(spec, elevation, atmosphere),
    systems,
    vessels,
    assumptions,
    findings: inReadingOrder(acceptFindings(findings, acceptances)),
    sources: titlesOf(cited),
  }
}
