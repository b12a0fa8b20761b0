import { index, jsonb, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { users } from './users.ts'

/** Sign-ins, failures, changes of role, deletions: who did what when, without what was in it. */
export const auditEntries = pgTable('audit_entries', {
  id: uuid('id').primaryKey().defaultRandom(),
  at: timestamp('at', { withTimezone: true }).notNull().defaultNow(),
  userId: uuid('user_id').references(() => users.id, { onDelete: 'set null' }),
  studioId: uuid('studio_id'),
  event: text('event').notNull(),
  details: jsonb('details').$type<Record<string, string>>().notNull(),
}, (t) => [index('audit_entries_at_idx').on(t.at)])
