import { lt } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { rateLimits } from '#db/schema/rateLimits.ts'

export const rateLimitQueries = (db: Queryable) => ({
  async removeExpired(before: Date): Promise<number> {
    return (await db.delete(rateLimits).where(lt(rateLimits.expire, before.getTime()))).rowCount ?? 0
  },
})
