import { type PatternView, type SignPattern } from '../rule.ts'
import { type Observation, type Side } from '../types.ts'
import { type Strength, weaker } from '../weights.ts'
import { listOf } from './ruleIndex.ts'

/** An observation with what the others say about its other side. */
export type Seen = { observation: Observation; /** the same sign was seen on the other side, about as much */ mirrored: boolean }
export type CandidateSide = 'both' | 'left' | 'right'

const viewsOf: Record<Observation['view'], readonly PatternView[]> = { front: ['front'], back: ['back'], left: ['side'], right: ['side'], detail: ['front', 'back', 'side'] }

/**
 * How strongly a pattern speaks about an observation. What the observation contradicts does not fit; what it leaves open (direction,
 * target, line, or the view where only a detail was photographed) costs one grade altogether, so that an exact sign beats a vague one.
 * @returns null where it does not fit, or fits less than slightly
 */
export function matchSign(pattern: SignPattern, { observation, mirrored }: Seen): Strength | null {
  const views = listOf(pattern.view)
  if (views.length && !views.some((view) => viewsOf[observation.view].includes(view))) return null
  if (!sideFits(pattern.side, observation.side, mirrored)) return null
  let open = views.length > 0 && observation.view === 'detail'
  for (const [wanted, seen] of [
    [listOf(pattern.direction), observation.direction], [listOf(pattern.towards), observation.towards], [listOf(pattern.line), observation.line],
  ] as const) {
    if (!wanted.length) continue
    if (!seen) open = true
    else if (!(wanted as readonly string[]).includes(seen)) return null
  }
  return open ? weaker(pattern.weight) : pattern.weight
}

function sideFits(wanted: SignPattern['side'], side: Side, mirrored: boolean): boolean {
  if (!wanted) return true
  const oneSided = (side === 'left' || side === 'right') && !mirrored
  if (wanted === 'one') return oneSided
  return wanted === 'both' ? !oneSided : side === 'centre'
}

/**
 * The strength for a cause on one side of the body. A fault of one side is not explained by the other, and a change of both
 * sides explains what was seen on one only a grade less.
 */
export function strengthOnSide(strength: Strength, sided: 'either' | 'both' | 'one', side: CandidateSide, { observation, mirrored }: Seen): Strength | null {
  const seen = observation.side
  if (side === 'both') return seen === 'both' || seen === 'centre' || mirrored ? strength : weaker(strength)
  if (seen === side) return mirrored && sided === 'either' ? weaker(strength) : strength
  if (seen === 'centre') return sided === 'one' ? strength : weaker(strength)
  return seen === 'both' && sided === 'one' ? weaker(strength) : null
}

/** Readings of the two sides that differ by less than this are one fault. Common practice: about a quarter of an inch. */
const alikeMm = 6

/** Notes for each observation whether the same was seen on the other side. */
export function pairSides(observations: readonly Observation[]): Seen[] {
  return observations.map((observation) => ({ observation, mirrored: observations.some((other) => isMirror(observation, other)) }))
}
function isMirror(a: Observation, b: Observation): boolean {
  if (!((a.side === 'left' && b.side === 'right') || (a.side === 'right' && b.side === 'left'))) return false
  if (a.sign !== b.sign || a.zone !== b.zone || a.direction !== b.direction || a.towards !== b.towards || a.line !== b.line) return false
  return !a.amount || !b.amount || a.amount.as !== b.amount.as || Math.abs(a.amount.mm - b.amount.mm) < alikeMm
}
