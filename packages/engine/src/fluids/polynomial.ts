/** A property as a polynomial in strength (per cent by mass) and temperature (°C), both counted from a base. */
export interface PolynomialTable {
  readonly base: { readonly strength: number; readonly temperature: number }
  readonly terms: readonly (readonly [byStrength: number, byTemperature: number, coefficient: number])[]
}

export const polynomial = ({ base, terms }: PolynomialTable, strength: number, celsius: number): number => {
  const x = strength - base.strength
  const y = celsius - base.temperature
  return terms.reduce((sum, [i, j, c]) => sum + c * x ** i * y ** j, 0)
}

/** Its derivative by the temperature. */
export const polynomialSlope = ({ base, terms }: PolynomialTable, strength: number, celsius: number): number => {
  const x = strength - base.strength
  const y = celsius - base.temperature
  return terms.reduce((sum, [i, j, c]) => (j === 0 ? sum : sum + c * x ** i * j * y ** (j - 1)), 0)
}
