import type { SpecDocument } from '@coldfill/contract'
import type { SavedSpec } from '../../commands/save-spec.ts'

export const presentSpec = (spec: SavedSpec, readOnly: string | null): SpecDocument => ({
  text: spec.text,
  version: spec.version,
  savedAt: spec.savedAt.toISOString(),
  savedBy: spec.savedBy,
  readOnly: readOnly === null ? null : { reason: readOnly },
})
