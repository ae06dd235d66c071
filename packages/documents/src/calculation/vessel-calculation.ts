import { formulaTree, inUnits, type FormulaFunction, type Scope, type Tree } from '@coldfill/formula'
import type { ProjectResult } from '@coldfill/sizing'
import { unitLabel, type Kind, type UnitSystem } from '@coldfill/units'
import { citationWords, originWords } from '../words/source-words.ts'
import { displayNumber } from '@coldfill/presentation'

type Vessel = ProjectResult['vessels'][number]
type TraceEntry = Vessel['trace'][number]['entries'][number]

interface LineBase {
  /** Id of the trace entry, as redlines use it: `ET-1/expansion-volume`. */
  readonly id: string
  readonly symbol: string
  readonly name: string
  readonly kind: Kind
  /** In the unit of the line, full precision. Not finite where the step has no value. */
  readonly value: number
  /** Value in the SI unit of the kind. */
  readonly si: number
  /** Printed unit, empty for a pure number. */
  readonly unit: string
  /** Where the value comes from, in words. */
  readonly source: string
}

export interface InputLine extends LineBase {
  readonly is: 'input'
  /** Lines with the same key show one and the same thing: a key of the spec, or an assumption, in one kind. Null for a table value. */
  readonly key: string | null
  /** As a person wrote it, where a person did. */
  readonly authored?: string
}

export interface StepLine extends LineBase {
  readonly is: 'step'
  /** As the method has it: holds for any coherent units. */
  readonly formula: Tree
  /** The same for numbers in the units of the lines; a factor stands only where units do not cancel. */
  readonly inUnits: Tree
}

export type CalculationLine = InputLine | StepLine

export interface CalculationSection {
  readonly title: string
  readonly lines: readonly CalculationLine[]
}

/** The calculation of a vessel in one unit system, in the order in which it runs. */
export interface VesselCalculation {
  readonly sections: readonly CalculationSection[]
  readonly scope: Scope
}

const lineOf = (entry: TraceEntry, scope: Scope, result: ProjectResult, units: UnitSystem): CalculationLine => {
  const { id, symbol, name, kind } = entry
  // A value that is not finite becomes null where a result has been stored as JSON.
  const si = (entry.value as number | null) ?? Number.NaN
  const base = { id, symbol, name, kind, si, value: displayNumber(si, kind, units), unit: unitLabel(kind, units) }
  if (entry.entry === 'input') {
    const { origin, authored } = entry
    const place = origin.from === 'spec' ? origin.path : origin.from === 'assumption' ? `assumption ${origin.id}` : null
    const line = {
      ...base,
      is: 'input',
      source: originWords(origin, result),
      key: place && `${place}, ${kind}`,
    } as const
    return authored === undefined ? line : { ...line, authored }
  }
  const formula = formulaTree(entry.formula)
  return {
    ...base,
    is: 'step',
    source: citationWords(entry.source, result, 'from memory'),
    formula,
    inUnits: inUnits(formula, scope, units, kind),
  }
}

/** `functions` are those of the vessel's fluid. */
export const vesselCalculation = (
  vessel: Vessel,
  result: ProjectResult,
  units: UnitSystem,
  functions: Readonly<Record<string, FormulaFunction>>,
): VesselCalculation => {
  const entries = vessel.trace.flatMap((section) => section.entries)
  const scope: Scope = { symbols: Object.fromEntries(entries.map(({ symbol, kind }) => [symbol, kind])), functions }
  return {
    scope,
    sections: vessel.trace.map(({ title, entries: lines }) => ({
      title,
      lines: lines.map((entry) => lineOf(entry, scope, result, units)),
    })),
  }
}
