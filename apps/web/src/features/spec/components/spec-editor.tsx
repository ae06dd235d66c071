import { indentWithTab } from '@codemirror/commands'
import { yaml } from '@codemirror/lang-yaml'
import { nextDiagnostic, previousDiagnostic } from '@codemirror/lint'
import { openSearchPanel } from '@codemirror/search'
import { EditorState, Prec, type Extension } from '@codemirror/state'
import { EditorView, keymap, type ViewUpdate } from '@codemirror/view'
import CodeMirror, { ExternalChange } from '@uiw/react-codemirror'
import { useCallback, useEffect, useImperativeHandle, useMemo, useRef, useState, type Ref } from 'react'
import type { Range, Vocabulary } from '@coldfill/spec'
import type { Finding } from '#lib/sized-project.ts'
import { actionMenu, knowFindings } from '../editor/action-menu.ts'
import { applyFix, findingGutter, offsetOf, showFindings } from '../editor/finding-marks.ts'
import { folding } from '../editor/folding.ts'
import { formatCommand, formatText } from '../editor/format-command.ts'
import { closePanel, helpPanel } from '../editor/help-panel.ts'
import { languageHelp, showComputed, type Computed } from '../editor/language-help.ts'
import { nameCommands } from '../editor/name-commands.ts'
import { resultMargin, showResults } from '../editor/result-margin.ts'
import { textDifference } from '../editor/text-difference.ts'
import { editorTheme } from '../editor/theme.ts'
import type { MarginEntry } from '../margin-lines.ts'
import type { PushedText } from '../use-spec-draft.ts'

export interface SpecEditorHandle {
  readonly jumpTo: (range: Range) => void
  readonly fix: (fix: Finding['fixes'][number]) => void
  readonly format: () => void
  readonly text: () => string
  /** Findings that are shown before the rest of the sheet knows of them. */
  readonly show: (findings: readonly Finding[]) => void
}

/** What the language and the last sizing say about the text. */
export interface ShownBesideText {
  readonly findings: readonly Finding[]
  readonly entries: readonly MarginEntry[]
  readonly stale: boolean
  /** What the last sizing made of a path; for the hover. */
  readonly computed: Computed
}

interface Props {
  readonly ref: Ref<SpecEditorHandle>
  readonly pushed: PushedText
  readonly onChange: (text: string) => void
  readonly readOnly: boolean
  /** Names that completion and hover know; until it is there they are silent. */
  readonly vocabulary: Vocabulary | undefined
  readonly shown: ShownBesideText
  /** Zero-based line of the cursor. Must stay the same function. */
  readonly onLine: (line: number) => void
  /** Leads to the whole calculation of a vessel. Must stay the same function. */
  readonly onTrace: (address: string) => void
}

const setup = { foldGutter: true, autocompletion: false, highlightActiveLine: true, lintKeymap: false, tabSize: 2 }
const always: Extension = [
  yaml(),
  editorTheme(),
  findingGutter,
  Prec.highest(
    keymap.of([
      { key: 'F8', run: nextDiagnostic, shift: previousDiagnostic, preventDefault: true },
      { key: 'Mod-f', run: openSearchPanel },
    ]),
  ),
  helpPanel,
  folding,
  formatCommand,
  keymap.of([{ key: 'Escape', run: closePanel }, indentWithTab]),
  EditorView.lineWrapping,
  EditorView.contentAttributes.of({
    'aria-label': 'Spec text. Press Escape, then Tab, to leave the editor.',
    spellcheck: 'false',
    tabindex: '0',
    autocorrect: 'off',
    autocapitalize: 'off',
  }),
]

/** The YAML editor of the spec: findings underlined and marked, results beside the lines. */
export const SpecEditor = ({ ref, pushed, onChange, readOnly, vocabulary, shown, onLine, onTrace }: Props) => {
  const { findings, entries, stale, computed } = shown
  const [view, setView] = useState<EditorView | null>(null)
  const jumpTo = useCallback(
    (range: Range) => {
      if (!view) return
      const anchor = offsetOf(view.state.doc, range.start)
      const head = Math.max(anchor, offsetOf(view.state.doc, range.end))
      view.dispatch({ selection: { anchor, head }, effects: EditorView.scrollIntoView(anchor, { y: 'center' }) })
      view.focus()
    },
    [view],
  )
  const drawn = useRef<readonly Finding[] | null>(null)
  const show = useCallback(
    (found: readonly Finding[]) => {
      if (!view || drawn.current === found) return
      drawn.current = found
      view.dispatch(showFindings(view.state, found), knowFindings(found))
    },
    [view],
  )
  useImperativeHandle(
    ref,
    () => ({
      jumpTo,
      fix: (fix) => view && applyFix(view, fix),
      format: () => view && formatText(view),
      text: () => view?.state.doc.toString() ?? '',
      show,
    }),
    [jumpTo, show, view],
  )

  const extensions = useMemo(
    () => [
      always,
      resultMargin(onTrace),
      EditorState.readOnly.of(readOnly),
      vocabulary ? [languageHelp(vocabulary), nameCommands(vocabulary), actionMenu(vocabulary)] : [],
    ],
    [readOnly, vocabulary, onTrace],
  )
  const onUpdate = useCallback(
    ({ state, selectionSet }: ViewUpdate) => {
      if (selectionSet) onLine(state.doc.lineAt(state.selection.main.head).number - 1)
    },
    [onLine],
  )

  const [first] = useState(pushed.text)
  const known = useRef(pushed)
  useEffect(() => {
    if (known.current === pushed || !view) return
    known.current = pushed
    const was = view.state.doc.toString()
    if (was !== pushed.text)
      view.dispatch({ changes: textDifference(was, pushed.text), annotations: ExternalChange.of(true) })
  }, [view, pushed])
  useEffect(() => show(findings), [show, findings])
  useEffect(() => {
    if (view) view.dispatch(showComputed(computed, stale))
  }, [view, computed, stale])
  useEffect(() => {
    if (view) view.dispatch(showResults(view.state, entries, stale))
  }, [view, entries, stale])

  return (
    <CodeMirror
      value={first}
      onChange={onChange}
      onUpdate={onUpdate}
      onCreateEditor={setView}
      extensions={extensions}
      basicSetup={setup}
      indentWithTab={false}
      theme="none"
      height="100%"
      className="h-full min-h-0"
    />
  )
}
