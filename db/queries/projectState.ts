import { asc, eq, inArray, isNotNull, isNull, and } from 'drizzle-orm'
import { type Queryable } from '#db/client.ts'
import { type ChangeRow, changeObservations, changes } from '#db/schema/changes.ts'
import { type ObservationRow, type ReadingRow, observations, readings } from '#db/schema/observations.ts'
import { type PhotographRow, photographs } from '#db/schema/photographs.ts'
import { type PieceRow, pieces, transfers } from '#db/schema/pieces.ts'
import { type SampleRow, samples } from '#db/schema/samples.ts'
import { users } from '#db/schema/users.ts'

/** Everything that happened in one project, as rows. Small: some samples, some dozens of observations. */
export type ProjectState = {
  samples: SampleRow[]
  photographs: PhotographRow[]
  observations: ObservationRow[]
  readings: ReadingRow[]
  changes: (ChangeRow & { observationIds: string[] })[]
  pieces: PieceRow[]
  /** pairs that are ticked */
  transfers: { changeId: string; pieceId: string }[]
  names: ReadonlyMap<string, string>
}

/** Reads a project whole, what was removed left out. */
export async function readProjectState(db: Queryable, projectId: string): Promise<ProjectState> {
  const sampleRows = await db.select().from(samples).where(eq(samples.projectId, projectId)).orderBy(asc(samples.number))
  const sampleIds = sampleRows.map(({ id }) => id)
  // One after the other: inside a transaction they share one connection anyway.
  const [photographRows, observationRows, changeRows, pieceRows] = [
    sampleIds.length ? await db.select().from(photographs).where(and(inArray(photographs.sampleId, sampleIds), isNotNull(photographs.storedAt), isNull(photographs.removedAt))).orderBy(asc(photographs.createdAt)) : [],
    await db.select().from(observations).where(and(eq(observations.projectId, projectId), isNull(observations.removedAt))).orderBy(asc(observations.number)),
    await db.select().from(changes).where(eq(changes.projectId, projectId)).orderBy(asc(changes.decidedAt)),
    await db.select().from(pieces).where(eq(pieces.projectId, projectId)).orderBy(asc(pieces.number)),
  ]
  const observationIds = observationRows.map(({ id }) => id)
  const changeIds = changeRows.map(({ id }) => id)
  const [readingRows, links, transferRows] = [
    observationIds.length ? await db.select().from(readings).where(inArray(readings.observationId, observationIds)) : [],
    changeIds.length ? await db.select().from(changeObservations).where(inArray(changeObservations.changeId, changeIds)) : [],
    changeIds.length ? await db.select({ changeId: transfers.changeId, pieceId: transfers.pieceId }).from(transfers).where(inArray(transfers.changeId, changeIds)) : [],
  ]
  const userIds = new Set([...photographRows.map(({ takenBy }) => takenBy), ...observationRows.map(({ notedBy }) => notedBy), ...readingRows.map(({ readBy }) => readBy), ...changeRows.map(({ decidedBy }) => decidedBy)].filter((id) => id !== null))
  const people = userIds.size ? await db.select({ id: users.id, name: users.name }).from(users).where(inArray(users.id, [...userIds])) : []
  const kept = new Set(observationIds)
  return {
    samples: sampleRows, photographs: photographRows, observations: observationRows, readings: readingRows, pieces: pieceRows, transfers: transferRows,
    changes: changeRows.map((change) => ({ ...change, observationIds: links.filter(({ changeId, observationId }) => changeId === change.id && kept.has(observationId)).map(({ observationId }) => observationId) })),
    names: new Map(people.map(({ id, name }) => [id, name])),
  }
}
