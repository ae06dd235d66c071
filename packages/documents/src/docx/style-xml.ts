/** A paragraph or character style as data; sizes in half points, lengths in twips, pens in eighths of a point. */
export interface StyleDefinition {
  readonly id: string
  readonly name: string
  readonly type?: 'paragraph' | 'character'
  readonly basedOn?: string
  readonly next?: string
  /** A style of this project; built-in styles are known to every word processor by name. */
  readonly custom?: true
  readonly size?: number
  readonly bold?: boolean
  readonly italic?: true
  readonly subscript?: true
  readonly color?: string
  readonly letterSpacing?: number
  readonly before?: number
  readonly after?: number
  readonly line?: number
  readonly left?: number
  readonly hanging?: number
  readonly align?: 'left' | 'right' | 'center'
  /** False takes off what the style it is based on has. */
  readonly keepNext?: boolean
  readonly keepLines?: true
  readonly outline?: number
  readonly top?: Pen
  readonly bottom?: Pen
}

export interface Pen {
  readonly color: string
  readonly size: number
}

const pen = (side: string, of: Pen | undefined): string =>
  of ? `<w:${side} w:val="single" w:sz="${of.size}" w:space="2" w:color="${of.color}"/>` : ''

// The order of elements is that of the schema, which word processors insist on.
const paragraphProperties = (s: StyleDefinition): string => {
  const borders = pen('top', s.top) + pen('bottom', s.bottom)
  const spacing = [
    s.before === undefined ? '' : ` w:before="${s.before}"`,
    s.after === undefined ? '' : ` w:after="${s.after}"`,
    s.line === undefined ? '' : ` w:line="${s.line}" w:lineRule="auto"`,
  ].join('')
  return [
    s.keepNext === undefined ? '' : s.keepNext ? '<w:keepNext/>' : '<w:keepNext w:val="0"/>',
    s.keepLines ? '<w:keepLines/>' : '',
    borders ? `<w:pBdr>${borders}</w:pBdr>` : '',
    spacing ? `<w:spacing${spacing}/>` : '',
    s.left === undefined
      ? ''
      : `<w:ind w:left="${s.left}"${s.hanging === undefined ? '' : ` w:hanging="${s.hanging}"`}/>`,
    s.align ? `<w:jc w:val="${s.align}"/>` : '',
    s.outline === undefined ? '' : `<w:outlineLvl w:val="${s.outline}"/>`,
  ].join('')
}

const runProperties = (s: StyleDefinition): string =>
  [
    s.bold === undefined ? '' : s.bold ? '<w:b/><w:bCs/>' : '<w:b w:val="0"/><w:bCs w:val="0"/>',
    s.italic ? '<w:i/><w:iCs/>' : '',
    s.color ? `<w:color w:val="${s.color}"/>` : '',
    s.letterSpacing === undefined ? '' : `<w:spacing w:val="${s.letterSpacing}"/>`,
    s.size === undefined ? '' : `<w:sz w:val="${s.size}"/><w:szCs w:val="${s.size}"/>`,
    s.subscript ? '<w:vertAlign w:val="subscript"/>' : '',
  ].join('')

const wrapped = (name: string, inside: string): string => (inside ? `<w:${name}>${inside}</w:${name}>` : '')

export const styleXml = (s: StyleDefinition): string => {
  const type = s.type ?? 'paragraph'
  const isDefault = s.id === 'Normal' || s.id === 'DefaultParagraphFont'
  return [
    `<w:style w:type="${type}"${isDefault ? ' w:default="1"' : ''}${s.custom ? ' w:customStyle="1"' : ''} w:styleId="${s.id}">`,
    `<w:name w:val="${s.name}"/>`,
    isDefault ? '' : `<w:basedOn w:val="${s.basedOn ?? (type === 'paragraph' ? 'Normal' : 'DefaultParagraphFont')}"/>`,
    s.next ? `<w:next w:val="${s.next}"/>` : '',
    '<w:qFormat/>',
    wrapped('pPr', paragraphProperties(s)),
    wrapped('rPr', runProperties(s)),
    '</w:style>',
  ].join('')
}
