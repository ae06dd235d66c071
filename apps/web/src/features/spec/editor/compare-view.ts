import { defaultKeymap, history, historyKeymap } from '@codemirror/commands'
import { yaml } from '@codemirror/lang-yaml'
import { getChunks, MergeView, rejectChunk, unifiedMergeView, type Chunk } from '@codemirror/merge'
import { EditorState, type Extension } from '@codemirror/state'
import { EditorView, keymap, lineNumbers } from '@codemirror/view'
import type { Range } from '@coldfill/spec'
import { compareTheme } from './compare-theme.ts'
import { findingGutter, offsetOf } from './finding-marks.ts'
import { element } from './help-panel.ts'
import { textDifference } from './text-difference.ts'
import { editorTheme } from './theme.ts'

/** How many places differ, and at which of them the cursor stands (from 1; 0 where it stands at none). */
export interface ComparePlace {
  readonly count: number
  readonly at: number
}

export interface CompareSetup {
  readonly parent: HTMLElement
  readonly left: { readonly title: string; readonly text: string }
  readonly right: { readonly title: string; readonly text: string }
  /** Side by side, or one text with the other's lines put between. */
  readonly wide: boolean
  readonly readOnly: boolean
  readonly onChange: (text: string) => void
  readonly onPlace: (place: ComparePlace) => void
}

export interface CompareView {
  /** The text at the right, which may be edited. */
  readonly right: EditorView
  /** Puts another text at the right, where it is another. */
  readonly setRight: (text: string) => void
  /** To the first place that differs. */
  readonly start: () => void
  readonly step: (by: 1 | -1) => void
  /** Takes the lines of the left text at the place of the cursor. */
  readonly takeLeft: () => void
  /** Leads to a range of either text. */
  readonly jump: (side: 'left' | 'right', range: Range) => void
  readonly destroy: () => void
}

const shared: Extension = [
  lineNumbers(),
  yaml(),
  editorTheme(),
  compareTheme,
  EditorView.lineWrapping,
  EditorState.phrases.of({ '$ unchanged lines': '$ lines that are alike' }),
]

const labelled = (label: string): Extension =>
  EditorView.contentAttributes.of({
    'aria-label': label,
    spellcheck: 'false',
    tabindex: '0',
    autocorrect: 'off',
    autocapitalize: 'off',
  })

const isAt = (chunk: Chunk, head: number): boolean => head >= chunk.fromB && head <= Math.max(chunk.endB, chunk.fromB)

const placeIn = (state: EditorState): ComparePlace => {
  const chunks = getChunks(state)?.chunks ?? []
  return { count: chunks.length, at: chunks.findIndex((chunk) => isAt(chunk, state.selection.main.head)) + 1 }
}

const chunkButton = (label: string, action: (event: MouseEvent) => void): HTMLElement => {
  const button = element('button', '', [label], { type: 'button' })
  button.addEventListener('mousedown', action)
  return button
}

const mounted = (setup: CompareSetup): { readonly right: EditorView; readonly destroy: () => void } => {
  const { parent, left, right, wide, readOnly } = setup
  const own: Extension = [
    shared,
    labelled(readOnly ? right.title : `${right.title}. Press Escape, then Tab, to leave it.`),
    EditorState.readOnly.of(readOnly),
    history(),
    findingGutter,
    keymap.of([...defaultKeymap, ...historyKeymap]),
    EditorView.updateListener.of((update) => {
      if (update.docChanged) setup.onChange(update.state.doc.toString())
      if (update.docChanged || update.selectionSet) setup.onPlace(placeIn(update.state))
    }),
  ]
  const collapseUnchanged = { margin: 3, minSize: 6 }
  if (wide) {
    const view = new MergeView({
      parent,
      a: { doc: left.text, extensions: [shared, labelled(left.title), EditorState.readOnly.of(true)] },
      b: { doc: right.text, extensions: own },
      collapseUnchanged,
      ...(readOnly
        ? {}
        : {
            revertControls: 'a-to-b' as const,
            renderRevertControl: () =>
              element('button', 'text-steel', ['→'], {
                type: 'button',
                // The button over the texts does the same for the keyboard.
                tabindex: '-1',
                title: `Take this from ${left.title}`,
              }),
          }),
    })
    return { right: view.b, destroy: () => view.destroy() }
  }
  const view = new EditorView({
    parent,
    doc: right.text,
    extensions: [
      own,
      unifiedMergeView({
        original: left.text,
        collapseUnchanged,
        syntaxHighlightDeletions: false,
        mergeControls: readOnly
          ? false
          : (sort, action) => chunkButton(sort === 'reject' ? 'Take these' : 'Keep mine', action),
      }),
    ],
  })
  return { right: view, destroy: () => view.destroy() }
}

/** Two texts beside each other, of which the right one may be edited. */
export const openCompare = (setup: CompareSetup): CompareView => {
  const { right, destroy } = mounted(setup)
  const chunks = (): readonly Chunk[] => getChunks(right.state)?.chunks ?? []
  const show = (chunk: Chunk) => {
    const anchor = Math.min(chunk.fromB, right.state.doc.length)
    right.dispatch({ selection: { anchor }, effects: EditorView.scrollIntoView(anchor, { y: 'center' }) })
    right.focus()
  }
  const step = (by: 1 | -1) => {
    const all = chunks()
    const { head } = right.state.selection.main
    const here = all.findIndex((chunk) => isAt(chunk, head))
    const behind = all.findLastIndex((chunk) => chunk.fromB <= head)
    const next = here >= 0 ? here + by : by === 1 ? behind + 1 : behind
    const chunk = all[(next + all.length) % all.length]
    if (chunk) show(chunk)
  }
  const leftDoc = EditorState.create({ doc: setup.left.text }).doc
  return {
    right,
    setRight: (text) => {
      const was = right.state.doc.toString()
      if (was !== text) right.dispatch({ changes: textDifference(was, text) })
    },
    start: () => {
      const [first] = chunks()
      if (first) show(first)
      setup.onPlace(placeIn(right.state))
    },
    step,
    takeLeft: () => {
      const chunk = chunks().find((each) => isAt(each, right.state.selection.main.head))
      if (!chunk) return
      if (!setup.wide) rejectChunk(right, chunk.fromB)
      else {
        const lines = leftDoc.sliceString(chunk.fromA, Math.max(chunk.fromA, chunk.toA - 1))
        const whole = chunk.fromA !== chunk.toA && chunk.toB <= right.state.doc.length
        right.dispatch({
          changes: {
            from: chunk.fromB,
            to: Math.min(right.state.doc.length, chunk.toB),
            insert: whole ? `${lines}\n` : lines,
          },
          userEvent: 'revert',
        })
      }
      right.focus()
    },
    jump: (side, range) => {
      if (side === 'right') {
        const anchor = offsetOf(right.state.doc, range.start)
        right.dispatch({ selection: { anchor }, effects: EditorView.scrollIntoView(anchor, { y: 'center' }) })
        right.focus()
        return
      }
      const offset = offsetOf(leftDoc, range.start)
      const chunk = chunks().find(({ fromA, toA }) => offset >= fromA && offset <= toA)
      if (chunk) show(chunk)
    },
    destroy,
  }
}
