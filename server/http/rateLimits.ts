import { createHash } from 'node:crypto'
import { isIPv6 } from 'node:net'
import { type Request } from 'express'
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible'
import { type Route } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'
import { type SignedIn } from '../access/checkAccess.ts'
import { type AppContext } from '../context.ts'

type Limit = { per: 'address' | 'person' | 'email' | 'email and address'; times: number; seconds: number }
const minute = 60
const hour = 60 * minute

/** Route id → how often it may be called. Kept in PostgreSQL, so all instances count together. */
export const limits: Readonly<Record<string, readonly Limit[]>> = {
  // Guessing one person's password from one place is slowed first; the limit over all places is wider, since anyone could use
  // it up to keep that person out.
  'account.sign-in': [
    { per: 'address', times: 30, seconds: 15 * minute },
    { per: 'email and address', times: 10, seconds: 15 * minute },
    { per: 'email', times: 60, seconds: hour },
  ],
  'account.sign-up': [{ per: 'address', times: 10, seconds: hour }],
  'account.request-reset': [{ per: 'address', times: 20, seconds: hour }, { per: 'email', times: 3, seconds: hour }],
  'account.reset': [{ per: 'address', times: 20, seconds: hour }],
  'account.password': [{ per: 'person', times: 10, seconds: 15 * minute }],
  'photographs.upload': [{ per: 'person', times: 240, seconds: hour }, { per: 'address', times: 600, seconds: hour }],
}
/** The shelf answers plainly as often as it is asked; looking for words costs more. */
const searchLimit: Limit = { per: 'person', times: 120, seconds: minute }

/** Counts a call by address and person, before its body is read. @throws DomainError 'request.too-many' */
export async function limitBeforeBody(context: AppContext, route: Route, req: Request, user: SignedIn | null): Promise<void> {
  for (const limit of limits[route.id] ?? []) {
    if (limit.per === 'address') await count(context, route.id, limit, networkOf(req.ip ?? ''))
    if (limit.per === 'person' && user) await count(context, route.id, limit, user.id)
  }
  if (route.id === 'projects.list' && req.query.q && user) await count(context, 'search', searchLimit, user.id)
}

/** Counts a call by the e-mail in its body. @throws DomainError 'request.too-many' */
export async function limitByBody(context: AppContext, route: Route, req: Request, body: unknown): Promise<void> {
  if (typeof body !== 'object' || body === null || !('email' in body)) return
  // Hashed: the table of counts need not know who tried to sign in.
  const email = createHash('sha256').update(String(body.email)).digest('base64url')
  for (const limit of limits[route.id] ?? []) {
    if (limit.per === 'email and address') await count(context, route.id, limit, `${email} ${networkOf(req.ip ?? '')}`)
    if (limit.per === 'email') await count(context, route.id, limit, email)
  }
}

async function count(context: AppContext, subject: string, limit: Limit, who: string): Promise<void> {
  try {
    await limiter(context, subject, limit).consume(who)
  } catch (thrown) {
    if (!(thrown instanceof RateLimiterRes)) throw thrown
    const retryAfterSeconds = Math.max(1, Math.ceil(thrown.msBeforeNext / 1000))
    throw new DomainError('request.too-many', `This was tried too often. Try again in ${inWords(retryAfterSeconds)}.`, { retryAfterSeconds })
  }
}

const inWords = (seconds: number) => (seconds < 90 ? `${seconds} seconds` : `${Math.ceil(seconds / minute)} minutes`)

const made = new WeakMap<AppContext, Map<string, RateLimiterPostgres>>()
function limiter(context: AppContext, subject: string, limit: Limit): RateLimiterPostgres {
  const ofContext = made.get(context) ?? new Map<string, RateLimiterPostgres>()
  made.set(context, ofContext)
  const name = `${subject}/${limit.per}`
  const found = ofContext.get(name) ?? new RateLimiterPostgres({
    storeClient: context.pool, storeType: 'pool', tableName: 'rate_limits', tableCreated: true, clearExpiredByTimeout: false,
    keyPrefix: name, points: Math.ceil(limit.times * context.settings.rateLimitScale), duration: limit.seconds,
  })
  ofContext.set(name, found)
  return found
}

/** One household usually holds a whole /64 of IPv6, so it counts as one address. */
function networkOf(address: string): string {
  if (!isIPv6(address) || address.includes('.')) return address
  const [head = '', tail = ''] = address.split('::')
  const left = head.split(':').filter(Boolean)
  const right = address.includes('::') ? tail.split(':').filter(Boolean) : []
  const groups = [...left, ...Array<string>(Math.max(0, 8 - left.length - right.length)).fill('0'), ...right]
  return `${groups.slice(0, 4).join(':')}::/64`
}
