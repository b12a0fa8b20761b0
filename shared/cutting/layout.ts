/** Room to add where all pieces must lie one way, or stripes and checks must meet. Common practice: 10 to 15 %. */
export const oneWayShare = { least: 0.1, most: 0.15 } as const

export type LengthNeeded = { leastMm: number; mostMm: number }
/**
 * Length for cloth of another width, from the length the pattern states for its own: L2 ≈ L1 · w1 / w2, more for one-way cloth.
 * A guide only: a wide piece may not fit beside another on narrow cloth. Common practice.
 */
export function lengthForWidth(statedMm: number, statedWidthMm: number, widthMm: number, oneWay = false): LengthNeeded {
  const mm = (statedMm * statedWidthMm) / widthMm
  return { leastMm: mm * (oneWay ? 1 + oneWayShare.least : 1), mostMm: mm * (oneWay ? 1 + oneWayShare.most : 1) }
}

/** Whether the cloth is long enough; null where something is not known yet. */
export function clothEnough(cloth: { widthMm: number | null; lengthMm: number | null; neededMm: number | null; statedWidthMm: number | null; oneWay: boolean; matching: boolean }): { enough: boolean; needed: LengthNeeded; shortMm: number } | null {
  const { widthMm, lengthMm, neededMm, statedWidthMm } = cloth
  if (!widthMm || !lengthMm || !neededMm) return null
  const needed = lengthForWidth(neededMm, statedWidthMm ?? widthMm, widthMm, cloth.oneWay || cloth.matching)
  return { enough: lengthMm >= needed.leastMm - 1e-6, needed, shortMm: Math.max(0, needed.leastMm - lengthMm) }
}

export type PrintScale = { factor: number; offPercent: number; accepted: boolean }
/**
 * How true a printed test square is.
 * @returns factor to print with again (nominal / measured), how far off in percent, and whether it is within 1 %. Tolerance ours: half a
 * millimetre on 50 mm; on a half hip of 500 mm that is 5 mm.
 */
export function printScale(nominalMm: number, measuredMm: number): PrintScale {
  const offPercent = (100 * (measuredMm - nominalMm)) / nominalMm
  return { factor: nominalMm / measuredMm, offPercent, accepted: Math.abs(offPercent) <= 1 + 1e-9 }
}

/** How much a garment grows (or shrinks, negative) when seams are sewn at another allowance than they were cut with. */
export const allowanceDifference = (cutMm: number, sewnMm: number, cutEdges: number): number => (cutMm - sewnMm) * cutEdges
