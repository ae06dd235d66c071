import { type Kind, parseQuantity, type QuantityReading } from '@coldfill/units'

/** Most texts that are remembered for one list of kinds. */
const MOST = 2_000

const known = new WeakMap<readonly Kind[], Map<string, QuantityReading<Kind>>>()

/** `parseQuantity`, which is asked the same of nearly every value each time that a text is read while it is typed. */
export const readKnownQuantity = (text: string, kinds: readonly Kind[]): QuantityReading<Kind> => {
  const readings = known.get(kinds) ?? new Map<string, QuantityReading<Kind>>()
  known.set(kinds, readings)
  const remembered = readings.get(text)
  if (remembered) return remembered
  if (readings.size >= MOST) readings.clear()
  const reading = parseQuantity(text, kinds)
  readings.set(text, reading)
  return reading
}
