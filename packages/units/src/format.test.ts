import { describe, expect, it } from 'vitest'
import { UNITS, toSi, unitOf } from './convert.ts'
import { formatIn, formatNumber, formatQuantity, formatValue, printedUnit, unitLabel } from './format.ts'
import { KINDS, type Kind } from './kind.ts'
import { parseQuantity } from './parse.ts'

const quantity = (kind: Kind, number: number, symbol: string) => ({ kind, value: toSi(number, unitOf(kind, symbol)) })

describe('formatNumber', () => {
  // Rounding to significant digits is arithmetic; expected texts by hand.
  it.each([
    [344.2, 3, '344'],
    [12345, 3, '12300'],
    [99.96, 3, '100'],
    [999.6, 3, '1000'],
    [0.99999, 2, '1.0'],
    [12, 3, '12.0'],
    [0.031, 3, '0.0310'],
    [0.0000123, 2, '0.000012'],
    [0.0000065, 2, '6.5e-6'],
    [-5.25, 2, '-5.3'],
    [0, 3, '0'],
    [-0, 3, '0'],
    [1e15, 2, '1.0e15'],
    [123456789, 4, '123500000'],
    [Number.NaN, 3, '–'],
    [Number.POSITIVE_INFINITY, 3, '–'],
  ])('%d with %d digits is %s', (value, digits, text) => {
    expect(formatNumber(value, digits)).toBe(text)
  })
})

describe('formatQuantity', () => {
  it.each([
    ['volume', 344.2, 'gal', 'US', '344 gal'],
    ['volume', 344.2, 'gal', 'SI', '1300 L'],
    ['gauge pressure', 12, 'psig', 'US', '12.0 psig'],
    ['gauge pressure', 12, 'psig', 'SI', '83 kPa'],
    ['absolute pressure', 14.696, 'psia', 'US', '14.70 psia'],
    ['temperature', 180, '°F', 'US', '180 °F'],
    ['temperature', 180, '°F', 'SI', '82.2 °C'],
    ['temperature difference', 20, '°C', 'US', '36 Δ°F'],
    ['length', 5200, 'ft', 'US', '5200 ft'],
    ['diameter', 24, 'in', 'SI', '610 mm'],
    ['specific volume', 0.001, 'm3/kg', 'US', '0.016018 ft³/lb'],
    ['count', 12, '1', 'US', '12'],
    ['ratio', 0.0312, '1', 'US', '0.0312'],
  ] as const)('%s %d %s in %s', (kind, number, symbol, system, text) => {
    const found = symbol === '°C' ? { kind, value: number } : quantity(kind, number, symbol)
    expect(formatQuantity(found, system)).toBe(text)
  })

  it('shows as many digits as are asked for', () => {
    expect(formatQuantity(quantity('volume', 344.234, 'gal'), 'US', { digits: 5 })).toBe('344.23 gal')
    expect(formatValue(quantity('temperature', 180.25, '°F'), 'US', { digits: 5 })).toBe('180.25')
    expect(formatIn(quantity('gauge pressure', 1.5, 'bar g'), 'bar g')).toBe('1.50 bar g')
  })

  it('never writes minus zero', () => {
    expect(formatQuantity({ kind: 'gauge pressure', value: -1 }, 'SI')).toBe('0 kPa')
  })

  it('prints labels that the reader of quantities understands', () => {
    const misread = UNITS.filter((unit) => {
      const read = parseQuantity(`3 ${printedUnit(unit)}`, [unit.kind])
      return unit.symbol !== '1' && (!read.ok || read.unit !== unit)
    })
    expect(misread).toEqual([])
  })

  it('shows every kind in both systems as a text that reads back as the same quantity', () => {
    const texts = (Object.keys(KINDS) as Kind[]).flatMap((kind) =>
      (['US', 'SI'] as const).map((system) => ({
        kind,
        text: formatQuantity({ kind, value: 300 }, system, { digits: 12 }),
      })),
    )
    const strayed = texts.filter(({ kind, text }) => {
      const read = parseQuantity(text, [kind])
      return !read.ok || Math.abs(read.quantity.value / 300 - 1) > 1e-10
    })
    expect(strayed).toEqual([])
  })

  it('labels headers', () => {
    expect([
      unitLabel('volume', 'US'),
      unitLabel('gauge pressure', 'US'),
      unitLabel('gauge pressure', 'SI'),
      unitLabel('temperature', 'US'),
      unitLabel('ratio', 'US'),
    ]).toEqual(['gal', 'psig', 'kPa', '°F', ''])
  })
})
