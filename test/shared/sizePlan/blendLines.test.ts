import { blendSteepness, levelDistance, perEdgeMove } from '#shared/fit/sizePlan/blendLines.ts'
import { runningLabel } from '#shared/fit/sizePlan/sizeLabel.ts'
import { sizePlan } from '#shared/fit/sizePlan.ts'
import { describe, expect, it } from 'vitest'
import { en, inches, misses } from './charts.ts'

// Steepness: no published figure was found, the limits are ours; angles are arithmetic.
describe('how steep a blend runs', () => {
  it('hip 36 to 40 in from a waist 8 in above: 1 in an edge, 1 in 8, 7.125°', () => {
    const move = perEdgeMove(inches(36), inches(40))
    expect(move).toBeCloseTo(inches(1), 6)
    const { slope, angleDeg, verdict } = blendSteepness(move, inches(8))
    expect(slope).toBeCloseTo(1 / 8, 9)
    expect(angleDeg).toBeCloseTo(7.125, 3)
    expect(verdict).toBe('ok')
  })
  it('one EN class over 20.6 cm: 1 cm an edge, 2.779°', () => {
    expect(perEdgeMove(1000, 1040)).toBe(10)
    expect(blendSteepness(10, 206).angleDeg).toBeCloseTo(2.779, 3)
  })
  it('2 cm an edge over 12 cm: 9.462°, check the curve', () => expect(blendSteepness(20, 120)).toMatchObject({ angleDeg: expect.closeTo(9.462, 3), verdict: 'check' }))
  it('1 in 5 is still checked, more is too steep', () => expect([blendSteepness(20, 100), blendSteepness(20.1, 100)].map(({ verdict }) => verdict)).toEqual(['check', 'steep']))
})

describe('the blends of a plan', () => {
  it('run from level to level where sizes differ: bust 92, waist 80, hip 108 over three sizes', () => {
    const plan = sizePlan({ bust: 920, waist: 800, hip: 1080, 'waist-to-hip': 206 }, en, { kind: 'dress' })
    expect(plan.blends.map(({ fromSize, toSize, perEdgeMm }) => [fromSize, toSize, perEdgeMm])).toEqual([['92', '96', 10], ['96', '100', 10]])
    expect(plan.blends[1]).toMatchObject({ distanceMm: 206, distanceAssumed: false, verdict: 'ok', angleDeg: expect.closeTo(2.779, 3) })
    expect(plan.label).toBe('92→96→100 from bust over waist to hip')
  })
  it('use the usual distance where the wearer’s is not known, and say so', () => expect(sizePlan({ waist: inches(26.5), hip: inches(40) }, misses, { kind: 'skirt' }).blends).toMatchObject([{ fromSize: '12', toSize: '16', distanceAssumed: true, sizesApart: 2, verdict: 'ok', text: expect.stringMatching(/Leave size 12 at the waist and meet size 16 at the hip/) }]))
  it('warn of more than two sizes between neighbours', () => expect(sizePlan({ waist: inches(25), hip: inches(42) }, misses, { kind: 'skirt' }).blends[0]!.text).toMatch(/4 apart: take one between/))
  it('leave the bust 5 cm below the armhole (common practice)', () => expect(levelDistance({ 'back-waist-length': 410, 'armscye-depth': 210 }, 'bust', 'waist')).toEqual({ mm: 150, assumed: false }))
})

describe('the size label of a piece', () => {
  const level = (code: string, index: number) => ({ code, index, size: String(10 + 2 * index) })
  it.each([
    [[level('bust', 2), level('waist', 2), level('hip', 2)], '14'],
    [[level('bust', 2), level('waist', 2), level('hip', 3)], '14→16 from waist to hip'],
    [[level('bust', 2), level('waist', 3), level('hip', 3)], '14→16 from bust to waist'],
    [[level('bust', 1), level('waist', 2), level('hip', 3)], '12→14→16 from bust over waist to hip'],
    [[level('bust', 2), level('waist', 1), level('hip', 2)], '14→12→14 from bust over waist to hip'],
  ])('of %j is %s', (levels, label) => expect(runningLabel(levels)).toBe(label))
  it('differs from piece to piece', () => {
    const labels = sizePlan({ bust: 920, waist: 800, hip: 1080 }, en, { kind: 'dress', features: ['waist-seam'], sleeves: 'set-in' }).pieceLabels
    expect(labels).toMatchObject({ 'bodice-front': '92→96 from bust to waist', 'skirt-back': '96→100 from waist to hip', sleeve: '92', 'neck-facing': '92', waistband: '96' })
  })
})
