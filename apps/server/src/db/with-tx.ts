import { AsyncLocalStorage } from 'node:async_hooks'
import type { Database, Tx } from './client.ts'

const inside = new AsyncLocalStorage<true>()

const QUERYING = new Set([
  'select',
  'selectDistinct',
  'selectDistinctOn',
  'insert',
  'update',
  'delete',
  'execute',
  'query',
  'transaction',
  '$count',
  'with',
])

/**
 * PGlite has one connection: a query on the outer database inside a transaction waits for that transaction, which waits for the
 * query, without an error or a time limit. The guard turns such a hang into an exception that names the mistake.
 */
export const guardOuterUse = (db: Database): Database =>
  new Proxy(db, {
    get(target, property) {
      if (typeof property === 'string' && QUERYING.has(property) && inside.getStore())
        throw new Error(`db.${property} was used inside withTx: use the tx that withTx hands over.`)
      return Reflect.get(target, property, target) as unknown
    },
  })

/** Runs `work` in one transaction. Nothing slow belongs inside: every other request waits for it. */
export const withTx = <T>(db: Database, work: (tx: Tx) => Promise<T>): Promise<T> =>
  db.transaction((tx) => inside.run(true, () => work(tx)))
