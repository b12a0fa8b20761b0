import { describe, expect, it } from 'vitest'
import { type Change, type Sample } from '#shared/contracts/fitting.ts'
import { changesToCarry, nextStep } from '../../../src/composables/fitting/useSample.ts'

const step = (state: Sample['state'], counts: Partial<{ photographs: number; open: number; toCarry: number }> = {}, newest = true) => nextStep({ state, number: 1 }, { photographs: 0, open: 0, toCarry: 0, ...counts }, newest)

describe('the next step of a sample', () => {
  it('goes from sewing to photographs to the fitter to the next sample', () => {
    expect(step('to-sew').next).toBe('to-photograph')
    expect(step('to-photograph').next).toBeNull()
    expect(step('to-photograph', { photographs: 2 })).toMatchObject({ action: 'Ask the fitter', next: 'with-fitter' })
    expect(step('with-fitter').next).toBe('reviewed')
    expect(step('reviewed', { toCarry: 4 })).toMatchObject({ action: 'Carry 4 changes into sample 2', next: 'start-next' })
    expect(step('reviewed', { toCarry: 1 }).action).toBe('Carry 1 change into sample 2')
  })
  it('does not start a sample without a change, and says what is open', () => {
    expect(step('reviewed', { open: 2 })).toMatchObject({ next: null, words: 'Reviewed; 2 still open. Choose a change, or let it be.' })
    expect(step('reviewed').words).toContain('The final cut is open.')
  })
  it('leaves an older sample closed', () => expect(step('reviewed', { toCarry: 3 }, false).action).toBeNull())
})
it('carries what was decided and not carried yet, never what was declined', () => {
  const change = (decision: Change['decision'], carriedTo: number | null) => ({ decision, carriedTo }) as Change
  expect(changesToCarry([change('accepted', null), change('own', null), change('altered', 2), change('declined', null)])).toBe(2)
})
