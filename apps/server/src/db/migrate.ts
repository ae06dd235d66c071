import { createHash } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { sql } from 'drizzle-orm'
import { migrate as applyMigrations } from 'drizzle-orm/pglite/migrator'
import { z } from 'zod'
import type { Database } from './client.ts'

const Journal = z.object({ entries: z.array(z.object({ tag: z.string(), when: z.number() })) })

/** Folder of the generated SQL. */
export const migrationsFolder = fileURLToPath(new URL('../../../../drizzle', import.meta.url))

/** The database and the migrations of this program do not belong together. Nothing was changed. */
export class MigrationMismatch extends Error {}

interface Migration {
  readonly tag: string
  readonly when: number
  readonly hash: string
}

const readMigrations = (folder: string): Migration[] =>
  Journal.parse(JSON.parse(readFileSync(`${folder}/meta/_journal.json`, 'utf8'))).entries.map(({ tag, when }) => ({
    tag,
    when,
    hash: createHash('sha256')
      .update(readFileSync(`${folder}/${tag}.sql`, 'utf8'))
      .digest('hex'),
  }))

const appliedHashes = async (db: Database): Promise<string[]> => {
  const { rows } = await db.execute<{ there: string | null }>(
    sql`select to_regclass('drizzle.__drizzle_migrations')::text as there`,
  )
  if (rows[0]?.there == null) return []
  const applied = await db.execute<{ hash: string }>(sql`select hash from drizzle.__drizzle_migrations order by id`)
  return applied.rows.map((row) => row.hash)
}

const compare = (migrations: readonly Migration[], applied: readonly string[]): void => {
  if (applied.length > migrations.length)
    throw new MigrationMismatch(
      `The database has ${applied.length} migrations, this program knows ${migrations.length}: a newer version of the program made it. Start that version.`,
    )
  for (const [index, hash] of applied.entries())
    if (migrations[index]?.hash !== hash)
      throw new MigrationMismatch(
        `Migration ${migrations[index]?.tag ?? index} was changed after the database had run it. Restore the file in drizzle/ as it was and add a new migration instead.`,
      )
}

/**
 * Brings the database up to the migrations of this program. The migrator only looks at the time stamps in the journal: it passes over
 * an entry that is older than the newest one applied, and does not notice a changed file. So order, number and content are checked.
 * @throws {MigrationMismatch}
 */
export const migrate = async (db: Database, folder: string = migrationsFolder): Promise<void> => {
  const migrations = readMigrations(folder)
  for (const [index, migration] of migrations.entries())
    if (index > 0 && migration.when <= (migrations[index - 1]?.when ?? 0))
      throw new MigrationMismatch(
        `Migration ${migration.tag} is dated before the one in front of it and would be passed over. Generate it again.`,
      )
  compare(migrations, await appliedHashes(db))
  await applyMigrations(db, { migrationsFolder: folder })
  const applied = await appliedHashes(db)
  compare(migrations, applied)
  if (applied.length !== migrations.length)
    throw new MigrationMismatch(`Only ${applied.length} of ${migrations.length} migrations were run.`)
}
