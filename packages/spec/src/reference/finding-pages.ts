import { seededMistakes } from '../corpus/seeded-mistakes.ts'
import { type Diagnostic, type FindingCode, findingCodes } from '../diagnostics.ts'

/** What the help says of a code of the syntax and the spec layer. */
export interface FindingPage extends Diagnostic {
  readonly code: FindingCode
  /** A mistake that raises it, and what stands there instead. Absent for what is no mistake in a line. */
  readonly example?: {
    readonly wrong: string
    /** The part of `wrong` that is underlined. */
    readonly underlined: { readonly start: number; readonly end: number }
    readonly right: string
  }
}

/** Longest example that is shown, in lines. */
const MOST_LINES = 6

const leadOf = (text: string): number =>
  Math.min(
    ...text
      .split('\n')
      .filter((line) => line.trim() !== '')
      .map((line) => /^ */u.exec(line)?.[0].length ?? 0),
  )

/** Takes away the indentation that both texts share and the line feeds at the end. */
const shown = (text: string, lead: number): string =>
  text
    .split('\n')
    .map((line) => line.slice(lead))
    .join('\n')
    .trimEnd()

const exampleOf = (code: FindingCode): FindingPage['example'] => {
  const found = seededMistakes.find(
    (each) => each.code === code && each.to.includes('|›') && each.to.split('\n').length <= MOST_LINES,
  )
  if (!found) return undefined
  const mended = found.mended ?? found.from
  const lead = Math.min(leadOf(found.to), leadOf(mended))
  const marked = shown(found.to, lead)
  const start = marked.indexOf('‹|')
  const end = marked.indexOf('|›') - 2
  if (start < 0 || end < start) return undefined
  return {
    wrong: marked.replace('‹|', '').replace('|›', ''),
    underlined: { start, end },
    right: shown(mended, lead),
  }
}

/** A page for every code that reading a spec can raise, with an example from the corpus of mistakes. */
export const findingPages = (): readonly FindingPage[] =>
  (Object.keys(findingCodes) as FindingCode[]).map((code) => {
    const example = exampleOf(code)
    return { code, ...findingCodes[code], ...(example && { example }) }
  })
