import { clothOf, leastChangeMm } from './amount.ts'
import { holdResponse } from './reasoning/response.ts'
import { type Amount } from './types.ts'

/** How a sign read on the next sample: gone, or an amount; `reversed` where it is slack now where it was tight, and the like. */
export type After = 'gone' | (Amount & { reversed?: boolean })

export type Outcome = {
  outcome: 'settled' | 'better' | 'same' | 'worse' | 'overdone'
  /** (before − after) / predicted, held between 0.4 and 1.6 */
  response: number
  /** cloth still to change, mm; below zero the overshoot */
  remainingMm: number
  /** cloth to change next, in the direction of the change that was made: below zero it goes back */
  nextMm: number
}

/**
 * What a change did, from one sign before and after it.
 * @param predictedMm - cloth the change was predicted to take away, mm, > 0; without a prediction the sign itself
 * What is left is divided by the response; an overshoot goes back exactly; a change that made it worse comes out whole.
 */
export function outcomeOf(before: Amount, after: After, predictedMm: number): Outcome {
  const beforeMm = clothOf(before)
  const remainingMm = after === 'gone' ? 0 : clothOf(after) * (after.reversed ? -1 : 1)
  const putIn = predictedMm > 0 ? predictedMm : beforeMm
  const response = putIn > 0 ? holdResponse((beforeMm - remainingMm) / putIn) : 1
  const outcome = nameOf(beforeMm, remainingMm)
  return { outcome, response, remainingMm, nextMm: nextOf(outcome, remainingMm, response, putIn) }
}

function nameOf(beforeMm: number, afterMm: number): Outcome['outcome'] {
  if (afterMm <= -leastChangeMm) return 'overdone'
  if (Math.abs(afterMm) < leastChangeMm) return 'settled'
  if (afterMm - beforeMm >= leastChangeMm) return 'worse'
  return beforeMm - afterMm < leastChangeMm ? 'same' : 'better'
}

function nextOf(outcome: Outcome['outcome'], remainingMm: number, response: number, putInMm: number): number {
  if (outcome === 'settled') return 0
  if (outcome === 'overdone') return remainingMm
  return outcome === 'worse' ? -putInMm : Math.round(remainingMm / response)
}
