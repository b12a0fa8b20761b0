import { throwAwayPostgres } from '../run/throwAwayPostgres.ts'

/** For a single test file run by hand: without TEST_DATABASE_URL a throw-away PostgreSQL is started for the run. */
export async function setup(): Promise<(() => Promise<void>) | undefined> {
  if (process.env.TEST_DATABASE_URL) return undefined
  const postgres = await throwAwayPostgres()
  process.env.TEST_DATABASE_URL = postgres.url('postgres')
  return postgres.stop
}
