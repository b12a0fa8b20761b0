import { bodyValue } from '../../measurements/findMeasurement.ts'
import { negativeEaseLimitPercent } from '../../sizes/knitStretch.ts'
import { bodyColumn } from '../../sizes/sizeChart.ts'
import { easeBand } from '../../sizes/wearingEase.ts'
import { tidyMm } from '../../units/unit.ts'
import { highBustColumn, ruleOf } from './cupPlan.ts'
import { isKnit, isUpper, levelWord } from './garmentZones.ts'
import { draftedOf, tieOf } from './governing.ts'
import { nearestSize, type Column, type Nearest } from './nearestSize.ts'
import { type OffChart, type PlanInput, type ZonePlan, type ZoneSize } from './types.ts'
import { leastEaseMm, noiseMm, zoneSize } from './zoneSize.ts'

export type ZoneOrder = {
  code: string
  governing: boolean
  /** led by the high bust */
  byHighBust: boolean
  /** keep the size of another zone; `grow` where a larger size may be taken for want of ease */
  follow?: { index: number; reason: string; grow: boolean }
}

/** The zone as it stands before the front gains anything over the bust; `withAddition` adds that. */
export function zonePlan(input: PlanInput, order: ZoneOrder): ZonePlan | null {
  const { code, governing, byHighBust } = order
  const own = bodyColumn(input.chart, code)
  const column = byHighBust ? highBustColumn(input.chart, ruleOf(input), draftedOf(input).mm) : own
  if (!column.length) return null
  const bodyMm = bodyValue(input.body, code)
  const leadCode = byHighBust ? 'high-bust' : code
  const leadMm = bodyValue(input.body, leadCode)
  const near = leadMm === null ? null : nearestSize(leadMm, column, tieOf(input).take)
  const recommended = recommend(input, order, near, column, bodyMm)
  const choice = chosenIndex(input, code, column)
  const index = choice.index ?? recommended.index
  const offChart = near?.offChart && leadMm !== null ? withText(near.offChart, code, near.label) : null
  const cut = (addedMm: number) => (bodyMm === null || leadMm === null ? null : zoneSize(input, code, columnAt(column, index), bodyMm, leadMm, addedMm))
  const plan: ZonePlan = {
    code, name: capital(levelWord(code)), governing, bodyMm, leadCode, leadMm, size: input.chart[index]!.label, index, chosen: choice.index !== null, recommended,
    t: near?.t ?? null, neighbours: bodyMm === null || leadMm === null ? [] : (near?.around ?? []).map((place) => zoneSize(input, code, column[place]!, bodyMm, leadMm)),
    cut: cut(0), addedMm: 0, easeMm: null, designEaseMm: null, minimumMm: bodyMm === null ? null : leastEaseMm(input, code, bodyMm), againstDesignMm: null, reads: '', band: null, offChart,
    warnings: choice.warning ? [choice.warning] : [],
  }
  return withEase(input, plan, 0, cut(0))
}

/** The same zone once the front is changed over the bust by `addedMm`. */
export function withAddition(input: PlanInput, zone: ZonePlan, addedMm: number): ZonePlan {
  const cut = zone.cut && zone.bodyMm !== null && zone.leadMm !== null ? zoneSize(input, zone.code, { index: zone.index, label: zone.size, mm: zone.cut.chartMm }, zone.bodyMm, zone.leadMm, addedMm) : zone.cut
  return withEase(input, zone, addedMm, cut)
}

function withEase(input: PlanInput, zone: ZonePlan, addedMm: number, cut: ZoneSize | null): ZonePlan {
  const easeMm = cut?.easeMm ?? null
  const designEaseMm = cut?.designEaseMm ?? null
  // Without finished measures the garment is still known to differ from its design as the body differs from the chart.
  const chartMm = input.chart[zone.index]?.body[zone.code] ?? null
  const againstDesignMm = zone.bodyMm === null ? null : easeMm !== null && designEaseMm !== null ? tidyMm(easeMm - designEaseMm) : chartMm === null ? null : tidyMm(chartMm + addedMm - zone.bodyMm)
  const ease = { ...zone, cut, addedMm, easeMm, designEaseMm, againstDesignMm, band: easeMm === null ? null : easeBand(zone.code, input.garment.kind, easeMm, { knit: isKnit(input) }) }
  const kept = zone.warnings.filter((text) => !text.startsWith(easeWarningStart(zone)))
  return { ...ease, reads: readsAs(againstDesignMm), warnings: [...kept, ...easeWarnings(input, ease)] }
}

function recommend(input: PlanInput, { follow, code, byHighBust }: ZoneOrder, near: Nearest | null, column: Column, bodyMm: number | null): ZonePlan['recommended'] {
  const at = (one: { index: number; label: string }, reason: string) => ({ size: one.label, index: one.index, reason })
  if (follow) {
    const start = columnAt(column, follow.index)
    if (!follow.grow || bodyMm === null) return at(start, follow.reason)
    return growForEase(input, code, start, column, bodyMm, follow.reason)
  }
  if (!near) return at(columnAt(column, Math.floor((input.chart.length - 1) / 2)), 'Not measured yet; the middle size stands in.')
  if (near.offChart) return at(near, near.offChart.side === 'above' ? 'The largest size is nearest.' : 'The smallest size is nearest.')
  if (near.around.length === 1) return at(near, 'The body stands on this size.')
  if (near.tie) {
    const tie = tieOf(input)
    return at(near, `Half way between two sizes: ${tie.why}.`)
  }
  const reason = byHighBust ? 'The size nearest to the high bust.' : 'The nearest size.'
  // Led by the high bust, the front gains its ease on the paper and not by a larger size.
  return bodyMm === null || byHighBust || near.t! > 0.5 || isKnit(input) ? at(near, reason) : growForEase(input, code, columnAt(column, near.index), column, bodyMm, reason)
}

