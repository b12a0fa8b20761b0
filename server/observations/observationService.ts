import { type Queryable } from '#db/client.ts'
import { observationQueries } from '#db/queries/observations.ts'
import { photographQueries } from '#db/queries/photographs.ts'
import { projectQueries } from '#db/queries/projects.ts'
import { readProjectState } from '#db/queries/projectState.ts'
import { type ObservationRow } from '#db/schema/observations.ts'
import { type ProjectRow } from '#db/schema/projects.ts'
import { type FittingObservation, type createObservation, type putReading, type updateObservation } from '#shared/contracts/fitting.ts'
import { type RouteBody } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'
import { goesToPaper } from '../projects/projectState.ts'
import { refreshProject } from '../projects/refreshProject.ts'
import { findSample, refuseAfterClearing } from '../samples/sampleService.ts'
import { toObservation } from '../samples/toFitting.ts'
import { staleVersion } from '../staleVersion.ts'

export const observationService = ({ db }: { db: Queryable }) => ({
  async read(projectId: string, id: string): Promise<FittingObservation> {
    const state = await readProjectState(db, projectId)
    const row = state.observations.find((one) => one.id === id)
    if (!row) throw noObservation()
    return toObservation(row, state)
  },

  async create(project: ProjectRow, number: number, notedBy: string, input: RouteBody<typeof createObservation>): Promise<FittingObservation> {
    refuseAfterClearing(project)
    const sample = await findSample(db, project.id, number)
    await checkPhotograph(db, project.id, input.photographId)
    const id = await db.transaction(async (tx) => {
      await projectQueries(tx).lock(project.id)
      const row = await observationQueries(tx).insert({ ...input, projectId: project.id, sampleId: sample.id, notedBy })
      await refreshProject(tx, project.id)
      return row.id
    })
    return this.read(project.id, id)
  },

  /** @throws 'version.stale' with the observation as it is now */
  async update(project: ProjectRow, id: string, { version, letBe, ...set }: RouteBody<typeof updateObservation>): Promise<FittingObservation> {
    refuseAfterClearing(project)
    const row = await find(db, project.id, id)
    if (set.photographId) await checkPhotograph(db, project.id, set.photographId)
    const change = letBe === undefined ? {} : letBe ? { state: 'let-be' as const, letBeReason: letBe.reason } : { state: await stateWithoutReading(db, row), letBeReason: '' }
    const updated = await db.transaction(async (tx) => {
      const done = await observationQueries(tx).update(id, version, { ...set, ...change })
      if (done) await refreshProject(tx, project.id)
      return done
    })
    const now = await this.read(project.id, id)
    if (!updated) throw staleVersion(now)
    return now
  },

  /** Puts it aside; `restore` brings it back with its number. */
  async remove(project: ProjectRow, id: string): Promise<void> {
    refuseAfterClearing(project)
    await find(db, project.id, id)
    await setRemoved(db, project.id, id, new Date())
  },
  async restore(project: ProjectRow, id: string): Promise<FittingObservation> {
    refuseAfterClearing(project)
    const row = await observationQueries(db).find(project.id, id)
    if (!row) throw noObservation()
    await setRemoved(db, project.id, id, null)
    return this.read(project.id, id)
  },

  /** Looks at an earlier observation again. Gone settles it; anything else leaves it open on this sample. */
  async putReading(project: ProjectRow, number: number, id: string, readBy: string, { gone, reversed, amount, note }: RouteBody<typeof putReading>): Promise<FittingObservation> {
    refuseAfterClearing(project)
    const [sample, row] = [await findSample(db, project.id, number), await find(db, project.id, id)]
    if (row.sampleId === sample.id) throw new DomainError('state.wrong', 'This was first seen on this very sample. Change the observation itself.')
    if (gone && (amount || reversed)) throw new DomainError('request.invalid', 'What is gone has no amount. Leave the amount out, or say that it is still there.', { amount: 'Leave it out.' })
    await db.transaction(async (tx) => {
      await projectQueries(tx).lock(project.id)
      await observationQueries(tx).putReading({ observationId: id, sampleId: sample.id, gone, reversed, amount: gone ? null : amount, note, readBy })
      await observationQueries(tx).keep([id], { state: gone ? 'settled' : 'noted', letBeReason: '' })
      await refreshProject(tx, project.id)
    })
    return this.read(project.id, id)
  },
  async removeReading(project: ProjectRow, number: number, id: string): Promise<FittingObservation> {
    refuseAfterClearing(project)
    const [sample, row] = [await findSample(db, project.id, number), await find(db, project.id, id)]
    await db.transaction(async (tx) => {
      await observationQueries(tx).removeReading(id, sample.id)
      await observationQueries(tx).keep([id], { state: await stateWithoutReading(tx, row) })
      await refreshProject(tx, project.id)
    })
    return this.read(project.id, id)
  },
})

const noObservation = () => new DomainError('not-found', 'There is no such observation in this project.')

async function find(db: Queryable, projectId: string, id: string): Promise<ObservationRow> {
  const row = await observationQueries(db).find(projectId, id)
  if (!row || row.removedAt) throw noObservation()
  return row
}

/** What an observation is by its newest reading and change, when neither is given by hand. */
export async function stateWithoutReading(db: Queryable, row: ObservationRow): Promise<ObservationRow['state']> {
  const state = await readProjectState(db, row.projectId)
  const numberOf = new Map(state.samples.map(({ id, number }) => [id, number]))
  const newest = state.readings.filter(({ observationId }) => observationId === row.id).toSorted((a, b) => numberOf.get(b.sampleId)! - numberOf.get(a.sampleId)!)[0]
  if (newest?.gone) return 'settled'
  const answering = state.changes.filter((change) => goesToPaper(change) && change.observationIds.includes(row.id))
  if (answering.some(({ carriedTo }) => carriedTo === null)) return 'chosen'
  const carriedTo = Math.max(0, ...answering.map((change) => change.carriedTo ?? 0))
  return carriedTo > (newest ? numberOf.get(newest.sampleId)! : 0) ? 'carried' : 'noted'
}

async function setRemoved(db: Queryable, projectId: string, id: string, removedAt: Date | null): Promise<void> {
  await db.transaction(async (tx) => {
    await observationQueries(tx).keep([id], { removedAt })
    await refreshProject(tx, projectId)
  })
}

async function checkPhotograph(db: Queryable, projectId: string, photographId: string | null): Promise<void> {
  if (photographId && !(await photographQueries(db).find(projectId, photographId))) {
    throw new DomainError('request.invalid', 'The photograph of this mark is not in this project any more.', { photographId: 'Choose a photograph of this project.' })
  }
}
