import { sizePlan } from '#shared/fit/sizePlan.ts'
import { expect, it } from 'vitest'
import { en } from './charts.ts'

/** Middles of n equal shares of a standard normal distribution, by bisection on the error function. */
function quantiles(n: number): number[] {
  const below = (z: number) => { // Abramowitz & Stegun 7.1.26, good to 1.5e-7
    const t = 1 / (1 + 0.3275911 * Math.abs(z) / Math.SQRT2)
    const erf = 1 - t * (0.254829592 + t * (-0.284496736 + t * (1.421413741 + t * (-1.453152027 + t * 1.061405429)))) * Math.exp(-(z * z) / 2)
    return z < 0 ? (1 - erf) / 2 : (1 + erf) / 2
  }
  return Array.from({ length: n }, (_, i) => {
    let [low, high] = [-5, 5]
    while (high - low > 1e-6) { const mid = (low + high) / 2; if (below(mid) < (i + 0.5) / n) low = mid; else high = mid }
    return low
  })
}
/** Bodies spread as the women of the ANSUR II public data: means, standard deviations and correlation derived from it, mm. */
function bodies(a: { code: string; mean: number; sd: number }, b: typeof a, correlation: number) {
  const zs = quantiles(40)
  return zs.flatMap((z1) => zs.map((z2) => ({ [a.code]: a.mean + a.sd * z1, [b.code]: b.mean + b.sd * (correlation * z1 + Math.sqrt(1 - correlation ** 2) * z2) })))
}
const apart = (list: readonly Record<string, number>[], kind: 'dress' | 'skirt', upper: string) => list.flatMap((body) => {
  const plan = sizePlan(body, en, { kind })
  const [a, b] = [upper, 'hip'].map((code) => plan.zones.find((zone) => zone.code === code)!)
  return a!.offChart || b!.offChart ? [] : [b!.index - a!.index]
})
const share = (steps: readonly number[], test: (step: number) => boolean) => steps.filter(test).length / steps.length

const bust = { code: 'bust', mean: 946.9, sd: 82.7 }
const hip = { code: 'hip', mean: 1021.2, sd: 75.9 }

it('finds bust and hip on one size for about three in ten, within one size for about seven, as counted on 1,981 women', () => {
  const steps = apart(bodies(bust, hip, 0.743), 'dress', 'bust')
  // Counted in the survey: 591 of 1,981 alike, 1,445 within one class.
  expect(Math.abs(share(steps, (n) => n === 0) - 591 / 1981)).toBeLessThan(0.03)
  expect(Math.abs(share(steps, (n) => Math.abs(n) <= 1) - 1445 / 1981)).toBeLessThan(0.04)
})
it('finds most bodies on different sizes at waist and hip', () => {
  // The survey's waist is the navel's. Even moved so that the average body lies on one size, most bodies do not.
  for (const mean of [860.9, 1021.2 - 240]) expect(share(apart(bodies({ code: 'waist', mean, sd: 99.9 }, hip, 0.803), 'skirt', 'waist'), (n) => n !== 0)).toBeGreaterThan(0.5)
})