/** Where finished measures are known, the smallest size from `start` on that leaves enough to wear, or what the pattern means where that is less. */
function growForEase(input: PlanInput, code: string, start: Column[number], column: Column, bodyMm: number, reason: string): ZonePlan['recommended'] {
  const keep = { size: start.label, index: start.index, reason }
  const least = leastEaseMm(input, code, bodyMm)
  const place = column.findIndex(({ index }) => index === start.index)
  const bigger = column.slice(Math.max(0, place)).find((one) => {
    const { easeMm, designEaseMm } = zoneSize(input, code, one, bodyMm, bodyMm)
    return easeMm === null || least === null || easeMm >= Math.min(least, designEaseMm ?? least) - noiseMm
  })
  if (!bigger || bigger.index === start.index) return keep
  return { size: bigger.label, index: bigger.index, reason: `Size ${start.label} would leave too little ease at the ${levelWord(code)}; this is the smallest that leaves enough, and it is easier to take in than to let out.` }
}

/** The column's entry for a size, or the nearest one that has a value. */
export function columnAt(column: Column, index: number): Column[number] {
  return column.reduce((best, one) => (Math.abs(one.index - index) < Math.abs(best.index - index) ? one : best))
}

function chosenIndex({ options, chart }: PlanInput, code: string, column: Column): { index: number | null; warning?: string } {
  const label = options.choices?.[code]
  if (label === undefined) return { index: null }
  const index = chart.findIndex((row) => row.label === label)
  if (index < 0) return { index: null, warning: `Size ${label} was chosen for the ${levelWord(code)} and is no longer in the chart. The recommended size stands in.` }
  return column.some((one) => one.index === index) ? { index } : { index: null, warning: `Size ${label} gives no ${levelWord(code)} in this chart. The recommended size stands in.` }
}

function withText(off: Omit<OffChart, 'text'>, code: string, end: string): OffChart {
  const way = off.side === 'above' ? 'larger than the largest' : 'smaller than the smallest'
  const start = `The ${levelWord(code)} is {mm:${off.byMm}} ${way} size, ${end}.`
  const grades = off.grades === null ? '' : ` That is ${Math.round(off.grades * 10) / 10} of the step from the size next to it.`
  const advice = {
    shift: `Draw a line {mm:${off.byMm}} ${off.side === 'above' ? 'outside' : 'inside'} it, shared over the seams as the sizes themselves are.`,
    check: 'Shift the line that far, shared over the seams, and prove it on a sample before anything else.',
    refuse: 'Beyond two steps the shapes no longer hold. Take another chart or another pattern; this one would have to be drafted anew.',
  }[off.verdict]
  return { ...off, text: `${start}${grades} ${advice}` }
}

function readsAs(againstMm: number | null): string {
  if (againstMm === null) return ''
  if (Math.abs(againstMm) < 1) return 'as drafted'
  return againstMm < 0 ? `{mm:${-againstMm}} under` : `{mm:${againstMm}} over`
}

const easeWarningStart = ({ code }: Pick<ZonePlan, 'code'>) => `The ${levelWord(code)} would`
function easeWarnings(input: PlanInput, zone: ZonePlan): string[] {
  const { easeMm, minimumMm, designEaseMm, bodyMm } = zone
  if (easeMm === null || bodyMm === null) return []
  const start = easeWarningStart(zone)
  const stretch = input.options.stretchPercent ?? 0
  if (isKnit(input)) {
    const limitMm = Math.round((bodyMm * negativeEaseLimitPercent(stretch)) / 100)
    if (easeMm < -limitMm) return [`${start} be {mm:${-easeMm}} smaller than the body; cloth of ${stretch} % stretch spans {mm:${limitMm}} at the very most. Take a larger size or another cloth.`]
    if (minimumMm !== null && easeMm < minimumMm) return [`${start} be {mm:${-easeMm}} smaller than the body, more than half of what the cloth can span. Check that it recovers, and prove it on a sample of the same knit.`]
    return []
  }
  const seated = seatedWarning(input, zone)
  if (minimumMm === null || easeMm >= minimumMm - 0.5) return seated ? [seated] : []
  const meant = designEaseMm === null || designEaseMm >= minimumMm ? '' : designEaseMm < 0 ? `{mm:${-designEaseMm}} less than the body` : `{mm:${designEaseMm}}`
  const drafted = meant && ` The pattern itself means ${meant}.`
  const have = easeMm < 0 ? `be {mm:${-easeMm}} smaller than the body` : `have {mm:${easeMm}} of ease`
  return [`${start} ${have}; {mm:${minimumMm}} is the least to wear in cloth that does not stretch.${drafted}`]
}

/** Waist and hip grow in sitting; a skirt or trousers of cloth that does not stretch must take that too. Common practice. */
function seatedWarning({ body, garment }: PlanInput, { code, cut }: ZonePlan): string | null {
  const seatedMm = body[`${code}-seated`]
  if (!seatedMm || !cut?.finishedMm || isUpper(garment.kind) || cut.finishedMm >= seatedMm) return null
  return `${easeWarningStart({ code })} be {mm:${tidyMm(seatedMm - cut.finishedMm)}} short in sitting. Take a larger size there, or let it out.`
}
const capital = (text: string) => text[0]!.toUpperCase() + text.slice(1)
