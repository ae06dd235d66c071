import { expect, it } from 'vitest'
import { PAPER, svgText } from '@coldfill/presentation'
import { pngRenderer } from './png-of-svg.ts'

const size = (png: Uint8Array) => {
  const view = new DataView(png.buffer, png.byteOffset)
  return [view.getUint32(16), view.getUint32(20)]
}

it('draws an SVG with its letters, in the size asked for and in the same bytes each time', async () => {
  const png = await pngRenderer()
  const picture = (words: string) =>
    svgText(
      {
        title: 'Title',
        words: 'Words',
        width: 200,
        height: 100,
        shapes: [{ name: 'text', attributes: { x: 20, y: 50, fontWeight: 600 }, text: words }],
      },
      PAPER,
    )
  const drawn = png(picture('Cold 22 psig'), 400)
  expect(size(drawn)).toEqual([400, 200])
  expect(Buffer.from(png(picture('Cold 22 psig'), 400)).equals(Buffer.from(drawn))).toBe(true)
  // Letters show: other words are another picture, and none are an emptier one.
  expect(drawn.length).toBeGreaterThan(png(picture(''), 400).length + 300)
})
