import { boolean, date, doublePrecision, integer, jsonb, pgTable, text, timestamp, uniqueIndex, uuid } from 'drizzle-orm/pg-core'
import { sampleStates } from '#shared/contracts/project.ts'
import { projects } from './projects.ts'

export const samples = pgTable('samples', {
  id: uuid('id').primaryKey().defaultRandom(),
  projectId: uuid('project_id').notNull().references(() => projects.id, { onDelete: 'cascade' }),
  number: integer('number').notNull(),
  state: text('state', { enum: sampleStates }).notNull().default('to-sew'),
  cloth: text('cloth').notNull().default(''),
  differs: text('differs').notNull().default(''),
  stiffer: boolean('stiffer').notNull().default(false),
  stretchPercent: doublePrecision('stretch_percent'),
  finalStretchPercent: doublePrecision('final_stretch_percent'),
  basted: text('basted').notNull().default(''),
  sewnOn: date('sewn_on'),
  note: text('note').notNull().default(''),
  /** check id → answer, as given in front of the wearer */
  answers: jsonb('answers').$type<Record<string, 'yes' | 'no'>>().notNull(),
  version: integer('version').notNull().default(1),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
}, (t) => [uniqueIndex('samples_number_key').on(t.projectId, t.number)])
export type SampleRow = typeof samples.$inferSelect
