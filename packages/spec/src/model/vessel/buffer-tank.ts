import { choice, quantity } from '../field.ts'
import { hydronicServices } from '../system.ts'
import type { Need, VesselKindDefinition } from './definition.ts'
import { common } from './shared-fields.ts'

/** The water of the buffer is as warm as that of its loop. */
const WARM = ['temperatures.low', 'temperatures.high'] as const

/** Needs of a method: where it is named, and where its keys ask for it and none is named. */
const byMethod = (
  method: string,
  to: string,
  keys: readonly string[],
  unnamed: Pick<Need, 'askedBy' | 'liftedBy'>,
): Need[] =>
  keys.flatMap((key): Need[] => [
    { keys: [key], to, only: { key: 'method', is: [method] } },
    { keys: [key], to, only: { key: 'method', is: [''] }, ...unnamed },
  ])

export const bufferTank = {
  title: 'Buffer tanks',
  doc: 'Adds water to a loop so that the source does not start too often.',
  example:
    '{ kind: buffer tank, source-minimum: 96 MBH, load-minimum: 10 MBH, run-time: 10 min, temperature-band: 20 °F }',
  services: hydronicServices,
  fields: {
    ...common,
    method: choice(
      {
        'run time': 'holds what the source makes beyond the load in its least run time',
        'volume per ton': 'water of the whole loop for each ton of cooling',
        'en 303-5': 'store of a solid fuel boiler that burns one charge',
        defrost: 'holds the heat that a heat pump takes to defrost',
      },
      'Method by which the vessel is sized.',
      'run time',
      { fallback: 'the method whose keys are given' },
    ),
    'source-minimum': quantity(['power'], 'Least output of the smallest source.', '96 MBH', { positive: true }),
    'load-minimum': quantity(['power'], 'Least load that can call alone.', '10 MBH', {
      fallback: 'none, and then an assumption',
      least: 0,
    }),
    'run-time': quantity(['time'], 'Least time that the source runs once it has started.', '10 min', {
      positive: true,
    }),
    'temperature-band': quantity(
      ['temperature difference'],
      'Change of temperature of the buffer between start and stop of the source.',
      '20 °F',
      {
        positive: true,
      },
    ),
    credit: quantity(['volume'], 'Water of the circuit that always flows. It is taken off.', '60 gal', {
      fallback: 'none',
      least: 0,
    }),
    'cooling-capacity': quantity(['power'], 'Capacity of the chillers that run.', '40 ton', { positive: true }),
    'volume-per-ton': quantity(['volume per power'], 'Water of the loop for each unit of cooling.', '6 gal/ton', {
      positive: true,
    }),
    'boiler-output': quantity(['power'], 'Rated output of the solid fuel boiler.', '30 kW', { positive: true }),
    'boiler-minimum': quantity(['power'], 'Least output of the solid fuel boiler.', '15 kW', { positive: true }),
    'heat-load': quantity(['power'], 'Design heat load of the building.', '25 kW', { positive: true }),
    'burn-time': quantity(['time'], 'Time that one charge of fuel burns.', '5 h', { positive: true }),
    'defrost-energy': quantity(['energy'], 'Heat that one defrost takes.', '3 kWh', { positive: true }),
  },
  needs: [
    ...byMethod(
      'run time',
      'to be sized by run time',
      ['vessel.source-minimum', 'vessel.run-time', 'vessel.temperature-band', ...WARM],
      { liftedBy: ['cooling-capacity', 'boiler-output', 'defrost-energy'] },
    ),
    ...byMethod('volume per ton', 'to be sized by volume per ton', ['vessel.cooling-capacity', 'contents'], {
      askedBy: ['cooling-capacity'],
    }),
    ...byMethod(
      'en 303-5',
      'to be sized by en 303-5',
      ['vessel.boiler-output', 'vessel.boiler-minimum', 'vessel.heat-load', 'vessel.burn-time'],
      { askedBy: ['boiler-output'], liftedBy: ['cooling-capacity'] },
    ),
    ...byMethod('defrost', 'to be sized for defrost', ['vessel.defrost-energy', 'vessel.temperature-band', ...WARM], {
      askedBy: ['defrost-energy'],
      liftedBy: ['cooling-capacity', 'boiler-output'],
    }),
  ],
} satisfies VesselKindDefinition
