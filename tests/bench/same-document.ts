// The library on its own: builds a document of the same content from the text of a finished one and writes it.
import {
  BuilderElement,
  Document,
  ImageRun,
  Packer,
  Paragraph,
  type ParagraphChild,
  Table,
  TableCell,
  TableRow,
  TextRun,
  type XmlComponent,
} from 'docx'

interface Node {
  readonly name: string
  readonly attributes: Readonly<Record<string, string>>
  readonly children: (Node | string)[]
}

/** Elements of the body as plain data. */
export const parseBody = (xml: string): Node[] => {
  const root: Node = { name: '', attributes: {}, children: [] }
  const open: Node[] = [root]
  const from = xml.indexOf('<w:body>') + '<w:body>'.length
  for (const [, text, close, name = '', list = '', empty] of xml
    .slice(from, xml.indexOf('</w:body>'))
    .matchAll(/([^<]+)|<(\/?)([\w:]+)((?: [\w:]+="[^"]*")*) ?(\/?)>/g)) {
    const parent = open.at(-1) ?? root
    if (text !== undefined) parent.children.push(text)
    else if (close) open.pop()
    else {
      const attributes = Object.fromEntries(
        [...list.matchAll(/ ([\w:]+)="([^"]*)"/g)].map(([, k = '', v = '']) => [k, v]),
      )
      const node: Node = { name, attributes, children: [] }
      parent.children.push(node)
      if (!empty) open.push(node)
    }
  }
  return root.children.filter((child) => typeof child !== 'string')
}

const elements = (node: Node, name?: string): Node[] =>
  node.children.filter(
    (child): child is Node => typeof child !== 'string' && (name === undefined || child.name === name),
  )
const textOf = (node: Node): string =>
  node.children.map((child) => (typeof child === 'string' ? child : textOf(child))).join('')
const deep = (node: Node, name: string): Node[] =>
  elements(node).flatMap((child) => (child.name === name ? [child] : deep(child, name)))

const generic = (node: Node): XmlComponent =>
  new BuilderElement<Record<string, string>>({
    name: node.name,
    attributes: Object.fromEntries(Object.entries(node.attributes).map(([key, value]) => [key, { key, value }])),
    children: node.children.map((child) =>
      typeof child === 'string' ? (child as unknown as XmlComponent) : generic(child),
    ),
  })

const child = (node: Node, pictures: Iterator<{ svg: Uint8Array; png: Uint8Array }>): ParagraphChild => {
  if (node.name !== 'w:r') return generic(node) as unknown as ParagraphChild
  if (deep(node, 'wp:inline').length > 0) {
    const next = pictures.next()
    if (next.done) throw new Error('fewer pictures than places for them')
    return new ImageRun({
      type: 'svg',
      data: next.value.svg,
      fallback: { type: 'png', data: next.value.png },
      transformation: { width: 540, height: 254 },
    })
  }
  if (elements(node, 'w:t').length === 0) return generic(node) as unknown as ParagraphChild
  const style = deep(node, 'w:rStyle')[0]?.attributes['w:val']
  return new TextRun({ text: textOf(node), ...(style === undefined ? {} : { style }) })
}

const paragraph = (node: Node, pictures: Iterator<{ svg: Uint8Array; png: Uint8Array }>): Paragraph =>
  new Paragraph({
    style: deep(node, 'w:pStyle')[0]?.attributes['w:val'] ?? 'Normal',
    children: elements(node)
      .filter((each) => each.name !== 'w:pPr')
      .map((each) => child(each, pictures)),
  })

export const writeSame = async (
  body: readonly Node[],
  images: readonly { svg: Uint8Array; png: Uint8Array }[],
): Promise<Uint8Array> => {
  const pictures = images[Symbol.iterator]()
  const children = body.flatMap((node): (Paragraph | Table)[] => {
    if (node.name === 'w:p') return [paragraph(node, pictures)]
    if (node.name !== 'w:tbl') return []
    const rows = elements(node, 'w:tr').map(
      (row, index) =>
        new TableRow({
          tableHeader: index === 0,
          cantSplit: true,
          children: elements(row, 'w:tc').map(
            (cell) => new TableCell({ children: elements(cell, 'w:p').map((each) => paragraph(each, pictures)) }),
          ),
        }),
    )
    return [new Table({ rows })]
  })
  return new Uint8Array(await Packer.toArrayBuffer(new Document({ sections: [{ children }] })))
}
