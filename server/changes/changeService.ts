import { type Queryable } from '#db/client.ts'
import { changeQueries } from '#db/queries/changes.ts'
import { observationQueries } from '#db/queries/observations.ts'
import { projectQueries } from '#db/queries/projects.ts'
import { readProjectState } from '#db/queries/projectState.ts'
import { type ChangeRow } from '#db/schema/changes.ts'
import { type ProjectRow } from '#db/schema/projects.ts'
import { type Change, type createOwnChange, type decideChange, type updateChange } from '#shared/contracts/fitting.ts'
import { type RouteBody } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'
import { clothOf } from '#shared/fit/amount.ts'
import { type Finding, type PaperChange } from '#shared/fit/types.ts'
import { withAmount } from '#shared/fit/withAmount.ts'
import { stateWithoutReading } from '../observations/observationService.ts'
import { refreshProject } from '../projects/refreshProject.ts'
import { findSample, refuseAfterClearing, sampleService } from '../samples/sampleService.ts'
import { toChange } from '../samples/toFitting.ts'
import { staleVersion } from '../staleVersion.ts'

const noChange = () => new DomainError('not-found', 'There is no such change in this project.')

export const changeService = ({ db }: { db: Queryable }) => ({
  async read(projectId: string, id: string): Promise<Change> {
    const state = await readProjectState(db, projectId)
    const row = state.changes.find((one) => one.id === id)
    if (!row) throw noChange()
    return toChange(row, state)
  },

  /**
   * Takes a suggestion up or declines it. The suggestion is worked out here from what is stored, never taken from the request.
   * Deciding once more on the same cause and side replaces the first decision, until it is carried.
   */
  async decide(project: ProjectRow, number: number, decidedBy: string, input: RouteBody<typeof decideChange>): Promise<Change> {
    refuseAfterClearing(project)
    const sample = await findSample(db, project.id, number)
    const { findings } = await sampleService({ db }).diagnosis(project, sample)
    const finding = findings.find(({ cause, side }) => cause === input.cause && side === input.side)
    if (!finding) throw new DomainError('state.wrong', 'This suggestion has changed with what was seen since. Look at the list again.')
    if (input.decision === 'altered' && input.amountMm === undefined && !input.pieceRoles) throw new DomainError('request.invalid', 'Say what is altered: the amount, or the pieces.', { amountMm: 'Give an amount.' })
    const amountMm = input.decision === 'altered' ? input.amountMm ?? finding.change.amountMm : finding.change.amountMm
    const paper = withAmount(finding.change, amountMm, { keep: input.decision === 'altered' ? input.pieceRoles : undefined })
    const id = await db.transaction(async (tx) => {
      await projectQueries(tx).lock(project.id)
      const { changes } = await readProjectState(tx, project.id)
      const before = changes.filter((one) => one.sampleId === sample.id && one.cause === input.cause && one.side === input.side)
      if (before.some(({ carriedTo }) => carriedTo !== null)) throw new DomainError('state.wrong', 'This change is carried into the next sample already. Decide on that sample.')
      for (const old of before) await takeOut(tx, old)
      const row = await changeQueries(tx).insert({
        projectId: project.id, sampleId: sample.id, cause: input.cause, side: input.side, decision: input.decision, title: finding.change.title,
        suggestedMm: finding.change.amountMm, amountMm, paper, predictions: predictionsFor(finding, amountMm), reason: input.decision === 'declined' ? input.reason ?? 'other' : null, note: input.note, decidedBy,
      }, finding.explains)
      if (input.decision !== 'declined') await observationQueries(tx).keep(finding.explains, { state: 'chosen' })
      await refreshProject(tx, project.id)
      return row.id
    })
    return this.read(project.id, id)
  },

  /** A change the maker or fitter writes themselves; treated like any other from here on. */
  async own(project: ProjectRow, number: number, decidedBy: string, input: RouteBody<typeof createOwnChange>): Promise<Change> {
    refuseAfterClearing(project)
    const sample = await findSample(db, project.id, number)
    const { observations } = await readProjectState(db, project.id)
    const answered = observations.filter(({ id }) => input.observationIds.includes(id))
    if (answered.length !== new Set(input.observationIds).size) throw new DomainError('request.invalid', 'One of these observations is not in this project.', { observationIds: 'Choose observations of this project.' })
    const amountMm = input.steps.reduce((sum, { amountMm: mm, edges }) => sum + mm * edges, 0)
    const paper: PaperChange = {
      title: input.title, operation: 'none', amountMm, amountFrom: 'measured on sample',
      steps: input.steps.map((step) => ({ ...step, text: `${step.amountMm < 0 ? 'Take' : 'Add'} {mm:${Math.abs(step.amountMm)}} ${step.amountMm < 0 ? 'off' : 'to'} the ${step.edge}${step.taper ? `, ${step.taper}` : ''}.` })),
      companions: [], limits: { leastMm: 0, mostMm: Math.abs(amountMm), beyond: '', text: '' }, recheck: [], unfold: input.steps.some(({ side }) => side !== 'both'), notes: [], source: 'your own',
    }
    const id = await db.transaction(async (tx) => {
      await projectQueries(tx).lock(project.id)
      const row = await changeQueries(tx).insert({
        projectId: project.id, sampleId: sample.id, cause: null, decision: 'own', title: input.title, suggestedMm: null, amountMm, paper, note: input.note, decidedBy,
        predictions: answered.map((one) => ({ observationId: one.id, expectedMm: 0, changeMm: one.amount ? clothOf(one.amount) : Math.abs(amountMm), text: 'It should be gone.' })),
      }, answered.map((one) => one.id))
      await observationQueries(tx).keep(answered.map((one) => one.id), { state: 'chosen' })
      await refreshProject(tx, project.id)
      return row.id
    })
    return this.read(project.id, id)
  },

  /** @throws 'version.stale' with the change as it is now; 'state.wrong' once it is carried */
  async update(project: ProjectRow, id: string, { version, amountMm, pieceRoles, note }: RouteBody<typeof updateChange>): Promise<Change> {
    refuseAfterClearing(project)
    const row = await findWaiting(db, project.id, id)
    const whole = amountMm ?? row.amountMm
    const altered = row.decision === 'accepted' && (whole !== row.amountMm || pieceRoles !== undefined)
    const updated = await changeQueries(db).update(id, version, {
      ...(note === undefined ? {} : { note }), amountMm: whole, paper: withAmount(row.paper, whole, { keep: pieceRoles }),
      predictions: rescale(row.predictions, row.amountMm === 0 ? 0 : whole / row.amountMm), ...(altered && { decision: 'altered' as const }),
    })
    const now = await this.read(project.id, id)
    if (!updated) throw staleVersion(now)
    return now
  },

  /** @throws 'state.wrong' once it is carried: then a new change on the next sample brings it back out */
  async takeBack(project: ProjectRow, id: string): Promise<void> {
    refuseAfterClearing(project)
    await db.transaction(async (tx) => {
      await projectQueries(tx).lock(project.id)
      await findWaiting(tx, project.id, id)
      const { changes } = await readProjectState(tx, project.id)
      await takeOut(tx, changes.find((one) => one.id === id)!)
      await refreshProject(tx, project.id)
    })
  },
})

