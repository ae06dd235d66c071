import {
  RangeSet,
  StateEffect,
  StateField,
  type EditorState,
  type Extension,
  type TransactionSpec,
} from '@codemirror/state'
import { gutter, GutterMarker } from '@codemirror/view'
import type { MarginEntry } from '../margin-lines.ts'

const line = (text: string, className: string): HTMLElement => {
  const element = document.createElement('span')
  element.textContent = text
  element.className = className
  return element
}

const link = (entry: MarginEntry): HTMLElement => {
  if (entry.trace === null) return line(entry.mark, 'font-mono text-zone text-pencil')
  const anchor = document.createElement('a')
  anchor.href = entry.trace
  anchor.textContent = entry.mark
  anchor.title = `The whole calculation of ${entry.mark}, as saved`
  anchor.className = 'font-mono text-zone'
  // The list under the editor has the same link for the keyboard.
  anchor.tabIndex = -1
  return anchor
}

class ResultMarker extends GutterMarker {
  readonly entry: MarginEntry
  readonly stale: boolean
  constructor(entry: MarginEntry, stale: boolean) {
    super()
    this.entry = entry
    this.stale = stale
  }
  override eq(other: ResultMarker): boolean {
    return other.stale === this.stale && JSON.stringify(other.entry) === JSON.stringify(this.entry)
  }
  override toDOM(): Node {
    const { entry, stale } = this
    const holder = document.createElement('div')
    holder.className = `flex flex-col pl-2 pr-3 leading-5 whitespace-nowrap ${stale ? 'opacity-45' : ''}`
    const head = document.createElement('span')
    head.className = 'flex items-baseline justify-between gap-2'
    const size = line(entry.size, `font-mono text-[13px] font-semibold ${entry.sized ? 'text-ink' : 'text-fault'}`)
    if (entry.was === null) head.append(link(entry), size)
    else {
      const was = document.createElement('del')
      was.className = 'font-mono text-zone'
      was.textContent = entry.was
      const triangle = line('△', 'text-redline text-[11px]')
      triangle.title = `${entry.was} in the last issue`
      const right = document.createElement('span')
      right.className = 'inline-flex items-baseline gap-1.5'
      right.append(was, size)
      const left = document.createElement('span')
      left.className = 'inline-flex items-baseline gap-1'
      left.append(link(entry), triangle)
      head.append(left, right)
    }
    holder.append(
      head,
      ...entry.details
        .slice(0, entry.room)
        .map((text) => line(text, 'text-right font-mono text-zone leading-5 text-pencil')),
    )
    return holder
  }
}

class Spacer extends GutterMarker {
  override toDOM(): Node {
    const element = document.createElement('div')
    element.className = 'w-52'
    return element
  }
}

const setResults = StateEffect.define<RangeSet<GutterMarker>>()
const results = StateField.define<RangeSet<GutterMarker>>({
  create: () => RangeSet.empty,
  update: (value, transaction) => {
    let next = value.map(transaction.changes)
    for (const effect of transaction.effects) if (effect.is(setResults)) next = effect.value
    return next
  },
})

/** Sized results beside the lines on which vessels are declared. The Results list of the tray says the same to those who do not see it. */
export const resultMargin = (onTrace: (address: string) => void): Extension => [
  results,
  gutter({
    class: 'cm-result-margin max-desk:hidden',
    side: 'after',
    markers: (view) => view.state.field(results),
    initialSpacer: () => new Spacer(),
    domEventHandlers: {
      click: (_view, _line, event) => {
        if (!(event instanceof MouseEvent) || event.button !== 0 || event.ctrlKey || event.metaKey || event.shiftKey)
          return false
        const anchor = event.target instanceof Element ? event.target.closest('a') : null
        const address = anchor?.getAttribute('href')
        if (!address) return false
        event.preventDefault()
        onTrace(address)
        return true
      },
    },
  }),
]

export const showResults = (state: EditorState, entries: readonly MarginEntry[], stale: boolean): TransactionSpec => {
  const marks = entries
    .filter((entry) => entry.line < state.doc.lines)
    .map((entry) => new ResultMarker(entry, stale).range(state.doc.line(entry.line + 1).from))
  return { effects: setResults.of(RangeSet.of(marks, true)) }
}
