import { isPlaceholder } from '../model/block.ts'
import type { SourceText } from '../parse/source-tree.ts'
import { reportTightColon, tightColon } from '../parse/tight-colon.ts'
import type { Block, Context, Entry } from './context.ts'
import { keyAt, valueAt } from './context.ts'

const wrongShape = (context: Context, entry: Entry, due: string, example: string): void => {
  const tight = entry.value?.node === 'text' ? tightColon(entry.value.text) : null
  if (tight && entry.value) return reportTightColon(context.report, entry.path, entry.value.span.start, tight)
  context.report.add('CF-S005', valueAt(entry), {
    message: `${entry.label ?? `\`${entry.key}\``} takes ${due}, not ${shapeName(entry)}.`,
    hint: `Write it as in \`${example}\`.`,
  })
}

const shapeName = (entry: Entry): string => {
  if (entry.value === null) return 'nothing'
  if (entry.value.node === 'map') return 'a block of keys'
  return entry.value.node === 'list' ? 'a list' : 'a single text'
}

/** Says once that nothing is written behind a key. */
const nothingWritten = (context: Context, entry: Entry, example: string): void =>
  context.report.add('CF-S006', keyAt(entry), {
    message: entry.label === undefined ? `Nothing is written behind \`${entry.key}\`.` : `${entry.label} is empty.`,
    hint:
      entry.label === undefined
        ? `Write \`${entry.key}: ${example}\`, or take the key out.`
        : 'Write it or take it out.',
    fixes:
      entry.value === null && entry.label === undefined && !example.includes('…')
        ? [
            {
              title: `Write ${example}`,
              span: behindColon(context.text, entry.keySpan.end),
              text: `: ${example}`,
              guess: true,
            },
          ]
        : [],
  })

/** Says once that a placeholder stands where a value is due. */
const stillToSay = (context: Context, entry: Entry, example: string): void =>
  context.report.add('CF-S019', valueAt(entry), {
    message: `\`${entry.key}\` is still to be filled in.`,
    hint: `Write it as in \`${entry.key}: ${example}\`.`,
  })

/** The colon behind a key with the spaces that follow on the line; a key in braces may have none. */
const behindColon = (text: string, end: number): { start: number; end: number } => {
  const colon = /^\s*:[ \t]*/u.exec(text.slice(end, end + 20))?.[0]
  return { start: end, end: end + (colon?.length ?? 0) }
}

/** The single text behind a key. */
export const expectText = (context: Context, entry: Entry, due: string, example: string): SourceText | undefined => {
  const { value } = entry
  if (value === null || (value.node === 'text' && value.text.trim() === '')) {
    nothingWritten(context, entry, example)
    return undefined
  }
  if (value.node === 'text') {
    if (value.quoted || !isPlaceholder(value.text.trim())) return value
    stillToSay(context, entry, example)
    return undefined
  }
  wrongShape(context, entry, due, `${entry.key}: ${example}`)
  return undefined
}

/** The block behind a key, an id or a mark. */
export const expectBlock = (context: Context, entry: Entry, example: string): Block | undefined => {
  if (entry.value === null) {
    nothingWritten(context, entry, '{ … }')
    return undefined
  }
  if (entry.value.node === 'map') return { map: entry.value, path: entry.path, span: entry.keySpan }
  wrongShape(context, entry, 'a block of keys', example)
  return undefined
}

/** The items of the list behind a key. */
export const expectList = (context: Context, entry: Entry, example: string): readonly Entry[] => {
  if (entry.value === null) {
    nothingWritten(context, entry, '[ … ]')
    return []
  }
  if (entry.value.node !== 'list') {
    wrongShape(context, entry, 'a list', example)
    return []
  }
  return entry.value.items.map((value, index) => ({
    key: `${index}`,
    label: `Line ${index + 1} of \`${entry.key}\``,
    path: `${entry.path}.${index}`,
    keySpan: value === null ? entry.keySpan : { start: value.span.start, end: value.span.start + 1 },
    value,
  }))
}
