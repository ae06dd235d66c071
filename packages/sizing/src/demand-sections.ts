import {
  apartments,
  type DemandBuilding,
  demandBuildings,
  demandFixture,
  fixtureDemand,
  fixtureFigure,
  fixtures,
  type FixtureLine,
  type GivenValue,
  isDemandLevel,
  people,
  type RunOutcome,
} from '@coldfill/engine'
import { fromSpec, numberFromSpec, report, type VesselContext } from './vessel-context.ts'

const isBuilding = (text: string): text is DemandBuilding => (demandBuildings as readonly string[]).includes(text)

/** Gallons an hour taken where the table gives a range. */
const withinRange = (context: VesselContext, [least, most]: readonly [number, number]): number => {
  const which = context.register.words('storage.fixture-demand-range', context.reference)
  return which === 'least' ? least : which === 'middle' ? (least + most) / 2 : most
}

/** The fixtures of the demand as lines of the table; a fixture without a figure for the building is a finding. */
const fixtureLines = (context: VesselContext, building: DemandBuilding): FixtureLine[] => {
  const lines: FixtureLine[] = []
  for (const [name, number] of Object.entries(context.system.demand?.fixtures ?? {})) {
    const fixture = demandFixture(name)
    const figure = fixture === undefined ? null : fixtureDemand(fixture, building)
    if (figure === null) {
      if (number.value === 0) continue
      const message = `The demand table has no figure for a ${name} in a building of the type ${building}.`
      report(context, 'CF-E014', {
        message,
        hint: 'Name another fixture or building of the table, or size by another method.',
        at: number,
      })
      context.blocked.push(message)
      continue
    }
    const gallons = typeof figure === 'number' ? figure : withinRange(context, figure)
    lines.push({ label: name, number: numberFromSpec(number), each: fixtureFigure(gallons) })
  }
  return lines
}

export const runFixtures = (context: VesselContext): RunOutcome | null => {
  const { demand } = context.system
  const building = demand?.building?.value
  if (building === undefined || !isBuilding(building))
    context.missing.push('`demand.building`, to know which column of the demand table holds')
  if (Object.keys(demand?.fixtures ?? {}).length === 0)
    context.missing.push('`demand.fixtures`, to know what draws hot water')
  if (context.missing.length > 0 || building === undefined || !isBuilding(building)) return null
  const lines = fixtureLines(context, building)
  if (context.blocked.length > 0) return null
  const section = fixtures(lines, building)
  return context.calculation.run(section.method, section.given)
}

export const runPeople = (context: VesselContext): RunOutcome | null => {
  const { vessel, register, reference } = context
  const level = 'demand-level' in vessel.fields ? vessel.fields['demand-level']?.value : undefined
  const written = 'peak-time' in vessel.fields ? vessel.fields['peak-time'] : undefined
  const chosen = level ?? register.words('storage.demand-level', reference)
  const tau: GivenValue = written ? fromSpec(written) : register.number('storage.peak-time', reference)
  const section = isDemandLevel(chosen) ? people(chosen, tau) : null
  if (!section) {
    const message = 'The table of the draw of a person reaches from 5 minutes to 3 hours; the peak lies outside it.'
    report(context, 'CF-E014', { message, hint: 'Give `peak-time` within 5 min and 3 h.', at: written })
    context.blocked.push(message)
    return null
  }
  return context.calculation.run(section.method, section.given)
}

export const runApartments = (context: VesselContext): RunOutcome | null => {
  const number = context.system.demand?.apartments
  if (!number) {
    context.missing.push('`demand.apartments`, to know how many draw hot water')
    return null
  }
  const section = apartments(numberFromSpec(number))
  return context.calculation.run(section.method, section.given)
}

/** How many the readings of a curve hold for: said at the vessel, or else the people or the apartments of the demand. */
export const runUnitsServed = (context: VesselContext): RunOutcome | null => {
  const { vessel, system } = context
  const own = 'units-served' in vessel.fields ? vessel.fields['units-served'] : undefined
  const number = own ?? system.demand?.people ?? system.demand?.apartments
  if (!number) {
    context.missing.push('`units-served`, `demand.people` or `demand.apartments`, to know how many are served')
    return null
  }
  context.calculation.input('n_u', 'count', 'units served', numberFromSpec(number))
  return { failed: [], warnings: [], notFinite: null }
}
