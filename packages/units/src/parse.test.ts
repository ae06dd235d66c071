import { describe, expect, it } from 'vitest'
import { fromSi, UNITS, unitsFor } from './convert.ts'
import { KINDS, type Kind } from './kind.ts'
import { parseQuantity } from './parse.ts'

const value = (text: string, ...kinds: Kind[]): number => {
  const read = parseQuantity(text, kinds)
  if (!read.ok) throw new Error(read.problem.message)
  return read.quantity.value
}
const problem = (text: string, ...kinds: Kind[]) => {
  const read = parseQuantity(text, kinds)
  if (read.ok) throw new Error(`${text} was read as ${read.quantity.kind} ${read.quantity.value}`)
  return read.problem
}

describe('units of the spec', () => {
  // The list of the spec language, "Quantities".
  const accepted: readonly (readonly [Kind, string])[] = [
    ...'psi psig bar mbar kPa MPa'.split(' ').map((unit) => ['gauge pressure', unit] as const),
    ['gauge pressure', 'ft water'],
    ['gauge pressure', 'm water'],
    ['pressure difference', 'psi'],
    ['pressure difference', 'ft water'],
    ['absolute pressure', 'psia'],
    ['absolute pressure', 'bar abs'],
    ['absolute pressure', 'kPa abs'],
    ...'°F °C K F C'
      .split(' ')
      .flatMap((unit) => [['temperature', unit] as const, ['temperature difference', unit] as const]),
    ...'in ft m mm'.split(' ').flatMap((unit) => [['length', unit] as const, ['diameter', unit] as const]),
    ...['gal', 'L', 'm3', 'ft3', 'imp gal'].map((unit) => ['volume', unit] as const),
    ...'gpm L/s m3/h gph'.split(' ').flatMap((unit) => [['flow', unit] as const, ['hourly flow', unit] as const]),
    ...'MBH Btu/h kW W ton'.split(' ').map((unit) => ['power', unit] as const),
    ...'min s h'.split(' ').map((unit) => ['time', unit] as const),
    ...'lb kg'.split(' ').map((unit) => ['mass', unit] as const),
    ['ratio', '%'],
  ]
  it.each(accepted)('%s in %s, with and without a space', (kind, unit) => {
    expect(value(`7.5 ${unit}`, kind)).toBe(value(`7.5${unit}`, kind))
  })

  const spellings = UNITS.flatMap((unit) =>
    [unit.symbol, ...unit.spellings].map((spelling) => ({ unit, spelling })),
  ).filter(({ spelling }) => spelling !== '1')

  it('reads every spelling of every unit as that unit, and no other', () => {
    const misread = spellings.filter(({ unit, spelling }) => {
      const read = parseQuantity(`2 ${spelling}`, [unit.kind])
      return !read.ok || read.unit !== unit
    })
    expect(misread).toEqual([])
  })

  it('has no spelling twice in a kind', () => {
    const twice = (Object.keys(KINDS) as Kind[]).flatMap((kind) => {
      const all = unitsFor(kind).flatMap((unit) => [unit.symbol, ...unit.spellings])
      return all.filter((spelling, n) => all.indexOf(spelling) !== n)
    })
    expect(twice).toEqual([])
  })

  it('round-trips through every unit to 1e-12', () => {
    const numbers = Array.from({ length: 60 }, (_, n) => (n - 20) * 1.618 ** (n / 4))
    const strayed = UNITS.filter((unit) => unit.symbol !== '1').flatMap((unit) =>
      numbers.filter((number) => {
        const back = fromSi(value(`${number} ${unit.symbol}`, unit.kind), unit)
        // The offset of a thermometer is carried in the sum, so its size counts.
        const scale = Math.max(Math.abs(number), Math.abs(unit.offset / unit.factor), 1e-9)
        return Math.abs(back - number) / scale > 1e-12
      }),
    )
    expect(strayed).toEqual([])
  })
})

describe('pressures and temperatures', () => {
  it('takes a pressure without a suffix as gauge where both may stand, and as a difference where that is asked', () => {
    const kindOf = (text: string) => {
      const read = parseQuantity(text, ['gauge pressure', 'absolute pressure', 'pressure difference'])
      return read.ok ? read.quantity.kind : undefined
    }
    for (const text of ['30 psi', '3 bar', '3 bar(g)', '30 psig']) expect(kindOf(text)).toBe('gauge pressure')
    for (const text of ['30 psia', '3 bar abs', '3 bar(a)']) expect(kindOf(text)).toBe('absolute pressure')
    const read = parseQuantity('4 psi', ['ratio', 'pressure difference'])
    expect(read.ok && read.quantity.kind).toBe('pressure difference')
  })

  it('keeps absolute readings out of gauge places and gauge readings out of differences', () => {
    expect(problem('29.4 psia', 'gauge pressure')).toMatchObject({ reason: 'wrong kind', suggestions: [] })
    expect(problem('30 psi', 'absolute pressure')).toMatchObject({ reason: 'wrong kind' })
    expect(problem('4 psig', 'pressure difference')).toMatchObject({ reason: 'wrong kind', suggestions: ['4 psi'] })
  })

  it('reads a temperature with its zero and a difference without', () => {
    expect(value('212 F', 'temperature')).toBeCloseTo(373.15, 10)
    expect(value('-40 °C', 'temperature')).toBeCloseTo(value('-40 °F', 'temperature'), 10)
    expect(value('−40 deg C', 'temperature')).toBeCloseTo(233.15, 10)
    expect(value('18 °F', 'temperature difference')).toBeCloseTo(10, 12)
    expect(problem('18 Δ°F', 'temperature').reason).toBe('wrong kind')
  })
})

