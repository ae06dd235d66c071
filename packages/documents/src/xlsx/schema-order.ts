/** Children of a font in the order of the schema. */
const FONT = ['b', 'i', 'strike', 'u', 'vertAlign', 'sz', 'color', 'name', 'family', 'charset', 'scheme']

const place = (element: string): number => FONT.indexOf(/^<(\w+)/.exec(element)?.[1] ?? '')

/** The styles part with the children of each font in the order of the schema; the library writes them in one of its own. */
export const withFontsInOrder = (xml: string): string =>
  xml.replace(/<font>(.*?)<\/font>/gs, (_, inside: string) => {
    const children = inside.match(/<\w+(?: [^>]*)?\/>/g) ?? []
    return `<font>${children.toSorted((a, b) => place(a) - place(b)).join('')}</font>`
  })

/** A drawing part without an attribute that the library gives to an anchor of one cell and only one of two may have. */
export const withoutEditAs = (xml: string): string => xml.replace(/(<xdr:oneCellAnchor) editAs="\w+"/g, '$1')
