import { and, eq, lt } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { requestKeys } from '#db/schema/requestKeys.ts'

export const requestKeyQueries = (db: Queryable) => ({
  /** False when the key is there already. Waits for another transaction that is just inserting the same key. */
  async claim(userId: string, key: string, request: string): Promise<boolean> {
    const rows = await db.insert(requestKeys).values({ userId, key, request }).onConflictDoNothing().returning({ key: requestKeys.key })
    return rows.length === 1
  },
  async find(userId: string, key: string) {
    const [row] = await db.select().from(requestKeys).where(and(eq(requestKeys.userId, userId), eq(requestKeys.key, key)))
    return row ?? null
  },
  async keepAnswer(userId: string, key: string, status: number, answer: unknown): Promise<void> {
    await db.update(requestKeys).set({ status, answer }).where(and(eq(requestKeys.userId, userId), eq(requestKeys.key, key)))
  },
  async removeOlderThan(before: Date): Promise<number> {
    return (await db.delete(requestKeys).where(lt(requestKeys.createdAt, before))).rowCount ?? 0
  },
})
