import { fileURLToPath } from 'node:url'
import { migrate as runMigrations } from 'drizzle-orm/node-postgres/migrator'
import { type Db } from './client.ts'

/** Brings the database to the newest schema; does nothing when it is there already. */
export async function migrate(db: Db, folder = fileURLToPath(new URL('./migrations', import.meta.url))): Promise<void> {
  await runMigrations(db, { migrationsFolder: folder })
}
