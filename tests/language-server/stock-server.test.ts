import { jsonSchema } from '@coldfill/spec'
import { expectDiagnostic, testVocabulary } from '@coldfill/spec/testing'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { baseSpec } from '../../packages/spec/src/corpus/base-spec.ts'
import { type SeededMistake, seededMistakes } from '../../packages/spec/src/corpus/seeded-mistakes.ts'
import { type StockServer, startStockServer } from './stock-server.ts'

let server: StockServer
beforeAll(async () => {
  server = await startStockServer(jsonSchema(testVocabulary))
}, 30_000)
afterAll(() => server.close())

/** Line and character of `‸` in a text, and the text without it. */
const cursor = (source: string) => {
  const before = source.slice(0, source.indexOf('‸')).split('\n')
  return {
    text: source.replace('‸', ''),
    at: { line: before.length - 1, character: before.at(-1)?.length ?? 0 },
  }
}

const within = (from: string, to: string): string => {
  if (!baseSpec.includes(from)) throw new Error(`the base spec has no "${from}"`)
  return baseSpec.replace(from, () => to)
}

describe('a YAML language server with the schema alone', () => {
  it('has nothing to say of a spec without mistakes', async () => {
    expect((await server.open(baseSpec)).diagnostics).toEqual([])
  })

  it.each([
    ['keys of the spec', 'coldfill: 1\n‸\n', ['project', 'fluids', 'assumptions', 'systems']],
    ['keys of a block', within('      pump-head: 45 ft\n', '      ‸\n'), ['relief-height', 'pump-head', 'fill']],
    [
      'keys of the kind of a vessel',
      within('        temperature-band: 20 °F\n', '        temperature-band: 20 °F\n        ‸\n'),
      ['credit', 'quantity'],
    ],
    ['services', within('service: heating water', 'service: ‸'), ['snow melting', 'chilled water']],
    ['kinds', within('kind: buffer tank', 'kind: ‸'), ['expansion tank', 'pressure tank']],
    ['pipe families', within('pipe: copper type L', 'pipe: ‸'), ['copper type L', 'steel schedule 40']],
  ])('completes %s', async (_, source, expected) => {
    const { text, at } = cursor(source)
    const { uri } = await server.open(text)
    expect(await server.complete(uri, at)).toEqual(expect.arrayContaining(expected))
  })

  it.each([
    ['a key', 'static‸-height: 42 ft', 'Height of the highest point of the system above the vessel connection.'],
    ['a choice', 'service: heating ‸water', 'closed loop that heats'],
    ['a block', 'conte‸nts:\n      - equipment: Boilers', 'What holds the water'],
  ])('explains %s', async (_, marked, expected) => {
    const { text, at } = cursor(within(marked.replace('‸', ''), marked))
    const { uri } = await server.open(text)
    expect(await server.hover(uri, at)).toContain(expected)
  })
})

/** Codes of mistakes that a schema can tell: it knows keys, choices and shapes, and neither quantities nor what leans on what. */
const SCHEMA_CODES = [
  'CF-S002',
  'CF-S003',
  'CF-S005',
  'CF-S007',
  'CF-S016',
  'CF-S020',
  'CF-S040',
  'CF-S042',
  'CF-S050',
  'CF-S080',
  'CF-S081',
]

/** Missing keys that lean on nothing else in the spec. */
const MISSING = ['no service', 'no kind', 'no method', 'no reason for an assumption', 'no volume of equipment']

const told = seededMistakes.filter(
  ({ code, name }) => SCHEMA_CODES.includes(code) || (code === 'CF-S004' && MISSING.includes(name)),
)

const seed = ({ from, to }: SeededMistake): string => baseSpec.replace(from, () => to)

describe.each(told)('$code $name', (mistake) => {
  it('is told by the server too, on the same line', async () => {
    const { finding, text } = expectDiagnostic(seed(mistake), mistake)
    const { diagnostics } = await server.open(text)
    const lines = diagnostics.map(({ range }) => range.start.line)
    expect({ said: diagnostics.map(({ message }) => message), lines }).toMatchObject({
      lines: expect.arrayContaining([finding.range.start.line]) as number[],
    })
  })
})
