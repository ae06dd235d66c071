import { citeFromMemory } from '../../citation.ts'
import { defineMethod, given, keyed, step, type Method } from '../../method.ts'
import { commonPractice } from '../../sources/common-practice.ts'

const practice = citeFromMemory(commonPractice, 'make-up of a glycol loop: a part of the contents, one drum at least')

const build = (pump: boolean): Method =>
  defineMethod({
    id: pump ? 'glycol-feeder.make-up.pump' : 'glycol-feeder.make-up',
    revision: 1,
    title: 'Glycol feeder by the make-up it holds',
    vessel: { kind: 'glycol feeder', method: 'make-up', ...(pump ? { when: { written: ['pump-flow'] } } : {}) },
    sections: ['contents'],
    inputs: {
      V_s: given('volume', 'system volume'),
      m_u: keyed('ratio', 'make-up held, of the contents', 'vessel', 'make-up', 'glycol-feeder.make-up'),
      V_dr: keyed('volume', 'content of a drum', 'vessel', 'drum', 'glycol-feeder.drum'),
      ...(pump ? { Q_p: keyed('flow', 'flow of the feed pump', 'vessel', 'pump-flow') } : {}),
    },
    steps: {
      V_m: step('volume', 'make-up held', 'm_u * V_s', practice),
      V_t: step('volume', 'required volume', 'max(V_m, V_dr)', practice),
      ...(pump ? { tau_p: step('time', 'time to pump the make-up', 'V_m / Q_p', practice) } : {}),
    },
    checks: [],
    results: {
      'required-volume': 'V_t',
      'system-volume': 'V_s',
      'make-up-volume': 'V_m',
      ...(pump ? { 'pump-flow': 'Q_p', 'pumping-time': 'tau_p' } : {}),
    },
    basis:
      'The tank holds a few per cent of the contents, and one whole drum at least. A trade rule without a standard or a published equation behind it. The pump has to lift above the fill pressure; the loop has no permanent connection to drinking water, and a low level stops the pump.',
    examples: [
      {
        id: 'make-up-of-3000-gal',
        title: '3 % of 3,000 gal',
        origin: 'by hand',
        source: practice,
        given: { V_s: '3000 gal', m_u: '0.03', V_dr: '55 gal', ...(pump ? { Q_p: '1.5 gpm' } : {}) },
        expected: { V_m: '90 gal', V_t: '90 gal', ...(pump ? { tau_p: '60 min' } : {}) },
        tolerance: 1e-9,
        because: 'By hand: 3,000 · 0.03, more than a drum.',
      },
      {
        id: 'drum-governs',
        title: '3 % of 1,000 gal is less than a drum',
        origin: 'by hand',
        source: practice,
        given: { V_s: '1000 gal', m_u: '0.03', V_dr: '55 gal', ...(pump ? { Q_p: '1.5 gpm' } : {}) },
        expected: { V_t: '55 gal' },
        tolerance: 1e-9,
        because: 'By hand: 30 gal is less than 55.',
      },
    ],
  })

export const glycolFeederWithPump = build(true)
export const glycolFeeder = build(false)
