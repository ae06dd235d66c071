import type { ProjectResult } from '@coldfill/sizing'
import { and, desc, eq, lte } from 'drizzle-orm'
import type { Reader } from '../db/client.ts'
import { assumptionChanges, users } from '../db/schema/index.ts'

export interface AssumptionChange {
  readonly assumption: string
  readonly by: string
  readonly at: Date
}

/** Who put the values of a result in the place of defaults, as far as it was written down; `until` is when the text was frozen. */
export const changedAssumptions = async (
  db: Reader,
  projectId: string,
  { assumptions }: Pick<ProjectResult, 'assumptions'>,
  until: Date | null,
): Promise<readonly AssumptionChange[]> => {
  const overridden = assumptions.filter((assumption) => assumption.overridden)
  if (overridden.length === 0) return []
  const rows = await db
    .select({
      assumption: assumptionChanges.assumption,
      value: assumptionChanges.value,
      reason: assumptionChanges.reason,
      at: assumptionChanges.changedAt,
      by: users.name,
    })
    .from(assumptionChanges)
    .innerJoin(users, eq(users.id, assumptionChanges.changedBy))
    .where(and(eq(assumptionChanges.projectId, projectId), until ? lte(assumptionChanges.changedAt, until) : undefined))
    .orderBy(desc(assumptionChanges.id))
  return overridden.flatMap(({ id, value, reason = '' }) => {
    const found = rows.find((row) => row.assumption === id && row.value === value && row.reason === reason)
    return found ? [{ assumption: id, by: found.by, at: found.at }] : []
  })
}
