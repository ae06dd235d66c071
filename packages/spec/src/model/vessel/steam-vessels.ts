import { choice, number, quantity } from '../field.ts'
import type { VesselKindDefinition } from './definition.ts'
import { common, usableFraction } from './shared-fields.ts'

export const flashTank = {
  title: 'Flash tanks',
  doc: 'Lets hot condensate flash at a lower pressure.',
  example: '{ kind: flash tank, condensate-flow: 2000 lb/h, condensate-pressure: 100 psi, flash-pressure: 5 psi }',
  services: ['steam'],
  fields: {
    ...common,
    method: choice(
      {
        'steam velocity': 'diameter at which the velocity of the flash steam is kept',
      },
      'Method by which the vessel is sized.',
      'steam velocity',
      { fallback: 'steam velocity' },
    ),
    'condensate-flow': quantity(['mass flow'], 'Condensate that enters.', '2000 lb/h', {
      required: true,
      positive: true,
    }),
    'condensate-pressure': quantity(
      ['gauge pressure'],
      'Pressure of the steam that the condensate comes from.',
      '100 psi',
      {
        required: true,
        positive: true,
      },
    ),
    'flash-pressure': quantity(['gauge pressure'], 'Pressure in the flash tank.', '5 psi', {
      required: true,
      least: 0,
    }),
    'steam-velocity': quantity(['velocity'], 'Highest velocity of the flash steam in the tank.', '10 ft/s', {
      positive: true,
    }),
  },
  needs: [],
} satisfies VesselKindDefinition

export const blowdownSeparator = {
  title: 'Blowdown separators',
  doc: 'Cools and vents the water that is blown out of a steam boiler.',
  example: '{ kind: blowdown separator, blown-volume: 60 gal, boiler-pressure: 100 psi }',
  services: ['steam'],
  fields: {
    ...common,
    method: choice(
      {
        'blown volume': 'twice the volume blown',
        'level drop': 'twice the volume of a drop of the boiler level',
      },
      'Method by which the vessel is sized.',
      'blown volume',
      { fallback: 'the method whose keys are given' },
    ),
    'blown-volume': quantity(['volume'], 'Water blown out at once.', '60 gal', { positive: true }),
    'water-surface': quantity(['area'], 'Area of the water surface in the boiler at its normal level.', '48 ft2', {
      positive: true,
    }),
    'level-drop': quantity(['length'], 'Drop of the water level in one blow.', '4 in', { positive: true }),
    'boiler-pressure': quantity(['gauge pressure'], 'Working pressure of the boiler.', '100 psi', {
      required: true,
      positive: true,
    }),
    'drain-temperature': quantity(['temperature'], 'Hottest water that the drain may take.', '140 °F'),
  },
  needs: [
    {
      keys: ['vessel.blown-volume'],
      to: 'to know how much water is blown out',
      only: { key: 'method', is: ['blown volume'] },
    },
    {
      keys: ['vessel.water-surface'],
      to: 'to know how much water is blown out',
      only: { key: 'method', is: ['level drop'] },
    },
    {
      keys: ['vessel.blown-volume', 'vessel.water-surface'],
      to: 'to know how much water is blown out',
      only: { key: 'method', is: [''] },
    },
  ],
} satisfies VesselKindDefinition

export const condensateReceiver = {
  title: 'Condensate receivers',
  doc: 'Collects condensate ahead of a pump.',
  example: '{ kind: condensate receiver, steaming-rate: 3450 lb/h }',
  services: ['steam'],
  fields: {
    ...common,
    method: choice(
      {
        'holding time': 'flow of the pump for a time',
      },
      'Method by which the vessel is sized.',
      'holding time',
      { fallback: 'holding time' },
    ),
    duty: choice(
      { condensate: 'returns condensate', 'boiler feed': 'feeds the boiler' },
      'What the pump of the receiver does.',
      'condensate',
      { fallback: 'condensate' },
    ),
    'steaming-rate': quantity(['mass flow'], 'Steam that the boilers make at full load.', '3450 lb/h', {
      required: true,
      positive: true,
    }),
    'pump-factor': number('Flow of the pump as a multiple of the steaming rate.', '3', { least: 1 }),
    'holding-time': quantity(['time'], 'Time for which the receiver holds the flow.', '1 min', { positive: true }),
    'usable-fraction': usableFraction,
  },
  needs: [],
} satisfies VesselKindDefinition
