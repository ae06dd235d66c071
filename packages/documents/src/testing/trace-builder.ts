import { compile, formulaTree, type FormulaFunction } from '@coldfill/formula'
import type { ProjectResult } from '@coldfill/sizing'
import type { Kind } from '@coldfill/units'

type Trace = ProjectResult['vessels'][number]['trace']
type Entry = Trace[number]['entries'][number]
type Citation = Extract<Entry, { entry: 'step' }>['source']
type Origin = Extract<Entry, { entry: 'input' }>['origin']

/** Writes the calculation of a vessel for tests: values of steps come from their formulas, in SI units. */
export class TraceBuilder {
  readonly #mark: string
  readonly #functions: Readonly<Record<string, FormulaFunction>>
  readonly #sections: { title: string; entries: Entry[] }[] = []
  readonly #values: Record<string, number> = {}

  constructor(mark: string, functions: Readonly<Record<string, FormulaFunction>> = {}) {
    this.#mark = mark
    this.#functions = functions
  }

  section(title: string): this {
    this.#sections.push({ title, entries: [] })
    return this
  }

  input(symbol: string, kind: Kind, name: string, value: number, origin: Origin, authored?: string): this {
    const entry = { entry: 'input', id: this.#idOf(name), symbol, name, kind, value, origin } as const
    return this.#put(authored === undefined ? entry : { ...entry, authored })
  }

  step(symbol: string, kind: Kind, name: string, formula: string, source: Citation, method: string): this {
    const value = compile(formulaTree(formula), this.#functions)(this.#values)
    return this.#put({ entry: 'step', id: this.#idOf(name), symbol, name, kind, value, formula, source, method })
  }

  get trace(): Trace {
    return this.#sections
  }

  /** The entry of a symbol as a result of the vessel. */
  result(symbol: string, name: string): ProjectResult['vessels'][number]['results'][string] {
    const found = this.#sections.flatMap((section) => section.entries).find((entry) => entry.symbol === symbol)
    if (!found) throw new Error(`no ${symbol}`)
    return { kind: found.kind, value: found.value, name, entry: found.id }
  }

  #idOf(name: string): string {
    return `${this.#mark}/${name.toLowerCase().replace(/[^a-z0-9]+/g, '-')}`
  }

  #put(entry: Entry): this {
    this.#sections.at(-1)?.entries.push(entry)
    this.#values[entry.symbol] = entry.value
    return this
  }
}
