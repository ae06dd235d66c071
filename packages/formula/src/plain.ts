import type { Box } from './box.ts'
import type { Functions } from './evaluate.ts'
import { spelledOut } from './greek.ts'
import { layoutSymbol } from './layout-symbol.ts'

const LEVELS: Readonly<Record<string, number>> = { '<': 1, '≤': 1, '>': 1, '≥': 1, '=': 1, '+': 2, '−': 2, '·': 3 }

/** Where a linear text needs brackets that a fraction bar or a raised exponent stands for. */
const level = (box: Box): number => {
  if (box.box === 'fraction') return 3
  if (box.box === 'superscript') return 5
  if (box.box !== 'row') return 6
  return Math.min(
    6,
    ...box.items.map((item) =>
      item.box === 'operator' ? (LEVELS[item.text] ?? 6) : item.box === 'row' ? level(item) : 6,
    ),
  )
}
const grouped = (box: Box, least: number): string => (level(box) < least ? `(${toPlainText(box)})` : toPlainText(box))

const powerOfTen = (box: Box): { mantissa: string; exponent: string } | null => {
  if (box.box !== 'row') return null
  const [mantissa, times, power] = box.items
  if (mantissa?.box !== 'number' || times?.box !== 'operator' || times.text !== '×' || power?.box !== 'superscript')
    return null
  return { mantissa: mantissa.text, exponent: toPlainText(power.sup).replace('−', '-') }
}

const items = (list: readonly Box[]): string =>
  list
    .map((item, index) => {
      const before = list[index - 1]
      if (item.box === 'word' && /^\s/.test(item.text)) return `[${item.text.trim()}]`
      if (item.box === 'operator') return item.text === ',' ? ', ' : index === 0 ? item.text : ` ${item.text} `
      if (item.box === 'fraction' && before?.box === 'operator' && before.text === '·') return `(${toPlainText(item)})`
      return toPlainText(item)
    })
    .join('')

/** One line of text that `parseFormula` reads back: a fraction and an exponent get the brackets they need. */
export const toPlainText = (box: Box): string => {
  switch (box.box) {
    case 'identifier':
    case 'word':
    case 'number':
    case 'operator':
      return box.text
    case 'row': {
      const power = powerOfTen(box)
      return power ? `${power.mantissa}e${power.exponent}` : items(box.items)
    }
    case 'fraction':
      return `${grouped(box.top, 3)} / ${grouped(box.bottom, 4)}`
    case 'subscript': {
      const base = toPlainText(box.base)
      const sub = toPlainText(box.sub)
      if (sub === '°C' || sub === '°F') {
        const inside = box.base.box === 'fence' && box.base.open === '(' ? base : `(${base})`
        return `${sub === '°C' ? 'celsius' : 'fahrenheit'}${inside}`
      }
      return box.base.box === 'word' ? base + sub : `${base}_${sub.replaceAll(',', '_')}`
    }
    case 'superscript':
      return `${toPlainText(box.base)}^${grouped(box.sup, 6)}`
    case 'radical':
      return `sqrt(${toPlainText(box.inside)})`
    case 'fence':
      return box.open === '|' ? `abs(${toPlainText(box.inside)})` : `(${toPlainText(box.inside)})`
    case 'cases':
    default: {
      const [first, ...rest] = box.cases
      if (!first?.condition) return first ? toPlainText(first.value) : ''
      return `when(${toPlainText(first.condition)}, ${toPlainText(first.value)}, ${toPlainText({ box: 'cases', cases: rest })})`
    }
  }
}

const SAID: Readonly<Record<string, string>> = {
  '+': 'plus',
  '−': 'minus',
  '·': 'times',
  '×': 'times',
  '=': 'equals',
  '<': 'is less than',
  '>': 'is greater than',
  '≤': 'is at most',
  '≥': 'is at least',
  ',': 'and',
  min: 'the least of',
  max: 'the greatest of',
  ln: 'the natural logarithm of',
  exp: 'the exponential of',
  ceil: 'round up',
  floor: 'round down',
  '°C': 'in degrees Celsius',
  '°F': 'in degrees Fahrenheit',
}

/** The drawing in words, for a screen reader: a fraction says where it begins and ends, a fluid property is named in full. */
export const spoken = (box: Box, functions: Functions = {}): string => {
  const say = (part: Box): string => spoken(part, functions)
  /** A part in more than one word is closed by a word, so that the ear knows where it ends. */
  const closed = (text: string, end: string): string => (text.includes(' ') ? `${text}, ${end}` : text)
  switch (box.box) {
    case 'identifier':
      return spelledOut(box.text)
    case 'word':
    case 'number':
    case 'operator':
      return SAID[box.text] ?? box.text.trim()
    case 'row': {
      const [head, inside] = box.items
      if (box.items.length === 2 && head && inside?.box === 'fence') {
        const drawing = JSON.stringify(head)
        const called = Object.values(functions).find(({ symbol }) => JSON.stringify(layoutSymbol(symbol)) === drawing)
        if (called) return `${called.words} ${closed(say(inside.inside), 'end')}`
        if (head.box !== 'operator') return `${say(head)} ${closed(say(inside.inside), 'end')}`
      }
      return box.items.map(say).join(' ')
    }
    case 'fraction': {
      const [top, bottom] = [say(box.top), say(box.bottom)]
      return `${top} ${top.includes(' ') ? 'all ' : ''}over ${closed(bottom, 'end of fraction')}`
    }
    case 'subscript': {
      const sub = say(box.sub)
      return box.sub.box === 'word' && box.sub.text.startsWith('°')
        ? `${say(box.base)} ${sub}`
        : `${say(box.base)} sub ${sub}`
    }
    case 'superscript': {
      const power = say(box.sup)
      return `${say(box.base)} ${power === '2' ? 'squared' : power === '3' ? 'cubed' : `to the power ${closed(power, 'end of power')}`}`
    }
    case 'radical':
      return `the square root of ${closed(say(box.inside), 'end of root')}`
    case 'fence':
      return box.open === '|'
        ? `the magnitude of ${closed(say(box.inside), 'end')}`
        : `open bracket ${say(box.inside)} close bracket`
    case 'cases':
    default:
      return box.cases
        .map(({ value, condition }) => (condition ? `${say(value)} if ${say(condition)}` : `otherwise ${say(value)}`))
        .join(', ')
  }
}
