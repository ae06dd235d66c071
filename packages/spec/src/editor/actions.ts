import type { Finding, Fix } from '../finding.ts'
import type { Vocabulary } from '../model/spec-model.ts'
import { indexLines } from '../parse/line-index.ts'
import { treeForHelp } from '../parse/recent.ts'
import { acceptFix } from './accept-fix.ts'
import { conversionsAt } from './convert-unit.ts'
import { applyEdits, canStandTogether, type TextEdit } from './edits.ts'
import { sureFix } from './mend.ts'

/** A change that can be made at the cursor. */
export interface Action extends Fix {
  /** `fix` and `accept` answer the finding; `fix all` answers every finding of its code; the others change text that is right. */
  readonly sort: 'fix' | 'fix all' | 'accept' | 'convert' | 'tabs'
  readonly code?: string
}

const INDENTATION = /^(?=[ ]*\t)[ \t]+/gmu

/** Two spaces for each tab in the indentation. Tabs inside a line stay. */
export const tabsToSpaces = (text: string): readonly TextEdit[] => {
  const lines = indexLines(text)
  return [...text.matchAll(INDENTATION)].map(({ 0: indentation, index }) => ({
    range: lines.range({ start: index, end: index + indentation.length }),
    text: indentation.replaceAll('\t', '  '),
  }))
}

/** Findings under the cursor; where there are none, those on its line. */
const findingsAt = (text: string, offset: number, findings: readonly Finding[]): readonly Finding[] => {
  const lines = indexLines(text)
  const under = findings.filter(({ range }) => lines.offset(range.start) <= offset && offset <= lines.offset(range.end))
  if (under.length > 0) return under
  const { line } = lines.position(offset)
  return findings.filter(({ range }) => range.start.line <= line && line <= range.end.line)
}

/** One change that mends every finding of a code, as far as the fixes can stand together. */
const fixAllOf = (text: string, code: string, findings: readonly Finding[]): Action | null => {
  const edits: TextEdit[] = []
  let count = 0
  for (const finding of findings) {
    const fix = finding.code === code ? sureFix(finding) : undefined
    if (!fix || !canStandTogether(text, [...edits, ...fix.edits])) continue
    edits.push(...fix.edits)
    count += 1
  }
  return count < 2 ? null : { sort: 'fix all', title: `Mend all ${count} findings of ${code}`, code, edits }
}

/** Every change offered at an offset: what mends the findings there first, then other units. Each gives the edits to preview. */
export const actionsAt = (
  text: string,
  offset: number,
  findings: readonly Finding[],
  vocabulary: Vocabulary,
): readonly Action[] => {
  const here = findingsAt(text, offset, findings).filter(({ accepted }) => accepted === undefined)
  const codes = [...new Set(here.map(({ code }) => code))]
  const lines = indexLines(text)
  const tabs = tabsToSpaces(text)
  const atTab = tabs.some(({ range }) => range.start.line === lines.position(offset).line)
  const tree = treeForHelp(text)
  return [
    ...here.flatMap(({ code, fixes }) => fixes.map((fix): Action => ({ ...fix, sort: 'fix', code }))),
    ...codes.flatMap((code) => fixAllOf(text, code, findings) ?? []),
    ...(atTab || (codes.includes('CF-Y007') && tabs.length > 0)
      ? [{ sort: 'tabs', title: 'Write spaces for tabs in every line', edits: tabs } as const]
      : []),
    ...here.flatMap((finding) => {
      const accept = acceptFix(text, finding)
      return accept ? [{ ...accept, sort: 'accept', code: finding.code } as const] : []
    }),
    ...(tree ? conversionsAt(tree, offset, vocabulary) : []).map(({ span, text: put }): Action => ({
      sort: 'convert',
      title: `Write ${put}`,
      edits: [{ range: lines.range(span), text: put }],
    })),
  ].filter(({ edits }) => applyEdits(text, edits) !== text)
}
