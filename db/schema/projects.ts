import { index, integer, jsonb, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { sampleStates, stages } from '#shared/contracts/project.ts'
import { patterns } from './patterns.ts'
import { studios } from './studios.ts'
import { users } from './users.ts'
import { measurementSets, wearers } from './wearers.ts'

export const projects = pgTable('projects', {
  id: uuid('id').primaryKey().defaultRandom(),
  studioId: uuid('studio_id').notNull().references(() => studios.id, { onDelete: 'cascade' }),
  wearerId: uuid('wearer_id').notNull().references(() => wearers.id, { onDelete: 'restrict' }),
  patternId: uuid('pattern_id').notNull().references(() => patterns.id, { onDelete: 'restrict' }),
  makerId: uuid('maker_id').references(() => users.id, { onDelete: 'set null' }),
  name: text('name').notNull(),
  note: text('note').notNull().default(''),
  // The shelf lists and counts by these, so they are kept up to date here instead of being worked out per card.
  stage: text('stage', { enum: stages }).notNull().default('size'),
  sampleNumber: integer('sample_number'),
  sampleState: text('sample_state', { enum: sampleStates }),
  openCount: integer('open_count').notNull().default(0),
  nextFittingAt: timestamp('next_fitting_at', { withTimezone: true }),
  /** the stage to wake to */
  restedFrom: text('rested_from', { enum: stages }),
  lastLookAt: timestamp('last_look_at', { withTimezone: true }),
  version: integer('version').notNull().default(1),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
  updatedAt: timestamp('updated_at', { withTimezone: true }).notNull().defaultNow(),
}, (t) => [
  index('projects_shelf_idx').on(t.studioId, t.updatedAt.desc(), t.id),
  index('projects_stage_idx').on(t.studioId, t.stage, t.sampleState, t.updatedAt.desc(), t.id),
  index('projects_wearer_idx').on(t.wearerId),
  index('projects_pattern_idx').on(t.patternId),
])
export type ProjectRow = typeof projects.$inferSelect

export const sizePlans = pgTable('size_plans', {
  projectId: uuid('project_id').primaryKey().references(() => projects.id, { onDelete: 'cascade' }),
  choices: jsonb('choices').$type<Record<string, string>>().notNull(),
  lengthsMm: jsonb('lengths_mm').$type<Record<string, number>>().notNull(),
  reason: text('reason').notNull().default(''),
  setId: uuid('set_id').references(() => measurementSets.id, { onDelete: 'set null' }),
  keptAt: timestamp('kept_at', { withTimezone: true }),
  version: integer('version').notNull().default(1),
})
export type SizePlanRow = typeof sizePlans.$inferSelect
