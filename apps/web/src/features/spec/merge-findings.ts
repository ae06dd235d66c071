import type { ProjectResult } from '@coldfill/contract'
import type { Range } from '@coldfill/spec'
import type { Finding } from '#lib/sized-project.ts'

const isEngineering = (finding: Finding) => finding.code.startsWith('CF-E')

const inOrder = (findings: readonly Finding[]): readonly Finding[] =>
  findings.toSorted(
    (a, b) => a.range.start.line - b.range.start.line || a.range.start.character - b.range.start.character,
  )

/**
 * Findings of the text as it stands. Syntax and spec are checked here at once; engineering comes with the sizing. While a newer text
 * is being sized, its last findings stay at the keys they were about, wherever these have moved, and go with keys that are gone.
 */
export const mergeFindings = (
  local: readonly Finding[],
  sized: { readonly result: ProjectResult; readonly text: string } | null,
  text: string,
  rangeOf: (path: string) => Range | null,
): readonly Finding[] => {
  if (!sized) return local
  if (sized.text === text) return sized.result.findings
  const moved = sized.result.findings.filter(isEngineering).flatMap((finding) => {
    const range = rangeOf(finding.path)
    return range ? [{ ...finding, range, fixes: [] }] : []
  })
  return inOrder([...local, ...moved])
}
