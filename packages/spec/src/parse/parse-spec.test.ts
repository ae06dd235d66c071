import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { baseSpec } from '../corpus/base-spec.ts'
import { readSpec } from '../read-spec.ts'
import { testVocabulary } from '../testing.ts'
import { maxSpecBytes } from './limits.ts'
import { parseSpec } from './parse-spec.ts'

const codes = (text: string): string[] => parseSpec(text).report.findings.map(({ code }) => code)

const milliseconds = (run: () => void): number => {
  const start = Date.now()
  run()
  return Date.now() - start
}

describe('texts that are no spec', () => {
  it.each([
    ['nothing', '', 'CF-Y022'],
    ['comments only', '# coldfill: 1\n', 'CF-Y022'],
    ['a list', '- coldfill: 1\n', 'CF-Y023'],
    ['a single text', 'coldfill\n', 'CF-Y023'],
  ])('%s', (_, text, code) => {
    expect(codes(text)).toEqual([code])
    expect(parseSpec(text).tree).toBeNull()
  })
})

describe('values as they were typed', () => {
  const { tree } = parseSpec(
    'number: 010\nedition: 1.10\nhex: 0x1F\nno: no\nempty:\ntilde: ~\nquoted: "010"\ntime: 1:30\nday: 2026-01-02\n',
  )
  it.each([
    ['number', '010'],
    ['edition', '1.10'],
    ['hex', '0x1F'],
    ['no', 'no'],
    ['tilde', '~'],
    ['quoted', '010'],
    ['time', '1:30'],
    ['day', '2026-01-02'],
  ])('%s stays %s', (key, text) => {
    expect(tree?.entries.find((entry) => entry.key === key)?.value).toMatchObject({ node: 'text', text })
  })

  it('tells nothing written from an empty text', () => {
    expect(tree?.entries.find((entry) => entry.key === 'empty')?.value).toBeNull()
  })
})

describe('keys that mean something to the machine', () => {
  it('reads `__proto__` as any other unknown key', () => {
    const { findings, model } = readSpec('coldfill: 1\n__proto__: { polluted: yes }\nconstructor: 1\n', testVocabulary)
    expect(findings.filter(({ code }) => code === 'CF-S003').map(({ path }) => path)).toEqual([
      '__proto__',
      'constructor',
    ])
    expect(model).not.toBeNull()
    expect(Object.hasOwn(Object.prototype, 'polluted')).toBe(false)
  })

  it.each(['__proto__', 'constructor', 'toString', 'hasOwnProperty'])(
    'takes %s for no choice, no field and no name',
    (word) => {
      const text = `coldfill: 1\nproject: { units: ${word}, ${word}: 1 }\nfluids: { ${word}: { base: ${word} } }\nassumptions: { ${word}: { value: 1, reason: r } }\nsystems: { A: { service: ${word}, fluid: ${word}, vessels: { V: { kind: ${word} } }, contents: [{ pipe: ${word}, size: ${word}, length: 1 m }, { estimate: ${word}, output: 1 kW }], demand: { building: ${word}, fixtures: { ${word}: 1 } } } }\n`
      const { findings } = readSpec(text, testVocabulary)
      expect(findings.map(({ code }) => code)).toEqual(
        expect.arrayContaining([
          'CF-S007',
          'CF-S003',
          'CF-S050',
          'CF-S020',
          'CF-S040',
          'CF-S042',
          'CF-S080',
          'CF-S081',
        ]),
      )
    },
  )
})

describe('texts that attack', () => {
  it('refuses a text above the limit without reading it', () => {
    const text = `coldfill: 1\n${'# '.padEnd(99, 'x')}\n`.repeat(50_000)
    expect(text.length).toBeGreaterThan(5_000_000)
    expect(codes(text)).toEqual(['CF-Y021'])
  })

  it('reads a text at the limit', () => {
    const head = 'coldfill: 1\n'
    const text = head + `#${'x'.repeat(98)}\n`.repeat(Math.floor((maxSpecBytes - head.length) / 100))
    expect(codes(text)).toEqual([])
  })

  it('refuses an alias bomb with one finding', () => {
    const levels = Array.from(
      { length: 12 },
      (_, level) => `l${level + 1}: &l${level + 1} [${Array.from({ length: 10 }, () => `*l${level}`).join(', ')}]`,
    )
    const text = `coldfill: 1\nl0: &l0 [lol]\n${levels.join('\n')}\n`
    expect(codes(text)).toEqual(['CF-Y006'])
  })

  const deep: Record<string, string> = {
    brackets: '['.repeat(300_000),
    braces: '{a: '.repeat(200_000),
    dashes: '- '.repeat(300_000),
    'question marks': '? '.repeat(300_000),
    indentation: Array.from({ length: 1_200 }, (_, level) => `${' '.repeat(level)}a:`).join('\n'),
    'closed brackets': `coldfill: ${'['.repeat(5_000)}${']'.repeat(5_000)}`,
  }
  it.each(Object.keys(deep))('refuses nesting without end by %s', (name) => {
    const found = codes(deep[name] ?? '')
    expect(found.length).toBeGreaterThan(0)
    expect(['CF-Y012', 'CF-Y001', 'CF-Y013']).toContain(found[0])
  })

  const many = Array.from({ length: 20_000 }, (_, index) => `k${index}`)
  it.each([
    ['lines', many.map((key) => `${key}: 1`).join('\n')],
    ['braces', `{${many.map((key) => `${key}: 1`).join(', ')}}`],
    ['one key again and again', 'a: 1\n'.repeat(20_000)],
  ])('refuses 20,000 keys in %s', (_, text) => {
    expect(codes(text)).toEqual(['CF-Y013'])
  })

  it('finds keys that stand twice without comparing all with all', () => {
    const text = many
      .slice(0, 9_000)
      .map((key) => `${key}: 1`)
      .join('\n')
    expect(codes(`${text}\nk0: 2\n`)).toEqual(['CF-Y018'])
  })
})

