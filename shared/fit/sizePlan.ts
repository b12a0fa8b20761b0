import { bodyValue, measurementName } from '../measurements/findMeasurement.ts'
import { bodyColumn, type SizeChart } from '../sizes/sizeChart.ts'
import { blendLines } from './sizePlan/blendLines.ts'
import { cupPlan } from './sizePlan/cupPlan.ts'
import { chainOf, followersOf, hasFeature, isKnit, isUpper, levelWord, lengthsOf, upperCode } from './sizePlan/garmentZones.ts'
import { governingOf, highBustLeads, isFull, isLooseTop, tieOf } from './sizePlan/governing.ts'
import { lengthPlans } from './sizePlan/lengthPlan.ts'
import { nearestSize } from './sizePlan/nearestSize.ts'
import { planReason } from './sizePlan/planReason.ts'
import { pieceLabels, runningLabel, sizeRuns } from './sizePlan/sizeLabel.ts'
import { type CupPlan, type PlanInput, type SizePlan, type SizePlanOptions, type ZonePlan } from './sizePlan/types.ts'
import { elasticWaistIndex, openingPlan } from './sizePlan/waistOpening.ts'
import { withAddition, zonePlan, type ZoneOrder } from './sizePlan/zonePlan.ts'
import { type Body, type Garment } from './types.ts'

export type { SizePlan, SizePlanOptions, ZonePlan }

/**
 * Which size to trace, zone by zone, what ease results, where to blend from one size's line to another, what to lengthen, and why.
 * Works with whatever is known: an empty chart or body gives a plan that says what is missing.
 * @param body - measurement code → mm; sides as `code-left`, `code-right`
 * @param chart - sizes, smallest first
 * @returns amounts in mm; texts carry them as `{mm:16}` or `{+mm:-16}`, for the reader's unit
 * Source: common practice of home sewing; each rule names its own where it has one
 */
export function sizePlan(body: Body, chart: SizeChart, garment: Garment, options: SizePlanOptions = {}): SizePlan {
  const input: PlanInput = { body, chart, garment, options }
  const governing = governingOf(input)
  const planned = planZones(input, governing?.code ?? null)
  const lead = planned.find((zone) => zone.governing) ?? null
  const cup = lead && lead.leadCode === 'high-bust' ? cupPlan(input, lead.index, tieOf(input).take) : null
  const zones = cup && cup.addition.advice !== 'leave' ? planned.map((zone) => (zone === lead ? withAddition(input, zone, cup.addition.wholeMm) : zone)) : planned
  const chain = chainOf(input).flatMap((code) => zones.find((zone) => zone.code === code) ?? [])
  const waistIndex = (zones.find(({ code }) => code === 'waist') ?? lead)?.index
  const opening = waistIndex === undefined ? null : openingPlan(input, waistIndex)
  const named = governing && { code: governing.code, name: measurementName(governing.code), reason: governing.reason }
  return {
    governing: named, zones, cup, opening, runs: sizeRuns(chain), label: runningLabel(chain), pieceLabels: pieceLabels(input, zones), blends: blendLines(input, chain), lengths: lengthPlans(input, zones),
    missing: missingMeasurements(input), refused: zones.some(({ offChart }) => offChart?.verdict === 'refuse'), warnings: [...chartWarnings(input), ...(governing?.warnings ?? []), ...(opening && opening.passes !== true ? [opening.text] : [])],
    reason: planReason(named, zones), pattern: patternOf(input, zones, cup),
  }
}

function planZones(input: PlanInput, governingCode: string | null): ZonePlan[] {
  const chain = chainOf(input)
  const upper = isUpper(input.garment.kind) ? chain[0]! : null
  const plan = (code: string, follow?: ZoneOrder['follow']) => zonePlan(input, { code, governing: code === governingCode, byHighBust: code === upper && upper === 'bust' && highBustLeads(input), ...(follow && { follow }) })
  const lead = governingCode ? plan(governingCode) : null
  const chainZones: ZonePlan[] = []
  for (const code of chain) {
    const zone = code === governingCode ? lead : plan(code, followOf(input, code, lead, chainZones))
    if (zone) chainZones.push(zone)
  }
  const base = upper ? chainZones.find(({ code }) => code === upper) ?? lead : chainZones.findLast(({ code }) => code === 'thigh' || code === 'hip') ?? lead
  const others = followersOf(input).flatMap((code): ZonePlan[] => {
    if (code === governingCode) return lead ? [lead] : []
    const zone = plan(code, base ? { index: base.index, reason: `Keeps the size of the ${levelWord(base.code)}: nothing is blended inside an armhole, a neckline or a leg.`, grow: false } : undefined)
    return zone ? [zone] : []
  })
  return [...chainZones, ...others]
}

