/** Stretch of knits, as fractions in percent. Measured round the body's way, on a fold, only as far as the cloth goes easily and recovers. */

/** 100 (stretched − rest) / rest: 4 in to 5 in is 25 %. Source: Purdue Extension HE-452 and sewing-education pages */
export const stretchPercent = (restMm: number, stretchedMm: number): number => (100 * (stretchedMm - restMm)) / restMm

/**
 * The most negative ease cloth can span at all, percent of the body girth: 100 (1 − 1/r). A limit, not a wearing value. Derived.
 */
export const negativeEaseLimitPercent = (stretch: number): number => 100 * (1 - 1 / (1 + stretch / 100))

/** Share of that limit that is comfortable to wear; ours, recovery must be good. */
export const wearingShare = { top: [0.25, 0.5], swimAndDance: [0.5, 0.75] } as const

/**
 * The girths a knit garment may have on a body.
 * @returns leastMm: stretched to its limit; closeMm: half of that, as close as a top wears
 */
export function knitGirths(bodyMm: number, stretch: number): { leastMm: number; closeMm: number } {
  const limit = negativeEaseLimitPercent(stretch) / 100
  return { leastMm: bodyMm * (1 - limit), closeMm: bodyMm * (1 - limit * wearingShare.top[1]) }
}

/** Stretch needed to pull an opening over a girth, percent; 0 where it passes without. */
export const stretchToPass = (restMm: number, largestMm: number): number => Math.max(0, stretchPercent(restMm, largestMm))

export type KnitClass = 'stable' | 'moderate' | 'stretchy' | 'super'
/**
 * Class of a knit by its stretch, from memory: Armstrong, Patternmaking for Fashion Design, ch. 27 (about 18, 25, 50 and 100 %). The
 * limits half way between are ours.
 */
export const knitClass = (stretch: number): KnitClass => (stretch < 21.5 ? 'stable' : stretch < 37.5 ? 'moderate' : stretch < 75 ? 'stretchy' : 'super')
/** Girth taken out of a block without ease, percent; from memory: Richardson, Designing and Patternmaking for Stretch Fabrics. */
export const blockReductionPercent: Readonly<Record<KnitClass, number>> = { stable: 0, moderate: 2, stretchy: 3, super: 5 }
