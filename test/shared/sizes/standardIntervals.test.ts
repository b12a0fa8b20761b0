import { braSize, classLimits, classOf, menRows, sizeLetter, womenRows } from '#shared/sizes/standardIntervals.ts'
import { gradeSteps } from '#shared/sizes/sizeChart.ts'
import { mmPerInch } from '#shared/units/unit.ts'
import { describe, expect, it } from 'vitest'

const bustClass = (mm: number) => classOf(mm, womenRows.bust)?.midMm

// EN 13402-3, women: bust class limits as published (78, 82 … 102, then 107, 113 … 131); waist, hip and letters from memory.
describe('EN 13402-3, women', () => {
  it('has the published bust limits', () => expect(classLimits(womenRows.bust).slice(0, 13)).toEqual([740, 780, 820, 860, 900, 940, 980, 1020, 1070, 1130, 1190, 1250, 1310]))
  it.each([[899, 880, 'S'], [900, 920, 'M'], [1019, 1000, 'L'], [1020, 1040, 'L'], [1070, 1100, 'XL']])('puts bust %d mm in class %d and letter %s: lower limit in, upper out', (mm, mid, letter) => {
    expect(bustClass(mm)).toBe(mid)
    expect(sizeLetter(mm, 'women')).toBe(letter)
  })
  it('spreads one body over three columns where bust, waist and hip differ', () => {
    expect([classOf(920, womenRows.bust)!.index, classOf(800, womenRows.waist)!.index, classOf(1080, womenRows.hip)!.index]).toEqual([4, 5, 6])
  })
  it('has hip limits midway, 114.5 and 119.5 cm among the larger', () => expect(classLimits(womenRows.hip)).toEqual(expect.arrayContaining([820, 860, 1100, 1145, 1195, 1345])))
  // ANSUR II public data, one row of the women's file (derived).
  it('classes a measured body: bust 922, waist 850, hip 1011', () => {
    expect([bustClass(922), classOf(850, womenRows.waist)!.midMm, classOf(1011, womenRows.hip)!.midMm, sizeLetter(922, 'women')]).toEqual([920, 840, 1000, 'M'])
  })
  it('has no class outside the table', () => {
    expect(classOf(739.9, womenRows.bust)).toBeNull()
    expect(classOf(1550, womenRows.bust)).toBeNull()
    expect(sizeLetter(600, 'women')).toBeNull()
  })
  it('leaves no gap between letters', () => { for (let mm = 660; mm < 1430; mm++) expect(sizeLetter(mm, 'women')).not.toBeNull() })
})
// From memory.
describe('EN 13402-3, men', () => it.each([[1000, 'M'], [1100, 'XL'], [859, 'XS'], [1290, '3XL']])('gives chest %d mm the letter %s', (mm, letter) => {
  expect(sizeLetter(mm, 'men')).toBe(letter)
  expect(classOf(mm, menRows.chest)).not.toBeNull()
}))
// EN 13402 rule from memory.
it.each([[870, 1070, '85D'], [890, 1080, '90D'], [820, 1000, '80C'], [820, 900, null]])('names a bra of underbust %d and bust %d mm %s', (under, bust, size) => expect(braSize(under, bust)).toBe(size))

// Bust of sizes 8, 10 and 12 of ASTM D5585-11e1, as shown on the publisher's page.
it('reads the grade off a chart', () => {
  const chart = [36.25, 37.25, 38.75].map((bust, i) => ({ label: ['8', '10', '12'][i]!, body: { bust: bust * mmPerInch } }))
  expect(gradeSteps(chart, 'bust').map((mm) => mm / mmPerInch)).toEqual([1, 1.5].map((n) => expect.closeTo(n, 9)))
  expect(gradeSteps(chart, 'hip')).toEqual([])
})
