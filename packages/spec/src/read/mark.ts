import { longestMark, markPattern } from '../model/block.ts'
import { type Context, type Entry, keyAt } from './context.ts'

/** Says where an id or a mark cannot be part of a path. `what` is "id of a system" or "mark". */
export const readMark = (context: Context, entry: Entry, what: string): void => {
  const mark = entry.key
  if (markPattern.test(mark) && mark.length <= longestMark) return
  const spelled = mark
    .trim()
    .replace(/[^\p{L}\p{N}_-]+/gu, '-')
    .replace(/^[-_]+|[-_]+$/gu, '')
    .slice(0, longestMark)
  context.report.add('CF-S061', keyAt(entry), {
    message: `\`${mark}\` cannot be the ${what}.`,
    hint: `Write letters and digits, parted by hyphens or underscores, at most ${longestMark}: as in \`ET-1\`.`,
    fixes: markPattern.test(spelled) ? [{ title: `Write ${spelled}`, span: entry.keySpan, text: spelled }] : [],
  })
}
