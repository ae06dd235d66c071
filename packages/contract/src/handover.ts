import { z } from 'zod'
import { Person } from './people.ts'
import { RevisionFile } from './revisions.ts'

/** A setting for the field: `value` in the SI unit of `kind` (gauge pascals). */
export const FieldSetting = z.object({ kind: z.literal('gauge pressure'), value: z.number() })
export type FieldSetting = z.infer<typeof FieldSetting>

/** GET /api/projects/:project/handover?rev= */
export const Handover = z.object({
  project: z.object({
    number: z.string(),
    title: z.string(),
    client: z.string(),
    office: z.string(),
    units: z.enum(['US', 'SI']),
  }),
  /** The revision issued for construction; null where there is none. */
  current: z
    .object({
      revision: z.string(),
      issuedAt: z.string(),
      issuedBy: Person,
      files: z.array(RevisionFile),
      /** Why there is no PDF among them; null where there is one. */
      noPdf: z.string().nullable(),
      contentHash: z.string(),
      settings: z.array(
        z.object({
          system: z.string(),
          mark: z.string(),
          serves: z.string(),
          kind: z.string(),
          precharge: FieldSetting.nullable(),
          fill: FieldSetting.nullable(),
          relief: FieldSetting.nullable(),
        }),
      ),
    })
    .nullable(),
  /** What stands: "Issued for construction", or why there is nothing to download. */
  word: z.string(),
  /** True where `rev` names an issue that is no longer the current one. */
  superseded: z.boolean(),
})
export type Handover = z.infer<typeof Handover>
