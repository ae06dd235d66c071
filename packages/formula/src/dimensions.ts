import type { Kind } from '@coldfill/units'
import { builtin, constant } from './builtins.ts'
import { compile } from './evaluate.ts'
import type { Scope } from './function.ts'
import {
  CONDITION,
  type Meaning,
  RATIO,
  alike,
  inWords,
  isAbsolute,
  isPressure,
  isRatio,
  meaningOfKind,
  product,
  sameDimensions,
} from './meaning.ts'
import { symbolsIn } from './symbols-in.ts'
import type { FormulaProblem, Tree } from './tree.ts'
import { literalUnit } from './unit-literal.ts'

type Binary = Extract<Tree, { type: 'binary' }>
type Call = Extract<Tree, { type: 'call' }>
/** A rule gives the meaning of the whole, or the sentence that says why there is none. */
type Outcome = Meaning | string

const READING = meaningOfKind('temperature')
const ABSOLUTE = meaningOfKind('absolute pressure')
const GAUGE = meaningOfKind('gauge pressure')

const needsNumbers = 'A condition has no place in arithmetic; write when(condition, a, b).'

/** Readings against a conventional zero and absolute pressures, added to or subtracted from one another. */
const sum = (adds: boolean, a: Meaning, b: Meaning): Outcome => {
  if (a.sort === 'condition' || b.sort === 'condition') return needsNumbers
  if (!sameDimensions(a, b)) {
    return adds
      ? `${inWords(a)} and ${inWords(b)} cannot be added.`
      : `${inWords(b)} cannot be subtracted from ${inWords(a)}.`
  }
  if (!isPressure(a) && a.sort === 'plain' && b.sort === 'plain') {
    return {
      ...a,
      absolutes: adds ? Math.max(a.absolutes, b.absolutes) : a.absolutes === b.absolutes ? 0 : a.absolutes,
    }
  }
  const rank = (meaning: Meaning): string => (isAbsolute(meaning) ? 'absolute' : meaning.sort)
  const [left, right] = [rank(a), rank(b)]
  if (right === 'plain') return a
  if (left === 'plain' && adds) return b
  if (left === right && !adds) return { ...a, absolutes: 0, sort: 'plain' }
  if (left === right) {
    return left === 'temperature point'
      ? 'Two temperature readings cannot be added; one of them must be a difference.'
      : `Two ${left === 'absolute' ? 'absolute' : 'gauge'} pressures cannot be added; one of them must be a pressure difference.`
  }
  if (left !== 'plain') return 'A gauge and an absolute pressure do not mix; write absolute(p, p_a) or gauge(P, p_a).'
  return `${inWords(b)} cannot be subtracted from ${inWords(a)}.`
}

const productOf = (divides: boolean, a: Meaning, b: Meaning): Outcome => {
  if (a.sort === 'condition' || b.sort === 'condition') return needsNumbers
  if (a.sort === 'temperature point' || b.sort === 'temperature point') {
    return 'A temperature reading cannot be multiplied or divided, as its zero is a convention; take a difference first.'
  }
  if (a.sort === 'gauge pressure' && isRatio(b)) return a
  if (b.sort === 'gauge pressure' && isRatio(a) && !divides) return b
  if (a.sort === 'gauge pressure' || b.sort === 'gauge pressure') {
    return 'A gauge pressure cannot be multiplied or divided here; write absolute(p, p_a), or take a difference first.'
  }
  return product(a, b, divides ? -1 : 1)
}

/**
 * Checks that a formula means something: that what is added has the same dimensions, that thermometer readings,
 * temperature differences, gauge readings and absolute pressures are kept apart, and that every name is known. With
 * `expected`, that the value is of that kind. Reports every mistake once, with its columns.
 */
