import { describe, expect, it } from 'vitest'
import { fittingTime } from '../../../src/components/rail/fittingTime.ts'

const now = new Date(2026, 9, 22, 9, 30) // a Thursday, three days before the clocks change in Europe
const at = (day: number, hour = 16) => fittingTime(new Date(2026, 9, day, hour), now)

describe('when a fitting is', () => {
  it('is said by its day within a week', () => {
    expect([at(22), at(23), at(24), at(28)]).toEqual(['Today, 16:00', 'Tomorrow, 16:00', 'Saturday, 16:00', 'Wednesday, 16:00'])
  })
  it('is said by its date from the same day next week on, and when it has passed', () => {
    expect(at(29)).toBe('Thursday 29 October, 16:00')
    expect(at(21)).toBe('Wednesday 21 October, 16:00')
  })
  it('goes by the calendar, not by 24 hours', () => expect(at(23, 0)).toBe('Tomorrow, 00:00'))
})
