import { type Queryable } from '#db/client.ts'
import { changeQueries } from '#db/queries/changes.ts'
import { observationQueries } from '#db/queries/observations.ts'
import { projectQueries } from '#db/queries/projects.ts'
import { type ProjectState, readProjectState } from '#db/queries/projectState.ts'
import { sampleQueries } from '#db/queries/samples.ts'
import { type ProjectRow } from '#db/schema/projects.ts'
import { type SampleRow } from '#db/schema/samples.ts'
import { type Fitting, type Sample, type readStory, type startSample, type updateSample } from '#shared/contracts/fitting.ts'
import { sampleStates } from '#shared/contracts/project.ts'
import { type RouteBody, type RouteResponse } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'
import { diagnose } from '#shared/fit/diagnose.ts'
import { type Diagnosis } from '#shared/fit/types.ts'
import { allReady } from '#shared/tracing/missingMarks.ts'
import { goesToPaper } from '../projects/projectState.ts'
import { refreshProject } from '../projects/refreshProject.ts'
import { sizePlanService } from '../sizePlans/sizePlanService.ts'
import { staleVersion } from '../staleVersion.ts'
import { askedAgain } from './askedAgain.ts'
import { fitInput } from './fitInput.ts'
import { toChange, toObservation, toPhotograph, toSample } from './toFitting.ts'

const noSample = () => new DomainError('not-found', 'There is no such sample in this project.')

/** @throws 'not-found' */
export async function findSample(db: Queryable, projectId: string, number: number): Promise<SampleRow> {
  const row = await sampleQueries(db).find(projectId, number)
  if (!row) throw noSample()
  return row
}

/** What is cleared to cut can only be read. @throws 'state.wrong' */
export function refuseAfterClearing({ stage }: Pick<ProjectRow, 'stage'>): void {
  if (stage === 'cleared' || stage === 'cut') throw new DomainError('state.wrong', 'This garment is cleared to cut; its samples and pieces can only be read.')
}

export const sampleService = ({ db }: { db: Queryable }) => ({
  /**
   * Starts the next sample with every change that waits for it.
   * @throws 'state.wrong' while size or tracing are not ready, or the sample before is not reviewed
   */
  async start(project: ProjectRow, { cloth }: RouteBody<typeof startSample>): Promise<Sample> {
    refuseAfterClearing(project)
    return db.transaction(async (tx) => {
      await projectQueries(tx).lock(project.id)
      const [state, plan, row] = [await readProjectState(tx, project.id), await projectQueries(tx).sizePlan(project.id), await projectQueries(tx).find(project.id)]
      const before = state.samples.at(-1)
      if (before) checkReviewed(before)
      else checkTraced(state, Boolean(plan?.keptAt), row!)
      const number = (before?.number ?? 0) + 1
      const made = await sampleQueries(tx).insert({ projectId: project.id, number, cloth: cloth || before?.cloth || '', answers: {} })
      if (before) await sampleQueries(tx).keep(before.id, { state: 'closed' })
      const waiting = state.changes.filter((change) => goesToPaper(change) && change.carriedTo === null)
      await changeQueries(tx).carry(waiting.map(({ id }) => id), number)
      const answered = new Set(waiting.flatMap(({ observationIds }) => observationIds))
      await observationQueries(tx).keep(state.observations.filter(({ id, state: now }) => answered.has(id) && now !== 'settled' && now !== 'let-be').map(({ id }) => id), { state: 'carried' })
      await refreshProject(tx, project.id)
      return toSample(made)
    })
  },

  async read(project: ProjectRow, number: number): Promise<Fitting> {
    const [state, plan] = [await readProjectState(db, project.id), await sizePlanService({ db }).read(project)]
    const sample = state.samples.find((one) => one.number === number)
    if (!sample) throw noSample()
    return { ...whatHappenedOn(sample, state), answers: sample.answers, diagnosis: diagnose(fitInput(state, sample, plan)) }
  },

  /** The suggestions of one sample, worked out anew. */
  async diagnosis(project: ProjectRow, sample: SampleRow): Promise<Diagnosis> {
    const [state, plan] = [await readProjectState(db, project.id), await sizePlanService({ db }).read(project)]
    return diagnose(fitInput(state, sample, plan))
  },

  async story(project: ProjectRow): Promise<RouteResponse<typeof readStory>> {
    const state = await readProjectState(db, project.id)
    return { samples: state.samples.map((sample) => whatHappenedOn(sample, state)) }
  },

  /** @throws 'version.stale' with the sample as it is now; 'state.wrong' for a move that skips a step */
  async update(project: ProjectRow, number: number, { version, state: next, ...facts }: RouteBody<typeof updateSample>): Promise<Sample> {
    refuseAfterClearing(project)
    const row = await findSample(db, project.id, number)
    if (next && next !== row.state) await checkMove(db, project, row, next)
    const updated = await db.transaction(async (tx) => {
      const done = await sampleQueries(tx).update(row.id, version, { ...facts, ...(next && { state: next }) })
      if (done) await refreshProject(tx, project.id)
      return done
    })
    const now = toSample(await findSample(db, project.id, number))
    if (!updated) throw staleVersion(now)
    return now
  },

  async answer(project: ProjectRow, number: number, checkId: string, answer: 'yes' | 'no' | null): Promise<void> {
    refuseAfterClearing(project)
    await db.transaction(async (tx) => {
      await projectQueries(tx).lock(project.id)
      const { id, answers } = await findSample(tx, project.id, number)
      const { [checkId]: _old, ...others } = answers
      await sampleQueries(tx).keep(id, { answers: answer ? { ...others, [checkId]: answer } : others })
    })
  },
})