export const checkDimensions = (tree: Tree, scope: Scope, expected?: Kind): { problems: FormulaProblem[] } => {
  const problems: FormulaProblem[] = []
  /** Null stands for a part already reported. */
  const settle = (node: Tree, outcome: Outcome | null): Meaning | null => {
    if (typeof outcome !== 'string') return outcome
    problems.push({ message: outcome.replace(/^a(?=n? )/, 'A'), at: node.at })
    return null
  }

  const exponentOf = (node: Binary): Outcome | null => {
    const base = meaning(node.left)
    const exponent = meaning(node.right)
    if (!base || !exponent) return null
    if (!isRatio(exponent)) return settle(node.right, `An exponent is a pure number, not ${inWords(exponent)}.`)
    if (base.sort !== 'plain') return base.sort === 'condition' ? needsNumbers : productOf(false, base, base)
    if (isRatio(base)) return RATIO
    if (symbolsIn(node.right).length > 0)
      return settle(node.right, 'The exponent of a quantity with a unit must be a fixed number.')
    return product(RATIO, base, compile(node.right, scope.functions)({}))
  }

  const same = (node: Tree, args: readonly Tree[], met: readonly (Meaning | null)[]): Outcome | null => {
    const first = met.find((found) => found !== null)
    if (!first) return null
    const other = met.findIndex((found) => found !== null && !alike(found, first))
    if (other >= 0)
      return settle(args[other]!, `${inWords(met[other]!)} stands beside ${inWords(first)}; both must be of one kind.`)
    return met.includes(null) ? null : first
  }

  const takes = (
    node: Call,
    met: readonly (Meaning | null)[],
    wanted: readonly Meaning[],
    result: Meaning,
  ): Meaning => {
    wanted.forEach((want, index) => {
      const found = met[index]
      if (found && !alike(found, want))
        settle(node.args[index]!, `${node.name}() takes ${inWords(want)} here, not ${inWords(found)}.`)
    })
    return result
  }

  const call = (node: Call): Outcome | null => {
    const met = node.args.map(meaning)
    const own = Object.hasOwn(scope.functions, node.name) ? scope.functions[node.name] : undefined
    if (own && !builtin(node.name)) {
      const count = own.parameters.length
      if (count !== met.length)
        return `${node.name}() takes ${count} value${count === 1 ? '' : 's'}, not ${met.length}.`
      return takes(node, met, own.parameters.map(meaningOfKind), meaningOfKind(own.result))
    }
    const [first] = met
    switch (node.name) {
      case 'min':
      case 'max':
        return met.some((found) => found?.sort === 'condition') ? needsNumbers : same(node, node.args, met)
      case 'when':
        takes(node, met, [CONDITION], RATIO)
        return same(node, node.args.slice(1), met.slice(1))
      case 'absolute':
        return takes(node, met, [GAUGE, ABSOLUTE], ABSOLUTE)
      case 'gauge':
        return takes(node, met, [ABSOLUTE, ABSOLUTE], GAUGE)
      case 'celsius':
      case 'fahrenheit':
        return takes(node, met, [READING], RATIO)
      case 'abs':
      case 'sqrt':
        if (!first) return null
        if (node.name === 'abs' && first.sort === 'gauge pressure') return first
        if (first.sort !== 'plain') return `${node.name}() takes a quantity with a true zero, not ${inWords(first)}.`
        return node.name === 'abs' ? first : product(RATIO, first, 0.5)
      default:
        if (!builtin(node.name)) return `The function "${node.name}" is not known.`
        return takes(node, met, [RATIO], RATIO)
    }
  }

  const meaning = (node: Tree): Meaning | null => {
    switch (node.type) {
      case 'number': {
        const unit = node.unit === undefined ? undefined : literalUnit(node.unit)
        return unit ? meaningOfKind(unit.kind) : RATIO
      }
      case 'symbol': {
        if (constant(node.name) !== undefined) return RATIO
        const kind = Object.hasOwn(scope.symbols, node.name) ? scope.symbols[node.name] : undefined
        return settle(node, kind ? meaningOfKind(kind) : `The symbol "${node.name}" is not known.`)
      }
      case 'negate': {
        const operand = meaning(node.operand)
        return operand && settle(node, productOf(false, RATIO, operand))
      }
      case 'compare': {
        const sides = [node.left, node.right]
        const met = sides.map(meaning)
        if (met.some((side) => side?.sort === 'condition')) return settle(node, 'A condition cannot be compared.')
        same(node, sides, met)
        return CONDITION
      }
      case 'call':
        return settle(node, call(node))
      case 'binary':
      default: {
        if (node.operator === '^') return settle(node, exponentOf(node))
        const [a, b] = [meaning(node.left), meaning(node.right)]
        if (!a || !b) return null
        const { operator } = node
        return settle(
          node,
          operator === '+' || operator === '-' ? sum(operator === '+', a, b) : productOf(operator === '/', a, b),
        )
      }
    }
  }

  const whole = meaning(tree)
  if (whole && expected !== undefined) {
    const wanted = meaningOfKind(expected)
    if (!alike(whole, wanted)) settle(tree, `The formula gives ${inWords(whole)}, not ${inWords(wanted)}.`)
  }
  return { problems }
}
