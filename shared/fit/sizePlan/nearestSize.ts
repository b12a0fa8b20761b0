import { tidyMm } from '../../units/unit.ts'
import { type OffChart } from './types.ts'

export type Column = readonly { index: number; label: string; mm: number }[]
export type Nearest = {
  /** place in the chart */
  index: number
  label: string
  t: number | null
  tie: boolean
  /** places in the column of the sizes around it: two between sizes, one on a size or off the chart */
  around: readonly number[]
  offChart: Omit<OffChart, 'text'> | null
}

/** Half way is half way within a millimetre: a tape is no finer. */
const tieMm = 1
const onSizeMm = 0.05
/** Beyond one grade a shift of the outermost line needs checking, beyond two the shape breaks. Our own limits. */
const checkGrades = 1
const refuseGrades = 2

/**
 * The size nearest to a measurement; in the middle, the one asked for.
 * @param column - at least one size; sorted here, as a chart may list sizes in any order
 */
export function nearestSize(mm: number, column: Column, atTie: 'smaller' | 'larger'): Nearest {
  const sorted = column.toSorted((a, b) => a.mm - b.mm)
  const places = sorted.map((one) => column.indexOf(one))
  const exact = sorted.findIndex((one) => Math.abs(one.mm - mm) <= onSizeMm)
  if (exact >= 0) return { ...pick(sorted[exact]!), t: 0, tie: false, around: [places[exact]!], offChart: null }
  const end = mm < sorted[0]!.mm ? 0 : mm > sorted.at(-1)!.mm ? sorted.length - 1 : -1
  if (end >= 0) {
    const neighbour = sorted[end === 0 ? 1 : end - 1]
    const byMm = tidyMm(Math.abs(mm - sorted[end]!.mm))
    const step = neighbour ? Math.abs(neighbour.mm - sorted[end]!.mm) : 0
    const grades = step > 0 ? byMm / step : null
    const verdict = grades === null ? 'check' : grades > refuseGrades + 1e-9 ? 'refuse' : grades > checkGrades + 1e-9 ? 'check' : 'shift'
    return { ...pick(sorted[end]!), t: null, tie: false, around: [places[end]!], offChart: { side: mm < sorted[0]!.mm ? 'below' : 'above', byMm, grades, verdict } }
  }
  const upper = sorted.findIndex((one) => one.mm > mm)
  const [low, high] = [sorted[upper - 1]!, sorted[upper]!]
  const t = tidyMm((mm - low.mm) / (high.mm - low.mm))
  const tie = Math.abs(mm - (low.mm + high.mm) / 2) <= tieMm
  const takeHigh = tie ? atTie === 'larger' : t > 0.5
  return { ...pick(takeHigh ? high : low), t, tie, around: [places[upper - 1]!, places[upper]!], offChart: null }
}
const pick = ({ index, label }: Column[number]) => ({ index, label })