async function findWaiting(db: Queryable, projectId: string, id: string): Promise<ChangeRow> {
  const row = await changeQueries(db).find(projectId, id)
  if (!row) throw noChange()
  if (row.carriedTo !== null) throw new DomainError('state.wrong', `This change is sewn into sample ${row.carriedTo}. Look at that sample; if it was wrong, bring it back out there.`)
  return row
}

/** Removes a decision; what it answered is as it was before. */
async function takeOut(tx: Queryable, change: ChangeRow & { observationIds: string[] }): Promise<void> {
  await changeQueries(tx).remove(change.id)
  for (const id of change.observationIds) {
    const row = await observationQueries(tx).find(change.projectId, id)
    if (row && row.state === 'chosen') await observationQueries(tx).keep([id], { state: await stateWithoutReading(tx, row) })
  }
}

const rescale = (predictions: ChangeRow['predictions'], factor: number) => predictions.map((one) => ({ ...one, expectedMm: Math.max(0, one.expectedMm + one.changeMm * (1 - factor)), changeMm: one.changeMm * factor }))

/** What each observation should read with the amount that was chosen instead of the one suggested. */
const predictionsFor = ({ predicts, change }: Finding, amountMm: number): ChangeRow['predictions'] =>
  rescale(predicts.map((one) => ({ ...one })), change.amountMm === 0 ? 1 : amountMm / change.amountMm)
