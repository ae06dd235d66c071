import { longestMark, markPattern } from '../model/block.ts'
import type { Vocabulary } from '../model/spec-model.ts'
import { parsedText } from '../parse/recent.ts'
import type { SourceMap } from '../parse/source-tree.ts'
import type { TextEdit } from './edits.ts'
import { givenNames, type Name } from './names.ts'
import { type NameUses, usesOf } from './uses.ts'

export type Renaming =
  | { readonly ok: true; readonly name: Name; readonly edits: readonly TextEdit[]; readonly uses: NameUses }
  | { readonly ok: false; readonly message: string }

const WHAT = { system: 'the id of a system', vessel: 'the mark of a vessel', fluid: 'the id of a fluid' } as const

const no = (message: string): Renaming => ({ ok: false, message })

const FIXED_FLUIDS = ['water']

/** Why a name of this sort cannot be called `to`; undefined where it can. */
const objection = (tree: SourceMap, { sort, name }: Name, to: string): string | undefined => {
  if (sort === 'assumption' || sort === 'word') return `\`${name}\` is a word of the language and keeps its name.`
  if (!markPattern.test(to) || to.length > longestMark)
    return `\`${to}\` cannot be ${WHAT[sort]}: write letters and digits, parted by hyphens or underscores, at most ${longestMark}.`
  if (to === name) return `It is called \`${name}\` already.`
  if (sort === 'fluid' && FIXED_FLUIDS.includes(to)) return `\`${to}\` is a fluid without an additive; take another id.`
  const taken = givenNames(tree).find((other) => other.sort === sort && other.name === to)
  return taken ? `\`${to}\` is taken: it is ${WHAT[sort]} in this spec.` : undefined
}

/**
 * The edits that give the name under the cursor another one, with every place that means or mentions it. Refused where the
 * text cannot be read, where no name of the author's stands, and where the new name is malformed or taken.
 */
export const renameAt = (text: string, offset: number, to: string, vocabulary: Vocabulary): Renaming => {
  const { tree } = parsedText(text)
  if (!tree) return no('The text cannot be read as it is; mend that first.')
  const uses = usesOf(text, offset, vocabulary)
  if (!uses) return no('No mark, system or fluid stands here.')
  const message = objection(tree, uses.name, to)
  if (message !== undefined) return no(message)
  return { ok: true, name: uses.name, uses, edits: uses.uses.map(({ range }) => ({ range, text: to })) }
}

/** What the new name would be refused for before one is typed; null where the name under the cursor can be changed. */
export const renameRefusal = (text: string, offset: number, vocabulary: Vocabulary): string | null => {
  const { tree } = parsedText(text)
  if (!tree) return 'The text cannot be read as it is; mend that first.'
  const name = usesOf(text, offset, vocabulary)?.name
  if (!name) return 'No mark, system or fluid stands here.'
  return name.sort === 'assumption' || name.sort === 'word'
    ? `\`${name.name}\` is a word of the language and keeps its name.`
    : null
}
