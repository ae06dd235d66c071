import { revisionSegment, type Project, type SpecDocument } from '@coldfill/contract'
import { useQuery } from '@tanstack/react-query'
import { useMemo } from 'react'
import { resultsQuery } from '#features/results/api/results.ts'
import { useSizing, type SizedText } from '#features/spec/use-sizing.ts'

/** Results of the text: sized as typed where this person may edit, else as the server has them; and those of the last issue. */
export const useSpecResults = (project: Project, document: SpecDocument, rev: string | null, text: string) => {
  const { number } = project
  const readOnly = document.readOnly !== null
  const typed = useSizing(number, text, !readOnly)
  const saved = useQuery({ ...resultsQuery(number, rev), enabled: readOnly })
  const newest = project.revisions[0]
  const issued = useQuery({
    ...resultsQuery(number, newest ? revisionSegment(newest.label) : null),
    enabled: newest !== undefined && !readOnly,
  })
  const savedAnswer = useMemo(
    (): SizedText | null =>
      saved.data ? { result: saved.data.result, text: document.text, at: document.savedAt } : null,
    [saved.data, document],
  )
  const latest = readOnly ? savedAnswer : typed.latest
  const good = readOnly ? savedAnswer : typed.good
  return {
    latest,
    good,
    stale: good === null || good.text !== text,
    error: typed.error,
    issued: readOnly ? null : (issued.data?.result ?? null),
    newest,
  }
}
