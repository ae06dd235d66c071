import { eq } from 'drizzle-orm'
import type { Reader } from '../../db/client.ts'
import { specs, users } from '../../db/schema/index.ts'

export const savedSpec = async (db: Reader, projectId: string) => {
  const [row] = await db
    .select({
      text: specs.text,
      version: specs.version,
      savedAt: specs.savedAt,
      savedBy: { id: users.id, name: users.name, initials: users.initials },
    })
    .from(specs)
    .innerJoin(users, eq(users.id, specs.savedBy))
    .where(eq(specs.projectId, projectId))
  return row ?? null
}
