import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { baseSpec } from './corpus/base-spec.ts'
import { parseSpec } from './parse/parse-spec.ts'
import { places } from './parse/path.ts'
import { pathAt, pathRange, textIn, valueRange } from './spec-path.ts'

const keyText = (path: string): string | null => {
  const range = pathRange(baseSpec, path)
  return range && textIn(baseSpec, range)
}

describe('pathRange', () => {
  it.each([
    ['systems.HWS', 'HWS'],
    ['systems.HWS.vessels.ET-1', 'ET-1'],
    ['systems.HWS.pressure.relief-valve', 'relief-valve'],
    ['systems.HWS.contents.1.size', 'size'],
    ['assumptions.relief-margin.hydronic', 'relief-margin.hydronic'],
    ['assumptions.relief-margin.hydronic.reason', 'reason'],
    ['project.spec-sections.expansion tank', 'expansion tank'],
  ])('of %s is the key', (path, key) => {
    expect(keyText(path)).toBe(key)
  })

  it.each(['systems.HWS.vessels.ET-9', 'systems.HWS.pressure.relief-valve.more', 'nothing', ''])(
    'of %s is nothing',
    (path) => {
      expect(pathRange(baseSpec, path)).toBeNull()
    },
  )
})

it('valueRange is the value', () => {
  const range = valueRange(baseSpec, 'systems.CWB.pressure.cut-in')
  expect(range && textIn(baseSpec, range)).toBe('40 psi')
})

describe('pathAt', () => {
  const at = (text: string, offset = 1) => pathAt(baseSpec, baseSpec.indexOf(text) + offset)
  it.each([
    ['BR-7', { path: 'project.number', part: 'value' }],
    ['relief-valve', { path: 'systems.HWS.pressure.relief-valve', part: 'key' }],
    ['ET-1:', { path: 'systems.HWS.vessels.ET-1', part: 'key' }],
    ['640 ft', { path: 'systems.HWS.contents.1.length', part: 'value' }],
  ])('inside %s', (text, place) => {
    expect(at(text)).toEqual(place)
  })

  it('finds each key where pathRange says that it stands', () => {
    const { tree, lineIndex } = parseSpec(baseSpec)
    const keys = [...places(tree)].filter(({ path }) => !/\.\d+$/u.test(path))
    expect(keys.length).toBeGreaterThan(60)
    fc.assert(
      fc.property(fc.constantFrom(...keys), ({ path }) => {
        const range = pathRange(baseSpec, path)
        expect(range && pathAt(baseSpec, lineIndex.offset(range.start) + 1)).toEqual({ path, part: 'key' })
      }),
    )
  })
})
