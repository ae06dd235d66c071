import { verificationRows } from '@coldfill/engine'
import type { UnitSystem } from '@coldfill/units'
import type { DocumentOptions } from '../document-options.ts'
import { documentOptions } from './document-options.ts'

const lark = { name: 'B. Lark', initials: 'BL' }
const rowan = { name: 'A. Rowan', initials: 'AR' }

/** A grey square of two by one dots. */
const LOGO = 'iVBORw0KGgoAAAANSUhEUgAAAAIAAAABCAAAAADRSSBWAAAADElEQVR42mNoaGgAAAMEAYFL09IQAAAAAElFTkSuQmCC'

/** Options of an invented issue that has been through a review, for tests: everything that may be given is given. */
export const reviewedOptions = (units: UnitSystem, status = 'Issued for construction'): DocumentOptions => ({
  ...documentOptions(units, status),
  dispositions: [
    {
      reviewer: 'B. Lark',
      outcome: 'Revise and resubmit',
      reason: 'The precharge of ET-1 is below the static height.',
      date: '2026-11-20',
      stale: true,
    },
    { reviewer: 'B. Lark', outcome: 'Accepted as noted', reason: 'See redline 2.', date: '2026-11-30' },
  ],
  assumptionChanges: [{ assumption: 'relief-margin.hydronic', by: 'A. Rowan', date: '2026-11-18' }],
  redlines: [
    {
      number: 1,
      anchor: { type: 'cell', mark: 'ET-1', column: 'precharge' },
      quoted: '12 psig',
      proposedValue: '22.2 psig',
      mustAnswer: true,
      state: 'closed',
      messages: [
        { author: lark, at: '2026-11-20T09:30:00Z', text: 'Below the static height of the building.' },
        { author: rowan, at: '2026-11-21T14:05:00Z', text: 'Raised to the fill pressure; charge it on site.' },
      ],
    },
    {
      number: 2,
      anchor: { type: 'row', mark: 'TET-1' },
      quoted: '',
      proposedValue: null,
      mustAnswer: false,
      state: 'open',
      messages: [{ author: lark, at: '2026-11-30T10:00:00Z', text: 'Say who supplies the <drain> & "valve".' }],
    },
    {
      number: 3,
      anchor: { type: 'assumption', assumption: 'A1' },
      quoted: '',
      proposedValue: null,
      mustAnswer: false,
      state: 'open',
      messages: [{ author: lark, at: '2026-11-30T10:05:00Z', text: 'Is this the content of these convectors?' }],
    },
    {
      number: 4,
      anchor: { type: 'spec', path: 'systems.HWS.temperatures.high' },
      quoted: '180 °F',
      proposedValue: null,
      mustAnswer: false,
      state: 'open',
      messages: [{ author: lark, at: '2026-11-30T10:10:00Z', text: 'The boilers are set to 160 °F.' }],
    },
  ],
  comparison: {
    revision: '',
    changed: [
      {
        system: 'HWS',
        mark: 'ET-1',
        key: 'precharge',
        name: 'Precharge',
        kind: 'gauge pressure',
        was: 12 * 6894.757293168361,
        now: 15 * 6894.757293168361,
      },
      { system: 'DHW', mark: 'TET-1', key: 'status', name: 'Status', kind: 'words', was: 'blocked', now: 'sized' },
      {
        system: 'DHW',
        mark: 'TET-1',
        key: 'precharge',
        name: 'Precharge',
        kind: 'gauge pressure',
        was: null,
        now: 413_685,
      },
    ],
  },
  override: { reason: 'The owner accepts ET-1 as it is.', by: 'C. Heath', date: '2026-12-01' },
  logo: { data: Buffer.from(LOGO, 'base64'), type: 'png', width: 2, height: 1 },
  verification: verificationRows(),
})
