import { PAPER, svgText, type Drawing } from '@coldfill/presentation'

/** A drawing as the text of an SVG file, in ink on white whatever the theme is. */
const svgOf = (drawing: Drawing): string => `<?xml version="1.0" encoding="UTF-8"?>\n${svgText(drawing, PAPER)}`

/** Dots of the picture for each pixel of the drawing: some 190 to the inch where it goes across a page. */
const DOTS = 3

const pictureOf = async (drawing: Drawing): Promise<Blob> => {
  const image = new Image(drawing.width, drawing.height)
  // Not an address of a blob: the page takes pictures from its own server and from data alone.
  image.src = `data:image/svg+xml;charset=utf-8,${encodeURIComponent(svgText(drawing, PAPER))}`
  await image.decode()
  const canvas = document.createElement('canvas')
  canvas.width = drawing.width * DOTS
  canvas.height = drawing.height * DOTS
  canvas.getContext('2d')?.drawImage(image, 0, 0, canvas.width, canvas.height)
  return new Promise((resolve, reject) => {
    canvas.toBlob((blob) => (blob ? resolve(blob) : reject(new Error('The browser made no picture.'))), 'image/png')
  })
}

const save = (blob: Blob, name: string): void => {
  const address = URL.createObjectURL(blob)
  const link = document.createElement('a')
  link.href = address
  link.download = name
  link.click()
  // The download has begun by the next turn; until then the address has to last.
  setTimeout(() => URL.revokeObjectURL(address), 1000)
}

export type DrawingFormat = 'SVG' | 'PNG'

/** Hands the drawing to the person as a file. */
export const saveDrawing = async (drawing: Drawing, name: string, format: DrawingFormat): Promise<void> => {
  if (format === 'SVG') save(new Blob([svgOf(drawing)], { type: 'image/svg+xml' }), `${name}.svg`)
  else save(await pictureOf(drawing), `${name}.png`)
}
