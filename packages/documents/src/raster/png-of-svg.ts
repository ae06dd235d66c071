import { readFile } from 'node:fs/promises'
import { fileURLToPath } from 'node:url'
import { initWasm, Resvg } from '@resvg/resvg-wasm'
import { indexedPng } from './indexed-png.ts'
import { unpackWoff } from './unpack-woff.ts'

const fontFile = (subset: string, weight: number): URL =>
  new URL(import.meta.resolve(`@fontsource/inter/files/inter-${subset}-${weight}-normal.woff`))

const load = async (): Promise<Uint8Array[]> => {
  const renderer = fileURLToPath(import.meta.resolve('@resvg/resvg-wasm/index_bg.wasm'))
  await initWasm(await readFile(renderer))
  const files = ['latin'].flatMap((subset) => [400, 600].map((weight) => fontFile(subset, weight)))
  return Promise.all(files.map(async (file) => unpackWoff(await readFile(file))))
}

let fonts: Promise<Uint8Array[]> | undefined

/**
 * Draws SVGs as PNGs of `width` pixels, with the fonts of the project alone: the same picture gives the same bytes on every
 * machine. The renderer is loaded once a process.
 */
export const pngRenderer = async (): Promise<(svg: string, width: number) => Uint8Array> => {
  const fontBuffers = await (fonts ??= load())
  return (svg, width) => {
    const drawing = new Resvg(svg, {
      font: { fontBuffers, defaultFontFamily: 'Inter' },
      fitTo: { mode: 'width', value: width },
    })
    try {
      const image = drawing.render()
      try {
        return indexedPng(image.pixels, image.width, image.height)
      } finally {
        image.free()
      }
    } finally {
      // Their memory is the renderer's, where no collector looks.
      drawing.free()
    }
  }
}
