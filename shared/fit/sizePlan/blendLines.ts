import { tidyMm } from '../../units/unit.ts'
import { type Body } from '../types.ts'
import { levelWord } from './garmentZones.ts'
import { type Blend, type BlendVerdict, type PlanInput, type ZonePlan } from './types.ts'

/** Steepness that needs nothing, and that needs a look at the curve. No published figure was found; our own limits. */
export const okSlope = 1 / 8
export const checkSlope = 1 / 5
/** Front and back, left and right. */
export const usualEdges = 4
/** More sizes apart than this between neighbouring levels: take the one between and alter. Common practice. */
const mostSizesApart = 2

/** How steep an edge runs that moves `perEdgeMm` over `distanceMm` of its length. */
export function blendSteepness(perEdgeMm: number, distanceMm: number): { slope: number; angleDeg: number; verdict: BlendVerdict } {
  const slope = Math.abs(perEdgeMm) / distanceMm
  return { slope, angleDeg: (Math.atan(slope) * 180) / Math.PI, verdict: slope <= okSlope + 1e-9 ? 'ok' : slope <= checkSlope + 1e-9 ? 'check' : 'steep' }
}

/** What each edge moves at a level to come from one girth to another. */
export const perEdgeMove = (fromGirthMm: number, toGirthMm: number, edges: number = usualEdges): number => tidyMm((toGirthMm - fromGirthMm) / edges)

/** Heights of the levels below the prominent neck bone on our usual body, where the wearer's own are not known. Our own figures. */
const usual = { 'back-waist-length': 410, 'armscye-depth': 210, 'waist-to-hip': 205, 'crotch-depth': 280 } as const
/** A blend leaves the bust about 5 cm below the armhole. Common practice. */
const belowArmholeMm = 50
const abdomenShare = 0.45 // 3 to 4 in of the 7 to 9 in from waist to hip
const thighBelowCrotchMm = 25

/** Distance along the edge between two levels. */
export function levelDistance(body: Body, from: string, to: string): { mm: number; assumed: boolean } {
  const used: string[] = []
  const value = (code: keyof typeof usual) => {
    if (!body[code]) used.push(code)
    return body[code] ?? usual[code]
  }
  const heightOf = (code: string): number => {
    const waist = value('back-waist-length')
    if (code === 'bust' || code === 'chest') return value('armscye-depth') + belowArmholeMm
    if (code === 'abdomen') return waist + value('waist-to-hip') * abdomenShare
    if (code === 'hip') return waist + value('waist-to-hip')
    if (code === 'thigh') return waist + value('crotch-depth') + thighBelowCrotchMm
    return waist
  }
  const mm = Math.max(20, tidyMm(heightOf(to) - heightOf(from)))
  // Below the waist the back length cancels out.
  const needed = from === 'bust' || from === 'chest' ? used : used.filter((code) => code !== 'back-waist-length')
  return { mm, assumed: needed.length > 0 }
}

/** The lines drawn from one size to another between neighbouring levels whose sizes differ. */
export function blendLines(input: PlanInput, chain: readonly ZonePlan[]): Blend[] {
  return chain.slice(1).flatMap((to, i) => {
    const from = chain[i]!
    if (from.index === to.index) return []
    const girth = (index: number) => input.chart[index]?.finished?.[to.code] ?? input.chart[index]?.body[to.code]
    const both = (key: 'finished' | 'body') => [input.chart[from.index]?.[key]?.[to.code], input.chart[to.index]?.[key]?.[to.code]] as const
    // One kind of measure for both ends: finished against body would count the ease as a blend.
    const [a, b] = both('finished').every((mm) => mm !== undefined) ? both('finished') : both('body')
    const perEdgeMm = perEdgeMove(a ?? girth(to.index) ?? 0, b ?? girth(to.index) ?? 0)
    const { mm: distanceMm, assumed } = levelDistance(input.body, from.code, to.code)
    const steepness = blendSteepness(perEdgeMm, distanceMm)
    const sizesApart = Math.abs(to.index - from.index)
    return [{ fromCode: from.code, toCode: to.code, fromSize: from.size, toSize: to.size, perEdgeMm, edges: usualEdges, distanceMm, distanceAssumed: assumed, ...steepness, sizesApart, text: blendText(from, to, perEdgeMm, distanceMm, steepness.verdict, sizesApart) }]
  })
}

function blendText(from: ZonePlan, to: ZonePlan, perEdgeMm: number, distanceMm: number, verdict: BlendVerdict, sizesApart: number): string {
  const way = perEdgeMm >= 0 ? 'out' : 'in'
  const line = `Leave size ${from.size} at the ${levelWord(from.code)} and meet size ${to.size} at the ${levelWord(to.code)}: each side-seam edge runs {mm:${Math.abs(perEdgeMm)}} ${way} over {mm:${Math.round(distanceMm)}}. Both edges of the seam get the same line.`
  const steep = verdict === 'ok' ? '' : verdict === 'check'
    ? ' That is steep: check that the curve stays smooth.'
    : from.code === 'waist' || to.code === 'waist'
      ? ' That is too steep for one seam: take part of it at the darts, at most {mm:25} a dart in front and {mm:40} at the back, or in other seams.'
      : ' That is too steep for one seam: share it with other seams or darts.'
  return line + steep + (sizesApart > mostSizesApart ? ` The sizes are ${sizesApart} apart: take one between and alter, or share the difference with darts and seams.` : '')
}
