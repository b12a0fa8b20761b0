import { date, index, integer, jsonb, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { type Measurement } from '#shared/contracts/wearer.ts'
import { studios } from './studios.ts'
import { users } from './users.ts'

export const wearers = pgTable('wearers', {
  id: uuid('id').primaryKey().defaultRandom(),
  studioId: uuid('studio_id').notNull().references(() => studios.id, { onDelete: 'cascade' }),
  /** set when the wearer has an account of their own */
  userId: uuid('user_id').references(() => users.id, { onDelete: 'set null' }),
  name: text('name').notNull(),
  note: text('note').notNull().default(''),
  version: integer('version').notNull().default(1),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
}, (t) => [index('wearers_studio_idx').on(t.studioId, t.name), index('wearers_user_idx').on(t.userId)])
export type WearerRow = typeof wearers.$inferSelect

export const measurementSets = pgTable('measurement_sets', {
  id: uuid('id').primaryKey().defaultRandom(),
  wearerId: uuid('wearer_id').notNull().references(() => wearers.id, { onDelete: 'cascade' }),
  takenOn: date('taken_on').notNull(),
  takenBy: text('taken_by').notNull(),
  note: text('note').notNull().default(''),
  // Read and written as one dated sheet; a single measurement's history is short enough to pick out of the sheets.
  measurements: jsonb('measurements').$type<Measurement[]>().notNull(),
  version: integer('version').notNull().default(1),
  updatedAt: timestamp('updated_at', { withTimezone: true }).notNull().defaultNow(),
}, (t) => [index('measurement_sets_wearer_idx').on(t.wearerId, t.takenOn)])
export type MeasurementSetRow = typeof measurementSets.$inferSelect
