import { formulaTree, symbolsIn } from '@coldfill/formula'
import type { TraceEntry, TraceSection, TraceStep } from '#lib/sized-project.ts'

/** The entry with this id and everything it is computed from, in the order of the calculation, itself last. */
export const upstream = (trace: readonly TraceSection[], id: string): readonly TraceEntry[] => {
  const entries = trace.flatMap((section) => section.entries)
  const bySymbol = new Map(entries.map((entry) => [entry.symbol, entry]))
  const needed = new Set<string>()
  const visit = (entry: TraceEntry | undefined) => {
    if (!entry || needed.has(entry.id)) return
    needed.add(entry.id)
    if (entry.entry === 'step') for (const symbol of symbolsIn(formulaTree(entry.formula))) visit(bySymbol.get(symbol))
  }
  visit(entries.find((entry) => entry.id === id))
  return entries.filter((entry) => needed.has(entry.id))
}

/** The entries that a step names itself, in the order of its formula. */
export const operands = (step: TraceStep, before: readonly TraceEntry[]): readonly TraceEntry[] =>
  symbolsIn(formulaTree(step.formula)).flatMap((symbol) => before.find((entry) => entry.symbol === symbol) ?? [])
