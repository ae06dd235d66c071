import { fluid, type Fluid } from '@coldfill/engine'
import type { VesselResult } from '@coldfill/sizing'

/** The fluid of a vessel. A result without one is a programmer's mistake and throws. */
export const fluidOf = ({ solution: { base, massFraction } }: Pick<VesselResult, 'solution'>): Fluid => {
  const read = base === 'water' ? fluid(base) : fluid(base, { value: massFraction, by: 'mass' })
  if (!read.ok) throw new Error(read.message)
  return read.fluid
}