/** Zones that keep another's size, because the garment hangs free there or elastic draws it in. */
function followOf(input: PlanInput, code: string, lead: ZonePlan | null, above: readonly ZonePlan[]): ZoneOrder['follow'] {
  if (!lead) return undefined
  const { garment, body, chart } = input
  if (code === 'waist' && garment.waist === 'elastic' && !isUpper(garment.kind)) {
    const [mm, column] = [bodyValue(body, 'waist'), bodyColumn(chart, 'waist')]
    const own = mm !== null && column.length ? nearestSize(mm, column, tieOf(input).take).index : null
    return { ...elasticWaistIndex(input, own, lead.index), grow: false }
  }
  const free = (code === 'hip' || code === 'abdomen') && isFull(input)
  if (free) {
    const waist = above.find((zone) => zone.code === 'waist') ?? lead
    return { index: waist.index, reason: `The skirt hangs free of the ${levelWord(code)}, so it keeps the size of the ${levelWord(waist.code)}.`, grow: true }
  }
  if (isLooseTop(input)) return { index: lead.index, reason: `The garment hangs free of the ${levelWord(code)}, so it keeps the size of the ${levelWord(lead.code)}.`, grow: true }
  // The neck of a shirt may lead over its chest: the body is then cut in the neck's size.
  if (lead.code === 'neck') return { index: lead.index, reason: 'Keeps the size of the neck, which leads.', grow: true }
  return bodyValue(body, code) === null ? { index: lead.index, reason: `Not measured yet; keeps the size of the ${levelWord(lead.code)}.`, grow: false } : undefined
}

function missingMeasurements(input: PlanInput): SizePlan['missing'] {
  const { body, chart, garment } = input
  const missing: { code: string; name: string; why: string }[] = []
  const ask = (code: string, why: string) => {
    if (bodyValue(body, code) === null) missing.push({ code, name: measurementName(code), why })
  }
  const inChart = (code: string) => bodyColumn(chart, code).length > 0
  for (const code of chainOf(input)) if (inChart(code)) ask(code, `The chart is drafted for it; without it the ${levelWord(code)} keeps the size next to it.`)
  for (const code of followersOf(input)) if (inChart(code)) ask(code, 'Shows whether the size leaves enough ease there.')
  if (isUpper(garment.kind) && upperCode(body, chart) === 'bust' && body.bust && !hasFeature(garment, 'children')) ask('high-bust', 'Shows whether the size should be taken by it, with the bust changed on the paper.')
  for (const { code } of lengthsOf(input)) if (inChart(code) || (code === 'crotch-depth' && chart.some((row) => row.finished?.[code]))) ask(code, 'Shows what to lengthen or shorten before tracing.')
  if (garment.waist === 'elastic') ask('hip', 'The waist opening must pass over it.')
  return missing.filter(({ code }, i) => missing.findIndex((one) => one.code === code) === i)
}

function chartWarnings(input: PlanInput): string[] {
  const { chart, garment, options } = input
  if (!chart.length) return ['This pattern has no size chart yet. Type the body measurements from its envelope; two sizes are enough to start.']
  const warnings: string[] = []
  if (!chart.some((row) => row.finished && Object.keys(row.finished).length)) warnings.push('The pattern gives no finished measurements, so the ease cannot be told. Measure the paper across at bust, waist or hip, and type it in.')
  if (isKnit(input) && options.stretchPercent === undefined) warnings.push('The stretch of the cloth is not measured. Fold it, mark {mm:100} away from the edge, and see how far that goes easily and comes back from.')
  if (hasFeature(garment, 'children')) warnings.push(childrenText(input))
  return warnings
}

/** Children's lengths go by height, widths by their own girths, nothing by age. Common practice. */
function childrenText({ body, chart }: PlanInput): string {
  const [height, column] = [bodyValue(body, 'height'), bodyColumn(chart, 'height')]
  const start = 'Children are sized by their measurements and their height, never by age.'
  return height !== null && column.length ? `${start} By height, trace the lengths of size ${nearestSize(height, column, 'larger').label}; the widths keep their own size.` : start
}

/** What was traced is drafted for the chart's body of each level's own size; everything else follows the size that leads. */
function patternOf({ chart, options }: PlanInput, zones: readonly ZonePlan[], cup: CupPlan | null): SizePlan['pattern'] {
  const lead = zones.find(({ governing }) => governing) ?? zones[0]
  const row = lead && chart[lead.index]
  if (!row) return { body: {} }
  const body: Record<string, number> = { ...row.body }
  const finished: Record<string, number> = { ...row.finished }
  for (const { code, index } of zones) {
    const own = chart[index]!
    if (own.body[code]) body[code] = own.body[code]
    if (own.finished?.[code]) finished[code] = own.finished[code]
  }
  const drafted = options.draftedCupMm ?? cup?.draftedMm
  return { body, ...(Object.keys(finished).length && { finished }), ...(drafted !== undefined && drafted !== null && { draftedCupMm: drafted }) }
}
