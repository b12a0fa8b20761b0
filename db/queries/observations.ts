import { and, eq, inArray, sql } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { observations, readings } from '#db/schema/observations.ts'

export const observationQueries = (db: Queryable) => ({
  async find(projectId: string, id: string) {
    const [row] = await db.select().from(observations).where(and(eq(observations.projectId, projectId), eq(observations.id, id)))
    return row ?? null
  },
  /** Numbers count on over removed ones, so that a number never means two things. Call with the project locked. */
  async insert(observation: Omit<typeof observations.$inferInsert, 'number'>) {
    const [row] = await db.insert(observations).values({
      ...observation,
      number: sql`(select coalesce(max(o.number), 0) + 1 from observations o where o.project_id = ${observation.projectId})`,
    }).returning()
    return row!
  },
  async update(id: string, version: number, set: Partial<typeof observations.$inferInsert>): Promise<boolean> {
    const rows = await db.update(observations).set({ ...set, version: version + 1 }).where(and(eq(observations.id, id), eq(observations.version, version))).returning({ id: observations.id })
    return rows.length === 1
  },
  async keep(ids: readonly string[], set: Partial<typeof observations.$inferInsert>): Promise<void> {
    if (ids.length) await db.update(observations).set({ ...set, version: sql`${observations.version} + 1` }).where(inArray(observations.id, [...ids]))
  },
  async putReading(reading: typeof readings.$inferInsert): Promise<void> {
    await db.insert(readings).values(reading).onConflictDoUpdate({
      target: [readings.observationId, readings.sampleId],
      set: { gone: reading.gone, reversed: reading.reversed, amount: reading.amount, note: reading.note, readBy: reading.readBy, readAt: sql`now()` },
    })
  },
  async removeReading(observationId: string, sampleId: string): Promise<void> {
    await db.delete(readings).where(and(eq(readings.observationId, observationId), eq(readings.sampleId, sampleId)))
  },
})
