import { choice, integer, number, quantity } from '../field.ts'
import type { VesselKindDefinition } from './definition.ts'
import { common, usableFraction } from './shared-fields.ts'

export const storageTank = {
  title: 'Storage tanks',
  doc: 'Stores hot water for the peak.',
  example: '{ kind: storage tank, method: ashrae fixture }',
  services: ['domestic hot water'],
  fields: {
    ...common,
    method: choice(
      {
        'ashrae fixture': 'hourly demand of the fixtures, demand factor, storage factor',
        'aspe fixture': 'the same, divided by the usable fraction',
        'per person': 'volume that a person draws in the peak',
        'per apartment': 'hourly demand of an apartment by the number of apartments',
        'recovery and storage': 'readings from a curve of recovery against storage, typed by you',
        'din 4708': 'German standard, demand index N of a group of dwellings',
      },
      'Method by which storage and recovery are found. Two methods may differ by 40 %.',
      'ashrae fixture',
      { required: true },
    ),
    'usable-fraction': usableFraction,
    'demand-level': choice(
      { low: 'few draw at once', medium: 'usual', high: 'many draw at once' },
      'How heavy the demand of a person is.',
      'medium',
      { fallback: 'medium' },
    ),
    'peak-time': quantity(['time'], 'Length of the peak that the store carries.', '30 min', { positive: true }),
    recovery: quantity(['hourly flow'], 'Reading of the curve: recovery for each unit served.', '1.1 gph', {
      positive: true,
    }),
    storage: quantity(['volume'], 'Reading of the curve: usable storage for each unit served.', '12 gal', {
      positive: true,
    }),
    'units-served': integer(1, 'Number of people, beds or apartments to which the readings of the curve apply.', '300'),
    'demand-index': number('Demand index N of the dwellings, where it is known.', '12', { least: 0 }),
  },
  needs: [
    {
      keys: ['demand.fixtures'],
      to: 'to know what draws hot water',
      only: { key: 'method', is: ['ashrae fixture', 'aspe fixture'] },
    },
    {
      keys: ['demand.building'],
      to: 'to know which row of the demand table holds',
      only: { key: 'method', is: ['ashrae fixture', 'aspe fixture'] },
    },
    {
      keys: ['vessel.recovery'],
      to: 'to be sized from a curve',
      only: { key: 'method', is: ['recovery and storage'] },
    },
    {
      keys: ['vessel.storage'],
      to: 'to be sized from a curve',
      only: { key: 'method', is: ['recovery and storage'] },
    },
    {
      keys: ['vessel.units-served', 'demand.people', 'demand.apartments'],
      to: 'to know how many the readings of the curve hold for',
      only: { key: 'method', is: ['recovery and storage'] },
    },
    {
      keys: ['vessel.demand-index', 'demand.apartments'],
      to: 'to be sized by din 4708',
      only: { key: 'method', is: ['din 4708'] },
    },
    { keys: ['demand.people'], to: 'to know how many draw hot water', only: { key: 'method', is: ['per person'] } },
    {
      keys: ['demand.apartments'],
      to: 'to know how many draw hot water',
      only: { key: 'method', is: ['per apartment'] },
    },
  ],
} satisfies VesselKindDefinition
