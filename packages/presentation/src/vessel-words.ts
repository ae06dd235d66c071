import type { ProjectResult } from '@coldfill/sizing'

export const sentenceCase = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1)

/** Methods as drawings write them: initials of standards bodies in capitals. */
export const methodWords = (method: string): string =>
  sentenceCase(method.replace(/\b(ashrae|en|une|bs|din|aspe|idae)\b/g, (initials) => initials.toUpperCase()))

/** `A1–A3, A5` of 1, 2, 3 and 5. */
export const numberRanges = (numbers: readonly number[]): string => {
  const runs: { first: number; last: number }[] = []
  for (const number of numbers.toSorted((a, b) => a - b)) {
    const run = runs.at(-1)
    if (run && number === run.last + 1) run.last = number
    else runs.push({ first: number, last: number })
  }
  return runs
    .map(({ first, last }) => (first === last ? `A${first}` : `A${first}${last === first + 1 ? ', ' : '–'}A${last}`))
    .join(', ')
}

/** The numbers of assumptions by their ids, as ranges. */
export const numbersOf = (ids: readonly string[], result: ProjectResult): string =>
  numberRanges(
    result.assumptions.filter(({ id }) => ids.includes(id)).map((assumption) => Number(assumption.number.slice(1))),
  )

/** What a status means to the reader of a schedule. */
export const statusWords = { sized: 'Sized', infeasible: 'No vessel can do it', blocked: 'Not sized' } as const
