import { describe, expect, it } from 'vitest'
import { parseStrength } from './strength.ts'

describe('parseStrength', () => {
  it.each([
    ['30 % vol', 0.3, 'volume'],
    ['30% by volume', 0.3, 'volume'],
    ['35 % mass', 0.35, 'mass'],
    ['35 % weight', 0.35, 'mass'],
    ['27.5%wt', 0.275, 'mass'],
  ])('%s', (text, value, by) => {
    const read = parseStrength(text)
    expect(read.ok && read.strength.by).toBe(by)
    expect(read.ok && read.strength.value).toBeCloseTo(value, 12)
  })

  it.each([
    ['30 %', 'no unit', ['30 % vol', '30 % mass']],
    ['30', 'no unit', ['30 % vol', '30 % mass']],
    ['30 % mol', 'unknown unit', ['30 % vol', '30 % mass']],
    ['30,5 % vol', 'decimal comma', ['30.5 % vol']],
    ['strong', 'not a number', []],
    ['', 'empty', []],
  ])('“%s” is refused: %s', (text, reason, suggestions) => {
    const read = parseStrength(text)
    expect(read.ok ? undefined : read.problem).toMatchObject({ reason, suggestions })
  })
})
