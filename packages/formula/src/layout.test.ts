import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Box } from './box.ts'
import { equationBox, layout } from './layout.ts'
import { layoutSymbol } from './layout-symbol.ts'
import { toMathML } from './mathml.ts'
import { formulaTree, parseFormula } from './parse.ts'
import { spoken, toPlainText } from './plain.ts'
import { functions } from './testing/random-formula.ts'
import type { Tree } from './tree.ts'

const plain = (text: string, numbers?: Record<string, string>): string =>
  toPlainText(layout(formulaTree(text), numbers ? { numbers, functions } : { functions }))

describe('brackets', () => {
  it.each([
    ['3*alpha*(t_h-t_l)', '3 · α · (t_h − t_l)'],
    ['v_h / v_l - 1 - 3 * alpha * (t_h - t_l)', 'v_h / v_l − 1 − 3 · α · (t_h − t_l)'],
    ['V_e / (1 - P_1 / P_2)', 'V_e / (1 − P_1 / P_2)'],
    ['(a + b) / (c * d)', '(a + b) / (c · d)'],
    ['a / b / c', 'a / b / c'],
    ['a / (b / c)', 'a / (b / c)'],
    ['a * (b / c)', 'a · (b / c)'],
    ['a - (b - c)', 'a − (b − c)'],
    ['a - b + c', 'a − b + c'],
    ['a + -b', 'a + (−b)'],
    ['a * -b', 'a · (−b)'],
    ['-a * b', '−a · b'],
    ['-(a + b)', '−(a + b)'],
    ['-a^2', '−a^2'],
    ['(-a)^2', '(−a)^2'],
    ['(a^b)^c', '(a^b)^c'],
    ['a^b^c', 'a^(b^c)'],
    ['(a / b)^-2', '(a / b)^(−2)'],
    ['2[L]^2', '(2[L])^2'],
    ['6.5e-6 * x^2', '6.5e-6 · x^2'],
    ['absolute(p_f, p_a) / absolute(p_m, p_a)', '(p_f + p_a) / (p_m + p_a)'],
    ['V * absolute(p_f, p_a)', 'V · (p_f + p_a)'],
    ['gauge(P_1, p_a) - 3[psi]', 'P_1 − p_a − 3[psi]'],
    ['celsius(t_l) + celsius(t_l - t_h)', 'celsius(t_l) + celsius(t_l − t_h)'],
    ['when(a < b, c, when(a = b, d, e + f)) + 1', '(when(a < b, c, when(a = b, d, e + f))) + 1'],
    ['sqrt(a + b)^2 + abs(a - b) + log10(c) + min(a, b, c)', 'sqrt(a + b)^2 + abs(a − b) + log10(c) + min(a, b, c)'],
    ['v_sat(t_h) * pi', 'v_sat(t_h) · π'],
    ['a <= b + c', 'a ≤ b + c'],
  ])('%s is drawn as %s', (text, expected) => expect(plain(text)).toBe(expected))

  it('puts numbers in place of symbols, with the brackets that negative numbers need', () => {
    const numbers = { a: '-5', b: '1.2e-6', c: '12.0 psi' }
    expect(plain('3 - a', numbers)).toBe('3 − (−5)')
    expect(plain('a - 3 + b * a', numbers)).toBe('−5 − 3 + 1.2e-6 · (−5)')
    expect(plain('a^2 + b^2 + c^2 + d^2', numbers)).toBe('(−5)^2 + (1.2e-6)^2 + (12.0[psi])^2 + d^2')
  })
})

