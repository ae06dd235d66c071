import type { Drawing, Palette } from './shape.ts'

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

/** `textAnchor` is `text-anchor` in a file. */
const attributeName = (name: string): string =>
  name === 'viewBox' ? name : name.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`)

/** An element. Text in attributes and content is escaped here and nowhere else; `inside` is made of elements. */
const element = (name: string, attributes: Attributes, inside = ''): string => {
  const list = Object.entries(attributes)
    .map(([key, value]) => ` ${attributeName(key)}="${typeof value === 'number' ? number(value) : escaped(value)}"`)
    .join('')
  return inside === '' ? `<${name}${list}/>` : `<${name}${list}>${inside}</${name}>`
}

/** A drawing as the text of an SVG file, on the ground of its palette. */
export const svgText = ({ title, words, width, height, shapes }: Drawing, { ground }: Palette): string =>
  element(
    'svg',
    {
      xmlns: 'http://www.w3.org/2000/svg',
      viewBox: `0 0 ${width} ${height}`,
      width,
      height,
      role: 'img',
      'aria-label': `${title}. ${words}`,
      fontFamily: 'Inter, Arial, sans-serif',
      fontSize: 12,
    },
    [
      element('title', {}, escaped(title)),
      element('desc', {}, escaped(words)),
      element('rect', { width, height, fill: ground }),
      ...shapes.map(({ name, attributes, text = '' }) => element(name, attributes, escaped(text))),
    ].join(''),
  )
