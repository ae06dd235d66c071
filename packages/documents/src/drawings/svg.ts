/** Pens of the drawings, in pixels of the drawing. */
export const PEN = { hair: 1, fine: 1.5, medium: 2, heavy: 3 } as const

type Attributes = Readonly<Record<string, string | number>>

const escaped = (text: string): string =>
  text
    .replace(/\p{Surrogate}/gu, '\ufffd')
    // oxlint-disable-next-line no-control-regex
    .replace(/[\u0000-\u001f\u007f\ufffe\uffff]/g, ' ')
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;')

const number = (value: number): string => String(Math.round(value * 100) / 100)

/** An SVG element. Text in attributes and content is escaped here and nowhere else; `inside` is made of elements. */
export const element = (name: string, attributes: Attributes, inside = ''): string => {
  const list = Object.entries(attributes)
    .map(([key, value]) => ` ${key}="${typeof value === 'number' ? number(value) : escaped(value)}"`)
    .join('')
  return inside === '' ? `<${name}${list}/>` : `<${name}${list}>${inside}</${name}>`
}

export const text = (x: number, y: number, words: string, attributes: Attributes = {}): string =>
  element('text', { x, y, ...attributes }, escaped(words))

export const line = (x1: number, y1: number, x2: number, y2: number, attributes: Attributes): string =>
  element('line', { x1, y1, x2, y2, ...attributes })

/** A finished picture with what it is called and what it shows, said in words. */
export interface Drawing {
  readonly svg: string
  readonly title: string
  readonly words: string
  readonly width: number
  readonly height: number
}

export const drawing = (
  size: { width: number; height: number },
  title: string,
  words: string,
  parts: readonly string[],
): Drawing => ({
  title,
  words,
  ...size,
  svg: element(
    'svg',
    {
      xmlns: 'http://www.w3.org/2000/svg',
      viewBox: `0 0 ${size.width} ${size.height}`,
      width: size.width,
      height: size.height,
      role: 'img',
      'aria-label': `${title}. ${words}`,
      'font-family': 'Inter, Arial, sans-serif',
      'font-size': 12,
    },
    [
      element('title', {}, escaped(title)),
      element('desc', {}, escaped(words)),
      element('rect', { width: size.width, height: size.height, fill: '#FFFFFF' }),
      ...parts,
    ].join(''),
  ),
})
