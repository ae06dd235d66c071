import type { Severity } from '../finding.ts'

export type Layer = 'syntax' | 'spec' | 'engineering'

/** What the help says about a code. */
export interface Diagnostic {
  readonly title: string
  readonly severity: Severity
  readonly layer: Layer
  readonly what: string
  readonly why: string
  readonly fix: string
}

export const define = (
  layer: Layer,
  severity: Severity,
  title: string,
  what: string,
  why: string,
  fix: string,
): Diagnostic => ({
  title,
  severity,
  layer,
  what,
  why,
  fix,
})

export const syntax = (title: string, what: string, why: string, fix: string): Diagnostic =>
  define('syntax', 'error', title, what, why, fix)
export const error = (title: string, what: string, why: string, fix: string): Diagnostic =>
  define('spec', 'error', title, what, why, fix)
export const warning = (title: string, what: string, why: string, fix: string): Diagnostic =>
  define('spec', 'warning', title, what, why, fix)
export const note = (title: string, what: string, why: string, fix: string): Diagnostic =>
  define('spec', 'note', title, what, why, fix)
