import type pg from 'pg'
import { type Logger } from 'pino'
import { type Db } from '#db/client.ts'
import { type Mailer } from './mail/mailer.ts'
import { type Settings } from './settings.ts'
import { type PhotographStore } from './storage/store.ts'

/** What the process is made of; built once by main.ts or by a test and handed to every router. */
export type AppContext = {
  db: Db
  pool: pg.Pool
  storage: PhotographStore
  mailer: Mailer
  settings: Settings
  logger: Logger
}
