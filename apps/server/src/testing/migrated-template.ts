import { createHash } from 'node:crypto'
import { readFileSync, renameSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { PGlite } from '@electric-sql/pglite'
import { databaseOver } from '../db/client.ts'
import { migrate, migrationsFolder } from '../db/migrate.ts'

/** Changes with every migration, with the version of Node and with the build of the database. */
const key = (): string => {
  const hash = createHash('sha256').update(process.version)
  hash.update(readFileSync(new URL(import.meta.resolve('@electric-sql/pglite'))))
  const journal = readFileSync(join(migrationsFolder, 'meta', '_journal.json'), 'utf8')
  hash.update(journal)
  for (const { tag } of (JSON.parse(journal) as { entries: { tag: string }[] }).entries)
    hash.update(readFileSync(join(migrationsFolder, `${tag}.sql`)))
  return hash.digest('hex').slice(0, 24)
}

/**
 * A database in memory with all migrations run. Making one from nothing takes seconds, so that the first is kept as a template for the
 * others. The caller closes it: an instance made from a template keeps the process running.
 */
export const migratedDatabase = async (): Promise<PGlite> => {
  const file = join(tmpdir(), `coldfill-template-${key()}.tar`)
  let template: Buffer | null = null
  try {
    template = readFileSync(file)
  } catch {
    // Made below.
  }
  if (template) return PGlite.create({ loadDataDir: new Blob([Uint8Array.from(template)]) })
  const client = await PGlite.create()
  await migrate(databaseOver(client))
  const dump = await client.dumpDataDir('none')
  const mine = `${file}.${process.pid}`
  writeFileSync(mine, new Uint8Array(await dump.arrayBuffer()))
  renameSync(mine, file)
  return client
}
