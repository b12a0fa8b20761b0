import { and, eq, getTableColumns } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { finalCuts } from '#db/schema/finalCuts.ts'
import { users } from '#db/schema/users.ts'

export const finalCutQueries = (db: Queryable) => ({
  async find(projectId: string) {
    const [row] = await db.select({ ...getTableColumns(finalCuts), agreedName: users.name }).from(finalCuts).leftJoin(users, eq(users.id, finalCuts.agreedBy)).where(eq(finalCuts.projectId, projectId))
    return row ?? null
  },
  async insert(finalCut: typeof finalCuts.$inferInsert): Promise<void> {
    await db.insert(finalCuts).values(finalCut).onConflictDoNothing()
  },
  async update(projectId: string, version: number, set: Partial<typeof finalCuts.$inferInsert>): Promise<boolean> {
    const rows = await db.update(finalCuts).set({ ...set, version: version + 1 }).where(and(eq(finalCuts.projectId, projectId), eq(finalCuts.version, version))).returning({ id: finalCuts.projectId })
    return rows.length === 1
  },
  async keep(projectId: string, set: Partial<typeof finalCuts.$inferInsert>): Promise<void> {
    await db.update(finalCuts).set(set).where(eq(finalCuts.projectId, projectId))
  },
})
