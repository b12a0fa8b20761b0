import { type Queryable } from '#db/client.ts'
import { isForeignKeyViolation } from '#db/isForeignKeyViolation.ts'
import { auditQueries } from '#db/queries/auditEntries.ts'
import { type WearerWithCounts, wearerQueries } from '#db/queries/wearers.ts'
import { type MeasurementSetRow } from '#db/schema/wearers.ts'
import { type RouteBody } from '#shared/contracts/route.ts'
import { type MeasurementSet, type Wearer, type createSet, type createWearer, type updateSet, type updateWearer } from '#shared/contracts/wearer.ts'
import { DomainError } from '#shared/errors.ts'
import { combineReadings, readingToleranceMm } from '#shared/measurements/combineReadings.ts'
import { staleVersion } from '../staleVersion.ts'

export type WearerService = ReturnType<typeof wearerService>
/** Who looks: a member with the role `wearer` sees only wearers whose account is theirs. */
export type Looking = { userId: string; role: string }
const narrowedTo = (looking: Looking) => (looking.role === 'wearer' ? looking.userId : null)

const noWearer = () => new DomainError('not-found', 'There is no such wearer in this studio.')
const noSet = () => new DomainError('not-found', 'There is no such set of measurements.')

export const wearerService = ({ db }: { db: Queryable }) => ({
  async list(studioId: string, looking: Looking): Promise<Wearer[]> {
    return (await wearerQueries(db).list(studioId, narrowedTo(looking))).map(toWearer)
  },

  /** The wearer with every dated set, newest first. */
  async read(studioId: string, id: string, looking: Looking): Promise<{ wearer: Wearer; sets: MeasurementSet[] }> {
    const row = await wearerQueries(db).find(studioId, id, narrowedTo(looking))
    if (!row) throw noWearer()
    return { wearer: toWearer(row), sets: (await wearerQueries(db).sets(id)).map(toMeasurementSet) }
  },

  async create(studioId: string, input: RouteBody<typeof createWearer>): Promise<Wearer> {
    const row = await wearerQueries(db).insert({ studioId, ...input })
    return toWearer({ ...row, projectCount: 0, latestSetOn: null })
  },

  /** Says that this wearer is the person with this account; used when a member joins as a wearer. */
  async linkAccount(studioId: string, id: string, userId: string): Promise<void> {
    await wearerQueries(db).linkAccount(studioId, id, userId)
  },

  /** @throws 'version.stale' with the wearer as it is now */
  async update(studioId: string, id: string, { version, ...set }: RouteBody<typeof updateWearer>): Promise<Wearer> {
    const updated = await wearerQueries(db).update(studioId, id, version, set)
    const row = await wearerQueries(db).find(studioId, id, null)
    if (!row) throw noWearer()
    if (!updated) throw staleVersion(toWearer(row))
    return toWearer(row)
  },

  /** Removes the wearer with every set. @throws 'state.wrong' while a project is made for them */
  async remove(studioId: string, byUserId: string, id: string): Promise<void> {
    try {
      await db.transaction(async (tx) => {
        if (!(await wearerQueries(tx).remove(studioId, id))) throw noWearer()
        await auditQueries(tx).add('wearer.removed', { userId: byUserId, studioId }, { wearer: id })
      })
    } catch (thrown) {
      if (!isForeignKeyViolation(thrown)) throw thrown
      throw new DomainError('state.wrong', 'A project is made for this wearer, so they stay. Remove the project first.', {}, { cause: thrown })
    }
  },

  async createSet(studioId: string, wearerId: string, input: RouteBody<typeof createSet>): Promise<MeasurementSet> {
    if (!(await wearerQueries(db).find(studioId, wearerId, null))) throw noWearer()
    return toMeasurementSet(await wearerQueries(db).insertSet({ wearerId, ...withValues(input) }))
  },

  /** @throws 'version.stale' with the set as it is now */
  async updateSet(studioId: string, wearerId: string, id: string, { version, ...input }: RouteBody<typeof updateSet>): Promise<MeasurementSet> {
    const updated = await wearerQueries(db).updateSet(studioId, wearerId, id, version, withValues(input))
    if (updated) return toMeasurementSet(updated)
    const current = await wearerQueries(db).findSet(studioId, wearerId, id)
    throw current ? staleVersion(toMeasurementSet(current)) : noSet()
  },

  async removeSet(studioId: string, byUserId: string, wearerId: string, id: string): Promise<void> {
    await db.transaction(async (tx) => {
      if (!(await wearerQueries(tx).removeSet(studioId, wearerId, id))) throw noSet()
      await auditQueries(tx).add('measurements.removed', { userId: byUserId, studioId }, { wearer: wearerId, set: id })
    })
  },
})

function withValues(input: RouteBody<typeof createSet>) {
  const codes = input.measurements.map(({ code }) => code)
  const twice = codes.find((code, i) => codes.indexOf(code) !== i)
  if (twice) throw new DomainError('request.invalid', `The measurement ${twice} is there twice. Send its readings together.`, { measurements: `${twice} is there twice.` })
  return {
    ...input,
    measurements: input.measurements.map(({ code, readingsMm }) => ({ code, readingsMm, valueMm: combineReadings(readingsMm, readingToleranceMm(code))!.valueMm })),
  }
}

const toWearer = (row: WearerWithCounts): Wearer => ({
  id: row.id, studioId: row.studioId, name: row.name, note: row.note, hasAccount: row.userId !== null,
  version: row.version, projectCount: row.projectCount, latestSetOn: row.latestSetOn,
})
/** A dated set as it is sent, from its row. */
export const toMeasurementSet = ({ updatedAt, ...row }: MeasurementSetRow): MeasurementSet => ({ ...row, updatedAt: updatedAt.toISOString() })
