import { choice, quantity } from '../field.ts'
import { hydronicServices } from '../system.ts'
import type { VesselKindDefinition } from './definition.ts'
import { common } from './shared-fields.ts'

export const airAndDirtSeparator = {
  title: 'Air and dirt separators',
  doc: 'Takes air bubbles, dirt or both out of the flow.',
  example: '{ kind: air and dirt separator, flow: 100 gpm }',
  services: hydronicServices,
  fields: {
    ...common,
    method: choice(
      {
        'entering velocity': 'bore at which the inlet velocity is kept',
      },
      'Method by which the vessel is sized.',
      'entering velocity',
      { fallback: 'entering velocity' },
    ),
    removes: choice(
      { air: 'air only', dirt: 'dirt only', 'air and dirt': 'both' },
      'What it takes out of the flow.',
      'air and dirt',
      { fallback: 'air and dirt' },
    ),
    flow: quantity(['flow'], 'Design flow through the separator.', '100 gpm', { required: true, positive: true }),
    'entering-velocity': quantity(['velocity'], 'Highest velocity at the inlet.', '4 ft/s', { positive: true }),
  },
  needs: [],
} satisfies VesselKindDefinition

export const hydraulicSeparator = {
  title: 'Hydraulic separators',
  doc: 'Parts the flow of the sources from the flow of the loads.',
  example: '{ kind: hydraulic separator, source-flow: 80 gpm, load-flow: 100 gpm }',
  services: hydronicServices,
  fields: {
    ...common,
    method: choice(
      {
        'body velocity': 'diameter at which the velocity in the body is kept',
      },
      'Method by which the vessel is sized.',
      'body velocity',
      { fallback: 'body velocity' },
    ),
    'source-flow': quantity(['flow'], 'Design flow on the side of the sources.', '80 gpm', {
      required: true,
      positive: true,
    }),
    'load-flow': quantity(['flow'], 'Design flow on the side of the loads.', '100 gpm', {
      required: true,
      positive: true,
    }),
    'body-velocity': quantity(['velocity'], 'Highest velocity in the body.', '0.4 ft/s', { positive: true }),
  },
  needs: [],
} satisfies VesselKindDefinition
