import { bodyValue } from '../../measurements/findMeasurement.ts'
import { fullBustFromMm, smallBustFromMm, usualDraftedCupMm } from '../../sizes/bustDifference.ts'
import { bodyColumn } from '../../sizes/sizeChart.ts'
import { easeBand } from '../../sizes/wearingEase.ts'
import { chainOf, hasFeature, isKnit, isUpper, levelWord, upperCode } from './garmentZones.ts'
import { nearestSize } from './nearestSize.ts'
import { type PlanInput } from './types.ts'

/** Room at the hip from which a skirt counts as full and is chosen by the waist. Common practice: about 15 cm. */
const fullHipEaseMm = 150
/** Bust ease from which only the shoulder decides. Common practice. */
const looseBustEaseMm = 200
const stretchyFromPercent = 25

/** Ease the pattern means at a place, by the middle size that gives both measures. */
export function designEaseMm({ chart }: PlanInput, code: string): number | null {
  const known = chart.flatMap((row) => (row.body[code] && row.finished?.[code] ? [row.finished[code] - row.body[code]] : []))
  return known[Math.floor(known.length / 2)] ?? null
}

/** Whether the skirt part hangs free of the hip, so that the waist decides. */
export function isFull(input: PlanInput): boolean {
  const { garment } = input
  if (hasFeature(garment, 'full') || hasFeature(garment, 'gathered')) return true
  const ease = designEaseMm(input, 'hip')
  if (ease !== null) return garment.kind !== 'trousers' && ease > fullHipEaseMm
  return hasFeature(garment, 'flared') && garment.kind !== 'trousers'
}
export function isLooseTop(input: PlanInput): boolean {
  const ease = designEaseMm(input, upperCode(input.body, input.chart))
  return isUpper(input.garment.kind) && ease !== null && ease > looseBustEaseMm
}

/** Which size half way between two: easier to take in than to let out, unless the garment is loose or gives. Common practice. */
export function tieOf(input: PlanInput): { take: 'smaller' | 'larger'; why: string } {
  const { garment, options } = input
  if (options.frame) return { take: options.frame === 'small' ? 'smaller' : 'larger', why: `a ${options.frame} frame takes the ${options.frame === 'small' ? 'smaller' : 'larger'}` }
  if (isKnit(input) || (options.stretchPercent ?? 0) >= stretchyFromPercent) return { take: 'smaller', why: 'cloth that stretches takes the smaller' }
  const code = isUpper(garment.kind) ? upperCode(input.body, input.chart) : 'hip'
  const ease = designEaseMm(input, code)
  const band = ease === null ? null : easeBand(code, garment.kind, ease)
  if (isFull(input) || isLooseTop(input) || band === 'loose' || band === 'very-loose') return { take: 'smaller', why: 'a loose garment takes the smaller' }
  return { take: 'larger', why: 'it is easier to take in than to let out' }
}

/** Full minus high bust, where both were taken. */
export const cupOf = ({ body }: PlanInput): number | null => (body.bust && body['high-bust'] ? body.bust - body['high-bust'] : null)
/** The drafted difference: as the pattern says, else as a chart with both columns shows, else the usual one. */
export function draftedOf({ options, chart }: PlanInput): { mm: number; assumed: boolean } {
  if (options.draftedCupMm !== undefined && options.draftedCupMm !== null) return { mm: options.draftedCupMm, assumed: false }
  const shown = chart.flatMap(({ body }) => (body.bust && body['high-bust'] ? [body.bust - body['high-bust']] : []))
  const middle = shown[Math.floor(shown.length / 2)]
  return middle === undefined ? { mm: usualDraftedCupMm, assumed: true } : { mm: middle, assumed: false }
}
/** Whether the high bust leads: the difference is 5 cm or more, or far from the drafted one. */
export function highBustLeads(input: PlanInput): boolean {
  const cup = cupOf(input)
  if (cup === null || !isUpper(input.garment.kind) || hasFeature(input.garment, 'children')) return false
  // 2 in are 50.8 mm and 5 cm are 50: the same rule in two units.
  return cup >= fullBustFromMm - 1e-6 || cup <= draftedOf(input).mm - smallBustFromMm
}

export type Governing = { code: string; reason: string; warnings: string[] }

/**
 * The measurement the size is chosen by, with the reason. Where chart or body lack it, the next of the garment's levels stands in.
 * Null where no level has both a chart column and a body measurement.
 */
export function governingOf(input: PlanInput): Governing | null {
  const wanted = wantedCodes(input)
  const usable = ({ code }: { code: string }) => bodyColumn(input.chart, code).length > 0 && bodyValue(input.body, code) !== null
  const found = wanted.find(usable) ?? chainOf(input).map((code) => ({ code, reason: `The ${levelWord(code)} leads, as it is what chart and measurements share.` })).find(usable)
  if (!found) return null
  const first = wanted[0]!
  const lacks = bodyColumn(input.chart, first.code).length ? 'the measurements have' : 'this chart has'
  return { ...found, warnings: found.code === first.code ? [] : [`The ${levelWord(first.code)} should lead, but ${lacks} none; the ${levelWord(found.code)} stands in.`] }
}

function wantedCodes(input: PlanInput): { code: string; reason: string }[] {
  const { garment } = input
  const elastic = garment.waist === 'elastic'
  if (garment.kind === 'skirt') {
    if (elastic) return [{ code: 'hip', reason: 'The hip leads: a waist without an opening must pass over it, and elastic draws the rest in.' }, { code: 'waist', reason: 'The waist leads, and the opening must still pass over the hip.' }]
    if (isFull(input)) return [{ code: 'waist', reason: 'The waist leads: a full skirt hangs free of the hip.' }]
    return [{ code: 'hip', reason: 'The hip leads: the waist is easily changed at darts and side seams.' }]
  }
  if (garment.kind === 'trousers') {
    return [{ code: 'hip', reason: elastic ? 'The hip leads: a waist without an opening must pass over it. Thigh and rise are checked next.' : 'The hip leads: the waist is easily changed at darts and seams. Thigh and rise are checked next.' }]
  }
  const upper = upperCode(input.body, input.chart)
  if (garment.kind === 'shirt' && upper === 'chest') {
    const neck = shirtNeck(input)
    if (neck) return [neck, { code: upper, reason: 'The chest leads.' }]
  }
  if (highBustLeads(input)) return [{ code: upper, reason: 'The high bust leads: neck, shoulder and upper chest are hard to change afterwards, the bust is changed on the paper.' }]
  if (isLooseTop(input)) return [{ code: upper, reason: `The ${upper} leads, through the shoulder alone: the rest hangs free.` }]
  return [{ code: upper, reason: `The ${upper} leads: neck, shoulder and armhole are hard to change afterwards.` }]
}

/** A collared shirt is taken by neck or chest, whichever asks for the larger size. Common practice. */
function shirtNeck(input: PlanInput): { code: string; reason: string } | null {
  const sizeAt = (code: string) => {
    const [column, mm] = [bodyColumn(input.chart, code), bodyValue(input.body, code)]
    return column.length && mm !== null ? nearestSize(mm, column, 'larger').index : null
  }
  const [neck, chest] = [sizeAt('neck'), sizeAt('chest')]
  if (neck === null || chest === null || neck <= chest) return null
  return { code: 'neck', reason: 'The neck leads: it asks for a larger size than the chest, and a collar cannot be let out.' }
}
