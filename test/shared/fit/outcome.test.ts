import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { outcomeOf } from '#shared/fit/outcome.ts'
import { diagnose } from '#shared/fit/diagnose.ts'
import { type LedgerReading } from '#shared/fit/types.ts'
import { catalogueOf, fitting, rule, seen } from '../../support/fit.ts'

describe('what a change did', () => { // the module's worked behaviour
  it('20 short, 20 let out, still 6: better, response 0.7, 9 next', () => {
    expect(outcomeOf({ mm: 20, as: 'cloth' }, { mm: 6, as: 'cloth' }, 20)).toEqual({ outcome: 'better', response: 0.7, remainingMm: 6, nextMm: 9 })
  })
  it('20 short, 20 let out, now a fold of 4: overdone by 8', () => {
    expect(outcomeOf({ mm: 20, as: 'cloth' }, { mm: 4, as: 'fold-depth', reversed: true }, 20)).toMatchObject({ outcome: 'overdone', remainingMm: -8, nextMm: -8 })
  })
  it('gone: settled, whatever it was measured as', () => expect(outcomeOf({ mm: 8, as: 'fold-depth' }, 'gone', 16)).toEqual({ outcome: 'settled', response: 1, remainingMm: 0, nextMm: 0 }))
  it('compares a fold with cloth as cloth', () => expect(outcomeOf({ mm: 10, as: 'fold-depth' }, { mm: 10, as: 'cloth' }, 20).response).toBe(0.5))
  it('unchanged within 3: the same', () => expect(outcomeOf({ mm: 20, as: 'cloth' }, { mm: 18, as: 'cloth' }, 20)).toMatchObject({ outcome: 'same', response: 0.4 }))
  it('worse: what was put in comes out', () => expect(outcomeOf({ mm: 20, as: 'cloth' }, { mm: 26, as: 'cloth' }, 15)).toMatchObject({ outcome: 'worse', nextMm: -15 }))
  it('holds the response between 0.4 and 1.6 and never asks for more than the rest divided by it', () => fc.assert(fc.property(
    fc.integer({ min: 3, max: 150 }), fc.integer({ min: -150, max: 150 }), fc.integer({ min: 1, max: 150 }), (before, after, predicted) => {
      const { response, nextMm, outcome } = outcomeOf({ mm: before, as: 'cloth' }, { mm: Math.abs(after), as: 'cloth', reversed: after < 0 }, predicted)
      expect(response).toBeGreaterThanOrEqual(0.4)
      expect(response).toBeLessThanOrEqual(1.6)
      if (outcome === 'better' || outcome === 'same') expect(nextMm).toBe(Math.round(after / response))
    })))
})

describe('response over several samples', () => {
  const index = catalogueOf(rule('hip-tight', { opposite: 'hip-loose' }))
  const reading = (beforeMm: number, afterMm: number, predictedMm: number): LedgerReading => ({ observationId: 'hip', sign: 'tight', zone: 'hip', beforeMm, afterMm, predictedMm })
  const next = (amountMm: number, ...readings: LedgerReading[]) => diagnose(fitting({ ledger: [{ cause: 'hip-tight', amountMm, side: 'both', readings }] }), index).findings[0]
  it('is the cloth gone for the paper put in, over all of them', () => {
    // 20 put in took 14; 9 more, predicted to take the 6 left, took 4: 18 for 20 + 6 / 0.7 = 0.63
    expect(next(29, reading(20, 6, 20), reading(6, 2, 6))).toBeUndefined()
    expect(next(29, reading(30, 16, 20), reading(16, 12, 6))!.response!.value).toBe(0.63)
  })
  it('has no bound on the number of samples', () => {
    const many = Array.from({ length: 40 }, (_, i) => reading(100 - i * 2, 98 - i * 2, 4))
    expect(next(160, ...many)!.response!.value).toBeGreaterThanOrEqual(0.4)
  })
  it('is settled where the last reading is within 3', () => expect(next(20, reading(20, 2, 20))).toBeUndefined())
  it('takes back no more than was put in', () => expect(next(5, reading(5, -20, 5))!.change.amountMm).toBe(-5))
  it('adds up several entries for one cause', () => {
    const ledger = [{ cause: 'hip-tight', amountMm: 12, side: 'both' as const, readings: [] }, { cause: 'hip-tight', amountMm: 8, side: 'both' as const, readings: [reading(20, 6, 20)] }]
    expect(diagnose(fitting({ ledger }), index).findings[0]!.response!.soFarMm).toBe(20)
  })
  it('stays on its side', () => {
    const { findings } = diagnose(fitting({ ledger: [{ cause: 'hip-tight', amountMm: 10, side: 'left', readings: [reading(10, 4, 10)] }] }), index)
    expect(findings).toMatchObject([{ side: 'left', change: { unfold: true } }])
  })
  it('forgets a cause the catalogue no longer has', () => expect(diagnose(fitting({ ledger: [{ cause: 'no-such-cause', amountMm: 10, side: 'both', readings: [] }] }), index).findings).toEqual([]))
})

