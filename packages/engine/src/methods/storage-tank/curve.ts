import { cite, citeFromMemory } from '../../citation.ts'
import { defineMethod, given, keyed, step, type WorkedExample } from '../../method.ts'
import { ashraeServiceWater } from '../../sources/ashrae-service-water.ts'
import { heatingBasis, heatingChecks, heatingInputs, heatingSteps, storageResults } from './heating.ts'

const curve = cite(ashraeServiceWater, 'recovery and storage curves by type of building, 70 % usable')

const example = (
  id: string,
  title: string,
  printed: { units: string; recovery: string; storage: string; q_r: string; V_t: string },
  tolerance: number,
  because: string,
  read: boolean,
): WorkedExample => ({
  id,
  title,
  origin: read ? 'published' : 'from memory',
  source: read
    ? cite(ashraeServiceWater, 'example 1 of the recovery and storage curves')
    : citeFromMemory(ashraeServiceWater, 'examples of the recovery and storage curves'),
  given: {
    n_u: printed.units,
    r_u: printed.recovery,
    s_u: printed.storage,
    f_u: '0.7',
    t_c: '40 °F',
    t_s: '140 °F',
  },
  expected: { q_r: printed.q_r, V_t: printed.V_t },
  tolerance,
  because,
})

export const recoveryAndStorage = defineMethod({
  id: 'storage-tank.recovery-and-storage',
  revision: 1,
  title: 'Storage tank by readings from a curve of recovery against storage',
  vessel: { kind: 'storage tank', method: 'recovery and storage', impliedBy: ['recovery', 'storage'] },
  sections: ['units served'],
  inputs: {
    n_u: given('count', 'units served'),
    r_u: keyed('hourly flow', 'recovery for each unit, read from the curve', 'vessel', 'recovery'),
    s_u: keyed('volume', 'usable storage for each unit, read from the curve', 'vessel', 'storage'),
    f_u: keyed('ratio', 'usable part of the tank', 'vessel', 'usable-fraction', 'storage.usable-fraction'),
    ...heatingInputs,
  },
  steps: {
    q_r: step('hourly flow', 'recovery', 'n_u * r_u', curve),
    V_u: step('volume', 'usable storage', 'n_u * s_u', curve),
    V_t: step('volume', 'storage volume', 'V_u / f_u', curve),
    ...heatingSteps,
  },
  checks: heatingChecks,
  results: { ...storageResults, 'usable-volume': 'V_u' },
  basis: `Recovery and usable storage for each unit are read from a curve by the consultant and typed; the tank is the usable storage divided by its usable part. The curves themselves are in the handbook. ${heatingBasis}`,
  examples: [
    example(
      'dormitory-300-students',
      'Dormitory of 300 students, least recovery',
      { units: '300', recovery: '1.1 gph', storage: '12 gal', q_r: '330 gph', V_t: '5150 gal' },
      0.0015,
      'The handbook rounds 5,143 gal up to 5,150.',
      true,
    ),
    example(
      'office-300-people',
      'Office of 300 people, least recovery',
      { units: '300', recovery: '0.1 gph', storage: '1.6 gal', q_r: '30 gph', V_t: '690 gal' },
      0.007,
      'The handbook rounds 686 gal up to 690.',
      false,
    ),
    example(
      'apartments-200',
      'Building of 200 apartments, least recovery',
      { units: '200', recovery: '2.1 gph', storage: '24 gal', q_r: '420 gph', V_t: '6900 gal' },
      0.0065,
      'The handbook rounds 6,857 gal up to 6,900.',
      false,
    ),
  ],
})
