import { type Citation, sources } from '@coldfill/engine'
import { displayUnit, fromSi, type Kind, KINDS } from '@coldfill/units'
import type { ProjectResult, VesselResult } from './result.ts'

interface JsonQuantity {
  readonly value: number
  readonly unit: string
}

const quantity = (kind: Kind, value: number): JsonQuantity => ({
  value: fromSi(value, displayUnit(kind, 'SI')),
  unit: KINDS[kind].metric,
})

const sourceText = (citation: Citation): string => {
  const title = sources[citation.source]?.title ?? citation.source
  return `${title}: ${citation.locator}${citation.fromMemory ? ' (from memory; verify against the adopted edition)' : ''}`
}

const vesselJson = (vessel: VesselResult) => ({
  system: vessel.system,
  mark: vessel.mark,
  kind: vessel.kind,
  method: vessel.method,
  status: vessel.status,
  ...(vessel.reason === undefined ? {} : { reason: vessel.reason }),
  results: Object.fromEntries(
    Object.entries(vessel.results).map(([name, result]) => [name, quantity(result.kind, result.value)]),
  ),
  selected: vessel.selected && {
    maker: vessel.selected.maker,
    model: vessel.selected.model,
    volume: quantity('volume', vessel.selected.volume),
    quantity: vessel.selected.quantity,
  },
  steps: vessel.trace
    .flatMap((section) => section.entries)
    .filter((entry) => entry.entry === 'step')
    .map((step) => ({
      id: step.id,
      symbol: step.symbol,
      formula: step.formula,
      ...quantity(step.kind, step.value),
      source: sourceText(step.source),
    })),
  assumptions: vessel.assumptions,
})

/** The result as the command writes it: SI units (L, kPa gauge, °C, kW, kg, L/s), full precision. */
export const resultJson = (result: ProjectResult) => ({
  engine: result.engine,
  spec: result.spec,
  vessels: result.vessels.map(vesselJson),
  // The text says the quantities; their values are for documents in other units.
  findings: result.findings.map(({ quantities: _, ...finding }) => finding),
  assumptions: result.assumptions.map((assumption) => ({
    id: assumption.id,
    value: assumption.value,
    source: sourceText(assumption.source),
    because: assumption.reason ?? assumption.because,
    'used-by': assumption.usedBy,
  })),
})

export type CommandJson = ReturnType<typeof resultJson>
