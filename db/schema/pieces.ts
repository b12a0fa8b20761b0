import { boolean, doublePrecision, index, integer, jsonb, pgTable, primaryKey, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { pieceRoles } from '#shared/fit/types.ts'
import { changes } from './changes.ts'
import { projects } from './projects.ts'
import { users } from './users.ts'

export const pieces = pgTable('pieces', {
  id: uuid('id').primaryKey().defaultRandom(),
  projectId: uuid('project_id').notNull().references(() => projects.id, { onDelete: 'cascade' }),
  number: integer('number').notNull(),
  role: text('role', { enum: pieceRoles }).notNull(),
  name: text('name').notNull(),
  view: text('view').notNull().default(''),
  cutCount: integer('cut_count').notNull(),
  onFold: boolean('on_fold').notNull(),
  notchCount: integer('notch_count'),
  dartCount: integer('dart_count'),
  allowanceMm: doublePrecision('allowance_mm').notNull(),
  marks: jsonb('marks').$type<Record<string, 'missing' | 'marked' | 'not-needed'>>().notNull(),
  hangs: text('hangs').notNull().default(''),
  version: integer('version').notNull().default(1),
  updatedAt: timestamp('updated_at', { withTimezone: true }).notNull().defaultNow(),
}, (t) => [index('pieces_project_idx').on(t.projectId, t.number)])
export type PieceRow = typeof pieces.$inferSelect

/** A change drawn on a piece: the tick that says the tracing carries it. */
export const transfers = pgTable('transfers', {
  changeId: uuid('change_id').notNull().references(() => changes.id, { onDelete: 'cascade' }),
  pieceId: uuid('piece_id').notNull().references(() => pieces.id, { onDelete: 'cascade' }),
  tickedAt: timestamp('ticked_at', { withTimezone: true }).notNull().defaultNow(),
  tickedBy: uuid('ticked_by').references(() => users.id, { onDelete: 'set null' }),
}, (t) => [primaryKey({ columns: [t.changeId, t.pieceId] }), index('transfers_piece_idx').on(t.pieceId)])
