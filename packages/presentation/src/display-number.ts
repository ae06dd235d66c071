import { displayUnit, fromSi, type Kind, type UnitSystem } from '@coldfill/units'

/**
 * Number in the unit in which `system` shows the kind. Noise of the conversion in the thirteenth digit and beyond is
 * taken off, so that 40 °F is 40 and not 40.00000000000006; every other number stays as it is.
 */
export const displayNumber = (value: number, kind: Kind, system: UnitSystem): number => {
  const unit = displayUnit(kind, system)
  const number = fromSi(value, unit)
  const rounded = Number(number.toPrecision(12))
  // Taking the offset of a thermometer off a number in kelvin leaves the noise of the larger number.
  return Math.abs(rounded - number) <= 1e-14 * Math.abs(value / unit.factor) ? rounded : number
}
