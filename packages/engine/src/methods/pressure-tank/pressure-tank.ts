import { cite } from '../../citation.ts'
import {
  defineMethod,
  given,
  keyed,
  step,
  type Method,
  type MethodInput,
  type MethodStep,
  type WorkedExample,
} from '../../method.ts'
import { boyle } from '../../sources/boyle.ts'
import { commonPractice } from '../../sources/common-practice.ts'
import { groundwaterColumn } from '../../sources/groundwater-column.ts'
import { idaho580108 } from '../../sources/idaho-58-01-08.ts'
import { waDoh } from '../../sources/wa-doh.ts'
import { tenStatesTank } from './ten-states.ts'

const gasLaw = cite(boyle, 'gas volume at charge, cut-in and cut-out')
const cycle = cite(waDoh, 'a quarter of a cycle at half the flow of the pump')
const offRule = cite(commonPractice, 'shutdown of variable-speed sets: the least demand for 3 to 30 minutes')
const runRule = cite(commonPractice, 'the pump runs its least time on the drawdown')

type Way = {
  readonly method: 'drawdown' | 'run time' | 'starts per hour' | 'off time'
  readonly impliedBy: readonly string[]
  readonly inputs: Readonly<Record<string, MethodInput>>
  readonly steps: Readonly<Record<string, MethodStep>>
  readonly basis: string
  readonly examples: readonly WorkedExample[]
}

const pressures = { P_a: '14.7 psia', p_on: '30 psig', p_off: '50 psig' }

const ways: readonly Way[] = [
  {
    method: 'drawdown',
    impliedBy: ['drawdown'],
    inputs: { V_d: keyed('volume', 'drawdown', 'vessel', 'drawdown') },
    steps: {},
    basis: 'The drawdown is given.',
    examples: [
      {
        id: 'column-85-gal',
        title: '85 gal tank gives 25.1 gal between 50 and 30 psig, charged to 28 psig',
        origin: 'published',
        source: cite(groundwaterColumn, 'example 1'),
        given: { ...pressures, V_d: '25.1 gal', p_0: '28 psig' },
        expected: { V_t: '85 gal' },
        tolerance: 0.0025,
        because: 'Drawdown printed with one decimal: half a unit is 0.05 in 25.1.',
      },
    ],
  },
  {
    method: 'run time',
    impliedBy: ['pump-flow', 'run-time'],
    inputs: {
      Q_p: keyed('flow', 'pump flow', 'vessel', 'pump-flow'),
      tau: keyed('time', 'least run time', 'vessel', 'run-time'),
    },
    steps: { V_d: step('volume', 'drawdown', 'Q_p * tau', runRule) },
    basis: 'The drawdown keeps the pump running for its least time.',
    examples: [
      {
        id: 'run-time-two-minutes',
        title: '10 gpm for two minutes',
        origin: 'published',
        source: cite(groundwaterColumn, 'run time rule'),
        given: { ...pressures, Q_p: '10 gpm', tau: '2 min', p_0: '30 psig' },
        expected: { V_d: '20 gal' },
        tolerance: 1e-9,
        because: 'Arithmetic only.',
      },
      {
        id: 'run-time-119-gal',
        title: '119 gal tank gives 36.8 gal between 50 and 30 psig, charged to cut-in',
        origin: 'published',
        source: cite(groundwaterColumn, '119 gal tank'),
        given: { ...pressures, Q_p: '36.8 gpm', tau: '1 min', p_0: '30 psig' },
        expected: { V_t: '119 gal' },
        tolerance: 0.0015,
        because: 'Drawdown printed with one decimal: half a unit is 0.05 in 36.8.',
      },
    ],
  },
  {
    method: 'starts per hour',
    impliedBy: ['pump-flow', 'starts-per-hour'],
    inputs: {
      Q_p: keyed('flow', 'pump flow', 'vessel', 'pump-flow'),
      N_s: keyed('count', 'most starts in an hour', 'vessel', 'starts-per-hour'),
    },
    steps: { V_d: step('volume', 'drawdown', '15[min] * Q_p / N_s', cycle) },
    basis: 'A pump starts most often when the demand is half its flow; the drawdown is a quarter of that cycle.',
    examples: [
      {
        id: 'six-starts-40-gpm',
        title: '40 gpm with six starts an hour',
        origin: 'derived',
        source: cite(idaho580108, 'six starts an hour'),
        given: { ...pressures, Q_p: '40 gpm', N_s: '6', p_0: '28 psig' },
        expected: { V_d: '100 gal' },
        tolerance: 1e-9,
        because: 'By hand: 15 · 40 / 6.',
      },
      {
        id: 'six-starts-50-gpm',
        title: '50 gpm, 40 to 60 psig, six starts an hour, charged to cut-in: the first term of the design manual',
        origin: 'derived',
        source: cite(waDoh, 'first term, without the water seal of a tank without a membrane'),
        given: { P_a: '14.7 psia', p_on: '40 psig', p_off: '60 psig', Q_p: '50 gpm', N_s: '6', p_0: '40 psig' },
        expected: { V_t: '466.875 gal' },
        tolerance: 1e-5,
        because: 'By hand: 74.7 · 15 · 50 / (20 · 6); 513.877 with the seal of 47.002.',
      },
    ],
  },
  {
    method: 'off time',
    impliedBy: ['low-demand', 'off-time'],
    inputs: {
      Q_l: keyed('flow', 'least demand, at which the pumps stop', 'vessel', 'low-demand'),
      tau: keyed('time', 'time for which the pumps stay off', 'vessel', 'off-time'),
    },
    steps: { V_d: step('volume', 'drawdown', 'Q_l * tau', offRule) },
    basis:
      'The drawdown carries the least demand while variable-speed pumps stay off. A rule of the trade, 3 to 30 minutes; large vessels let drinking water stand.',
    examples: [
      {
        id: 'off-time-five-minutes',
        title: 'Least demand of 4 gpm for five minutes',
        origin: 'by hand',
        source: offRule,
        given: { ...pressures, Q_l: '4 gpm', tau: '5 min', p_0: '28 psig' },
        expected: { V_d: '20 gal', V_t: '67.730445 gal' },
        tolerance: 1e-7,
        because: 'By hand: 20 / (42.7/44.7 − 42.7/64.7).',
      },
    ],
  },
]

