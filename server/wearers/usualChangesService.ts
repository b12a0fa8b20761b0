import { type z } from 'zod'
import { type Queryable } from '#db/client.ts'
import { type SettledChange, settledChangeQueries } from '#db/queries/settledChanges.ts'
import { wearerQueries } from '#db/queries/wearers.ts'
import { type usualChange } from '#shared/contracts/wearer.ts'
import { DomainError } from '#shared/errors.ts'
import { type Looking } from './wearerService.ts'

type UsualChange = z.infer<typeof usualChange>
/** One project may be chance; the same change on two is a habit of this body's clothes. */
const leastCount = 2

export const usualChangesService = ({ db }: { db: Queryable }) => ({
  /** What settled on this wearer at least twice, most frequent first. */
  async list(studioId: string, wearerId: string, looking: Looking): Promise<UsualChange[]> {
    const wearer = await wearerQueries(db).find(studioId, wearerId, looking.role === 'wearer' ? looking.userId : null)
    if (!wearer) throw new DomainError('not-found', 'There is no such wearer in this studio.')
    return group(await settledChangeQueries(db).ofWearer(studioId, wearerId))
  },
})

function group(settled: readonly SettledChange[]): UsualChange[] {
  const groups = new Map<string, SettledChange[]>()
  for (const change of settled) {
    const key = `${change.cause} ${change.garment.kind}`
    groups.set(key, [...(groups.get(key) ?? []), change])
  }
  return [...groups.values()].filter((same) => same.length >= leastCount).map((same) => {
    const amounts = same.map(({ amountMm }) => amountMm)
    const { cause, title, garment } = same.at(-1)!
    return { cause, title, garmentFamily: garment.kind, count: same.length, medianMm: median(amounts), leastMm: Math.min(...amounts), mostMm: Math.max(...amounts) }
  }).sort((a, b) => b.count - a.count)
}

function median(values: readonly number[]): number {
  const sorted = values.toSorted((a, b) => a - b)
  const middle = (sorted.length - 1) / 2
  return (sorted[Math.floor(middle)]! + sorted[Math.ceil(middle)]!) / 2
}