describe('any text', () => {
  const pieces = [
    '\t',
    '  ',
    '\n',
    ': ',
    '- ',
    '{',
    '}',
    '[',
    ']',
    "'",
    '"',
    '#',
    '&a ',
    '*a',
    '!t ',
    '%',
    '|',
    '>',
    '?',
    ',',
    '\u0000',
    '\ufeff',
    '\ud800',
    '<<: ',
    '---\n',
    'coldfill',
    '1,200 ft',
    'kind: ',
    '__proto__: ',
  ]

  const change = fc.record({
    at: fc.nat(baseSpec.length),
    remove: fc.nat(12),
    put: fc.oneof(fc.constantFrom(...pieces), fc.string({ maxLength: 6 })),
  })

  it('never throws for a changed spec', () => {
    fc.assert(
      fc.property(fc.array(change, { minLength: 1, maxLength: 6 }), (changes) => {
        const text = changes.reduce(
          (spec, { at, remove, put }) => spec.slice(0, at) + put + spec.slice(at + remove),
          baseSpec,
        )
        const { findings, model } = readSpec(text, testVocabulary)
        expect(model !== null || findings.some(({ severity }) => severity === 'error')).toBe(true)
      }),
      { numRuns: 500 },
    )
  })

  it('never throws for text of any sort', () => {
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string({ unit: 'binary', maxLength: 200 }),
          fc.array(fc.constantFrom(...pieces, 'a', ' ', '\n'), { maxLength: 60 }).map((parts) => parts.join('')),
        ),
        (text) => {
          const { findings, lineIndex } = readSpec(text, testVocabulary)
          for (const { range } of findings)
            expect(lineIndex.offset(range.end)).toBeGreaterThanOrEqual(lineIndex.offset(range.start))
        },
      ),
      { numRuns: 1_000, examples: [['  \uFEFF#kind: __proto__: '], ['\u00A0#k: a: b\u00A0']] },
    )
  })
})

describe('speed', () => {
  const system = baseSpec.slice(baseSpec.indexOf('  HWS:'))
  const building = (systems: number): string =>
    baseSpec.slice(0, baseSpec.indexOf('  HWS:')) +
    Array.from({ length: systems }, (_, index) =>
      system.replace(/\b(HWS|DHW|CWB|ET-1|BT-1|ST-1|TET-1|PT-1):/gu, `$1-${index}:`),
    ).join('')
  // The quickest of some runs, since others share the machine.
  const quickest = (text: string): number =>
    Math.min(...Array.from({ length: 5 }, () => milliseconds(() => readSpec(text, testVocabulary))))

  it('reads a spec of a thousand lines without a finding', () => {
    const text = building(20)
    expect(text.split('\n').length).toBeGreaterThan(1000)
    expect(readSpec(text, testVocabulary).findings).toEqual([])
  })

  it('takes time in proportion to the length of the text', () => {
    expect(quickest(building(80))).toBeLessThan(Math.max(quickest(building(20)), 10) * 12)
  })

  // Four times the text may take four times as long; comparing all with all would take sixteen.
  it.each([
    ['keys of one map', (n: number) => Array.from({ length: n }, (_, index) => `k${index}: 1`).join('\n'), 2_250],
    ['nesting that is refused', (n: number) => '['.repeat(n), 100_000],
    ['comments', (n: number) => `coldfill: 1\n${'# x\n'.repeat(n)}`, 20_000],
  ] as const)('takes time in proportion to the %s', (_, make, n) => {
    expect(quickest(make(4 * n))).toBeLessThan(Math.max(quickest(make(n)), 10) * 12)
  })
})
