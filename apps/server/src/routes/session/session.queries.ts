import { eq } from 'drizzle-orm'
import type { Database, Reader } from '../../db/client.ts'
import { offices, users } from '../../db/schema/index.ts'

export const userByEmail = async (db: Reader, email: string) => {
  const [row] = await db
    .select({ user: users, office: offices })
    .from(users)
    .innerJoin(offices, eq(offices.id, users.officeId))
    .where(eq(users.email, email.trim().toLowerCase()))
  return row ?? null
}

export const noteSignIn = async (db: Database, userId: string, now: Date): Promise<void> => {
  await db.update(users).set({ lastSignInAt: now }).where(eq(users.id, userId))
}
