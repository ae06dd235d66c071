import { isKind, unitLabel, type UnitSystem } from '@coldfill/units'
import { displayNumber, numberText, sentenceCase } from '@coldfill/presentation'
import { revisionWords, type ChangedEntry } from '../document-options.ts'

/** Shown digits of a result that changed. */
const DIGITS = 4

/** Heading of a comparison: `Changes since Rev A`. */
export const comparisonTitle = (revision: string): string =>
  `Changes since ${revision === '' ? 'the first issue' : revisionWords(revision)}`

/** A changed number in the unit of its kind; null for words. */
export const changedNumber = (
  value: ChangedEntry['was'],
  kind: string,
  units: UnitSystem,
): { value: number; unit: string } | null =>
  typeof value === 'number' && isKind(kind)
    ? { value: displayNumber(value, kind, units), unit: unitLabel(kind, units) }
    : null

/** One side of a change as it is read; a dash where there was nothing. */
export const changedWords = (value: ChangedEntry['was'], kind: string, units: UnitSystem): string => {
  const number = changedNumber(value, kind, units)
  if (number) return `${numberText(Number(number.value.toPrecision(DIGITS)))} ${number.unit}`.trimEnd()
  return value === null ? '—' : sentenceCase(String(value))
}

/** `+4.2 %`; empty where a percentage says nothing. */
export const changeInPercent = ({ was, now, kind }: ChangedEntry): string => {
  // A thermometer has no true zero, so a share of a reading on it means nothing.
  if (typeof was !== 'number' || typeof now !== 'number' || was === 0 || kind === 'temperature') return ''
  const percent = (now / was - 1) * 100
  return Number.isFinite(percent) ? `${percent > 0 ? '+' : ''}${numberText(Number(percent.toPrecision(3)))} %` : ''
}
