import type { Box } from '@coldfill/formula'
import { TextRun } from 'docx'
import { SUBSCRIPT_STYLE, SYMBOL_STYLE } from './styles.ts'

/** A symbol among words: a native equation there would stand in a size and on a line of its own. */
export const symbolRuns = (box: Box): TextRun[] => {
  if (box.box === 'row') return box.items.flatMap(symbolRuns)
  if (box.box === 'subscript') {
    return [...symbolRuns(box.base), new TextRun({ text: textOf(box.sub), style: SUBSCRIPT_STYLE })]
  }
  if (box.box === 'identifier') return [new TextRun({ text: box.text, style: SYMBOL_STYLE })]
  return [new TextRun(textOf(box))]
}

const textOf = (box: Box): string => {
  if (box.box === 'row') return box.items.map(textOf).join('')
  return 'text' in box ? box.text : ''
}
