import type { FormulaFunction } from '@coldfill/formula'
import type { Kind } from '@coldfill/units'
import { compiled } from './compiled.ts'
import type { Method, MethodCheck, ValidityRange } from './method.ts'
import type { Origin, TraceEntry, TraceSection } from './trace.ts'

/** A value for an input of a method, in the SI unit of its kind, with where it comes from. */
export interface GivenValue {
  readonly value: number
  readonly origin: Origin
  /** As the person wrote it. */
  readonly authored?: string
}

export interface RunOutcome {
  readonly failed: readonly MethodCheck[]
  readonly warnings: readonly ValidityRange[]
  /** Symbol of the first step without a finite value, where a check did not already say why. */
  readonly notFinite: string | null
}

const hyphens = new Map<string, string>()

/** `expansion volume` → `expansion-volume`; the names of methods recur in every vessel, so each is worked out once. */
const hyphenated = (name: string): string => {
  let made = hyphens.get(name)
  if (made === undefined) {
    made = name
      .toLowerCase()
      .replace(/[^a-z0-9]+/g, '-')
      .replace(/^-|-$/g, '')
    // Labels that people type are bounded by the specs of one process, but not by this program.
    if (hyphens.size < 5000) hyphens.set(name, made)
  }
  return made
}

/**
 * One vessel's calculation: methods are run into it one after the other, and it keeps every input and step in order.
 * A symbol means one thing in a calculation; giving it twice is a programmer's mistake and throws.
 */
export class Calculation {
  readonly mark: string
  readonly functions: Readonly<Record<string, FormulaFunction>>
  private readonly numbers = Object.create(null) as Record<string, number>
  /** `ET-1/`, before every id; joined to names that are worked out once, so that an id costs little. */
  private readonly prefix: string
  /** Ids without the prefix. */
  private readonly names = new Set<string>()
  private readonly parts: { title: string; entries: TraceEntry[] }[] = []

  constructor(mark: string, functions: Readonly<Record<string, FormulaFunction>>) {
    this.mark = mark
    this.prefix = `${mark}/`
    this.functions = functions
  }

  has(symbol: string): boolean {
    return this.numbers[symbol] !== undefined
  }

  /** Value in SI units. An unknown symbol throws. */
  value(symbol: string): number {
    const value = this.numbers[symbol]
    if (value === undefined) throw new Error(`${this.mark}: no symbol ${symbol} in the calculation yet`)
    return value
  }

  entry(symbol: string): TraceEntry {
    // Few are asked for; an index of all would cost each vessel more than the search.
    for (const { entries } of this.parts) for (const entry of entries) if (entry.symbol === symbol) return entry
    throw new Error(`${this.mark}: no symbol ${symbol} in the calculation yet`)
  }

  get values(): Readonly<Record<string, number>> {
    return this.numbers
  }

  get trace(): readonly TraceSection[] {
    return this.parts
  }

  /** Opens a section; inputs and steps that follow belong to it. */
  section(title: string): void {
    if (this.parts.at(-1)?.title !== title) this.parts.push({ title, entries: [] })
  }

  private put(entry: TraceEntry): void {
    if (this.has(entry.symbol)) throw new Error(`${this.mark}: symbol ${entry.symbol} is given twice`)
    const part = this.parts.at(-1)
    if (!part) throw new Error(`${this.mark}: no section is open`)
    part.entries.push(entry)
    this.numbers[entry.symbol] = entry.value
  }

  private idFor(name: string): string {
    const base = hyphenated(name)
    let own = base
    for (let n = 2; this.names.has(own); n += 1) own = `${base}-${n}`
    this.names.add(own)
    return this.prefix + own
  }

  input(symbol: string, kind: Kind, name: string, given: GivenValue): void {
    const { value, origin, authored } = given
    const id = this.idFor(name)
    // Two literals, for a spread would give each entry a hidden class of its own.
    this.put(
      authored === undefined
        ? { entry: 'input', id, symbol, name, kind, value, origin }
        : { entry: 'input', id, symbol, name, kind, value, origin, authored },
    )
  }

  /**
   * Gives the inputs that the calculation does not have yet, evaluates the steps in order and then the checks.
   * A step whose value was `stated` is an input instead (a worked example that states a rounded property).
   */
  run(
    method: Method,
    given: Readonly<Record<string, GivenValue>>,
    stated: Readonly<Record<string, GivenValue>> = {},
  ): RunOutcome {
    for (const [symbol, input] of Object.entries(method.inputs)) {
      if (this.has(symbol)) continue
      const value = given[symbol]
      if (!value) throw new Error(`${method.id}: input ${symbol} is not given`)
      this.input(symbol, input.kind, input.name, value)
    }
    let notFinite: string | null = null
    for (const [symbol, step] of Object.entries(method.steps)) {
      const known = stated[symbol]
      if (known) {
        this.input(symbol, step.kind, step.name, known)
        continue
      }
      const value = compiled(step.formula, this.functions).evaluate(this.numbers)
      if (!Number.isFinite(value)) notFinite ??= symbol
      const { kind, name, formula, source } = step
      this.put({ entry: 'step', id: this.idFor(name), symbol, name, kind, value, formula, source, method: method.id })
    }
    const holds = (condition: string) => compiled(condition, this.functions).evaluate(this.numbers) === 1
    const failed = method.checks.filter((check) => !holds(check.condition))
    const warnings = (method.validity ?? []).filter((range) => !holds(range.condition))
    return { failed, warnings, notFinite: failed.length > 0 ? null : notFinite }
  }
}
