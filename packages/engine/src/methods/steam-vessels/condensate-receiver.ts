import { cite, type Citation } from '../../citation.ts'
import { assumed, defineMethod, keyed, step, type Method } from '../../method.ts'
import { commonPractice } from '../../sources/common-practice.ts'
import { heatBalance } from '../../sources/heat-balance.ts'
import { steamColumnist } from '../../sources/steam-columnist.ts'

const column = cite(steamColumnist, 'condensate pump and receiver')
const feed = cite(commonPractice, 'boiler feed receiver by the time of evaporation, 75 % usable, in a reprint')
const volumeOf = (source: Citation) => step('flow', 'condensate at the steaming rate', 'm_s / rho(t_cd)', source)

const steaming = {
  m_s: keyed('mass flow', 'steaming rate', 'vessel', 'steaming-rate'),
  t_cd: assumed('temperature', 'temperature of the condensate', 'condensate.temperature'),
}

const results = { 'required-volume': 'V_t', 'pump-flow': 'Q_p', 'condensate-flow': 'Q_s' } as const

const receiver = (written: boolean): Method =>
  defineMethod({
    id: written ? 'condensate-receiver.pump-capacity.stated' : 'condensate-receiver.pump-capacity',
    revision: 1,
    title: 'Condensate receiver by the capacity of its pump',
    vessel: {
      kind: 'condensate receiver',
      method: 'holding time',
      ...(written ? { when: { chosen: { duty: ['condensate'] } } } : {}),
    },
    inputs: {
      ...steaming,
      F_p: keyed(
        'count',
        'flow of the pump, multiple of the steaming rate',
        'vessel',
        'pump-factor',
        'condensate.pump-factor',
      ),
      tau: keyed(
        'time',
        'time for which the receiver holds the flow of the pump',
        'vessel',
        'holding-time',
        'condensate.holding-time',
      ),
      f_u: keyed('ratio', 'usable part of the receiver', 'vessel', 'usable-fraction', 'condensate.usable-fraction'),
    },
    steps: {
      Q_s: volumeOf(column),
      Q_p: step('flow', 'flow of the pump', 'F_p * Q_s', column),
      V_t: step('volume', 'required volume', 'Q_p * tau / f_u', column),
    },
    checks: [],
    results,
    ...(written ? {} : { assumes: ['condensate.duty'] }),
    basis:
      'The pump returns three times the steaming rate and the receiver holds one minute of it. A rule of the trade press without a standard behind it; the receiver is vented.',
    examples: [
      {
        id: 'column-8000-ft2',
        title: '8,000 ft2 EDR: 4 gpm of condensate, pump of 12 gpm',
        origin: 'published',
        source: column,
        given: { m_s: '1978.77 lb/h', t_cd: '212 °F', F_p: '3', tau: '1 min', f_u: '1' },
        expected: { Q_s: '4 gpm', Q_p: '12 gpm', V_t: '12 gal' },
        tolerance: 0.035,
        because:
          'The column rounds to half a gallon a minute for each 1,000 ft2; 240 Btu/h a square foot over 970.3 Btu/lb give 4.1 gpm at 212 °F.',
      },
    ],
  })

export const condensateReceiverStated = receiver(true)
export const condensateReceiver = receiver(false)

export const boilerFeedReceiver = defineMethod({
  id: 'condensate-receiver.boiler-feed',
  revision: 1,
  title: 'Boiler feed receiver by the time of evaporation',
  vessel: { kind: 'condensate receiver', method: 'holding time', when: { chosen: { duty: ['boiler feed'] } } },
  inputs: {
    ...steaming,
    F_p: keyed(
      'count',
      'flow of the pump, multiple of the steaming rate',
      'vessel',
      'pump-factor',
      'boiler-feed.pump-factor',
    ),
    tau: keyed(
      'time',
      'time for which the receiver holds the evaporation',
      'vessel',
      'holding-time',
      'boiler-feed.holding-time',
    ),
    f_u: keyed('ratio', 'usable part of the receiver', 'vessel', 'usable-fraction', 'boiler-feed.usable-fraction'),
  },
  steps: {
    Q_s: volumeOf(feed),
    Q_p: step('flow', 'flow of the pump', 'F_p * Q_s', feed),
    V_t: step('volume', 'required volume', 'Q_s * tau / f_u', feed),
  },
  checks: [],
  results,
  basis:
    'The receiver holds the evaporation of the boilers for the time that condensate takes to come back, with a part of it usable. A trade rule without a standard behind it; half an hour for spread systems.',
  examples: [
    {
      id: 'feed-3450-lb-h',
      title: '3,450 lb/h for 20 minutes, 75 % usable',
      origin: 'by hand',
      source: cite(heatBalance, 'with 7.996 lb/gal at 212 °F, steam tables from memory'),
      given: { m_s: '3450 lb/h', t_cd: '212 °F', F_p: '2', tau: '20 min', f_u: '0.75' },
      expected: { Q_s: '7.191 gpm', Q_p: '14.38 gpm', V_t: '191.8 gal' },
      tolerance: 0.001,
      because: 'By hand: 3,450 / 7.996 / 60, then times 20 over 0.75; four digits.',
    },
  ],
})
