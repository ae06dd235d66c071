import { engineeringCodes, sizeSpec, vocabulary } from '@coldfill/sizing'
import {
  actionsAt,
  applyEdits,
  completionsAt,
  definitionAt,
  findingCodes,
  foldsOf,
  formatSpec,
  hoverAt,
  mend,
  outlineOf,
  readSpec,
  renameAt,
  specChanges,
  usesOf,
} from '@coldfill/spec'

const known = new Set([...Object.keys(findingCodes), ...Object.keys(engineeringCodes)])

const assert = (holds: boolean, message: string): void => {
  if (!holds) throw new Error(message)
}

/** What is asked of a text besides reading it. */
const asked: Readonly<Record<string, (text: string, at: number) => void>> = {
  format: (text) => {
    const tidy = formatSpec(text)
    assert(formatSpec(tidy) === tidy, 'formatting twice is not formatting once')
    const changes = specChanges(text, tidy)
    assert(changes === null || changes.length === 0, `formatting changes ${changes?.[0]?.path}`)
  },
  complete: (text, at) => {
    completionsAt(text, at, vocabulary)
    hoverAt(text, at, vocabulary)
  },
  structure: (text) => {
    outlineOf(text)
    for (const { start, end } of foldsOf(text)) assert(end > start, 'a fold ends before it begins')
  },
  names: (text, at) => {
    definitionAt(text, at, vocabulary)
    const uses = usesOf(text, at, vocabulary)
    const renaming = uses && renameAt(text, at, 'RENAMED-1', vocabulary)
    if (!renaming?.ok) return
    const { tree } = readSpec(applyEdits(text, renaming.edits), vocabulary)
    assert(tree !== null, 'a renaming breaks the text')
  },
  act: (text, at) => {
    const { findings } = readSpec(text, vocabulary)
    for (const { edits, title } of actionsAt(text, at, findings, vocabulary))
      assert(applyEdits(text, edits) !== text, `${title} does nothing`)
  },
  mend: (text) => {
    const wanted = ({ severity }: { severity: string }): boolean => severity === 'error'
    const find = (each: string) => readSpec(each, vocabulary).findings
    mend(text, find, wanted)
  },
  size: (text) => {
    for (const { code } of sizeSpec(text).findings) assert(known.has(code), `${code} is no code`)
  },
}

const names = Object.keys(asked)

/** Reads a text, asks one more thing of it, and throws where something does not hold. */
export const withstand = (text: string, index: number): void => {
  const { findings, model, lineIndex } = readSpec(text, vocabulary)
  assert(model !== null || findings.some(({ severity }) => severity === 'error'), 'no model and no error')
  for (const { code, range, message, hint } of findings) {
    assert(known.has(code), `${code} is no code`)
    assert(message !== '' && hint !== '', `${code} says nothing`)
    const [start, end] = [lineIndex.offset(range.start), lineIndex.offset(range.end)]
    assert(0 <= start && start <= end && end <= text.length, `${code} has its range outside the text`)
  }
  const name = names[index % names.length] ?? 'size'
  try {
    asked[name]?.(text, (index * 7919) % (text.length + 1))
  } catch (error) {
    throw new Error(`${name}: ${error instanceof Error ? error.message : String(error)}`, { cause: error })
  }
}
