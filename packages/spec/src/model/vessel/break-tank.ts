import { choice, quantity } from '../field.ts'
import type { VesselKindDefinition } from './definition.ts'
import { common, usableFraction } from './shared-fields.ts'

export const breakTank = {
  title: 'Break tanks',
  doc: 'Parts a drinking water system from the main and stores for its failure.',
  example: '{ kind: break tank, peak-flow: 60 gpm, holding-time: 30 min }',
  services: ['domestic hot water', 'domestic cold water'],
  fields: {
    ...common,
    method: choice(
      {
        peak: 'peak flow less refill for its length',
      },
      'Method by which the vessel is sized.',
      'peak',
      { fallback: 'peak' },
    ),
    'peak-flow': quantity(['flow'], 'Flow out of the tank at the peak.', '60 gpm', {
      required: true,
      positive: true,
    }),
    'refill-flow': quantity(['flow'], 'Flow from the main into the tank.', '20 gpm', { least: 0 }),
    'holding-time': quantity(['time'], 'Length of the peak or of the failure of the main.', '30 min', {
      required: true,
      positive: true,
    }),
    'usable-fraction': usableFraction,
  },
  needs: [],
} satisfies VesselKindDefinition
