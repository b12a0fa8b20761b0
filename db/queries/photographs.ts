import { and, eq, getTableColumns, inArray, isNotNull, isNull, lt, or, sql } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { photographs } from '#db/schema/photographs.ts'
import { projects } from '#db/schema/projects.ts'
import { samples } from '#db/schema/samples.ts'
import { users } from '#db/schema/users.ts'

const columns = { ...getTableColumns(photographs), sampleNumber: samples.number, takerName: users.name }

export const photographQueries = (db: Queryable) => ({
  /** A photograph of this project, also a removed one; an upload that is not stored is none. */
  async find(projectId: string, id: string) {
    const [row] = await db.select(columns).from(photographs)
      .innerJoin(samples, eq(samples.id, photographs.sampleId)).leftJoin(users, eq(users.id, photographs.takenBy))
      .where(and(eq(samples.projectId, projectId), eq(photographs.id, id), isNotNull(photographs.storedAt)))
    return row ?? null
  },
  async countInSample(sampleId: string): Promise<number> {
    const [row] = await db.select({ count: sql<number>`count(*)::int` }).from(photographs).where(and(eq(photographs.sampleId, sampleId), isNotNull(photographs.storedAt), isNull(photographs.removedAt)))
    return row!.count
  },
  async bytesInStudio(studioId: string): Promise<number> {
    const [row] = await db.select({ bytes: sql<number>`coalesce(sum(${photographs.bytes}), 0)::float8` }).from(photographs)
      .innerJoin(samples, eq(samples.id, photographs.sampleId)).innerJoin(projects, eq(projects.id, samples.projectId))
      .where(and(eq(projects.studioId, studioId), isNotNull(photographs.storedAt), isNull(photographs.removedAt)))
    return row!.bytes
  },
  /** The row that says a photograph is on its way; a repeated request finds the row of the first. */
  async insertIntent(photograph: typeof photographs.$inferInsert): Promise<void> {
    await db.insert(photographs).values(photograph).onConflictDoNothing()
  },
  async confirm(id: string, set: { contentHash: string; width: number; height: number; bytes: number }): Promise<void> {
    await db.update(photographs).set({ ...set, storedAt: sql`now()` }).where(eq(photographs.id, id))
  },
  async update(id: string, version: number, set: Partial<typeof photographs.$inferInsert>): Promise<boolean> {
    const rows = await db.update(photographs).set({ ...set, version: version + 1 }).where(and(eq(photographs.id, id), eq(photographs.version, version))).returning({ id: photographs.id })
    return rows.length === 1
  },
  async setRemoved(id: string, removed: boolean): Promise<void> {
    await db.update(photographs).set({ removedAt: removed ? sql`now()` : null }).where(eq(photographs.id, id))
  },
  /** Drops rows whose upload never finished, and those removed long enough ago that undo is over. */
  async dropForgotten(before: Date): Promise<number> {
    const gone = await db.delete(photographs).where(or(and(isNull(photographs.storedAt), lt(photographs.createdAt, before)), lt(photographs.removedAt, before)))
    return gone.rowCount ?? 0
  },
  /** Which of these content hashes a row still names. */
  async hashesInUse(hashes: readonly string[]): Promise<Set<string>> {
    if (!hashes.length) return new Set()
    const rows = await db.selectDistinct({ hash: photographs.contentHash }).from(photographs).where(inArray(photographs.contentHash, [...hashes]))
    return new Set(rows.map(({ hash }) => hash!))
  },
  /** Stored rows with their hash, for the sweep that looks for missing files. */
  async stored() {
    return db.select({ id: photographs.id, contentHash: photographs.contentHash }).from(photographs).where(isNotNull(photographs.storedAt))
  },
})
