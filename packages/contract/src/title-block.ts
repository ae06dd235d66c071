import { z } from 'zod'

/** Bytes of a logo; a larger one is refused with 413. */
export const LOGO_LIMIT = 1_000_000

export const Paper = z.enum(['by units', 'Letter', 'A4'])
export type Paper = z.infer<typeof Paper>

/** Captions of the people of a title block where the office has no other words. */
export const USUAL_CAPTIONS = { prepared: 'Prepared', checked: 'Checked', approved: 'Approved' } as const

export const OfficeLogo = z.object({
  fileName: z.string(),
  type: z.enum(['png', 'jpg']),
  /** Pixels, as the file says. */
  width: z.number().int(),
  height: z.number().int(),
  size: z.number().int(),
  sha256: z.string(),
  /** Address of the picture. */
  href: z.string(),
})
export type OfficeLogo = z.infer<typeof OfficeLogo>

/** GET and PUT /api/office/title-block, and the answer to a new logo. */
export const OfficeTitleBlock = z.object({
  /** The office's name as it is printed. */
  name: z.string(),
  lines: z.array(z.string()),
  captions: z.object({ prepared: z.string(), checked: z.string(), approved: z.string() }),
  paper: Paper,
  logo: OfficeLogo.nullable(),
  /** Null where the office has never changed it. */
  changed: z.object({ at: z.string(), by: z.string() }).nullable(),
})
export type OfficeTitleBlock = z.infer<typeof OfficeTitleBlock>

/** No line break or other control character: each text is one line of a document. */
const line = (most: number) =>
  z
    .string()
    .trim()
    .max(most)
    .regex(/^\P{Cc}*$/u, 'Write it in one line.')
const caption = line(40).min(1, 'Give the caption.')

export const PutTitleBlockRequest = z.strictObject({
  name: line(120).min(1, 'Give the name of the office.'),
  lines: z
    .array(line(120))
    .max(4, 'Four lines have room.')
    .transform((lines) => lines.filter((text) => text !== '')),
  captions: z.strictObject({ prepared: caption, checked: caption, approved: caption }),
  paper: Paper,
})
export type PutTitleBlockRequest = z.input<typeof PutTitleBlockRequest>

/** PUT /api/office/title-block/logo: the bytes of a PNG or JPEG file in base64. */
export const PutLogoRequest = z.strictObject({
  fileName: z.string().trim().min(1, 'Give the name of the file.').max(200),
  content: z.base64('Send the bytes of the file in base64.'),
})
export type PutLogoRequest = z.input<typeof PutLogoRequest>
