import { bigint, index, integer, pgTable, varchar } from 'drizzle-orm/pg-core'

/** The shape rate-limiter-flexible expects; the migration makes it, so that the limiter never has to. */
export const rateLimits = pgTable('rate_limits', {
  key: varchar('key', { length: 255 }).primaryKey(),
  points: integer('points').notNull().default(0),
  /** milliseconds since 1970 */
  expire: bigint('expire', { mode: 'number' }),
}, (t) => [index('rate_limits_expire_idx').on(t.expire)])
