import { roundToStep, splitOverPairs } from '../amount.ts'
import { mmToken } from '../amountText.ts'
import { splitAmount } from '../../units/splitAmount.ts'
import { type Rule, type StepRule } from '../rule.ts'
import { type ChangeStep, type Garment } from '../types.ts'
import { fitsGarment } from './fitsGarment.ts'
import { type CandidateSide } from './matchSign.ts'

export type StepContext = {
  garment: Garment
  side: CandidateSide
  /** the whole amount, signed */
  wholeMm: number
  stepMm: number
  /** part of an earlier change is taken back: the rule's instructions would say the opposite */
  takesBack: boolean
}

/** Amounts of the edges of one step. */
type Shared = { step: StepRule; side: 'both' | 'left' | 'right'; edges: number; mm: number }

/**
 * The instructions, piece by piece. Width amounts add up exactly to the whole over all edges; a length stands whole on every piece.
 * Where an odd step is left over, one edge takes it and stands in a row of its own.
 */
export function paperSteps(rule: Rule, context: StepContext): ChangeStep[] {
  const steps = rule.change.steps.filter((step) => fitsGarment(step.when, context.garment))
  const shared = new Map<StepRule, Shared[]>()
  const add = (rows: readonly Shared[]) => rows.forEach((row) => shared.set(row.step, [...shared.get(row.step) ?? [], row]))
  for (const share of ['width', 'side'] as const) {
    const ofShare = steps.filter((step) => step.share === share)
    for (const { group, totalMm } of shareGroups(rule, ofShare, context)) add(share === 'width' ? overEdges(group, totalMm, context) : overSides(group, totalMm, context))
  }
  for (const step of steps) if (step.share === 'length') add([{ step, side: context.side, edges: edgesOn(step, context.side), mm: roundToStep(context.wholeMm * (step.times ?? 1), context.stepMm) }])
  return steps.flatMap((step) => shared.get(step) ?? []).map((row) => worded(row, context))
}

const edgesOn = (step: StepRule, side: CandidateSide): number => (side === 'both' ? step.edges : Math.max(1, Math.ceil(step.edges / 2)))

/** The whole over the groups of steps, as `parts` says; a group the garment has no steps for leaves its part to the others. */
function shareGroups(rule: Rule, steps: readonly StepRule[], { wholeMm, stepMm }: StepContext): { group: StepRule[]; totalMm: number }[] {
  const names = [...new Set(steps.map((step) => step.group ?? ''))]
  if (!names.length) return []
  const totals = splitAmount(wholeMm, names.map((name) => rule.change.parts?.[name] ?? 1), stepMm)
  return names.map((name, i) => ({ group: steps.filter((step) => (step.group ?? '') === name), totalMm: totals[i]! }))
}

function overEdges(group: readonly StepRule[], totalMm: number, { side, stepMm }: StepContext): Shared[] {
  if (side !== 'both') {
    const edges = group.map((step) => edgesOn(step, side))
    const amounts = splitAmount(totalMm, edges.reduce((sum, count) => sum + count, 0), stepMm)
    return group.flatMap((step, i) => {
      const before = edges.slice(0, i).reduce((sum, count) => sum + count, 0)
      return alike(amounts.slice(before, before + edges[i]!)).map(({ mm, count }) => ({ step, side, edges: count, mm }))
    })
  }
  const pairs = group.flatMap((step) => [...Array<{ step: StepRule; edges: number }>(Math.floor(step.edges / 2)).fill({ step, edges: 2 }), ...(step.edges % 2 ? [{ step, edges: 1 }] : [])])
  const amounts = splitOverPairs(totalMm, pairs.map(({ edges }) => edges), stepMm)
  return group.flatMap((step) => {
    const own = amounts.filter((_, i) => pairs[i]!.step === step)
    const even = alike(own.filter(([a, b]) => b === undefined || a === b).flat())
    const odd = own.filter(([a, b]) => b !== undefined && a !== b)
    return [
      ...even.map(({ mm, count }): Shared => ({ step, side: 'both', edges: count, mm })),
      ...odd.flatMap(([a, b]): Shared[] => [{ step, side: 'right', edges: 1, mm: a! }, { step, side: 'left', edges: 1, mm: b! }]),
    ]
  })
}

/** The whole stands for each side and is divided over the edges of one side; both sides alike. */
function overSides(group: readonly StepRule[], totalMm: number, { side, stepMm }: StepContext): Shared[] {
  const amounts = splitAmount(totalMm, group.map((step) => edgesOn(step, 'left')), stepMm)
  return group.flatMap((step, i) => alike(splitAmount(amounts[i]!, edgesOn(step, 'left'), stepMm)).map(({ mm, count }) => ({ step, side, edges: side === 'both' ? Math.min(step.edges, count * 2) : count, mm })))
}

function alike(amounts: readonly number[]): { mm: number; count: number }[] {
  const counts = new Map<number, number>()
  for (const mm of amounts) counts.set(mm, (counts.get(mm) ?? 0) + 1)
  return [...counts].map(([mm, count]) => ({ mm, count }))
}

const sideWords = { both: 'left and right', left: 'left', right: 'right' } as const

function worded({ step, side, edges, mm }: Shared, { wholeMm, takesBack }: StepContext): ChangeStep {
  const fill = (text: string) => text.replaceAll('{amount}', mmToken(mm)).replaceAll('{whole}', mmToken(wholeMm)).replaceAll('{half}', mmToken(wholeMm / 2)).replaceAll('{side}', sideWords[side])
  const back = `Take {amount} of the earlier change back: ${step.edge}, {side}${step.taper ? `, ${step.taper}` : ''}.`
  return { pieceRole: step.piece, side, edge: step.edge, amountMm: mm, edges, ...(step.taper && { taper: step.taper }), text: fill(takesBack && mm !== 0 ? back : step.text) }
}
