import { sql } from 'drizzle-orm'
import { index, json, pgTable, timestamp, varchar } from 'drizzle-orm/pg-core'

/** The shape connect-pg-simple expects; the migration makes it, so that the store never has to. */
export const sessions = pgTable('sessions', {
  sid: varchar('sid').primaryKey(),
  sess: json('sess').notNull(),
  expire: timestamp('expire', { precision: 6 }).notNull(),
}, (t) => [
  index('sessions_expire_idx').on(t.expire),
  // listing and ending one person's sessions
  index('sessions_user_idx').on(sql`(${t.sess}->>'userId')`),
])
