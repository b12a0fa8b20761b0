import { doublePrecision, index, integer, jsonb, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { type SizeRow } from '#shared/contracts/pattern.ts'
import { type Garment } from '#shared/fit/types.ts'
import { studios } from './studios.ts'

export const patterns = pgTable('patterns', {
  id: uuid('id').primaryKey().defaultRandom(),
  studioId: uuid('studio_id').notNull().references(() => studios.id, { onDelete: 'cascade' }),
  name: text('name').notNull(),
  origin: text('origin').notNull().default(''),
  view: text('view').notNull().default(''),
  garment: jsonb('garment').$type<Garment>().notNull(),
  draftedCupMm: doublePrecision('drafted_cup_mm'),
  allowanceMm: doublePrecision('allowance_mm').notNull().default(15),
  note: text('note').notNull().default(''),
  chart: jsonb('chart').$type<SizeRow[]>().notNull(),
  version: integer('version').notNull().default(1),
  updatedAt: timestamp('updated_at', { withTimezone: true }).notNull().defaultNow(),
}, (t) => [index('patterns_studio_idx').on(t.studioId, t.name)])
export type PatternRow = typeof patterns.$inferSelect
