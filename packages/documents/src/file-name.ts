import type { ProjectResult } from '@coldfill/sizing'

export type DocumentKind = 'schedule' | 'submittal' | 'pdf' | 'review-copy'

const ENDING: Record<DocumentKind, string> = {
  schedule: 'schedule.xlsx',
  submittal: 'submittal.docx',
  pdf: 'submittal.pdf',
  'review-copy': 'review-copy.docx',
}

/** Letters, digits and single hyphens only: safe in every file system, header and address. */
const plain = (text: string): string =>
  text
    .normalize('NFKD')
    .replace(/[\u0300-\u036f]/g, '')
    .replace(/[^A-Za-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 40)

/** `FC-241-rev-B-schedule.xlsx`; the first issue, which has no letter, is `FC-241-schedule.xlsx`. */
export const fileName = (result: ProjectResult, revision: string, kind: DocumentKind): string => {
  const project = plain(result.project.number) || 'project'
  const letter = plain(revision)
  return [project, ...(letter ? ['rev', letter] : []), ENDING[kind]].join('-')
}