describe('symbols', () => {
  it.each<[string, Box]>([
    ['V', { box: 'identifier', text: 'V' }],
    ['rho', { box: 'identifier', text: 'ρ' }],
    ['P_1', { box: 'subscript', base: { box: 'identifier', text: 'P' }, sub: { box: 'number', text: '1' } }],
    ['V_s', { box: 'subscript', base: { box: 'identifier', text: 'V' }, sub: { box: 'identifier', text: 's' } }],
    ['v_sat_h', { box: 'subscript', base: { box: 'identifier', text: 'v' }, sub: { box: 'word', text: 'sat,h' } }],
    [
      'Delta_t',
      {
        box: 'row',
        items: [
          { box: 'identifier', text: 'Δ' },
          { box: 'identifier', text: 't' },
        ],
      },
    ],
    ['Delta_1', { box: 'subscript', base: { box: 'identifier', text: 'Δ' }, sub: { box: 'number', text: '1' } }],
  ])('%s', (name, box) => expect(layoutSymbol(name)).toEqual(box))

  it('come back from their drawing', () => {
    for (const name of [
      'V_s',
      'eta',
      'alpha_p_2',
      'Delta_t_h',
      'Delta_rho',
      'Delta_rho_max',
      'Delta',
      'Delta_2',
      'NPSH_a',
      'pi_x',
      'x1',
      'a__b',
      'a_',
      '_',
    ]) {
      if (name === '_') continue
      const { tree } = parseFormula(toPlainText(layoutSymbol(name)))
      expect(tree).toMatchObject({ type: 'symbol', name })
    }
  })
})

const at = { start: 0, end: 0 }
const leaf: fc.Arbitrary<Tree> = fc.oneof(
  fc
    .constantFrom('a', 'V_s', 'rho_c', 'Delta_t_h', 'pi', 'P_1', 'alpha')
    .map((name): Tree => ({ type: 'symbol', name, at })),
  fc
    .constantFrom('1', '2.50', '0.04', '6.5e-6', '1.2e+7', '3e12')
    .map((text): Tree => ({ type: 'number', value: Number(text), text, at })),
  fc
    .constantFrom('3[L]', '6.5e-6[1/Δ°F]', '14.696[psia]', '9.80665[m/s2]', '68[°F]', '5[%]')
    .map((text) => formulaTree(text)),
)
const { tree: randomTree } = fc.letrec<{ tree: Tree; condition: Tree }>((tie) => ({
  tree: fc.oneof(
    { maxDepth: 5 },
    leaf,
    tie('tree').map((operand): Tree => ({ type: 'negate', operand, at })),
    ...(['+', '-', '*', '/', '^'] as const).map((operator) =>
      fc.tuple(tie('tree'), tie('tree')).map(([left, right]): Tree => ({ type: 'binary', operator, left, right, at })),
    ),
    fc
      .tuple(
        fc.constantFrom('sqrt', 'abs', 'exp', 'ln', 'log10', 'round', 'celsius', 'fahrenheit', 'v_sat'),
        tie('tree'),
      )
      .map(([name, arg]): Tree => ({ type: 'call', name, args: [arg], at })),
    fc
      .tuple(fc.constantFrom('min', 'max', 'absolute', 'gauge'), tie('tree'), tie('tree'))
      .map(([name, ...args]): Tree => ({ type: 'call', name, args, at })),
    fc
      .tuple(tie('condition'), tie('tree'), tie('tree'))
      .map((args): Tree => ({ type: 'call', name: 'when', args, at })),
  ),
  condition: fc
    .tuple(fc.constantFrom('<', '<=', '>', '>=', '=' as const), tie('tree'), tie('tree'))
    .map(([operator, left, right]): Tree => ({ type: 'compare', operator, left, right, at })),
}))

/**
 * What a drawing cannot tell apart is made the same: absolute() and gauge() are a sum and a difference, and
 * (−a) · b, −(a · b), (−a) / b and −(a / b) are the same number to the last bit.
 */
const same = (tree: Tree): unknown => {
  if (tree.type === 'number') return [tree.value, tree.unit]
  if (tree.type === 'symbol') return tree.name
  if (tree.type === 'negate') return ['negate', same(tree.operand)]
  if (tree.type === 'call') {
    const drawn = { absolute: '+', gauge: '-' }[tree.name] ?? tree.name
    return [drawn, ...tree.args.map(same)]
  }
  const join = (left: unknown): unknown => {
    const product = tree.operator === '*' || tree.operator === '/'
    return product && Array.isArray(left) && left[0] === 'negate'
      ? ['negate', join(left[1])]
      : [tree.operator, left, same(tree.right)]
  }
  return join(same(tree.left))
}

it('draws random trees so that the drawing reads back as the same formula', () => {
  fc.assert(
    fc.property(randomTree, (tree) => {
      const text = toPlainText(layout(tree, { functions }))
      const { tree: read, problems } = parseFormula(text)
      fc.pre(!problems.some(({ message }) => /may have 2048|deeper/.test(message)))
      expect(problems).toEqual([])
      expect(same(read!)).toEqual(same(tree))
    }),
    { numRuns: 2000 },
  )
})

