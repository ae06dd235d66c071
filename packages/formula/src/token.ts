import { spelledOut } from './greek.ts'
import type { Columns } from './tree.ts'

export interface Token {
  readonly type: 'number' | 'name' | 'unit' | 'sign' | 'end'
  readonly text: string
  readonly at: Columns
}

/** Typeset signs that a drawn formula has, and what they mean. */
const SIGNS: Readonly<Record<string, string>> = {
  '−': '-',
  '·': '*',
  '×': '*',
  '÷': '/',
  '≤': '<=',
  '≥': '>=',
  '==': '=',
}

const TOKEN =
  /(?<space>\s+)|(?<number>(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?)|(?<name>[A-Za-zΑ-Ωα-ω][A-Za-z0-9_Α-Ωα-ω]*)|\[(?<unit>[^\]]*)\]|(?<sign><=|>=|==|[-+*/^(),<>=−·×÷≤≥])|(?<wrong>[^])/gu

/** Cuts a formula into tokens, the last of type `end`. A character that no formula has is reported and left out. */
export const tokens = (text: string, report: (message: string, at: Columns) => void): Token[] => {
  const list: Token[] = []
  for (const match of text.matchAll(TOKEN)) {
    const groups = match.groups!
    const at = { start: match.index, end: match.index + match[0].length }
    if (groups.number !== undefined) list.push({ type: 'number', text: groups.number, at })
    else if (groups.name !== undefined) list.push({ type: 'name', text: spelledOut(groups.name), at })
    else if (groups.unit !== undefined) list.push({ type: 'unit', text: groups.unit.trim(), at })
    else if (groups.sign !== undefined) list.push({ type: 'sign', text: SIGNS[groups.sign] ?? groups.sign, at })
    else if (groups.wrong !== undefined) report(`The character "${groups.wrong}" does not belong in a formula.`, at)
  }
  list.push({ type: 'end', text: '', at: { start: text.length, end: text.length } })
  return list
}
