import { type Queryable } from '#db/client.ts'
import { auditQueries } from '#db/queries/auditEntries.ts'
import { finalCutQueries } from '#db/queries/finalCuts.ts'
import { patternQueries } from '#db/queries/patterns.ts'
import { type ShelfPlace, projectQueries } from '#db/queries/projects.ts'
import { readProjectState } from '#db/queries/projectState.ts'
import { wearerQueries } from '#db/queries/wearers.ts'
import { type ProjectRow } from '#db/schema/projects.ts'
import { type Role } from '#shared/contracts/permissions.ts'
import { type Project, type ProjectCard, type createProject, type listProjects, type updateProject } from '#shared/contracts/project.ts'
import { type RouteBody, type RouteQuery, type RouteResponse } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'
import { toPattern } from '../patterns/patternService.ts'
import { staleVersion } from '../staleVersion.ts'
import { toMeasurementSet } from '../wearers/wearerService.ts'
import { beforeTheCut } from './beforeTheCut.ts'
import { progress } from './progress.ts'
import { refreshProject } from './refreshProject.ts'

type Seer = { userId: string; role: Role }
type Card = Awaited<ReturnType<ReturnType<typeof projectQueries>['shelf']>>[number]

export const projectService = ({ db }: { db: Queryable }) => ({
  /** One page of the shelf. A wearer finds only what is made for them. */
  async list(studioId: string, { filter, q, after, limit }: RouteQuery<typeof listProjects>, seer: Seer): Promise<RouteResponse<typeof listProjects>> {
    const wearerUserId = seer.role === 'wearer' ? seer.userId : undefined
    const projects = projectQueries(db)
    const [rows, counts] = [
      // one more than asked for tells whether there is another page
      await projects.shelf(studioId, { filter, q: q || undefined, after: after ? readPlace(after) : undefined, limit: limit + 1, wearerUserId }),
      await projects.counts(studioId, wearerUserId),
    ]
    const shown = rows.slice(0, limit)
    return { projects: shown.map(toCard), counts, next: rows.length > limit ? writePlace(shown.at(-1)!.project) : null }
  },

  async read(projectId: string, role: Role): Promise<Project> {
    const card = await projectQueries(db).card(projectId)
    if (!card) throw new DomainError('not-found', 'There is no such project.')
    const { project } = card
    const [pattern, sets, plan, state, cut] = [
      await patternQueries(db).find(project.studioId, project.patternId), await wearerQueries(db).sets(project.wearerId),
      await projectQueries(db).sizePlan(projectId), await readProjectState(db, projectId), await finalCutQueries(db).find(projectId),
    ]
    const sizeKept = Boolean(plan?.keptAt)
    return {
      ...toCard(card), studioId: project.studioId, studioName: card.studioName, version: project.version, note: project.note, role,
      pattern: toPattern(pattern!), latestSet: sets[0] ? toMeasurementSet(sets[0]) : null,
      samples: state.samples.map(({ number, state: at }) => ({ number, state: at })), sizeKept,
      beforeTheCut: cut?.clearedAt ? [] : beforeTheCut(state, sizeKept), createdAt: project.createdAt.toISOString(),
    }
  },

  async create(studioId: string, makerId: string, role: Role, { name, wearerId, patternId, note }: RouteBody<typeof createProject>): Promise<Project> {
    if (!(await wearerQueries(db).find(studioId, wearerId, null))) throw new DomainError('request.invalid', 'This wearer is not in the studio. Choose another.', { wearerId: 'Choose a wearer of this studio.' })
    if (!(await patternQueries(db).find(studioId, patternId))) throw new DomainError('request.invalid', 'This pattern is not in the studio. Choose another.', { patternId: 'Choose a pattern of this studio.' })
    const id = await db.transaction(async (tx) => {
      const row = await projectQueries(tx).insert({ studioId, makerId, wearerId, patternId, name, note })
      await projectQueries(tx).insertSizePlan({ projectId: row.id, choices: {}, lengthsMm: {} })
      return row.id
    })
    return this.read(id, role)
  },

  /** @throws 'version.stale' with the project as it is now */
  async update(projectId: string, role: Role, { version, resting, nextFittingAt, ...words }: RouteBody<typeof updateProject>): Promise<Project> {
    const row = await projectQueries(db).find(projectId)
    if (!row) throw new DomainError('not-found', 'There is no such project.')
    const rest: Partial<Pick<ProjectRow, 'stage' | 'restedFrom'>> = resting === undefined || resting === (row.stage === 'resting') ? {}
      : resting ? { stage: 'resting', restedFrom: row.stage } : { stage: row.restedFrom ?? 'size', restedFrom: null }
    const updated = await projectQueries(db).update(projectId, version, { ...words, ...rest, ...(nextFittingAt === undefined ? {} : { nextFittingAt: nextFittingAt ? new Date(nextFittingAt) : null }) })
    if (!updated) throw staleVersion(await this.read(projectId, role))
    await refreshProject(db, projectId)
    return this.read(projectId, role)
  },

  /** Takes a project off the rail for good; its photographs' files go with the next sweep. */
  async remove(projectId: string, studioId: string, byUserId: string): Promise<void> {
    await db.transaction(async (tx) => {
      await projectQueries(tx).remove(projectId)
      await auditQueries(tx).add('project.removed', { userId: byUserId, studioId }, { project: projectId })
    })
  },
})

/** A card as it is sent. */
const toCard = ({ project, wearerName, garment, coverPhotographId }: Card): ProjectCard => ({
  id: project.id, name: project.name, garment: garment as ProjectCard['garment'], wearer: { id: project.wearerId, name: wearerName }, stage: project.stage,
  sample: project.sampleNumber !== null && project.sampleState ? { number: project.sampleNumber, state: project.sampleState } : null,
  openCount: project.openCount, progress: progress(project), nextFittingAt: project.nextFittingAt?.toISOString() ?? null, coverPhotographId, updatedAt: project.updatedAt.toISOString(),
})

const writePlace = ({ updatedAt, id }: ShelfPlace) => Buffer.from(JSON.stringify([updatedAt.toISOString(), id])).toString('base64url')
function readPlace(text: string): ShelfPlace {
  try {
    const [updatedAt, id] = JSON.parse(Buffer.from(text, 'base64url').toString()) as [string, string]
    const place = { updatedAt: new Date(updatedAt), id }
    if (!/^[0-9a-f-]{36}$/i.test(id) || Number.isNaN(place.updatedAt.getTime())) throw new Error('not a place')
    return place
  } catch (cause) {
    throw new DomainError('request.invalid', 'This page of the rail cannot be found. Start again from the first.', { after: 'Leave it out for the first page.' }, { cause })
  }
}
