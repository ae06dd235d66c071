import {
  closedPressures,
  type ContentsLine,
  contents,
  domesticPressures,
  emitterClasses,
  findPipe,
  type GivenValue,
  type PressureRule,
  type RunOutcome,
  type SectionId,
  site,
} from '@coldfill/engine'
import type { ContentLine, Located } from '@coldfill/spec'
import type { Quantity } from '@coldfill/units'
import { adoptsPlumbingCap } from './adopted-codes.ts'
import { runApartments, runFixtures, runPeople, runUnitsServed } from './demand-sections.ts'
import { fromSpec, numberFromSpec, type VesselContext } from './vessel-context.ts'

/** The gauge reading of a pressure that may have been written as an absolute one. `atmosphere` in Pa abs. */
export const gaugeFromSpec = (located: Located<Quantity>, atmosphere: number): GivenValue => {
  const given = fromSpec(located)
  return located.value.kind === 'absolute pressure' ? { ...given, value: given.value - atmosphere } : given
}

const lineFrom = (context: VesselContext, line: ContentLine, index: number): ContentsLine | null => {
  switch (line.holds) {
    case 'equipment': {
      const count = { value: line.count, origin: { from: 'spec', path: line.path } } as const
      const read = { holds: 'equipment', label: line.name, each: fromSpec(line.volume), count } as const
      return line.material ? { ...read, material: line.material } : read
    }
    case 'pipe': {
      const search = findPipe(line.family, line.size)
      if (!search.ok) return null
      const { row } = search
      const insideDiameter = { value: row.insideDiameter, origin: { from: 'table', citation: row.citation } } as const
      return { holds: 'pipe', label: `${line.family}, ${line.size}`, insideDiameter, length: fromSpec(line.length) }
    }
    case 'estimate': {
      const emitter = emitterClasses[line.emitter]
      if (!emitter) return null
      const content = context.register.number(emitter.id, context.reference)
      return { holds: 'estimate', label: line.emitter, output: fromSpec(line.output), content }
    }
    case 'volume': {
      const read = {
        holds: 'volume',
        label: line.note ?? `volume ${index + 1}`,
        volume: fromSpec(line.volume),
      } as const
      return line.material ? { ...read, material: line.material } : read
    }
  }
}

/** What contents that name no material are made of, where a thermal expansion tank says so. */
const materialElsewhere = (context: VesselContext): 'steel' | 'copper' | 'none' | undefined =>
  context.vessel.kind === 'thermal expansion tank' ? context.vessel.fields.material?.value : undefined

/** Whether anything says what the contents are made of; the family of a pipe alone does not, which errs on the large side. */
export const namesMaterials = (context: VesselContext): boolean =>
  (materialElsewhere(context) ?? 'none') !== 'none' ||
  context.system.contents.some(
    (line) => 'material' in line && (line.material === 'steel' || line.material === 'copper'),
  )

const runContents = (context: VesselContext): RunOutcome | null => {
  const lines = context.system.contents
    .map((line, index) => lineFrom(context, line, index))
    .filter((line) => line !== null)
  if (lines.length < context.system.contents.length || lines.length === 0) {
    context.missing.push('the `contents` of its system, to know how much water expands')
    return null
  }
  const withMaterials = context.vessel.kind === 'thermal expansion tank' && namesMaterials(context)
  const elsewhere = materialElsewhere(context)
  const said = elsewhere ? lines.map((line) => (line.material ? line : { ...line, material: elsewhere })) : lines
  const section = contents(said, withMaterials)
  return context.calculation.run(section.method, section.given)
}

const marginOf = (context: VesselContext, assumption: string) => {
  const own = 'relief-margin' in context.vessel.fields ? context.vessel.fields['relief-margin'] : undefined
  const written = own ?? context.system.pressure['relief-margin']
  if (written) {
    const as = written.value.kind === 'ratio' ? ('ratio' as const) : ('pressure difference' as const)
    return { as, given: fromSpec(written) }
  }
  const assumed = context.register.number(assumption, context.reference)
  const as = assumed.kind === 'ratio' ? ('ratio' as const) : ('pressure difference' as const)
  return { as, given: assumed }
}

