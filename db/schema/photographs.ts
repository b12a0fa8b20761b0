import { bigint, boolean, index, integer, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { views } from '#shared/fit/types.ts'
import { samples } from './samples.ts'
import { users } from './users.ts'

export const photographs = pgTable('photographs', {
  id: uuid('id').primaryKey().defaultRandom(),
  sampleId: uuid('sample_id').notNull().references(() => samples.id, { onDelete: 'cascade' }),
  view: text('view', { enum: views }).notNull(),
  caption: text('caption').notNull().default(''),
  pose: text('pose').notNull().default(''),
  drawing: boolean('drawing').notNull().default(false),
  // The row comes first as an intent; `storedAt` is set when all three files are in the store, and only then is it shown.
  /** SHA-256 of the full-size file: the name under which the three sizes lie in the store */
  contentHash: text('content_hash'),
  width: integer('width'),
  height: integer('height'),
  bytes: bigint('bytes', { mode: 'number' }).notNull().default(0),
  storedAt: timestamp('stored_at', { withTimezone: true }),
  takenBy: uuid('taken_by').references(() => users.id, { onDelete: 'set null' }),
  removedAt: timestamp('removed_at', { withTimezone: true }),
  version: integer('version').notNull().default(1),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
}, (t) => [index('photographs_sample_idx').on(t.sampleId), index('photographs_hash_idx').on(t.contentHash)])
export type PhotographRow = typeof photographs.$inferSelect
