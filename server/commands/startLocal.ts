import { connect } from '#db/client.ts'
import { CommandError } from '#db/local/CommandError.ts'
import { ensureDatabase, isFree, startLocalPostgres } from '#db/local/LocalPostgres.ts'
import { migrate } from '#db/migrate.ts'
import { type SignIn, seedDemo } from '#db/seed/seedDemo.ts'
import { type RunningServer, startServer } from '../main.ts'
import { readSettings } from '../settings.ts'
import { openStore } from '../storage/openStore.ts'
import { endInOrder } from './ending.ts'
import { dataFolder, ensureDataFolder, sessionSecret, takeFolder } from './localSettings.ts'

export type Started = { server: RunningServer; signIns: readonly SignIn[] }

/**
 * Database, migrations, demo studio and server on this machine; Ctrl-C ends them in order.
 * @param prepare - done while nothing is running yet, such as building the client
 * @throws CommandError with one line when port, disk or data stand in the way
 */
export async function startLocal(prepare: () => Promise<void>): Promise<Started> {
  const port = Number(process.env.PORT ?? 4310)
  if (!Number.isInteger(port) || port < 1 || port > 65_535) throw new CommandError(`PORT is ${process.env.PORT}; it must be a number from 1 to 65535.`)
  if (!(await isFree(port))) throw new CommandError(`Port ${port} is in use. Stop what listens there, or choose another: PORT=4311 npm start`)
  ensureDataFolder()
  const giveFree = takeFolder()
  let server: RunningServer | null = null
  let stopDatabase = () => {}
  const end = endInOrder(async () => {
    console.log('\nStopping.')
    await server?.stop()
    stopDatabase()
    giveFree()
  })
  try {
    await prepare()
    const postgres = await startLocalPostgres(`${dataFolder}/postgres`)
    stopDatabase = postgres.stop
    await ensureDatabase(postgres, 'proofcloth')
    const settings = readSettings({ PHOTO_STORAGE: `disk:${dataFolder}/photographs`, LOG_LEVEL: 'warn', ...process.env, DATABASE_URL: postgres.url('proofcloth'), SESSION_SECRET: sessionSecret(), PORT: String(port) }, 'local')
    const { db, pool } = connect(settings.databaseUrl)
    await migrate(db)
    const signIns = await seedDemo(db, await openStore(settings.photoStorage))
    await pool.end()
    server = await startServer(settings)
    return { server, signIns }
  } catch (error) {
    console.error(error instanceof CommandError ? error.message : error)
    await end(1)
    throw error
  }
}
