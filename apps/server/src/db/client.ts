import { PGlite } from '@electric-sql/pglite'
import { NodeFS } from '@electric-sql/pglite/nodefs'
import { drizzle, type PgliteDatabase } from 'drizzle-orm/pglite'
import { guardOuterUse } from './with-tx.ts'
import * as schema from './schema/index.ts'

export type Schema = typeof schema
/** The database outside a transaction. Using it inside one throws (see with-tx.ts). */
export type Database = PgliteDatabase<Schema>
export type Tx = Parameters<Parameters<Database['transaction']>[0]>[0]
/** What a query needs: it runs in a transaction or out of one. */
export type Reader = Pick<Database, 'select' | 'selectDistinctOn' | 'query'>

export interface OpenDatabase {
  readonly client: PGlite
  readonly db: Database
}

/** A database over a running PGlite. */
export const databaseOver = (client: PGlite): Database => guardOuterUse(drizzle(client, { schema }))

/**
 * Opens the database in a folder, making it where there is none. The caller holds the lock of the folder: PGlite itself lets two
 * processes in, and then loses commits of one of them without a word.
 */
export const openDatabase = async (folder: string): Promise<OpenDatabase> => {
  const client = await PGlite.create({ fs: new NodeFS(folder) })
  return { client, db: databaseOver(client) }
}
