import { type BustAddition } from '../../sizes/bustDifference.ts'
import { type SizeChart } from '../../sizes/sizeChart.ts'
import { type EaseBand } from '../../sizes/wearingEase.ts'
import { type Body, type Garment, type PieceRole } from '../types.ts'

/** What a size is chosen by where the bust is full: the chart's high bust (or bust less the drafted difference), or its bust column. */
export type HighBustRule = 'high-bust-column' | 'bust-column'

export type SizePlanOptions = {
  /** full bust minus high bust the pattern is drafted for; unknown where null */
  draftedCupMm?: number | null
  /** the maker's own size per zone: measurement code → label; it overrides what is recommended */
  choices?: Readonly<Record<string, string>>
  /** stretch of the cloth round the body */
  stretchPercent?: number
  highBustRule?: HighBustRule
  /** decides only half way between two sizes */
  frame?: 'small' | 'large'
}

/** One size at one zone: what it is drafted for and what it leaves this body. All mm. */
export type ZoneSize = {
  size: string
  index: number
  /** what the size is drafted for: the bust less the drafted difference where the high bust leads */
  chartMm: number
  /** body less chart: + the body is larger than the size is drafted for */
  bodyOverMm: number
  finishedMm: number | null
  /** finished less body; null where the pattern gives no finished measure */
  easeMm: number | null
  /** ease the pattern means: finished less the chart's body */
  designEaseMm: number | null
  /** null where the ease is unknown */
  enough: boolean | null
  /** what would have to be changed on the paper to cut this size */
  toChange: string
}

export type OffChart = {
  side: 'below' | 'above'
  byMm: number
  /** in steps between the two outermost sizes; null in a chart of one size */
  grades: number | null
  /** 'shift' the outermost line, 'check' beyond one grade, 'refuse' beyond two */
  verdict: 'shift' | 'check' | 'refuse'
  text: string
}

export type ZonePlan = {
  code: string
  name: string
  governing: boolean
  /** null where the body has no such measurement yet */
  bodyMm: number | null
  /** the measurement compared with the chart: the high bust where it leads */
  leadCode: string
  leadMm: number | null
  size: string
  index: number
  /** true where the maker's own choice stands */
  chosen: boolean
  recommended: { size: string; index: number; reason: string }
  /** 0 at the lower size, 1 at the upper; null outside the chart or without a measurement */
  t: number | null
  /** the sizes on either side, one where the body stands on a size or off the chart */
  neighbours: readonly ZoneSize[]
  /** the size that is cut */
  cut: ZoneSize | null
  /** what the front is to gain over the bust before this ease holds */
  addedMm: number
  /** ease with the addition */
  easeMm: number | null
  designEaseMm: number | null
  minimumMm: number | null
  /** ease got less ease the pattern means, or chart less body where finished measures are missing; null without a body measurement */
  againstDesignMm: number | null
  reads: string
  band: EaseBand | null
  offChart: OffChart | null
  warnings: readonly string[]
}

export type CupPlan = {
  rule: HighBustRule
  /** which of the two rules was used, and why the high bust leads */
  text: string
  bodyMm: number
  draftedMm: number
  /** the pattern does not say, 2 in is taken */
  draftedAssumed: boolean
  size: string
  addition: BustAddition
  /** full bust less the bust the traced size is drafted for */
  toRowMm: number
  other: { rule: HighBustRule; size: string; addition: BustAddition }
}

export type BlendVerdict = 'ok' | 'check' | 'steep'
export type Blend = {
  fromCode: string
  toCode: string
  fromSize: string
  toSize: string
  /** what each of the edges moves, + outwards */
  perEdgeMm: number
  edges: number
  distanceMm: number
  /** the distance is our usual one, not measured */
  distanceAssumed: boolean
  /** move over distance: 0.125 is 1 in 8 */
  slope: number
  angleDeg: number
  verdict: BlendVerdict
  sizesApart: number
  text: string
}

export type LengthPlan = {
  code: string
  name: string
  bodyMm: number
  chartMm: number
  size: string
  /** + lengthen, − shorten the paper before tracing */
  amountMm: number
  /** under 5 mm: leave it */
  leave: boolean
  text: string
}

export type OpeningPlan = {
  /** sewn waist edge without elastic; null where the pattern does not give it */
  edgeMm: number | null
  hipMm: number
  neededMm: number
  passes: boolean | null
  shortMm: number
  text: string
}

export type SizePlan = {
  governing: { code: string; name: string; reason: string } | null
  zones: readonly ZonePlan[]
  /** the sizes down the cutting line, joined where neighbours are equal */
  runs: readonly { size: string; index: number; from: string }[]
  /** "14", or "14→16 from waist to hip" */
  label: string
  /** the same for each piece */
  pieceLabels: Readonly<Partial<Record<PieceRole, string>>>
  cup: CupPlan | null
  blends: readonly Blend[]
  lengths: readonly LengthPlan[]
  opening: OpeningPlan | null
  missing: readonly { code: string; name: string; why: string }[]
  /** true where a zone lies too far off the chart to trace from it */
  refused: boolean
  warnings: readonly string[]
  reason: string
  /** what the traced pattern is drafted for, zone by zone, as the rules module takes it */
  pattern: { body: Body; finished?: Body; draftedCupMm?: number }
}

/** What every step of the plan reads. */
export type PlanInput = { body: Body; chart: SizeChart; garment: Garment; options: SizePlanOptions }
