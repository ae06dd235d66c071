import { unitsFor } from './convert.ts'
import type { Kind } from './kind.ts'

const USUAL: Partial<Record<Kind, readonly string[]>> = {
  ratio: ['%'],
  count: [],
  length: ['ft', 'm'],
  diameter: ['in', 'mm'],
  volume: ['gal', 'L', 'm3'],
  temperature: ['°F', '°C'],
  'temperature difference': ['°F', 'K'],
  'gauge pressure': ['psi', 'bar', 'kPa'],
  'absolute pressure': ['psia', 'bar abs', 'kPa abs'],
  'pressure difference': ['psi', 'bar', 'kPa'],
  power: ['MBH', 'kW', 'Btu/h', 'ton'],
  energy: ['Btu', 'kWh'],
  flow: ['gpm', 'L/s', 'm3/h'],
  'hourly flow': ['gph', 'L/h'],
  time: ['min', 's', 'h'],
}

/** Spellings of the units in which people mostly write a kind, for suggestions and completion. */
export const usualUnits = (kind: Kind): readonly string[] =>
  USUAL[kind] ??
  unitsFor(kind)
    .slice(0, 3)
    .map((unit) => unit.symbol)

const WORDS: Partial<Record<Kind, string>> = {
  ratio: 'percentage',
  count: 'number',
  'hourly flow': 'flow',
}

/** What a reader calls a kind: `gauge pressure`, `flow`. */
export const kindName = (kind: Kind): string => WORDS[kind] ?? kind

/** The same with its article: `a gauge pressure`, `an area`. */
export const kindInWords = (kind: Kind): string => {
  const words = kindName(kind)
  return `${/^[aeiou]/u.test(words) ? 'an' : 'a'} ${words}`
}

/** `a percentage or a pressure difference` */
export const kindsInWords = (kinds: readonly Kind[]): string => [...new Set(kinds.map(kindInWords))].join(' or ')
