import type { Extension } from '@codemirror/state'
import { EditorView } from '@codemirror/view'

const underline = (colour: string) =>
  `linear-gradient(var(--color-${colour}), var(--color-${colour})) bottom/100% 2px no-repeat`

/** Colours of a comparison: what is only in the other text, what is only in this one. A sign in the margin says the same. */
export const compareTheme: Extension = EditorView.theme({
  '.cm-content': { paddingBottom: '16px' },
  '.cm-activeLine': { backgroundColor: 'transparent' },
  '&.cm-focused .cm-activeLine': { outline: '1px solid var(--color-hair)' },
  '&.cm-merge-a .cm-changedLine, .cm-deletedChunk': { backgroundColor: 'var(--color-ochre-wash)' },
  '&.cm-merge-b .cm-changedLine, .cm-inlineChangedLine': { backgroundColor: 'var(--color-steel-wash)' },
  '&.cm-merge-a .cm-changedText, .cm-deletedChunk .cm-deletedText': { background: underline('ochre') },
  '&.cm-merge-b .cm-changedText': { background: underline('steel') },
  '&.cm-merge-b .cm-deletedText': { background: underline('ochre') },
  '.cm-changeGutter': { width: '4px', paddingLeft: '0' },
  '&.cm-merge-a .cm-changedLineGutter, .cm-deletedLineGutter': { background: 'var(--color-ochre)' },
  '&.cm-merge-b .cm-changedLineGutter': { background: 'var(--color-steel)' },
  '.cm-deletedChunk .cm-chunkButtons': {
    position: 'static',
    display: 'flex',
    flexWrap: 'wrap',
    gap: '8px',
    padding: '4px 0 2px',
    fontFamily: 'var(--font-sans)',
  },
  '.cm-deletedChunk .cm-chunkButtons button': {
    height: '28px',
    padding: '0 10px',
    margin: '0',
    borderRadius: '0',
    border: '1.5px solid var(--color-rule)',
    background: 'var(--color-sheet)',
    color: 'var(--color-ink)',
    fontSize: '12.5px',
    fontWeight: '500',
  },
  '.cm-collapsedLines': {
    padding: '2px 10px',
    color: 'var(--color-pencil)',
    background: 'var(--color-sheet)',
    fontFamily: 'var(--font-sans)',
    fontSize: '12.5px',
  },
  '.cm-collapsedLines:before, .cm-collapsedLines:after': { content: '"⋯"' },
})
