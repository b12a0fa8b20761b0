import { and, eq, gt, isNull, lt, sql } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { passwordResets } from '#db/schema/passwordResets.ts'
import { users } from '#db/schema/users.ts'

export const passwordResetQueries = (db: Queryable) => ({
  /** One statement for a known and an unknown address, so that both take the same time. @returns the account, or null */
  async insertFor(email: string, tokenHash: string, validMs: number) {
    const [row] = await db.insert(passwordResets)
      .select(db.select({
        tokenHash: sql<string>`${tokenHash}`.as('token_hash'), userId: users.id,
        expiresAt: sql<Date>`now() + make_interval(secs => ${validMs / 1000})`.as('expires_at'), usedAt: sql<Date | null>`null::timestamptz`.as('used_at'),
      }).from(users).where(eq(users.email, email)))
      .returning({ userId: passwordResets.userId })
    return row ?? null
  },
  /** Marks the token as used; null when it was used, has expired or never was. */
  async use(tokenHash: string): Promise<string | null> {
    const [row] = await db.update(passwordResets).set({ usedAt: sql`now()` })
      .where(and(eq(passwordResets.tokenHash, tokenHash), isNull(passwordResets.usedAt), gt(passwordResets.expiresAt, sql`now()`)))
      .returning({ userId: passwordResets.userId })
    return row?.userId ?? null
  },
  async removeOf(userId: string): Promise<void> {
    await db.delete(passwordResets).where(eq(passwordResets.userId, userId))
  },
  async removeExpired(before: Date): Promise<number> {
    return (await db.delete(passwordResets).where(lt(passwordResets.expiresAt, before))).rowCount ?? 0
  },
})