describe('numbers', () => {
  it('reads scientific notation, signs and leading points', () => {
    expect(value('1.2e3 L', 'volume')).toBeCloseTo(1.2, 12)
    expect(value('1E-1 m', 'length')).toBe(0.1)
    expect(value('+.5 m', 'length')).toBe(0.5)
    expect(value('5. m', 'length')).toBe(5)
  })

  it('reads fractions for lengths and diameters only', () => {
    for (const text of ['1-1/2 in', '1 1/2 in', '1½"', '1 ½ inch', '1.5 in'])
      expect(value(text, 'diameter')).toBeCloseTo(0.0381, 12)
    expect(value('3/4 in', 'diameter')).toBeCloseTo(0.01905, 12)
    expect(problem('1-1/2 gal', 'volume').reason).toBe('not a number')
    expect(problem('1/0 in', 'diameter').reason).toBe('not a number')
  })

  it('takes a number without a unit as a count, or as a ratio where nothing else may stand', () => {
    expect(value('6', 'count')).toBe(6)
    expect(value('0.7', 'ratio')).toBe(0.7)
    expect(problem('0.1', 'ratio', 'pressure difference')).toMatchObject({
      reason: 'no unit',
      suggestions: ['10 %', '0.1 psi', '0.1 bar', '0.1 kPa'],
    })
  })
})

describe('mistakes', () => {
  const cases: readonly (readonly [
    text: string,
    kinds: readonly Kind[],
    reason: string,
    suggestions: readonly string[],
  ])[] = [
    ['', ['volume'], 'empty', []],
    ['12', ['gauge pressure'], 'no unit', ['12 psi', '12 bar', '12 kPa']],
    ['180', ['temperature'], 'no unit', ['180 °F', '180 °C']],
    ['1,200 L', ['volume'], 'thousands comma', ['1200 L']],
    ['1,234,567.5 L', ['volume'], 'thousands comma', ['1234567.5 L']],
    ['1 200 L', ['volume'], 'thousands comma', ['1200 L']],
    ['1,5 bar', ['gauge pressure'], 'decimal comma', ['1.5 bar']],
    ['0,500 m', ['length'], 'decimal comma', ['0.500 m']],
    ['1.200,5 L', ['volume'], 'decimal comma', ['1200.5 L']],
    ['600..700 ft', ['length'], 'range', []],
    ['600-700 ft', ['length'], 'range', []],
    ['600 ft to 700 ft', ['length'], 'range', []],
    ['12 pis', ['gauge pressure'], 'unknown unit', ['12 psi']],
    ['0.6 mpa', ['gauge pressure'], 'unknown unit', ['0.6 MPa']],
    ['5 mW', ['power'], 'unknown unit', ['5 MW']],
    ['12 ft', ['volume'], 'wrong kind', []],
    ['twelve psi', ['gauge pressure'], 'not a number', []],
    ['about 12 psi', ['gauge pressure'], 'not a number', ['12 psi']],
    ['Infinity psi', ['gauge pressure'], 'not a number', []],
    ['NaN psi', ['gauge pressure'], 'not a number', []],
    ['1e999 psi', ['gauge pressure'], 'not a number', []],
    ['1e308 MPa', ['gauge pressure'], 'not a number', []],
    ['5 ft 6 in', ['length'], 'not a number', ['5.5 ft']],
    ['6 gal', ['count'], 'wrong kind', []],
  ]
  it.each(cases)('“%s” as %j: %s', (text, kinds, reason, suggestions) => {
    expect(problem(text, ...kinds)).toMatchObject({ reason, suggestions })
  })

  it('says the unit and what is due in words', () => {
    expect(problem('42 ft', 'gauge pressure').message).toBe(
      '“ft” is a unit of length; a gauge pressure is due here, as in “42 psi”.',
    )
    expect(problem('12', 'gauge pressure').message).toBe('“12” needs a unit: “12 psi”, “12 bar” or “12 kPa”.')
    expect(problem('12 foo', 'time').message).toBe('“foo” is not a unit of time. Write “12 min”, “12 s” or “12 h”.')
  })

  it('suggests only texts that are read without a problem', () => {
    const suggestions = cases.flatMap(([text, kinds]) =>
      problem(text, ...kinds).suggestions.map((suggestion) => ({ suggestion, kinds })),
    )
    expect(suggestions.length).toBeGreaterThan(10)
    expect(suggestions.filter(({ suggestion, kinds }) => !parseQuantity(suggestion, kinds).ok)).toEqual([])
  })

  it('never throws, whatever the text', () => {
    const pieces = ['1', '-', '/', ',', '.', ' ', 'e', 'psi', '°', '½', '%', '\u0000', '𝟙', 'to', '(', 'm']
    let seed = 7
    const next = (): string => {
      seed = (seed * 48271) % 2147483647
      return pieces[seed % pieces.length] ?? ''
    }
    const texts = Array.from({ length: 4000 }, () => Array.from({ length: 7 }, next).join(''))
    const bad = texts.filter((text) =>
      (['gauge pressure', 'length', 'ratio'] as const).some((kind) => {
        const read = parseQuantity(text, [kind])
        return read.ok ? !Number.isFinite(read.quantity.value) : read.problem.message === ''
      }),
    )
    expect(bad).toEqual([])
  })
})