describe('worse after a change', () => {
  const sign = { sign: 'tight', zone: 'hip', weight: 'strong', because: 'it is strained', amounts: { cloth: 1 } } as const
  const check = { ask: 'Is the back tight too?', yes: 'It is the hip.', no: 'It is the seat alone.' }
  const index = catalogueOf(
    rule('hip-tight', { rivals: [{ cause: 'full-seat-skirt', check }], signs: [sign] }),
    rule('full-seat-skirt', { signs: [{ ...sign, weight: 'fair' }] }),
  )
  const tight = seen({ id: 'hip', sign: 'tight', zone: 'hip', amount: { mm: 30, as: 'cloth' } })
  it('brings the change back and raises its rivals', () => {
    expect(diagnose(fitting({ observations: [tight] }), index).findings.map(({ cause }) => cause)).toEqual(['hip-tight'])
    const { findings } = diagnose(fitting({
      observations: [tight], ledger: [{ cause: 'hip-tight', amountMm: 20, side: 'both', readings: [{ observationId: 'hip', sign: 'tight', zone: 'hip', beforeMm: 20, afterMm: 30, predictedMm: 20 }] }],
    }), index)
    expect(findings.map(({ cause, advice, change }) => [cause, advice, change.amountMm])).toEqual([['hip-tight', 'bring-back', -20], ['full-seat-skirt', 'change', 30]])
    expect(findings[1]!.because.some(({ from }) => 'ledger' in from)).toBe(true)
  })
})

describe('a change that was not looked at yet', () => {
  const index = catalogueOf(rule('hip-tight', { opposite: 'hip-loose' }))
  const first: LedgerReading = { observationId: 'hip', sign: 'tight', zone: 'hip', beforeMm: 20, afterMm: 6, predictedMm: 20 }
  it('is not asked for twice', () => {
    expect(diagnose(fitting({ ledger: [{ cause: 'hip-tight', amountMm: 29, unreadMm: 9, side: 'both', readings: [first] }] }), index).findings).toEqual([])
    expect(diagnose(fitting({ ledger: [{ cause: 'hip-tight', amountMm: 12, unreadMm: -8, side: 'both', readings: [{ ...first, afterMm: -8 }] }] }), index).findings).toEqual([])
  })
  it('is not brought back twice, and its cause stays refused', () => {
    const ledger = [{ cause: 'hip-tight', amountMm: 0, unreadMm: -20, side: 'both' as const, readings: [{ ...first, afterMm: 30 }] }]
    expect(diagnose(fitting({ observations: [seen({ sign: 'tight', zone: 'hip' })], ledger }), index).findings).toEqual([])
  })
  it('foretells what goes back, for the sign first seen, so that it is looked at again', () => {
    const { findings } = diagnose(fitting({ ledger: [{ cause: 'hip-tight', amountMm: 20, side: 'both', readings: [{ ...first, afterMm: -8 }] }] }), index)
    expect(findings[0]!.predicts).toMatchObject([{ observationId: 'hip', expectedMm: 0, changeMm: 8 }])
  })
})
