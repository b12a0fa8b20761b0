import { stretchToPass } from './knitStretch.ts'

export type ElasticLength = { cutMm: number; joinedMm: number }

/** Elastic is cut this much shorter than the waist: firm and wide near the first, soft or narrow near the second. Common practice. */
export const elasticLessMm = { firm: 25, soft: 50 } as const
export const elasticOverlapMm = 20

/** Elastic for a waist: cut length with the overlap of the join, and the ring it makes. Common practice. */
export function elasticLength(waistMm: number, lessMm: number = elasticLessMm.soft, overlapMm: number = elasticOverlapMm): ElasticLength {
  return { cutMm: waistMm - lessMm + overlapMm, joinedMm: waistMm - lessMm }
}

/** What a waist edge must have over the full hip so that it can be pulled on: 1 to 2 in. Common practice. */
export const pullOnEaseMm = { least: 25, usual: 50 } as const

export type PullOn = {
  passes: boolean
  /** the least edge, pulled out, that passes the hip */
  neededMm: number
  /** how far the edge is short of the least and of the usual ease; 0 where it is not */
  shortMm: number
  shortOfUsualMm: number
}
/**
 * Whether a waist without an opening passes the hip, pulled out flat.
 * @param waistEdgeMm - the sewn waist edge of the garment, without elastic
 * @param hipMm - full hip of the body
 * @param stretchPercent - of the cloth; with stretch the edge has to reach the hip itself and no more
 */
export function pullOn(waistEdgeMm: number, hipMm: number, stretchPercent = 0): PullOn {
  const reachMm = waistEdgeMm * (1 + stretchPercent / 100)
  const least = stretchPercent > 0 ? 0 : pullOnEaseMm.least
  const neededMm = hipMm + least
  const usualMm = hipMm + (stretchPercent > 0 ? 0 : pullOnEaseMm.usual)
  return { passes: reachMm >= neededMm - 1e-6, neededMm, shortMm: Math.max(0, neededMm - reachMm), shortOfUsualMm: Math.max(0, usualMm - reachMm) }
}

/** Stretch the elastic itself needs to be pulled out to the hip plus `easeMm`, percent of the joined ring. */
export const elasticStretchNeeded = (joinedMm: number, hipMm: number, easeMm: number = pullOnEaseMm.least): number => stretchToPass(joinedMm, hipMm + easeMm)

/** Inside width of a casing, mm: elastic and 3 to 6 mm to slide. Common practice. */
export const casingWidth = (elasticWidthMm: number, slackMm = 5): number => elasticWidthMm + slackMm

/** Radius of the waist of a circle skirt; share 1 full, 0.5 half, 0.25 quarter circle. Subtract the waist's allowance for the cut edge. */
export const circleSkirtRadius = (waistMm: number, share = 1): number => waistMm / (2 * Math.PI * share)
