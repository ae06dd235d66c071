import { choice, number, quantity } from '../field.ts'
import { pressureReading } from '../system.ts'
import type { Need, VesselKindDefinition } from './definition.ts'
import { closedConstruction, common } from './shared-fields.ts'

export const pressureTank = {
  title: 'Pressure tanks',
  doc: 'Gives water between two starts of a pump.',
  example: '{ kind: pressure tank, pump-flow: 50 gpm, starts-per-hour: 6 }',
  services: ['domestic cold water'],
  fields: {
    ...common,
    construction: closedConstruction,
    method: choice(
      {
        drawdown: 'the drawdown is given',
        'run time': 'the flow of the pump for its least run time',
        'starts per hour': 'a quarter of a cycle at half the flow of the pump',
        'off time': 'the least demand while variable-speed pumps stay off',
        'ten states': 'ten minutes of the largest pump, for public water systems',
      },
      'How the drawdown is found.',
      'starts per hour',
      { fallback: 'the method whose keys are given' },
    ),
    'pump-flow': quantity(['flow'], 'Flow of one pump at cut-in.', '50 gpm', { positive: true }),
    'starts-per-hour': number('Most starts of the pump in an hour.', '6', { least: 0 }),
    'run-time': quantity(['time'], 'Least time that the pump runs.', '2 min', { positive: true }),
    drawdown: quantity(['volume'], 'Water given between cut-out and cut-in.', '25 gal', { positive: true }),
    'low-demand': quantity(['flow'], 'Least demand, at which variable-speed pumps stop.', '4 gpm', {
      positive: true,
    }),
    'off-time': quantity(['time'], 'Time for which the pumps stay off at the least demand.', '5 min', {
      positive: true,
    }),
    precharge: quantity(pressureReading, 'Pressure of the gas when the vessel is empty of water.', '38 psi', {
      fallback: '2 psi below cut-in, and then an assumption',
      positive: true,
    }),
  },
  needs: [
    ...(['starts-per-hour', 'run-time'] as const).map((key): Need => ({
      keys: ['vessel.pump-flow'],
      to: 'to know the drawdown',
      only: { key: 'method', is: [''] },
      askedBy: [key],
      liftedBy: ['drawdown', 'off-time'],
    })),
    {
      keys: ['vessel.low-demand'],
      to: 'to know the drawdown',
      only: { key: 'method', is: [''] },
      askedBy: ['off-time'],
      liftedBy: ['drawdown', 'run-time', 'starts-per-hour'],
    },
    {
      keys: ['vessel.pump-flow', 'vessel.drawdown', 'vessel.low-demand'],
      to: 'to know the drawdown',
      only: { key: 'method', is: [''] },
    },
    {
      keys: ['vessel.starts-per-hour', 'vessel.run-time', 'vessel.drawdown', 'vessel.off-time'],
      to: 'to know the drawdown',
      only: { key: 'method', is: [''] },
    },
    { keys: ['vessel.drawdown'], to: 'to be sized by drawdown', only: { key: 'method', is: ['drawdown'] } },
    ...(['vessel.run-time', 'vessel.pump-flow'] as const).map((key): Need => ({
      keys: [key],
      to: 'to be sized by run time',
      only: { key: 'method', is: ['run time'] },
    })),
    ...(['vessel.starts-per-hour', 'vessel.pump-flow'] as const).map((key): Need => ({
      keys: [key],
      to: 'to be sized by starts per hour',
      only: { key: 'method', is: ['starts per hour'] },
    })),
    ...(['vessel.low-demand', 'vessel.off-time'] as const).map((key): Need => ({
      keys: [key],
      to: 'to be sized by off time',
      only: { key: 'method', is: ['off time'] },
    })),
    { keys: ['vessel.pump-flow'], to: 'to be sized by ten states', only: { key: 'method', is: ['ten states'] } },
    { keys: ['pressure.cut-in'], to: 'to know when the pump starts' },
    { keys: ['pressure.cut-out'], to: 'to know when the pump stops' },
  ],
} satisfies VesselKindDefinition
