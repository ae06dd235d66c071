import type { Finding, Fix } from '../finding.ts'
import { indexLines } from '../parse/line-index.ts'

/** Words to be replaced by the reason. */
export const reasonPlaceholder = '…'

/**
 * The change that accepts a warning in the text: a comment on a line of its own above the place. The reason is still to be
 * written; `reasonPlaceholder` stands for it and is no reason. Null for errors, which are mended, and for notes.
 */
export const acceptFix = (text: string, finding: Finding, reason: string = reasonPlaceholder): Fix | null => {
  if (finding.severity !== 'warning') return null
  const lines = indexLines(text)
  const start = { line: finding.range.start.line, character: 0 }
  const at = lines.offset(start)
  const lineEnd = text.indexOf('\n', at)
  const line = text.slice(at, lineEnd < 0 ? text.length : lineEnd)
  const indent = /^\s*/u.exec(line)?.[0] ?? ''
  return {
    title: 'Accept with a reason',
    edits: [{ range: { start, end: start }, text: `${indent}# coldfill: accept ${finding.code} because ${reason}\n` }],
  }
}
