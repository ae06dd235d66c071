import { unzlibSync } from 'fflate'

/** A font file of the first WOFF format as the plain font it packs. Bytes of another format throw. */
export const unpackWoff = (woff: Uint8Array): Uint8Array => {
  const from = new DataView(woff.buffer, woff.byteOffset, woff.byteLength)
  if (from.getUint32(0) !== 0x77_4f_46_46) throw new Error('not a WOFF font')
  const count = from.getUint16(12)
  const tables = Array.from({ length: count }, (_, index) => {
    const at = 44 + 20 * index
    const [tag, offset, packed, length, sum] = [0, 4, 8, 12, 16].map((step) => from.getUint32(at + step))
    const bytes = woff.subarray(offset, (offset ?? 0) + (packed ?? 0))
    return { tag: tag ?? 0, sum: sum ?? 0, bytes: packed === length ? bytes : unzlibSync(bytes) }
  })

  const padded = (length: number) => (length + 3) & ~3
  const size = tables.reduce((sum, { bytes }) => sum + padded(bytes.length), 12 + 16 * count)
  const font = new Uint8Array(size)
  const to = new DataView(font.buffer)
  const power = Math.floor(Math.log2(count))
  to.setUint32(0, from.getUint32(4))
  to.setUint16(4, count)
  to.setUint16(6, 16 * 2 ** power)
  to.setUint16(8, power)
  to.setUint16(10, 16 * count - 16 * 2 ** power)
  let place = 12 + 16 * count
  tables.forEach(({ tag, sum, bytes }, index) => {
    const at = 12 + 16 * index
    to.setUint32(at, tag)
    to.setUint32(at + 4, sum)
    to.setUint32(at + 8, place)
    to.setUint32(at + 12, bytes.length)
    font.set(bytes, place)
    place += padded(bytes.length)
  })
  return font
}
