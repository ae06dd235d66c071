import { blockDocs } from '../model/block.ts'
import type { Shape } from '../model/shape.ts'
import type { Vocabulary } from '../model/spec-model.ts'
import { specShape } from '../model/spec-shape.ts'
import type { Span } from '../parse/line-index.ts'
import { places, type Step } from '../parse/path.ts'
import { entryOf, type SourceMap, type SourceNode } from '../parse/source-tree.ts'
import { shapeAt } from './shape-at.ts'

/**
 * What a word in a spec names. The first three are given by the author and can be renamed; an assumption and a word of the
 * language (a pipe family, a kind, a method, a fixture) have their names from the program.
 */
export type NameSort = 'system' | 'vessel' | 'fluid' | 'assumption' | 'word'

export interface Name {
  readonly sort: NameSort
  readonly name: string
  /** Path of the entry that gives the name: `systems.HWS.vessels.ET-1`. Empty for a name that the spec does not give. */
  readonly path: string
  /** One line that explains it, where the program knows one. */
  readonly doc: string
}

/** A name at a place of the tree. */
export interface NameAt {
  readonly name: Name
  readonly span: Span
  readonly role: 'declaration' | 'reference'
}

const SYSTEM = /^systems\.([^.]+)$/u
const VESSEL = /^systems\.[^.]+\.vessels\.([^.]+)$/u
const FLUID = /^fluids\.([^.]+)$/u
const FLUID_REFERENCE = /^systems\.[^.]+\.fluid$/u

const given = (step: Step): Name | null => {
  const { path, key } = step
  const doc = (sort: 'systems' | 'vessels' | 'fluids'): string => blockDocs[sort]
  if (SYSTEM.test(path)) return { sort: 'system', name: key, path, doc: doc('systems') }
  if (VESSEL.test(path)) return { sort: 'vessel', name: key, path, doc: doc('vessels') }
  return FLUID.test(path) ? { sort: 'fluid', name: key, path, doc: doc('fluids') } : null
}

const fluidsOf = (tree: SourceMap): SourceNode | null | undefined => entryOf(tree, 'fluids')?.value

const fluidNamed = (tree: SourceMap, name: string): Name => {
  const fluids = fluidsOf(tree)
  const known = fluids?.node === 'map' && entryOf(fluids, name) !== undefined
  return { sort: known ? 'fluid' : 'word', name, path: known ? `fluids.${name}` : '', doc: blockDocs.fluid }
}

/** Words that may stand behind a key, with a line for each. */
const wordsOf = (shape: Shape): Readonly<Record<string, string>> => {
  const field = shape.shape === 'field' ? shape : shape.shape === 'either' ? shape.text : undefined
  return field?.names ?? (field?.field.field === 'choice' ? field.field.choices : {})
}

/** A name that the program gives: the key of a map of known names, or a value that is one of the words of its key. */
const wordAt = (tree: SourceMap, step: Step, part: 'key' | 'value', vocabulary: Vocabulary): NameAt | null => {
  const language = specShape(vocabulary)
  if (part === 'key') {
    const parent = shapeAt(language, tree, step.path)?.above.at(-1)
    const shape = parent && shapeAt(language, tree, parent.path)?.shape
    if (shape?.shape !== 'map' || !shape.names || !Object.hasOwn(shape.names, step.key)) return null
    const isAssumption = parent?.path === 'assumptions'
    return {
      name: {
        sort: isAssumption ? 'assumption' : 'word',
        name: step.key,
        path: isAssumption ? step.path : '',
        doc: shape.names[step.key] ?? '',
      },
      span: step.keySpan,
      role: isAssumption ? 'declaration' : 'reference',
    }
  }
  const shape = shapeAt(language, tree, step.path)?.shape
  if (!shape || step.value?.node !== 'text') return null
  const text = step.value.text.trim()
  const words = wordsOf(shape)
  if (!Object.hasOwn(words, text)) return null
  return {
    name: { sort: 'word', name: text, path: '', doc: words[text] ?? '' },
    span: step.value.span,
    role: 'reference',
  }
}

const nameOfStep = (tree: SourceMap, step: Step, part: 'key' | 'value', vocabulary: Vocabulary): NameAt | null => {
  if (part === 'key') {
    const name = given(step)
    return name ? { name, span: step.keySpan, role: 'declaration' } : wordAt(tree, step, part, vocabulary)
  }
  if (step.value?.node !== 'text') return null
  if (!FLUID_REFERENCE.test(step.path)) return wordAt(tree, step, part, vocabulary)
  return { name: fluidNamed(tree, step.value.text.trim()), span: step.value.span, role: 'reference' }
}

const holds = ({ start, end }: Span, offset: number): boolean => start <= offset && offset <= end

/** The name under the cursor, as a key or a value. Null where no name stands. */
export const nameAt = (tree: SourceMap, offset: number, vocabulary: Vocabulary): NameAt | null => {
  let found: { step: Step; part: 'key' | 'value' } | null = null
  for (const step of places(tree)) {
    if (step.value?.node === 'text' && holds(step.value.span, offset)) found = { step, part: 'value' }
    else if (holds(step.keySpan, offset)) found = { step, part: 'key' }
  }
  return found && nameOfStep(tree, found.step, found.part, vocabulary)
}

/** The names that the author gave: systems, vessels and fluids. */
export const givenNames = (tree: SourceMap): readonly Name[] => [...places(tree)].flatMap((step) => given(step) ?? [])

const same = (a: Name, b: Name): boolean =>
  a.path !== '' || b.path !== '' ? a.path === b.path : a.sort === b.sort && a.name === b.name

/** The last part of a path that is a key of the language: words are the same only behind the same key. */
const keyOf = (path: string): string => path.split('.').at(-1) ?? ''

/** Every place in the tree where the name stands as a key or a value. */
export const placesOfName = (
  tree: SourceMap,
  wanted: NameAt,
  vocabulary: Vocabulary,
): readonly (NameAt & { readonly path: string })[] => {
  const found: (NameAt & { path: string })[] = []
  const at = wanted.name.sort === 'word' ? keyAt(tree, wanted.span) : undefined
  for (const step of places(tree)) {
    // Most steps are neither: the shape of the language is asked only where the text is right.
    const key = step.key === wanted.name.name ? nameOfStep(tree, step, 'key', vocabulary) : null
    if (key && same(key.name, wanted.name)) found.push({ ...key, path: step.path })
    if (step.value?.node !== 'text' || step.value.text.trim() !== wanted.name.name) continue
    if (at !== undefined && keyOf(step.path) !== at) continue
    const value = nameOfStep(tree, step, 'value', vocabulary)
    if (value && same(value.name, wanted.name)) found.push({ ...value, path: step.path })
  }
  return found
}

/** Key behind which a word stands; undefined where the word is a key itself. */
const keyAt = (tree: SourceMap, span: Span): string | undefined => {
  for (const step of places(tree))
    if (step.value?.node === 'text' && step.value.span.start === span.start) return keyOf(step.path)
  return undefined
}