/** Everything of one sample but the suggestions. */
function whatHappenedOn(sample: SampleRow, state: ProjectState): Omit<Fitting, 'answers' | 'diagnosis'> {
  const seen = state.observations.filter(({ sampleId }) => sampleId === sample.id)
  return {
    sample: toSample(sample),
    photographs: state.photographs.filter(({ sampleId }) => sampleId === sample.id).map((row) => toPhotograph(row, sample.number, state.names)),
    observations: [...askedAgain(state, sample), ...seen].map((row) => toObservation(row, state)),
    changes: state.changes.filter(({ sampleId }) => sampleId === sample.id).map((row) => toChange(row, state)),
    carriedIn: state.changes.filter(({ carriedTo }) => carriedTo === sample.number).map((row) => toChange(row, state)),
  }
}

function checkTraced(state: ProjectState, sizeKept: boolean, { lastLookAt }: ProjectRow): void {
  if (!sizeKept) throw new DomainError('state.wrong', 'Keep a size first: the sample is cut from its tracing.')
  if (!allReady(state.pieces)) throw new DomainError('state.wrong', 'The tracing is not ready: a piece still lacks a mark. Tick every mark, then take the last look.')
  if (!lastLookAt) throw new DomainError('state.wrong', 'Take the last look at the tracing first, before the weights come off.')
}

function checkReviewed({ number, state }: SampleRow): void {
  if (state !== 'reviewed' && state !== 'closed') throw new DomainError('state.wrong', `Sample ${number} is not reviewed yet. Look at it and decide, then start the next one.`)
}

/** One step on or back; the fitter may be left out. */
async function checkMove(db: Queryable, project: ProjectRow, row: SampleRow, next: SampleRow['state']): Promise<void> {
  const [from, to] = [sampleStates.indexOf(row.state), sampleStates.indexOf(next)]
  const skipsFitter = row.state === 'to-photograph' && next === 'reviewed'
  const newest = await sampleQueries(db).newest(project.id)
  if (newest?.id !== row.id) throw new DomainError('state.wrong', `Sample ${row.number} is closed: sample ${newest?.number} was sewn after it.`)
  if (Math.abs(to - from) === 1 || skipsFitter || (row.state === 'reviewed' && next === 'to-photograph')) return
  throw new DomainError('state.wrong', `Sample ${row.number} is ${row.state.replaceAll('-', ' ')}; one step at a time.`)
}
