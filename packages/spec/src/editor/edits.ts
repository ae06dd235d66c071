import type { Fix, Range } from '../finding.ts'
import { indexLines, lineEnd, lineStart } from '../parse/line-index.ts'

export type TextEdit = Fix['edits'][number]

interface Patch {
  readonly start: number
  readonly end: number
  readonly text: string
}

const patchesOf = (text: string, edits: readonly TextEdit[]): Patch[] => {
  const lines = indexLines(text)
  return edits
    .map(({ range, text: put }) => ({ start: lines.offset(range.start), end: lines.offset(range.end), text: put }))
    .toSorted((a, b) => a.start - b.start || a.end - b.end)
}

/** Whether no two edits touch the same characters, so that they can be made together. */
export const canStandTogether = (text: string, edits: readonly TextEdit[]): boolean =>
  patchesOf(text, edits).every(
    ({ start, end }, index, all) =>
      index === 0 || (all[index - 1]?.end ?? 0) < start || (all[index - 1]?.end === start && end > start),
  )

/** The text with all edits made at once; an edit that touches one before it is left out. */
export const applyEdits = (text: string, edits: readonly TextEdit[]): string => {
  const parts: string[] = []
  let at = 0
  for (const { start, end, text: put } of patchesOf(text, edits)) {
    if (start < at) continue
    parts.push(text.slice(at, start), put)
    at = end
  }
  return parts.join('') + text.slice(at)
}

/** Lines that a change replaces, as a small difference: for a preview. */
export interface ChangedLines {
  /** Zero-based number of the first line in the text before. */
  readonly line: number
  readonly was: readonly string[]
  readonly now: readonly string[]
}

/** Takes away the lines at both ends that stay the same. */
const trimmed = ({ line, was, now }: ChangedLines): ChangedLines => {
  let head = 0
  while (head < was.length && head < now.length && was[head] === now[head]) head += 1
  let tail = 0
  while (tail < was.length - head && tail < now.length - head && was.at(-1 - tail) === now.at(-1 - tail)) tail += 1
  return { line: line + head, was: was.slice(head, was.length - tail), now: now.slice(head, now.length - tail) }
}

/** What the edits do to the lines of the text, in order. */
export const changedLines = (text: string, edits: readonly TextEdit[]): readonly ChangedLines[] => {
  const groups: { start: number; end: number; patches: Patch[] }[] = []
  for (const patch of patchesOf(text, edits)) {
    const start = lineStart(text, patch.start)
    const end = lineEnd(text, patch.end)
    const last = groups.at(-1)
    if (last && start <= last.end) {
      last.end = Math.max(last.end, end)
      last.patches.push(patch)
    } else groups.push({ start, end, patches: [patch] })
  }
  const lines = indexLines(text)
  return groups
    .map(({ start, end, patches }) => {
      const inside = patches.map((patch) => ({
        range: lines.range({ start: patch.start, end: patch.end }),
        text: patch.text,
      }))
      // Edits keep their places while the text behind the group is cut off.
      const after = applyEdits(text.slice(0, end), inside).slice(start)
      return trimmed({
        line: lines.position(start).line,
        was: text.slice(start, end).split('\n'),
        now: after.split('\n'),
      })
    })
    .filter(({ was, now }) => was.length > 0 || now.length > 0)
}

/** An edit that replaces the characters between two offsets. */
export const editAt = (text: string, start: number, end: number, put: string): TextEdit => ({
  range: indexLines(text).range({ start, end }),
  text: put,
})

export const isEmptyRange = ({ start, end }: Range): boolean =>
  start.line === end.line && start.character === end.character
