import { imageSize } from 'image-size'
import { LOGO_LIMIT } from '@coldfill/contract'
import type { Logo } from '@coldfill/documents'
import { AppError } from '../errors.ts'

/** A picture of fewer is a dot on paper; one of more only makes files slow. */
const [LEAST, MOST] = [16, 4_000]
/** Longer side by shorter side. */
const LONGEST = 20

const refused = (detail: string): AppError =>
  new AppError(422, 'logo_unreadable', 'The logo cannot be used', `${detail} Nothing was stored.`)

const HEADS = {
  png: [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a],
  jpg: [0xff, 0xd8, 0xff],
} as const

/** The last chunk of a PNG, and the last marker of a JPEG, behind which some programs leave further bytes. */
const END = { png: Buffer.from([0x49, 0x45, 0x4e, 0x44, 0xae, 0x42, 0x60, 0x82]), jpg: Buffer.from([0xff, 0xd9]) }

/**
 * Reads a logo: PNG or JPEG by its bytes and not by its name, whole, and of a size that can be printed.
 * @throws {AppError} 413 for a file above the limit, 422 logo_unreadable
 */
export const readLogo = (bytes: Uint8Array): Logo => {
  if (bytes.length > LOGO_LIMIT)
    throw new AppError(413, 'logo_too_large', 'The logo is too large', 'A logo may have 1 MB. Nothing was stored.')
  const type = (['png', 'jpg'] as const).find((kind) => HEADS[kind].every((byte, index) => bytes[index] === byte))
  if (!type) throw refused('It is neither a PNG nor a JPEG.')
  if (!Buffer.from(bytes).includes(END[type])) throw refused('The file ends in the middle of the picture.')
  let size: { width: number; height: number }
  try {
    size = imageSize(bytes)
  } catch {
    throw refused('The size of the picture cannot be read.')
  }
  const { width, height } = size
  const [short, long] = [Math.min(width, height), Math.max(width, height)]
  if (!(short >= LEAST && long <= MOST))
    throw refused(`It has ${width} × ${height} pixels; a logo has ${LEAST} to ${MOST} each way.`)
  if (long > short * LONGEST) throw refused(`It has ${width} × ${height} pixels, which is too narrow for a cover.`)
  return { data: bytes, type, width, height }
}
