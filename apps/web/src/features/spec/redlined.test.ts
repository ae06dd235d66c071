import type { Redline } from '@coldfill/contract'
import { outlineOf } from '@coldfill/spec'
import { expect, it } from 'vitest'
import { redlinesOf } from './redlined.ts'

const outline = outlineOf(`coldfill: 1
project: { number: R-1 }
systems:
  HWS:
    service: heating water
    temperatures: { low: 50 °F, high: 180 °F }
    vessels:
      ET-1: { kind: expansion tank }
      ET-2: { kind: expansion tank }
`)

const redline = (anchor: Redline['anchor'], state: Redline['state'] = 'open') => ({ anchor, state }) as Redline

it('counts the open redlines of each vessel, and those on the spec at the innermost part', () => {
  if (!outline) throw new Error('no outline')
  const counts = redlinesOf(outline, [
    redline({ type: 'row', mark: 'ET-1' }),
    redline({ type: 'cell', mark: 'ET-1', column: 'precharge' }),
    redline({ type: 'cell', mark: 'ET-2', column: 'precharge' }, 'closed'),
    redline({ type: 'spec', path: 'systems.HWS.temperatures.high' }),
    redline({ type: 'spec', path: 'systems.HWS.vessels.ET-1.kind' }, 'pending'),
    redline({ type: 'assumption', assumption: 'elevation' }),
    redline({ type: 'row', mark: 'ET-9' }),
  ])
  expect([...counts]).toEqual([
    ['systems.HWS.vessels.ET-1', 3],
    ['systems.HWS', 1],
  ])
})
