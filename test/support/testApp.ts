import { createServer } from 'node:http'
import request from 'supertest'
import { connect } from '#db/client.ts'
import { accountService } from '#server/account/accountService.ts'
import { type AppContext } from '#server/context.ts'
import { createApp } from '#server/createApp.ts'
import { createLogger } from '#server/http/logger.ts'
import { memoryOutbox } from '#server/mail/outbox.ts'
import { readSettings } from '#server/settings.ts'
import { studioService } from '#server/studios/studioService.ts'
import { wearerService } from '#server/wearers/wearerService.ts'
import { type Role } from '#shared/contracts/permissions.ts'
import { freshDatabase } from './freshDatabase.ts'
import { memoryStore } from './memoryStore.ts'

export const origin = 'http://proofcloth.test'
export const password = 'seven quiet lanterns over water'

/** A browser of one person: keeps cookies and sends our own origin. */
export type Browser = ReturnType<typeof request.agent>
export type Person = Browser & { userId: string; email: string }

type Options = {
  /** environment variables of the server */
  env?: Record<string, string>
  /** receives the log's lines */
  log?: (line: string) => void
  given?: Partial<Pick<AppContext, 'storage' | 'mailer'>>
}

/**
 * The real app on an empty database. `owner`, `maker`, `fitter` and `wearer` are signed in and members of one studio;
 * `stranger` is the owner of another. `wearerId` is a wearer whose account is `wearer`'s, `otherWearerId` one without account.
 */
export async function testApp({ env = {}, log, given }: Options = {}) {
  const database = await freshDatabase()
  const { pool, db } = connect(database.url)
  const outbox = memoryOutbox()
  const store = memoryStore()
  const settings = readSettings({
    DATABASE_URL: database.url, SESSION_SECRET: 'for tests only: 0123456789abcdefghij', PUBLIC_URL: origin, LOG_LEVEL: log ? 'info' : 'silent', ...env,
  }, 'local')
  const logger = log ? createLogger('trace', { write: log }) : createLogger('silent')
  const context: AppContext = { db, pool, settings, logger, storage: store, mailer: outbox, ...given }
  const app = createApp(context)
  const server = createServer(app)
  await new Promise<void>((resolve) => { server.listen(0, '127.0.0.1', resolve) })

  const browser = (): Browser => request.agent(server).set('Origin', settings.publicUrl ?? origin)
  const accounts = accountService({ db, sendResetMail: () => {} })
  const person = async (name: string): Promise<Person> => {
    const email = `${name.toLowerCase()}@example.org`
    const userId = await accounts.signUp({ name, email, password, units: 'cm' })
    const agent = browser()
    await agent.post('/api/sign-in').set(settings.secure ? { 'X-Forwarded-Proto': 'https' } : {}).send({ email, password }).expect(200)
    return Object.assign(agent, { userId, email })
  }

  const studios = studioService({ db })
  const owner = await person('Orla')
  const [{ studioId } = { studioId: '' }] = (await accounts.me(owner.userId)).memberships
  const member = async (name: string, role: Role): Promise<Person> => {
    const joined = await person(name)
    await studios.addMember(studioId, joined.userId, role)
    return joined
  }
  const [maker, fitter, wearer] = [await member('Mara', 'maker'), await member('Finn', 'fitter'), await member('Wilma', 'wearer')]
  const wearers = wearerService({ db })
  const { id: wearerId } = await wearers.create(studioId, { name: 'Wilma', note: '' })
  await wearers.linkAccount(studioId, wearerId, wearer.userId)
  const { id: otherWearerId } = await wearers.create(studioId, { name: 'Someone else', note: '' })

  return {
    app, server, context, db, settings, outbox, store, browser, person, member,
    studioId, wearerId, otherWearerId, owner, maker, fitter, wearer, stranger: await person('Stella'), anonymous: browser(),
    async close() {
      await new Promise<void>((resolve) => { server.close(() => resolve()); server.closeAllConnections() })
      await pool.end()
      await database.drop()
    },
  }
}
export type TestApp = Awaited<ReturnType<typeof testApp>>
