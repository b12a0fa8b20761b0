import { type Body } from '#shared/fit/types.ts'
import { type SizeRow } from '#shared/sizes/sizeChart.ts'
import { mmPerInch } from '#shared/units/unit.ts'

export const inches = (n: number) => Math.round(n * mmPerInch * 1e6) / 1e6
const rows = (labels: readonly string[], columns: Record<string, readonly number[]>, mmPer: number): SizeRow[] =>
  labels.map((label, i) => ({ label, body: Object.fromEntries(Object.entries(columns).map(([code, values]) => [code, Math.round(values[i]! * mmPer * 1e6) / 1e6])) }))

/** Home-pattern misses chart as a teaching blog reproduced it in 2011, inches. */
export const misses = rows(['6', '8', '10', '12', '14', '16', '18', '20'], {
  bust: [30.5, 31.5, 32.5, 34, 36, 38, 40, 42], waist: [23, 24, 25, 26.5, 28, 30, 32, 34], hip: [32.5, 33.5, 34.5, 36, 38, 40, 42, 44], 'back-waist-length': [15.5, 15.75, 16, 16.25, 16.5, 16.75, 17, 17.25],
}, mmPerInch)

/** EN 13402-3 women, bust 76 to 104 and on to 128; waist and hip from memory. */
export const en = rows(['76', '80', '84', '88', '92', '96', '100', '104', '110', '116', '122', '128'], {
  bust: [76, 80, 84, 88, 92, 96, 100, 104, 110, 116, 122, 128], waist: [60, 64, 68, 72, 76, 80, 84, 88, 94, 100, 106, 112], hip: [84, 88, 92, 96, 100, 104, 108, 112, 117, 122, 127, 132],
}, 10)

/** An invented chart with finished measurements, mm: each size has the same ease. */
export function withEase(ease: Body, base = en): SizeRow[] {
  return base.map((row) => ({ ...row, finished: Object.fromEntries(Object.entries(ease).map(([code, mm]) => [code, row.body[code]! + mm])) }))
}
/** The chart of an invented top, 10 to 20. */
export const top: SizeRow[] = ['10', '12', '14', '16', '18', '20'].map((label, i) => {
  const [bust, waist, hip] = [[880, 920, 960, 1000, 1050, 1100][i]!, [700, 740, 780, 820, 870, 920][i]!, [940, 980, 1020, 1060, 1110, 1160][i]!]
  return { label, body: { bust, waist, hip, 'back-waist-length': 404 + 4 * i }, finished: { bust: bust + 60, waist: waist + 80, hip: hip + 60 } }
})
