import { describe, expect, it } from 'vitest'
import { type SettledChange, usualChanges } from '#shared/fit/usualChanges.ts'

const settled = (over: Partial<SettledChange>): SettledChange => ({ projectId: 'a', kind: 'skirt', cause: 'hollow-back-skirt', side: 'both', amountMm: -16, ...over })

describe('a wearer’s usual changes', () => {
  it('are those that settled in two projects, with median and spread', () => {
    const history = [settled({}), settled({ projectId: 'b', amountMm: -12 }), settled({ projectId: 'c', amountMm: -20 }), settled({ projectId: 'd', cause: 'hip-tight', amountMm: 20 })]
    expect(usualChanges(history)).toEqual([{ cause: 'hollow-back-skirt', family: 'skirts', side: 'both', count: 3, medianMm: -16, spreadMm: 8, leastMm: -20, mostMm: -12 }])
  })
  it('are not those seen twice in one project: steps of one change add up', () => {
    expect(usualChanges([settled({}), settled({ amountMm: -4 })])).toEqual([])
    expect(usualChanges([settled({}), settled({ amountMm: -4 }), settled({ projectId: 'b' })])).toMatchObject([{ count: 2, medianMm: -18 }])
  })
  it('carry over between a shirt and a dress, not between a skirt and trousers', () => {
    expect(usualChanges([settled({ kind: 'shirt', cause: 'full-bust' }), settled({ kind: 'dress', cause: 'full-bust', projectId: 'b' })])).toMatchObject([{ family: 'tops' }])
    expect(usualChanges([settled({}), settled({ kind: 'trousers', projectId: 'b' })])).toEqual([])
  })
  it('keep left and right apart, and the centre with both', () => {
    expect(usualChanges([settled({ side: 'left' }), settled({ side: 'right', projectId: 'b' })])).toEqual([])
    expect(usualChanges([settled({ side: 'centre' }), settled({ side: 'both', projectId: 'b' })])).toHaveLength(1)
  })
  it('do not depend on the order of the history, and are none for a new wearer', () => {
    const history = [settled({}), settled({ projectId: 'b' }), settled({ cause: 'hip-tight', amountMm: 10 }), settled({ cause: 'hip-tight', projectId: 'b', amountMm: 14 })]
    expect(usualChanges(history.toReversed())).toEqual(usualChanges(history))
    expect(usualChanges([])).toEqual([])
  })
})
