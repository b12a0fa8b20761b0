import { additionOf, bustAddition } from '#shared/sizes/bustDifference.ts'
import { circleSkirtRadius, elasticLength, elasticStretchNeeded, pullOn } from '#shared/sizes/elasticWaist.ts'
import { blockReductionPercent, knitClass, knitGirths, negativeEaseLimitPercent, stretchPercent, stretchToPass } from '#shared/sizes/knitStretch.ts'
import { clothNeeded, dimensionalChange } from '#shared/sizes/shrinkage.ts'
import { crotchDepthEaseMm, easeBand, minimumEaseMm, minimumEaseTable } from '#shared/sizes/wearingEase.ts'
import { mmPerInch } from '#shared/units/unit.ts'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

const inches = (n: number) => n * mmPerInch

// Bands as pattern houses chart them, from memory.
describe('how an ease reads', () => {
  it('calls 80 mm at the bust of a dress fitted', () => expect(easeBand('bust', 'dress', 1000 - 920)).toBe('fitted'))
  it('calls 30 mm at the hip of a skirt closer than fitted, and below the least to wear', () => {
    expect(easeBand('hip', 'skirt', 990 - 960)).toBe('below-fitted')
    expect(minimumEaseMm('hip', 'skirt')!).toBeGreaterThan(30)
  })
  it('calls 130 mm at the bust of a jacket semi-fitted', () => expect(easeBand('bust', 'jacket', 130)).toBe('semi-fitted'))
  it('calls 8 in on a coat semi-fitted and 8 1/8 loose', () => {
    expect(easeBand('bust', 'coat', inches(8))).toBe('semi-fitted')
    expect(easeBand('bust', 'coat', inches(8.125))).toBe('loose')
  })
  it('counts the gap between two bands to the lower one', () => expect(easeBand('bust', 'dress', inches(2.95))).toBe('close-fitting'))
  it('starts very loose beyond the last figure, not at it', () => {
    expect(easeBand('bust', 'dress', inches(8))).toBe('loose')
    expect(easeBand('bust', 'dress', inches(8) + 1)).toBe('very-loose')
  })
  it('reads knits by their own bands (common practice)', () => {
    expect(easeBand('bust', 'shirt', -30, { knit: true })).toBe('close-fitting')
    expect(easeBand('bust', 'shirt', -30)).toBe('negative')
  })
  it('has no word where no chart covers the place', () => expect(easeBand('hip', 'jacket', 60)).toBeNull())
})

describe('least ease to wear', () => {
  // New Mexico State University Extension, Guide C-209.
  it.each([[35, 0.5], [37, 0.75], [38, 0.75], [39, 1]])('gives the crotch depth of hip %d in %d in', (hip, ease) => expect(crotchDepthEaseMm(inches(hip))).toBeCloseTo(inches(ease), 9))
  it('stays inside what one of its published rows allows', () => {
    for (const [code, garment] of [['bust', 'dress'], ['waist', 'skirt'], ['waist', 'dress'], ['hip', 'skirt'], ['hip', 'trousers'], ['thigh', 'trousers'], ['knee', 'trousers'], ['upper-arm', 'shirt'], ['back-width', 'jacket']] as const) {
      const least = minimumEaseMm(code, garment)!
      const rows = minimumEaseTable.filter((row) => row.code === code && (!row.garments.length || row.garments.includes(garment)))
      expect(rows.some((row) => least >= row.leastMm - 1 && least <= row.mostMm + 1), `${code} ${garment}`).toBe(true)
    }
  })
})

