import { cpSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { PGlite } from '@electric-sql/pglite'
import { sql } from 'drizzle-orm'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { migratedDatabase } from '../testing/migrated-template.ts'
import { type Database, databaseOver } from './client.ts'
import { migrate, MigrationMismatch, migrationsFolder } from './migrate.ts'

interface Journal {
  entries: { idx: number; when: number; tag: string; version: string; breakpoints: boolean }[]
}

let client: PGlite
let db: Database
let folder: string

beforeAll(async () => {
  client = await migratedDatabase()
  db = databaseOver(client)
})
afterAll(() => client.close())
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'coldfill-migrations-'))
  cpSync(migrationsFolder, folder, { recursive: true })
})
afterEach(() => rmSync(folder, { recursive: true }))

const journal = (): Journal => JSON.parse(readFileSync(join(folder, 'meta', '_journal.json'), 'utf8')) as Journal
const writeJournal = (changed: Journal): void =>
  writeFileSync(join(folder, 'meta', '_journal.json'), JSON.stringify(changed))
const add = (tag: string, when: number, statement: string): void => {
  const { entries } = journal()
  writeFileSync(join(folder, `${tag}.sql`), statement)
  writeJournal({
    ...journal(),
    entries: [...entries, { idx: entries.length, when, tag, version: '7', breakpoints: true }],
  })
}
const last = () => {
  const entry = journal().entries.at(-1)
  if (!entry) throw new Error('There are no migrations.')
  return entry
}

describe('migrations at the start', () => {
  it('are those in drizzle/, all of them, and running them again changes nothing', async () => {
    await migrate(db, folder)
    const { rows } = await db.execute<{ count: number }>(
      sql`select count(*)::int as count from drizzle.__drizzle_migrations`,
    )
    expect(rows[0]?.count).toBe(journal().entries.length)
    expect(readdirSync(folder).filter((name) => name.endsWith('.sql'))).toHaveLength(journal().entries.length)
  })

  it('stop where a migration that was run has been changed', async () => {
    const { tag } = last()
    writeFileSync(join(folder, `${tag}.sql`), `${readFileSync(join(folder, `${tag}.sql`), 'utf8')}\n-- more`)
    await expect(migrate(db, folder)).rejects.toThrow(`Migration ${tag} was changed`)
  })

  it('stop where one is dated before its forerunner, which the migrator would pass over in silence', async () => {
    add('9998_early', last().when - 1, 'create table "too_early" ("id" integer);')
    await expect(migrate(db, folder)).rejects.toThrow(MigrationMismatch)
    const { rows } = await db.execute<{ there: string | null }>(sql`select to_regclass('too_early')::text as there`)
    expect(rows[0]?.there).toBeNull()
  })

  it('stop where the database was made by a newer version', async () => {
    writeJournal({ ...journal(), entries: journal().entries.slice(0, -1) })
    await expect(migrate(db, folder)).rejects.toThrow('a newer version of the program made it')
  })

  it('leave nothing behind where one of them fails', async () => {
    add('9999_broken', last().when + 1, 'create table "half" ("id" integer);\n--> statement-breakpoint\nnonsense;')
    await expect(migrate(db, folder)).rejects.toThrow(/nonsense/)
    const { rows } = await db.execute<{ there: string | null }>(sql`select to_regclass('half')::text as there`)
    expect(rows[0]?.there).toBeNull()
  })
})