describe('MathML', () => {
  it('draws fractions, subscripts, powers, roots and brackets', () => {
    expect(toMathML(layout(formulaTree('sqrt(V_s) / (a + b)^2')), { display: true })).toBe(
      '<math xmlns="http://www.w3.org/1998/Math/MathML" display="block"><mfrac><msqrt><msub><mi>V</mi><mi>s</mi></msub></msqrt>' +
        '<msup><mrow><mo fence="true" form="prefix" stretchy="true">(</mo><mrow><mi>a</mi><mo>+</mo><mi>b</mi></mrow>' +
        '<mo fence="true" form="postfix" stretchy="true">)</mo></mrow><mn>2</mn></msup></mfrac></math>',
    )
  })

  it('draws a choice as lines of a table behind a brace', () => {
    expect(toMathML(layout(formulaTree('when(a < b, c, d)')))).toContain(
      '<mo fence="true" form="prefix" stretchy="true">{</mo><mtable><mtr><mtd><mi>c</mi></mtd><mtd><mrow><mtext>if\u00A0</mtext>' +
        '<mrow><mi>a</mi><mo>&#60;</mo><mi>b</mi></mrow></mrow></mtd></mtr><mtr><mtd><mi>d</mi></mtd><mtd><mtext>otherwise</mtext></mtd></mtr></mtable>',
    )
  })

  it('escapes what is text', () => {
    const box: Box = {
      box: 'row',
      items: [
        { box: 'word', text: '<b> & "c"' },
        { box: 'operator', text: '<' },
      ],
    }
    expect(toMathML(box)).toContain('<mtext>&#60;b&#62; &#38; &#34;c&#34;</mtext><mo>&#60;</mo>')
  })

  it('is well formed, in elements of MathML Core, with the number of children each takes', () => {
    const counts: Record<string, number> = { mfrac: 2, msub: 2, msup: 2, mtr: 2, msqrt: 1 }
    const known = ['math', 'mrow', 'mi', 'mn', 'mo', 'mtext', 'mtable', 'mtd', ...Object.keys(counts)]
    fc.assert(
      fc.property(randomTree, (tree) => {
        const mistakes: string[] = []
        const open: { name: string; children: number }[] = [{ name: '', children: 0 }]
        for (const [, slash, name] of toMathML(layout(tree, { functions })).matchAll(/<(\/?)([a-z]+)[^>]*>/g)) {
          if (!known.includes(name!)) mistakes.push(name!)
          if (slash === '') {
            open.at(-1)!.children++
            open.push({ name: name!, children: 0 })
          } else {
            const closed = open.pop()!
            if (closed.name !== name || (counts[name] ?? closed.children) !== closed.children) mistakes.push(`/${name}`)
          }
        }
        expect(mistakes).toEqual([])
        expect(open).toEqual([{ name: '', children: 1 }])
      }),
      { numRuns: 200 },
    )
  })
})

describe('the words a screen reader says', () => {
  it.each([
    ['V_s * e_n', 'V sub s times e sub n'],
    ['V_e / (1 - P_1 / P_2)', 'V sub e all over 1 minus P sub 1 all over P sub 2, end of fraction, end of fraction'],
    ['v_sat(t_h)', 'specific volume of the saturated liquid at t sub h, end'],
    ['rho^2 + x^3 + y^n', 'rho squared plus x cubed plus y to the power n'],
    ['sqrt(x) <= abs(a - b)', 'the square root of x is at most the magnitude of a minus b, end'],
    ['3[L] * min(a, b)', '3 L times the least of a and b, end'],
    ['when(a > b, c, d)', 'c if a is greater than b, otherwise d'],
    ['celsius(t_h)', 't sub h in degrees Celsius'],
    ['-6.5e-6', 'minus 6.5 times 10 to the power minus 6, end of power'],
  ])('%s', (text, expected) => expect(spoken(layout(formulaTree(text), { functions }), functions)).toBe(expected))

  it('says an equation', () => {
    expect(spoken(equationBox(layoutSymbol('V_t'), layout(formulaTree('a + b'))))).toBe('V sub t equals a plus b')
  })
})
