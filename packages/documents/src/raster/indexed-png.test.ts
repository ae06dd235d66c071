import { unzlibSync } from 'fflate'
import { expect, it } from 'vitest'
import { indexedPng } from './indexed-png.ts'

/** Colours of the pixels of a PNG with a palette. */
const pixelsOf = (png: Uint8Array, width: number): number[][] => {
  const view = new DataView(png.buffer, png.byteOffset)
  const chunks = new Map<string, Uint8Array>()
  for (let at = 8; at < png.length;) {
    const length = view.getUint32(at)
    chunks.set(Buffer.from(png.subarray(at + 4, at + 8)).toString(), png.subarray(at + 8, at + 8 + length))
    at += 12 + length
  }
  const palette = chunks.get('PLTE') ?? new Uint8Array()
  const lines = unzlibSync(chunks.get('IDAT') ?? new Uint8Array())
  return [...lines]
    .filter((_, index) => index % (width + 1) !== 0)
    .map((place) => [...palette.subarray(3 * place, 3 * place + 3)])
}

it('keeps the colours of a drawing', () => {
  const colours = [
    [255, 255, 255],
    [29, 43, 51],
    [31, 86, 115],
    [255, 255, 255],
  ]
  const rgba = Uint8Array.from(colours.flatMap((colour) => [...colour, 255]))
  expect(pixelsOf(indexedPng(rgba, 2, 2), 2)).toEqual(colours)
})

it('takes a picture of more colours than a palette has, a little coarser', () => {
  const rgba = Uint8Array.from({ length: 4 * 64 * 64 }, (_, index) => (index % 4 === 3 ? 255 : (index * 37) % 256))
  const pixels = pixelsOf(indexedPng(rgba, 64, 64), 64)
  expect(pixels).toHaveLength(64 * 64)
  const worst = Math.max(
    ...pixels.flatMap((pixel, index) => pixel.map((v, c) => Math.abs(v - (rgba[4 * index + c] ?? 0)))),
  )
  expect(worst).toBeLessThan(64)
})
