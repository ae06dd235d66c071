import type { Acceptance, Finding } from '@coldfill/spec'
import { engineeringCodes } from './engineering-codes.ts'

/**
 * Marks the warnings that the text accepts with their reasons, and reports acceptances that match nothing.
 * Errors cannot be accepted: they are mended.
 */
export const acceptFindings = (
  findings: readonly Finding[],
  acceptances: readonly Acceptance[],
): readonly Finding[] => {
  const used = new Set<Acceptance>()
  const marked = findings.map((finding) => {
    if (finding.severity !== 'warning') return finding
    const acceptance = acceptances.find(
      (candidate) =>
        candidate.code === finding.code &&
        (finding.path === candidate.path || finding.path.startsWith(`${candidate.path}.`)),
    )
    if (!acceptance) return finding
    used.add(acceptance)
    return { ...finding, accepted: acceptance.reason }
  })
  const stale = acceptances
    .filter((acceptance) => !used.has(acceptance))
    .map((acceptance): Finding => ({
      code: 'CF-E090',
      severity: engineeringCodes['CF-E090'].severity,
      message: `${acceptance.code} is accepted here, but no warning with this code stands here.`,
      hint: 'Remove the line; errors cannot be accepted.',
      path: acceptance.path,
      range: acceptance.range,
      related: [],
      fixes: [],
    }))
  return [...marked, ...stale]
}

const rank = { error: 0, warning: 1, note: 2 } as const

/** By place, then by severity, then by code: the order in which a reader meets them. */
export const inReadingOrder = (findings: readonly Finding[]): readonly Finding[] =>
  findings.toSorted(
    (a, b) =>
      a.range.start.line - b.range.start.line ||
      a.range.start.character - b.range.start.character ||
      rank[a.severity] - rank[b.severity] ||
      (a.code < b.code ? -1 : a.code > b.code ? 1 : 0),
  )
