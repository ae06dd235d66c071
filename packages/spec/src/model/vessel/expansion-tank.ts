import { choice } from '../field.ts'
import { hydronicServices } from '../system.ts'
import type { VesselKindDefinition } from './definition.ts'
import { common, material, precharge, reliefMargin } from './shared-fields.ts'

export const expansionTank = {
  title: 'Expansion tanks',
  doc: 'Takes up the growth of the water in a closed or open heating or cooling loop.',
  example: '{ kind: expansion tank, construction: bladder, method: ashrae }',
  services: hydronicServices,
  fields: {
    ...common,
    construction: choice(
      {
        diaphragm: 'closed, gas and water parted by a fixed diaphragm',
        bladder: 'closed, water held in a bladder that can be replaced',
        'plain steel': 'closed, gas and water meet',
        open: 'open to the air, above the highest point of the system',
      },
      'How the vessel is built. It decides the formula.',
      'bladder',
      { fallback: 'diaphragm' },
    ),
    method: choice(
      {
        ashrae: 'growth of the water less growth of the pipes, gas law between fill and maximum pressure',
        'en 12828': 'European standard for heating systems in buildings, with a water reserve',
        'din 4807': 'German standard for closed heating systems, expansion counted from 10 °C',
        'une 100155': 'Spanish standard, with its own expansion coefficient',
        'bs 7074': 'British standard, with a check of the final pressure',
        'code minimum': 'least volume in the mechanical code, a legal floor and not a design method',
      },
      'Method by which the vessel is sized. The method moves the answer by up to 40 %.',
      'ashrae',
      { fallback: 'ashrae' },
    ),
    material,
    precharge,
    'relief-margin': reliefMargin,
  },
  needs: [
    { keys: ['contents'], to: 'to know how much water expands' },
    { keys: ['temperatures.high'], to: 'to know how hot the water gets' },
    { keys: ['temperatures.low'], to: 'to know how cold the water gets', only: { key: 'method', is: ['', 'ashrae'] } },
    {
      keys: ['temperatures.low'],
      to: 'to know how cold the glycol gets',
      only: { key: 'method', is: ['en 12828'] },
      glycol: true,
    },
    { keys: ['temperatures.low', 'temperatures.fill'], to: 'to know how cold the water gets' },
    {
      keys: ['pressure.static-height', 'pressure.fill'],
      to: 'to know the fill pressure',
      unless: { key: 'construction', is: ['open'] },
    },
    {
      keys: ['pressure.relief-valve', 'pressure.maximum'],
      to: 'to know the highest pressure allowed',
      unless: { key: 'construction', is: ['open'] },
    },
  ],
} satisfies VesselKindDefinition
