const LETTERS =
  'alpha α beta β gamma γ delta δ epsilon ε zeta ζ eta η theta θ kappa κ lambda λ mu μ nu ν xi ξ pi π rho ρ sigma σ tau τ phi φ chi χ psi ψ omega ω ' +
  'Gamma Γ Delta Δ Theta Θ Lambda Λ Pi Π Sigma Σ Phi Φ Psi Ψ Omega Ω'

const words = LETTERS.split(' ')
const letterOf = new Map<string, string>()
const nameOf = new Map<string, string>()
for (let at = 0; at < words.length; at += 2) {
  letterOf.set(words[at]!, words[at + 1]!)
  nameOf.set(words[at + 1]!, words[at]!)
}

/** The Greek letter that a name spells out (`rho` → ρ), or the name itself. */
export const greekLetter = (name: string): string => letterOf.get(name) ?? name

/** A symbol as it is kept in trees: `ρ_c` → `rho_c`, `Δt` → `Delta_t`. */
export const spelledOut = (symbol: string): string => {
  const name = nameOf.get(symbol.charAt(0))
  if (name === undefined) return symbol
  const rest = spelledOut(symbol.slice(1))
  return rest === '' || rest.startsWith('_') ? name + rest : `${name}_${rest}`
}
