import { pgTable, text, timestamp, uniqueIndex, uuid } from 'drizzle-orm/pg-core'

export const users = pgTable('users', {
  id: uuid('id').primaryKey().defaultRandom(),
  /** lower case, as signed in with */
  email: text('email').notNull(),
  name: text('name').notNull(),
  /** argon2id, with its parameters inside */
  passwordHash: text('password_hash').notNull(),
  units: text('units', { enum: ['cm', 'inch'] }).notNull().default('cm'),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
}, (t) => [uniqueIndex('users_email_key').on(t.email)])
export type UserRow = typeof users.$inferSelect
