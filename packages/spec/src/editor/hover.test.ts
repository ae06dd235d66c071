import { describe, expect, it } from 'vitest'
import { baseSpec } from '../corpus/base-spec.ts'
import { pressureFields } from '../model/system.ts'
import { vesselKinds } from '../model/vessel.ts'
import { textIn } from '../spec-path.ts'
import { testVocabulary } from '../testing.ts'
import { hoverAt } from './hover.ts'

const at = (text: string, offset = 1) => hoverAt(baseSpec, baseSpec.indexOf(text) + offset, testVocabulary)

describe('hoverAt', () => {
  it('says what a key means, its units and its default', () => {
    const hover = at('relief-margin: 10 %')
    expect(hover).toMatchObject({
      path: 'systems.HWS.pressure.relief-margin',
      title: 'relief-margin',
      doc: pressureFields['relief-margin'].doc,
      fallback: pressureFields['relief-margin'].fallback,
    })
    expect(hover?.units).toEqual(['%', 'psi', 'bar', 'kPa'])
    expect(hover && textIn(baseSpec, hover.range)).toBe('relief-margin')
  })

  it('says what a choice means', () => {
    const hover = at('bladder')
    expect(hover?.value).toEqual({
      text: 'bladder',
      doc: vesselKinds['expansion tank'].fields.construction.choices.bladder,
    })
    expect(hover && textIn(baseSpec, hover.range)).toBe('bladder')
  })

  it('says what a name of the vocabulary means', () => {
    expect(at('convectors')?.value?.doc).toBe('5 to 6 L/kW')
    expect(at('relief-margin.hydronic')?.doc).toContain('margin below the relief valve')
  })

  it('says what a vessel is, by its mark', () => {
    expect(at('BT-1:')).toMatchObject({ title: 'BT-1', doc: vesselKinds['buffer tank'].doc })
  })

  it('says nothing between keys and of unknown ones', () => {
    expect(hoverAt(baseSpec, baseSpec.indexOf('  HWS:'), testVocabulary)).toBeNull()
    expect(hoverAt('coldfill: 1\nother: 2\n', 13, testVocabulary)).toBeNull()
  })
})
