import { and, eq, inArray, isNotNull, ne, sql } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { changeObservations, changes } from '#db/schema/changes.ts'
import { observations } from '#db/schema/observations.ts'
import { patterns } from '#db/schema/patterns.ts'
import { projects } from '#db/schema/projects.ts'

export const settledChangeQueries = (db: Queryable) => ({
  /** Changes of a wearer's cleared or cut projects that were sewn and after which nothing they answer stayed open; oldest first. */
  async ofWearer(studioId: string, wearerId: string) {
    return db.select({ cause: sql<string>`${changes.cause}`, title: changes.title, amountMm: changes.amountMm, garment: patterns.garment, projectId: projects.id })
      .from(changes)
      .innerJoin(projects, eq(projects.id, changes.projectId))
      .innerJoin(patterns, eq(patterns.id, projects.patternId))
      .where(and(
        eq(projects.studioId, studioId), eq(projects.wearerId, wearerId), inArray(projects.stage, ['cleared', 'cut']),
        isNotNull(changes.cause), ne(changes.decision, 'declined'), isNotNull(changes.carriedTo),
        sql`exists (select 1 from ${changeObservations} where ${changeObservations.changeId} = ${changes.id})`,
        sql`not exists (select 1 from ${changeObservations} join ${observations} on ${observations.id} = ${changeObservations.observationId}
          where ${changeObservations.changeId} = ${changes.id} and ${observations.removedAt} is null and ${observations.state} <> 'settled')`,
      ))
      .orderBy(changes.decidedAt)
  },
})
export type SettledChange = Awaited<ReturnType<ReturnType<typeof settledChangeQueries>['ofWearer']>>[number]
