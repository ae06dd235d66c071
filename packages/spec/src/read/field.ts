import { parseQuantity, type QuantityProblem } from '@coldfill/units'
import type { FindingCode } from '../diagnostics.ts'
import type {
  Field,
  Fields,
  FieldValue,
  IntegerField,
  Located,
  NumberField,
  QuantityField,
  ReadFields,
} from '../model/field.ts'
import type { SourceText } from '../parse/source-tree.ts'
import type { At } from '../report.ts'
import { wrongChoice } from './choice.ts'
import { type Block, type Context, entriesOf, type Entry } from './context.ts'
import { asScalar, missingKey, unknownKey, type UnknownKey } from './keys.ts'
import { readKnownQuantity } from './known-quantity.ts'
import { expectText } from './shape.ts'

const PROBLEM_CODES: Readonly<Record<Exclude<QuantityProblem['reason'], 'empty'>, FindingCode>> = {
  'no unit': 'CF-S008',
  'unknown unit': 'CF-S009',
  'wrong kind': 'CF-S010',
  'not a number': 'CF-S011',
  'thousands comma': 'CF-S012',
  'decimal comma': 'CF-S013',
  range: 'CF-S017',
}

/** Puts a problem of a quantity or a strength into a finding. */
export const reportQuantity = (context: Context, at: At, problem: QuantityProblem, example: string): void => {
  const code = problem.reason === 'empty' ? 'CF-S006' : PROBLEM_CODES[problem.reason]
  context.report.add(code, at, {
    message: problem.message,
    hint:
      problem.suggestions.length > 0
        ? `Write ${problem.suggestions.map((each) => `\`${each}\``).join(' or ')}.`
        : `Write it as in \`${example}\`.`,
    fixes: problem.suggestions.map((suggestion) => ({
      title: `Write ${suggestion}`,
      span: at.span,
      text: suggestion,
      ...(problem.suggestions.length > 1 && { guess: true }),
    })),
  })
}

const outOfRange = (context: Context, at: At, message: string, example: string): undefined => {
  context.report.add('CF-S014', at, { message, hint: `Write a value such as \`${example}\`.` })
  return undefined
}

/** Few mean an absolute pressure where a gauge reading may stand, so it is not offered. */
const usualProblem = (field: QuantityField, text: string): QuantityProblem | undefined => {
  if (!field.kinds.includes('gauge pressure')) return undefined
  const reading = parseQuantity(
    text,
    field.kinds.filter((kind) => kind !== 'absolute pressure'),
  )
  return reading.ok ? undefined : reading.problem
}

const readQuantity = (
  context: Context,
  field: QuantityField,
  at: At,
  text: string,
): FieldValue<QuantityField> | undefined => {
  const reading = readKnownQuantity(text, field.kinds)
  if (!reading.ok) {
    reportQuantity(context, at, usualProblem(field, text) ?? reading.problem, field.example)
    return undefined
  }
  const { quantity } = reading
  if (field.positive && quantity.value <= 0)
    return outOfRange(context, at, `\`${text}\` is not above zero.`, field.example)
  if (field.least !== undefined && quantity.value < field.least)
    return outOfRange(
      context,
      at,
      `\`${text}\` is below ${field.least === 0 ? 'zero' : 'the least value'}.`,
      field.example,
    )
  return quantity
}

const PLAIN_NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)$/u

const readNumber = (context: Context, field: NumberField | IntegerField, at: At, text: string): number | undefined => {
  const whole = field.field === 'integer'
  const value = Number(text)
  if (!PLAIN_NUMBER.test(text) || (whole && !Number.isSafeInteger(value))) {
    const number = /^[+-]?\d[\d,]*(?:\.\d+)?/u.exec(text)?.[0].replaceAll(',', '')
    context.report.add(whole ? 'CF-S015' : 'CF-S018', at, {
      message: `\`${text}\` is not a ${whole ? 'whole ' : ''}number${number === undefined ? '' : ' without a unit'}.`,
      hint: `Write a ${whole ? 'whole ' : ''}number, as in \`${field.example}\`.`,
      fixes:
        number !== undefined && (!whole || !number.includes('.'))
          ? [{ title: `Write ${number}`, span: at.span, text: number }]
          : [],
    })
    return undefined
  }
  if (field.least !== undefined && value < field.least)
    return outOfRange(context, at, `\`${text}\` is below ${field.least}.`, field.example)
  return value
}

