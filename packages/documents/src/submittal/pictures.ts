import { drawAcceptance, drawPressures, ON_PAPER, PAPER, svgText, type Drawing } from '@coldfill/presentation'
import type { ProjectResult, SystemResult, VesselResult } from '@coldfill/sizing'
import { ImageRun, Paragraph, type FileChild } from 'docx'
import type { DocumentOptions } from '../document-options.ts'
import type { Captions } from '../docx/captions.ts'
import { plainText } from '../docx/plain-text.ts'
import { STYLE } from '../docx/styles.ts'
import { pngRenderer } from '../raster/png-of-svg.ts'

/** A drawing, and the same as dots for programs that do not draw. */
export interface Picture {
  readonly drawing: Drawing
  readonly svg: string
  readonly png: Uint8Array
}

/** Drawings of a project by what they show. */
export interface Pictures {
  readonly pressures: ReadonlyMap<SystemResult, Picture>
  readonly acceptance: ReadonlyMap<VesselResult, Picture>
}

/** Pixels across of the dots, some 128 to the inch of paper: what programs show that do not draw. Time goes by their square. */
const DOTS = 720

export const drawPictures = async (result: ProjectResult, { units }: DocumentOptions): Promise<Pictures> => {
  const pngOf = await pngRenderer()
  const pictures = <T>(things: readonly T[], draw: (thing: T) => Drawing | null): Map<T, Picture> =>
    new Map(
      things.flatMap((thing) => {
        const drawing = draw(thing)
        if (!drawing) return []
        const svg = svgText(drawing, PAPER)
        return [[thing, { drawing, svg, png: pngOf(svg, DOTS) }] as const]
      }),
    )
  return {
    pressures: pictures(result.systems, (system) => drawPressures(system, units, ON_PAPER, result.vessels)),
    acceptance: pictures(result.vessels, (vessel) => drawAcceptance(vessel, units, ON_PAPER)),
  }
}

/** Pixels of the page, 96 to the inch. */
const ACROSS = 540

/** A picture in the line, and its caption under it on the same page. */
export const figure = (
  { drawing, svg, png }: Picture,
  caption: string,
  captions: Captions,
  key?: string,
): FileChild[] => {
  const { title, words, width, height } = drawing
  return [
    new Paragraph({
      style: STYLE.figure,
      children: [
        new ImageRun({
          type: 'svg',
          data: new TextEncoder().encode(svg),
          fallback: { type: 'png', data: png },
          transformation: { width: ACROSS, height: Math.round((ACROSS * height) / width) },
          altText: { title: plainText(title), description: plainText(words), name: plainText(title) },
        }),
      ],
    }),
    captions.figure(caption, key),
  ]
}
