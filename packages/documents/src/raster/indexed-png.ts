import { zlibSync } from 'fflate'

const CRC = Uint32Array.from({ length: 256 }, (_, start) => {
  let value = start
  for (let bit = 0; bit < 8; bit += 1) value = value & 1 ? 0xedb88320 ^ (value >>> 1) : value >>> 1
  return value >>> 0
})

const crcOf = (bytes: Uint8Array): number => {
  let value = 0xffffffff
  for (const byte of bytes) value = (CRC[(value ^ byte) & 0xff] ?? 0) ^ (value >>> 8)
  return (value ^ 0xffffffff) >>> 0
}

const chunk = (name: string, data: Uint8Array): Uint8Array => {
  const whole = new Uint8Array(12 + data.length)
  const view = new DataView(whole.buffer)
  view.setUint32(0, data.length)
  whole.set(new TextEncoder().encode(name), 4)
  whole.set(data, 8)
  view.setUint32(8 + data.length, crcOf(whole.subarray(4, 8 + data.length)))
  return whole
}

const SIGNATURE = [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]

/** Most colours of a palette. */
const COLOURS = 256

interface Indexed {
  /** Three bytes a colour. */
  readonly palette: Uint8Array
  /** A filter byte and the indices of each line. */
  readonly lines: Uint8Array
}

/** The pixels by a palette, each channel cut to its first `bits`; null where they have too many colours. */
const indexed = (rgba: Uint8Array, width: number, height: number, bits: number): Indexed | null => {
  const places = new Int16Array(1 << (3 * bits)).fill(-1)
  const palette = new Uint8Array(3 * COLOURS)
  const lines = new Uint8Array((width + 1) * height)
  const cut = 8 - bits
  let count = 0
  // Whole pixels, to be told apart in one look.
  const aligned = rgba.byteOffset % 4 === 0 ? rgba : rgba.slice()
  const whole = new Uint32Array(aligned.buffer, aligned.byteOffset, width * height)
  let [before, place] = [-1, 0]
  for (let y = 0, pixel = 0; y < height; y += 1) {
    const line = y * (width + 1) + 1
    for (let x = 0; x < width; x += 1, pixel += 1) {
      const colour = whole[pixel] ?? 0
      // A drawing is mostly ground: a pixel is like the one before it.
      if (colour !== before) {
        before = colour
        const [r, g, b] = [rgba[4 * pixel] ?? 0, rgba[4 * pixel + 1] ?? 0, rgba[4 * pixel + 2] ?? 0]
        const key = ((r >> cut) << (2 * bits)) | ((g >> cut) << bits) | (b >> cut)
        place = places[key] ?? -1
        if (place < 0) {
          if (count === COLOURS) return null
          // The first colour that is met stands for all that are cut to the same: white is white and ink is ink.
          palette.set([r, g, b], 3 * count)
          place = count
          places[key] = count
          count += 1
        }
      }
      lines[line + x] = place
    }
  }
  return { palette: palette.subarray(0, 3 * count), lines }
}

/** Opaque pixels as a PNG with a palette: a line drawing has few colours, and so is small and quickly packed. */
export const indexedPng = (rgba: Uint8Array, width: number, height: number): Uint8Array => {
  const found = [5, 4, 3, 2].reduce<Indexed | null>((best, bits) => best ?? indexed(rgba, width, height, bits), null)
  if (!found) throw new Error('a palette of two bits a channel holds every picture')
  const head = new Uint8Array(13)
  const view = new DataView(head.buffer)
  view.setUint32(0, width)
  view.setUint32(4, height)
  head.set([8, 3, 0, 0, 0], 8)
  const parts = [
    Uint8Array.from(SIGNATURE),
    chunk('IHDR', head),
    chunk('PLTE', found.palette),
    chunk('IDAT', zlibSync(found.lines, { level: 2 })),
    chunk('IEND', new Uint8Array()),
  ]
  const whole = new Uint8Array(parts.reduce((sum, part) => sum + part.length, 0))
  let at = 0
  for (const part of parts) {
    whole.set(part, at)
    at += part.length
  }
  return whole
}
