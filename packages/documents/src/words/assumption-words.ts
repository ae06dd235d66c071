import type { ProjectResult } from '@coldfill/sizing'
import type { DocumentOptions } from '../document-options.ts'

/** Who changed an assumption and when; empty where the default stands or it is not known. */
export const changedBy = (
  { id, overridden }: ProjectResult['assumptions'][number],
  { assumptionChanges = [] }: DocumentOptions,
): string => {
  const change = overridden ? assumptionChanges.find(({ assumption }) => assumption === id) : undefined
  return change ? `${change.by}, ${change.date}` : ''
}
