import { type Queryable } from '#db/client.ts'
import { patternQueries } from '#db/queries/patterns.ts'
import { projectQueries } from '#db/queries/projects.ts'
import { wearerQueries } from '#db/queries/wearers.ts'
import { type ProjectRow } from '#db/schema/projects.ts'
import { type SizePlanState, type updateSizePlan } from '#shared/contracts/sizePlan.ts'
import { type RouteBody } from '#shared/contracts/route.ts'
import { DomainError } from '#shared/errors.ts'
import { type SizePlan, sizePlan } from '#shared/fit/sizePlan.ts'
import { type Body } from '#shared/fit/types.ts'
import { toPattern } from '../patterns/patternService.ts'
import { refreshProject } from '../projects/refreshProject.ts'
import { staleVersion } from '../staleVersion.ts'
import { toMeasurementSet } from '../wearers/wearerService.ts'

export const sizePlanService = ({ db }: { db: Queryable }) => ({
  async read(project: ProjectRow): Promise<SizePlanState> {
    const [pattern, sets, plan] = [await patternQueries(db).find(project.studioId, project.patternId), await wearerQueries(db).sets(project.wearerId), await projectQueries(db).sizePlan(project.id)]
    // A kept plan goes on reading the set it was made with, until that set is removed.
    const set = sets.find(({ id }) => plan?.keptAt && id === plan.setId) ?? sets[0]
    return {
      pattern: toPattern(pattern!), set: set ? toMeasurementSet(set) : null, choices: plan!.choices, reason: plan!.reason, lengthsMm: plan!.lengthsMm,
      keptAt: plan!.keptAt?.toISOString() ?? null, version: plan!.version,
    }
  },

  /**
   * @throws 'version.stale' with the plan as it is now; 'state.wrong' when it is to be kept and nothing can be traced from it;
   *   'request.invalid' for a size the chart does not have
   */
  async update(project: ProjectRow, { version, keep, ...input }: RouteBody<typeof updateSizePlan>): Promise<SizePlanState> {
    const now = await this.read(project)
    const labels = new Set(now.pattern.chart.map(({ label }) => label))
    const unknown = Object.values(input.choices).find((label) => !labels.has(label))
    if (unknown !== undefined) throw new DomainError('request.invalid', `The chart has no size ${unknown}. Choose one of ${[...labels].join(', ') || 'its sizes, once it is typed'}.`, { choices: `The chart has no size ${unknown}.` })
    const sets = await wearerQueries(db).sets(project.wearerId)
    if (keep) checkCanKeep(planOf({ ...now, choices: input.choices, set: sets[0] ? toMeasurementSet(sets[0]) : null }), now)
    const updated = await db.transaction(async (tx) => {
      const done = await projectQueries(tx).updateSizePlan(project.id, version, { ...input, ...(keep ? { keptAt: new Date(), setId: sets[0]?.id ?? null } : {}) })
      if (done) await refreshProject(tx, project.id)
      return done
    })
    if (!updated) throw staleVersion(await this.read(project))
    return this.read(project)
  },
})

/** Measurement code → mm of a set; empty when nothing is measured. */
export const bodyOf = (set: SizePlanState['set']): Body => Object.fromEntries((set?.measurements ?? []).map(({ code, valueMm }) => [code, valueMm]))

/** The size plan of a project worked out from what it reads. */
export const planOf = ({ pattern, set, choices }: Pick<SizePlanState, 'pattern' | 'set' | 'choices'>): SizePlan =>
  sizePlan(bodyOf(set), pattern.chart, pattern.garment, { choices, draftedCupMm: pattern.draftedCupMm })

function checkCanKeep(plan: SizePlan, { pattern }: SizePlanState): void {
  if (!pattern.chart.length) throw new DomainError('state.wrong', 'This pattern has no size chart yet. Type the body measurements from its envelope; two sizes are enough to start.')
  if (!plan.zones.length) throw new DomainError('state.wrong', 'Nothing in the size chart can be compared with the measurements. Add the measurements this garment is chosen by.')
  const lacking = plan.zones.find(({ governing, size }) => governing && !size)
  if (lacking) throw new DomainError('state.wrong', `Choose the size at the ${lacking.name.toLowerCase()} first: this garment is chosen by it.`)
}