const build = (way: Way, written: boolean): Method =>
  defineMethod({
    id: `pressure-tank.${way.method.replaceAll(' ', '-')}${written ? '' : '.usual-charge'}`,
    revision: 1,
    title: `Pressure tank by ${way.method}`,
    vessel: {
      kind: 'pressure tank',
      method: way.method,
      impliedBy: way.impliedBy,
      ...(written ? { when: { written: ['precharge'] } } : {}),
    },
    sections: ['site'],
    inputs: {
      P_a: given('absolute pressure', 'atmospheric pressure'),
      p_on: keyed('gauge pressure', 'cut-in pressure', 'pressure', 'cut-in'),
      p_off: keyed('gauge pressure', 'cut-out pressure', 'pressure', 'cut-out'),
      ...way.inputs,
      ...(written
        ? { p_0: keyed('gauge pressure', 'precharge', 'vessel', 'precharge') }
        : {
            dp_0: keyed(
              'pressure difference',
              'precharge below cut-in',
              'vessel',
              'precharge',
              'pressure-tank.precharge-below-cut-in',
            ),
          }),
    },
    steps: {
      ...way.steps,
      ...(written
        ? {}
        : {
            p_0: step(
              'gauge pressure',
              'precharge',
              'p_on - dp_0',
              cite(commonPractice, 'precharge 2 psi below cut-in'),
            ),
          }),
      P_0: step('absolute pressure', 'absolute precharge', 'absolute(p_0, P_a)', gasLaw),
      P_on: step('absolute pressure', 'absolute cut-in pressure', 'absolute(p_on, P_a)', gasLaw),
      P_off: step('absolute pressure', 'absolute cut-out pressure', 'absolute(p_off, P_a)', gasLaw),
      V_t: step('volume', 'required volume', 'V_d / (P_0 / P_on - P_0 / P_off)', gasLaw),
    },
    checks: [
      {
        condition: 'P_off > P_on',
        code: 'CF-E024',
        message: 'The cut-out pressure is not above the cut-in pressure, so the tank gives no water.',
        hint: 'Raise `cut-out` or lower `cut-in`.',
      },
      {
        condition: 'P_0 <= P_on',
        code: 'CF-E025',
        message: 'The precharge is above the cut-in pressure: the tank is empty before the pump starts.',
        hint: 'Charge the tank to about 2 psi below cut-in.',
      },
    ],
    results: {
      'required-volume': 'V_t',
      drawdown: 'V_d',
      precharge: 'p_0',
      'cut-in-pressure': 'p_on',
      'maximum-pressure': 'p_off',
    },
    basis: `${way.basis} The gas law between charge, cut-in and cut-out gives the tank.`,
    examples: written
      ? way.examples
      : [
          {
            id: `usual-charge-${way.method.replaceAll(' ', '-')}`,
            title: 'The usual charge is 2 psi below a cut-in of 30 psig',
            origin: 'published',
            source: cite(groundwaterColumn, 'example 1'),
            given: { ...pressures, ...(way.examples[0]?.given ?? {}), dp_0: '2 psi' },
            expected: { p_0: '28 psig' },
            tolerance: 1e-9,
            because: 'Whole psi.',
          },
        ].map(({ given: all, ...rest }) => {
          const { p_0: _p0, ...others } = all as Record<string, string>
          return { ...rest, given: others } as WorkedExample
        }),
  })

/** With a written precharge first, because it is the more particular. */
export const pressureTankMethods: readonly Method[] = [
  ...ways.flatMap((way) => [build(way, true), build(way, false)]),
  tenStatesTank,
]
