import { bodyValue, findMeasurement, measurementName, sideCodes } from '#shared/measurements/findMeasurement.ts'
import { measurementTable } from '#shared/measurements/measurementTable.ts'
import { measurementsFor, sizeDimensions } from '#shared/measurements/sizeDimensions.ts'
import { garmentKinds } from '#shared/fit/types.ts'
import { describe, expect, it } from 'vitest'

const row = (code: string) => findMeasurement(code)!.measurement

describe('the table', () => {
  it('has each code once, in the form the database takes', () => {
    const codes = measurementTable.map(({ code }) => code)
    expect(new Set(codes).size).toBe(codes.length)
    for (const code of codes) expect(code).toMatch(/^[a-z][a-z0-9-]{1,40}$/)
  })
  // Names of ISO 8559-1 and EN 13402-1; the body rise, scye depth and crotch length as ISO 8559:1989 lists them (Zakaria & Gupta, p. 96).
  it.each([
    ['bust', 'bust girth'], ['chest', 'chest girth'], ['underbust', 'underbust girth'], ['waist', 'waist girth'], ['hip', 'hip girth'], ['neck', 'neck girth'], ['head', 'head girth'], ['height', 'height'],
    ['inside-leg', 'inside leg length'], ['arm-length', 'arm length'], ['crotch-depth', 'body rise'], ['armscye-depth', 'scye depth'], ['crotch-length', 'total crotch length'], ['outside-leg', 'outside leg length'], ['thigh', 'thigh girth'],
  ])('names %s "%s" as the standard does', (code, name) => expect(row(code).standardName).toBe(name))
  it('has no standard name for the high bust, which is home sewing only', () => expect(row('high-bust').standardName).toBeNull())
  it('says how to take each one in a sentence, and never praises or judges', () => {
    for (const { how } of measurementTable) {
      expect(how).toMatch(/\.$/)
      expect(how).not.toMatch(/!|ideal|flaw|problem/i)
    }
  })
  it('draws every tape line inside the figure', () => {
    for (const { code, tape } of measurementTable) {
      for (const path of [tape.path, 'behind' in tape ? (tape as { behind?: string }).behind ?? '' : '']) {
        const numbers = path.match(/-?\d+(?:\.\d+)?/g)?.map(Number) ?? []
        expect(numbers.length % 2, code).toBe(0)
        numbers.forEach((n, i) => {
          expect(n, code).toBeGreaterThanOrEqual(0)
          expect(n, code).toBeLessThanOrEqual(i % 2 ? 400 : 200)
        })
      }
    }
  })
  // ANSUR II public data, 5th and 95th percentile, mm (derived).
  it.each([['height', 1525, 1870], ['hip', 899, 1156], ['waist', 710, 1131], ['bust', 824, 1094], ['chest', 922, 1207], ['wrist', 142, 191], ['inside-leg', 712, 925]])('expects %s between %d and %d mm', (code, least, most) => {
    expect(row(code).plausible).toMatchObject({ leastMm: least, mostMm: most, source: expect.stringMatching(/ANSUR II/) })
  })
  it('says where a range of the survey was taken at another level than ours', () => expect(row('waist').plausible.source).toMatch(/navel/))
})

describe('sides', () => {
  it('finds one side of a paired measurement, and none of a single one', () => {
    expect(findMeasurement('thigh-left')).toMatchObject({ measurement: { code: 'thigh' }, side: 'left' })
    expect(findMeasurement('bust-left')).toBeNull()
    expect(measurementName('shoulder-right')).toBe('Shoulder, right')
    expect(sideCodes('waist')).toBeNull()
  })
  it('sizes by the larger side where both were taken apart', () => {
    expect(bodyValue({ 'thigh-left': 580, 'thigh-right': 592 }, 'thigh')).toBe(592)
    expect(bodyValue({}, 'thigh')).toBeNull()
  })
})

describe('what to measure', () => {
  it('never asks for the bust where a skirt or trousers are made', () => {
    for (const kind of ['skirt', 'trousers'] as const) {
      const { needed, helpful } = measurementsFor({ kind, waist: 'elastic' })
      for (const code of [...needed, ...helpful]) expect(code).not.toMatch(/bust|chest/)
    }
  })
  it('knows every code it asks for', () => {
    for (const kind of garmentKinds) {
      const { needed, helpful } = measurementsFor({ kind, sleeves: 'set-in', features: ['children'] })
      for (const code of [...needed, ...helpful]) expect(findMeasurement(code), code).not.toBeNull()
    }
  })
  it('takes children by height, never by age (common practice)', () => expect(measurementsFor({ kind: 'dress', features: ['children'] }).needed[0]).toBe('height'))
  // EN 13402-2:2002, ISO 8559-2:2017; rows from memory.
  it('labels skirts by the waist, dresses by the bust, shirts for men by the neck', () => {
    expect(sizeDimensions('skirt', 'women')).toEqual({ primary: ['waist'], secondary: ['height', 'hip'] })
    expect(sizeDimensions('dress', 'women')?.primary).toEqual(['bust'])
    expect(sizeDimensions('shirt', 'men')).toEqual({ primary: ['neck'], secondary: ['height', 'arm-length'] })
    expect(sizeDimensions('skirt', 'men')).toBeNull()
  })
})
