import { ON_PAPER, type Drawing, type DrawingLook, type Palette } from '@coldfill/presentation'
import { createElement, useLayoutEffect, useRef, useState } from 'react'
import { Failure } from '#components/failure.tsx'
import { Button } from '#components/ui/button.tsx'
import { useAction } from '#lib/use-action.ts'
import { saveDrawing, type DrawingFormat } from '../drawing-file.ts'

const THEME: Palette = {
  ink: 'var(--color-ink)',
  pencil: 'var(--color-pencil)',
  hair: 'var(--color-hair)',
  steel: 'var(--color-steel)',
  ground: 'var(--color-sheet)',
}
const LEAST = 300
const MOST = 720

/** Width of the room an element has, within what a drawing can be. */
const useRoom = () => {
  const holder = useRef<HTMLElement>(null)
  const [width, setWidth] = useState<number>(ON_PAPER.width)
  useLayoutEffect(() => {
    const element = holder.current
    if (!element) return undefined
    const measure = () => setWidth(Math.max(LEAST, Math.min(MOST, element.clientWidth)))
    measure()
    const observer = new ResizeObserver(measure)
    observer.observe(element)
    return () => observer.disconnect()
  }, [])
  return { holder, width }
}

const Downloads = ({ drawing, name }: { readonly drawing: Drawing; readonly name: string }) => {
  const { busy, error, run } = useAction()
  return (
    <div className="mt-2 flex flex-wrap items-center gap-2 print:hidden">
      {(['SVG', 'PNG'] satisfies DrawingFormat[]).map((format) => (
        <Button
          key={format}
          small
          busy={busy}
          aria-label={`Download ${drawing.title} as ${format}`}
          onClick={() => void run(() => saveDrawing(drawing, name, format))}
        >
          {format}
        </Button>
      ))}
      {error ? <Failure error={error} /> : null}
    </div>
  )
}

/**
 * A drawing in the colours of the theme and as wide as there is room, with what it shows in words for whoever does not see it.
 * Its files are as it stands in the submittal.
 */
export const DrawingFigure = ({
  draw,
  name,
}: {
  /** Null where there is nothing to draw. */
  readonly draw: (look: DrawingLook) => Drawing | null
  /** Of its files, without what stands behind the dot. */
  readonly name: string
}) => {
  const { holder, width } = useRoom()
  const drawing = draw({ palette: THEME, width })
  const onPaper = draw(ON_PAPER)
  return (
    <figure ref={holder} className="w-full">
      {drawing && onPaper ? (
        <>
          <svg
            width={drawing.width}
            height={drawing.height}
            viewBox={`0 0 ${drawing.width} ${drawing.height}`}
            role="img"
            aria-label={`${drawing.title}. ${drawing.words}`}
            fontSize="12"
            className="figures block max-w-full"
          >
            <title>{drawing.title}</title>
            <desc>{drawing.words}</desc>
            {drawing.shapes.map(({ name: element, attributes, text }, index) =>
              // A drawing is made anew as a whole: its shapes have no identity but their place.
              createElement(element, { key: index, ...attributes }, text),
            )}
          </svg>
          <Downloads drawing={onPaper} name={name} />
        </>
      ) : null}
    </figure>
  )
}
