import { and, lt, ne, sql } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { sessions } from '#db/schema/sessions.ts'

type StoredSession = { userId: string; startedAt: number; lastSeenAt: number; device: string }

// What people see of a session is a digest: its id is half of the key to the account.
const publicId = sql<string>`encode(sha256(convert_to(${sessions.sid}, 'UTF8')), 'hex')`
const ofUser = (userId: string) => sql`${sessions.sess}->>'userId' = ${userId}`
const alive = sql`${sessions.expire} >= now()`
/** How long an id that was replaced still works, for the requests that were under way. */
const graceSeconds = 30

export const sessionQueries = (db: Queryable) => ({
  async ofUser(userId: string) {
    return db.select({ sid: sessions.sid, publicId, sess: sql<StoredSession>`${sessions.sess}` }).from(sessions)
      // an id that was replaced a moment ago is no session of its own
      .where(and(ofUser(userId), alive, sql`${sessions.sess}->>'replaced' is null`))
  },
  async endOne(userId: string, id: string): Promise<number> {
    return (await db.delete(sessions).where(and(ofUser(userId), sql`${publicId} = ${id}`))).rowCount ?? 0
  },
  async endAll(userId: string, except?: string): Promise<number> {
    return (await db.delete(sessions).where(and(ofUser(userId), except === undefined ? undefined : ne(sessions.sid, except)))).rowCount ?? 0
  },
  /** Every session of this person gets a new id with its next request. */
  async markForRotation(userId: string): Promise<void> {
    await db.update(sessions).set({ sess: sql`(${sessions.sess}::jsonb || '{"rotate":true}')::json` }).where(ofUser(userId))
  },
  /** True for the one request that may replace this id; the id itself ends in half a minute. */
  async claimRotation(sid: string): Promise<boolean> {
    const rows = await db.update(sessions)
      .set({ sess: sql`((${sessions.sess}::jsonb - 'rotate') || '{"replaced":true}')::json`, expire: sql`now() + make_interval(secs => ${graceSeconds})` })
      .where(and(sql`${sessions.sid} = ${sid}`, sql`${sessions.sess}->>'rotate' is not null`)).returning({ sid: sessions.sid })
    return rows.length === 1
  },
  /** By the database's own clock: the column has no time zone, so a time from here would be read in another. */
  async removeExpired(): Promise<number> {
    return (await db.delete(sessions).where(lt(sessions.expire, sql`now()`))).rowCount ?? 0
  },
})
