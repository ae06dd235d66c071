import type { ProjectResult } from '@coldfill/sizing'
import { desc, eq } from 'drizzle-orm'
import type { Tx } from '../db/client.ts'
import { assumptionChanges } from '../db/schema/index.ts'

/** Writes down which defaults a saved text replaces that the text before it did not, and which it leaves alone again. */
export const noteAssumptionChanges = async (
  tx: Tx,
  projectId: string,
  { assumptions }: Pick<ProjectResult, 'assumptions'>,
  by: string,
  at: Date,
): Promise<void> => {
  const rows = await tx
    .selectDistinctOn([assumptionChanges.assumption])
    .from(assumptionChanges)
    .where(eq(assumptionChanges.projectId, projectId))
    .orderBy(assumptionChanges.assumption, desc(assumptionChanges.id))
  const standing = new Map(rows.map((row) => [row.assumption, row]))
  const changes = assumptions.flatMap(({ id, overridden, value, reason = '' }) => {
    const before = standing.get(id)
    const now = overridden ? { value, reason } : { value: null, reason: '' }
    return (before?.value ?? null) === now.value && (before?.reason ?? '') === now.reason
      ? []
      : [{ projectId, assumption: id, ...now, changedAt: at, changedBy: by }]
  })
  if (changes.length > 0) await tx.insert(assumptionChanges).values(changes)
}
