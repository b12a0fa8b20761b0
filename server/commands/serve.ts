import { connect } from '#db/client.ts'
import { migrate } from '#db/migrate.ts'
import { startServer } from '../main.ts'
import { readSettings } from '../settings.ts'
import { runCommand } from './runCommand.ts'

// npm run serve: production. Settings come from the environment and are checked before anything else; no demo account is ever made.
await runCommand(async (life) => {
  const settings = readSettings(process.env, 'production')
  const { db, pool } = connect(settings.databaseUrl)
  await migrate(db).finally(() => pool.end())
  await life.begin(() => startServer(settings), (server) => server.stop())
})
