import { doublePrecision, index, integer, jsonb, pgTable, primaryKey, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { decisions, declineReasons } from '#shared/contracts/fitting.ts'
import { type PaperChange, sides } from '#shared/fit/types.ts'
import { observations } from './observations.ts'
import { projects } from './projects.ts'
import { samples } from './samples.ts'
import { users } from './users.ts'

/** A decision about the paper: a suggestion accepted, altered or declined, or a change of one's own. */
export const changes = pgTable('changes', {
  id: uuid('id').primaryKey().defaultRandom(),
  projectId: uuid('project_id').notNull().references(() => projects.id, { onDelete: 'cascade' }),
  /** the sample whose fitting led to it */
  sampleId: uuid('sample_id').notNull().references(() => samples.id, { onDelete: 'cascade' }),
  /** null for a change of one's own */
  cause: text('cause'),
  side: text('side', { enum: sides }).notNull().default('both'),
  decision: text('decision', { enum: decisions }).notNull(),
  title: text('title').notNull(),
  suggestedMm: doublePrecision('suggested_mm'),
  amountMm: doublePrecision('amount_mm').notNull(),
  // Kept as it was shown: the rules may change later, what was drawn on this paper does not.
  paper: jsonb('paper').$type<PaperChange>().notNull(),
  /** observation id → what it should read on the next sample */
  predictions: jsonb('predictions').$type<{ observationId: string; expectedMm: number; changeMm: number; text: string }[]>().notNull(),
  reason: text('reason', { enum: declineReasons }),
  note: text('note').notNull().default(''),
  /** the sample that was sewn with it; null while it waits for the next one */
  carriedTo: integer('carried_to'),
  decidedBy: uuid('decided_by').references(() => users.id, { onDelete: 'set null' }),
  decidedAt: timestamp('decided_at', { withTimezone: true }).notNull().defaultNow(),
  version: integer('version').notNull().default(1),
}, (t) => [index('changes_project_idx').on(t.projectId, t.decidedAt), index('changes_sample_idx').on(t.sampleId)])
export type ChangeRow = typeof changes.$inferSelect

/** Which observations a change answers. */
export const changeObservations = pgTable('change_observations', {
  changeId: uuid('change_id').notNull().references(() => changes.id, { onDelete: 'cascade' }),
  observationId: uuid('observation_id').notNull().references(() => observations.id, { onDelete: 'cascade' }),
}, (t) => [primaryKey({ columns: [t.changeId, t.observationId] }), index('change_observations_observation_idx').on(t.observationId)])
