import { and, desc, eq } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { samples } from '#db/schema/samples.ts'

export const sampleQueries = (db: Queryable) => ({
  async list(projectId: string) {
    return db.select({ number: samples.number, state: samples.state }).from(samples).where(eq(samples.projectId, projectId)).orderBy(samples.number)
  },
  async find(projectId: string, number: number) {
    const [row] = await db.select().from(samples).where(and(eq(samples.projectId, projectId), eq(samples.number, number)))
    return row ?? null
  },
  async newest(projectId: string) {
    const [row] = await db.select().from(samples).where(eq(samples.projectId, projectId)).orderBy(desc(samples.number)).limit(1)
    return row ?? null
  },
  async insert(sample: typeof samples.$inferInsert) {
    const [row] = await db.insert(samples).values(sample).returning()
    return row!
  },
  /** False when there is no such sample at this version. */
  async update(id: string, version: number, set: Partial<typeof samples.$inferInsert>): Promise<boolean> {
    const rows = await db.update(samples).set({ ...set, version: version + 1 }).where(and(eq(samples.id, id), eq(samples.version, version))).returning({ id: samples.id })
    return rows.length === 1
  },
  /** Sets what does not belong to the form: state moved by the story, answers to checks. */
  async keep(id: string, set: Partial<typeof samples.$inferInsert>): Promise<void> {
    await db.update(samples).set(set).where(eq(samples.id, id))
  },
})
