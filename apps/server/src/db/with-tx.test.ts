import type { PGlite } from '@electric-sql/pglite'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { migratedDatabase } from '../testing/migrated-template.ts'
import { type Database, databaseOver } from './client.ts'
import { offices } from './schema/index.ts'
import { withTx } from './with-tx.ts'

let client: PGlite
let db: Database

beforeAll(async () => {
  client = await migratedDatabase()
  db = databaseOver(client)
})
afterAll(() => client.close())

it('writes all of it, or nothing where the work throws', async () => {
  await withTx(db, (tx) => tx.insert(offices).values({ name: 'Kept' }))
  await expect(
    withTx(db, async (tx) => {
      await tx.insert(offices).values({ name: 'Not kept' })
      throw new Error('no')
    }),
  ).rejects.toThrow('no')
  expect((await db.select({ name: offices.name }).from(offices)).map(({ name }) => name)).toEqual(['Kept'])
})

it('names the mistake of using the outer database inside, instead of waiting for ever', async () => {
  await expect(withTx(db, async () => db.select().from(offices))).rejects.toThrow('use the tx')
  await expect(withTx(db, async () => withTx(db, async () => 1))).rejects.toThrow('use the tx')
  expect(await db.select().from(offices)).toHaveLength(1)
})
