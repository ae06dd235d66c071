import type { FindingCode } from '../diagnostics.ts'
import type { At, Edit } from '../report.ts'
import type { Context } from './context.ts'
import { nearest, oneOf } from './nearest.ts'

const MOST_LISTED = 20

/** The choices, and the nearest to what was written, for the hint and the fix. */
export const choiceHint = (
  at: At,
  written: string,
  choices: readonly string[],
  listed = choices,
): { hint: string; fixes: Edit[] } => {
  const near = nearest(written, choices)
  const list =
    listed.length === 0
      ? ''
      : `Write ${oneOf(listed.slice(0, MOST_LISTED))}${listed.length > MOST_LISTED ? ' or another of the reference' : ''}.`
  return {
    hint: near === undefined ? list : `Did you mean \`${near}\`? ${list}`.trim(),
    fixes: near === undefined ? [] : [{ title: `Write ${near}`, span: at.span, text: near }],
  }
}

/** Says that a text is none of the choices. */
export const wrongChoice = (
  context: Context,
  code: FindingCode,
  at: At,
  written: string,
  choices: readonly string[],
  message: string,
): void => context.report.add(code, at, { message, ...choiceHint(at, written, choices) })
