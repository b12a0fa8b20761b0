export const measurementGroups = ['whole', 'neck-and-shoulder', 'trunk', 'arm', 'leg'] as const
export type MeasurementGroup = (typeof measurementGroups)[number]
export const measurementGroupWords: Readonly<Record<MeasurementGroup, string>> = {
  whole: 'Overall', 'neck-and-shoulder': 'Neck and shoulder', trunk: 'Bust, waist and hip', arm: 'Arm', leg: 'Leg',
}

/** Where the tape runs on the figure of 200 × 400 that faces us, turns its back, or faces left. */
export type TapeLine = {
  view: 'front' | 'back' | 'side'
  /** path data of the part in sight */
  path: string
  /** path data of the part behind the body */
  behind?: string
}

export type Percentiles = { p5Mm: number; p95Mm: number }
export type Plausible = {
  /** outside these an entry deserves a second look; it is never refused */
  leastMm: number
  mostMm: number
  women?: Percentiles
  men?: Percentiles
  source: string
}

export type Measurement = {
  code: string
  /** name in ISO 8559-1 / EN 13402-1; null where neither has it */
  standardName: string | null
  /** the name used in home sewing */
  name: string
  /** other words it goes by on charts and envelopes */
  aliases: readonly string[]
  group: MeasurementGroup
  kind: 'girth' | 'length' | 'width'
  how: string
  tape: TapeLine
  /** two readings further apart than this ask for a third */
  toleranceMm: number
  plausible: Plausible
  /** may be kept for left and right apart, as `code-left` and `code-right` */
  paired: boolean
}
