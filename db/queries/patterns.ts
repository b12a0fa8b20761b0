import { and, eq, getTableColumns, sql } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { prepared } from '#db/prepared.ts'
import { type PatternRow, patterns } from '#db/schema/patterns.ts'
import { projects } from '#db/schema/projects.ts'

export type PatternWithCount = PatternRow & { projectCount: number }

// Named through its table: inside the subquery a bare "id" would mean the project's.
const columns = {
  ...getTableColumns(patterns),
  projectCount: sql<number>`(select count(*)::int from ${projects} where ${projects.patternId} = ${sql.raw('"patterns"."id"')})`,
}
const inStudio = (studioId: string, id: string) => and(eq(patterns.studioId, studioId), eq(patterns.id, id))

const inStudioById = prepared((db) => db.select(columns).from(patterns).where(and(eq(patterns.studioId, sql.placeholder('studioId')), eq(patterns.id, sql.placeholder('id')))).prepare('pattern'))

export const patternQueries = (db: Queryable) => ({
  async list(studioId: string): Promise<PatternWithCount[]> {
    return db.select(columns).from(patterns).where(eq(patterns.studioId, studioId)).orderBy(patterns.name, patterns.id)
  },
  async find(studioId: string, id: string): Promise<PatternWithCount | null> {
    const [row] = await inStudioById(db).execute({ studioId, id })
    return row ?? null
  },
  async insert(pattern: typeof patterns.$inferInsert): Promise<PatternRow> {
    const [row] = await db.insert(patterns).values(pattern).returning()
    return row!
  },
  /** False when there is no such pattern at this version. */
  async update(studioId: string, id: string, version: number, set: Partial<typeof patterns.$inferInsert>): Promise<boolean> {
    const rows = await db.update(patterns).set({ ...set, version: version + 1, updatedAt: sql`now()` })
      .where(and(inStudio(studioId, id), eq(patterns.version, version))).returning({ id: patterns.id })
    return rows.length === 1
  },
  async remove(studioId: string, id: string): Promise<boolean> {
    return (await db.delete(patterns).where(inStudio(studioId, id))).rowCount === 1
  },
})
