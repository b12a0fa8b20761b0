import { type Queryable } from '#db/client.ts'
import { auditQueries } from '#db/queries/auditEntries.ts'
import { finalCutQueries } from '#db/queries/finalCuts.ts'
import { projectQueries } from '#db/queries/projects.ts'
import { readProjectState } from '#db/queries/projectState.ts'
import { type ProjectRow } from '#db/schema/projects.ts'
import { type FinalCut, type updateFinalCut } from '#shared/contracts/finalCut.ts'
import { type RouteBody } from '#shared/contracts/route.ts'
import { usualSquareMm } from '#shared/cutting/testSquare.ts'
import { DomainError } from '#shared/errors.ts'
import { beforeTheCut } from '../projects/beforeTheCut.ts'
import { personOf } from '../projects/projectState.ts'
import { sizePlanService } from '../sizePlans/sizePlanService.ts'
import { staleVersion } from '../staleVersion.ts'
import { checkItems } from './checkItems.ts'

const emptyCloth = { name: '', widthMm: null, lengthMm: null, oneWay: false, matching: false, neededMm: null, statedWidthMm: null }
const noSquare = { markedMm: usualSquareMm, lengthAfterMm: null, widthAfterMm: null }

export const finalCutService = ({ db, now = () => new Date() }: { db: Queryable; now?: () => Date }) => ({
  async read(project: ProjectRow): Promise<FinalCut> {
    await finalCutQueries(db).insert({ projectId: project.id, ticks: {}, cloth: emptyCloth, shrinkage: noSquare })
    const [cut, state, plan, hasFitter] = [
      (await finalCutQueries(db).find(project.id))!, await readProjectState(db, project.id), await sizePlanService({ db }).read(project), await projectQueries(db).hasFitter(project.studioId),
    ]
    const standing = cut.clearedAt ? [] : beforeTheCut(state, plan.keptAt !== null)
    return {
      open: standing.length === 0, beforeTheCut: standing, items: checkItems(state, plan, cut, { hasFitter, today: now().toISOString().slice(0, 10) }), cloth: cut.cloth, shrinkage: cut.shrinkage,
      agreedBy: cut.agreedAt ? { person: personOf(new Map(cut.agreedBy && cut.agreedName ? [[cut.agreedBy, cut.agreedName]] : []), cut.agreedBy), at: cut.agreedAt.toISOString() } : null,
      clearedAt: cut.clearedAt?.toISOString() ?? null, cutAt: cut.cutAt?.toISOString() ?? null, note: cut.note, version: cut.version,
    }
  },

  /** @throws 'version.stale' with the list as it is now; 'state.wrong' for an item that ticks itself, or after clearing */
  async update(project: ProjectRow, { version, ticks = {}, ...set }: RouteBody<typeof updateFinalCut>): Promise<FinalCut> {
    const before = await this.read(project)
    if (before.clearedAt) throw new DomainError('state.wrong', 'The cut is cleared; the list can only be read.')
    for (const id of Object.keys(ticks)) {
      const item = before.items.find((one) => one.id === id)
      if (!item) throw new DomainError('request.invalid', 'There is no such line on the list.', { ticks: `There is no line ${id}.` })
      if (item.verified) throw new DomainError('state.wrong', `“${item.title}” ticks itself. ${item.support}.`)
    }
    const row = (await finalCutQueries(db).find(project.id))!
    const kept = { ...row.ticks }
    for (const [id, ticked] of Object.entries(ticks)) {
      if (ticked) kept[id] = now().toISOString()
      else delete kept[id]
    }
    const updated = await finalCutQueries(db).update(project.id, version, { ...set, ticks: kept })
    const after = await this.read(project)
    if (!updated) throw staleVersion(after)
    return after
  },

  async agree(project: ProjectRow, userId: string, agreed: boolean): Promise<FinalCut> {
    if ((await this.read(project)).clearedAt) throw new DomainError('state.wrong', 'The cut is cleared already.')
    await finalCutQueries(db).keep(project.id, agreed ? { agreedBy: userId, agreedAt: now() } : { agreedBy: null, agreedAt: null })
    return this.read(project)
  },

  /** @throws 'state.wrong' with what is still open */
  async clear(project: ProjectRow, userId: string): Promise<FinalCut> {
    const before = await this.read(project)
    if (before.clearedAt) return before
    if (!before.open) throw new DomainError('state.wrong', `The final cut is not open. ${before.beforeTheCut.join(' ')}`, { beforeTheCut: before.beforeTheCut })
    const left = before.items.filter(({ ticked }) => !ticked)
    if (left.length) throw new DomainError('state.wrong', `${left.length === 1 ? 'One line is' : `${left.length} lines are`} not ticked: ${left.map(({ title }) => title).join('; ')}.`, { items: left.map(({ id }) => id) })
    await db.transaction(async (tx) => {
      await finalCutQueries(tx).keep(project.id, { clearedAt: now() })
      await projectQueries(tx).keep(project.id, { stage: 'cleared' })
      await auditQueries(tx).add('project.cleared', { userId, studioId: project.studioId }, { project: project.id })
    })
    return this.read(project)
  },

  /** @throws 'state.wrong' before it is cleared */
  async cut(project: ProjectRow): Promise<FinalCut> {
    const before = await this.read(project)
    if (!before.clearedAt) throw new DomainError('state.wrong', 'Clear the cut first.')
    if (!before.cutAt) {
      await db.transaction(async (tx) => {
        await finalCutQueries(tx).keep(project.id, { cutAt: now() })
        await projectQueries(tx).keep(project.id, { stage: 'cut' })
      })
    }
    return this.read(project)
  },
})
