import type { Finding } from '@coldfill/spec'

/** Findings for a terminal: place, severity, code, what is wrong, what to write. Lines and columns count from 1. */
export const findingsText = (file: string, findings: readonly Finding[]): string =>
  findings
    .map((finding) => {
      const { line, character } = finding.range.start
      const accepted = finding.accepted === undefined ? '' : ` (accepted: ${finding.accepted})`
      const head = `${file}:${line + 1}:${character + 1}: ${finding.severity} ${finding.code}: ${finding.message}${accepted}`
      return finding.hint ? `${head}\n    ${finding.hint}` : head
    })
    .join('\n')

/** "1 error, 2 warnings" */
export const findingsCount = (findings: readonly Finding[]): string => {
  const count = (severity: Finding['severity']) => findings.filter((finding) => finding.severity === severity).length
  const words = (['error', 'warning', 'note'] as const)
    .map((severity) => [count(severity), severity] as const)
    .filter(([n]) => n > 0)
    .map(([n, severity]) => `${n} ${severity}${n === 1 ? '' : 's'}`)
  return words.length > 0 ? words.join(', ') : 'no findings'
}
