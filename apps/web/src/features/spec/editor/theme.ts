import { HighlightStyle, syntaxHighlighting } from '@codemirror/language'
import type { Extension } from '@codemirror/state'
import { EditorView } from '@codemirror/view'
import { tags } from '@lezer/highlight'

const look = EditorView.theme({
  '&': { height: '100%', backgroundColor: 'var(--color-well)', color: 'var(--color-ink)', fontSize: '13px' },
  '&.cm-focused': { outline: 'none' },
  '.cm-scroller': { fontFamily: 'var(--font-mono)', lineHeight: '20px', overflow: 'auto' },
  '.cm-content': { padding: '8px 0 60px', caretColor: 'var(--color-ink)' },
  '.cm-line': { padding: '0 12px 0 6px' },
  '.cm-cursor': { borderLeftColor: 'var(--color-ink)', borderLeftWidth: '2px' },
  '.cm-gutters': { backgroundColor: 'var(--color-well)', color: 'var(--color-pencil)', border: 'none' },
  '.cm-gutters.cm-gutters-after': { borderLeft: '1px solid var(--color-hair)', backgroundColor: 'var(--color-sheet)' },
  '.cm-activeLine': { backgroundColor: 'color-mix(in srgb, var(--color-steel-wash) 55%, transparent)' },
  '.cm-activeLineGutter': { backgroundColor: 'transparent', color: 'var(--color-ink)' },
  '&.cm-focused > .cm-scroller > .cm-selectionLayer .cm-selectionBackground, .cm-selectionBackground': {
    backgroundColor: 'color-mix(in srgb, var(--color-steel) 28%, transparent)',
  },
  '.cm-content ::selection': { backgroundColor: 'transparent', color: 'inherit' },
  '.cm-matchingBracket': { backgroundColor: 'var(--color-steel-wash)', outline: '1px solid var(--color-steel)' },
  '.cm-searchMatch': { backgroundColor: 'var(--color-ochre-wash)', outline: '1px solid var(--color-ochre)' },
  '.cm-panels': { backgroundColor: 'var(--color-sheet)', color: 'var(--color-ink)', borderColor: 'var(--color-rule)' },
  '.cm-tooltip': {
    backgroundColor: 'var(--color-sheet)',
    color: 'var(--color-ink)',
    border: '2px solid var(--color-ink)',
    maxWidth: '440px',
  },
  '.cm-tooltip.cm-tooltip-autocomplete > ul': { fontFamily: 'var(--font-mono)', maxHeight: '14em' },
  '.cm-tooltip.cm-tooltip-autocomplete > ul > li': { padding: '2px 8px', lineHeight: '18px' },
  '.cm-tooltip.cm-tooltip-autocomplete > ul > li[aria-selected]': {
    backgroundColor: 'var(--color-steel)',
    color: 'var(--color-sheet)',
  },
  '.cm-completionDetail': { fontStyle: 'normal', opacity: '0.75', marginLeft: '12px' },
  '.cm-completionMatchedText': { textDecoration: 'none', fontWeight: '700' },
  '.cm-tooltip.cm-completionInfo': { fontFamily: 'var(--font-sans)', fontSize: '13px', padding: '6px 10px' },
  '.cm-diagnostic': {
    fontFamily: 'var(--font-sans)',
    fontSize: '13px',
    padding: '6px 10px',
    borderLeft: '3px solid var(--color-fault)',
  },
  '.cm-diagnostic-warning': { borderLeftColor: 'var(--color-ochre)' },
  '.cm-diagnostic-info': { borderLeftColor: 'var(--color-steel)' },
  '.cm-diagnosticAction': {
    backgroundColor: 'var(--color-steel)',
    color: 'var(--color-sheet)',
    borderRadius: '0',
    padding: '2px 6px',
  },
  '.cm-lintRange': { backgroundImage: 'none', paddingBottom: '0' },
  '.cm-lintRange-error': { textDecoration: 'underline wavy var(--color-fault) 1.5px', textUnderlineOffset: '3px' },
  '.cm-lintRange-warning': { textDecoration: 'underline wavy var(--color-ochre) 1.5px', textUnderlineOffset: '3px' },
  '.cm-lintRange-info': { textDecoration: 'underline dotted var(--color-steel) 2px', textUnderlineOffset: '3px' },
  '.cm-lintRange-active': { backgroundColor: 'var(--color-steel-wash)' },
  '.cm-lintPoint:after': { display: 'none' },
  '.cm-finding-gutter': { width: '20px' },
  '.cm-finding-gutter .cm-gutterElement': { padding: '2px 0 0 4px', cursor: 'pointer' },
  '.cm-result-margin .cm-gutterElement': { overflow: 'visible', padding: '0' },
})

const colours = HighlightStyle.define([
  { tag: [tags.propertyName, tags.definition(tags.propertyName)], color: 'var(--color-steel)', fontWeight: '500' },
  { tag: tags.comment, color: 'var(--color-pencil)', fontStyle: 'italic' },
  { tag: [tags.string, tags.content, tags.literal, tags.number], color: 'var(--color-ink)' },
  { tag: [tags.punctuation, tags.separator, tags.squareBracket, tags.brace], color: 'var(--color-pencil)' },
])

/** Tags of styles that the editor puts into the page need the nonce of the page. */
const nonce = (): string => document.querySelector<HTMLMetaElement>('meta[name="csp-nonce"]')?.content ?? ''

export const editorTheme = (): Extension => [look, syntaxHighlighting(colours), EditorView.cspNonce.of(nonce())]
