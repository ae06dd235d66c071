import type { Range } from '../finding.ts'
import type { Span } from '../parse/line-index.ts'
import { type Step, places } from '../parse/path.ts'
import type { Comment } from '../parse/scan.ts'
import type { SourceMap } from '../parse/source-tree.ts'
import type { Context } from './context.ts'

/** A warning that a person accepts in the text: `# coldfill: accept CF-E021 because …` */
export interface Acceptance {
  readonly code: string
  readonly reason: string
  /** The key, system or vessel that it holds for, with everything in it. Empty for the whole spec. */
  readonly path: string
  readonly range: Range
}

const ADDRESSED = /^\s*coldfill\s*:\s*(.*)$/iu
const ACCEPT = /^accept\s+(CF-[A-Z]\d{3,4})\b\s*(?:because\s*:?\s*(.*))?$/u

const VESSEL = /^systems\.[^.]+\.vessels\.[^.]+/u

interface Line {
  readonly first: Step
}

/** Keys by the line on which they begin; of several on a line the first. */
const keysByLine = (context: Context, tree: SourceMap): Map<number, Line> => {
  const lines = new Map<number, Line>()
  for (const step of places(tree)) {
    const { line } = context.report.lineIndex.position(step.keySpan.start)
    if (!lines.has(line)) lines.set(line, { first: step })
  }
  return lines
}

/** The key on the line of the comment or on the next line that has one; within a vessel the vessel. */
const pathFor = (lines: ReadonlyMap<number, Line>, line: number, last: number): string => {
  for (let at = line; at <= last; at++) {
    const found = lines.get(at)
    if (!found) continue
    return VESSEL.exec(found.first.path)?.[0] ?? found.first.path
  }
  return ''
}

const misread = (context: Context, span: Span, body: string): void =>
  context.report.add(
    'CF-S071',
    { path: '', span },
    {
      message: `\`${body}\` is not understood behind \`coldfill:\`.`,
      hint: 'Write `# coldfill: accept CF-E021 because …` with the code of the warning.',
    },
  )

const withoutReason = (context: Context, span: Span, path: string, code: string): void =>
  context.report.add(
    'CF-S070',
    { path, span },
    {
      message: `${code} is accepted here without a reason, so it is not accepted.`,
      hint: `Write \`# coldfill: accept ${code} because …\`. The reason is printed with the warning.`,
    },
  )

/** The acceptances in the comments of a spec. */
export const readAcceptances = (
  context: Context,
  tree: SourceMap,
  comments: readonly Comment[],
): readonly Acceptance[] => {
  const addressed = comments.flatMap((comment) => {
    const body = ADDRESSED.exec(comment.text)?.[1]
    return body === undefined ? [] : [{ body: body.trim(), span: comment.span }]
  })
  if (addressed.length === 0) return []
  const { lineIndex } = context.report
  const lines = keysByLine(context, tree)
  return addressed.flatMap(({ body, span }) => {
    const accept = ACCEPT.exec(body)
    const code = accept?.[1]
    if (code === undefined) {
      misread(context, span, body)
      return []
    }
    const reason = accept?.[2]?.trim() ?? ''
    const path = pathFor(lines, lineIndex.position(span.start).line, lineIndex.lines)
    if (!/[\p{L}\p{N}]/u.test(reason)) {
      withoutReason(context, span, path, code)
      return []
    }
    return [{ code, reason, path, range: lineIndex.range(span) }]
  })
}
