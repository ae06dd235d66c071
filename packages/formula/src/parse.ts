import { toSi } from '@coldfill/units'
import { builtin } from './builtins.ts'
import { type Token, tokens } from './token.ts'
import type { BinaryOperator, Columns, Comparison, FormulaProblem, Tree } from './tree.ts'
import { literalUnit } from './unit-literal.ts'

export const MAX_FORMULA_LENGTH = 2048
export const MAX_FORMULA_DEPTH = 64

const COMPARE = 1
const NEGATE = 4
const BINDING: Readonly<Record<string, number>> = {
  '<': COMPARE,
  '<=': COMPARE,
  '>': COMPARE,
  '>=': COMPARE,
  '=': COMPARE,
  '+': 2,
  '-': 2,
  '*': 3,
  '/': 3,
  '^': 5,
}

/** Thrown inside the parser alone, to give up on text that is nested too deep. */
class TooDeep extends Error {}

/**
 * Reads a formula: numbers (with a unit as in `3[L]`), symbols, + - * / ^ (right to left), one comparison, brackets and
 * calls. Every problem found is returned with its columns; the tree is null where there is any. Never throws.
 */
export const parseFormula = (text: string): { tree: Tree | null; problems: FormulaProblem[] } => {
  const problems: FormulaProblem[] = []
  const report = (message: string, at: Columns): void => void problems.push({ message, at })
  if (text.length > MAX_FORMULA_LENGTH) {
    report(`A formula may have ${MAX_FORMULA_LENGTH} characters; this one has ${text.length}.`, {
      start: 0,
      end: text.length,
    })
    return { tree: null, problems }
  }
  const list = tokens(text, report)
  let next = 0
  let depth = 0
  const peek = (): Token => list[next]!
  const take = (): Token => (list[next]!.type === 'end' ? list[next]! : list[next++]!)
  const endOfLast = (): number => (next > 0 ? list[next - 1]!.at.end : 0)
  const takeIf = (wanted: string): boolean => peek().type === 'sign' && peek().text === wanted && Boolean(take())

  const number = (token: Token): Tree => {
    const value = Number(token.text)
    if (!Number.isFinite(value)) report(`The number ${token.text} is too large.`, token.at)
    if (peek().type !== 'unit') return { type: 'number', value, text: token.text, at: token.at }
    const symbol = take()
    const unit = literalUnit(symbol.text)
    if (!unit) report(`The unit "${symbol.text}" is not known.`, symbol.at)
    const si = unit ? toSi(value, unit) : value
    return {
      type: 'number',
      value: si,
      text: token.text,
      unit: unit?.symbol ?? '',
      at: { start: token.at.start, end: symbol.at.end },
    }
  }

  const call = (token: Token, open: Columns): Tree => {
    const args: Tree[] = []
    if (!takeIf(')')) {
      do args.push(expression(0))
      while (takeIf(','))
      close(open)
    }
    const at = { start: token.at.start, end: endOfLast() }
    const known = builtin(token.text)
    if (known && (args.length < known.least || args.length > known.most)) {
      const count = `${known.least}${known.most > known.least ? ' or more' : ''}`
      report(`${token.text}() takes ${count} value${count === '1' ? '' : 's'}, not ${args.length}.`, at)
    }
    return { type: 'call', name: token.text, args, at }
  }

  const close = (open: Columns): void => {
    if (takeIf(')')) return
    const token = peek()
    if (token.type === 'end') report('This bracket is not closed.', open)
    else report(`Unexpected "${token.text}"; a closing bracket is due here.`, take().at)
  }

  const operand = (): Tree => {
    const token = peek()
    if (token.type === 'number') return number(take())
    if (token.type === 'name') {
      take()
      const open = peek().at
      return takeIf('(') ? call(token, open) : { type: 'symbol', name: token.text, at: token.at }
    }
    if (takeIf('(')) {
      const inside = expression(0)
      close(token.at)
      return inside
    }
    if (takeIf('-')) {
      const negated = expression(NEGATE)
      return { type: 'negate', operand: negated, at: { start: token.at.start, end: endOfLast() } }
    }
    if (takeIf('+')) return expression(NEGATE)
    if (token.type === 'end') report('The formula ends where a value is due.', token.at)
    else report(`A value is missing before "${token.text}".`, token.at)
    if (token.type === 'unit') take()
    return { type: 'number', value: 0, text: '0', at: token.at }
  }

  const expression = (least: number): Tree => {
    if (++depth > MAX_FORMULA_DEPTH) {
      report(`The formula is nested deeper than ${MAX_FORMULA_DEPTH} levels.`, peek().at)
      throw new TooDeep()
    }
    const start = peek().at.start
    let left = operand()
    for (;;) {
      const token = peek()
      const starts = token.type === 'number' || token.type === 'name' || (token.type === 'sign' && token.text === '(')
      if (starts && problems.at(-1)?.at !== token.at)
        report('An operator is missing here; a product is written with *.', token.at)
      const binding = starts ? BINDING['*']! : token.type === 'sign' ? (BINDING[token.text] ?? 0) : 0
      if (binding === 0 || binding <= least) break
      if (!starts) take()
      if (binding === COMPARE && left.type === 'compare') report('Only two values can be compared at a time.', token.at)
      const right = expression(token.text === '^' ? binding - 1 : binding)
      const at = { start, end: endOfLast() }
      left =
        binding === COMPARE
          ? { type: 'compare', operator: token.text as Comparison, left, right, at }
          : { type: 'binary', operator: (starts ? '*' : token.text) as BinaryOperator, left, right, at }
    }
    depth--
    return left
  }

  try {
    let tree = expression(0)
    while (peek().type !== 'end') {
      const token = take()
      const message = token.type === 'unit' ? 'A unit belongs behind a number.' : `Unexpected "${token.text}".`
      report(message, token.at)
      if (peek().type !== 'end') tree = expression(0)
    }
    return { tree: problems.length > 0 ? null : tree, problems }
  } catch (error) {
    if (!(error instanceof TooDeep)) throw error
    return { tree: null, problems }
  }
}

const parsed = new Map<string, Tree>()

/** The tree of a formula that the program itself holds; a problem in it is a programmer's mistake and throws. */
export const formulaTree = (text: string): Tree => {
  const known = parsed.get(text)
  if (known) return known
  const { tree, problems } = parseFormula(text)
  if (!tree)
    throw new Error(
      `formula "${text}": ${problems.map(({ message, at }) => `${message} (column ${at.start + 1})`).join(' ')}`,
    )
  parsed.set(text, tree)
  return tree
}
