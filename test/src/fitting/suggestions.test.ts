import { describe, expect, it } from 'vitest'
import { type Change } from '#shared/contracts/fitting.ts'
import { type Diagnosis, type Finding } from '#shared/fit/types.ts'
import { changeCards, findCard, limitWarning, notchesOf, suggestionId } from '../../../src/composables/fitting/suggestions.ts'

const finding = (cause: string, explains: string[], more: Partial<Finding> = {}): Finding => ({
  cause, sentence: '', side: 'both', confidence: 0.8, explains, because: [], rivals: [], predicts: [], advice: 'change',
  change: { title: cause, operation: 'seam-shift', amountMm: 20, amountFrom: 'measured on sample', steps: [], companions: [], limits: { leastMm: 3, mostMm: 40, beyond: 'Go up a size.', text: '' }, recheck: [], unfold: false, notes: [], source: 'common practice' },
  ...more,
})
const change = (id: string, cause: string | null, decision: Change['decision'], observationIds: string[]): Change =>
  ({ id, cause, decision, observationIds, title: id, sampleNumber: 1, suggestedMm: 20, amountMm: 20, paper: finding('x', []).change, reason: null, note: '', carriedTo: null, by: { id: 'p', name: 'Ilse' }, at: '', version: 1, transfers: [] })
const diagnosis = (...findings: Finding[]): Diagnosis => ({ findings, unexplained: [], conflicts: [], missing: [] })

describe('suggestions and what was decided about them', () => {
  it('stand in working order with their decision, own changes after, refused ones apart', () => {
    const { open, declined } = changeCards({
      diagnosis: diagnosis(finding('bust', ['a', 'b']), finding('waist', ['c']), finding('hem', ['d'])),
      changes: [change('c1', 'waist', 'accepted', ['c']), change('c2', null, 'own', ['e']), change('c3', 'hem', 'declined', ['d'])],
    })
    expect(open.map(({ id, change: c, notches }) => [id, c?.id ?? null, notches])).toEqual([['bust~both', null, 1], ['waist~both', 'c1', 2], ['c2', 'c2', 3]])
    expect(declined.map(({ change: c }) => c?.id)).toEqual(['c3'])
  })
  it('keep left and right apart by the observations they share', () => {
    const { open } = changeCards({
      diagnosis: diagnosis(finding('slope', ['l'], { side: 'left' }), finding('slope', ['r'], { side: 'right' })),
      changes: [change('c1', 'slope', 'accepted', ['r'])],
    })
    expect(open.map(({ id, change: c }) => [id, c?.id ?? null])).toEqual([['slope~left', null], ['slope~right', 'c1']])
  })
  it('keep a decision whose suggestion is made no more', () => {
    expect(changeCards({ diagnosis: diagnosis(), changes: [change('c1', 'bust', 'altered', ['a'])] }).open.map(({ change: c }) => c?.id)).toEqual(['c1'])
  })
  it('are found by their own address and by the id of the decision', () => {
    const { open } = changeCards({ diagnosis: diagnosis(finding('waist', ['c'])), changes: [change('c1', 'waist', 'accepted', ['c'])] })
    expect(findCard(open, suggestionId({ cause: 'waist', side: 'both' }))).toBe(open[0])
    expect(findCard(open, 'c1')).toBe(open[0])
    expect(findCard(open, 'nothing')).toBeNull()
  })
  it('give an observation the notches of the first suggestion that answers it', () => {
    const { open } = changeCards({ diagnosis: diagnosis(finding('bust', ['a', 'b']), finding('waist', ['b', 'c'])), changes: [] })
    expect([...notchesOf(open)]).toEqual([['a', 1], ['b', 1], ['c', 2]])
  })
})

describe('amounts out of range', () => {
  const cm = (mm: number) => `${mm / 10} cm`
  it('say what is too much and what to do instead', () => expect(limitWarning(finding('x', []), 41, cm)).toBe('4.1 cm is more than this change should take (at most 4 cm). Go up a size.'))
  it('stay quiet at the limit', () => { expect(limitWarning(finding('x', []), 40, cm)).toBe(''); expect(limitWarning(finding('x', []), 3, cm)).toBe('') })
  it('say when it is too little, and when it goes the other way', () => {
    expect(limitWarning(finding('x', []), 2, cm)).toContain('less than is worth doing')
    expect(limitWarning(finding('x', []), -10, cm)).toContain('other way')
  })
})
