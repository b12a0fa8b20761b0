import { mmPerInch } from '../units/unit.ts'

/** What patterns are mostly drafted for where they do not say: 2 in between high and full bust. Common practice. */
export const usualDraftedCupMm = 2 * mmPerInch
/** From this difference on, or this far from the drafted one, the size is led by the high bust: 2 in, said as 5 cm in metric texts. */
export const fullBustFromMm = 50
export const smallBustFromMm = 20
/** A difference smaller than this is left as it is (half a front under 6 mm). Common practice. */
export const cupLeaveMm = 12
/** A half front that grows by more is split over two darts or seams, or done in two passes. Common practice. */
export const cupSplitHalfMm = 32

export type BustAddition = { wholeMm: number; halfFrontMm: number; advice: 'leave' | 'add' | 'add-in-two' | 'take-away' }

/**
 * What the front must gain (or lose, negative) when the size was taken by the high bust: the body's difference less the drafted one.
 */
export function bustAddition(bustMm: number, highBustMm: number, draftedCupMm: number = usualDraftedCupMm): BustAddition {
  return additionOf(bustMm - highBustMm - draftedCupMm)
}
export function additionOf(wholeMm: number): BustAddition {
  const halfFrontMm = wholeMm / 2
  const advice = Math.abs(wholeMm) < cupLeaveMm ? 'leave' : wholeMm < 0 ? 'take-away' : halfFrontMm > cupSplitHalfMm ? 'add-in-two' : 'add'
  return { wholeMm, halfFrontMm, advice }
}
