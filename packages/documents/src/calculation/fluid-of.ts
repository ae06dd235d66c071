import { fluid, type Fluid, type FluidBase } from '@coldfill/engine'

const LABEL = /^(propylene glycol|ethylene glycol) ([0-9.]+) % (vol|mass)$/

/** The fluid that a result names by its label. An unknown label is a programmer's mistake and throws. */
export const fluidOf = (label: string): Fluid => {
  const [, base, percent, by] = LABEL.exec(label) ?? []
  const read =
    base === undefined
      ? fluid(label as FluidBase)
      : fluid(base as FluidBase, { value: Number(percent) / 100, by: by === 'vol' ? 'volume' : 'mass' })
  if (!read.ok) throw new Error(`${label}: ${read.message}`)
  return read.fluid
}
