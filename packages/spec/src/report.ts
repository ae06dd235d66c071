import { type FindingCode, findingCodes } from './diagnostics.ts'
import type { Finding, Fix } from './finding.ts'
import type { LineIndex, Span } from './parse/line-index.ts'
import { isWithin } from './parse/source-tree.ts'

/** Where a finding is said: the path and the key or value that is underlined. */
export interface At {
  readonly path: string
  readonly span: Span
}

/** Replaces the text of `span`. */
export interface Edit {
  readonly title: string
  readonly span: Span
  readonly text: string
  readonly guess?: true
}

export interface Said {
  readonly message: string
  readonly hint: string
  readonly related?: readonly { readonly message: string; readonly path: string; readonly span: Span }[]
  readonly fixes?: readonly Edit[]
  /** Paths that cannot be sized for this error; the path of the finding where not said. */
  readonly blocks?: readonly string[]
}

/** Collects findings and what they block. Nothing is thrown. */
export interface Report {
  readonly findings: Finding[]
  readonly lineIndex: LineIndex
  add(code: FindingCode, at: At, said: Said): void
  /** Whether an error stands in `path` or in something that `path` leans on, outside the parts named in `except`. */
  isSound(path: string, ...except: string[]): boolean
}

export const createReport = (lineIndex: LineIndex): Report => {
  const findings: Finding[] = []
  const blocked = new Set<string>()
  return {
    findings,
    lineIndex,
    add: (code, at, { message, hint, related = [], fixes = [], blocks = [at.path] }) => {
      const { severity } = findingCodes[code]
      if (severity === 'error') for (const path of blocks) blocked.add(path)
      findings.push({
        code,
        severity,
        message,
        hint,
        path: at.path,
        range: lineIndex.range(at.span),
        related: related.map((each) => ({
          message: each.message,
          path: each.path,
          range: lineIndex.range(each.span),
        })),
        fixes: fixes.map(({ title, span, text, guess }): Fix => ({
          title,
          ...(guess && { guess }),
          edits: [{ range: lineIndex.range(span), text }],
        })),
      })
    },
    isSound: (path, ...except) =>
      ![...blocked].some(
        (each) => (isWithin(each, path) || isWithin(path, each)) && !except.some((part) => isWithin(each, part)),
      ),
  }
}
