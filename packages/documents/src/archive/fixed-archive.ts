import { strFromU8, strToU8, unzipSync, zipSync, type Zippable } from 'fflate'

/** Earliest time a ZIP entry can carry; every entry gets it, so that the time of writing does not show. */
const EPOCH = new Date(1980, 0, 1)

const FIRST = '[Content_Types].xml'

/** Packs the parts again in a fixed order with fixed times: the same parts give the same bytes. `edit` may change the text of a part. */
export const fixedArchive = (
  bytes: Uint8Array,
  edit: (name: string, xml: string) => string = (_, xml) => xml,
): Uint8Array => {
  const parts = unzipSync(bytes)
  const names = Object.keys(parts)
    .filter((name) => !name.endsWith('/'))
    .sort((a, b) => (a === FIRST ? -1 : b === FIRST ? 1 : a < b ? -1 : 1))
  const packed: Zippable = {}
  for (const name of names) {
    const part = parts[name] ?? new Uint8Array()
    const isText = name.endsWith('.xml') || name.endsWith('.rels')
    packed[name] = [isText ? strToU8(edit(name, strFromU8(part))) : part, { mtime: EPOCH }]
  }
  return zipSync(packed, { level: 6 })
}
