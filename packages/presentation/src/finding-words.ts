import type { ProjectResult } from '@coldfill/sizing'
import { formatQuantity, type UnitSystem } from '@coldfill/units'

/** Message and hint of a finding with the quantities that the program worked out in the units asked for. */
export const findingWords = (
  { message, hint, quantities = [] }: Pick<ProjectResult['findings'][number], 'message' | 'hint' | 'quantities'>,
  units: UnitSystem,
): { readonly message: string; readonly hint: string } => {
  // Each place is said once: what was put in is not looked at again, or 5 psi in the place of 34 kPa could become part of another.
  const said = (words: string): string => {
    let rest = words
    let done = ''
    while (rest !== '') {
      const next = quantities
        .map((quantity) => ({ quantity, at: rest.indexOf(quantity.text) }))
        .filter(({ at }) => at >= 0)
        .sort((a, b) => a.at - b.at || b.quantity.text.length - a.quantity.text.length)[0]
      if (!next) break
      const { kind, value, text } = next.quantity
      done += rest.slice(0, next.at) + formatQuantity({ kind, value }, units)
      rest = rest.slice(next.at + text.length)
    }
    return done + rest
  }
  return { message: said(message), hint: said(hint) }
}
