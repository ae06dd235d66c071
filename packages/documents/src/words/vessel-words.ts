import type { ProjectResult } from '@coldfill/sizing'

export const sentenceCase = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1)

/** Methods as drawings write them: initials of standards bodies in capitals. */
export const methodWords = (method: string): string =>
  sentenceCase(method.replace(/\b(ashrae|en|une|bs|din|aspe)\b/g, (initials) => initials.toUpperCase()))

/** `A1–A3, A5` from the ids of assumptions, in order of number. */
export const numbersOf = (ids: readonly string[], result: ProjectResult): string => {
  const numbers = result.assumptions
    .filter((assumption) => ids.includes(assumption.id))
    .map((assumption) => Number(assumption.number.slice(1)))
    .sort((a, b) => a - b)
  const parts: string[] = []
  for (let first = 0; first < numbers.length;) {
    let last = first
    while (numbers[last + 1] === (numbers[last] ?? 0) + 1) last += 1
    const [from, to] = [`A${numbers[first]}`, `A${numbers[last]}`]
    parts.push(last === first ? from : last === first + 1 ? `${from}, ${to}` : `${from}–${to}`)
    first = last + 1
  }
  return parts.join(', ')
}

/** What a status means to the reader of a schedule. */
export const statusWords = { sized: 'Sized', infeasible: 'No vessel can do it', blocked: 'Not sized' } as const
