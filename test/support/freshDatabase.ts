import { createHash, randomBytes } from 'node:crypto'
import { readFileSync } from 'node:fs'
import pg from 'pg'
import { connect } from '#db/client.ts'
import { migrate } from '#db/migrate.ts'

/** One database of migrated tables that every test copies: copying takes a fraction of migrating. */
const templateName = () => `proofcloth_template_${createHash('sha256').update(readFileSync(new URL('../../db/migrations/meta/_journal.json', import.meta.url))).digest('hex').slice(0, 12)}`
const templateLock = 718_271_001

export type FreshDatabase = { url: string; drop: () => Promise<void> }

/**
 * An empty database with every table, for one test file.
 * @param serverUrl - a PostgreSQL where the user may make databases
 */
export async function freshDatabase(serverUrl = process.env.TEST_DATABASE_URL): Promise<FreshDatabase> {
  if (!serverUrl) throw new Error('Set TEST_DATABASE_URL to a PostgreSQL server where databases may be made.')
  const template = templateName()
  const name = `proofcloth_test_${randomBytes(6).toString('hex')}`
  await onServer(serverUrl, async (client) => {
    await client.query('select pg_advisory_lock($1)', [templateLock])
    const { rowCount } = await client.query('select 1 from pg_database where datname = $1', [template])
    if (!rowCount) {
      // Named only when it is whole, so that a run that was broken off leaves no half template behind.
      await client.query(`drop database if exists ${template}_making`)
      await client.query(`create database ${template}_making`)
      const { pool, db } = connect(urlOf(serverUrl, `${template}_making`))
      await migrate(db)
      await pool.end()
      await client.query(`alter database ${template}_making rename to ${template}`)
    }
    await client.query('select pg_advisory_unlock($1)', [templateLock])
    await client.query(`create database ${name} template ${template}`)
  })
  return { url: urlOf(serverUrl, name), drop: () => onServer(serverUrl, async (client) => { await client.query(`drop database if exists ${name} with (force)`) }) }
}

function urlOf(serverUrl: string, database: string): string {
  const url = new URL(serverUrl)
  url.pathname = `/${database}`
  return url.href
}

async function onServer(serverUrl: string, run: (client: pg.Client) => Promise<void>): Promise<void> {
  const client = new pg.Client({ connectionString: serverUrl })
  await client.connect()
  try {
    await run(client)
  } finally {
    await client.end()
  }
}
