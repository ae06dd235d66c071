/**
 * Makes the parts of a word-processor file independent of when and in which process they were written: the times in the
 * properties, and the ids of bookmarks and pictures, which the library counts on from document to document.
 */
export const settled =
  (date: Date) =>
  (name: string, xml: string): string => {
    if (name === 'docProps/core.xml') {
      const time = date.toISOString().replace(/\.\d+Z$/, 'Z')
      return xml.replace(/(<dcterms:(?:created|modified)[^>]*>)[^<]*/g, `$1${time}`)
    }
    if (name !== 'word/document.xml') return xml
    const ids = new Map<string, string>()
    let pictures = 0
    const settledPictures = xml.replace(
      /(<wp:docPr\b[^>]*?\bid=")[^"]*"/g,
      (_, start: string) => `${start}${(pictures += 1)}"`,
    )
    return settledPictures.replace(
      /(<w:bookmark(?:Start|End)\b[^>]*?\bw:id=")([^"]*)"/g,
      (_, start: string, id: string) => {
        const settledId = ids.get(id) ?? String(ids.size + 1)
        ids.set(id, settledId)
        return `${start}${settledId}"`
      },
    )
  }
