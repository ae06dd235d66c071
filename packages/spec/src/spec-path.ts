import type { Range } from './finding.ts'
import { indexLines } from './parse/line-index.ts'
import { parsedText } from './parse/recent.ts'
import { type PathAtOffset, pathAtOffset, placeOf } from './parse/path.ts'

/** Where the key, mark or id of a path stands. Null where the text has no such path or cannot be read. */
export const pathRange = (text: string, path: string): Range | null => {
  const { tree, lineIndex } = parsedText(text)
  const place = tree && placeOf(tree, path)
  return place ? lineIndex.range(place.keySpan) : null
}

/** Where the value of a path stands. Null where there is none. */
export const valueRange = (text: string, path: string): Range | null => {
  const { tree, lineIndex } = parsedText(text)
  const value = tree && placeOf(tree, path)?.value
  return value ? lineIndex.range(value.span) : null
}

/** The innermost key or list item at an offset; an empty path where the text cannot be read. */
export const pathAt = (text: string, offset: number): PathAtOffset => {
  const { tree } = parsedText(text)
  return tree ? pathAtOffset(tree, offset) : { path: '', part: 'between' }
}

/** The text between two positions. */
export const textIn = (text: string, range: Range): string => {
  const lines = indexLines(text)
  return text.slice(lines.offset(range.start), lines.offset(range.end))
}
