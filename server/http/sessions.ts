import connectPgSimple from 'connect-pg-simple'
import { type RequestHandler } from 'express'
import session from 'express-session'
import { sessionQueries } from '#db/queries/sessions.ts'
import { type AppContext } from '../context.ts'
import { deviceOf } from './deviceOf.ts'

const day = 24 * 3600 * 1000
/** A session ends after this long without a request, and after this long in any case. */
export const sessionLimits = { idleMs: 14 * day, absoluteMs: 30 * day, touchMs: 5 * 60 * 1000 } as const

export const sessionCookieName = (secure: boolean) => (secure ? '__Host-proofcloth' : 'proofcloth')

/** Loads the session, ends it at its absolute limit, notes now and then that it is in use, and changes its id when rights changed. */
export function sessions(context: AppContext): RequestHandler[] {
  const { settings, pool, db, logger } = context
  const Store = connectPgSimple(session)
  return [
    session({
      name: sessionCookieName(settings.secure),
      secret: settings.sessionSecret,
      store: new Store({ pool, tableName: 'sessions', createTableIfMissing: false, disableTouch: true, pruneSessionInterval: false, errorLog: (...parts) => logger.warn({ reason: String(parts.at(-1)) }, 'session store') }),
      resave: false,
      saveUninitialized: false,
      rolling: false,
      unset: 'destroy',
      cookie: { path: '/', httpOnly: true, secure: settings.secure, sameSite: 'lax', maxAge: sessionLimits.idleMs },
    }),
    async (req, res, next) => {
      const { session } = req
      if (!session?.userId) return next()
      const now = Date.now()
      if (now - (session.startedAt ?? 0) > sessionLimits.absoluteMs) {
        await endSession(req, res, settings.secure)
        return next()
      }
      if (session.rotate && (await sessionQueries(db).claimRotation(req.sessionID))) await changeId(req)
      // A write on every request would cost half of the throughput; a few minutes are exact enough for an idle limit of days.
      else if (now - (session.lastSeenAt ?? 0) > sessionLimits.touchMs) session.lastSeenAt = now
      next()
    },
  ]
}

type Req = Parameters<RequestHandler>[0]
type Res = Parameters<RequestHandler>[1]

/** Starts a session for this person under a new id; whatever session came with the request is gone. */
export async function startSession(req: Req, userId: string): Promise<void> {
  await new Promise<void>((resolve, reject) => { req.session.regenerate((error) => (error ? reject(error) : resolve())) })
  const now = Date.now()
  Object.assign(req.session, { userId, startedAt: now, lastSeenAt: now, device: deviceOf(req.get('user-agent') ?? '') })
  // Stored before the answer goes out, so the first request after it finds the session.
  await save(req)
}

/** Ends this request's session and takes the cookie back. */
export async function endSession(req: Req, res: Res, secure: boolean): Promise<void> {
  await new Promise<void>((resolve, reject) => { req.session.destroy((error) => (error ? reject(error) : resolve())) })
  res.clearCookie(sessionCookieName(secure), { path: '/', httpOnly: true, secure, sameSite: 'lax' })
}

/** The same session under a new id. The old id stays good for some seconds (`claimRotation`): a page asks for several things at once. */
async function changeId(req: Req): Promise<void> {
  const { cookie: _cookie, rotate: _rotate, ...kept } = req.session
  req.sessionStore.generate(req)
  Object.assign(req.session, kept, { lastSeenAt: Date.now() })
  await save(req)
}

const save = (req: Req) => new Promise<void>((resolve, reject) => { req.session.save((error: unknown) => (error ? reject(error) : resolve())) })
