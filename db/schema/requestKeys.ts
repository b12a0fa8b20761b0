import { index, integer, jsonb, pgTable, primaryKey, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { users } from './users.ts'

/** Answers to creating requests, kept a day, so that a repeated request makes one thing and hears the same answer. */
export const requestKeys = pgTable('request_keys', {
  userId: uuid('user_id').notNull().references(() => users.id, { onDelete: 'cascade' }),
  key: text('key').notNull(),
  /** route id and path, so that a key cannot be used for another request */
  request: text('request').notNull(),
  status: integer('status'),
  answer: jsonb('answer'),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
}, (t) => [primaryKey({ columns: [t.userId, t.key] }), index('request_keys_created_idx').on(t.createdAt)])
