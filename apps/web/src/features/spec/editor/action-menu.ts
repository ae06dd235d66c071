import { StateEffect, StateField, type Extension } from '@codemirror/state'
import { keymap, type EditorView } from '@codemirror/view'
import { type Action, actionsAt, changedLines, type Vocabulary } from '@coldfill/spec'
import type { Finding } from '#lib/sized-project.ts'
import { drawnChanges } from './changes.ts'
import { applyFix, rendered } from './finding-marks.ts'
import { element, openPanel, panelFrame, say } from './help-panel.ts'

const setFindings = StateEffect.define<readonly Finding[]>()

/** Findings as they are shown, for the actions at the cursor. */
const findingsField = StateField.define<readonly Finding[]>({
  create: () => [],
  update: (value, transaction) => {
    for (const effect of transaction.effects) if (effect.is(setFindings)) return effect.value
    return value
  },
})

export const knowFindings = (findings: readonly Finding[]) => ({ effects: setFindings.of(findings) })

const HINT = 'Up and Down choose, Enter makes the change.'

const menu = (view: EditorView, actions: readonly Action[]) => {
  const text = view.state.doc.toString()
  const preview = element('div', 'min-w-0 flex-1 basis-72', [], { 'aria-live': 'polite' })
  const list = element('ul', 'min-w-0 flex-1 basis-56', [], { role: 'listbox', tabindex: '0', 'aria-label': HINT })
  let at = 0
  const rows = actions.map((action, index) => {
    const row = element(
      'li',
      'cursor-pointer px-2 py-0.5 aria-selected:bg-steel aria-selected:text-sheet',
      [rendered(action.title)],
      {
        role: 'option',
        id: `action-${index}`,
      },
    )
    row.addEventListener('mousemove', () => choose(index))
    row.addEventListener('click', () => applyFix(view, action))
    return row
  })
  const choose = (index: number) => {
    at = (index + rows.length) % rows.length
    for (const [each, row] of rows.entries()) row.setAttribute('aria-selected', String(each === at))
    list.setAttribute('aria-activedescendant', `action-${at}`)
    rows[at]?.scrollIntoView({ block: 'nearest' })
    const action = actions[at]
    preview.replaceChildren(...(action ? [drawnChanges(changedLines(text, action.edits))] : []))
  }
  list.append(...rows)
  list.addEventListener('keydown', (event) => {
    if (event.key === 'ArrowDown') choose(at + 1)
    else if (event.key === 'ArrowUp') choose(at - 1)
    else if (event.key === 'Home') choose(0)
    else if (event.key === 'End') choose(rows.length - 1)
    else if (event.key === 'Enter') {
      const action = actions[at]
      if (action) applyFix(view, action)
    } else return
    event.preventDefault()
  })
  choose(0)
  const body = element('div', 'flex flex-wrap gap-3', [list, preview])
  return { dom: panelFrame(view, 'Changes offered here', [body]), focus: list }
}

/** Ctrl+. offers what mends the findings at the cursor and other units, each with the lines that it would change. */
export const actionMenu = (vocabulary: Vocabulary): Extension => [
  findingsField,
  keymap.of([
    {
      key: 'Mod-.',
      preventDefault: true,
      run: (view) => {
        if (view.state.readOnly) return false
        const text = view.state.doc.toString()
        const actions = actionsAt(text, view.state.selection.main.head, view.state.field(findingsField), vocabulary)
        if (actions.length === 0) say(view, 'Nothing is offered here: no finding has a fix, and no other unit fits.')
        else openPanel(view, (opened) => menu(opened, actions))
        return true
      },
    },
  ]),
]
