import { type GarmentKind } from '../fit/types.ts'
import { mmPerInch } from '../units/unit.ts'

const inches = (n: number) => n * mmPerInch

export type EaseRow = {
  code: string
  /** empty: all garments */
  garments: readonly GarmentKind[]
  leastMm: number
  mostMm: number
  source: string
}

/** Least ease to wear a garment of woven cloth, as sources give it; they differ. */
export const minimumEaseTable: readonly EaseRow[] = [
  { code: 'bust', garments: ['bodice', 'dress', 'shirt'], leastMm: inches(1.5), mostMm: inches(2), source: 'Central Washington University, costume textbook, ch. 16' },
  { code: 'bust', garments: [], leastMm: inches(2), mostMm: inches(2.5), source: 'general encyclopedia, Ease (sewing)' },
  { code: 'chest', garments: ['shirt'], leastMm: inches(1.5), mostMm: inches(2.5), source: 'Central Washington University, ch. 16, men’s fitted shirt' },
  { code: 'waist', garments: ['dress', 'bodice'], leastMm: inches(0.75), mostMm: inches(1), source: 'Central Washington University, ch. 16' },
  { code: 'waist', garments: ['skirt', 'trousers'], leastMm: inches(0.5), mostMm: inches(0.75), source: 'Central Washington University, ch. 16' },
  { code: 'waist', garments: [], leastMm: 0, mostMm: inches(1), source: 'New Mexico State University Extension, Guide C-209' },
  { code: 'hip', garments: [], leastMm: inches(2), mostMm: inches(2.75), source: 'Central Washington University, ch. 16' },
  { code: 'hip', garments: ['trousers'], leastMm: inches(2), mostMm: inches(4), source: 'New Mexico State University Extension, Guide C-209' },
  { code: 'abdomen', garments: [], leastMm: 0, mostMm: inches(2), source: 'New Mexico State University Extension, Guide C-209' },
  { code: 'thigh', garments: ['trousers'], leastMm: inches(1), mostMm: inches(2), source: 'New Mexico State University Extension, Guide C-209' },
  { code: 'knee', garments: ['trousers'], leastMm: inches(1), mostMm: inches(1), source: 'New Mexico State University Extension, Guide C-209' },
  { code: 'ankle', garments: ['trousers'], leastMm: inches(1), mostMm: inches(1), source: 'Government of India, CITS Dress Making, Trade Practical p. 180' },
  { code: 'upper-arm', garments: [], leastMm: inches(1.5), mostMm: inches(2), source: 'common practice, from memory' },
  { code: 'back-width', garments: [], leastMm: inches(0.5), mostMm: inches(1), source: 'from memory' },
  { code: 'back-waist-length', garments: [], leastMm: inches(0.25), mostMm: inches(0.5), source: 'from memory' },
  { code: 'crotch-length', garments: ['trousers'], leastMm: inches(1), mostMm: inches(2), source: 'from memory' },
  { code: 'elbow', garments: [], leastMm: inches(1), mostMm: inches(1.5), source: 'from memory' },
  { code: 'wrist', garments: [], leastMm: inches(0.5), mostMm: inches(1), source: 'from memory' },
  { code: 'neck', garments: [], leastMm: inches(0.25), mostMm: inches(0.5), source: 'from memory' },
]

/** One least ease a place for the journal to work with, mm: our own choice inside the published ranges above. */
const ours: Readonly<Record<string, number>> = { bust: 50, chest: 50, waist: 20, abdomen: 25, hip: 50, 'upper-arm': 50, thigh: 40, knee: 25, ankle: 25, 'back-width': 20, neck: 6, wrist: 13, elbow: 25 }
const oursWaistBelow = 13 // skirts and trousers are held by their waist: the lower end of the published 13–19 mm

/**
 * Least wearing ease in cloth that does not stretch, mm.
 * @param body - the hip decides how much the crotch depth needs
 * @returns null where nothing is known for this measurement
 */
