import { cautionsFor, childrenCautions, layoutCautions, safetyCautions } from '#shared/cutting/cautions.ts'
import { finalChecklist } from '#shared/cutting/finalChecklist.ts'
import { allowanceDifference, clothEnough, lengthForWidth, printScale } from '#shared/cutting/layout.ts'
import { clothToBuy, shrinkageOf } from '#shared/cutting/testSquare.ts'
import { mmPerInch } from '#shared/units/unit.ts'
import { describe, expect, it } from 'vitest'

describe('a washed test square', () => {
  // Dimensional change in the form of AATCC test method 135, from memory.
  it('of 500 that comes out 485 by 500 shrank 3.0 % in length alone', () => {
    const shrinkage = shrinkageOf({ markedMm: 500, lengthAfterMm: 485, widthAfterMm: 500 })!
    expect(shrinkage.lengthPercent).toBeCloseTo(-3, 9)
    expect(shrinkage.widthPercent).toBe(0)
    expect(shrinkage.text).toMatch(/3\.0 % shorter in the length\./)
    expect(clothToBuy(1000, 1000, shrinkage)).toEqual({ lengthMm: expect.closeTo(1030.93, 2), widthMm: 1000 })
  })
  it('needs 2.632 m for 2.5 m at 5 %', () => expect(clothToBuy(2500, 1400, { lengthPercent: -5, widthPercent: 0 }).lengthMm).toBeCloseTo(2631.6, 1))
  it('says so where the cloth keeps its size, and nothing until it is measured', () => {
    expect(shrinkageOf({ markedMm: 250, lengthAfterMm: 250, widthAfterMm: 249 })?.text).toMatch(/keeps its size/)
    expect(shrinkageOf({ markedMm: 250, lengthAfterMm: null, widthAfterMm: 249 })).toBeNull()
  })
})

// Common practice: L2 ≈ L1 · w1 / w2, 10 to 15 % more for nap.
describe('cloth of another width', () => {
  it('needs more length where it is narrower', () => expect(lengthForWidth(1400, 1500, 1200)).toEqual({ leastMm: 1750, mostMm: 1750 }))
  it('needs 10 to 15 % more one way', () => {
    const { leastMm, mostMm } = lengthForWidth(1000, 1400, 1400, true)
    expect(leastMm).toBeCloseTo(1100, 6)
    expect(mostMm).toBeCloseTo(1150, 6)
  })
  it('is enough at the least length, short below it, unknown without a figure', () => {
    const cloth = { widthMm: 1400, lengthMm: 1100, neededMm: 1000, statedWidthMm: 1400, oneWay: true, matching: false }
    expect(clothEnough(cloth)?.enough).toBe(true)
    expect(clothEnough({ ...cloth, lengthMm: 1090 })).toMatchObject({ enough: false, shortMm: expect.closeTo(10, 6) })
    expect(clothEnough({ ...cloth, lengthMm: null })).toBeNull()
  })
})

// Tolerance ours: 1 %.
it('asks to print a 50 mm square of 48.5 again at 103.1 %, and accepts 49.6', () => {
  expect(printScale(50, 48.5)).toMatchObject({ factor: expect.closeTo(1.0309, 4), accepted: false })
  expect(printScale(50, 49.6)).toMatchObject({ offPercent: expect.closeTo(-0.8, 9), accepted: true })
  expect([printScale(50, 49.5), printScale(50, 50.5), printScale(50, 49.4)].map(({ accepted }) => accepted)).toEqual([true, true, false])
})
it('makes a garment 7.0 mm larger where eight edges of 5/8 in are sewn at 15 mm', () => expect(allowanceDifference((5 / 8) * mmPerInch, 15, 8)).toBeCloseTo(7, 9))

describe('the list before the cut', () => {
  const ids = (...args: Parameters<typeof finalChecklist>) => finalChecklist(...args).map(({ id }) => id)
  it('has all three groups and says which items tick themselves', () => {
    const list = finalChecklist({ kind: 'skirt' })
    expect(new Set(list.map(({ group }) => group))).toEqual(new Set(['fit', 'pattern', 'cloth']))
    expect(list.find(({ id }) => id === 'fit.observations')?.verifiedBy).toBe('observations-settled')
    expect(list.find(({ id }) => id === 'cloth.washed')?.verifiedBy).toBeNull()
    expect(new Set(list.map(({ id }) => id)).size).toBe(list.length)
  })
  it('asks only what applies', () => {
    expect(ids({ kind: 'skirt' })).not.toEqual(expect.arrayContaining(['cloth.one-way']))
    expect(ids({ kind: 'skirt' }, { oneWay: true, matching: true, hasFitter: true })).toEqual(expect.arrayContaining(['cloth.one-way', 'cloth.matching', 'fit.fitter']))
    expect(ids({ kind: 'dress', features: ['knit'] })).toContain('cloth.stretch')
    expect(ids({ kind: 'dress', features: ['children'] })).toContain('cloth.children')
    expect(ids({ kind: 'dress' })).not.toContain('cloth.children')
  })
})

describe('cautions', () => {
  it('name a source and stay calm', () => {
    for (const { text, source } of [...layoutCautions, ...safetyCautions, ...childrenCautions]) {
      expect(source).not.toBe('')
      expect(text).not.toMatch(/!/)
    }
  })
  // US 16 CFR 1120, 1615, 1616; EN 14682.
  it('for children defer to local rules and qualified people, for cords and nightwear', () => {
    for (const id of ['children.cords', 'children.nightwear']) expect(childrenCautions.find((row) => row.id === id)!.text).toMatch(/rules.*qualified person/is)
    expect(cautionsFor({ kind: 'dress' }, 'children')).toEqual([])
    expect(cautionsFor({ kind: 'dress', features: ['children'] }, 'children')).toHaveLength(childrenCautions.length)
  })
  it('cover pins on a body, the rotary cutter and the iron', () => {
    expect(cautionsFor({ kind: 'skirt' }, 'fitting').map(({ id }) => id)).toContain('fitting.pins')
    expect(cautionsFor({ kind: 'skirt' }, 'cutting').map(({ id }) => id)).toContain('cutting.rotary-cutter')
    expect(cautionsFor({ kind: 'skirt' }, 'pressing').map(({ id }) => id)).toContain('pressing.iron')
  })
})
