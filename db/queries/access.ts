import { and, eq, ne, or } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { memberships } from '#db/schema/studios.ts'
import { projects } from '#db/schema/projects.ts'
import { wearers } from '#db/schema/wearers.ts'

/** What a person can see at all: membership and row in one WHERE, so that no caller can forget the check. */
export const accessQueries = (db: Queryable) => ({
  async membershipOf(userId: string, studioId: string) {
    const [row] = await db.select().from(memberships).where(and(eq(memberships.userId, userId), eq(memberships.studioId, studioId)))
    return row ?? null
  },
  /** The project with the caller's membership; a member with the role `wearer` finds only what is made for them. */
  async projectSeenBy(userId: string, projectId: string) {
    const [row] = await db.select({ project: projects, membership: memberships })
      .from(projects)
      .innerJoin(memberships, and(eq(memberships.studioId, projects.studioId), eq(memberships.userId, userId)))
      .innerJoin(wearers, eq(wearers.id, projects.wearerId))
      .where(and(eq(projects.id, projectId), or(ne(memberships.role, 'wearer'), eq(wearers.userId, userId))))
    return row ?? null
  },
})
