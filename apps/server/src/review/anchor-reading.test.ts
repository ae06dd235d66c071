import type { Anchor } from '@coldfill/contract'
import { sizeSpec } from '@coldfill/sizing'
import { describe, expect, it } from 'vitest'
import { loopSpec } from '../testing/specs.ts'
import { anchorState, type Content, readAnchor, readCarriedAnchor } from './anchor-reading.ts'

const content = (specText: string): Content => ({ specText, result: sizeSpec(specText) })
const before = content(loopSpec({ marks: ['ET-1', 'ET-2'] }))

const state = (anchor: Anchor, after: string) =>
  anchorState(readAnchor(anchor, before), readCarriedAnchor(anchor, content(after)))

describe('an anchor on a cell', () => {
  const fill: Anchor = { type: 'cell', mark: 'ET-1', column: 'fill-pressure' }

  it('is pinned where another value changed, moved where its own did, adrift where its vessel is gone', () => {
    expect(state(fill, loopSpec({ marks: ['ET-1', 'ET-2'], relief: '40 psi' }))).toBe('pinned')
    expect(state(fill, loopSpec().replace('20 ft', '21 ft'))).toBe('moved')
    expect(state(fill, loopSpec({ marks: ['ET-2'] }))).toBe('adrift')
  })

  it('is moved by a change that is too small to be seen in the rounded value', () => {
    expect(state(fill, loopSpec().replace('20 ft', '20.0001 ft'))).toBe('moved')
  })

  it('is moved, to nothing, where the vessel can no longer be sized', () => {
    const volume: Anchor = { type: 'cell', mark: 'ET-1', column: 'required-volume' }
    const unsized = loopSpec({ relief: '5 psi' })
    expect(state(volume, unsized)).toBe('moved')
    expect(readCarriedAnchor(volume, content(unsized))?.shown).toBe('—')
  })

  it('reads columns of words too', () => {
    expect(readAnchor({ type: 'cell', mark: 'ET-1', column: 'construction' }, before)?.shown).toBe('bladder')
    expect(readAnchor({ type: 'cell', mark: 'ET-1', column: 'toString' }, before)).toBeNull()
  })
})

describe('an anchor on a row', () => {
  it('is moved by any change of the row, and pinned where only the title changed', () => {
    const row: Anchor = { type: 'row', mark: 'ET-1' }
    expect(state(row, loopSpec({ marks: ['ET-1', 'ET-2'], title: 'Another' }))).toBe('pinned')
    expect(state(row, loopSpec({ marks: ['ET-1', 'ET-2'], relief: '31 psi' }))).toBe('moved')
  })
})

describe('an anchor on the spec', () => {
  const path: Anchor = { type: 'spec', path: 'systems.HWS.pressure.relief-valve' }

  it('quotes the text as written, wherever its line has gone', () => {
    expect(readAnchor(path, before)?.shown).toBe('30 psi')
    expect(state(path, `# a line more\n${loopSpec()}`)).toBe('pinned')
    expect(state(path, loopSpec({ relief: '30.0 psi' }))).toBe('moved')
    expect(state(path, loopSpec().replace('relief-valve: 30 psi', 'maximum: 27 psi'))).toBe('adrift')
  })
})
