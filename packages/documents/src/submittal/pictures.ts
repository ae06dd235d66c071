import { drawAcceptance, drawPressures, ON_PAPER, PAPER, svgText, type Drawing } from '@coldfill/presentation'
import type { ProjectResult, SystemResult, VesselResult } from '@coldfill/sizing'
import { ImageRun, Paragraph, type FileChild } from 'docx'
import type { DocumentOptions } from '../document-options.ts'
import type { Captions } from '../docx/captions.ts'
import { plainText } from '../docx/plain-text.ts'
import { STYLE } from '../docx/styles.ts'
import { drawPngs } from '../raster/draw-pngs.ts'

/** A drawing, and what stands in for the same as dots, which are drawn while the document is written. */
export interface Picture {
  readonly drawing: Drawing
  readonly svg: string
  readonly standIn: Uint8Array
}

/** Drawings of a project by what they show. */
export interface Pictures {
  readonly pressures: ReadonlyMap<SystemResult, Picture>
  readonly acceptance: ReadonlyMap<VesselResult, Picture>
  /** Puts the dots where their stand-in is; ready when all are drawn. */
  readonly dots: Promise<(part: Uint8Array) => Uint8Array>
}

const STAND_IN = 'dots of drawing '

/** Pixels across of the dots, some 128 to the inch of paper: what programs show that do not draw. Time goes by their square. */
const DOTS = 720

export const drawPictures = (result: ProjectResult, { units }: DocumentOptions): Pictures => {
  const svgs: string[] = []
  const pictures = <T>(things: readonly T[], draw: (thing: T) => Drawing | null): Map<T, Picture> =>
    new Map(
      things.flatMap((thing) => {
        const drawing = draw(thing)
        if (!drawing) return []
        const svg = svgText(drawing, PAPER)
        const standIn = new TextEncoder().encode(`${STAND_IN}${svgs.length}`)
        svgs.push(svg)
        return [[thing, { drawing, svg, standIn }] as const]
      }),
    )
  const pressures = pictures(result.systems, (system) => drawPressures(system, units, ON_PAPER, result.vessels))
  const acceptance = pictures(result.vessels, (vessel) => drawAcceptance(vessel, units, ON_PAPER))
  const decoder = new TextDecoder()
  const dots = drawPngs({ svgs, width: DOTS }).then((pngs) => (part: Uint8Array): Uint8Array => {
    if (part.length > STAND_IN.length + 6) return part
    const words = decoder.decode(part)
    return words.startsWith(STAND_IN) ? (pngs[Number(words.slice(STAND_IN.length))] ?? part) : part
  })
  // Who never asks for them, since writing failed, must not end the process by their failure.
  dots.catch(() => undefined)
  return { pressures, acceptance, dots }
}

/** Pixels of the page, 96 to the inch. */
const ACROSS = 540

/** A picture in the line, and its caption under it on the same page. */
export const figure = (
  { drawing, svg, standIn }: Picture,
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
          fallback: { type: 'png', data: standIn },
          transformation: { width: ACROSS, height: Math.round((ACROSS * height) / width) },
          altText: { title: plainText(title), description: plainText(words), name: plainText(title) },
        }),
      ],
    }),
    captions.figure(caption, key),
  ]
}
