import { setDiagnostics, type Diagnostic } from '@codemirror/lint'
import {
  RangeSet,
  StateEffect,
  StateField,
  type EditorState,
  type Extension,
  type Text,
  type TransactionSpec,
} from '@codemirror/state'
import { gutter, GutterMarker, type EditorView } from '@codemirror/view'
import type { Position, TextEdit } from '@coldfill/spec'
import type { Finding } from '#lib/sized-project.ts'

/** Offset of a position; one outside the text is brought to its ends. */
export const offsetOf = (text: Text, { line, character }: Position): number => {
  const found = text.line(Math.min(Math.max(line + 1, 1), text.lines))
  return Math.min(found.from + Math.max(character, 0), found.to)
}

const SVG = 'http://www.w3.org/2000/svg'
const part = (name: string, attributes: Readonly<Record<string, string>>, text = ''): SVGElement => {
  const element = document.createElementNS(SVG, name)
  for (const [key, value] of Object.entries(attributes)) element.setAttribute(key, value)
  element.textContent = text
  return element
}

type Severity = Finding['severity']
const order: readonly Severity[] = ['error', 'warning', 'note']

/** Solid square E, diamond W, ring i: the same shapes as everywhere. */
const mark = (severity: Severity): SVGElement => {
  const svg = part('svg', { width: '14', height: '14', viewBox: '0 0 16 16' })
  if (severity === 'error') svg.append(part('rect', { x: '1', y: '1', width: '14', height: '14', class: 'fill-fault' }))
  else if (severity === 'warning') svg.append(part('path', { d: 'M8 0 16 8 8 16 0 8Z', class: 'fill-ochre' }))
  else
    svg.append(part('circle', { cx: '8', cy: '8', r: '6.5', class: 'fill-none stroke-steel', 'stroke-width': '1.5' }))
  const letter = severity === 'error' ? 'E' : severity === 'warning' ? 'W' : 'i'
  svg.append(
    part(
      'text',
      {
        x: '8',
        y: severity === 'warning' ? '11' : '11.5',
        'text-anchor': 'middle',
        'font-size': severity === 'warning' ? '8' : '10',
        'font-weight': '700',
        'font-family': 'var(--font-sans)',
        class: severity === 'note' ? 'fill-steel' : 'fill-sheet',
      },
      letter,
    ),
  )
  return svg
}

class FindingMarker extends GutterMarker {
  readonly severity: Severity
  readonly title: string
  constructor(severity: Severity, title: string) {
    super()
    this.severity = severity
    this.title = title
  }
  override eq(other: FindingMarker): boolean {
    return other.severity === this.severity && other.title === this.title
  }
  override toDOM(): Node {
    const holder = document.createElement('span')
    holder.title = this.title
    holder.append(mark(this.severity))
    return holder
  }
}

const setMarks = StateEffect.define<RangeSet<GutterMarker>>()
const marks = StateField.define<RangeSet<GutterMarker>>({
  create: () => RangeSet.empty,
  update: (value, transaction) => {
    let next = value.map(transaction.changes)
    for (const effect of transaction.effects) if (effect.is(setMarks)) next = effect.value
    return next
  },
})

/** Marks beside the lines that have findings; a click on one puts the cursor there, and the tray then points out the findings. */
export const findingGutter: Extension = [
  marks,
  gutter({
    class: 'cm-finding-gutter',
    markers: (view) => view.state.field(marks),
    initialSpacer: () => new FindingMarker('note', ''),
    domEventHandlers: {
      mousedown: (view, block) => {
        view.dispatch({ selection: { anchor: block.from } })
        view.focus()
        return true
      },
    },
  }),
]

/** Makes the edits in one step to undo. A place that is still to be filled in is selected, so that typing fills it. */
const applyFix = (view: EditorView, fix: { readonly edits: readonly TextEdit[] }) => {
  const changes = view.state.changes(
    fix.edits.map((edit) => ({
      from: offsetOf(view.state.doc, edit.range.start),
      to: offsetOf(view.state.doc, edit.range.end),
      insert: edit.text,
    })),
  )
  const [first] = fix.edits
  const open = first?.text.indexOf('…') ?? -1
  const anchor = first && open >= 0 ? changes.mapPos(offsetOf(view.state.doc, first.range.start), -1) + open : null
  view.dispatch({
    changes,
    userEvent: 'input.fix',
    ...(anchor === null ? {} : { selection: { anchor, head: anchor + 1 }, scrollIntoView: true }),
  })
  view.focus()
}

const wordsOf = (finding: Finding): string => (finding.hint ? `${finding.message} ${finding.hint}` : finding.message)

/** Text of the spec, between backticks, is set in its type. */
export const rendered = (text: string): HTMLElement => {
  const holder = document.createElement('span')
  text.split('`').forEach((part, at) => {
    const piece = document.createElement(at % 2 === 0 ? 'span' : 'code')
    piece.className = at % 2 === 0 ? '' : 'bg-well px-0.5 font-mono'
    piece.textContent = part
    holder.append(piece)
  })
  return holder
}

const diagnosticOf = (state: EditorState, finding: Finding): Diagnostic => {
  const from = offsetOf(state.doc, finding.range.start)
  return {
    from,
    to: Math.max(from, offsetOf(state.doc, finding.range.end)),
    severity: finding.severity === 'note' ? 'info' : finding.severity,
    source: finding.code,
    message: wordsOf(finding),
    renderMessage: () => rendered(wordsOf(finding)),
    actions: finding.fixes.map((fix) => ({
      name: fix.title.replaceAll('`', ''),
      apply: (view) => applyFix(view, fix),
    })),
  }
}

/** Underlines and marks of these findings, in place of those shown before. Accepted ones are only listed. */
export const showFindings = (state: EditorState, findings: readonly Finding[]): TransactionSpec => {
  const open = findings.filter((finding) => finding.accepted === undefined)
  const lines = new Map<number, Finding[]>()
  for (const finding of open) {
    const { from } = state.doc.lineAt(offsetOf(state.doc, finding.range.start))
    lines.set(from, [...(lines.get(from) ?? []), finding])
  }
  const gutterMarks = RangeSet.of(
    [...lines]
      .toSorted(([a], [b]) => a - b)
      .map(([from, own]) => {
        const worst = order.find((severity) => own.some((finding) => finding.severity === severity)) ?? 'note'
        return new FindingMarker(worst, own.map((finding) => `${finding.code} ${finding.message}`).join('\n')).range(
          from,
        )
      }),
  )
  const base = setDiagnostics(
    state,
    open.map((finding) => diagnosticOf(state, finding)).toSorted((a, b) => a.from - b.from),
  )
  const effects = base.effects === undefined ? [] : Array.isArray(base.effects) ? base.effects : [base.effects]
  return { ...base, effects: [...effects, setMarks.of(gutterMarks)] }
}

export { applyFix }
