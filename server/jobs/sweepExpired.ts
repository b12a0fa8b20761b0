import { type Queryable } from '#db/client.ts'
import { passwordResetQueries } from '#db/queries/passwordResets.ts'
import { rateLimitQueries } from '#db/queries/rateLimits.ts'
import { requestKeyQueries } from '#db/queries/requestKeys.ts'
import { sessionQueries } from '#db/queries/sessions.ts'

const dayMs = 24 * 3600 * 1000

/** Removes what has run out: sessions, reset links, counts of rate limits, and request keys after a day. */
export async function sweepExpired(db: Queryable, now = new Date()): Promise<void> {
  await sessionQueries(db).removeExpired()
  await passwordResetQueries(db).removeExpired(now)
  await rateLimitQueries(db).removeExpired(now)
  await requestKeyQueries(db).removeOlderThan(new Date(now.getTime() - dayMs))
}
