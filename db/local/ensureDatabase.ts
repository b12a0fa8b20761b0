import pg from 'pg'
import { type LocalPostgres } from './localPostgres.ts'

/** Makes a database where there is none yet. */
export async function ensureDatabase(postgres: LocalPostgres, name: string): Promise<void> {
  const client = new pg.Client({ connectionString: postgres.url('postgres') })
  await client.connect()
  try {
    const { rowCount } = await client.query('select 1 from pg_database where datname = $1', [name])
    if (!rowCount) await client.query(`create database ${client.escapeIdentifier(name)}`)
  } finally {
    await client.end()
  }
}
