import { randomUUID } from 'node:crypto'
import { fileURLToPath } from 'node:url'
import { type Queryable } from '#db/client.ts'
import { projectQueries } from '#db/queries/projects.ts'
import { type ProjectRow } from '#db/schema/projects.ts'
import { changeService } from '#server/changes/changeService.ts'
import { commentService } from '#server/comments/commentService.ts'
import { finalCutService } from '#server/finalCuts/finalCutService.ts'
import { observationService } from '#server/observations/observationService.ts'
import { patternService } from '#server/patterns/patternService.ts'
import { photographService } from '#server/photographs/photographService.ts'
import { pieceService } from '#server/pieces/pieceService.ts'
import { projectService } from '#server/projects/projectService.ts'
import { sampleService } from '#server/samples/sampleService.ts'
import { sizePlanService } from '#server/sizePlans/sizePlanService.ts'
import { type PhotographStore } from '#server/storage/store.ts'
import { wearerService } from '#server/wearers/wearerService.ts'
import { type FittingObservation, type Mark, type createObservation } from '#shared/contracts/fitting.ts'
import { type patternInput } from '#shared/contracts/pattern.ts'
import { type RouteBody } from '#shared/contracts/route.ts'
import { type View } from '#shared/fit/types.ts'
import { type z } from 'zod'

type Observation = RouteBody<typeof createObservation>
export type SeedObservation = Pick<Observation, 'sign' | 'zone' | 'view' | 'side'> & Partial<Observation> & { kind: Mark['kind']; points: Mark['points']; shape?: Mark['shape'] }
export type People = { ilse: string; rosalind: string; jonah: string; tamsin: string }

const pictures = fileURLToPath(new URL('./photographs/', import.meta.url))
/** ISO date some days before today. */
export const daysAgo = (days: number): string => new Date(Date.now() - days * 86_400_000).toISOString().slice(0, 10)
/** The next Thursday at four in the afternoon. */
export function nextThursday(): Date {
  const day = new Date()
  day.setDate(day.getDate() + ((4 - day.getDay() + 7) % 7 || 7))
  day.setHours(16, 0, 0, 0)
  return day
}

/** Does what a person does in the studio, through the services a person goes through. */
export class SeedStudio {
  constructor(private readonly db: Queryable, private readonly storage: PhotographStore, readonly studioId: string, readonly people: People) {}

  async measure(wearerId: string, takenOn: string, mm: Readonly<Record<string, number>>): Promise<void> {
    await wearerService({ db: this.db }).createSet(this.studioId, wearerId, {
      takenOn, takenBy: 'Ilse', note: '', measurements: Object.entries(mm).map(([code, value]) => ({ code, readingsMm: [value - 2, value + 2] })),
    })
  }

  /** Hangs a garment from a pattern of its own. */
  async hang(name: string, wearerId: string, pattern: z.output<typeof patternInput>, makerId = this.people.ilse): Promise<string> {
    const made = await patternService({ db: this.db }).create(this.studioId, pattern)
    return (await projectService({ db: this.db }).create(this.studioId, makerId, 'maker', { name, wearerId, patternId: made.id, note: '' })).id
  }

  async project(projectId: string): Promise<ProjectRow> {
    return (await projectQueries(this.db).find(projectId))!
  }

  async keepSize(projectId: string, choices: Record<string, string>, reason: string): Promise<void> {
    const [project, service] = [await this.project(projectId), sizePlanService({ db: this.db })]
    await service.update(project, { choices, reason, lengthsMm: {}, keep: true, version: (await service.read(project)).version })
  }

  /** Traces the usual pieces with every mark, and takes the last look. */
  async trace(projectId: string, hangs: string): Promise<void> {
    const [project, service] = [await this.project(projectId), pieceService({ db: this.db })]
    for (const piece of (await service.start(project)).pieces) {
      const counted = await service.update(project, piece.id, { notchCount: piece.notchCount ?? 3, dartCount: piece.dartCount ?? 1, hangs, version: piece.version })
      await service.update(project, piece.id, { marks: Object.fromEntries(counted.missing.map((mark) => [mark, 'marked' as const])), version: counted.version })
    }
    await service.lastLook(project)
  }

  async startSample(projectId: string, cloth: string): Promise<number> {
    return (await sampleService({ db: this.db }).start(await this.project(projectId), { cloth })).number
  }

