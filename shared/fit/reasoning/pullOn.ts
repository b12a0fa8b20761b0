import { bodyValue } from '../../measurements/findMeasurement.ts'
import { type FitInput } from '../types.ts'

/**
 * What the top edge of a garment with an elastic waist lacks to pass over the hip, mm.
 * @returns 0 where it passes, null where the edge or the hip is not known, or the garment has an opening
 * Source: the casing piece must pass over the hips, common practice; a woven edge does not stretch.
 */
export function pullOnLackMm({ garment, body, pattern, cloth }: FitInput): number | null {
  if (garment.waist !== 'elastic') return null
  const hip = bodyValue(body, 'hip')
  const edge = pattern.finished && bodyValue(pattern.finished, 'waist')
  if (!hip || !edge) return null
  const stretched = edge * (1 + (cloth?.finalStretchPercent ?? 0) / 100)
  return Math.max(0, Math.ceil(hip - stretched))
}
