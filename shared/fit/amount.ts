import { paperStepMm } from '../units/unit.ts'
import { splitAmount } from '../units/splitAmount.ts'
import { type Amount } from './types.ts'

/** Below this nothing is worth a paper change, and two readings are the same. Common practice: about an eighth of an inch. */
export const leastChangeMm = 3

/** Cloth in an amount, mm: a pinched fold that lies flat holds twice its depth; every other way of measuring is the cloth itself. */
export const clothOf = (amount: Amount): number => (amount.as === 'fold-depth' ? amount.mm * 2 : amount.mm)

/** How the amount was turned into cloth, in words with tokens; null where nothing was done to it. */
export const doublingText = (amount: Amount): string | null =>
  (amount.as === 'fold-depth' ? `A fold {mm:${amount.mm}} deep holds {mm:${amount.mm * 2}} of cloth` : null)

/** The nearest amount that can be drawn: whole millimetres, or sixteenths of an inch. */
export const roundToStep = (mm: number, stepMm: number): number => {
  const steps = Math.round(Math.abs(mm) / stepMm + 1e-9)
  return Math.sign(mm) * Math.round(steps * stepMm * 10000) / 10000 || 0
}

/** Parts of a whole in whole millimetres, larger ones first; they add up to the whole. */
export const splitMillimetres = (totalMm: number, parts: number | readonly number[]): number[] => splitAmount(totalMm, parts, paperStepMm.cm)
/** Parts of a whole in sixteenths of an inch, mm. */
export const splitSixteenths = (totalMm: number, parts: number | readonly number[]): number[] => splitAmount(totalMm, parts, paperStepMm.inch)

/**
 * Splits a whole over pairs of edges, so that both edges of a pair move alike as far as it goes: a piece cut on the fold or twice
 * has no left and right. Only an odd step makes one edge of one pair larger.
 * @param pairs - how many edges each entry has: 2 for a pair, 1 for a single edge
 * @returns one array of edge amounts for each entry, the larger first
 */
export function splitOverPairs(totalMm: number, pairs: readonly number[], stepMm: number): number[][] {
  const doubles = splitAmount(totalMm, pairs.map((edges) => edges / 2), stepMm * (pairs.every((edges) => edges === 2) ? 2 : 1))
  return doubles.map((total, i) => splitAmount(total, pairs[i]!, stepMm))
}
