import type { Finding } from '#lib/sized-project.ts'

/** The line to put above a finding to accept it with a reason, and where: zero-based line, indented as the line it stands over. */
export const acceptance = (
  text: string,
  finding: Pick<Finding, 'code' | 'range'>,
  reason: string,
): { readonly line: number; readonly insert: string } => {
  const { line } = finding.range.start
  const indent = /^ */.exec(text.split('\n')[line] ?? '')?.[0] ?? ''
  const words = reason.replaceAll(/\s+/g, ' ').trim()
  return { line, insert: `${indent}# coldfill: accept ${finding.code} because ${words}\n` }
}