const readYesNo = (context: Context, at: At, text: string): boolean | undefined => {
  if (text === 'yes' || text === 'true') return true
  if (text === 'no' || text === 'false') return false
  wrongChoice(context, 'CF-S016', at, text, ['yes', 'no'], `\`${text}\` is neither yes nor no.`)
  return undefined
}

const DUE: Readonly<Record<Field['field'], string>> = {
  quantity: 'a number with a unit',
  choice: 'one word or phrase',
  text: 'a text',
  integer: 'a whole number',
  number: 'a number',
  'yes or no': '`yes` or `no`',
}

const commaInText = (context: Context, at: At, text: string): void =>
  context.report.add('CF-Y024', at, {
    message: `The comma is read as part of the text; other programs that read YAML end the text there.`,
    hint: 'Put the text in quotes.',
    fixes: [{ title: 'Put the text in quotes', span: at.span, text: asScalar(text, true) }],
  })

const readText = (
  context: Context,
  field: Field,
  at: At,
  key: string,
  source: SourceText,
): FieldValue<Field> | undefined => {
  const text = source.text.trim()
  if (field.field === 'quantity') return readQuantity(context, field, at, text)
  if (field.field === 'integer' || field.field === 'number') return readNumber(context, field, at, text)
  if (field.field === 'yes or no') return readYesNo(context, at, text)
  if (field.field === 'choice') {
    if (Object.hasOwn(field.choices, text)) return text
    wrongChoice(context, 'CF-S007', at, text, Object.keys(field.choices), `\`${text}\` is not a choice of \`${key}\`.`)
    return undefined
  }
  if (source.comma) commaInText(context, at, text)
  return text
}

/** Reads the value behind a key. Undefined where it was not understood; a finding says why. */
export const readField = <F extends Field>(
  context: Context,
  field: F,
  entry: Entry,
): Located<FieldValue<F>> | undefined => {
  const source = expectText(context, entry, DUE[field.field], field.example)
  if (!source) return undefined
  const value = readText(context, field, { path: entry.path, span: source.span }, entry.key, source)
  if (value === undefined) return undefined
  return { value: value as FieldValue<F>, path: entry.path, range: context.report.lineIndex.range(source.span) }
}

/**
 * Reads the keys of a block by a table of fields. `others` are keys of the block that are read apart. Unknown keys are said
 * first, then each required key that is missing.
 */
export const readFields = <T extends Fields>(
  context: Context,
  block: Block,
  fields: T,
  { others = [], ...unknown }: Omit<UnknownKey, 'known'> & { readonly others?: readonly string[] },
): ReadFields<T> => {
  const read: Record<string, Located<unknown>> = {}
  const entries = entriesOf(block)
  const known = [...others, ...Object.keys(fields)]
  for (const entry of entries) {
    if (others.includes(entry.key)) continue
    const field = Object.hasOwn(fields, entry.key) ? fields[entry.key] : undefined
    if (!field) {
      unknownKey(context, entry, { ...unknown, known })
      continue
    }
    const value = readField(context, field, entry)
    if (value) read[entry.key] = value
  }
  const written = new Set(entries.map((entry) => entry.key))
  for (const [key, field] of Object.entries(fields))
    if (field.required && !written.has(key) && !others.includes(key))
      missingKey(context, block, { keys: [key], message: `${unknown.owner} needs \`${key}\`.`, example: field.example })
  return read as ReadFields<T>
}
