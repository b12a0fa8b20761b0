import { describe, expect, it } from 'vitest'
import { type Mark, markKinds, observationInput } from '#shared/contracts/fitting.ts'
import { garmentKinds, views } from '#shared/fit/types.ts'
import { guessObservation } from '../../../src/composables/fitting/guessObservation.ts'

const photo = '0d2c0c52-6f5e-4f5f-9d0a-222222222222'
const stroke = (kind: Mark['kind'], ...points: Mark['points']): Mark => ({ kind, shape: 'stroke', points })
const bodice = (mark: Mark, view: (typeof views)[number] = 'front') => guessObservation(mark, view, 'bodice', photo, 0.75)

describe('the first reading of a mark', () => {
  it('is always one the server takes', () => {
    for (const kind of markKinds) for (const view of views) for (const garment of garmentKinds) for (const points of [[[0, 0]], [[0.1, 0.1], [0.9, 0.9]], [[1, 1], [0, 0]]] as Mark['points'][])
      expect(observationInput.safeParse(guessObservation(stroke(kind, ...points), view, garment, photo, 0.75)).success).toBe(true)
  })
  // Spots as on the drawn bodice: shoulder near 0.21, bust point near 0.39, hem near 0.64 of the picture's height.
  it('reads lines to the bust point', () => expect(bodice(stroke('drag-line', [0.29, 0.55], [0.4, 0.4]))).toMatchObject({ sign: 'drag-lines', zone: 'bust', towards: 'bust', direction: 'diagonal' }))
  it('reads an armhole that stands off', () => expect(bodice(stroke('gape', [0.31, 0.24], [0.32, 0.36]))).toMatchObject({ sign: 'gaping', zone: 'armhole', side: 'both' }))
  it('reads a hem to be let down in the middle as one that rises', () => expect(bodice(stroke('length', [0.5, 0.64], [0.5, 0.69]))).toMatchObject({ sign: 'rises', zone: 'hem', line: 'centre-front', side: 'centre' }))
  it('reads the same arrow upwards as a hem that drops', () => expect(bodice(stroke('length', [0.5, 0.64], [0.5, 0.6]))).toMatchObject({ sign: 'drops', zone: 'hem' }))
  it('reads folds across the back waist', () => expect(bodice(stroke('excess', [0.35, 0.48], [0.65, 0.48]), 'back')).toMatchObject({ sign: 'excess', zone: 'waist', direction: 'horizontal' }))
  it('reads which way a side seam swings on either side view', () => {
    const forward = (view: 'left' | 'right', to: number) => guessObservation(stroke('balance', [0.5, 0.4], [to, 0.8]), view, 'skirt', photo, 0.75)
    expect(forward('left', 0.44)).toMatchObject({ towards: 'front', line: 'side-seam' })
    expect(forward('right', 0.56)).toMatchObject({ towards: 'front' })
    expect(forward('right', 0.44)).toMatchObject({ towards: 'back' })
  })
})
