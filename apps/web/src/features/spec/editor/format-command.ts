import type { ChangeSpec, Extension } from '@codemirror/state'
import { keymap, type EditorView } from '@codemirror/view'
import { formatSpec } from '@coldfill/spec'
import { plural } from '#lib/format.ts'
import { say } from './help-panel.ts'

/** Formatting keeps every line, so only those that change are put in: the cursor stays where it is. */
const lineChanges = (view: EditorView, after: string): ChangeSpec[] => {
  const lines = after.split('\n')
  if (lines.length !== view.state.doc.lines) return [{ from: 0, to: view.state.doc.length, insert: after }]
  return lines.flatMap((insert, at) => {
    const { from, to, text } = view.state.doc.line(at + 1)
    return text === insert ? [] : [{ from, to, insert }]
  })
}

/** Tidies indentation and spacing in one step to undo, and says what that came to. */
export const formatText = (view: EditorView): boolean => {
  if (view.state.readOnly) return false
  const text = view.state.doc.toString()
  const changes = lineChanges(view, formatSpec(text))
  if (changes.length > 0) view.dispatch({ changes, userEvent: 'input.format' })
  say(view, changes.length === 0 ? 'Format: no change needed.' : `Format: ${plural(changes.length, 'line')} tidied.`)
  view.focus()
  return true
}

export const formatCommand: Extension = keymap.of([{ key: 'Shift-Alt-f', run: formatText, preventDefault: true }])
