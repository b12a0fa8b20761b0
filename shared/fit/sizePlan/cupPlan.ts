import { additionOf, type BustAddition } from '../../sizes/bustDifference.ts'
import { bodyColumn, type SizeChart } from '../../sizes/sizeChart.ts'
import { tidyMm } from '../../units/unit.ts'
import { cupOf, draftedOf, highBustLeads } from './governing.ts'
import { nearestSize, type Column } from './nearestSize.ts'
import { type CupPlan, type HighBustRule, type PlanInput } from './types.ts'

/**
 * The column the high bust is looked up in. 'high-bust-column': the chart's own, or its bust less the drafted difference.
 * 'bust-column': the bust column as it stands, as many sewing courses teach; it gives a smaller size and a larger change.
 */
export function highBustColumn(chart: SizeChart, rule: HighBustRule, draftedMm: number): Column {
  if (rule === 'bust-column') return bodyColumn(chart, 'bust')
  const own = bodyColumn(chart, 'high-bust')
  return own.length ? own : bodyColumn(chart, 'bust').map((one) => ({ ...one, mm: tidyMm(one.mm - draftedMm) }))
}
export const ruleOf = ({ options }: PlanInput): HighBustRule => options.highBustRule ?? 'high-bust-column'

/** What the drafted bust of a size is: the chart's, or its high bust and the drafted difference. */
const rowBust = (chart: SizeChart, index: number): number | null => chart[index]?.body.bust ?? null

/**
 * How the size follows from the high bust and what the front must then gain, under both rules of the trade.
 * @param cutIndex - the size that is cut at the bust
 * @returns null where the high bust does not lead
 */
export function cupPlan(input: PlanInput, cutIndex: number, atTie: 'smaller' | 'larger'): CupPlan | null {
  const { body, chart } = input
  if (!highBustLeads(input) || !bodyColumn(chart, 'bust').length) return null
  const { mm, assumed } = draftedOf(input)
  const [bodyMm, draftedMm, rule] = [tidyMm(cupOf(input)!), tidyMm(mm), ruleOf(input)]
  const found = (which: HighBustRule) => nearestSize(body['high-bust']!, highBustColumn(chart, which, draftedMm), atTie)
  const additionAt = (which: HighBustRule, index: number): BustAddition => {
    const toRow = tidyMm(body.bust! - (rowBust(chart, index) ?? body.bust!))
    // Taken by its own high bust, a size lacks exactly the difference of the differences; taken otherwise, what its bust lacks.
    return additionOf(which === 'high-bust-column' && index === found(which).index ? tidyMm(bodyMm - draftedMm) : toRow)
  }
  const otherRule: HighBustRule = rule === 'bust-column' ? 'high-bust-column' : 'bust-column'
  const other = found(otherRule)
  const addition = additionAt(rule, cutIndex)
  return {
    rule, bodyMm, draftedMm, draftedAssumed: assumed, size: chart[cutIndex]!.label, addition,
    toRowMm: tidyMm(body.bust! - (rowBust(chart, cutIndex) ?? body.bust!)),
    other: { rule: otherRule, size: other.label, addition: additionAt(otherRule, other.index) },
    text: `${ruleText(input, rule)} ${draftedText(bodyMm, draftedMm, assumed)} ${changeText(addition)}`,
  }
}

function ruleText({ chart }: PlanInput, rule: HighBustRule): string {
  if (rule === 'bust-column') return 'The size is the one whose bust equals this high bust.'
  return bodyColumn(chart, 'high-bust').length ? 'The size is the one whose high bust is nearest to this one.' : 'The size is the one whose bust, less the drafted difference, is nearest to this high bust.'
}
const draftedText = (bodyMm: number, draftedMm: number, assumed: boolean) =>
  `The full bust is ${overHighBust(bodyMm)}; the pattern is drafted for ${draftedMm < 0 ? overHighBust(draftedMm) : `{mm:${draftedMm}}`}${assumed ? ', as most are where they do not say' : ''}.`
const overHighBust = (mm: number) => (mm < 0 ? `{mm:${-mm}} less than the high bust` : `{mm:${mm}} more than the high bust`)
function changeText({ wholeMm, halfFrontMm, advice }: BustAddition): string {
  if (advice === 'leave') return 'That is near enough to leave the bust as it is.'
  if (advice === 'take-away') return `Take {mm:${-wholeMm}} out of the front over the bust, {mm:${-halfFrontMm}} on each half.`
  return `Add {mm:${wholeMm}} to the front over the bust, {mm:${halfFrontMm}} on each half${advice === 'add-in-two' ? ', split over two darts or seams or done in two passes' : ''}.`
}
