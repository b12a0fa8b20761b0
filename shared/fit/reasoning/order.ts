import { roundToStep } from '../amount.ts'
import { mmToken } from '../amountText.ts'
import { stages } from '../rule.ts'
import { type FitInput, type Finding } from '../types.ts'
import { overlaps } from './confidence.ts'
import { sideOfEntry } from './ledgerState.ts'
import { leastOf, noChange, paperChange } from './paperChange.ts'
import { type RuleIndex } from './ruleIndex.ts'

/** Lengths and balance first, then from the top down; a change that goes back comes before any new one. */
export function inWorkingOrder(findings: readonly Finding[], index: RuleIndex): Finding[] {
  const rank = (finding: Finding) => (finding.advice === 'bring-back' ? -1 : stages.indexOf(index.byCause.get(finding.cause)!.stage))
  return [...findings].sort((a, b) => rank(a) - rank(b) || index.placeOf.get(a.cause)! - index.placeOf.get(b.cause)! || (a.side < b.side ? -1 : 1))
}

/**
 * Where an earlier change moves what a later one was measured by, the later amount is corrected, or asked again on the next sample.
 * @param findings - in working order
 */
export function correctForEarlier(findings: readonly Finding[], input: FitInput, stepMm: number, index: RuleIndex): Finding[] {
  const done: Finding[] = []
  for (const finding of findings) done.push(done.reduce((later, earlier) => corrected(later, earlier, input, stepMm, index), finding))
  return done
}

function corrected(later: Finding, earlier: Finding, input: FitInput, stepMm: number, index: RuleIndex): Finding {
  if (later.advice !== 'change' || earlier.advice !== 'change' || !overlaps(sideOfEntry(later.side), sideOfEntry(earlier.side))) return later
  const move = index.byCause.get(earlier.cause)!.moves?.find(({ cause }) => cause === later.cause)
  if (!move) return later
  const { change } = later
  const rule = index.byCause.get(later.cause)!
  const byMm = move.times === undefined ? 0 : roundToStep(earlier.change.amountMm * move.times, stepMm)
  const amountMm = change.amountMm + byMm
  // Turned round or used up: whether anything is left to change can only be seen on the next sample.
  if (!byMm || amountMm * change.amountMm <= 0) return { ...later, change: { ...change, notes: [...change.notes, `After “${earlier.change.title}” this amount is asked again. ${move.note}`] } }
  const note = `${mmToken(change.amountMm)} by itself, ${mmToken(amountMm)} after “${earlier.change.title}”. ${move.note}`
  const again = paperChange({ rule, side: sideOfEntry(later.side), amountMm, amountFrom: change.amountFrom, otherAmount: change.otherAmount }, input, stepMm)
  const full = { ...again, notes: [...change.notes, note] }
  return Math.abs(amountMm) < leastOf(rule) ? { ...later, change: noChange(full), predicts: [], advice: 'leave-it' } : { ...later, change: full }
}
