import type { Verification, VerificationFigure } from '@coldfill/contract'

export const VERIFICATION_FILTERS = ['all', 'holds', 'known wrong', 'fails', 'from memory'] as const
export type VerificationFilter = (typeof VERIFICATION_FILTERS)[number]

export const isVerificationFilter = (text: string | null): text is VerificationFilter =>
  VERIFICATION_FILTERS.some((filter) => filter === text)

const passes = (figure: VerificationFigure, filter: VerificationFilter): boolean =>
  filter === 'all' || (filter === 'from memory' ? figure.origin === 'from memory' : figure.verdict === filter)

/** Groups with the figures that pass and, where words are sought, hold all of them somewhere. Empty groups are left out. */
export const filteredGroups = (
  groups: Verification['groups'],
  filter: VerificationFilter,
  sought: string,
): Verification['groups'] => {
  const words = sought.toLowerCase().split(/\s+/).filter(Boolean)
  return groups.flatMap((group) => {
    const figures = group.figures.filter((figure) => {
      const text = `${group.source} ${figure.id} ${figure.title} ${figure.what}`.toLowerCase()
      return passes(figure, filter) && words.every((word) => text.includes(word))
    })
    return figures.length === 0 ? [] : [{ ...group, figures }]
  })
}

/** How many figures pass a filter. */
export const countOf = (groups: Verification['groups'], filter: VerificationFilter): number =>
  groups.flatMap((group) => group.figures).filter((figure) => passes(figure, filter)).length

/** `+0.04 %`, in hundredths of a per cent; `—` where there is no figure. */
export const deviationWords = (deviation: number | null): string => {
  if (deviation === null) return '—'
  const percent = deviation * 100
  const size = Math.abs(percent)
  if (size < 0.005) return '0.00 %'
  return `${percent > 0 ? '+' : '−'}${size >= 100 ? size.toFixed(0) : size.toFixed(2)} %`
}

/** `0.3 %` of 0.003. */
export const toleranceWords = (tolerance: number): string => `${String(Number((tolerance * 100).toPrecision(2)))} %`
