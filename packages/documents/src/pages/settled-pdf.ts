import { createHash } from 'node:crypto'

/**
 * Makes a PDF that LibreOffice wrote independent of when it was printed: its time becomes `date`, its identifiers and checksum
 * are worked out from its content. Each is replaced by as many characters, so that the table of places in it stays true.
 */
export const settledPdf = (pdf: Uint8Array, date: Date): Uint8Array => {
  const time = date.toISOString().replace(/\D/g, '').slice(0, 14)
  const identified = (text: string, id: string): string =>
    text
      .replace(/(\/ID\s*\[\s*<)[0-9A-F]{32}(>\s*<)[0-9A-F]{32}(?=>)/g, `$1${id}$2${id}`)
      .replace(/(\/DocChecksum\s*\/)[0-9A-F]{32}/g, `$1${id}`)
  const dated = Buffer.from(pdf)
    .toString('latin1')
    .replace(/(\/(?:CreationDate|ModDate)\(D:)\d{14}/g, `$1${time}`)
  const bare = identified(dated, '0'.repeat(32))
  const id = createHash('sha256').update(bare, 'latin1').digest('hex').slice(0, 32).toUpperCase()
  return Uint8Array.from(Buffer.from(identified(bare, id), 'latin1'))
}
