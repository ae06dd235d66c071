import { sizeSpec, vocabulary } from '@coldfill/sizing'
import { specReference } from '@coldfill/spec'
import { describe, expect, it } from 'vitest'

describe.each(specReference(vocabulary).kinds)('the example of $kind in the reference', ({ kind, sized, example }) => {
  it('is sized', () => {
    const { vessels, findings } = sizeSpec(example)
    expect(findings.filter(({ severity }) => severity === 'error')).toEqual([])
    expect(vessels.map((vessel) => [vessel.kind, vessel.status])).toEqual(sized ? [[kind, 'sized']] : [])
  })
})
