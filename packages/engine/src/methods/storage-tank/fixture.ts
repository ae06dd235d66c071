import { cite, citeFromMemory, type Citation } from '../../citation.ts'
import { defineMethod, given, keyed, step, type Method, type WorkedExample } from '../../method.ts'
import { ashraeServiceWater } from '../../sources/ashrae-service-water.ts'
import { aspeHotWater } from '../../sources/aspe-hot-water.ts'
import { din4708Article } from '../../sources/din-4708-article.ts'
import {
  atTableTemperature,
  heatingBasis,
  heatingChecks,
  heatingInputs,
  heatingSteps,
  storageResults,
} from './heating.ts'

const handbook = cite(ashraeServiceWater, 'demand per fixture, demand factor and storage capacity factor')
const methodOne = cite(aspeHotWater, 'method 1, average hourly demand')

interface Form {
  readonly method: 'ashrae fixture' | 'aspe fixture'
  readonly source: Citation
  /** Whether the storage is divided by a usable fraction: always under aspe, where one is written under ashrae. */
  readonly divides: 'always' | 'written' | 'no'
  readonly basis: string
  readonly examples: readonly WorkedExample[]
}

const build = ({ method, source, divides, basis, examples }: Form): Method => {
  const usable =
    divides === 'always'
      ? keyed('ratio', 'usable part of the tank', 'vessel', 'usable-fraction', 'storage.usable-fraction')
      : keyed('ratio', 'usable part of the tank', 'vessel', 'usable-fraction')
  return defineMethod({
    id: `storage-tank.${method.replace(' ', '-')}${divides === 'written' ? '.usable-part' : ''}`,
    revision: 1,
    title: `Storage tank by fixtures, ${method === 'ashrae fixture' ? 'ASHRAE' : 'ASPE'}`,
    vessel:
      divides === 'written'
        ? { kind: 'storage tank', method, when: { written: ['usable-fraction'] } }
        : { kind: 'storage tank', method },
    sections: ['fixtures'],
    inputs: {
      q_f: given('hourly flow', 'possible demand'),
      f_d: given('ratio', 'demand factor'),
      f_s: given('ratio', 'storage factor'),
      ...(divides === 'no' ? {} : { f_u: usable }),
      ...heatingInputs,
    },
    steps: {
      q_r: step('hourly flow', 'recovery', 'q_f * f_d', source),
      ...(divides === 'no'
        ? { V_t: step('volume', 'storage volume', 'q_r * f_s * 1[h]', source) }
        : {
            V_u: step('volume', 'usable storage', 'q_r * f_s * 1[h]', source),
            V_t: step('volume', 'storage volume', 'V_u / f_u', source),
          }),
      ...heatingSteps,
    },
    checks: heatingChecks,
    validity: [atTableTemperature()],
    results: divides === 'no' ? storageResults : { ...storageResults, 'usable-volume': 'V_u' },
    assumes: ['storage.fixture-demand-age'],
    basis: `${basis} The fixture data predate low-flow fixtures, so the result is usually high. ${heatingBasis}`,
    examples,
  })
}

const heated: WorkedExample = {
  id: 'heat-of-80-litres',
  title: '80 L heated from 10 to 45 °C take 3,256 Wh',
  origin: 'published',
  source: cite(din4708Article, 'heat of a draw of 80 L, with 1.163 Wh/(kg·K)'),
  given: {
    q_f: '80 L/h',
    f_d: '1',
    f_s: '1',
    t_c: '10 °C',
    t_s: '45 °C',
    rho_m: '1000 kg/m3',
    c_m: '4.1868 kJ/(kg·K)',
  },
  expected: { Q_h: '3256 W', tau_h: '1 h' },
  tolerance: 0.0002,
  because: 'Printed to the whole watt hour: half a unit is 0.5 in 3,256.',
}

export const ashraeFixtureUsablePart = build({
  method: 'ashrae fixture',
  source: handbook,
  divides: 'written',
  basis:
    'Hourly demand of the fixtures, times the demand factor of the building, is the recovery; times the storage factor it is the storage. It is divided by the usable fraction because one is written.',
  examples: [
    {
      id: 'usable-part-by-hand',
      title: 'The handbook example with 80 % usable',
      origin: 'by hand',
      source: handbook,
      given: { q_f: '2520 gph', f_d: '0.30', f_s: '1.25', f_u: '0.8', t_c: '40 °F', t_s: '140 °F' },
      expected: { V_u: '945 gal', V_t: '1181.25 gal' },
      tolerance: 1e-9,
      because: 'By hand: 945 / 0.8.',
    },
  ],
})

export const ashraeFixture = build({
  method: 'ashrae fixture',
  source: handbook,
  divides: 'no',
  basis:
    'Hourly demand of the fixtures, times the demand factor of the building, is the recovery; times the storage factor it is the storage. The handbook example takes this storage as the tank, without a usable fraction.',
  examples: [
    {
      id: 'handbook-apartment-building',
      title: 'Apartment building: 2,520 gph of fixtures',
      origin: 'from memory',
      source: citeFromMemory(ashraeServiceWater, 'example of the fixture method, apartment building'),
      given: { q_f: '2520 gph', f_d: '0.30', f_s: '1.25', t_c: '40 °F', t_s: '140 °F' },
      expected: { q_r: '756 gph', V_t: '945 gal' },
      tolerance: 1e-9,
      because: 'Whole gallons without a rest.',
    },
    {
      id: 'fifty-units',
      title: '50 units: 2,300 gph of fixtures',
      origin: 'published',
      source: cite(ashraeServiceWater, 'fixture method, 50 apartments, in a reprint'),
      given: { q_f: '2300 gph', f_d: '0.30', f_s: '1.25', t_c: '40 °F', t_s: '140 °F' },
      expected: { q_r: '690 gph', V_t: '863 gal' },
      tolerance: 0.0006,
      because: 'Printed to the whole gallon: half a unit is 0.5 in 863.',
    },
    heated,
  ],
})

export const aspeFixture = build({
  method: 'aspe fixture',
  source: methodOne,
  divides: 'always',
  basis:
    'As the fixture method of ASHRAE, then divided by the usable part of the tank: 43 % more than without at 70 %.',
  examples: [
    {
      id: 'sixteen-apartments',
      title: '16 apartments: 1,104 gph of fixtures, 70 % usable',
      origin: 'published',
      source: methodOne,
      given: { q_f: '1104 gph', f_d: '0.30', f_s: '1.25', f_u: '0.70', t_c: '40 °F', t_s: '140 °F' },
      expected: { q_r: '331 gph', V_u: '414 gal', V_t: '591 gal' },
      tolerance: 0.0015,
      because: 'Each is printed to the whole gallon: half a unit is 0.5 in 331.',
    },
  ],
})
