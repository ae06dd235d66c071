/**
 * Page of each named place of a PDF that LibreOffice wrote: pages and names stand in it uncompressed. A file of another
 * make gives an empty map, never a wrong page.
 */
export const pdfDestinations = (pdf: Uint8Array): Map<string, number> => {
  const text = Buffer.from(pdf).toString('latin1')
  const [, kids = ''] = /\/Type\s*\/Pages\b[^>]*?\/Kids\s*\[([^\]]*)\]/s.exec(text) ?? []
  const numbers = new Map([...kids.matchAll(/(\d+)\s+0\s+R/g)].map(([, object = ''], index) => [object, index + 1]))
  const found = new Map<string, number>()
  // An underscore at the head of a name comes out as its code, with or without the sign that should mark it.
  for (const [, name = '', object = ''] of text.matchAll(/\/(?:_|#?5F)(Toc\d+)\s*\[\s*(\d+)\s+0\s+R/g)) {
    const page = numbers.get(object)
    if (page !== undefined) found.set(`_${name}`, page)
  }
  return found
}
