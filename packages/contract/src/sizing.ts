import type { ProjectResult as SizedProject } from '@coldfill/sizing'
import { z } from 'zod'

/** Bytes of UTF-8 a spec may have; a longer one is refused with 413. */
export const SPEC_LIMIT = 256 * 1024

/** POST /api/projects/:project/sizing. Answers ProjectResult; nothing is saved. */
export const SizeTextRequest = z.strictObject({ text: z.string() })
export type SizeTextRequest = z.infer<typeof SizeTextRequest>

/** The result as @coldfill/sizing makes it. Trusted as it comes from the server: only its outline is looked at. */
export const ProjectResult = z.custom<SizedProject>(
  (value) => typeof value === 'object' && value !== null && 'vessels' in value && 'findings' in value,
)
export type ProjectResult = SizedProject
