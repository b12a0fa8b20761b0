import { and, eq, sql } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { pieces, transfers } from '#db/schema/pieces.ts'

export const pieceQueries = (db: Queryable) => ({
  async find(projectId: string, id: string) {
    const [row] = await db.select().from(pieces).where(and(eq(pieces.projectId, projectId), eq(pieces.id, id)))
    return row ?? null
  },
  /** Numbered in the order they are given. Call with the project locked. */
  async insert(projectId: string, list: readonly Omit<typeof pieces.$inferInsert, 'number' | 'projectId'>[]) {
    const made = []
    for (const piece of list) {
      const [row] = await db.insert(pieces).values({ ...piece, projectId, number: sql`(select coalesce(max(p.number), 0) + 1 from pieces p where p.project_id = ${projectId})` }).returning()
      made.push(row!)
    }
    return made
  },
  async update(id: string, version: number, set: Partial<typeof pieces.$inferInsert>): Promise<boolean> {
    const rows = await db.update(pieces).set({ ...set, version: version + 1, updatedAt: sql`now()` }).where(and(eq(pieces.id, id), eq(pieces.version, version))).returning({ id: pieces.id })
    return rows.length === 1
  },
  async remove(id: string): Promise<void> {
    await db.delete(pieces).where(eq(pieces.id, id))
  },
  async setTransfer(changeId: string, pieceId: string, userId: string, ticked: boolean): Promise<void> {
    if (ticked) await db.insert(transfers).values({ changeId, pieceId, tickedBy: userId }).onConflictDoNothing()
    else await db.delete(transfers).where(and(eq(transfers.changeId, changeId), eq(transfers.pieceId, pieceId)))
  },
})