const runClosedPressures = (context: VesselContext, rule: PressureRule, atmosphere: number): RunOutcome | null => {
  const { system, register, reference, missing } = context
  const { pressure, temperatures } = system
  const own = rule !== 'handbook' && 'precharge' in context.vessel.fields ? context.vessel.fields.precharge : undefined
  const stated = own ?? pressure.fill
  const fill = stated && gaugeFromSpec(stated, atmosphere)
  const height = pressure['static-height']
  if (!fill && !height) missing.push('`pressure.static-height` or `pressure.fill`, to know the fill pressure')
  const relief = pressure['relief-valve'] && gaugeFromSpec(pressure['relief-valve'], atmosphere)
  const maximum = pressure.maximum && gaugeFromSpec(pressure.maximum, atmosphere)
  if (!relief && !maximum)
    missing.push('`pressure.relief-valve` or `pressure.maximum`, to know the highest pressure allowed')
  const fillTemperature = temperatures.fill ?? temperatures.low
  // Given outright, the pressures need no density.
  const needsDensity = !fill || (!maximum && (pressure['relief-height']?.value.value ?? 0) !== 0)
  if (!fillTemperature && needsDensity)
    missing.push('`temperatures.low` or `temperatures.fill`, to know how cold the water gets')
  if (missing.length > 0) return null

  let pumpHead: { as: 'length' | 'pressure difference'; given: GivenValue } | undefined
  if (!fill) {
    const written = pressure['vessel-connection']?.value
    const connection = written ?? register.words('vessel-connection', reference)
    if (connection === 'pump discharge') {
      const head = pressure['pump-head']
      if (!head) {
        missing.push('`pressure.pump-head`, because the vessel is connected at the pump discharge')
        return null
      }
      pumpHead = { as: head.value.kind === 'length' ? 'length' : 'pressure difference', given: fromSpec(head) }
    }
  }
  const margin = pressure['top-margin']
  const topMarginId = rule === 'handbook' ? 'top-margin' : 'top-margin.european'
  const facts = {
    ...(fill ? { fill } : {}),
    ...(maximum ? { maximum } : {}),
    ...(height ? { staticHeight: fromSpec(height) } : {}),
    ...(fill
      ? {}
      : { topMargin: margin ? gaugeFromSpec(margin, atmosphere) : register.number(topMarginId, reference) }),
    ...(fillTemperature ? { fillTemperature: fromSpec(fillTemperature) } : {}),
    ...(relief && !maximum
      ? {
          reliefSet: relief,
          reliefHeight: pressure['relief-height']
            ? fromSpec(pressure['relief-height'])
            : register.number('relief-height', reference),
          ...(rule === 'european' ? {} : { reliefMargin: marginOf(context, 'relief-margin.hydronic') }),
        }
      : {}),
    ...(pumpHead ? { pumpHead } : {}),
  }
  const section = closedPressures(facts, rule)
  return context.calculation.run(section.method, section.given)
}

const runDomesticPressures = (
  context: VesselContext,
  atmosphere: number,
  limits: 'with limits' | 'incoming only',
): RunOutcome | null => {
  const { pressure } = context.system
  const gauge = (key: 'supply' | 'regulator' | 'maximum' | 'relief-valve') => {
    const written = pressure[key]
    return written ? gaugeFromSpec(written, atmosphere) : undefined
  }
  const supply = gauge('supply')
  const regulator = gauge('regulator')
  const limited = limits === 'with limits'
  const maximum = limited ? gauge('maximum') : undefined
  const reliefSet = limited ? gauge('relief-valve') : undefined
  const cap =
    limited && adoptsPlumbingCap(context.spec)
      ? context.register.number('thermal-expansion-cap', context.reference)
      : undefined
  if (!supply && !regulator)
    context.missing.push('`pressure.supply` or `pressure.regulator`, to know the pressure at the vessel')
  if (limited && !maximum && !reliefSet && !cap)
    context.missing.push('`pressure.relief-valve` or `pressure.maximum`, to know the highest pressure allowed')
  if (context.missing.length > 0) return null
  const section = domesticPressures({
    ...(supply ? { supply } : {}),
    ...(regulator ? { regulator } : {}),
    ...(maximum ? { maximum } : {}),
    ...(reliefSet ? { reliefSet, reliefMargin: marginOf(context, 'relief-margin.domestic') } : {}),
    ...(cap ? { cap } : {}),
  })
  return context.calculation.run(section.method, section.given)
}

const runMaterial = (context: VesselContext): RunOutcome => {
  const { calculation, register, reference, vessel } = context
  const written = 'material' in vessel.fields ? vessel.fields.material?.value : undefined
  const material = written ?? register.words('material', reference)
  const name = 'linear expansion of the piping'
  if (material === 'none') {
    calculation.input('alpha', 'per temperature difference', name, {
      value: 0,
      origin: { from: 'spec', path: `${vessel.path}.material` },
    })
  } else {
    calculation.input(
      'alpha',
      'per temperature difference',
      name,
      register.number(`linear-expansion.${material}`, reference),
    )
  }
  return { failed: [], warnings: [], notFinite: null }
}

const runSite = (context: VesselContext): RunOutcome => {
  const written = context.spec.project.elevation
  const Z = written ? fromSpec(written) : context.register.number('elevation', context.reference)
  return context.calculation.run(site, { Z })
}

const titles: Readonly<Record<SectionId, string>> = {
  site: 'Site',
  contents: 'Contents',
  material: 'Material',
  'handbook pressures': 'Pressures',
  'european pressures': 'Pressures',
  'british pressures': 'Pressures',
  'domestic pressures': 'Pressures',
  'incoming pressure': 'Pressures',
  fixtures: 'Demand',
  people: 'Demand',
  apartments: 'Demand',
  'units served': 'Demand',
}

/** Computes one section into the calculation; null where an input is missing, which is then said in `context.missing`. */
export const runSection = (context: VesselContext, section: SectionId, atmosphere: number): RunOutcome | null => {
  context.calculation.section(titles[section])
  switch (section) {
    case 'site':
      return runSite(context)
    case 'contents':
      return runContents(context)
    case 'material':
      return runMaterial(context)
    case 'handbook pressures':
      return runClosedPressures(context, 'handbook', atmosphere)
    case 'european pressures':
      return runClosedPressures(context, 'european', atmosphere)
    case 'british pressures':
      return runClosedPressures(context, 'british', atmosphere)
    case 'domestic pressures':
      return runDomesticPressures(context, atmosphere, 'with limits')
    case 'incoming pressure':
      return runDomesticPressures(context, atmosphere, 'incoming only')
    case 'fixtures':
      return runFixtures(context)
    case 'people':
      return runPeople(context)
    case 'apartments':
      return runApartments(context)
    case 'units served':
      return runUnitsServed(context)
  }
}

export { numberFromSpec }
