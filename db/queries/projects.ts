import { type SQL, and, desc, eq, ilike, inArray, lt, ne, or, sql } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { memberships, studios } from '#db/schema/studios.ts'
import { patterns } from '#db/schema/patterns.ts'
import { photographs } from '#db/schema/photographs.ts'
import { projects, sizePlans } from '#db/schema/projects.ts'
import { samples } from '#db/schema/samples.ts'
import { wearers } from '#db/schema/wearers.ts'

export type ShelfFilter = 'all' | 'to-size' | 'in-fitting' | 'with-fitter' | 'cleared' | 'resting'
export type ShelfPlace = { updatedAt: Date; id: string }

const shelfColumns = {
  project: projects,
  wearerName: wearers.name,
  garment: patterns.garment,
  /** front view of the newest sample that has one */
  coverPhotographId: sql<string | null>`(select ${photographs.id} from ${photographs} join ${samples} on ${samples.id} = ${photographs.sampleId}
    where ${samples.projectId} = ${sql.raw('"projects"."id"')} and ${photographs.storedAt} is not null and ${photographs.removedAt} is null
    order by ${samples.number} desc, (${photographs.view} = 'front') desc, ${photographs.createdAt} limit 1)`,
}
const isUnder: Record<ShelfFilter, SQL | undefined> = {
  all: undefined,
  'to-size': eq(projects.stage, 'size'),
  'in-fitting': and(eq(projects.stage, 'sample'), or(sql`${projects.sampleState} is null`, ne(projects.sampleState, 'with-fitter'))),
  'with-fitter': and(eq(projects.stage, 'sample'), eq(projects.sampleState, 'with-fitter')),
  cleared: inArray(projects.stage, ['cleared', 'cut']),
  resting: eq(projects.stage, 'resting'),
}
/** A wearer's own account narrows the shelf to what is made for them. */
const onShelf = (studioId: string, wearerUserId?: string) => and(eq(projects.studioId, studioId), wearerUserId ? eq(wearers.userId, wearerUserId) : undefined)
const literally = (words: string) => `%${words.replace(/[\\%_]/g, '\\$&')}%`

export const projectQueries = (db: Queryable) => ({
  /** One page of the shelf, newest work first; `after` is the last card of the page before. */
  async shelf(studioId: string, { filter, q, after, limit, wearerUserId }: { filter: ShelfFilter; q?: string; after?: ShelfPlace; limit: number; wearerUserId?: string }) {
    return db.select(shelfColumns).from(projects)
      .innerJoin(wearers, eq(wearers.id, projects.wearerId)).innerJoin(patterns, eq(patterns.id, projects.patternId))
      .where(and(
        onShelf(studioId, wearerUserId), isUnder[filter],
        q ? or(ilike(projects.name, literally(q)), ilike(wearers.name, literally(q)), ilike(patterns.name, literally(q))) : undefined,
        after ? or(lt(projects.updatedAt, after.updatedAt), and(eq(projects.updatedAt, after.updatedAt), lt(projects.id, after.id))) : undefined,
      ))
      .orderBy(desc(projects.updatedAt), desc(projects.id)).limit(limit)
  },
  async counts(studioId: string, wearerUserId?: string) {
    const [row] = await db.select({
      all: sql<number>`count(*)::int`,
      ...Object.fromEntries((['to-size', 'in-fitting', 'with-fitter', 'cleared', 'resting'] as const).map((filter) => [filter, sql<number>`(count(*) filter (where ${isUnder[filter]}))::int`])),
    }).from(projects).innerJoin(wearers, eq(wearers.id, projects.wearerId)).where(onShelf(studioId, wearerUserId))
    return row as Record<ShelfFilter, number>
  },
  async card(projectId: string) {
    const [row] = await db.select({ ...shelfColumns, studioName: studios.name }).from(projects)
      .innerJoin(wearers, eq(wearers.id, projects.wearerId)).innerJoin(patterns, eq(patterns.id, projects.patternId)).innerJoin(studios, eq(studios.id, projects.studioId))
      .where(eq(projects.id, projectId))
    return row ?? null
  },
  async find(projectId: string) {
    const [row] = await db.select().from(projects).where(eq(projects.id, projectId))
    return row ?? null
  },
  /** Holds the project until the transaction ends, so that two requests do not count or carry at once. */
  async lock(projectId: string): Promise<void> {
    await db.select({ id: projects.id }).from(projects).where(eq(projects.id, projectId)).for('update')
  },
  async insert(project: typeof projects.$inferInsert) {
    const [row] = await db.insert(projects).values(project).returning()
    return row!
  },
  /** False when there is no such project at this version. */
  async update(projectId: string, version: number, set: Partial<typeof projects.$inferInsert>): Promise<boolean> {
    const rows = await db.update(projects).set({ ...set, version: version + 1, updatedAt: sql`clock_timestamp()` })
      .where(and(eq(projects.id, projectId), eq(projects.version, version))).returning({ id: projects.id })
    return rows.length === 1
  },
  /** What the shelf lists by, kept beside the project; counts as work on it. */
  async keep(projectId: string, set: Partial<typeof projects.$inferInsert>): Promise<void> {
    await db.update(projects).set({ ...set, updatedAt: sql`clock_timestamp()` }).where(eq(projects.id, projectId))
  },
  async remove(projectId: string): Promise<void> {
    await db.delete(projects).where(eq(projects.id, projectId))
  },
  async sizePlan(projectId: string) {
    const [row] = await db.select().from(sizePlans).where(eq(sizePlans.projectId, projectId))
    return row ?? null
  },
  async insertSizePlan(plan: typeof sizePlans.$inferInsert) {
    await db.insert(sizePlans).values(plan)
  },
  async updateSizePlan(projectId: string, version: number, set: Partial<typeof sizePlans.$inferInsert>): Promise<boolean> {
    const rows = await db.update(sizePlans).set({ ...set, version: version + 1 }).where(and(eq(sizePlans.projectId, projectId), eq(sizePlans.version, version))).returning({ id: sizePlans.projectId })
    return rows.length === 1
  },
  /** Whether somebody with the role `fitter` is in the studio. */
  async hasFitter(studioId: string): Promise<boolean> {
    const rows = await db.select({ id: memberships.userId }).from(memberships).where(and(eq(memberships.studioId, studioId), eq(memberships.role, 'fitter'))).limit(1)
    return rows.length > 0
  },
})
