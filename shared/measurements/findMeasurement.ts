import { type Body } from '../fit/types.ts'
import { type Measurement } from './measurement.ts'
import { measurementTable } from './measurementTable.ts'

const byCode: ReadonlyMap<string, Measurement> = new Map(measurementTable.map((row) => [row.code, row]))
const oneSide = /^(.+)-(left|right)$/

/** The definition behind a code; `thigh-left` finds the thigh. Null where the code is unknown, or the measurement has no sides. */
export function findMeasurement(code: string): { measurement: Measurement; side: 'left' | 'right' | null } | null {
  const whole = byCode.get(code)
  if (whole) return { measurement: whole, side: null }
  const [, base, side] = oneSide.exec(code) ?? []
  const half = base ? byCode.get(base) : undefined
  return half?.paired ? { measurement: half, side: side as 'left' | 'right' } : null
}

/** What a code is called on screen: "Full bust", "Thigh, left". An unknown code is shown as it is. */
export function measurementName(code: string): string {
  const found = findMeasurement(code)
  if (!found) return code
  return found.side ? `${found.measurement.name}, ${found.side}` : found.measurement.name
}

/** The codes of the two sides; null for a measurement that has none. */
export function sideCodes(code: string): { left: string; right: string } | null {
  return byCode.get(code)?.paired ? { left: `${code}-left`, right: `${code}-right` } : null
}

/**
 * The value a size is chosen by: the measurement itself, or the larger of its sides. A garment cut alike on both sides must pass the
 * larger one. Null where none was taken.
 */
export function bodyValue(body: Body, code: string): number | null {
  const values = [body[code], body[`${code}-left`], body[`${code}-right`]].filter((value) => value !== undefined && value > 0) as number[]
  if (body[code]) return body[code]
  return values.length ? Math.max(...values) : null
}
