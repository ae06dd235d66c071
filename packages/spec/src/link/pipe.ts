import type { Vocabulary } from '../model/spec-model.ts'
import { wrongChoice } from '../read/choice.ts'
import type { Context } from '../read/context.ts'
import { allOf } from '../read/nearest.ts'
import type { At } from '../report.ts'

/** Case, the kind of cross and doubled or missing spaces do not tell sizes apart. */
const plainSize = (text: string): string =>
  text
    .trim()
    .toLowerCase()
    .replaceAll('×', 'x')
    .replaceAll('″', '"')
    .replace(/(\d)\s+(?=\d)/gu, '$1-')
    .replace(/\s+/gu, '')
    .replace(/(?:inches|inch)$/u, 'in')

/** Whether a family has the size; undefined where there is no such family. */
export const linkPipeFamily = (context: Context, at: At, name: string): string | undefined => {
  const families = Object.keys(context.vocabulary.pipes)
  if (families.includes(name)) return name
  wrongChoice(context, 'CF-S040', at, name, families, `There is no pipe \`${name}\` in the pipe table.`)
  return undefined
}

type Sizes = Vocabulary['pipes'][string]

/** Rough size in mm, to find neighbours only. */
const roughSize = (text: string): number | undefined => {
  const plain = plainSize(text)
  const fraction = /(?:(\d+)-)?(\d+)\/(\d+)/u.exec(plain)
  if (fraction) return (Number(fraction[1] ?? 0) + Number(fraction[2]) / Number(fraction[3])) * 25.4
  const number = /\d+(?:\.\d+)?/u.exec(plain)?.[0]
  if (number === undefined) return undefined
  return Number(number) * (/mm|dn|x|od|^d/u.test(plain) ? 1 : 25.4)
}

const neighbours = (sizes: Sizes, written: string): string[] => {
  const asked = roughSize(written)
  const names = sizes.map(({ size }) => size)
  if (asked === undefined) return names.slice(0, 8)
  const below = names.filter((name) => (roughSize(name) ?? 0) < asked).slice(-2)
  const above = names.filter((name) => (roughSize(name) ?? 0) >= asked).slice(0, 2)
  return [...below, ...above]
}

const spelled = new WeakMap<Sizes, ReadonlyMap<string, string>>()

/** Sizes of a family by every way in which they may be written; of two that share one the first. */
const bySpelling = (sizes: Sizes): ReadonlyMap<string, string> => {
  const known = spelled.get(sizes)
  if (known) return known
  const made = new Map<string, string>()
  for (const { size, spellings } of sizes)
    for (const each of [size, ...spellings].map(plainSize)) if (!made.has(each)) made.set(each, size)
  spelled.set(sizes, made)
  return made
}

/** The size as the family names it. Undefined where the family does not have it. */
export const linkPipeSize = (context: Context, at: At, family: string, written: string): string | undefined => {
  const sizes = context.vocabulary.pipes[family] ?? []
  const found = bySpelling(sizes).get(plainSize(written))
  if (found !== undefined) return found
  const near = neighbours(sizes, written)
  context.report.add('CF-S041', at, {
    message: `\`${family}\` has no size \`${written}\`.`,
    hint: near.length === 0 ? 'It has no sizes.' : `Sizes next to it are ${allOf(near)}.`,
    fixes: near.map((size) => ({ title: `Write ${size}`, span: at.span, text: size, guess: true })),
  })
  return undefined
}

export const linkEmitter = (context: Context, at: At, name: string): string | undefined => {
  const classes = Object.keys(context.vocabulary.emitters)
  if (classes.includes(name)) return name
  wrongChoice(context, 'CF-S042', at, name, classes, `There is no class of emitters \`${name}\`.`)
  return undefined
}
