import type { Finding, Fix } from '../finding.ts'
import type { Vocabulary } from '../model/spec-model.ts'
import { readSpec } from '../read-spec.ts'
import { applyEdits, canStandTogether, type ChangedLines, changedLines } from './edits.ts'

export interface MendedFinding {
  readonly finding: Finding
  readonly fix: Fix
  /** What the fix did to the lines of the text that it was made in. */
  readonly changes: readonly ChangedLines[]
}

export interface Mending {
  readonly text: string
  /** In the order in which they were made. */
  readonly mended: readonly MendedFinding[]
  /** Findings of the mended text that were asked for and are left. */
  readonly left: readonly Finding[]
}

/** The first fix that puts in nothing that the author has not said. */
export const sureFix = (finding: Finding): Fix | undefined => finding.fixes.find(({ guess }) => !guess)

const MOST_PASSES = 100

/** A finding that comes back to its line so often is not mended by its fix. */
const MOST_TRIES = 3

const placeOf = ({ code, range }: Finding): string => `${code} ${range.start.line}`

interface Taken {
  readonly finding: Finding
  readonly fix: Fix
}

/** The sure fixes that can be made together, in the order of the findings. */
const fixesOf = (text: string, findings: readonly Finding[]): readonly Taken[] => {
  const all = findings.flatMap((finding) => {
    const fix = sureFix(finding)
    return fix ? [{ finding, fix }] : []
  })
  const together = canStandTogether(
    text,
    all.flatMap(({ fix }) => fix.edits),
  )
  if (together) return all
  const taken: Taken[] = []
  for (const each of all)
    if (canStandTogether(text, [...taken.flatMap(({ fix }) => fix.edits), ...each.fix.edits])) taken.push(each)
  return taken
}

/**
 * Makes the first sure fix of each finding that is wanted, and reads the text again, until nothing changes. Fixes that touch
 * each other wait for the next reading.
 */
export const mend = (
  text: string,
  findingsOf: (text: string) => readonly Finding[],
  wanted: (finding: Finding) => boolean,
): Mending => {
  const mended: MendedFinding[] = []
  const seen = new Set([text])
  const tries = new Map<string, number>()
  let now = text
  for (let pass = 0; pass < MOST_PASSES; pass++) {
    const open = findingsOf(now).filter(wanted)
    const taken = fixesOf(now, open).filter(({ finding }) => (tries.get(placeOf(finding)) ?? 0) < MOST_TRIES)
    for (const place of new Set(taken.map(({ finding }) => placeOf(finding))))
      tries.set(place, (tries.get(place) ?? 0) + 1)
    const next = applyEdits(
      now,
      taken.flatMap(({ fix }) => fix.edits),
    )
    // A text that comes back would go round for ever.
    if (seen.has(next)) return { text: now, mended, left: open }
    seen.add(next)
    const before = now
    for (const { finding, fix } of taken) mended.push({ finding, fix, changes: changedLines(before, fix.edits) })
    now = next
  }
  return { text: now, mended, left: findingsOf(now).filter(wanted) }
}

/** Mends every finding of one code that has a sure fix. */
export const fixAll = (text: string, code: string, vocabulary: Vocabulary): Mending =>
  mend(
    text,
    (each) => readSpec(each, vocabulary).findings,
    (finding) => finding.code === code,
  )
