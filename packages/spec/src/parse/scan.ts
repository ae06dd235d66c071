import type { Report } from '../report.ts'
import { maxDepth, maxNodes } from './limits.ts'
import type { Span } from './line-index.ts'

export interface Comment {
  /** Without the `#`. */
  readonly text: string
  readonly span: Span
}

/** Looks at each lexeme on its way from lexer to parser: what is refused, what is left open, and the comments. */
export interface Scan {
  readonly comments: Comment[]
  /** False where the rest of the text must not be read. */
  next(lexeme: string): boolean
  /** Says what was found. True where the text can be read on. */
  finish(): boolean
}

// Marks that the lexer puts between the parts of the text; they have no length in it.
const DOCUMENT = '\u0002'
const SCALAR = '\u001f'
const FLOW_ERROR_END = '\u0018'

/** Places shown beside the first, so that one habit gives one finding. */
const OTHERS_SHOWN = 5

export const createScan = (report: Report, text: string): Scan => {
  const comments: Comment[] = []
  const references: Span[] = []
  const tags: Span[] = []
  const directives: Span[] = []
  const documents: Span[] = []
  const open: Span[] = []
  let unclosed: Span | null = null
  let offset = 0
  let nodes = 0
  let sequenceRun = 0
  let scalarNext = false
  let headed = false
  let refused = false

  const refuse = (code: 'CF-Y012' | 'CF-Y013', span: Span, message: string, hint: string): boolean => {
    report.add(code, { path: '', span }, { message, hint })
    refused = true
    return false
  }

  const count = (span: Span): boolean => {
    nodes += 1
    if (nodes <= maxNodes) return true
    return refuse(
      'CF-Y013',
      span,
      `The spec has more than ${maxNodes.toLocaleString('en-US')} keys and values; it is read no further than here.`,
      'Split the project into several specs.',
    )
  }

  const deeper = (span: Span): boolean => {
    if (open.length + sequenceRun <= maxDepth) return true
    return refuse(
      'CF-Y012',
      span,
      `The text is nested deeper than ${maxDepth} levels here; it is read no further.`,
      'A spec needs no more than eight levels: take out the brackets or dashes that are not needed.',
    )
  }

  const quoteIsOpen = (lexeme: string): boolean => lexeme.length < 2 || !lexeme.endsWith(lexeme.charAt(0))

  const scalar = (lexeme: string, span: Span): boolean => {
    if ((lexeme.startsWith('"') || lexeme.startsWith("'")) && quoteIsOpen(lexeme)) unclosed ??= span
    return count(span)
  }

  const firstLine = (span: Span): Span => {
    const end = text.indexOf('\n', span.start)
    return { start: span.start, end: end < 0 || end > span.end ? span.end : end }
  }

  const say = (
    code: 'CF-Y006' | 'CF-Y008' | 'CF-Y009' | 'CF-Y010',
    found: readonly Span[],
    message: string,
    hint: string,
    remove?: string,
  ): void => {
    const [first, ...others] = found
    if (!first) return
    refused = true
    report.add(
      code,
      { path: '', span: first },
      {
        message,
        hint,
        related: others
          .slice(0, OTHERS_SHOWN)
          .map((span) => ({ message: `\`${text.slice(span.start, span.end)}\` stands here too.`, path: '', span })),
        fixes: remove === undefined ? [] : [{ title: remove, span: first, text: '' }],
      },
    )
  }

  return {
    comments,
    next: (lexeme) => {
      if (lexeme === DOCUMENT) return true
      if (lexeme === SCALAR) {
        scalarNext = true
        return true
      }
      if (lexeme === FLOW_ERROR_END) {
        unclosed ??= open.at(-1) ?? null
        open.length = 0
        return true
      }
      const span = { start: offset, end: offset + lexeme.length }
      offset = span.end
      if (scalarNext) {
        scalarNext = false
        return scalar(lexeme, span)
      }
      const first = lexeme.charAt(0)
      if (first === '\n' || first === '\r') sequenceRun = 0
      switch (first) {
        case '#':
          comments.push({ text: lexeme.slice(1), span })
          return true
        case '&':
        case '*':
          references.push(span)
          return count(span)
        case '!':
          tags.push(span)
          return true
        case '%':
          directives.push(span)
          return true
        case '[':
        case '{':
          open.push(firstLine(span))
          return count(span) && deeper(span)
        case ']':
        case '}':
          open.pop()
          return true
        case '"':
        case "'":
          return scalar(lexeme, span)
        case '?':
        case '-':
          if (lexeme === '---') {
            // One such line at the head of the text opens the document that follows.
            if (nodes > 0 || headed) documents.push(span)
            headed = true
            return true
          }
          sequenceRun += 1
          return count(span) && deeper(span)
        default:
          return true
      }
    },
    finish: () => {
      if (refused) return false
      unclosed ??= open.at(-1) ?? null
      if (unclosed) {
        const span = firstLine(unclosed)
        const mark = text.charAt(span.start)
        const closing = mark === '[' ? ']' : mark === '{' ? '}' : mark
        report.add(
          'CF-Y002',
          { path: '', span },
          {
            message: `The ${mark === '[' ? 'bracket' : mark === '{' ? 'brace' : 'quotation mark'} \`${mark}\` that opens here is not closed.`,
            hint: `Write \`${closing}\` where it ends.`,
          },
        )
        refused = true
      }
      say(
        'CF-Y006',
        references,
        'Anchors (`&name`) and aliases (`*name`) are not read: a spec says each value where it holds.',
        'Write the value out here. A text that begins with & or * goes in quotes.',
      )
      say(
        'CF-Y008',
        tags,
        `The tag \`${tags[0] ? text.slice(tags[0].start, tags[0].end) : ''}\` is not read.`,
        'Leave the tag out. A text that begins with ! goes in quotes.',
        'Take out the tag',
      )
      say(
        'CF-Y009',
        directives,
        'Lines that begin with % are not read. A spec is always YAML 1.2.',
        'Leave this line out.',
        'Take out the line',
      )
      say(
        'CF-Y010',
        documents,
        'A second document begins here. A file holds one spec.',
        'Put the second spec into a file of its own.',
      )
      return !refused
    },
  }
}
