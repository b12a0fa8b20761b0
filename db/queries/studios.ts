import { and, eq, isNotNull, isNull, sql } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { photographs } from '#db/schema/photographs.ts'
import { projects } from '#db/schema/projects.ts'
import { samples } from '#db/schema/samples.ts'
import { type MembershipRow, type StudioRow, memberships, studios } from '#db/schema/studios.ts'
import { users } from '#db/schema/users.ts'

const one = (studioId: string, userId: string) => and(eq(memberships.studioId, studioId), eq(memberships.userId, userId))

export const studioQueries = (db: Queryable) => ({
  async insert(name: string): Promise<StudioRow> {
    const [row] = await db.insert(studios).values({ name }).returning()
    return row!
  },
  async find(id: string): Promise<StudioRow | null> {
    const [row] = await db.select().from(studios).where(eq(studios.id, id))
    return row ?? null
  },
  async rename(id: string, name: string): Promise<void> {
    await db.update(studios).set({ name }).where(eq(studios.id, id))
  },
  async members(studioId: string) {
    return db.select({ userId: users.id, name: users.name, email: users.email, role: memberships.role, joinedAt: memberships.createdAt })
      .from(memberships).innerJoin(users, eq(users.id, memberships.userId))
      .where(eq(memberships.studioId, studioId)).orderBy(memberships.createdAt, users.name)
  },
  /** The studio's memberships, locked until the transaction ends: two owners cannot both step down at once. */
  async lockMembers(studioId: string): Promise<MembershipRow[]> {
    return db.select().from(memberships).where(eq(memberships.studioId, studioId)).orderBy(memberships.userId).for('update')
  },
  async addMember(member: typeof memberships.$inferInsert): Promise<void> {
    await db.insert(memberships).values(member).onConflictDoUpdate({ target: [memberships.studioId, memberships.userId], set: { role: member.role } })
  },
  async setRole(studioId: string, userId: string, role: MembershipRow['role']): Promise<void> {
    await db.update(memberships).set({ role }).where(one(studioId, userId))
  },
  async removeMember(studioId: string, userId: string): Promise<void> {
    await db.delete(memberships).where(one(studioId, userId))
  },
  /** Photographs that are stored and not removed, and their bytes in all sizes. */
  async photographUse(studioId: string): Promise<{ count: number; bytes: number }> {
    const [row] = await db.select({ count: sql<number>`count(*)::int`, bytes: sql<number>`coalesce(sum(${photographs.bytes}), 0)::float8` })
      .from(photographs).innerJoin(samples, eq(samples.id, photographs.sampleId)).innerJoin(projects, eq(projects.id, samples.projectId))
      .where(and(eq(projects.studioId, studioId), isNotNull(photographs.storedAt), isNull(photographs.removedAt)))
    return row!
  },
})
