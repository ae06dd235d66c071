import { Composer, type CST, type Document, Lexer, Parser, type YAMLError } from 'yaml'
import { isKeyOfLanguage } from '../model/keys.ts'
import { createReport, type Report } from '../report.ts'
import { buildTree } from './build-tree.ts'
import { maxSpecBytes } from './limits.ts'
import { indexLines, type LineIndex } from './line-index.ts'
import { type Comment, createScan, type Scan } from './scan.ts'
import type { SourceMap } from './source-tree.ts'
import { reportYamlProblem } from './yaml-problem.ts'

export interface ParsedSpec {
  readonly report: Report
  readonly lineIndex: LineIndex
  /** Null where the text is refused or cannot be read; a finding says why. */
  readonly tree: SourceMap | null
  readonly comments: readonly Comment[]
}

// Every scalar stays the text that was typed; keys that stand twice are found in one pass of our own.
const OPTIONS = {
  version: '1.2',
  schema: 'failsafe',
  uniqueKeys: false,
  prettyErrors: false,
  logLevel: 'silent',
} as const

/** Line feeds, tabs and printable characters. The lexer marks its parts with some of the others. */
// oxlint-disable-next-line no-control-regex
const CONTROL = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f-\u0084\u0086-\u009f\ufffe\uffff]/u

const MOST_PROBLEMS = 10

/** Findings of the parser: one for each place, since what follows a stumble on the same or the next line is its echo. */
const distinct = (errors: readonly YAMLError[], lineIndex: LineIndex): YAMLError[] => {
  const kept: YAMLError[] = []
  let after = -1
  // A tab breaks up every block around it.
  const tabs = errors.filter(({ code }) => code === 'TAB_AS_INDENT')
  for (const error of tabs.length > 0 ? tabs : errors) {
    if (error.code === 'TAG_RESOLVE_FAILED') continue
    const line = lineIndex.position(error.pos[0]).line
    if (line > after) kept.push(error)
    after = Math.max(after, lineIndex.position(error.pos[1]).line + 1)
  }
  return kept.slice(0, MOST_PROBLEMS)
}

/** Null where the scan refuses to go on. */
const tokensOf = (text: string, scan: Scan): CST.Token[] | null => {
  const parser = new Parser()
  const tokens: CST.Token[] = []
  for (const lexeme of new Lexer().lex(text)) {
    if (!scan.next(lexeme)) return null
    for (const token of parser.next(lexeme)) tokens.push(token)
  }
  for (const token of parser.end()) tokens.push(token)
  return tokens
}

const compose = (tokens: readonly CST.Token[], text: string): Document.Parsed | undefined =>
  [...new Composer(OPTIONS).compose(tokens, true, text.length)][0]

const refusal = (text: string, report: Report): boolean => {
  if (text.length > maxSpecBytes) {
    report.add(
      'CF-Y021',
      { path: '', span: { start: 0, end: 0 } },
      {
        message: `The text has ${text.length.toLocaleString('en-US')} characters. A spec has at most ${maxSpecBytes.toLocaleString('en-US')}; nothing was read.`,
        hint: 'Split the project into several specs, and leave out what is no spec.',
      },
    )
    return true
  }
  const control = CONTROL.exec(text)
  if (!control) return false
  const code = control[0].charCodeAt(0).toString(16).toUpperCase().padStart(4, '0')
  const span = { start: control.index, end: control.index + 1 }
  report.add(
    'CF-Y016',
    { path: '', span },
    {
      message: `An invisible control character (U+${code}) stands here; the text is not read.`,
      hint: 'Delete it. It often comes from copying out of another program.',
      fixes: [{ title: 'Take out the character', span, text: '' }],
    },
  )
  return true
}

/** From text to a tree of keys and texts with their places. Never throws; every mistake is a finding of the report. */
export const parseSpec = (text: string): ParsedSpec => {
  const lineIndex = indexLines(text)
  const report = createReport(lineIndex)
  const unread = (comments: readonly Comment[] = []): ParsedSpec => ({ report, lineIndex, tree: null, comments })
  if (refusal(text, report)) return unread()
  const scan = createScan(report, text)
  const { comments } = scan
  const tokens = tokensOf(text, scan)
  const document = tokens && scan.finish() ? compose(tokens, text) : null
  if (!document) return unread(comments)
  const errors = distinct(document.errors, lineIndex)
  for (const error of errors) reportYamlProblem(report, text, error)
  if (errors.length > 0) return unread(comments)
  const tree = document.contents ? buildTree(report, text, document.contents, isKeyOfLanguage) : null
  if (tree?.node === 'map') return { report, lineIndex, tree, comments }
  if (report.findings.length === 0)
    report.add(
      tree === null ? 'CF-Y022' : 'CF-Y023',
      { path: '', span: tree === null ? { start: 0, end: 0 } : { start: tree.span.start, end: tree.span.start + 1 } },
      {
        message: tree === null ? 'The spec is empty.' : `A spec is a block of keys; this is a ${tree.node}.`,
        hint: 'Begin with `coldfill: 1` and put `project:` and `systems:` below it.',
      },
    )
  return unread(comments)
}

/** The tree of a text that is being typed: what can be made out of it, mistakes and all. For help at the cursor only. */
export const parseUnfinished = (text: string): SourceMap | null => {
  if (text.length > maxSpecBytes || CONTROL.test(text)) return null
  const report = createReport(indexLines(text))
  const tokens = tokensOf(text, createScan(report, text))
  const document = tokens && compose(tokens, text)
  const tree = document?.contents ? buildTree(report, text, document.contents, isKeyOfLanguage) : null
  return tree?.node === 'map' ? tree : null
}