  /** Moves a sample on, one step after the other. */
  async moveTo(projectId: string, number: number, ...states: ('to-photograph' | 'with-fitter' | 'reviewed')[]): Promise<void> {
    const service = sampleService({ db: this.db })
    for (const state of states) {
      const project = await this.project(projectId)
      await service.update(project, number, { state, ...(state === 'to-photograph' && { sewnOn: daysAgo(1) }), version: (await service.read(project, number)).sample.version })
    }
  }

  /** Puts drawn pictures on a sample: `art` names them without their view. @returns view → photograph's id */
  async photograph(projectId: string, number: number, art: string, views: readonly View[]): Promise<Partial<Record<View, string>>> {
    const ids: Partial<Record<View, string>> = {}
    for (const view of views) {
      const added = await photographService({ db: this.db, storage: this.storage }).add(await this.project(projectId), number, {
        path: `${pictures}${art}-${view}.jpg`, id: randomUUID(), takenBy: this.people.ilse, view, caption: 'Drawn illustration', pose: 'standing', drawing: true,
      })
      ids[view] = added.id
    }
    return ids
  }

  async note(projectId: string, number: number, photographs: Partial<Record<View, string>>, { kind, points, shape = 'stroke', ...seen }: SeedObservation, by = this.people.ilse): Promise<FittingObservation> {
    return observationService({ db: this.db }).create(await this.project(projectId), number, by, {
      direction: null, towards: null, line: null, severity: 2, amount: null, note: '', ...seen, photographId: photographs[seen.view] ?? null, mark: { kind, shape, points },
    })
  }

  async letBe(projectId: string, { id, version }: FittingObservation, reason: string): Promise<void> {
    await observationService({ db: this.db }).update(await this.project(projectId), id, { letBe: { reason }, version })
  }

  async lookAgain(projectId: string, number: number, observationId: string, reading: { gone: true } | { mm: number; as: 'cloth' | 'gap' | 'shift' | 'fold-depth' }): Promise<void> {
    await observationService({ db: this.db }).putReading(await this.project(projectId), number, observationId, this.people.rosalind, 'gone' in reading
      ? { gone: true, reversed: false, amount: null, note: '' } : { gone: false, reversed: false, amount: reading, note: '' })
  }

  /** Accepts what is suggested, as it is; with `causes` only those. */
  async accept(projectId: string, number: number, causes?: readonly string[]): Promise<void> {
    const project = await this.project(projectId)
    const { diagnosis } = await sampleService({ db: this.db }).read(project, number)
    for (const { cause, side, advice } of diagnosis.findings) {
      if (advice === 'leave-it' || (causes && !causes.includes(cause))) continue
      await changeService({ db: this.db }).decide(project, number, this.people.ilse, { cause, side, decision: 'accepted', note: '' })
    }
  }

  /** Ticks every change as drawn on every piece it touches. */
  async drawChanges(projectId: string): Promise<void> {
    const [project, service] = [await this.project(projectId), pieceService({ db: this.db })]
    for (const piece of (await service.list(project)).pieces) {
      for (const { changeId } of piece.changes) await service.setTransfer(project, piece.id, changeId, this.people.ilse, true)
    }
  }

  async say(projectId: string, authorId: string, sampleNumber: number, text: string): Promise<void> {
    await commentService({ db: this.db }).create(projectId, authorId, { text, sampleNumber })
  }

  async fittingOn(projectId: string, when: Date): Promise<void> {
    const project = await this.project(projectId)
    await projectService({ db: this.db }).update(projectId, 'maker', { nextFittingAt: when.toISOString(), version: project.version })
  }

  /** Describes the cloth, ticks the list and clears the cut. */
  async clear(projectId: string, cloth: { name: string; widthMm: number; lengthMm: number; neededMm: number; statedWidthMm: number }): Promise<void> {
    const [project, service] = [await this.project(projectId), finalCutService({ db: this.db })]
    await service.agree(project, this.people.rosalind, true)
    const described = await service.update(project, { cloth: { ...cloth, oneWay: false, matching: false }, shrinkage: { markedMm: 250, lengthAfterMm: 243, widthAfterMm: 248 }, version: (await service.read(project)).version })
    await service.update(project, { ticks: Object.fromEntries(described.items.filter(({ verified }) => !verified).map(({ id }) => [id, true])), version: described.version })
    await service.clear(project, this.people.ilse)
  }
}
