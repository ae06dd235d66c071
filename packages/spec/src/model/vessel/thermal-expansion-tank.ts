import { choice } from '../field.ts'
import type { VesselKindDefinition } from './definition.ts'
import { closedConstruction, common, precharge, reliefMargin } from './shared-fields.ts'

export const thermalExpansionTank = {
  title: 'Thermal expansion tanks',
  doc: 'Takes up the growth of heated drinking water behind a backflow preventer or check valve.',
  example: '{ kind: thermal expansion tank }',
  services: ['domestic hot water'],
  fields: {
    ...common,
    construction: closedConstruction,
    method: choice(
      {
        aspe: 'growth of the water less growth of tank and pipes, gas law between supply and maximum pressure',
        ashrae: 'the same by the equations of the handbook',
        'din 4807-5': 'German standard for vessels in drinking water systems',
      },
      'Method by which the vessel is sized.',
      'aspe',
      { fallback: 'aspe' },
    ),
    material: choice(
      {
        steel: 'growth of steel is credited for contents that name no material',
        copper: 'growth of copper is credited for contents that name no material',
        none: 'no growth is credited for contents that name no material',
      },
      'What the heater and pipes are made of where the contents do not say.',
      'none',
      { fallback: 'none, and then an assumption' },
    ),
    precharge,
    'relief-margin': reliefMargin,
  },
  needs: [
    { keys: ['contents'], to: 'to know how much water is heated' },
    { keys: ['temperatures.cold'], to: 'to know how cold the water comes in' },
    { keys: ['temperatures.storage'], to: 'to know how hot the water is stored' },
    { keys: ['pressure.regulator', 'pressure.supply'], to: 'to know the pressure at the vessel' },
    {
      keys: ['pressure.relief-valve'],
      to: 'to know the highest pressure allowed',
      only: { key: 'method', is: ['din 4807-5'] },
    },
    { keys: ['pressure.relief-valve', 'pressure.maximum'], to: 'to know the highest pressure allowed' },
  ],
} satisfies VesselKindDefinition
