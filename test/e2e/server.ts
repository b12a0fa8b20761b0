import { mkdtempSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { connect } from '#db/client.ts'
import { seedDemo } from '#db/seed/seedDemo.ts'
import { startServer, stopOnSignals } from '#server/main.ts'
import { readSettings } from '#server/settings.ts'
import { openStore } from '#server/storage/openStore.ts'
import { freshDatabase } from '../support/freshDatabase.ts'

// The real server on a database of its own with the demo studio; Playwright starts and ends it.
const database = await freshDatabase()
const settings = readSettings({
  DATABASE_URL: database.url, SESSION_SECRET: 'for tests only: 0123456789abcdefghij', PORT: process.env.PORT, LOG_LEVEL: 'error',
  PHOTO_STORAGE: `disk:${mkdtempSync(join(tmpdir(), 'proofcloth-e2e-'))}`, RATE_LIMIT_SCALE: '1000',
}, 'local')
const { db, pool } = connect(database.url)
await seedDemo(db, await openStore(settings.photoStorage))
await pool.end()
stopOnSignals(await startServer(settings))
