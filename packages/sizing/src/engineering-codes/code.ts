import type { Severity } from '@coldfill/spec'

export interface EngineeringCodeHelp {
  readonly severity: Severity
  readonly title: string
  /** What was found. */
  readonly what: string
  /** Why it matters. */
  readonly why: string
  /** What to do. */
  readonly fix: string
  /** Source, and how sure the clause number is. */
  readonly source: string
}

export const code = (
  severity: Severity,
  title: string,
  what: string,
  why: string,
  fix: string,
  source: string,
): EngineeringCodeHelp => ({ severity, title, what, why, fix, source })

export const local = 'Local law and the authority having jurisdiction govern.'
export const memory = 'clause from memory; verify against the adopted edition'
