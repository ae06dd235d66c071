import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { mutatedSpec } from './stress/mutated-spec.ts'
import { withstand } from './stress/withstand.ts'

// `npm run stress` does the same a hundred thousand times.
describe('mutated specs', () => {
  it('are read, formatted, completed, renamed, mended and sized without a throw', () => {
    let index = 0
    fc.assert(
      fc.property(mutatedSpec, (text) => {
        expect(() => withstand(text, index++)).not.toThrow()
      }),
      { numRuns: 2_000, seed: 1_987 },
    )
  }, 120_000)
})
