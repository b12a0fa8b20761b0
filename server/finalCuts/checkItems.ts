import { type ProjectState } from '#db/queries/projectState.ts'
import { type FinalCutRow } from '#db/schema/finalCuts.ts'
import { type FinalCut } from '#shared/contracts/finalCut.ts'
import { type SizePlanState } from '#shared/contracts/sizePlan.ts'
import { type VerifiedFact, finalChecklist } from '#shared/cutting/finalChecklist.ts'
import { clothEnough } from '#shared/cutting/layout.ts'
import { shrinkageOf } from '#shared/cutting/testSquare.ts'
import { isStale } from '#shared/measurements/isStale.ts'
import { missingMarks } from '#shared/tracing/missingMarks.ts'
import { goesToPaper, isOpen, isTransferred, touches } from '../projects/projectState.ts'

type CutFacts = Pick<FinalCutRow, 'ticks' | 'cloth' | 'shrinkage'> & { agreedName: string | null; agreedAt: Date | null }
type Known = { done: boolean; from: string }

/**
 * The list before the good cloth is cut. What the journal can see ticks itself and says from what; what it cannot see yet, and what
 * depends on cloth nobody has described, stays for a person to tick.
 * @param today - ISO date
 */
export function checkItems(state: ProjectState, plan: SizePlanState, cut: CutFacts, { hasFitter, today }: { hasFitter: boolean; today: string }): FinalCut['items'] {
  const known = knownFacts(state, plan, cut, today)
  return finalChecklist(plan.pattern.garment, { oneWay: cut.cloth.oneWay, matching: cut.cloth.matching, hasFitter }).map((item) => {
    const fact = item.verifiedBy ? known[item.verifiedBy] : undefined
    if (fact) return { id: item.id, group: item.group, title: item.title, support: fact.from, ticked: fact.done, verified: true }
    return { id: item.id, group: item.group, title: item.title, support: item.help, ticked: item.id in cut.ticks, verified: false }
  })
}

function knownFacts(state: ProjectState, plan: SizePlanState, cut: CutFacts, today: string): Partial<Record<VerifiedFact, Known>> {
  const settled = state.observations.filter(({ state: now }) => now === 'settled').length
  const letBe = state.observations.filter(({ state: now }) => now === 'let-be').length
  const open = state.observations.filter(isOpen)
  const lacking = state.pieces.filter((piece) => missingMarks(piece).length > 0)
  const undrawn = state.changes.filter(goesToPaper).flatMap((change) => state.pieces.filter((piece) => touches(change.paper, piece) && !isTransferred(state, change.id, piece.id)))
  const names = (pieces: readonly { name: string }[]) => [...new Set(pieces.map(({ name }) => name))].join(', ')
  const shrinkage = shrinkageOf(cut.shrinkage)
  const enough = clothEnough(cut.cloth)
  return {
    'observations-settled': { done: state.samples.length > 0 && open.length === 0, from: open.length ? `Still open: ${open.map(({ number }) => number).join(', ')}` : `${settled} settled, ${letBe} let be` },
    'fitter-agreed': { done: cut.agreedAt !== null, from: cut.agreedAt ? `${cut.agreedName ?? 'The fitter'}, ${cut.agreedAt.toISOString().slice(0, 10)}` : 'Not yet' },
    'size-kept': { done: plan.keptAt !== null, from: plan.keptAt ? [...new Set(Object.values(plan.choices))].join(', ') || 'Kept' : 'No size is kept yet' },
    // Stale measurements are told, not refused: the last sample has proved the fit. The maker ticks them.
    ...(plan.set && !isStale(plan.set.takenOn, today) ? { 'measurements-fresh': { done: true, from: `Taken on ${plan.set.takenOn} by ${plan.set.takenBy}` } } : {}),
    'changes-transferred': { done: undrawn.length === 0, from: undrawn.length ? `Not drawn yet: ${names(undrawn)}` : 'Every change is ticked on its pieces' },
    'marks-complete': { done: state.pieces.length > 0 && lacking.length === 0, from: lacking.length ? `Missing on ${names(lacking)}` : `${state.pieces.length} pieces complete` },
    'pieces-complete': { done: state.pieces.length > 0, from: `${state.pieces.length} on the tracing list` },
    ...(shrinkage ? { 'shrinkage-measured': { done: true, from: shrinkage.text } } : {}),
    ...(enough ? { 'cloth-long-enough': { done: enough.enough, from: enough.enough ? `{mm:${Math.round(enough.needed.leastMm)}} needed` : `{mm:${Math.round(enough.shortMm)}} short` } } : {}),
  }
}
