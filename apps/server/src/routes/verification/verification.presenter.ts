import type { Verification } from '@coldfill/contract'
import { casesNotRun, type VerificationRow, verificationRows } from '@coldfill/engine'
import { engineVersion } from '@coldfill/sizing'

const presentFigure = (row: VerificationRow): Verification['groups'][number]['figures'][number] => ({
  id: row.id,
  title: row.title,
  what: row.what,
  kind: row.kind,
  expected: row.shown.expected,
  computed: row.shown.computed,
  deviation: row.deviation,
  tolerance: row.tolerance,
  because: row.because,
  verdict: row.verdict,
  ...(row.reason === undefined ? {} : { reason: row.reason }),
  origin: row.origin,
})

const grouped = (rows: readonly VerificationRow[]): Verification['groups'] => {
  const groups = new Map<string, Verification['groups'][number]>()
  for (const row of rows) {
    const key = JSON.stringify([row.part, row.source])
    const group = groups.get(key) ?? { part: row.part, source: row.source, figures: [] }
    group.figures.push(presentFigure(row))
    groups.set(key, group)
  }
  return [...groups.values()]
}

/** Runs the verification manual. The same every time, so that whoever asks often keeps the answer. */
export const presentVerification = (): Verification => {
  const rows = verificationRows()
  const count = (verdict: VerificationRow['verdict']): number => rows.filter((row) => row.verdict === verdict).length
  return {
    engine: engineVersion,
    counts: { holds: count('holds'), fails: count('fails'), knownWrong: count('known wrong') },
    groups: grouped(rows),
    notRun: casesNotRun.map(({ id, title, reason }) => ({ id, title, reason })),
  }
}
