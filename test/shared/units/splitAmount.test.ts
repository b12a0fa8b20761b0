import { splitAmount } from '#shared/units/splitAmount.ts'
import { mmPerInch } from '#shared/units/unit.ts'
import fc from 'fast-check'
import { expect, it } from 'vitest'

const sum = (parts: readonly number[]) => parts.reduce((total, one) => total + one, 0)
const sixteenth = mmPerInch / 16

it('splits 40 mm over four side-seam edges into 10 each', () => expect(splitAmount(40, 4)).toEqual([10, 10, 10, 10]))
it('gives the millimetres left over to the first edges', () => expect(splitAmount(10, 4)).toEqual([3, 3, 2, 2]))
it('splits a taking-in the same way', () => expect(splitAmount(-10, 4)).toEqual([-3, -3, -2, -2]))
it('splits an inch over three edges in sixteenths: 6, 5 and 5', () => expect(splitAmount(mmPerInch, 3, sixteenth).map((mm) => mm / sixteenth)).toEqual([6, 5, 5].map((n) => expect.closeTo(n, 9))))
it('splits by weight where back and front share unevenly', () => expect(splitAmount(10, [2, 1])).toEqual([7, 3]))
it('has nothing to give where there is no edge', () => {
  expect(splitAmount(10, 0)).toEqual([])
  expect(splitAmount(10, [0, 0])).toEqual([0, 0])
})
it('always adds up to the whole, in millimetres and in sixteenths, and no two equal parts differ by more than a division', () => {
  fc.assert(fc.property(fc.integer({ min: -4000, max: 4000 }), fc.integer({ min: 1, max: 12 }), fc.constantFrom(1, sixteenth), (steps, n, step) => {
    const parts = splitAmount(steps * step, n, step)
    expect(parts).toHaveLength(n)
    expect(sum(parts)).toBeCloseTo(steps * step, 6)
    expect(Math.max(...parts) - Math.min(...parts)).toBeLessThanOrEqual(step + 1e-6)
    for (const part of parts) expect(part / step).toBeCloseTo(Math.round(part / step), 5)
  }))
})
it('adds up for any weights and any amount', () => {
  fc.assert(fc.property(fc.double({ min: -500, max: 500, noNaN: true }), fc.array(fc.integer({ min: 0, max: 9 }), { minLength: 1, maxLength: 8 }), (total, weights) => {
    fc.pre(weights.some((one) => one > 0))
    expect(sum(splitAmount(total, weights))).toBeCloseTo(total, 5)
  }))
})
