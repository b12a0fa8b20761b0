import { and, eq, inArray, isNull } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { changeObservations, changes } from '#db/schema/changes.ts'

export const changeQueries = (db: Queryable) => ({
  async find(projectId: string, id: string) {
    const [row] = await db.select().from(changes).where(and(eq(changes.projectId, projectId), eq(changes.id, id)))
    return row ?? null
  },
  async insert(change: typeof changes.$inferInsert, observationIds: readonly string[]) {
    const [row] = await db.insert(changes).values(change).returning()
    if (observationIds.length) await db.insert(changeObservations).values(observationIds.map((observationId) => ({ changeId: row!.id, observationId })))
    return row!
  },
  async update(id: string, version: number, set: Partial<typeof changes.$inferInsert>): Promise<boolean> {
    const rows = await db.update(changes).set({ ...set, version: version + 1 }).where(and(eq(changes.id, id), eq(changes.version, version))).returning({ id: changes.id })
    return rows.length === 1
  },
  async remove(id: string): Promise<void> {
    await db.delete(changes).where(eq(changes.id, id))
  },
  async carry(ids: readonly string[], carriedTo: number): Promise<void> {
    if (ids.length) await db.update(changes).set({ carriedTo }).where(and(inArray(changes.id, [...ids]), isNull(changes.carriedTo)))
  },
})
