import { once } from 'node:events'
import { createServer } from 'node:http'
import { type AddressInfo } from 'node:net'
import { setTimeout as delay } from 'node:timers/promises'
import { connect } from '#db/client.ts'
import { type AppContext } from './context.ts'
import { createApp } from './createApp.ts'
import { createLogger } from './http/logger.ts'
import { jobs } from './jobs/jobs.ts'
import { startScheduler } from './jobs/scheduler.ts'
import { folderOutbox } from './mail/outbox.ts'
import { type Mailer } from './mail/mailer.ts'
import { smtpMailer } from './mail/smtpMailer.ts'
import { type Settings } from './settings.ts'
import { openStore } from './storage/openStore.ts'

/** Requests under way may take this long to finish after a stop was asked for. */
const graceMs = 9000

/** 25 MB over a line of half a megabit a second. */
const slowestUploadMs = 7 * 60_000

export type RunningServer = {
  /** where people reach it */
  url: string
  /** where this process listens */
  port: number
  /** Takes no new requests, lets those under way finish, closes everything; at most ten seconds. */
  stop: () => Promise<void>
}

/**
 * Starts the server on a database that is migrated already.
 * @param given - parts a test brings along instead of the ones the settings name
 */
export async function startServer(settings: Settings, given: Partial<Pick<AppContext, 'mailer' | 'logger' | 'storage'>> = {}): Promise<RunningServer> {
  const logger = given.logger ?? createLogger(settings.logLevel)
  const { pool, db } = connect(settings.databaseUrl)
  const context: AppContext = {
    db, pool, settings, logger,
    storage: given.storage ?? (await openStore(settings.photoStorage)),
    mailer: given.mailer ?? openMailer(settings),
  }
  const server = createServer({ requestTimeout: slowestUploadMs, headersTimeout: 20_000, keepAliveTimeout: 10_000 }, createApp(context))
  try {
    server.listen(settings.port, settings.host)
    await once(server, 'listening')
  } catch (error) {
    await pool.end()
    throw error
  }
  const scheduler = startScheduler(jobs(context), logger)
  const { port } = server.address() as AddressInfo
  const url = settings.publicUrl ?? `http://${settings.host.includes(':') ? `[${settings.host}]` : settings.host}:${port}`
  logger.info({ url }, 'listening')

  let stopping: Promise<void> | null = null
  const stop = async () => {
    const late = delay(graceMs, undefined, { ref: false })
    const closed = new Promise<void>((resolve) => { server.close(() => resolve()) })
    // A connection falls idle when its last answer is out; nobody else would close it then.
    const idle = setInterval(() => server.closeIdleConnections(), 50)
    await Promise.race([closed, late])
    clearInterval(idle)
    server.closeAllConnections()
    await Promise.race([scheduler.stop().then(() => pool.end()), late])
    logger.info('stopped')
  }
  return { url, port, stop: () => (stopping ??= stop()) }
}

/** Stops on the signals of a terminal and of a service manager, and ends the process. */
export function stopOnSignals(server: RunningServer): void {
  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    process.once(signal, () => { server.stop().then(() => process.exit(0), () => process.exit(1)) })
  }
}

const openMailer = (settings: Settings): Mailer => (settings.smtpUrl ? smtpMailer(settings.smtpUrl, settings.mailFrom) : folderOutbox('.data/outbox'))
