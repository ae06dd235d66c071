import { unzipSync, Zip, ZipDeflate, ZipPassThrough } from 'fflate'

/** Earliest time a ZIP entry can carry; every entry gets it, so that the time of writing does not show. */
const EPOCH = new Date(1980, 0, 1)

const FIRST = '[Content_Types].xml'

/** Little is gained beyond, and it takes twice as long. */
const LEVEL = 2

const encoder = new TextEncoder()
const decoder = new TextDecoder('utf-8', { ignoreBOM: true })

/** Joins what a packer gives out piece by piece. */
const joined = (chunks: readonly Uint8Array[]): Uint8Array => {
  const whole = new Uint8Array(chunks.reduce((sum, chunk) => sum + chunk.length, 0))
  let at = 0
  for (const chunk of chunks) {
    whole.set(chunk, at)
    at += chunk.length
  }
  return whole
}

/**
 * Packs the parts again in a fixed order with fixed times: the same parts give the same bytes. `edit` may change the text
 * of a part, `swap` the bytes of a picture; each is edited, packed and let go before the next, so that a large one is in
 * memory once.
 */
export const fixedArchive = (
  bytes: Uint8Array,
  edit: (name: string, xml: string) => string = (_, xml) => xml,
  swap: (part: Uint8Array) => Uint8Array = (part) => part,
): Uint8Array => {
  const parts = unzipSync(bytes)
  const names = Object.keys(parts)
    .filter((name) => !name.endsWith('/'))
    .sort((a, b) => (a === FIRST ? -1 : b === FIRST ? 1 : a < b ? -1 : 1))
  const chunks: Uint8Array[] = []
  const zip = new Zip((error, chunk) => {
    if (error) throw error
    chunks.push(chunk)
  })
  for (const name of names) {
    const part = parts[name] ?? new Uint8Array()
    const isText = name.endsWith('.xml') || name.endsWith('.rels')
    // A picture is packed as it is.
    const entry = /\.(?:png|jpe?g)$/.test(name) ? new ZipPassThrough(name) : new ZipDeflate(name, { level: LEVEL })
    entry.mtime = EPOCH
    zip.add(entry)
    entry.push(isText ? encoder.encode(edit(name, decoder.decode(part))) : swap(part), true)
    delete parts[name]
  }
  zip.end()
  return joined(chunks)
}

/** Text of one part of an archive; empty where there is none of that name. */
export const partText = (bytes: Uint8Array, name: string): string =>
  decoder.decode(unzipSync(bytes, { filter: (file) => file.name === name })[name] ?? new Uint8Array())
