import { UNITS, type Unit } from '@coldfill/units'

const found = new Map<string, Unit | undefined>()

/**
 * The unit that `[symbol]` behind a number means. Where a symbol fits two kinds, the one with a true zero is meant:
 * `psi`, `kPa` and `bar` are pressure differences, `K` is a temperature difference; gauge readings are written `psig`
 * or `bar g`, absolute pressures `psia` or `bar abs`, and `°C` and `°F` are thermometer readings.
 */
export const literalUnit = (symbol: string): Unit | undefined => {
  if (!found.has(symbol)) {
    const named = UNITS.filter((unit) => unit.symbol === symbol)
    const candidates = named.length > 0 ? named : UNITS.filter((unit) => unit.spellings.includes(symbol))
    const difference = candidates.find(
      ({ kind, symbol: own }) =>
        kind === 'pressure difference' || (kind === 'temperature difference' && own === symbol),
    )
    found.set(symbol, difference ?? candidates[0])
  }
  return found.get(symbol)
}
