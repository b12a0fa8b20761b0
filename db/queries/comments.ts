import { desc, eq, getTableColumns } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { comments } from '#db/schema/comments.ts'
import { users } from '#db/schema/users.ts'

export const commentQueries = (db: Queryable) => ({
  async list(projectId: string) {
    return db.select({ ...getTableColumns(comments), authorName: users.name }).from(comments).leftJoin(users, eq(users.id, comments.authorId))
      .where(eq(comments.projectId, projectId)).orderBy(desc(comments.createdAt), desc(comments.id)).limit(200)
  },
  async insert(comment: typeof comments.$inferInsert) {
    const [row] = await db.insert(comments).values(comment).returning()
    return row!
  },
})
