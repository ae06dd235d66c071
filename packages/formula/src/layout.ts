import type { Box } from './box.ts'
import type { Functions } from './evaluate.ts'
import { layoutNumber, layoutSymbol, operator, row, word } from './layout-symbol.ts'
import type { Tree } from './tree.ts'

export interface LayoutOptions {
  /** Texts drawn in place of symbols: a line with its numbers put in. A unit may stand behind the number. */
  readonly numbers?: Readonly<Record<string, string>>
  /** Functions beside the built-in ones, for the symbols they are drawn with. */
  readonly functions?: Functions
}

/** How tightly a drawn part holds together; a part that holds less than its place needs is put in brackets. */
const CASES = 0
const COMPARISON = 1
const SUM = 2
const NEGATIVE = 2.5
const PRODUCT = 3
const FRACTION = 4
const POWER = 5
const ATOM = 6

interface Drawn {
  readonly box: Box
  readonly level: number
}

const SIGNS: Readonly<Record<string, string>> = { '-': '−', '*': '·', '<=': '≤', '>=': '≥' }
const sign = (text: string): Box => operator(SIGNS[text] ?? text)
const fence = (inside: Box, open: '(' | '|' = '('): Box => ({
  box: 'fence',
  inside,
  open,
  close: open === '(' ? ')' : '|',
})
const held = ({ box, level }: Drawn, least: number): Box => (level < least ? fence(box) : box)

/**
 * The formula as boxes. Brackets are decided here and nowhere else: just those without which the drawing would read as
 * another formula. `absolute` and `gauge` are drawn as the sum and the difference they are.
 */
export const layout = (tree: Tree, options: LayoutOptions = {}): Box => {
  const chain = (left: Tree, sum: boolean, leftBox: Box, text: string, right: Box): Box => {
    const same =
      leftBox.box === 'row' &&
      (left.type === 'binary'
        ? sum
          ? left.operator === '+' || left.operator === '-'
          : left.operator === '*'
        : sum && left.type === 'call' && (left.name === 'absolute' || left.name === 'gauge'))
    return same ? row(...leftBox.items, sign(text), right) : row(leftBox, sign(text), right)
  }

  const drawSum = (left: Tree, text: '+' | '-', right: Tree): Drawn => ({
    box: chain(left, true, held(draw(left), SUM), text, held(draw(right), PRODUCT)),
    level: SUM,
  })

  const cases = (node: Tree): { value: Box; condition: Box | null }[] => {
    if (node.type !== 'call' || node.name !== 'when') return [{ value: draw(node).box, condition: null }]
    const [condition, taken, otherwise] = node.args
    return [{ value: held(draw(taken!), COMPARISON), condition: draw(condition!).box }, ...cases(otherwise!)]
  }

  const call = (node: Extract<Tree, { type: 'call' }>): Drawn => {
    const [first, second] = node.args
    switch (node.name) {
      case 'absolute':
        return drawSum(first!, '+', second!)
      case 'gauge':
        return drawSum(first!, '-', second!)
      case 'when':
        return { box: { box: 'cases', cases: cases(node) }, level: CASES }
      case 'sqrt':
        return { box: { box: 'radical', inside: draw(first!).box }, level: ATOM }
      case 'abs':
        return { box: fence(draw(first!).box, '|'), level: ATOM }
      case 'celsius':
      case 'fahrenheit': {
        const sub = word(node.name === 'celsius' ? '°C' : '°F')
        return { box: { box: 'subscript', base: held(draw(first!), ATOM), sub }, level: ATOM }
      }
      default: {
        const own =
          options.functions && Object.hasOwn(options.functions, node.name) ? options.functions[node.name] : undefined
        const head: Box =
          node.name === 'log10'
            ? { box: 'subscript', base: word('log'), sub: { box: 'number', text: '10' } }
            : own || node.name.includes('_')
              ? layoutSymbol(own?.symbol ?? node.name)
              : word(node.name)
        const args = node.args.flatMap((arg, index) => (index > 0 ? [operator(','), draw(arg).box] : [draw(arg).box]))
        return { box: row(head, fence(args.length === 1 ? args[0]! : row(...args))), level: ATOM }
      }
    }
  }

  const binary = (node: Extract<Tree, { type: 'binary' }>): Drawn => {
    const { left, right } = node
    switch (node.operator) {
      case '+':
      case '-':
        return drawSum(left, node.operator, right)
      case '*':
        return { box: chain(left, false, held(draw(left), NEGATIVE), '*', held(draw(right), FRACTION)), level: PRODUCT }
      case '/':
        return { box: { box: 'fraction', top: draw(left).box, bottom: draw(right).box }, level: FRACTION }
      case '^':
      default:
        return { box: { box: 'superscript', base: held(draw(left), ATOM), sup: draw(right).box }, level: POWER }
    }
  }

  const written = (text: string): Drawn => {
    const { box, kind } = layoutNumber(text)
    return { box, level: kind === 'negative' ? NEGATIVE : kind === 'compound' ? FRACTION : ATOM }
  }

  const draw = (node: Tree): Drawn => {
    switch (node.type) {
      case 'number':
        return written(node.unit === undefined ? node.text : `${node.text} ${node.unit}`)
      case 'symbol': {
        const text =
          options.numbers && Object.hasOwn(options.numbers, node.name) ? options.numbers[node.name] : undefined
        return text === undefined ? { box: layoutSymbol(node.name), level: ATOM } : written(text)
      }
      case 'negate':
        return { box: row(operator('−'), held(draw(node.operand), PRODUCT)), level: NEGATIVE }
      case 'binary':
        return binary(node)
      case 'compare':
        return {
          box: row(held(draw(node.left), SUM), sign(node.operator), held(draw(node.right), SUM)),
          level: COMPARISON,
        }
      case 'call':
      default:
        return call(node)
    }
  }

  return draw(tree).box
}

/** `left = right` */
export const equationBox = (left: Box, right: Box): Box => row(left, operator('='), right)
