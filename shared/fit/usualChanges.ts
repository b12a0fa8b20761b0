import { type GarmentKind } from './types.ts'

/** Garments whose changes carry over to each other: they hang from the same place and meet the same body. */
export const garmentFamilies = { skirt: 'skirts', trousers: 'trousers', bodice: 'tops', shirt: 'tops', dress: 'tops', jacket: 'jackets', coat: 'jackets' } as const satisfies Record<GarmentKind, string>
export type GarmentFamily = (typeof garmentFamilies)[GarmentKind]

/** One change of a finished project that settled. */
export type SettledChange = { projectId: string; kind: GarmentKind; cause: string; side: 'both' | 'left' | 'right' | 'centre'; /** whole amount in the final paper, signed */ amountMm: number }

export type UsualChange = {
  cause: string
  family: GarmentFamily
  side: 'both' | 'left' | 'right'
  /** projects it settled in */
  count: number
  medianMm: number
  /** distance between the smallest and the largest */
  spreadMm: number
  leastMm: number
  mostMm: number
}

/** Once may be chance; twice is offered. */
const leastCount = 2

/**
 * A wearer's usual changes: what settled in at least two finished projects of one garment family, the most frequent first. Several
 * amounts for one cause in one project are parts of one change and add up. Offered before the first sample, never applied unasked.
 * @param history - settled changes of one wearer's finished projects, in any order
 */
export function usualChanges(history: readonly SettledChange[]): UsualChange[] {
  const groups = new Map<string, { cause: string; family: GarmentFamily; side: UsualChange['side']; byProject: Map<string, number> }>()
  for (const { projectId, kind, cause, side: seen, amountMm } of history) {
    const family = garmentFamilies[kind]
    const side = seen === 'centre' ? 'both' : seen
    const key = `${cause} ${family} ${side}`
    const group = groups.get(key) ?? { cause, family, side, byProject: new Map<string, number>() }
    group.byProject.set(projectId, (group.byProject.get(projectId) ?? 0) + amountMm)
    groups.set(key, group)
  }
  return [...groups.values()].filter(({ byProject }) => byProject.size >= leastCount).map(({ byProject, ...group }) => {
    const amounts = [...byProject.values()].sort((a, b) => a - b)
    const [leastMm, mostMm] = [amounts[0]!, amounts.at(-1)!]
    return { ...group, count: amounts.length, medianMm: medianOf(amounts), spreadMm: mostMm - leastMm, leastMm, mostMm }
  }).sort((a, b) => b.count - a.count || (a.cause < b.cause ? -1 : a.cause > b.cause ? 1 : a.side < b.side ? -1 : 1))
}

/** @param sorted - at least one amount */
function medianOf(sorted: readonly number[]): number {
  const middle = (sorted.length - 1) / 2
  return (sorted[Math.floor(middle)]! + sorted[Math.ceil(middle)]!) / 2
}
