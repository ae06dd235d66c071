import { cite } from '../../citation.ts'
import { assumed, defineMethod, keyed, step } from '../../method.ts'
import { din4708Part2 } from '../../sources/din-4708-2.ts'
import { verificationEvaluation } from '../../sources/verification-evaluation.ts'

const index = cite(din4708Part2, 'demand index')

const basis =
  'A water heater of a tested performance index of at least the demand index is chosen, and a boiler of at least its continuous output. The performance index is measured by the maker, so no volume is computed here. Not for hotels or homes where all draw at once.'

export const din4708Index = defineMethod({
  id: 'storage-tank.din-4708',
  revision: 1,
  title: 'Water heater by the demand index, DIN 4708-2',
  vessel: {
    kind: 'storage tank',
    method: 'din 4708',
    impliedBy: ['demand-index'],
    when: { written: ['demand-index'] },
  },
  inputs: { N: keyed('ratio', 'demand index', 'vessel', 'demand-index') },
  steps: { N_L: step('ratio', 'least performance index of the heater', 'N', index) },
  checks: [],
  results: { 'performance-index': 'N_L', 'demand-index': 'N' },
  basis,
  examples: [
    {
      id: 'performance-at-least-demand',
      title: 'A group of dwellings with the index 10',
      origin: 'derived',
      source: cite(din4708Part2, 'choice of the heater: performance index not below demand index'),
      given: { N: '10' },
      expected: { N_L: '10' },
      tolerance: 1e-12,
      because: 'The performance index is not to be below the demand index.',
    },
  ],
})

export const din4708Dwellings = defineMethod({
  id: 'storage-tank.din-4708.dwellings',
  revision: 1,
  title: 'Water heater by the demand index of standard dwellings, DIN 4708-2',
  vessel: { kind: 'storage tank', method: 'din 4708' },
  inputs: {
    n_d: keyed('count', 'dwellings', 'demand', 'apartments'),
    p_d: assumed('count', 'people in a dwelling', 'storage.dwelling-people'),
    w_d: assumed('energy', 'heat of the largest draw in a dwelling', 'storage.dwelling-draw'),
  },
  steps: {
    N: step('ratio', 'demand index', 'n_d * p_d * w_d / (3.5 * 5820[Wh])', index),
    N_L: step('ratio', 'least performance index of the heater', 'N', index),
  },
  checks: [],
  results: { 'performance-index': 'N_L', 'demand-index': 'N' },
  basis: `Each apartment counts as a standard dwelling of four rooms, 3.5 people and one bath. ${basis}`,
  examples: [
    {
      id: 'ten-standard-dwellings',
      title: 'Ten standard dwellings have the index 10',
      origin: 'derived',
      source: cite(verificationEvaluation, 'definition of the demand index'),
      given: { n_d: '10', p_d: '3.5', w_d: '5820 Wh' },
      expected: { N: '10' },
      tolerance: 1e-12,
      because: 'The standard dwelling is the unit of the index.',
    },
  ],
})
