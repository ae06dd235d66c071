/** Parts of a line that the spacing of YAML is about; everything else is text and stays as it is. */
interface Scanner {
  readonly source: string
  at: number
}

const quotedText = (scanner: Scanner): string => {
  const quote = scanner.source.charAt(scanner.at)
  let end = scanner.at + 1
  while (end < scanner.source.length) {
    if (quote === '"' && scanner.source.charAt(end) === '\\') end += 2
    else if (scanner.source.charAt(end) === quote) {
      // Two single quotes are one in the text.
      if (quote === "'" && scanner.source.charAt(end + 1) === "'") end += 2
      else break
    } else end += 1
  }
  const text = scanner.source.slice(scanner.at, Math.min(end + 1, scanner.source.length))
  scanner.at += text.length
  return text
}

const commentStart = (source: string, from: number): number => {
  const found = /(?:^|\s)#/u.exec(source.slice(from))
  return found ? from + found.index : source.length
}

/** Spacing inside braces: `{ a: 1, b: [2, 3] }`. Returns null where the braces do not close on the line. */
const spaceBraces = (scanner: Scanner): string | null => {
  const { source } = scanner
  const stack: string[] = []
  let out = ''
  const trimEnd = (): void => {
    out = out.trimEnd()
  }
  while (scanner.at < source.length) {
    const character = source.charAt(scanner.at)
    const atWord = /[\s,:[{]$/u.test(out)
    if ((character === '"' || character === "'") && atWord) {
      out += quotedText(scanner)
      continue
    }
    if (character === '#' && /\s$/u.test(out)) return null
    scanner.at += 1
    if (character === '{' || character === '[') {
      stack.push(character)
      out += character === '{' ? '{ ' : '['
      while (/\s/u.test(source.charAt(scanner.at))) scanner.at += 1
    } else if (character === '}' || character === ']') {
      const open = stack.pop()
      trimEnd()
      if (open === '{') out += out.endsWith('{') ? '}' : ' }'
      else out += ']'
      if (stack.length === 0) return out
    } else if (character === ',') {
      trimEnd()
      out += ', '
      while (/\s/u.test(source.charAt(scanner.at))) scanner.at += 1
    } else if (character === ':' && /[\s,}\]]|^$/u.test(source.charAt(scanner.at))) {
      trimEnd()
      out += ': '
      while (/\s/u.test(source.charAt(scanner.at))) scanner.at += 1
    } else out += character
  }
  return null
}

const value = (source: string): string => {
  const text = source.trimEnd()
  if (!/^[[{]/u.test(text)) return text
  const scanner = { source: text, at: 0 }
  const braces = spaceBraces(scanner)
  return braces === null ? text : braces + text.slice(scanner.at)
}

/** One space behind dashes and colons and inside braces. The space before a comment is the writer's. */
export const spaceLine = (line: string): string => {
  const dashes = /^(?:-\s+)*-?(?=\s|$)\s*|^(?:-\s+)+/u.exec(line)?.[0] ?? ''
  const lead = dashes.replace(/-\s*/gu, '- ')
  const body = line.slice(dashes.length)
  if (body.startsWith('#')) return `${lead}${body}`.trimEnd()
  const key =
    /^("(?:[^"\\]|\\.)*"|'(?:[^']|'')*'|[^\s"'#[\]{},&*!|>%@`][^#]*?|[^\s"'#[\]{},&*!|>%@`][^#]*?)\s*:(?=\s|$)\s*/u.exec(
      body,
    )
  const head = key ? `${key[1]}: ` : ''
  const rest = body.slice(key?.[0].length ?? 0)
  const comment = /^["']/u.test(rest)
    ? commentStart(rest, quotedText({ source: rest, at: 0 }).length)
    : commentStart(rest, 0)
  const spaces = /\s*$/u.exec(rest.slice(0, comment))?.[0] ?? ''
  const gap = comment < rest.length ? `${spaces}${rest.slice(comment)}` : ''
  return `${lead}${head}${value(rest.slice(0, comment))}${gap}`.trimEnd()
}
