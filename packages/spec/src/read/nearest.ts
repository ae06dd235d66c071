/** Damerau–Levenshtein distance (optimal string alignment): letters put in, left out, changed, or swapped with a neighbour. */
export const distance = (a: string, b: string): number => {
  let before: number[] = []
  let previous = Array.from({ length: b.length + 1 }, (_, index) => index)
  for (let i = 1; i <= a.length; i++) {
    const row = [i]
    for (let j = 1; j <= b.length; j++) {
      const same = a[i - 1] === b[j - 1]
      let least = Math.min((previous[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (previous[j - 1] ?? 0) + (same ? 0 : 1))
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1])
        least = Math.min(least, (before[j - 2] ?? 0) + 1)
      row.push(least)
    }
    before = previous
    previous = row
  }
  return previous[b.length] ?? 0
}

/** Words are compared without case, and spaces, hyphens and underscores count as one. */
const folded = (text: string): string => text.toLowerCase().replace(/[\s_-]+/gu, '-')

const LONGEST = 60

/** The candidate that a person most likely meant by `text`; undefined where none is near. */
export const nearest = (text: string, candidates: Iterable<string>): string | undefined => {
  if (text.length > LONGEST) return undefined
  const typed = folded(text)
  let best: { candidate: string; slips: number } | undefined
  for (const candidate of candidates) {
    const known = folded(candidate)
    const reach = Math.max(1, Math.floor(Math.max(typed.length, known.length) / 3))
    if (Math.abs(known.length - typed.length) > reach) continue
    const slips = distance(typed, known)
    if (slips <= reach && slips < (best?.slips ?? Infinity)) best = { candidate, slips }
  }
  return best?.candidate
}

/** `a`, `b` or `c`, each in code marks. */
export const oneOf = (texts: readonly string[]): string => listed(texts, 'or')

export const allOf = (texts: readonly string[]): string => listed(texts, 'and')

const listed = (texts: readonly string[], word: string): string => {
  const quoted = texts.map((text) => `\`${text}\``)
  return quoted.length < 2 ? quoted.join('') : `${quoted.slice(0, -1).join(', ')} ${word} ${quoted.at(-1)}`
}
