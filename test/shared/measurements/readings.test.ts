import { checkEntries, movedMuch } from '#shared/measurements/checkEntry.ts'
import { combineReadings, readingToleranceMm, technicalError } from '#shared/measurements/combineReadings.ts'
import { daysBetween, isStale } from '#shared/measurements/isStale.ts'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

describe('readings of one measurement', () => {
  it('takes the mean of two that agree', () => expect(combineReadings([970, 976], 10)).toEqual({ valueMm: 973, from: 'mean of two', spreadMm: 6, askThird: false }))
  it('asks for a third when two differ by more than the tolerance, not at it', () => {
    expect(combineReadings([970, 980], 10)?.askThird).toBe(false)
    expect(combineReadings([970, 981], 10)?.askThird).toBe(true)
  })
  it('then takes the median, so one slip of the tape counts for nothing', () => expect(combineReadings([970, 1010, 974], 10)).toMatchObject({ valueMm: 974, from: 'median of three', askThird: false }))
  it('keeps a single reading, and has no value without one', () => {
    expect(combineReadings([970])).toMatchObject({ valueMm: 970, from: 'one reading' })
    expect(combineReadings([])).toBeNull()
  })
  it('is stricter with small girths', () => {
    expect(readingToleranceMm('hip')).toBe(10)
    expect(readingToleranceMm('wrist')).toBe(5)
    expect(readingToleranceMm('wrist-left')).toBe(5)
  })
  it('always lies between the readings', () => {
    fc.assert(fc.property(fc.array(fc.integer({ min: 50, max: 2000 }), { minLength: 1, maxLength: 3 }), (readings) => {
      const { valueMm } = combineReadings(readings)!
      expect(valueMm).toBeGreaterThanOrEqual(Math.min(...readings))
      expect(valueMm).toBeLessThanOrEqual(Math.max(...readings))
    }))
  })
  // Worked from Zakaria & Gupta eq. 2.2; Ulijaszek & Kerr 1999.
  it('works out the technical error of repeats', () => {
    const error = technicalError([[940, 944], [1001, 997], [880, 886], [955, 955]])!
    expect(error.temMm).toBeCloseTo(2.915, 3)
    expect(error.meanMm).toBe(944.75)
    expect(error.percent).toBeCloseTo(0.309, 3)
    expect(technicalError([])).toBeNull()
  })
})

// Common practice: measurements older than about a month are taken again.
describe('age of a set', () => {
  it.each([['2026-10-15', '2026-11-15', false], ['2026-10-15', '2026-11-16', true], ['2026-10-31', '2026-11-30', false], ['2026-10-31', '2026-12-01', true], ['2026-01-31', '2026-02-28', false], ['2026-01-31', '2026-03-01', true], ['2026-12-20', '2027-01-19', false], ['2026-12-20', '2027-01-21', true], ['2026-11-20', '2026-11-19', false]])('taken %s, looked at %s: stale %s', (taken, today, stale) => expect(isStale(taken, today)).toBe(stale))
  it('counts days over the end of the year', () => expect(daysBetween('2026-12-20', '2027-01-03')).toBe(14))
})

describe('what is asked back', () => {
  it('asks about a value that moved more than 30 mm, not at 30', () => {
    expect(movedMuch(970, 1000)).toBe(false)
    expect(movedMuch(970, 1001)).toBe(true)
    expect(checkEntries({ bust: 930 }, { bust: 970 })).toEqual([{ code: 'bust', kind: 'moved', text: 'This moved {+mm:-40} since the last set. Measured again, or typed by mistake?' }])
  })
  it('asks about a hip typed in inches into centimetres', () => expect(checkEntries({ hip: 380 })).toMatchObject([{ code: 'hip', kind: 'unusual' }]))
  it('says nothing about children by the ranges of adults', () => expect(checkEntries({ hip: 620 }, {}, { adult: false })).toEqual([]))
  it('asks when underbust and bust seem swapped', () => expect(checkEntries({ underbust: 960, bust: 880 })).toMatchObject([{ kind: 'order', code: 'underbust' }]))
  it('asks nothing about an ordinary set', () => expect(checkEntries({ bust: 970, 'high-bust': 920, waist: 795, hip: 1060, height: 1680 }, { bust: 965, hip: 1055 })).toEqual([]))
})
