import { vocabulary } from '@coldfill/sizing'
import * as fc from 'fast-check'
import { exampleNames, exampleText } from '../golden/examples.ts'
import { baseSpec } from '../../packages/spec/src/corpus/base-spec.ts'
import { seededMistakes } from '../../packages/spec/src/corpus/seeded-mistakes.ts'

/** Specs that the mutations begin from: one without a mistake, each mistake of the corpus, and the examples. */
const seeds: readonly string[] = [
  baseSpec,
  ...seededMistakes.map(({ from, to }) => baseSpec.replace(from, () => to.replace('‹|', '').replace('|›', ''))),
  ...exampleNames.map(exampleText),
]

const signs = [
  ...Array.from(':-#"\'{}[],&*!%|>?@`~=\\/.…°'),
  '\t',
  '\n',
  '\r\n',
  '  ',
  ': ',
  '- ',
  ' #',
  '\n---\n',
  '\n...\n',
  '<<: ',
  '&a ',
  '*a',
  '!!str ',
  '%YAML 1.1\n',
  '\u0000',
  '\u0085',
  '\u2028',
  '\ufeff',
  '\ud800',
  '\u{1f4a7}',
]

const words = [
  'coldfill',
  'kind: ',
  'systems:\n',
  '__proto__: ',
  'constructor: ',
  'toString: 1',
  '1,200 ft',
  '1e400 psi',
  '-0 °F',
  '.inf',
  '0x1F',
  'null',
  'yes',
  '600..700 ft',
  '1-1/2 in',
  '# coldfill: accept CF-E021 because ET-1',
  ...Object.keys(vocabulary.pipes).slice(0, 4),
  ...vocabulary.kinds,
]

type Mutation = (text: string) => string

const place = fc.nat(1_000_000)

const atCharacter = fc
  .tuple(place, fc.nat(14), fc.oneof(fc.constantFrom(...signs, ...words), fc.string({ unit: 'binary', maxLength: 6 })))
  .map(([at, cut, put]): Mutation => (text) => {
    const from = at % (text.length + 1)
    return text.slice(0, from) + put + text.slice(from + cut)
  })

const atLine = fc
  .tuple(place, place, fc.constantFrom('out', 'twice', 'swap', 'in', 'back', 'tab', 'blank', 'join', 'flow'))
  .map(([a, b, what]): Mutation => (text) => {
    const lines = text.split('\n')
    const [at, other] = [a % lines.length, b % lines.length]
    const [line = '', second = ''] = [lines[at], lines[other]]
    if (what === 'out') lines.splice(at, 1)
    else if (what === 'twice') lines.splice(other, 0, line)
    else if (what === 'swap') [lines[at], lines[other]] = [second, line]
    else if (what === 'in') lines[at] = `${' '.repeat(b % 5)}${line}`
    else if (what === 'back') lines[at] = line.replace(/^ {1,2}/u, '')
    else if (what === 'tab') lines[at] = line.replace(/^ +/u, '\t')
    else if (what === 'blank') lines[at] = ''
    else if (what === 'join') lines.splice(at, 2, line + (lines[at + 1] ?? ''))
    else lines[at] = line.replace(/: (.*)$/u, ': { $1 }')
    return lines.join('\n')
  })

/** A block of one spec put into another, or many times into the same. */
const block = fc
  .tuple(place, place, place, fc.nat(12), fc.integer({ min: 1, max: 40 }))
  .map(([seed, from, to, length, times]): Mutation => (text) => {
    const other = (seeds[seed % seeds.length] ?? '').split('\n')
    const start = from % other.length
    const lines = text.split('\n')
    const piece = other.slice(start, start + length)
    lines.splice(to % (lines.length + 1), 0, ...Array.from({ length: times % 4 === 0 ? times : 1 }, () => piece).flat())
    return lines.join('\n')
  })

const deep = fc
  .tuple(place, fc.integer({ min: 1, max: 200 }), fc.constantFrom('[', '{ a: ', '- ', '? ', '"'))
  .map(([at, times, sign]): Mutation => (text) => {
    const from = at % (text.length + 1)
    return text.slice(0, from) + sign.repeat(times) + text.slice(from)
  })

const mutation = fc.oneof(
  { arbitrary: atCharacter, weight: 6 },
  { arbitrary: atLine, weight: 5 },
  { arbitrary: block, weight: 2 },
  { arbitrary: deep, weight: 1 },
)

/** A spec with one to eight mutations. */
export const mutatedSpec: fc.Arbitrary<string> = fc
  .tuple(fc.constantFrom(...seeds), fc.array(mutation, { minLength: 1, maxLength: 8 }))
  .map(([seed, mutations]) => mutations.reduce((text, mutate) => mutate(text), seed))
