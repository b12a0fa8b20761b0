/** Parts and wholes. The figures are consistency values in millimetres; the rules behind them are named beside each. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { clothOf, doublingText, roundToStep, splitMillimetres, splitOverPairs, splitSixteenths } from '#shared/fit/amount.ts'
import { fillAmounts, mmToken, signedToken } from '#shared/fit/amountText.ts'
import { diagnose } from '#shared/fit/diagnose.ts'
import { paperSteps } from '#shared/fit/reasoning/paperSteps.ts'
import { type Rule, type StepRule } from '#shared/fit/rule.ts'
import { formatLength } from '#shared/units/formatLength.ts'
import { catalogueOf, edgeAmounts, fitting, rule, seen, sum } from '../../support/fit.ts'

const sixteenth = 25.4 / 16
const step = (over: Partial<StepRule>): StepRule => ({ piece: 'skirt-front', edge: 'side seam', edges: 2, share: 'width', text: 'Move {amount}.', ...over })
const changeOf = (steps: readonly StepRule[], over: Partial<Rule['change']> = {}): Rule => rule('hip-tight', { change: { operation: 'seam-shift', steps, companions: [], noCompanions: 'a made-up rule', ...over } })
const edgesFor = (made: Rule, wholeMm: number, side: 'both' | 'left' | 'right' = 'both', stepMm = 1) => {
  const steps = paperSteps(made, { garment: { kind: 'skirt' }, side, wholeMm, stepMm, takesBack: false })
  return { steps, amounts: steps.flatMap(({ edges, amountMm }) => Array<number>(edges).fill(amountMm)) }
}
const sideSeams = changeOf([step({}), step({ piece: 'skirt-back' })])

describe('width over the edges there are (total divided by the seams, CWU ch. 17)', () => {
  it('40 over four side-seam edges: 10 each', () => expect(edgesFor(sideSeams, 40).amounts).toEqual([10, 10, 10, 10]))
  it('41 over four: 11, 10, 10, 10, the odd one named apart', () => {
    const { steps, amounts } = edgesFor(sideSeams, 41)
    expect(amounts).toEqual([11, 10, 10, 10])
    expect(steps.map(({ side }) => side)).toEqual(['right', 'left', 'both'])
  })
  it('36 at the waist, half from the darts: edges 5, 5, 4, 4, darts 5, 5, 4, 4', () => {
    const made = changeOf([
      step({ group: 'seams' }), step({ piece: 'skirt-back', group: 'seams' }), step({ edge: 'dart', group: 'darts' }), step({ piece: 'skirt-back', edge: 'dart', group: 'darts' }),
    ], { parts: { seams: 0.5, darts: 0.5 } })
    expect(edgesFor(made, 36).amounts).toEqual([5, 5, 4, 4, 5, 5, 4, 4])
  })
  it('50 over the bust of two half-fronts: 25 each', () => expect(edgesFor(changeOf([step({ piece: 'bodice-front', edge: 'bust line' })]), 50).amounts).toEqual([25, 25]))
  it('30 short across the back: 15 on each half-back', () => expect(edgesFor(changeOf([step({ piece: 'bodice-back', edge: 'mid-shoulder to hem' })]), 30).amounts).toEqual([15, 15]))
  it('gives the part of darts a skirt does not have to the seams', () => {
    const made = changeOf([step({ group: 'seams' }), step({ edge: 'dart', group: 'darts', when: { needs: ['darts'] } })], { parts: { seams: 0.5, darts: 0.5 } })
    expect(edgesFor(made, 20).amounts).toEqual([10, 10])
  })
  it('stays on one side where the fault is on one side: two edges, not four', () => {
    const { steps, amounts } = edgesFor(sideSeams, 20, 'left')
    expect(amounts).toEqual([10, 10])
    expect(steps.every(({ side }) => side === 'left')).toBe(true)
  })
})

describe('length, never divided (common practice)', () => {
  it('20 of rise: 20 on the front, 20 on the back', () => {
    expect(edgesFor(changeOf([step({ piece: 'trouser-front', share: 'length' }), step({ piece: 'trouser-back', share: 'length' })]), 20).amounts).toEqual([20, 20, 20, 20])
  })
  it('a sleeve 40 short of arm and ease takes all 40: 330 + 50 − 340', () => expect(edgesFor(changeOf([step({ piece: 'sleeve', edges: 1, share: 'length' })]), 330 + 50 - 340).amounts).toEqual([40]))
  it('a shoulder 9 too far back: front tip down 9, back tip up 9, cap notch 9 forward', () => {
    const made = changeOf([step({ piece: 'bodice-front', edge: 'shoulder tip', share: 'length', times: -1 }), step({ piece: 'bodice-back', edge: 'shoulder tip', share: 'length' }), step({ piece: 'sleeve', edge: 'cap notch', share: 'length' })])
    expect(edgesFor(made, 9).amounts).toEqual([-9, -9, 9, 9, 9, 9])
  })
})

describe('an amount that stands for each side', () => {
  const shoulder = changeOf([step({ piece: 'bodice-front', edge: 'shoulder tip', share: 'side' }), step({ piece: 'bodice-back', edge: 'shoulder tip', share: 'side' })])
  it('a shoulder that opens 14 at the tip: 7 on the front, 7 on the back, on both sides alike', () => expect(edgesFor(shoulder, 14).amounts).toEqual([7, 7, 7, 7]))
  it('15: 8 on the front, 7 on the back', () => expect(edgesFor(shoulder, 15, 'right').amounts).toEqual([8, 7]))
  it('a back crotch 24 short, shared with the point: 12 at the centre back, 12 at the inseam point', () => {
    const made = changeOf([step({ piece: 'trouser-back', edge: 'centre back', share: 'side', group: 'wedge' }), step({ piece: 'trouser-back', edge: 'inseam point', share: 'side', group: 'point' })], { parts: { wedge: 0.5, point: 0.5 } })
    expect(edgesFor(made, 24, 'left').amounts).toEqual([12, 12])
    expect(edgesFor(made, 24).amounts).toEqual([12, 12, 12, 12])
  })
})

describe('amounts from the sample', () => {
  const index = catalogueOf(rule('neck-front-loose', {
    signs: [{ sign: 'gaping', zone: 'neck', weight: 'strong', because: 'the edge is longer than the body under it', amounts: { 'fold-depth': 1 }, perSide: ['fold-depth'] }],
    amounts: { direction: -1, usualMm: [10, 20, 30] }, change: { operation: 'slash-hinge', steps: [step({ piece: 'bodice-front', edge: 'neckline' })], companions: [], noCompanions: 'a made-up rule' },
  }))
  const gape = (over = {}) => diagnose(fitting({ garment: { kind: 'bodice' }, observations: [seen({ sign: 'gaping', zone: 'neck', amount: { mm: 6, as: 'fold-depth' }, ...over })] }), index).findings[0]!
  it('a fold 6 deep on each side of the centre front: 24 of cloth, 12 on the half-front', () => {
    expect(gape().change.amountMm).toBe(-24)
    expect(edgeAmounts(gape())).toEqual([-12, -12])
    expect(gape().because[0]!.text).toMatch(/A fold \{mm:6\} deep holds \{mm:12\} of cloth; on both sides together that is \{mm:24\}/)
  })
  it('the same fold on the left only: 12, on the left', () => {
    expect(gape({ side: 'left' }).change.amountMm).toBe(-12)
    expect(gape({ side: 'left' }).side).toBe('left')
  })
  it('the same on left and right, noted apart, is the same fault on both', () => {
    const [left, right] = (['left', 'right'] as const).map((side) => seen({ sign: 'gaping', zone: 'neck', side, amount: { mm: 6, as: 'fold-depth' } }))
    const { findings } = diagnose(fitting({ garment: { kind: 'bodice' }, observations: [left!, right!] }), index)
    expect(findings).toMatchObject([{ side: 'both', change: { amountMm: -24 } }])
  })
  it('6 on the left and 18 on the right are two changes', () => {
    const observations = [seen({ sign: 'gaping', zone: 'neck', side: 'left', amount: { mm: 6, as: 'fold-depth' } }), seen({ sign: 'gaping', zone: 'neck', side: 'right', amount: { mm: 18, as: 'fold-depth' } })]
    expect(diagnose(fitting({ garment: { kind: 'bodice' }, observations }), index).findings.map(({ side, change }) => [side, change.amountMm])).toEqual([['left', -12], ['right', -36]])
  })
  it('a distance off its place is not taken for cloth', () => expect(gape({ amount: { mm: 6, as: 'shift' } }).change.amountFrom).toBe('usual for this sign'))
  it('is usual for the sign where nothing was measured, more for a strong one', () => {
    expect(gape({ amount: undefined, severity: 1 }).change).toMatchObject({ amountMm: -10, amountFrom: 'usual for this sign' })
    expect(gape({ amount: undefined, severity: 3 }).change.amountMm).toBe(-30)
  })
})

describe('amounts from measurements', () => {
  const index = catalogueOf(rule('hip-tight', {
    signs: [{ sign: 'tight', zone: 'hip', weight: 'strong', because: 'it is strained', amounts: { cloth: 1 } }],
    measures: [{ plus: ['body:hip'], minus: ['pattern:hip'], grades: [{ from: 30, weight: 'strong' }, { from: 10, weight: 'fair' }, { below: -20, weight: 'fair', against: true }], amount: 1, alone: true, because: 'the hip is {value} more than the pattern is drafted for' }],
  }))
  const hip = (mm: number | null, measured: number | null) => diagnose(fitting({
    body: mm === null ? {} : { hip: mm }, pattern: { body: { hip: 1000 } }, observations: measured === null ? [] : [seen({ sign: 'tight', zone: 'hip', ...(measured > 0 && { amount: { mm: measured, as: 'cloth' } }) })],
  }), index)
  it('measured on the sample beats measurements, and both are shown when they disagree by more than 10', () => {
    expect(hip(1050, 39).findings[0]!.change).toMatchObject({ amountMm: 39, amountFrom: 'measured on sample', otherAmount: { amountMm: 50, amountFrom: 'measurements' } })
    expect(hip(1050, 40).findings[0]!.change.otherAmount).toBeUndefined()
  })
  it('measurements beat the usual amount', () => expect(hip(1050, 0).findings[0]!.change).toMatchObject({ amountMm: 50, amountFrom: 'measurements' }))
  it('works from measurements alone, says so and is not too sure', () => {
    const { findings, missing } = hip(1050, null)
    expect(findings).toMatchObject([{ cause: 'hip-tight', explains: [], change: { amountMm: 50 } }])
    expect(findings[0]!.confidence).toBeLessThanOrEqual(0.5)
    expect(missing.join(' ')).toMatch(/only measured/)
  })
  it('works without any, and says which would help', () => expect(hip(null, 20).missing.join(' ')).toMatch(/Measure: Full hip/))
  it('speaks against the cause where the body is smaller than the pattern', () => {
    const sure = (mm: number) => hip(mm, 20).findings[0]?.confidence ?? 0
    expect(sure(960)).toBeLessThan(sure(1005))
    expect(sure(1005)).toBeLessThan(sure(1050))
  })
  it('does not ask again for what is in the sample already', () => {
    const { findings } = diagnose(fitting({ body: { hip: 1050 }, pattern: { body: { hip: 1000 } }, ledger: [{ cause: 'hip-tight', amountMm: 50, side: 'both', readings: [] }] }), index)
    expect(findings).toEqual([])
  })
})

describe('cloth in an amount', () => {
  it('is twice the depth of a fold, and the amount itself otherwise', () => {
    expect((['fold-depth', 'cloth', 'gap', 'shift'] as const).map((as) => clothOf({ mm: 8, as }))).toEqual([16, 8, 8, 8])
    expect(doublingText({ mm: 8, as: 'fold-depth' })).toBe('A fold {mm:8} deep holds {mm:16} of cloth')
    expect(doublingText({ mm: 8, as: 'cloth' })).toBeNull()
  })
})

describe('parts add up to the whole', () => {
  it('in millimetres, signed, for any number of parts', () => fc.assert(fc.property(fc.integer({ min: -400, max: 400 }), fc.integer({ min: 1, max: 12 }), (whole, parts) => {
    const split = splitMillimetres(whole, parts)
    expect(sum(split)).toBe(whole)
    expect(Math.max(...split) - Math.min(...split)).toBeLessThanOrEqual(1)
  })))
  it('in sixteenths of an inch', () => fc.assert(fc.property(fc.integer({ min: 1, max: 160 }), fc.integer({ min: 1, max: 12 }), (sixteenths, parts) => {
    const split = splitSixteenths(sixteenths * sixteenth, parts)
    expect(sum(split.map((mm) => Math.round(mm / sixteenth)))).toBe(sixteenths)
    for (const mm of split) expect(mm / sixteenth).toBeCloseTo(Math.round(mm / sixteenth), 4)
  })))
  it('over pairs of edges, so that only one pair is uneven', () => fc.assert(fc.property(fc.integer({ min: 0, max: 300 }), fc.integer({ min: 1, max: 5 }), (whole, pairs) => {
    const split = splitOverPairs(whole, Array<number>(pairs).fill(2), 1)
    expect(sum(split.flat())).toBe(whole)
    expect(split.filter(([a, b]) => a !== b).length).toBeLessThanOrEqual(1)
  })))
  it('over every width step of every change, both units and one or both sides', () => fc.assert(fc.property(
    fc.integer({ min: 3, max: 200 }), fc.constantFrom('both' as const, 'left' as const, 'right' as const), fc.constantFrom(1, sixteenth), fc.constantFrom(1, -1),
    (mm, side, stepMm, sign) => {
      const whole = roundToStep(sign * mm, stepMm)
      expect(sum(edgesFor(sideSeams, whole, side, stepMm).amounts)).toBeCloseTo(whole, 3)
    })))
  it('rounds to what can be drawn', () => {
    expect(roundToStep(12.5, 1)).toBe(13)
    expect(roundToStep(-12.4, 1)).toBe(-12)
    expect(roundToStep(25, sixteenth)).toBeCloseTo(25.4, 6)
  })
})

describe('amounts in texts', () => {
  it('are put into words by the reader', () => {
    expect(fillAmounts('A fold {mm:8} deep holds {mm:16}; {+mm:-16} at the centre back.', (mm, signed) => formatLength(mm, 'cm', { signed })).replaceAll('\u00A0', ' ')).toBe('A fold 0.8 cm deep holds 1.6 cm; −1.6 cm at the centre back.')
    expect(fillAmounts('{+mm:12.7}', (mm, signed) => formatLength(mm, 'inch', { signed }))).toBe('+½\u00A0in')
  })
  it('come back as they went in', () => fc.assert(fc.property(fc.integer({ min: -9999, max: 9999 }), (tenths) => {
    const mm = tenths / 10
    const read: [number, boolean][] = []
    fillAmounts(mmToken(mm) + signedToken(mm), (value, signed) => { read.push([value, signed]); return '' })
    expect(read).toEqual([[Math.abs(mm), false], [mm, true]])
  })))
  it('leave text without tokens alone', () => expect(fillAmounts('Take 2 {whole} {mm:x}', () => 'no')).toBe('Take 2 {whole} {mm:x}'))
})
