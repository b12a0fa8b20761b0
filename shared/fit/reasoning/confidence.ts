import { points } from '../weights.ts'
import { areRivals, type Candidate } from './candidates.ts'
import { type Cover } from './cover.ts'
import { type CandidateSide } from './matchSign.ts'

/** Points that make a cause about two thirds sure by itself: a strong sign falls a little short, three signs are past it. */
const sureScale = 9
/** Points of difference that make one of two causes clearly the likelier. */
const apartScale = 5

/** How sure a cause is by its own evidence, 0..1. */
const standing = (sum: number): number => (sum <= 0 ? 0 : 1 - Math.exp(-sum / sureScale))
const share = (mine: number, other: number): number => 1 / (1 + Math.exp((mine - other) / apartScale))

/** A cause's own standing, less what its strongest rival could claim of it. Many weak rivals do not add up against it. */
export function confidenceOf(mine: number, strongestRival: number): number {
  return Math.round(standing(mine) * (1 - standing(strongestRival) * share(mine, strongestRival)) * 10000) / 10000
}

export type Competitor = { candidate: Candidate; points: number }

export const overlaps = (a: CandidateSide, b: CandidateSide): boolean => a === 'both' || b === 'both' || a === b

/** All that speaks for a chosen cause: what it explains, and what does not rest on an observation. */
export function chosenPoints(candidate: Candidate, cover: Cover): number {
  let sum = candidate.bonus
  for (const [column, value] of candidate.columns) if (cover.explainedBy.get(column) === candidate) sum += value
  return sum
}

/**
 * The causes that could stand in for a chosen one, strongest first: they share something it explains, or are named as its rivals. What
 * another chosen cause accounts for no longer speaks for them.
 */
export function competitorsOf(chosen: Candidate, cover: Cover, all: readonly Candidate[]): Competitor[] {
  const mine = [...chosen.columns.keys()].filter((column) => cover.explainedBy.get(column) === chosen)
  const byCause = new Map<string, Competitor>()
  for (const candidate of all) {
    if (candidate.rule === chosen.rule || cover.chosen.includes(candidate) || !overlaps(candidate.side, chosen.side)) continue
    if (!mine.some((column) => candidate.columns.has(column)) && !areRivals(candidate.rule, chosen.rule)) continue
    let sum = candidate.bonus
    for (const [column, value] of candidate.columns) {
      const explainer = cover.explainedBy.get(column)
      if (!explainer || explainer === chosen) sum += value
    }
    const known = byCause.get(candidate.rule.cause)
    if (!known || sum > known.points) byCause.set(candidate.rule.cause, { candidate, points: sum })
  }
  return [...byCause.values()].sort((a, b) => b.points - a.points || a.candidate.place - b.candidate.place)
}

/** Below this a cause is not worth naming beside another. */
export const leastRivalPoints = points.slight
