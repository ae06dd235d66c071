import type { Report } from '../report.ts'

/** `fill:50 °F`, with the key and what follows the colon. */
export const tightColon = (text: string): { key: string; rest: string } | null => {
  const found = /^([\p{L}][\p{L}\d -]*):(?!\/\/)(\S.*)$/su.exec(text)
  return found?.[1] !== undefined && found[2] !== undefined ? { key: found[1], rest: found[2] } : null
}

/** Says that the space behind the colon of a key is missing. `start` is the offset of the key. */
export const reportTightColon = (
  report: Report,
  path: string,
  start: number,
  found: { key: string; rest: string },
): void => {
  const behind = start + found.key.length + 1
  report.add(
    'CF-Y019',
    { path, span: { start, end: behind } },
    {
      message: `A space is missing behind the colon of \`${found.key}\`.`,
      hint: `Write \`${found.key}: ${found.rest}\`.`,
      fixes: [{ title: 'Put in the space', span: { start: behind, end: behind }, text: ' ' }],
    },
  )
}
