import { formatNumber, fromSi, type Kind, parseQuantity, type Unit, unitOf } from '@coldfill/units'
import { water } from '../fluids/index.ts'
import type { ExampleOrigin } from '../method.ts'
import { methods } from '../methods/index.ts'
import { runExample } from '../run-example.ts'
import { sources } from '../sources/index.ts'
import type { VerificationCase } from './case.ts'
import { contentsCases } from './cases/contents.ts'
import { domesticCases } from './cases/domestic.ts'
import { europeanCases } from './cases/hydronic-european.ts'
import { hydronicCases } from './cases/hydronic.ts'
import { ruleCases } from './cases/rules.ts'
import { vesselCases } from './cases/vessels.ts'
import { waterCases } from './cases/water.ts'

export type Verdict = 'holds' | 'fails' | 'known wrong'

/** One figure of the verification manual. Values are in the SI unit of their kind; null where a mistake has no figure. */
export interface VerificationRow {
  readonly id: string
  /** `published cases`: figures of publications; `worked examples`: those that every method carries. */
  readonly part: 'published cases' | 'worked examples'
  readonly source: string
  readonly title: string
  /** What the figure is: "required volume". */
  readonly what: string
  readonly kind: Kind
  readonly expected: number | null
  readonly computed: number | null
  /** As printed, and what the program gives in the same unit. */
  readonly shown: { readonly expected: string; readonly computed: string }
  /** computed / expected − 1 */
  readonly deviation: number | null
  readonly tolerance: number
  readonly because: string
  readonly verdict: Verdict
  /** Why a printed figure is wrong. */
  readonly reason?: string
  readonly origin: ExampleOrigin
}

export const verificationCases: readonly VerificationCase[] = [
  ...hydronicCases,
  ...europeanCases,
  ...domesticCases,
  ...vesselCases,
  ...waterCases,
  ...contentsCases,
  ...ruleCases,
]

const readPrinted = (text: string, kind: Kind): { readonly value: number; readonly unit: Unit } => {
  const plain = kind === 'ratio' || kind === 'count' ? Number(text) : Number.NaN
  if (Number.isFinite(plain)) return { value: plain, unit: unitOf('ratio', '1') }
  const parsed = parseQuantity(text, [kind])
  if (!parsed.ok) throw new Error(`verification: ${text} is no ${kind}: ${parsed.problem.message}`)
  return { value: parsed.quantity.value, unit: parsed.unit }
}

/** One digit more than is printed, so that a reader sees how the two part. */
const digitsOf = (text: string): number => {
  const number = /[\d.]+/u.exec(text)?.[0] ?? ''
  return Math.max(3, number.replace('.', '').replace(/^0+/u, '').length + 1)
}

type Head = Omit<VerificationRow, 'kind' | 'what' | 'expected' | 'computed' | 'shown' | 'deviation' | 'verdict'>

const row = (
  head: Head,
  figure: { readonly what: string; readonly kind: Kind; readonly printed: string; readonly computed: number },
): VerificationRow => {
  const { what, kind, printed, computed } = figure
  const { value: expected, unit } = readPrinted(printed, kind)
  const deviation = computed / expected - 1
  const within = Math.abs(deviation) <= head.tolerance
  // A figure that is listed as wrong and comes out right has no place in the list.
  const verdict: Verdict = head.reason === undefined ? (within ? 'holds' : 'fails') : within ? 'fails' : 'known wrong'
  const symbol = unit.symbol === '1' ? '' : ` ${unit.symbol}`
  return {
    ...head,
    what,
    kind,
    expected,
    computed,
    shown: { expected: printed, computed: `${formatNumber(fromSi(computed, unit), digitsOf(printed))}${symbol}` },
    deviation,
    verdict,
  }
}

const rowsOfCase = (each: VerificationCase): readonly VerificationRow[] => {
  const { id, source, title, tolerance, because, origin, knownWrong } = each
  const head = (n: number, count: number): Head => ({
    id: count === 1 ? id : `${id}.${n + 1}`,
    part: 'published cases',
    source,
    title,
    tolerance,
    because,
    origin,
    ...(knownWrong === undefined ? {} : { reason: knownWrong }),
  })
  if (each.by === 'words') {
    return [
      {
        ...head(0, 1),
        what: title,
        kind: 'ratio',
        expected: null,
        computed: null,
        shown: { expected: '', computed: '' },
        deviation: null,
        verdict: 'known wrong',
      },
    ]
  }
  if (each.by === 'figures')
    return each.figures.map(({ what, kind, expected, compute }, n) =>
      row(head(n, each.figures.length), { what, kind, printed: expected, computed: compute() }),
    )
  const method = methods[each.method]
  if (!method) throw new Error(`verification case ${id}: no method ${each.method}`)
  const example = { id, title, origin, source: { source: '', locator: source }, tolerance, because }
  const results = runExample(method, { ...example, given: each.given, expected: each.expected }, water.functions)
  return results.map(({ symbol, kind, computed }, n) =>
    row(head(n, results.length), {
      what: (method.steps[symbol] ?? method.inputs[symbol])?.name ?? symbol,
      kind,
      printed: each.expected[symbol] ?? '',
      computed,
    }),
  )
}

const rowsOfExamples = (): readonly VerificationRow[] =>
  Object.values(methods).flatMap((method) =>
    method.examples.flatMap((example) => {
      const { source, locator } = example.source
      const results = runExample(method, example, water.functions)
      return results.map(({ symbol, kind, computed }, n) =>
        row(
          {
            id: `${method.id}/${example.id}${results.length === 1 ? '' : `.${n + 1}`}`,
            part: 'worked examples',
            source: `${sources[source]?.title ?? source}: ${locator}`,
            title: example.title,
            tolerance: example.tolerance,
            because: example.because,
            origin: example.origin,
          },
          {
            what: (method.steps[symbol] ?? method.inputs[symbol])?.name ?? symbol,
            kind,
            printed: example.expected[symbol] ?? '',
            computed,
          },
        ),
      )
    }),
  )

/**
 * The verification manual: every published case run now, then the worked examples of the methods. The same every time.
 * Throws where a case names a method or a symbol that is gone.
 */
export const verificationRows = (): readonly VerificationRow[] => [
  ...verificationCases.flatMap(rowsOfCase),
  ...rowsOfExamples(),
]
