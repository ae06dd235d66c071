import { formulaTree } from '@coldfill/formula'
import { describe, expect, it } from 'vitest'
import { emitFormula } from './emit-formula.ts'

const emit = (text: string): string =>
  emitFormula(formulaTree(text), {
    symbol: (name) => name.toUpperCase(),
    call: (tree, args) => `${tree.name}!${args.join(',')}`,
  })

describe('a formula for a spreadsheet', () => {
  // A spreadsheet gives -2^2 = 4 and 2^3^2 = 64 where the formula means -4 and 512.
  it('brackets powers and signs, which a spreadsheet groups otherwise', () => {
    expect(emit('-a ^ 2')).toBe('(-(A^2))')
    expect(emit('a ^ b ^ c')).toBe('(A^(B^C))')
    expect(emit('a - -b')).toBe('A-(-B)')
    expect(emit('(a + b) ^ -2')).toBe('((A+B)^(-2))')
  })

  it('keeps the brackets that differences and quotients need', () => {
    expect(emit('a - (b - c)')).toBe('A-(B-C)')
    expect(emit('a / (b * c)')).toBe('A/(B*C)')
    expect(emit('a * (b / c)')).toBe('A*(B/C)')
    expect(emit('(a + b) * c')).toBe('(A+B)*C')
  })

  it('writes functions that every spreadsheet program has', () => {
    expect(emit('max(a, min(b, 2))')).toBe('MAX(A,MIN(B,2))')
    expect(emit('when(a <= b, 0.9 * a, ceil(b))')).toBe('IF(A<=B,0.9*A,(-INT(-(B))))')
    expect(emit('absolute(a, b) * pi')).toBe('(A+B)*PI()')
    expect(emit('ln(a) + log10(b) + floor(a) + round(b)')).toBe('LN(A)+LOG10(B)+INT(A)+ROUND(B,0)')
  })

  it('hands a fluid function to its cells', () => {
    expect(emit('v_sat(a) / 2')).toBe('v_sat!A/2')
  })

  it('writes small numbers as a spreadsheet reads them', () => {
    expect(emit('6.8754e-6 * a')).toBe('0.0000068754*A')
    expect(emit('1e-7 * a')).toBe('1E-7*A')
  })
})
