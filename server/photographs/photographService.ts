import { type Readable } from 'node:stream'
import { type Queryable } from '#db/client.ts'
import { auditQueries } from '#db/queries/auditEntries.ts'
import { photographQueries } from '#db/queries/photographs.ts'
import { projectQueries } from '#db/queries/projects.ts'
import { type ProjectRow } from '#db/schema/projects.ts'
import { type Photograph, type PhotographSize, photographLimits, type updatePhotograph, type uploadPhotograph } from '#shared/contracts/photograph.ts'
import { type RouteBody } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'
import { findSample, refuseAfterClearing } from '../samples/sampleService.ts'
import { toPhotograph } from '../samples/toFitting.ts'
import { staleVersion } from '../staleVersion.ts'
import { type PhotographStore } from '../storage/store.ts'
import { decodeHeic } from './decodeHeic.ts'
import { makeSizes } from './makeSizes.ts'
import { decodeInTurn } from './pool.ts'
import { readImageType } from './readImageType.ts'
import { keyOf, storeSizes } from './storedSizes.ts'

type Row = NonNullable<Awaited<ReturnType<ReturnType<typeof photographQueries>['find']>>>
type Upload = RouteBody<typeof uploadPhotograph> & { path: string; id: string; takenBy: string; drawing?: boolean }

export const photographService = ({ db, storage }: { db: Queryable; storage: PhotographStore }) => ({
  /**
   * Takes one uploaded file in: the row first as an intent, then the files by their content, then the row is confirmed. A repeated
   * upload finds what the first one made.
   * @param upload.path - the file in its temporary place
   */
  async add(project: ProjectRow, number: number, { path, id, takenBy, drawing = false, view, caption, pose }: Upload): Promise<Photograph> {
    refuseAfterClearing(project)
    const done = await photographQueries(db).find(project.id, id)
    if (done) return toSent(done)
    const sample = await findSample(db, project.id, number)
    await checkRoom(db, project, sample.id)
    const { heic } = await readImageType(path)
    const made = await decodeInTurn(async () => makeSizes(heic ? await decodeHeic(path) : path))
    await photographQueries(db).insertIntent({ id, sampleId: sample.id, view, caption, pose, drawing, takenBy })
    const stored = await storeSizes(storage, made)
    await photographQueries(db).confirm(id, { ...stored, width: made.width, height: made.height })
    await projectQueries(db).keep(project.id, {})
    return toSent(await find(db, project.id, id))
  },

  /** @throws 'version.stale' with the photograph as it is now */
  async update(project: ProjectRow, id: string, { version, ...set }: RouteBody<typeof updatePhotograph>): Promise<Photograph> {
    refuseAfterClearing(project)
    await find(db, project.id, id)
    const updated = await photographQueries(db).update(id, version, set)
    const now = toSent(await find(db, project.id, id))
    if (!updated) throw staleVersion(now)
    return now
  },

  /** Hides it at once; for a day it can be brought back, then the sweep takes row and files. */
  async remove(project: ProjectRow, id: string, byUserId: string): Promise<void> {
    refuseAfterClearing(project)
    await find(db, project.id, id)
    await photographQueries(db).setRemoved(id, true)
    await auditQueries(db).add('photograph.removed', { userId: byUserId, studioId: project.studioId }, { photograph: id })
  },
  async restore(project: ProjectRow, id: string): Promise<Photograph> {
    refuseAfterClearing(project)
    const row = await photographQueries(db).find(project.id, id)
    if (!row) throw noPhotograph()
    await photographQueries(db).setRemoved(id, false)
    return toSent({ ...row, removedAt: null })
  },

  /** The file of one size. @returns its stream, bytes and a tag that changes with the content */
  async open(projectId: string, id: string, size: PhotographSize): Promise<{ stream: Readable; bytes: number; tag: string }> {
    const row = await find(db, projectId, id)
    const file = await storage.get(keyOf(row.contentHash!, size))
    if (!file) throw new DomainError('photograph.missing', 'The file of this photograph is not in the store. Add it again if you still have it.')
    return { ...file, tag: `"${row.contentHash}-${size}"` }
  },
})

const noPhotograph = () => new DomainError('not-found', 'There is no such photograph in this project.')

async function find(db: Queryable, projectId: string, id: string): Promise<Row> {
  const row = await photographQueries(db).find(projectId, id)
  if (!row || row.removedAt) throw noPhotograph()
  return row
}

async function checkRoom(db: Queryable, project: ProjectRow, sampleId: string): Promise<void> {
  if ((await photographQueries(db).countInSample(sampleId)) >= photographLimits.perSample) {
    throw new DomainError('photograph.too-large', `A sample keeps at most ${photographLimits.perSample} photographs. Remove one you no longer need first.`)
  }
  if ((await photographQueries(db).bytesInStudio(project.studioId)) >= photographLimits.quotaBytes) {
    throw new DomainError('storage.full', `The studio’s ${Math.round(photographLimits.quotaBytes / 1024 ** 3)} GB for photographs are full. Remove photographs you no longer need, then send this one again.`)
  }
}

const toSent = (row: Row): Photograph => toPhotograph(row, row.sampleNumber, new Map(row.takenBy && row.takerName ? [[row.takenBy, row.takerName]] : []))
