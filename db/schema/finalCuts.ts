import { type z } from 'zod'
import { integer, jsonb, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { type clothFacts, type shrinkage } from '#shared/contracts/finalCut.ts'
import { projects } from './projects.ts'
import { users } from './users.ts'

export const finalCuts = pgTable('final_cuts', {
  projectId: uuid('project_id').primaryKey().references(() => projects.id, { onDelete: 'cascade' }),
  /** items ticked by a person: item id → when */
  ticks: jsonb('ticks').$type<Record<string, string>>().notNull(),
  cloth: jsonb('cloth').$type<z.infer<typeof clothFacts>>().notNull(),
  shrinkage: jsonb('shrinkage').$type<z.infer<typeof shrinkage>>().notNull(),
  note: text('note').notNull().default(''),
  agreedBy: uuid('agreed_by').references(() => users.id, { onDelete: 'set null' }),
  agreedAt: timestamp('agreed_at', { withTimezone: true }),
  clearedAt: timestamp('cleared_at', { withTimezone: true }),
  cutAt: timestamp('cut_at', { withTimezone: true }),
  version: integer('version').notNull().default(1),
})
export type FinalCutRow = typeof finalCuts.$inferSelect
