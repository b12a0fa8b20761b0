import { connect } from '#db/client.ts'
import { ensureDatabase } from '#db/local/ensureDatabase.ts'
import { startLocalPostgres } from '#db/local/localPostgres.ts'
import { migrate } from '#db/migrate.ts'
import { type SignIn, seedDemo } from '#db/seed/seedDemo.ts'
import { type RunningServer, startServer } from '../main.ts'
import { readSettings } from '../settings.ts'
import { openStore } from '../storage/openStore.ts'
import { type Life } from './life.ts'
import { checkRoom, dataFolder, ensureDataFolder, localPort, sessionSecret, takeFolder } from './localSettings.ts'

/**
 * Database, migrations, demo studio and server on this machine.
 * @param prepare - done before anything runs, such as building the client
 * @throws CommandError with one line when port, disk or data stand in the way
 */
export async function startLocal(life: Life, prepare: () => Promise<void>): Promise<{ server: RunningServer; signIns: readonly SignIn[] }> {
  const port = await localPort()
  ensureDataFolder()
  await life.begin(async () => takeFolder(), (giveFree) => giveFree())
  await prepare()
  const postgres = await life.begin(() => startLocalPostgres(`${dataFolder}/postgres`), ({ stop }) => stop())
  checkRoom(postgres.place)
  await ensureDatabase(postgres, 'proofcloth')
  const settings = readSettings({
    PHOTO_STORAGE: `disk:${dataFolder}/photographs`, LOG_LEVEL: 'warn', ...process.env,
    // Demo accounts with a known password are for this machine's own eyes, whatever the environment says.
    HOST: '127.0.0.1', PORT: String(port), DATABASE_URL: postgres.url('proofcloth'), SESSION_SECRET: sessionSecret(),
  }, 'local')
  const { signIns } = await life.begin(async () => {
    const { db, pool } = connect(settings.databaseUrl)
    try {
      await migrate(db)
      return { signIns: await seedDemo(db, await openStore(settings.photoStorage)) }
    } finally {
      await pool.end()
    }
  }, () => {})
  const server = await life.begin(() => startServer(settings), async (begun) => {
    console.log('\nStopping.')
    await begun.stop()
  })
  return { server, signIns }
}