export function minimumEaseMm(code: string, garment: GarmentKind, body: Readonly<Record<string, number>> = {}): number | null {
  if (code === 'waist' && (garment === 'skirt' || garment === 'trousers')) return oursWaistBelow
  if (code === 'crotch-depth') return crotchDepthEaseMm(body.hip ?? inches(37))
  return ours[code] ?? null
}

/**
 * Ease of the crotch depth by hip: 1/2 in under 36 in, 3/4 in from 36 to 38 in, 1 in above.
 * Source: New Mexico State University Extension, Guide C-209 (the copy read prints an unlikely 3/5 for the middle row)
 */
export function crotchDepthEaseMm(hipMm: number): number {
  if (hipMm < inches(36) - 1e-6) return inches(0.5)
  return hipMm <= inches(38) + 1e-6 ? inches(0.75) : inches(1)
}

export const easeBands = ['negative', 'below-fitted', 'close-fitting', 'fitted', 'semi-fitted', 'loose', 'very-loose'] as const
export type EaseBand = (typeof easeBands)[number]
export const easeBandWords: Readonly<Record<EaseBand, string>> = {
  negative: 'smaller than the body', 'below-fitted': 'closer than fitted', 'close-fitting': 'close-fitting', fitted: 'fitted', 'semi-fitted': 'semi-fitted', loose: 'loose', 'very-loose': 'very loose',
}

type BandTable = { code: 'bust' | 'hip'; garments: readonly GarmentKind[]; /** lower ends in inches; the next band starts there */ fromInches: Readonly<Partial<Record<EaseBand, number>>>; /** the last band starts beyond this */ looseToInches: number }
/**
 * Design ease, wearing ease included, as pattern houses chart it; inches, from memory. Not for cloth that stretches. Figures between two
 * bands count to the lower one (our rule).
 */
export const designEaseTable: readonly BandTable[] = [
  { code: 'bust', garments: ['bodice', 'dress', 'shirt'], fromInches: { 'close-fitting': 0, fitted: 3, 'semi-fitted': 4.125, loose: 5.125 }, looseToInches: 8 },
  { code: 'bust', garments: ['jacket'], fromInches: { 'below-fitted': 0, fitted: 3.75, 'semi-fitted': 4.375, loose: 5.875 }, looseToInches: 10 },
  { code: 'bust', garments: ['coat'], fromInches: { 'below-fitted': 0, fitted: 5.25, 'semi-fitted': 6.875, loose: 8.125 }, looseToInches: 12 },
  { code: 'hip', garments: ['skirt', 'trousers'], fromInches: { 'below-fitted': 0, fitted: 2, 'semi-fitted': 3.125, loose: 4.125 }, looseToInches: 6 },
]
const knitTopFromMm: Readonly<Partial<Record<EaseBand, number>>> = { 'close-fitting': -50, fitted: 0, 'semi-fitted': 50, loose: 100 }

/**
 * How an ease reads on this garment.
 * @returns null where no chart covers the place: the hip of a jacket, the waist of anything
 */
export function easeBand(code: string, garment: GarmentKind, easeMm: number, { knit = false } = {}): EaseBand | null {
  const at = code === 'chest' ? 'bust' : code
  if (knit) return at === 'bust' ? lastFrom(knitTopFromMm, easeMm) ?? 'negative' : null
  const table = designEaseTable.find((row) => row.code === at && row.garments.includes(garment))
  if (!table) return null
  if (easeMm > inches(table.looseToInches) + 1e-6) return 'very-loose'
  return lastFrom(table.fromInches, easeMm / mmPerInch) ?? 'negative'
}
function lastFrom(from: Readonly<Partial<Record<EaseBand, number>>>, value: number): EaseBand | null {
  return easeBands.findLast((band) => from[band] !== undefined && value >= from[band]! - 1e-6) ?? null
}
