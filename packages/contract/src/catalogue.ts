import type { CatalogueReading } from '@coldfill/sizing'
import { z } from 'zod'

/** Bytes of a catalogue file; a larger one is refused with 413. */
export const CATALOGUE_LIMIT = 2_000_000

/** One vessel of the catalogue, SI units, as @coldfill/sizing reads it. Trusted as it comes from the server. */
export type CatalogueVessel = CatalogueReading['rows'][number]
export const CatalogueVessel = z.custom<CatalogueVessel>(
  (value) => typeof value === 'object' && value !== null && 'maker' in value && 'volume' in value,
)

/** What was left out of an uploaded catalogue or passed over, by line (its head is line 1) and heading. */
export const CatalogueProblem = z.object({ line: z.number().int(), column: z.string(), message: z.string() })
export type CatalogueProblem = z.infer<typeof CatalogueProblem>

const upload = z.object({
  fileName: z.string(),
  uploadedAt: z.string(),
  uploadedBy: z.string(),
  /** SHA-256 over the rows, in hex. */
  hash: z.string(),
})

/** GET and PUT /api/office/catalogue */
export const OfficeCatalogue = z.object({
  /** The one that vessels are chosen from now; null where the office has none. */
  catalogue: upload.extend({ rows: z.array(CatalogueVessel), problems: z.array(CatalogueProblem) }).nullable(),
  /** Those before it, newest first. */
  earlier: z.array(upload.extend({ rowCount: z.number().int(), endedAt: z.string() })),
  /** Columns that a catalogue file may have. */
  columns: z.array(z.object({ heading: z.string(), doc: z.string(), required: z.boolean() })),
})
export type OfficeCatalogue = z.infer<typeof OfficeCatalogue>

/** PUT /api/office/catalogue: the bytes of a CSV file or workbook in base64. */
export const PutCatalogueRequest = z.strictObject({
  fileName: z.string().trim().min(1, 'Give the name of the file.').max(200),
  content: z.base64('Send the bytes of the file in base64.'),
})
export type PutCatalogueRequest = z.input<typeof PutCatalogueRequest>