describe('knits', () => {
  // Purdue Extension HE-452; derived from girth × stretch ratio.
  it.each([[100, 150, 50, 100 / 3], [100, 125, 25, 20], [4, 7, 75, 300 / 7]])('stretches %d to %d by %d %%, and can be at most %d %% smaller than the body', (rest, stretched, percent, limit) => {
    expect(stretchPercent(rest, stretched)).toBeCloseTo(percent, 9)
    expect(negativeEaseLimitPercent(percent)).toBeCloseTo(limit, 9)
  })
  it('spans a 36 in bust with 24.0 in at 50 %, at the very limit', () => expect(knitGirths(inches(36), 50).leastMm).toBeCloseTo(inches(24), 6))
  it('needs 42.9 % to pull a 700 mm waist over 1000', () => expect(stretchToPass(700, 1000)).toBeCloseTo(42.86, 2))
  it('needs none to pass a smaller girth', () => expect(stretchToPass(1000, 900)).toBe(0))
  // From memory: Armstrong ch. 27; Richardson.
  it('classes 18, 25, 50 and 100 %', () => expect([18, 25, 50, 100].map(knitClass)).toEqual(['stable', 'moderate', 'stretchy', 'super']))
  it('takes no girth out of a stable knit', () => expect(blockReductionPercent[knitClass(18)]).toBe(0))
  it('always reaches the body when stretched, and no more', () => {
    fc.assert(fc.property(fc.integer({ min: 500, max: 1500 }), fc.integer({ min: 0, max: 120 }), (body, stretch) => { expect(knitGirths(body, stretch).leastMm * (1 + stretch / 100)).toBeCloseTo(body, 6) }))
  })
})

// Common practice.
describe('elastic waists', () => {
  it('cuts 650 for a waist of 680, joins to 630, and needs 56.3 % to pass a hip of 960', () => {
    const elastic = elasticLength(680, 50, 20)
    expect(elastic).toEqual({ cutMm: 650, joinedMm: 630 })
    expect(elasticStretchNeeded(elastic.joinedMm, 960)).toBeCloseTo(56.35, 2)
  })
  it('does not pass a hip of 1000 with a woven waist edge of 980: 45 to 70 short', () => expect(pullOn(980, 1000)).toMatchObject({ passes: false, shortMm: 45, shortOfUsualMm: 70 }))
  it('passes at the least ease exactly', () => expect(pullOn(1025, 1000).passes).toBe(true))
  it('passes a hip of 1000 with a knit edge of 700 from 42.9 % on', () => {
    expect(pullOn(700, 1000, 42).passes).toBe(false)
    expect(pullOn(700, 1000, 43).passes).toBe(true)
  })
  it('draws a circle skirt for waist 720 and ease 20 with 117.8 mm', () => {
    expect(circleSkirtRadius(740)).toBeCloseTo(117.8, 1)
    expect(circleSkirtRadius(720)).toBeCloseTo(114.6, 1)
    expect(circleSkirtRadius(740, 0.5)).toBeCloseTo(2 * circleSkirtRadius(740), 9)
  })
})

// AATCC 135 form, from memory.
describe('shrinkage', () => {
  it('reads 500 that washed to 485 as −3.0 %, and asks 1030.9 for 1000', () => {
    expect(dimensionalChange(500, 485)).toBeCloseTo(-3, 9)
    expect(clothNeeded(1000, dimensionalChange(500, 485))).toBeCloseTo(1030.9, 1)
  })
  it('asks 2.632 m for 2.5 m at 5 %', () => expect(clothNeeded(2500, -5)).toBeCloseTo(2631.6, 1))
  it('leaves after the wash what was wanted', () => {
    fc.assert(fc.property(fc.double({ min: 100, max: 5000, noNaN: true }), fc.double({ min: -15, max: 5, noNaN: true }), (length, change) => { expect(clothNeeded(length, change) * (1 + change / 100)).toBeCloseTo(length, 6) }))
  })
})

describe('bust difference', () => {
  it('adds 2 in whole, 1 in on the half front, for high bust 34 and full bust 38 on a row of 34 and 36', () => expect(bustAddition(inches(38), inches(34), inches(2))).toMatchObject({ wholeMm: expect.closeTo(inches(2), 9), halfFrontMm: expect.closeTo(inches(1), 9), advice: 'add' }))
  it('adds 50 whole and 25 half for 1020 over 920, drafted for 50', () => expect(bustAddition(1020, 920, 50)).toEqual({ wholeMm: 50, halfFrontMm: 25, advice: 'add' }))
  it('leaves what is under half an inch, takes away for a smaller bust, splits a large one (common practice)', () => {
    expect([additionOf(10), additionOf(-10), additionOf(-30), additionOf(90)].map(({ advice }) => advice)).toEqual(['leave', 'leave', 'take-away', 'add-in-two'])
  })
})
