import { choice, quantity } from '../field.ts'
import type { VesselKindDefinition } from './definition.ts'
import { closedConstruction, common, precharge, reliefMargin, solarContents } from './shared-fields.ts'

export const solarExpansionTank = {
  title: 'Solar expansion tanks',
  doc: 'Takes up the growth of the fluid in a solar loop and the content of the collectors when they boil.',
  example: '{ kind: solar expansion tank, collector-volume: 12 L, piping-above: 6 L }',
  services: ['solar thermal'],
  fields: {
    ...common,
    method: choice(
      {
        idae: 'growth of the fluid, content of collectors that boil, reserve; gas law with a floor of two',
      },
      'Method by which the vessel is sized.',
      'idae',
      { fallback: 'idae' },
    ),
    ...solarContents,
    construction: closedConstruction,
    'expansion-fraction': quantity(['ratio'], 'Growth of the fluid as a part of the contents.', '8.5 %', {
      fallback: '8.5 %, and then an assumption',
      positive: true,
    }),
    'water-reserve': quantity(['volume'], 'Fluid kept in the vessel when the loop is cold.', '3 L', {
      fallback: '3 L, and then an assumption',
      least: 0,
    }),
    precharge,
    'relief-margin': reliefMargin,
  },
  needs: [
    { keys: ['contents'], to: 'to know how much fluid expands' },
    {
      keys: ['temperatures.low', 'temperatures.fill'],
      to: 'to know how cold the fluid gets',
      // The growth of the fluid is a part of its volume here; temperatures only weigh the column of liquid.
      sparedBy: ['pressure.fill', 'pressure.maximum'],
    },
    { keys: ['pressure.static-height', 'pressure.fill'], to: 'to know the fill pressure' },
    { keys: ['pressure.relief-valve', 'pressure.maximum'], to: 'to know the highest pressure allowed' },
  ],
} satisfies VesselKindDefinition

export const drainBackTank = {
  title: 'Drain-back tanks',
  doc: 'Takes the content of the collectors when the pump stops.',
  example: '{ kind: drain-back tank, collector-volume: 10 gal, piping-above: 4 gal }',
  services: ['solar thermal'],
  fields: {
    ...common,
    method: choice(
      {
        'contents above': 'collectors, piping above and reserve',
      },
      'Method by which the vessel is sized.',
      'contents above',
      { fallback: 'contents above' },
    ),
    ...solarContents,
    'water-reserve': quantity(['volume'], 'Water that stays in the tank when the loop is full.', '5 gal', {
      least: 0,
    }),
  },
  needs: [],
} satisfies VesselKindDefinition
