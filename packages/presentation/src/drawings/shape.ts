/** Pens of the drawings, in pixels of the drawing. */
export const PEN = { hair: 1, fine: 1.5, medium: 2, heavy: 3 } as const

/** Colours of a drawing by what they are for, each as an SVG paint: of paper, or of the theme of a screen. */
export interface Palette {
  readonly ink: string
  readonly pencil: string
  readonly hair: string
  readonly steel: string
  /** What the drawing stands on. */
  readonly ground: string
}

/** Ink on white paper. */
export const PAPER: Palette = {
  ink: '#1D2B33',
  pencil: '#4A5A62',
  hair: '#D3CCBA',
  steel: '#1F5673',
  ground: '#FFFFFF',
}

/** How a drawing is made: in which colours, and how wide, in pixels. */
export interface DrawingLook {
  readonly palette: Palette
  readonly width: number
}

/** Across a portrait page. */
export const ON_PAPER: DrawingLook = { palette: PAPER, width: 680 }

/** An element of SVG as data. Names of attributes are in camel case, as React has them; `text` is the whole of its content. */
export interface Shape {
  readonly name: 'text' | 'line' | 'circle' | 'polyline' | 'path' | 'rect'
  readonly attributes: Readonly<Record<string, string | number>>
  readonly text?: string
}

type Attributes = Shape['attributes']

export const text = (x: number, y: number, words: string, attributes: Attributes = {}): Shape => ({
  name: 'text',
  attributes: { x, y, ...attributes },
  text: words,
})

/** Keeps words readable where a line runs behind them. */
export const halo = ({ ground }: Palette): Attributes => ({
  stroke: ground,
  strokeWidth: 4,
  strokeLinejoin: 'round',
  paintOrder: 'stroke',
})

export const line = (x1: number, y1: number, x2: number, y2: number, attributes: Attributes): Shape => ({
  name: 'line',
  attributes: { x1, y1, x2, y2, ...attributes },
})

export const shape = (name: Exclude<Shape['name'], 'text'>, attributes: Attributes): Shape => ({ name, attributes })

const rounded = (value: number): string => String(Math.round(value * 100) / 100)

/** `points` of a polyline. */
export const pointsOf = (points: readonly (readonly [x: number, y: number])[]): string =>
  points.map(([x, y]) => `${rounded(x)},${rounded(y)}`).join(' ')

/** Width of words in the type of a drawing, near enough to keep them apart. */
export const wordsWidth = (words: string): number => words.length * 6.4

/** A finished picture with what it is called and what it shows, said in words. */
export interface Drawing {
  readonly title: string
  readonly words: string
  readonly width: number
  readonly height: number
  readonly shapes: readonly Shape[]
}
