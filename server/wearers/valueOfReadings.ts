/**
 * The value a measurement is used with: the reading, the mean of two, the median of three.
 * A third reading is taken when two differ by more than the tolerance, so the median then leaves out the odd one.
 * @param readingsMm - one to three readings in mm, as taken
 */
export function valueOfReadings(readingsMm: readonly number[]): number {
  const sorted = [...readingsMm].sort((a, b) => a - b)
  const middle = (sorted.length - 1) / 2
  return (sorted[Math.floor(middle)]! + sorted[Math.ceil(middle)]!) / 2
}
