import { choice, quantity } from '../field.ts'
import { hydronicServices } from '../system.ts'
import type { VesselKindDefinition } from './definition.ts'
import { common } from './shared-fields.ts'

export const glycolFeeder = {
  title: 'Glycol feeders',
  doc: 'A tank and pump that make up a glycol loop.',
  example: '{ kind: glycol feeder, make-up: 3 %, drum: 55 gal }',
  services: hydronicServices,
  fields: {
    ...common,
    method: choice(
      {
        'make-up': 'the larger of a part of the contents and one drum',
      },
      'Method by which the vessel is sized.',
      'make-up',
      { fallback: 'make-up' },
    ),
    'make-up': quantity(['ratio'], 'Make-up held, as a part of the contents of the system.', '3 %', {
      positive: true,
    }),
    drum: quantity(['volume'], 'Content of the drum from which the tank is filled.', '55 gal', { positive: true }),
    'pump-flow': quantity(['flow'], 'Flow of the feed pump.', '1.5 gpm', { positive: true }),
  },
  needs: [{ keys: ['contents'], to: 'to know how much fluid is made up' }],
} satisfies VesselKindDefinition
