import { index, integer, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { projects } from './projects.ts'
import { users } from './users.ts'

export const comments = pgTable('comments', {
  id: uuid('id').primaryKey().defaultRandom(),
  projectId: uuid('project_id').notNull().references(() => projects.id, { onDelete: 'cascade' }),
  authorId: uuid('author_id').references(() => users.id, { onDelete: 'set null' }),
  text: text('text').notNull(),
  sampleNumber: integer('sample_number'),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
}, (t) => [index('comments_project_idx').on(t.projectId, t.createdAt.desc())])
export type CommentRow = typeof comments.$inferSelect
