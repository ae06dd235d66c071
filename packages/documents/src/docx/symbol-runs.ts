import type { Box } from '@coldfill/formula'
import { TextRun } from 'docx'
import { SUBSCRIPT_STYLE, SYMBOL_STYLE } from './styles.ts'

/** A symbol among words: a native equation there would stand in a size and on a line of its own. */
export const symbolRuns = (box: Box): TextRun[] => {
  switch (box.box) {
    case 'row':
      return box.items.flatMap(symbolRuns)
    case 'subscript':
      return [...symbolRuns(box.base), new TextRun({ text: textOf(box.sub), style: SUBSCRIPT_STYLE })]
    case 'identifier':
      return [new TextRun({ text: box.text, style: SYMBOL_STYLE })]
    default:
      return [new TextRun(textOf(box))]
  }
}

const textOf = (box: Box): string => {
  if (box.box === 'row') return box.items.map(textOf).join('')
  return 'text' in box ? box.text : ''
}
