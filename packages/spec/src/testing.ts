import type { FindingCode } from './diagnostics.ts'
import type { Finding } from './finding.ts'
import type { Vocabulary } from './model/spec-model.ts'
import { readSpec, type SpecReading } from './read-spec.ts'

const inches = (...sizes: string[]): Vocabulary['pipes'][string] =>
  sizes.map((size) => ({ size: `${size} in`, spellings: [`${size}"`, size] }))

/** A small vocabulary for tests of the language: a few names of each sort, none of which carries a value that is sized with. */
export const testVocabulary: Vocabulary = {
  pipes: {
    'copper type L': [
      ...inches('3/4', '1', '1-1/4', '1-1/2'),
      { size: '2 in', spellings: ['2"', 'DN 50', 'DN50'] },
      ...inches('2-1/2', '3', '4'),
    ],
    'steel schedule 40': inches('1', '1-1/4', '1-1/2', '2', '2-1/2', '3', '4', '6'),
    'copper EN 1057': [
      { size: '22 x 1 mm', spellings: ['22x1'] },
      { size: '28 x 1 mm', spellings: ['28x1'] },
      { size: '35 x 1.2 mm', spellings: ['35x1.2'] },
    ],
    'PEX SDR 9': inches('1/2', '3/4', '1'),
  },
  emitters: {
    convectors: '5 to 6 L/kW',
    'panel radiators': '9 to 11 L/kW',
    'air handlers and fan coils': '7 to 8 L/kW',
  },
  assumptions: {
    'relief-margin.hydronic': {
      name: 'margin below the relief valve',
      value: '10 %',
      because: 'Not stated.',
      kinds: ['ratio', 'pressure difference'],
    },
    'top-margin': {
      name: 'pressure kept at the top',
      value: '4 psi',
      because: 'Not stated.',
      kinds: ['gauge pressure'],
    },
    material: {
      name: 'material of most of the piping',
      value: 'steel',
      because: 'Not stated.',
      kinds: [],
      choices: ['steel', 'copper', 'none'],
    },
  },
  methods: {
    'expansion tank': { ashrae: 'gas law', 'en 12828': 'European standard', 'code minimum': 'legal floor' },
    'thermal expansion tank': { aspe: 'gas law' },
    'storage tank': { 'ashrae fixture': 'fixtures', 'aspe fixture': 'fixtures', 'recovery and storage': 'curve' },
    'buffer tank': { 'run time': 'least run time', 'en 303-5': 'solid fuel' },
    'pressure tank': { drawdown: 'given', 'run time': 'least run time', 'starts per hour': 'quarter cycle' },
  },
  kinds: ['expansion tank', 'thermal expansion tank', 'storage tank', 'buffer tank', 'pressure tank'],
  buildings: ['apartment house', 'hospital', 'hotel', 'office building'],
  fixtures: ['lavatory', 'bathtub', 'shower', 'kitchen sink', 'laundry tub', 'dishwasher'],
}

/** The text without its `‹|…|›` markers, and the part that they enclose. */
export const marked = (source: string): { readonly text: string; readonly start: number; readonly end: number } => {
  const start = source.indexOf('‹|')
  const end = source.indexOf('|›')
  if (start < 0 || end < start || source.indexOf('‹|', start + 1) >= 0)
    throw new Error('the text of a test marks one range, ‹|like this|›')
  const text = source.slice(0, start) + source.slice(start + 2, end) + source.slice(end + 2)
  return { text, start, end: end - 2 }
}

/** Removes the indentation that all lines of a template share, and the empty first line. */
export const dedent = (source: string): string => {
  const lines = source.replace(/^\n/u, '').split('\n')
  const indents = lines.filter((line) => line.trim() !== '').map((line) => /^ */u.exec(line)?.[0].length ?? 0)
  const common = Math.min(...indents)
  return lines.map((line) => line.slice(Math.min(common, /^ */u.exec(line)?.[0].length ?? 0))).join('\n')
}

const shown = (text: string, finding: Finding, reading: SpecReading): string => {
  const { start, end } = finding.range
  const part = text.slice(reading.lineIndex.offset(start), reading.lineIndex.offset(end))
  return `${finding.code} at ${start.line + 1}:${start.character + 1} on "${part}": ${finding.message}`
}

export interface ExpectedDiagnostic {
  readonly code: FindingCode
  /** How many more findings the one mistake may give; none where not said. */
  readonly more?: number | undefined
}

/**
 * Reads a spec with one seeded mistake between `‹|` and `|›` and throws unless the first finding has the code and that range,
 * and not more findings come than allowed. Returns the reading and the finding.
 */
export const expectDiagnostic = (
  source: string,
  { code, more = 0 }: ExpectedDiagnostic,
  vocabulary: Vocabulary = testVocabulary,
): { readonly reading: SpecReading; readonly finding: Finding; readonly text: string } => {
  const { text, start, end } = marked(source)
  const reading = readSpec(text, vocabulary)
  const finding = reading.findings.find((each) => each.code === code)
  const all = reading.findings.map((each) => shown(text, each, reading)).join('\n')
  if (!finding) throw new Error(`${code} was not found; found:\n${all || 'nothing'}`)
  const from = reading.lineIndex.offset(finding.range.start)
  const to = reading.lineIndex.offset(finding.range.end)
  if (from !== start || to !== end)
    throw new Error(`${code} underlines "${text.slice(from, to)}", not "${text.slice(start, end)}"; found:\n${all}`)
  if (reading.findings.length > 1 + more)
    throw new Error(`one mistake gives ${reading.findings.length} findings:\n${all}`)
  return { reading, finding, text }
}

/** Text of a spec after the first fix of a finding. */
export const fixed = (text: string, finding: Finding, reading: SpecReading): string => {
  const [fix] = finding.fixes
  if (!fix) throw new Error(`${finding.code} has no fix`)
  return fix.edits
    .toSorted((a, b) => reading.lineIndex.offset(b.range.start) - reading.lineIndex.offset(a.range.start))
    .reduce(
      (result, { range, text: put }) =>
        result.slice(0, reading.lineIndex.offset(range.start)) +
        put +
        result.slice(reading.lineIndex.offset(range.end)),
      text,
    )
}
