import { drizzle } from 'drizzle-orm/node-postgres'
import pg from 'pg'
import * as schema from './schema/index.ts'

/**
 * Opens a pool to PostgreSQL. Queries wait at most 5 s for a connection and 15 s for an answer, so that a database
 * that is away shows as an error and not as a hanging page.
 */
export function connect(databaseUrl: string, options: { max?: number } = {}) {
  const pool = new pg.Pool({ connectionString: databaseUrl, max: options.max ?? 10, connectionTimeoutMillis: 5000, statement_timeout: 15_000, idleTimeoutMillis: 30_000 })
  // An idle connection that dies (a restarted database) must not end the process; the next query reports it.
  pool.on('error', () => {})
  return { pool, db: drizzle(pool, { schema }) }
}

export type Db = ReturnType<typeof connect>['db']
/** A database or a transaction in it: what a query module takes. */
export type Queryable = Db | Parameters<Parameters<Db['transaction']>[0]>[0]
