import type { FluidModel } from '../model/spec-model.ts'
import { wrongChoice } from '../read/choice.ts'
import type { Context } from '../read/context.ts'
import type { At } from '../report.ts'

/** Fluids by id as they were read; null for one that was not understood. */
export type Fluids = ReadonlyMap<string, FluidModel | null>

/** The fluid that a system names: `water` or the id of a fluid. Null where it is not understood. */
export const linkFluid = (context: Context, fluids: Fluids, at: At, name: string): FluidModel | null => {
  const named = fluids.get(name)
  if (named !== undefined) return named
  if (name === 'water') return { base: 'water', path: at.path, range: context.report.lineIndex.range(at.span) }
  const ids = [...fluids.keys(), 'water']
  if (name === 'propylene glycol' || name === 'ethylene glycol') {
    context.report.add('CF-S030', at, {
      message: `\`${name}\` needs a strength.`,
      hint: `Write \`{ base: ${name}, strength: 30 % vol }\`, or name the fluid under \`fluids\`.`,
      fixes: [{ title: 'Write base and strength', span: at.span, text: `{ base: ${name}, strength: 30 % vol }` }],
    })
    return null
  }
  wrongChoice(context, 'CF-S031', at, name, ids, `There is no fluid \`${name}\`.`)
  return null
}
