import { foldService } from '@codemirror/language'
import { StateEffect, StateField, type Extension, type Text } from '@codemirror/state'
import { ViewPlugin, type EditorView } from '@codemirror/view'
import { foldsOf } from '@coldfill/spec'

/** Offsets at which the line of a fold ends and at which the fold ends, by the end of its line. */
type Folds = ReadonlyMap<number, number>

/** Folds are read a moment after typing stops, so that typing never waits for them. */
const DELAY = 250

const read = (doc: Text): Folds =>
  new Map(
    foldsOf(doc.toString())
      .filter(({ end }) => end < doc.lines)
      .map(({ start, end }) => [doc.line(start + 1).to, doc.line(end + 1).to]),
  )

const setFolds = StateEffect.define<Folds>()

const folds = StateField.define<Folds>({
  create: (state) => read(state.doc),
  update: (value, transaction) => {
    for (const effect of transaction.effects) if (effect.is(setFolds)) return effect.value
    if (!transaction.docChanged) return value
    const { changes } = transaction
    return new Map([...value].map(([from, to]) => [changes.mapPos(from, 1), changes.mapPos(to, 1)]))
  },
})

const reader = ViewPlugin.define((view: EditorView) => {
  let timer: ReturnType<typeof setTimeout> | undefined
  return {
    update: ({ docChanged }) => {
      if (!docChanged) return
      clearTimeout(timer)
      timer = setTimeout(() => view.dispatch({ effects: setFolds.of(read(view.state.doc)) }), DELAY)
    },
    destroy: () => clearTimeout(timer),
  }
})

/** Blocks and runs of comments fold as the language reads them. */
export const folding: Extension = [
  folds,
  reader,
  foldService.of((state, _from, lineEnd) => {
    const to = state.field(folds, false)?.get(lineEnd)
    return to === undefined || to <= lineEnd ? null : { from: lineEnd, to }
  }),
]
