import { boolean, index, integer, jsonb, pgTable, primaryKey, text, timestamp, uniqueIndex, uuid } from 'drizzle-orm/pg-core'
import { type Mark, observationStates } from '#shared/contracts/fitting.ts'
import { type Amount, directions, lines, sides, signs, targets, views, zones } from '#shared/fit/types.ts'
import { photographs } from './photographs.ts'
import { projects } from './projects.ts'
import { samples } from './samples.ts'
import { users } from './users.ts'

export const observations = pgTable('observations', {
  id: uuid('id').primaryKey().defaultRandom(),
  projectId: uuid('project_id').notNull().references(() => projects.id, { onDelete: 'cascade' }),
  /** the sample it was first seen on */
  sampleId: uuid('sample_id').notNull().references(() => samples.id, { onDelete: 'cascade' }),
  /** counted through the whole project, so that "4" means one thing on every sample */
  number: integer('number').notNull(),
  photographId: uuid('photograph_id').references(() => photographs.id, { onDelete: 'set null' }),
  mark: jsonb('mark').$type<Mark>(),
  sign: text('sign', { enum: signs }).notNull(),
  zone: text('zone', { enum: zones }).notNull(),
  view: text('view', { enum: views }).notNull(),
  side: text('side', { enum: sides }).notNull(),
  direction: text('direction', { enum: directions }),
  towards: text('towards', { enum: targets }),
  line: text('line', { enum: lines }),
  severity: integer('severity').$type<1 | 2 | 3>().notNull(),
  amount: jsonb('amount').$type<Amount>(),
  note: text('note').notNull().default(''),
  state: text('state', { enum: observationStates }).notNull().default('noted'),
  letBeReason: text('let_be_reason').notNull().default(''),
  notedBy: uuid('noted_by').references(() => users.id, { onDelete: 'set null' }),
  removedAt: timestamp('removed_at', { withTimezone: true }),
  version: integer('version').notNull().default(1),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
}, (t) => [uniqueIndex('observations_number_key').on(t.projectId, t.number), index('observations_sample_idx').on(t.sampleId)])
export type ObservationRow = typeof observations.$inferSelect

/** An observation looked at again on a later sample. */
export const readings = pgTable('readings', {
  observationId: uuid('observation_id').notNull().references(() => observations.id, { onDelete: 'cascade' }),
  sampleId: uuid('sample_id').notNull().references(() => samples.id, { onDelete: 'cascade' }),
  gone: boolean('gone').notNull(),
  reversed: boolean('reversed').notNull().default(false),
  amount: jsonb('amount').$type<Amount>(),
  note: text('note').notNull().default(''),
  readBy: uuid('read_by').references(() => users.id, { onDelete: 'set null' }),
  readAt: timestamp('read_at', { withTimezone: true }).notNull().defaultNow(),
}, (t) => [primaryKey({ columns: [t.observationId, t.sampleId] }), index('readings_sample_idx').on(t.sampleId)])
export type ReadingRow = typeof readings.$inferSelect
