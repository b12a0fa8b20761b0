import { parseLength } from '#shared/units/parseLength.ts'
import { describe, expect, it } from 'vitest'

const mm = (text: string, unit: 'cm' | 'inch', options = {}) => {
  const read = parseLength(text, unit, options)
  return read.ok ? read.mm : read.message
}

describe('what people type', () => {
  it.each([
    ['97', 'cm', 970], ['97.5', 'cm', 975], ['97,5', 'cm', 975], [' 97.5 cm ', 'cm', 975], ['97½', 'cm', 975], ['.5', 'cm', 5], ['9.95', 'cm', 99.5],
    ['38 1/4', 'inch', 971.55], ['38 ¼', 'inch', 971.55], ['38¼', 'inch', 971.55], ['38-1/4', 'inch', 971.55], ['38 1/4"', 'inch', 971.55], ['38 1⁄4 in', 'inch', 971.55], ['38³⁄₁₆', 'inch', 969.9625],
    ['38–1/4″', 'inch', 971.55], ['5/8', 'inch', 15.875], ['38,375', 'inch', 974.725], ['38', 'inch', 965.2],
  ] as const)('reads %s in %s', (text, unit, expected) => expect(mm(text, unit)).toBe(expected))

  it.each([
    ['97 cm', 'inch', 970], ['970 mm', 'inch', 970], ['38.25 in', 'cm', 971.55], ['38 1/4 inches', 'cm', 971.55], ['38¼″', 'cm', 971.55], ['1.63 m', 'cm', 1630],
    ['5 ft 6 in', 'cm', 1676.4], [`5'6"`, 'cm', 1676.4], ['5′ 6 ½″', 'inch', 1689.1], ['6 ft', 'cm', 1828.8],
  ] as const)('lets the unit in the text win: %s in a field of %s', (text, unit, expected) => expect(mm(text, unit)).toBe(expected))

  it('reads signs only where an amount may be below zero', () => {
    expect(mm('−1.5', 'cm', { signed: true })).toBe(-15)
    expect(mm('+1/2 in', 'cm', { signed: true })).toBe(12.7)
    expect(mm('-1.5', 'cm')).toMatch(/below zero/)
  })
  it('is exact for a foot, an inch, an eighth and a sixteenth', () => {
    expect(mm('12', 'inch')).toBe(304.8)
    expect(mm('1', 'inch')).toBe(25.4)
    expect(mm('1/8', 'inch')).toBe(3.175)
    expect(mm('1/16', 'inch')).toBe(1.5875)
  })
})

describe('what cannot be read', () => {
  it.each([
    ['', /Type a length/], ['   ', /Type a length/], ['wide', /"wide" is not a length.*97\.5/], ['38 1/0', /cannot end in \/0/], ['38 5/4', /one or more/],
    ['1,020 mm', /1020 or 1\.020/], ['1.020,5', /two decimal marks/], ['97 98', /not a length/], ['38 1/4 1/8', /not a length/], ['NaN', /not a length/], ['1e3', /not a length/],
    ['99999', /longer than anything/], ['5 ft 6 cm', /mixes feet/],
  ])('answers "%s" with what to write instead', (text, sentence) => expect(mm(text, 'cm')).toMatch(sentence))
})
