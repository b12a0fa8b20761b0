import { and, eq, ne, or, sql } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { prepared } from '#db/prepared.ts'
import { memberships } from '#db/schema/studios.ts'
import { projects } from '#db/schema/projects.ts'
import { wearers } from '#db/schema/wearers.ts'

const userId = sql.placeholder('userId')

const membershipOf = prepared((db) => db.select().from(memberships)
  .where(and(eq(memberships.userId, userId), eq(memberships.studioId, sql.placeholder('studioId'))))
  .prepare('access_studio'))

const projectSeenBy = prepared((db) => db.select({ project: projects, membership: memberships })
  .from(projects)
  .innerJoin(memberships, and(eq(memberships.studioId, projects.studioId), eq(memberships.userId, userId)))
  .innerJoin(wearers, eq(wearers.id, projects.wearerId))
  .where(and(eq(projects.id, sql.placeholder('projectId')), or(ne(memberships.role, 'wearer'), eq(wearers.userId, userId))))
  .prepare('access_project'))

/** What a person can see at all: membership and row in one WHERE, so that no caller can forget the check. Asked on every request. */
export const accessQueries = (db: Queryable) => ({
  async membershipOf(userId: string, studioId: string) {
    const [row] = await membershipOf(db).execute({ userId, studioId })
    return row ?? null
  },
  /** The project with the caller's membership; a member with the role `wearer` finds only what is made for them. */
  async projectSeenBy(userId: string, projectId: string) {
    const [row] = await projectSeenBy(db).execute({ userId, projectId })
    return row ?? null
  },
})
