import type { Reference } from '@coldfill/contract'
import { assumptions, methods, sources } from '@coldfill/engine'
import { engineeringCodes, engineVersion, vocabulary } from '@coldfill/sizing'
import { findingCodes } from '@coldfill/spec'

const presentMethods = (): Reference['methods'] =>
  Object.fromEntries(
    Object.values(methods).map((method) => [
      method.id,
      {
        id: method.id,
        revision: method.revision,
        title: method.title,
        basis: method.basis,
        vessel: method.vessel ? { kind: method.vessel.kind, method: method.vessel.method } : null,
        inputs: Object.entries(method.inputs).map(([symbol, { kind, name }]) => ({ symbol, kind, name })),
        steps: Object.entries(method.steps).map(([symbol, { kind, name, formula, source }]) => ({
          symbol,
          kind,
          name,
          formula,
          source,
        })),
        checks: method.checks.map(({ condition, code, message }) => ({ condition, code, message })),
      },
    ]),
  )

const presentEngineeringCodes = (): Reference['findingCodes'] =>
  Object.fromEntries(Object.entries(engineeringCodes).map(([code, help]) => [code, { ...help, layer: 'engineering' }]))

/** What the program knows, the same for everybody while it runs. */
export const presentReference = (): Reference => ({
  engine: engineVersion,
  vocabulary,
  findingCodes: { ...findingCodes, ...presentEngineeringCodes() },
  sources: { ...sources },
  assumptions: { ...assumptions },
  methods: presentMethods(),
})
