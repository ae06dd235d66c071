// Advance widths in thousandths of an em of the characters from space to tilde, in the metrics that Arial shares with
// every family cut to replace it; measured from Liberation Sans.
// prettier-ignore
const REGULAR = [
  278,278,355,556,556,889,667,191,333,333,389,584,278,333,278,278,556,556,556,556,556,556,556,556,556,556,278,278,584,584,584,556,
  1015,667,667,722,722,667,611,778,722,278,500,667,556,833,722,778,667,778,722,667,611,722,667,944,667,667,611,278,278,278,469,556,
  333,556,556,500,556,556,278,556,556,222,222,500,222,833,556,556,556,556,333,500,278,556,500,722,500,500,500,334,260,334,584,
]
// prettier-ignore
const BOLD = [
  278,333,474,556,556,889,722,238,333,333,389,584,278,333,278,278,556,556,556,556,556,556,556,556,556,556,333,333,584,584,584,611,
  975,722,722,722,722,667,611,778,722,278,556,722,611,833,722,778,667,778,722,667,611,722,667,944,667,667,611,333,278,333,584,556,
  333,556,611,556,611,556,333,611,611,278,278,556,278,889,611,611,611,611,389,556,333,611,556,778,556,556,500,389,280,389,584,
]
const OTHER: Readonly<Record<string, number>> = {
  '\u00A0': 278,
  '°': 400,
  '²': 333,
  '³': 333,
  '·': 278,
  '×': 584,
  Δ: 719,
  '–': 556,
  '—': 1000,
  '−': 584,
  '…': 1000,
}

/** Width of a character that no table has: an accented letter is as wide as its plain one at most, others get a whole em. */
const otherWidth = (character: string): number =>
  OTHER[character] ?? ((character.codePointAt(0) ?? 0) < 0x250 ? 778 : 1000)

/** Width of a text on one line, in ems of the body family. */
export const lineWidth = (text: string, bold = false): number => {
  const widths = bold ? BOLD : REGULAR
  let sum = 0
  for (let at = 0; at < text.length; at += 1) {
    const code = text.charCodeAt(at)
    // The second half of a pair adds nothing to the first.
    if (code < 0xdc00 || code > 0xdfff) sum += widths[code - 32] ?? otherWidth(text.charAt(at))
  }
  return sum / 1000
}

/** A word longer than this may be broken behind its hyphens and slashes. */
const LONG_WORD = 22

/** Words that no line may break: texts part at spaces, a very long word also behind a hyphen or slash. */
const words = (text: string): string[] =>
  text.split(/[ \n\t]+/).flatMap((word) => (word.length > LONG_WORD ? word.split(/(?<=[/-])/) : [word]))

/** Width of the longest word of a text, in ems of the body family. */
export const longestWord = (text: string, bold = false): number =>
  Math.max(0, ...words(text).map((word) => lineWidth(word, bold)))
