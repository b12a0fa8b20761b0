import { describe, expect, it } from 'vitest'
import { type Change, type FittingObservation, type Reading } from '#shared/contracts/fitting.ts'
import { foretold, outcomeWords, spokenLabel, stateWords } from '../../../src/composables/fitting/observationWords.ts'

const cm = (mm: number) => `${(mm / 10).toFixed(1)} cm`
const by = { id: 'p', name: 'Ilse' }
const seen = (more: Partial<FittingObservation> = {}): FittingObservation => ({
  id: 'o3', number: 3, sampleNumber: 1, photographId: null, mark: null, sign: 'tight', zone: 'bust', view: 'front', side: 'centre', direction: null, towards: null, line: null, severity: 2,
  amount: { mm: 20, as: 'cloth' }, note: '', state: 'noted', letBeReason: '', readings: [], predicted: null, by, createdAt: '', version: 1, ...more,
})
const reading = (more: Partial<Reading>): Reading => ({ observationId: 'o3', sampleNumber: 2, gone: false, amount: null, reversed: false, note: '', outcome: null, at: '', by, ...more })

it('speaks an observation in one breath', () => expect(spokenLabel(seen(), [], cm)).toBe('Observation 3, tight across the bust, 2.0 cm, noted'))
it('says which sample a change went into', () => {
  expect(stateWords(seen({ state: 'carried' }), [{ observationIds: ['o3'], carriedTo: 2 } as Change])).toBe('Carried to sample 2')
})
describe('what was foretold', () => {
  it('is gone or an amount', () => {
    expect(foretold(seen({ predicted: { sampleNumber: 2, expectedMm: 0, changeMm: 20, text: '' } }), cm)).toBe('should be gone')
    expect(foretold(seen({ predicted: { sampleNumber: 2, expectedMm: 4, changeMm: 16, text: '' } }), cm)).toBe('0.4 cm left')
    expect(foretold(seen(), cm)).toBe('')
  })
})
describe('what became of it', () => {
  it('compares in the measure the observation was taken in', () => {
    const fold = seen({ sign: 'excess', zone: 'waist', amount: { mm: 8, as: 'fold-depth' } })
    expect(outcomeWords(fold, reading({ outcome: 'better', amount: { mm: 3, as: 'fold-depth' } }), cm)).toBe('Better by 0.5 cm')
  })
  it('says how far a change went past its place', () => expect(outcomeWords(seen(), reading({ outcome: 'overdone', reversed: true, amount: { mm: 4, as: 'fold-depth' } }), cm)).toBe('Went too far by 0.8 cm'))
  it('says gone when it is gone', () => expect(outcomeWords(seen(), reading({ gone: true, outcome: 'settled' }), cm)).toBe('Gone'))
})
