import type { Finding } from '@coldfill/spec'

const data = (text: string): string => text.replaceAll('%', '%25').replaceAll('\r', '%0D').replaceAll('\n', '%0A')
const property = (text: string): string => data(text).replaceAll(':', '%3A').replaceAll(',', '%2C')

const level = { error: 'error', warning: 'warning', note: 'notice' } as const

/** Findings as workflow commands, which a pull request shows as annotations. */
export const findingsGithub = (file: string, findings: readonly Finding[]): string =>
  findings
    .filter((finding) => finding.accepted === undefined)
    .map(({ severity, code, message, hint, range }) => {
      const place = `file=${property(file)},line=${range.start.line + 1},endLine=${range.end.line + 1},col=${range.start.character + 1},endColumn=${range.end.character + 1}`
      return `::${level[severity]} ${place},title=${property(code)}::${data(hint ? `${message} ${hint}` : message)}`
    })
    .join('\n')
