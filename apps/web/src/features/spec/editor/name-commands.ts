import type { Extension } from '@codemirror/state'
import { EditorView, keymap } from '@codemirror/view'
import {
  changedLines,
  definitionAt,
  type NameUses,
  type Range,
  renameAt,
  renameRefusal,
  usesOf,
  type Vocabulary,
} from '@coldfill/spec'
import { plural } from '#lib/format.ts'
import { changesOf, drawnChanges } from './changes.ts'
import { offsetOf } from './finding-marks.ts'
import { closePanel, element, openPanel, panelButton, panelFrame, say } from './help-panel.ts'

const jump = (view: EditorView, range: Range): void => {
  const anchor = offsetOf(view.state.doc, range.start)
  const head = Math.max(anchor, offsetOf(view.state.doc, range.end))
  view.dispatch({ selection: { anchor, head }, effects: EditorView.scrollIntoView(anchor, { y: 'center' }) })
  view.focus()
}

const NO_NAME = 'No mark, system, fluid or word of the language stands here.'

const goTo = (view: EditorView, offset: number, vocabulary: Vocabulary): boolean => {
  const found = definitionAt(view.state.doc.toString(), offset, vocabulary)
  if (!found) say(view, NO_NAME)
  else if (found.declared) jump(view, found.declared.range)
  else say(view, `${found.name.name}: ${found.name.doc || 'a word of the language'}. It is explained in Help.`)
  return true
}

const ROLES = { declaration: 'given here', reference: 'used', mention: 'mentioned' } as const

const usesPanel = (view: EditorView, { name, uses }: NameUses) => {
  const rows = uses.map((use) => {
    const button = element(
      'button',
      'flex w-full items-baseline gap-3 py-0.5 text-left hover:bg-steel-wash',
      [
        element('span', 'w-16 shrink-0 text-pencil', [`Line ${use.range.start.line + 1}`]),
        element('span', 'w-20 shrink-0', [ROLES[use.role]]),
        element('code', 'min-w-0 truncate font-mono text-[12.5px]', [use.line]),
      ],
      { type: 'button' },
    )
    button.addEventListener('click', () => jump(view, use.range))
    return button
  })
  const list = element(
    'ul',
    '',
    rows.map((each) => element('li', '', [each])),
  )
  return {
    dom: panelFrame(view, `${name.name}: ${plural(uses.length, 'place')}`, [list]),
    ...(rows[0] && { focus: rows[0] }),
  }
}

const findUses = (view: EditorView, offset: number, vocabulary: Vocabulary): boolean => {
  const found = usesOf(view.state.doc.toString(), offset, vocabulary)
  if (found) openPanel(view, (opened) => usesPanel(opened, found))
  else say(view, NO_NAME)
  return true
}

const renamePanel = (view: EditorView, offset: number, name: string, vocabulary: Vocabulary) => {
  const text = view.state.doc.toString()
  const input = document.createElement('input')
  input.className =
    'h-7 w-64 border border-rule bg-sheet px-2 font-mono aria-invalid:border-2 aria-invalid:border-fault'
  input.value = name
  input.spellcheck = false
  const word = element('p', '', [], { id: 'rename-word', 'aria-live': 'polite' })
  input.setAttribute('aria-describedby', 'rename-word')
  const preview = element('div', '')
  const read = () => renameAt(text, offset, input.value.trim(), vocabulary)
  const show = () => {
    const renaming = read()
    const untouched = input.value.trim() === name
    input.setAttribute('aria-invalid', String(!renaming.ok && !untouched))
    word.textContent = untouched
      ? ''
      : renaming.ok
        ? `${plural(renaming.edits.length, 'place')} will change.`
        : renaming.message
    preview.replaceChildren(...(renaming.ok ? [drawnChanges(changedLines(text, renaming.edits))] : []))
  }
  const apply = () => {
    const renaming = read()
    if (!renaming.ok) return show()
    const changes = changesOf(view.state.doc, renaming.edits)
    view.dispatch({ changes, userEvent: 'input.rename' })
    view.focus()
  }
  input.addEventListener('input', show)
  const form = element('form', 'flex flex-wrap items-center gap-2', [
    element('label', 'flex items-center gap-2 font-semibold', ['New name ', input]),
    panelButton('Rename', apply, true),
    panelButton('Cancel', () => closePanel(view)),
    word,
  ])
  form.addEventListener('submit', (event) => {
    event.preventDefault()
    apply()
  })
  input.addEventListener('focus', () => input.select(), { once: true })
  return { dom: panelFrame(view, `Rename ${name}`, [form, preview]), focus: input }
}

const rename = (view: EditorView, vocabulary: Vocabulary): boolean => {
  if (view.state.readOnly) return false
  const text = view.state.doc.toString()
  const offset = view.state.selection.main.head
  const refusal = renameRefusal(text, offset, vocabulary)
  const name = usesOf(text, offset, vocabulary)?.name.name
  if (refusal !== null || name === undefined) say(view, (refusal ?? NO_NAME).replaceAll('`', ''))
  else openPanel(view, (opened) => renamePanel(opened, offset, name, vocabulary))
  return true
}

/** F12 and a click with Ctrl go to where a name is given, Shift+F12 finds its uses, F2 gives it another name everywhere. */
export const nameCommands = (vocabulary: Vocabulary): Extension => [
  keymap.of([
    {
      key: 'F12',
      run: (view) => goTo(view, view.state.selection.main.head, vocabulary),
      shift: (view) => findUses(view, view.state.selection.main.head, vocabulary),
      preventDefault: true,
    },
    { key: 'F2', run: (view) => rename(view, vocabulary), preventDefault: true },
  ]),
  EditorView.domEventHandlers({
    mousedown: (event, view) => {
      if (event.button !== 0 || !(event.ctrlKey || event.metaKey)) return false
      const offset = view.posAtCoords({ x: event.clientX, y: event.clientY })
      const found = offset === null ? null : definitionAt(view.state.doc.toString(), offset, vocabulary)
      if (!found?.declared) return false
      event.preventDefault()
      jump(view, found.declared.range)
      return true
    },
  }),
]
