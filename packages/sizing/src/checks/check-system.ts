import { type Finding, hydronicServices, type SpecModel, type SystemModel } from '@coldfill/spec'
import { gaugeFromSpec } from '../calculate-sections.ts'
import { glycolMakeUp } from './hydronic.ts'
import { engineeringCodes, type EngineeringCode } from '../engineering-codes.ts'

const PSI = 6894.757293168361
const SIXTY_C = 333.15
/** 250 °F */
const BOILER_CODE_HOTTEST = (250 + 459.67) / 1.8
const CLOSED_LOOPS: ReadonlySet<string> = new Set(hydronicServices)
const EXPANSION_KINDS: ReadonlySet<string> = new Set(['expansion tank', 'solar expansion tank', 'drain-back tank'])

/** Checks of a system as a whole, whether or not its vessels could be sized. `atmosphere` in Pa abs. */
export const checkSystem = (_spec: SpecModel, system: SystemModel, atmosphere: number): readonly Finding[] => {
  const findings: Finding[] = []
  const report = (
    code: EngineeringCode,
    at: Pick<Finding, 'path' | 'range'>,
    message: string,
    hint: string,
    related: Finding['related'] = [],
  ) => {
    const { severity } = engineeringCodes[code]
    findings.push({ code, severity, message, hint, path: at.path, range: at.range, related, fixes: [] })
  }
  const service = system.service?.value
  const { pressure, temperatures, vessels } = system
  const relief = pressure['relief-valve']
  const domestic = service === 'domestic hot water' || service === 'domestic cold water'
  if (domestic) {
    const { supply, regulator } = pressure
    const supplyGauge = supply && gaugeFromSpec(supply, atmosphere).value
    if (supply && supplyGauge !== undefined && supplyGauge > 80.001 * PSI && !regulator) {
      report(
        'CF-E051',
        supply,
        `The supply of ${supply.value.authored ?? 'the system'} is above 80 psi and no regulator is given.`,
        'Add `regulator:` with the reduced pressure; the vessel is then charged to it.',
      )
    }
    if (
      supply &&
      regulator &&
      supplyGauge !== undefined &&
      gaugeFromSpec(regulator, atmosphere).value > supplyGauge + 1
    ) {
      report(
        'CF-E052',
        regulator,
        `The regulator is set to ${regulator.value.authored ?? 'more'}, above the supply of ${supply.value.authored ?? 'the system'}; it never raises the pressure, so the vessel stands at the supply.`,
        'Correct the supply or the regulator setting.',
        [{ message: 'The supply is given here.', path: supply.path, range: supply.range }],
      )
    }
  }
  if (service === 'domestic hot water') {
    const closed = pressure['backflow-preventer']
    const hasTank = vessels.some((vessel) => vessel.kind === 'thermal expansion tank')
    if (closed?.value === true && !hasTank) {
      report(
        'CF-E050',
        closed,
        'A backflow preventer closes this system, and it has no thermal expansion tank.',
        'Add a vessel of kind `thermal expansion tank`.',
      )
    }
    const storage = temperatures.storage
    if (storage && storage.value.value < SIXTY_C - 0.05) {
      report(
        'CF-E053',
        storage,
        `Hot water is stored at ${storage.value.authored ?? 'less than 60 °C'}, below 60 °C (140 °F).`,
        'Store at 60 °C or above and temper at the outlets, or document another control of legionella.',
      )
    } else if (storage) {
      report(
        'CF-E054',
        storage,
        `Water stored at ${storage.value.authored ?? '60 °C'} scalds within seconds.`,
        'Provide tempering as the adopted code requires.',
      )
    }
  }
  if (domestic) {
    if (relief && service === 'domestic hot water' && gaugeFromSpec(relief, atmosphere).value > 150.001 * PSI) {
      report(
        'CF-E056',
        relief,
        `The relief valve is set to ${relief.value.authored ?? 'more than 150 psi'}, above 150 psi.`,
        'Set it to 150 psi or the rating of the tank, whichever is lower.',
      )
    }
  }
  const { high } = temperatures
  const hot = high && high.value.value > BOILER_CODE_HOTTEST + 0.01 ? high : undefined
  const tight = relief && gaugeFromSpec(relief, atmosphere).value > 160.001 * PSI ? relief : undefined
  const beyond = hot ?? tight
  if (beyond && (service === 'heating water' || service === 'dual temperature water')) {
    report(
      'CF-E058',
      beyond,
      `${beyond.value.authored ?? 'This'} is above the ${hot ? '250 °F' : '160 psi'} to which the heating boiler code reaches.`,
      'Confirm the construction code and the ratings of boiler, piping and vessel.',
    )
  }
  if (system.fluid && system.fluid.base !== 'water') {
    report('CF-E061', system.fluid, glycolMakeUp, 'Schedule a feeder, or say how the loop is made up.')
  }
  const closedLoop = service !== undefined && CLOSED_LOOPS.has(service)
  if (closedLoop && vessels.length > 0 && !vessels.some(({ kind }) => EXPANSION_KINDS.has(kind))) {
    report(
      'CF-E071',
      system,
      `${system.id} is a closed loop and has no expansion tank in this spec.`,
      'Add a vessel of kind `expansion tank`, or accept this with the reason (one that exists, or stands in another spec).',
    )
  }
  const tanks = vessels.filter((vessel) => vessel.kind === 'expansion tank')
  const second = tanks[1]
  if (second) {
    report(
      'CF-E070',
      second,
      `${system.id} has ${tanks.length} expansion tanks.`,
      'Connect them at one point and charge each for its own height.',
    )
  }
  return findings
}
