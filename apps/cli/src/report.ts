import type { Finding, Severity } from '@coldfill/spec'
import { exitStatus } from './exit-status.ts'
import type { ReportFormat } from './options.ts'
import { findingsGithub } from './reporters/findings-github.ts'
import { findingsSarif } from './reporters/findings-sarif.ts'
import { findingsText } from './reporters/findings-text.ts'

const rank = { note: 0, warning: 1, error: 2 } as const

/** Findings in a format other than JSON, which each verb shapes itself. */
export const findingsAs = (format: Exclude<ReportFormat, 'json'>, file: string, findings: readonly Finding[]): string =>
  ({ text: findingsText, github: findingsGithub, sarif: findingsSarif })[format](file, findings)

/** Codes with which no model could be read at all: unreadable YAML, a refused text, or an unknown version. */
export const isUnreadable = (finding: Finding): boolean =>
  finding.severity === 'error' && (finding.code.startsWith('CF-Y') || finding.code === 'CF-S001')

/** Status for findings: an accepted one no longer counts. */
export const statusOf = (findings: readonly Finding[], failOn: Severity, read: boolean): number => {
  if (!read) return exitStatus.unreadable
  return findings.some((finding) => finding.accepted === undefined && rank[finding.severity] >= rank[failOn])
    ? exitStatus.findings
    : exitStatus.ok
}
