import { XmlComponent, type IContext, type IXmlableObject, type ParagraphChild } from 'docx'

type Child = XmlComponent | string | (() => string)

class XmlElement extends XmlComponent {
  readonly #attributes: Readonly<Record<string, string>>
  readonly #children: readonly Child[]

  constructor(name: string, attributes: Readonly<Record<string, string>>, children: readonly Child[]) {
    super(name)
    this.#attributes = attributes
    this.#children = children
  }

  override prepForXml(context: IContext): IXmlableObject {
    const attributes = Object.keys(this.#attributes).length > 0 ? [{ _attr: this.#attributes }] : []
    const children = this.#children.flatMap((child) => {
      if (typeof child === 'function') return [child()]
      return typeof child === 'string' ? [child] : (child.prepForXml(context) ?? [])
    })
    const content = [...attributes, ...children]
    return { [this.rootKey]: attributes.length === 1 && content.length === 1 ? content[0] : content }
  }
}

/** An element that the library has no class for. A child that is a function is text that is only known when the file is written. */
export const xmlElement = (
  name: string,
  attributes: Readonly<Record<string, string>> = {},
  children: readonly Child[] = [],
): XmlComponent => new XmlElement(name, attributes, children)

/** A paragraph takes any element; the library's type only lists those that it can build itself. */
export const inParagraph = (component: XmlComponent): ParagraphChild => component as unknown as ParagraphChild
