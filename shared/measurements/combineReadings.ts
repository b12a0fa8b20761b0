import { findMeasurement } from './findMeasurement.ts'

export type CombinedReadings = {
  valueMm: number
  from: 'one reading' | 'mean of two' | 'median of three'
  /** how far apart the readings are */
  spreadMm: number
  /** two readings further apart than the tolerance: measure a third time, the mean stands until then */
  askThird: boolean
}

const usualToleranceMm = 10

/** How far two readings of this measurement may differ; 10 mm for a code we do not know. */
export const readingToleranceMm = (code: string): number => findMeasurement(code)?.measurement.toleranceMm ?? usualToleranceMm

/**
 * One value from one to three readings: the mean of two that agree, the median of three.
 * @param readingsMm - 1 to 3 readings, in the order taken; more are not expected and the first three count
 * @returns null where there is no reading
 * Source: our own rule; repeated readings and a third when two disagree are usual in anthropometry
 */
export function combineReadings(readingsMm: readonly number[], toleranceMm: number = usualToleranceMm): CombinedReadings | null {
  const used = readingsMm.slice(0, 3)
  const [first, second] = used
  if (first === undefined) return null
  const sorted = used.toSorted((a, b) => a - b)
  const spreadMm = sorted.at(-1)! - sorted[0]!
  if (second === undefined) return { valueMm: first, from: 'one reading', spreadMm: 0, askThird: false }
  if (used.length === 3) return { valueMm: sorted[1]!, from: 'median of three', spreadMm, askThird: false }
  // A hair over, from inches that do not end in binary, is not a difference.
  return { valueMm: (first + second) / 2, from: 'mean of two', spreadMm, askThird: spreadMm > toleranceMm + 1e-6 }
}

/**
 * Technical error of measurement from two repeats on several people.
 * @returns TEM = √(Σd² / 2N) in mm, the mean of all readings, and TEM as a percentage of it; null without a pair
 * Source: Ulijaszek & Kerr 1999, Br. J. Nutr. 82:165–177; Zakaria & Gupta, Anthropometry, Apparel Sizing and Design, eq. 2.2
 */
export function technicalError(pairsMm: readonly (readonly [number, number])[]): { temMm: number; meanMm: number; percent: number } | null {
  if (!pairsMm.length) return null
  const squares = pairsMm.reduce((sum, [a, b]) => sum + (a - b) ** 2, 0)
  const temMm = Math.sqrt(squares / (2 * pairsMm.length))
  const meanMm = pairsMm.reduce((sum, [a, b]) => sum + a + b, 0) / (2 * pairsMm.length)
  return { temMm, meanMm, percent: (100 * temMm) / meanMm }
}
