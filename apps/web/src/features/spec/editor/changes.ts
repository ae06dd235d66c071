import type { ChangeSpec, Text } from '@codemirror/state'
import type { ChangedLines, TextEdit } from '@coldfill/spec'
import { offsetOf } from './finding-marks.ts'
import { element } from './help-panel.ts'

/** Edits of the language as changes of the editor: all of them are one step to undo. */
export const changesOf = (doc: Text, edits: readonly TextEdit[]): ChangeSpec[] =>
  edits.map(({ range, text }) => ({ from: offsetOf(doc, range.start), to: offsetOf(doc, range.end), insert: text }))

const row = (sign: string, number: number, text: string, tone: string): HTMLElement =>
  element('div', `flex gap-2 px-1 ${tone}`, [
    element('span', 'w-8 shrink-0 text-right text-pencil select-none', [`${number}`]),
    element('span', 'select-none', [sign]),
    element('span', 'min-w-0 break-words whitespace-pre-wrap', [text]),
  ])

const MOST_SHOWN = 12

/** The lines that a change takes out and puts in. */
export const drawnChanges = (changes: readonly ChangedLines[]): HTMLElement => {
  const rows = changes.flatMap(({ line, was, now }) => [
    ...was.map((text, at) => row('−', line + 1 + at, text, 'bg-fault-wash')),
    ...now.map((text, at) => row('+', line + 1 + at, text, 'bg-verdigris-wash')),
  ])
  const rest = rows.length - MOST_SHOWN
  return element('div', 'border border-hair font-mono text-[12.5px] leading-[18px]', [
    ...rows.slice(0, MOST_SHOWN),
    ...(rest > 0 ? [element('p', 'px-1 text-pencil', [`and ${rest} more lines`])] : []),
  ])
}
