import { and, desc, eq, sql } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { projects } from '#db/schema/projects.ts'
import { type MeasurementSetRow, type WearerRow, measurementSets, wearers } from '#db/schema/wearers.ts'

/** What a list shows of a wearer besides the row itself. */
export type WearerWithCounts = WearerRow & { projectCount: number; latestSetOn: string | null }

// Named through its table: inside these subqueries a bare "id" would mean the inner table's.
const wearerId = sql.raw('"wearers"."id"')
const counts = {
  projectCount: sql<number>`(select count(*)::int from ${projects} where ${projects.wearerId} = ${wearerId})`,
  latestSetOn: sql<string | null>`(select max(${measurementSets.takenOn})::text from ${measurementSets} where ${measurementSets.wearerId} = ${wearerId})`,
}
const columns = {
  id: wearers.id, studioId: wearers.studioId, userId: wearers.userId, name: wearers.name, note: wearers.note,
  version: wearers.version, createdAt: wearers.createdAt, ...counts,
}
/** @param onlyUserId - narrows to wearers whose account this is: what a member with the role `wearer` may see */
const seen = (studioId: string, id: string | null, onlyUserId: string | null) => and(
  eq(wearers.studioId, studioId),
  id === null ? undefined : eq(wearers.id, id),
  onlyUserId === null ? undefined : eq(wearers.userId, onlyUserId),
)
// A set belongs to a studio through its wearer: both in one WHERE, also for a change.
const setOf = (studioId: string, wearer: string, id: string) => and(
  eq(measurementSets.id, id), eq(measurementSets.wearerId, wearer),
  sql`exists (select 1 from ${wearers} where ${wearers.id} = ${measurementSets.wearerId} and ${wearers.studioId} = ${studioId})`,
)

export const wearerQueries = (db: Queryable) => ({
  async list(studioId: string, onlyUserId: string | null): Promise<WearerWithCounts[]> {
    return db.select(columns).from(wearers).where(seen(studioId, null, onlyUserId)).orderBy(wearers.name, wearers.id)
  },
  async find(studioId: string, id: string, onlyUserId: string | null): Promise<WearerWithCounts | null> {
    const [row] = await db.select(columns).from(wearers).where(seen(studioId, id, onlyUserId))
    return row ?? null
  },
  async insert(wearer: typeof wearers.$inferInsert): Promise<WearerRow> {
    const [row] = await db.insert(wearers).values(wearer).returning()
    return row!
  },
  /** False when there is no such wearer at this version. */
  async update(studioId: string, id: string, version: number, set: Partial<Pick<WearerRow, 'name' | 'note'>>): Promise<boolean> {
    const rows = await db.update(wearers).set({ ...set, version: version + 1 })
      .where(and(seen(studioId, id, null), eq(wearers.version, version))).returning({ id: wearers.id })
    return rows.length === 1
  },
  async linkAccount(studioId: string, id: string, userId: string): Promise<void> {
    await db.update(wearers).set({ userId }).where(seen(studioId, id, null))
  },
  /** The wearers of this studio lose their link to an account that left it. */
  async unlinkAccount(studioId: string, userId: string): Promise<void> {
    await db.update(wearers).set({ userId: null }).where(seen(studioId, null, userId))
  },
  async remove(studioId: string, id: string): Promise<boolean> {
    return (await db.delete(wearers).where(seen(studioId, id, null))).rowCount === 1
  },

  /** Newest first. */
  async sets(wearer: string): Promise<MeasurementSetRow[]> {
    return db.select().from(measurementSets).where(eq(measurementSets.wearerId, wearer)).orderBy(desc(measurementSets.takenOn), desc(measurementSets.updatedAt))
  },
  async findSet(studioId: string, wearer: string, id: string): Promise<MeasurementSetRow | null> {
    const [row] = await db.select().from(measurementSets).where(setOf(studioId, wearer, id))
    return row ?? null
  },
  async insertSet(set: typeof measurementSets.$inferInsert): Promise<MeasurementSetRow> {
    const [row] = await db.insert(measurementSets).values(set).returning()
    return row!
  },
  /** Null when there is no such set at this version. */
  async updateSet(studioId: string, wearer: string, id: string, version: number, set: Pick<MeasurementSetRow, 'takenOn' | 'takenBy' | 'note' | 'measurements'>): Promise<MeasurementSetRow | null> {
    const [row] = await db.update(measurementSets).set({ ...set, version: version + 1, updatedAt: sql`now()` })
      .where(and(setOf(studioId, wearer, id), eq(measurementSets.version, version))).returning()
    return row ?? null
  },
  async removeSet(studioId: string, wearer: string, id: string): Promise<boolean> {
    return (await db.delete(measurementSets).where(setOf(studioId, wearer, id))).rowCount === 1
  },
})
