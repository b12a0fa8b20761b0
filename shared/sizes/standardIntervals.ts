/**
 * Size designation of clothes by body measurement, after EN 13402-3. Bust class limits as published; waist, hip and men's rows and
 * the letter codes from memory. Not a pattern's chart: a size is only a row of a stated chart.
 */
export type StandardRows = Readonly<Record<string, readonly number[]>>

/** Mid-values of the classes, mm. A column is one size: bust 920 goes with waist 760 and hip 1000. */
export const womenRows = {
  bust: [760, 800, 840, 880, 920, 960, 1000, 1040, 1100, 1160, 1220, 1280, 1340, 1400, 1460, 1520],
  waist: [600, 640, 680, 720, 760, 800, 840, 880, 940, 1000, 1060, 1120, 1180, 1240, 1300, 1360],
  hip: [840, 880, 920, 960, 1000, 1040, 1080, 1120, 1170, 1220, 1270, 1320, 1370, 1420, 1470, 1520],
} as const satisfies StandardRows
export const menRows = {
  chest: [840, 880, 920, 960, 1000, 1040, 1080, 1120, 1160, 1200, 1260, 1320, 1380, 1440],
  waist: [720, 760, 800, 840, 880, 920, 960, 1000, 1040, 1080, 1140, 1200, 1260, 1320],
} as const satisfies StandardRows

export type SizeClass = { /** place in the row */ index: number; midMm: number; fromMm: number; toMm: number }

/**
 * The class a girth falls in: limits lie half way between neighbours, the lower limit in, the upper out (our rule for the boundary).
 * @param midsMm - at least two mid-values, ascending
 * @returns null below the first class and from the upper limit of the last
 */
export function classOf(girthMm: number, midsMm: readonly number[]): SizeClass | null {
  const limits = classLimits(midsMm)
  const index = midsMm.findIndex((_, i) => girthMm >= limits[i]! && girthMm < limits[i + 1]!)
  return index < 0 ? null : { index, midMm: midsMm[index]!, fromMm: limits[index]!, toMm: limits[index + 1]! }
}

/** One limit more than there are classes; the outer ones stand half a step out. */
export function classLimits(midsMm: readonly number[]): number[] {
  const between = midsMm.slice(1).map((mid, i) => (mid + midsMm[i]!) / 2)
  const first = midsMm[0]! - (between[0]! - midsMm[0]!)
  const last = midsMm.at(-1)! + (midsMm.at(-1)! - between.at(-1)!)
  return [first, ...between, last]
}

export type SizeLetter = 'XXS' | 'XS' | 'S' | 'M' | 'L' | 'XL' | 'XXL' | '3XL'
const letters: Readonly<Record<'women' | 'men', readonly (readonly [SizeLetter, number, number])[]>> = {
  women: [['XXS', 660, 740], ['XS', 740, 820], ['S', 820, 900], ['M', 900, 980], ['L', 980, 1070], ['XL', 1070, 1190], ['XXL', 1190, 1310], ['3XL', 1310, 1430]],
  men: [['XXS', 700, 780], ['XS', 780, 860], ['S', 860, 940], ['M', 940, 1020], ['L', 1020, 1100], ['XL', 1100, 1180], ['XXL', 1180, 1290], ['3XL', 1290, 1410]],
}
/** Letter code by bust (women) or chest (men); null outside the table. From memory; limits agree with the bust classes. */
export const sizeLetter = (girthMm: number, cut: 'women' | 'men'): SizeLetter | null => letters[cut].find(([, from, to]) => girthMm >= from && girthMm < to)?.[0] ?? null

/**
 * Bra size of EN 13402: band is the underbust to the nearest 5 cm, cup the real difference in steps of 2 cm, upper limit included.
 * From memory. It is no pattern cup: that is full bust minus high bust.
 * @returns null outside AA to J
 */
export function braSize(underbustMm: number, bustMm: number): string | null {
  const cups = ['AA', 'A', 'B', 'C', 'D', 'E', 'F', 'G', 'H', 'J']
  const step = Math.ceil((bustMm - underbustMm - 100) / 20) - 1
  const cup = cups[step]
  return cup ? `${Math.round(underbustMm / 50) * 5}${cup}` : null
}
