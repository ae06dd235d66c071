import { methods } from '@coldfill/engine'
import { compile, formulaTree, inUnits, symbolsIn, type Tree } from '@coldfill/formula'
import type { ProjectResult } from '@coldfill/sizing'
import type { UnitSystem } from '@coldfill/units'
import type { VesselCalculation } from './vessel-calculation.ts'

/** A condition without which the method has no answer. */
export interface CheckLine {
  readonly condition: Tree
  /** The condition for numbers in the units shown. */
  readonly inUnits: Tree
  /** Said where the condition does not hold. */
  readonly message: string
  readonly holds: boolean
}

/**
 * The checks of the method of a vessel. None where the method has changed since the result was frozen, or where the
 * calculation stopped before the symbols of a check had values.
 */
export const methodChecks = (
  vessel: ProjectResult['vessels'][number],
  { sections, scope }: VesselCalculation,
  units: UnitSystem,
): CheckLine[] => {
  const method = Object.hasOwn(methods, vessel.methodId) ? methods[vessel.methodId] : undefined
  if (!method || method.revision !== vessel.methodRevision) return []
  const values = Object.fromEntries(sections.flatMap((section) => section.lines.map((line) => [line.symbol, line.si])))
  return method.checks.flatMap((check) => {
    const condition = formulaTree(check.condition)
    if (!symbolsIn(condition).every((symbol) => Number.isFinite(values[symbol]))) return []
    return [
      {
        condition,
        inUnits: inUnits(condition, scope, units),
        message: check.message,
        holds: compile(condition, scope.functions)(values) === 1,
      },
    ]
  })
}
