import { tidyMm } from './unit.ts'

/**
 * Splits an amount over several paper edges so that the parts add up to the whole (largest remainder).
 * @param totalMm - whole amount, signed
 * @param parts - how many equal parts, or one weight ≥ 0 a part
 * @param stepMm - the division on the paper: 1 mm, or 25.4 / 16
 * @returns the parts, mm, each a whole number of steps and the larger ones first. Where the whole is no whole number of steps, the
 * bit below one step goes to the first part. Empty when there is no part; all zero when every weight is 0.
 */
export function splitAmount(totalMm: number, parts: number | readonly number[], stepMm: number = 1): number[] {
  const weights = typeof parts === 'number' ? Array<number>(parts).fill(1) : parts
  const weight = weights.reduce((sum, one) => sum + one, 0)
  if (!weights.length || weight <= 0) return weights.map(() => 0)
  const sign = totalMm < 0 ? -1 : 1
  const size = Math.abs(totalMm)
  // 25.4 / 1.5875 is 16 on paper and may be 15.999… here.
  const steps = Math.floor(size / stepMm + 1e-6)
  const exact = weights.map((one) => (steps * one) / weight)
  const whole = exact.map((value) => Math.floor(value + 1e-9))
  const left = steps - whole.reduce((sum, one) => sum + one, 0)
  const byRemainder = exact.map((value, i) => ({ i, rest: value - whole[i]! })).sort((a, b) => b.rest - a.rest || a.i - b.i)
  for (const { i } of byRemainder.slice(0, left)) whole[i]! += 1
  const below = size - steps * stepMm
  const first = weights.findIndex((one) => one > 0)
  return whole.map((count, i) => sign * tidyMm(count * stepMm + (i === first ? below : 0)) || 0)
}
