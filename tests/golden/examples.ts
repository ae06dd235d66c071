import { readFileSync } from 'node:fs'
import type { ProjectResult, VesselResult } from '@coldfill/sizing'

export const exampleNames = ['fernhollow', 'alder-court'] as const
export type ExampleName = (typeof exampleNames)[number]

export const exampleText = (name: ExampleName): string =>
  readFileSync(new URL(`../../examples/${name}/spec.yaml`, import.meta.url), 'utf8')

export const vesselOf = (result: ProjectResult, mark: string): VesselResult => {
  const vessel = result.vessels.find((candidate) => candidate.mark === mark)
  if (!vessel) throw new Error(`no vessel ${mark}`)
  return vessel
}

/** A result in gal, L, psi or bar. Pressures are gauge. */
export const reading = (vessel: VesselResult, name: string, unit: 'gal' | 'L' | 'psi' | 'bar'): number => {
  const result = vessel.results[name]
  if (!result) throw new Error(`${vessel.mark} has no ${name}`)
  return result.value / { gal: 3.785411784e-3, L: 1e-3, psi: 6894.757293168361, bar: 1e5 }[unit]
}
