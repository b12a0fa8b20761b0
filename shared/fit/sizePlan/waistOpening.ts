import { elasticLength, elasticStretchNeeded, pullOn, pullOnEaseMm } from '../../sizes/elasticWaist.ts'
import { bodyColumn } from '../../sizes/sizeChart.ts'
import { tidyMm } from '../../units/unit.ts'
import { isKnit } from './garmentZones.ts'
import { type OpeningPlan, type PlanInput } from './types.ts'

const stretchOf = (input: PlanInput): number => (isKnit(input) ? input.options.stretchPercent ?? 0 : 0)

/** Whether a size's sewn waist edge passes the hip; null where the pattern does not give the edge or the hip is not measured. */
export function edgePasses(input: PlanInput, index: number): boolean | null {
  const edgeMm = input.chart[index]?.finished?.waist
  return edgeMm && input.body.hip ? pullOn(edgeMm, input.body.hip, stretchOf(input)).passes : null
}

/**
 * The size of an elastic waist: the waist's own where its edge passes the hip, else the smallest on the way to the hip's size and
 * beyond that does. Where the edge is not known, the hip's size.
 */
export function elasticWaistIndex(input: PlanInput, ownIndex: number | null, hipIndex: number): { index: number; reason: string } {
  const places = bodyColumn(input.chart, 'waist').map(({ index }) => index)
  const safe = { index: hipIndex, reason: 'The waist edge keeps the size of the hip, so that it can pass over it; the elastic draws it in.' }
  if (ownIndex === null || edgePasses(input, ownIndex) === null) return safe
  if (edgePasses(input, ownIndex)) return { index: ownIndex, reason: ownIndex === hipIndex ? safe.reason : 'The edge of this size passes the hip, so the waist may keep its own size and gathers less.' }
  const larger = places.filter((index) => index > ownIndex).find((index) => edgePasses(input, index))
  return larger === undefined ? safe : { index: larger, reason: 'The smallest size from the waist on whose edge passes the hip; the elastic draws it in.' }
}

/** The pull-on rule at the size that is cut. Null where the waist has an opening, or the hip is not measured. */
export function openingPlan(input: PlanInput, waistIndex: number): OpeningPlan | null {
  const hipMm = input.body.hip
  if (input.garment.waist !== 'elastic' || !hipMm) return null
  const edgeMm = input.chart[waistIndex]?.finished?.waist ?? null
  const stretch = stretchOf(input)
  const least = hipMm + (stretch > 0 ? 0 : pullOnEaseMm.least)
  if (edgeMm === null) {
    return { edgeMm, hipMm, neededMm: least, passes: null, shortMm: 0, text: `The waist edge must pass the hip: measure it on the paper, pulled out and without elastic. It needs at least {mm:${tidyMm(least)}}.` }
  }
  const { passes, neededMm, shortMm, shortOfUsualMm } = pullOn(edgeMm, hipMm, stretch)
  const waist = input.body.waist
  const elastic = waist ? elasticLength(waist) : null
  const elasticText = elastic ? ` Elastic for this waist is cut to about {mm:${Math.round(elastic.cutMm)}} and must stretch by ${Math.ceil(elasticStretchNeeded(elastic.joinedMm, hipMm))} % to pass.` : ''
  const short = tidyMm(shortMm)
  const text = passes
    ? `The waist edge of {mm:${edgeMm}} passes the hip.${elasticText}`
    : stretch > 0
      ? `The waist edge is {mm:${short}} short of passing the hip at ${stretch} % stretch. Cut a larger size at the waist, or put in an opening.`
      : `The waist edge is {mm:${short}} to {mm:${tidyMm(shortOfUsualMm)}} short of passing the hip. Cut a larger size at the waist, or put in an opening.`
  return { edgeMm, hipMm, neededMm: tidyMm(neededMm), passes, shortMm: short, text }
}
