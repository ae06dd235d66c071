import type { YAMLError } from 'yaml'
import type { Edit, Report } from '../report.ts'
import { lineEnd, lineStart, type Span } from './line-index.ts'
import { reportTightColon, tightColon } from './tight-colon.ts'

const lineOf = (text: string, offset: number): Span => ({ start: lineStart(text, offset), end: lineEnd(text, offset) })

/** What is written on a line, without indentation, dash and comment. Only blanks and tabs indent in YAML; a byte order mark does not. */
const written = (text: string, line: Span): Span => {
  const source = text.slice(line.start, line.end)
  const lead = /^[ \t\r]*(?:-[ \t]+)?/u.exec(source)?.[0].length ?? 0
  const body = source.slice(lead).replace(/(?:^|[ \t])#.*$/u, '')
  return { start: line.start + lead, end: line.start + lead + body.trimEnd().length }
}

const keyAtStart = (text: string, span: Span): Span => {
  const key = /^[^:\n]*/u.exec(text.slice(span.start, span.end))?.[0] ?? ''
  return key === '' ? span : { start: span.start, end: span.start + key.length }
}

/** The first line below `offset` that holds more than a comment. */
const nextWritten = (text: string, offset: number): Span | null => {
  for (let line = lineOf(text, offset); line.end < text.length;) {
    line = lineOf(text, line.end + 1)
    const span = written(text, line)
    if (span.end > span.start) return span
  }
  return null
}

const quoted = (value: string): string => (value.includes("'") ? `"${value.replace(/["\\]/gu, '\\$&')}"` : `'${value}'`)

const quoteIt = (text: string, span: Span): Edit => ({
  title: 'Put the text in quotes',
  span,
  text: quoted(text.slice(span.start, span.end)),
})

/** A line that should be `key: value` and is not. */
const missingColon = (report: Report, text: string, line: Span): void => {
  const source = text.slice(line.start, line.end)
  const tight = tightColon(source)
  if (tight) return reportTightColon(report, '', line.start, tight)
  const key = /^[\p{L}][\p{L}-]*/u.exec(source)?.[0]
  const end = line.start + (key?.length ?? 0)
  // Where no word stands, or a colon stands behind it already, something else is wrong.
  const lacks = key !== undefined && !/^\s*:/u.test(source.slice(key.length))
  report.add(
    'CF-Y003',
    { path: '', span: line },
    {
      message: `This line is no key with a value: the colon behind the key is missing.`,
      hint: lacks ? `Write \`${key}:${source.slice(key.length)}\`.` : 'Write a key, a colon, a space and the value.',
      fixes: lacks ? [{ title: 'Put in the colon', span: { start: end, end }, text: ':' }] : [],
    },
  )
}

const indented = (report: Report, text: string, line: Span): void =>
  report.add(
    'CF-Y004',
    { path: '', span: keyAtStart(text, line) },
    {
      message: 'This line is not indented like the lines that it belongs to.',
      hint: 'Keys of one block begin in the same column; what belongs to a key stands two spaces further in.',
    },
  )

/** A key begins on this line, so its parser stumbled over the line above or over its column. */
const implicitKey = (report: Report, text: string, span: Span): void => {
  const line = lineOf(text, span.start)
  const body = written(text, line)
  if (body.start === span.start) missingColon(report, text, body)
  else {
    const next = nextWritten(text, span.start)
    indented(report, text, next ?? body)
  }
}

const twoColons = (report: Report, text: string, span: Span): void => {
  const line = lineOf(text, span.start)
  const value = { start: span.start, end: Math.max(span.start, written(text, line).end) }
  const source = text.slice(value.start, value.end)
  if (!/:(?:\s|$)/u.test(source)) {
    indented(report, text, nextWritten(text, span.start) ?? value)
    return
  }
  report.add(
    'CF-Y005',
    { path: '', span: value },
    {
      message: `The text \`${source}\` holds a colon and a space, so it reads as a key with a value.`,
      hint: `Put the text in quotes, or put the second key on a line of its own.`,
      fixes: [quoteIt(text, value)],
    },
  )
}

const restOfValue = (text: string, offset: number): Span => ({
  start: offset,
  end: Math.max(offset + 1, written(text, lineOf(text, offset)).end),
})

const stray = (report: Report, text: string, span: Span): void => {
  const source = text.slice(span.start, Math.max(span.end, span.start + 1)).trim()
  report.add(
    'CF-Y001',
    { path: '', span: source === '' ? { start: span.start, end: span.start } : span },
    {
      message: source === '' ? 'Something is missing here.' : `\`${source}\` does not belong here.`,
      hint: 'Keys of a block stand below each other as `key: value`; in braces they are parted by commas. A text with quotation marks or brackets in it goes in quotes.',
    },
  )
}

const insideBraces = (report: Report, text: string, span: Span): void => {
  const source = text.slice(span.start, span.end)
  const next = /\s+[\p{L}][\p{L}\d -]*:\s?$/u.exec(source.slice(0, source.lastIndexOf(':') + 1))
  const at = next ? span.start + next.index : span.end
  report.add(
    'CF-Y020',
    { path: '', span },
    {
      message: 'A comma is missing between two keys in braces.',
      hint: 'Write `{ first: value, second: value }`.',
      fixes: next ? [{ title: 'Put in the comma', span: { start: at, end: at }, text: ',' }] : [],
    },
  )
}

/** How far up the line that a tab stands below is looked for: every line of a text may have its tab. */
const LINES_UP = 20

/** The line above that says something; empty where none is near. */
const lineAbove = (text: string, offset: number): string => {
  let end = lineStart(text, offset) - 1
  for (let n = 0; n < LINES_UP && end >= 0; n += 1) {
    const start = lineStart(text, end)
    const line = text.slice(start, end)
    if (/^\s*[^\s#]/u.test(line)) return line
    end = start - 1
  }
  return ''
}

/**
 * Spaces for tabs: two each; or, below a key that opens a block further in, two more than that key, for the tabs of an editor
 * say nothing of how wide they were meant.
 */
const widthForTabs = (text: string, tabs: Span): number => {
  const each = 2 * (tabs.end - tabs.start)
  const opening = /^( *)(?:- )?[^#]*:\s*(?:#.*)?$/u.exec(lineAbove(text, tabs.start))
  const indent = opening?.[1]?.length ?? -1
  return each <= indent ? indent + 2 : each
}

/** Puts what the YAML parser stumbled over into words for a person who writes specs. */
export const reportYamlProblem = (report: Report, text: string, error: YAMLError): void => {
  const span = { start: error.pos[0], end: Math.min(error.pos[1], text.length) }
  const code: string = error.code
  switch (code) {
    case 'MULTILINE_IMPLICIT_KEY':
      return text.charAt(span.start) === '-'
        ? indented(report, text, restOfValue(text, span.start))
        : implicitKey(report, text, span)
    case 'BLOCK_AS_IMPLICIT_KEY':
      return twoColons(report, text, span)
    case 'BLOCK_IN_FLOW':
      return insideBraces(report, text, span)
    case 'BAD_INDENT':
      return indented(report, text, written(text, lineOf(text, span.start)))
    case 'TAB_AS_INDENT': {
      const tabs = { start: span.start, end: span.start + (/^\t+/u.exec(text.slice(span.start))?.[0].length ?? 1) }
      return report.add(
        'CF-Y007',
        { path: '', span: tabs },
        {
          message: 'A tab indents this line. YAML takes spaces only.',
          hint: 'Write two spaces for each level.',
          fixes: [{ title: 'Write spaces for tabs', span: tabs, text: ' '.repeat(widthForTabs(text, tabs)) }],
        },
      )
    }
    case 'BAD_SCALAR_START': {
      const value = restOfValue(text, span.start)
      return report.add(
        'CF-Y015',
        { path: '', span: value },
        {
          message: `A text cannot begin with \`${text.charAt(span.start)}\` in YAML.`,
          hint: 'Put the text in quotes.',
          fixes: [quoteIt(text, value)],
        },
      )
    }
    case 'BAD_DQ_ESCAPE':
      return report.add(
        'CF-Y017',
        { path: '', span: { start: span.start, end: Math.min(span.start + 2, text.length) } },
        {
          message: `\`${text.slice(span.start, span.start + 2)}\` means nothing in double quotes.`,
          hint: 'Use single quotes, in which a backslash is a backslash.',
        },
      )
    case 'MISSING_CHAR': {
      const line = written(text, lineOf(text, Math.max(0, Math.min(span.start, text.length - 1))))
      return missingColon(report, text, line)
    }
    case 'RESOURCE_EXHAUSTION':
      return report.add(
        'CF-Y012',
        { path: '', span: { start: span.start, end: span.start + 1 } },
        {
          message: 'The text is nested too deep here; it is read no further.',
          hint: 'A spec needs no more than eight levels: take out the brackets or dashes that are not needed.',
        },
      )
    default:
      return stray(report, text, span)
  }
}
