import type { OutlineItem } from '@coldfill/spec'
import type { Finding } from '#lib/sized-project.ts'

/** How many findings stand in a part of the building, and the worst of them. */
export interface Badge {
  readonly severity: Finding['severity']
  readonly count: number
}

const rank = { error: 0, warning: 1, note: 2 } as const

const worse = (a: Finding['severity'], b: Finding['severity']) => (rank[a] <= rank[b] ? a : b)

const holds = ({ extent }: OutlineItem, { range }: Finding): boolean => {
  const { line, character } = range.start
  const { start, end } = extent
  return (
    (line > start.line || (line === start.line && character >= start.character)) &&
    (line < end.line || (line === end.line && character <= end.character))
  )
}

/** Each open finding counts once, at the innermost part that holds it. By path. */
export const badgesOf = (outline: OutlineItem, findings: readonly Finding[]): ReadonlyMap<string, Badge> => {
  const badges = new Map<string, Badge>()
  const innermost = (item: OutlineItem, finding: Finding): OutlineItem => {
    const child = item.children.find((each) => holds(each, finding))
    return child ? innermost(child, finding) : item
  }
  for (const finding of findings) {
    if (finding.accepted !== undefined) continue
    const { path } = innermost(outline, finding)
    const before = badges.get(path)
    badges.set(path, {
      severity: before ? worse(before.severity, finding.severity) : finding.severity,
      count: (before?.count ?? 0) + 1,
    })
  }
  return badges
}
