import { describe, expect, it } from 'vitest'
import { askedBetween, marksOn, nextView, viewsOf } from '../../../src/composables/fitting/useCompared.ts'
import { type StorySample } from '../../../src/composables/project/useStory.ts'
import { photograph, shown } from './fittingFixtures.ts'

const story = (number: number, more: Partial<StorySample>): StorySample => ({ sample: { number } as StorySample['sample'], photographs: [], observations: [], changes: [], carriedIn: [], ...more })
const reading = { observationId: 'o1', sampleNumber: 2, gone: true, amount: null, reversed: false, note: '', outcome: 'settled' as const, at: '', by: { id: 'p', name: 'Ilse' } }

describe('two samples compared', () => {
  it('asks what the earlier one left, each once and newest, without what was let be', () => {
    const first = story(1, { observations: [shown({ id: 'o1', number: 1 }), shown({ id: 'o2', number: 2, state: 'let-be' })] })
    const second = story(2, { observations: [shown({ id: 'o1', number: 1, version: 3, readings: [reading] }), shown({ id: 'o9', number: 3, sampleNumber: 2 })] })
    const asked = askedBetween([first, second], 1, 2)
    expect(asked.map(({ id, version }) => [id, version])).toEqual([['o1', 3]])
  })
  it('offers the views either sample has, in their usual order', () => {
    expect(viewsOf(story(1, { photographs: [photograph({ view: 'left' }), photograph({ view: 'front' })] }), story(2, { photographs: [photograph({ view: 'back' })] }))).toEqual(['front', 'back', 'left'])
  })
  it('goes on to the next view with something not looked at', () => {
    const asked = [shown({ view: 'front', readings: [reading] }), shown({ id: 'o2', view: 'back', readings: [reading] }), shown({ id: 'o3', view: 'left' })]
    expect(nextView('front', ['front', 'back', 'left'], asked, 2)).toBe('left')
    expect(nextView('left', ['front', 'back', 'left'], asked, 2)).toBeNull()
  })
  it('draws marks on the photograph they were put on', () => {
    const one = story(1, { observations: [shown(), shown({ id: 'o2', photographId: 'other' }), shown({ id: 'o3', mark: null })] })
    expect(marksOn(one, 'ph', (mm) => `${mm}`).map(({ id }) => id)).toEqual(['o1'])
  })
})
