import { parseChart } from '#shared/sizes/parseChart.ts'
import { mmPerInch } from '#shared/units/unit.ts'
import { describe, expect, it } from 'vitest'

const stops = (text: string, unit: 'cm' | 'inch' = 'cm') => parseChart(text, unit).problems.filter(({ severity }) => severity === 'stop')
const tab = (...rows: string[][]) => rows.map((row) => row.join('\t')).join('\n')

// Rows of the home-pattern misses chart as a teaching blog reproduced it in 2011, inches.
const misses = tab(['Size', '12', '14', '16'], ['Bust', '34', '36', '38'], ['Waist', '26 1/2', '28', '30'], ['Hip', '36', '38', '40'], ['Back waist length', '16¼', '16½', '16 3/4'])

describe('a chart pasted from a spreadsheet', () => {
  it('reads sizes across, fractions and whole names', () => {
    const { chart, problems, laidOut } = parseChart(misses, 'inch')
    expect(problems).toEqual([])
    expect(laidOut).toBe('sizes across')
    expect(chart.map(({ label }) => label)).toEqual(['12', '14', '16'])
    expect(chart[0]!.body).toEqual({ bust: 863.6, waist: 673.1, hip: 914.4, 'back-waist-length': 412.75 })
    expect(chart[2]!.body['back-waist-length']).toBeCloseTo(16.75 * mmPerInch, 9)
  })
  it('reads the same chart with the sizes down', () => {
    const turned = tab(['Size', 'Bust', 'Waist', 'Hip', 'Back waist length'], ['12', '34', '26.5', '36', '16.25'], ['14', '36', '28', '38', '16.5'], ['16', '38', '30', '40', '16.75'])
    expect(parseChart(turned, 'inch')).toMatchObject({ laidOut: 'sizes down', problems: [] })
    expect(parseChart(turned, 'inch').chart).toEqual(parseChart(misses, 'inch').chart)
  })
  it('reads decimal commas between semicolons, and quoted ones between commas', () => {
    expect(parseChart('Size;36;38\nBust;84,5;88\nHip;92,5;96', 'cm').chart).toEqual([{ label: '36', body: { bust: 845, hip: 925 } }, { label: '38', body: { bust: 880, hip: 960 } }])
    expect(parseChart('Size,36,38\nBust,"84,5",88', 'cm').chart[0]!.body).toEqual({ bust: 845 })
  })
  it('reads commas, bars and bare spaces', () => {
    const expected = [{ label: 'S', body: { waist: 660.4, hip: 914.4 } }, { label: 'M', body: { waist: 717.55, hip: 965.2 } }]
    expect(parseChart('Size,S,M\nWaist,26,28 1/4\nHip,36,38', 'inch').chart).toEqual(expected)
    expect(parseChart('| Size | S | M |\n|---|---|---|\n| Waist | 26 | 28 1/4 |\n| Hip | 36 | 38 |', 'inch').chart).toEqual(expected)
    expect(parseChart('Size S M\nWaist 26 28 1/4\nHip 36 38', 'inch').chart).toEqual(expected)
  })
  it('believes the unit of a heading, a corner, a title and a cell over the one asked for', () => {
    expect(parseChart(tab(['Size', 'Bust (in)', 'Hip (cm)'], ['14', '36', '96']), 'cm').chart[0]!.body).toEqual({ bust: 914.4, hip: 960 })
    expect(parseChart(tab(['Size (inches)', '14'], ['Bust', '36']), 'cm').chart[0]!.body).toEqual({ bust: 914.4 })
    expect(parseChart(`Body measurements in inches\n${tab(['Size', '14'], ['Bust', '36']) }`, 'cm').chart[0]!.body).toEqual({ bust: 914.4 })
    expect(parseChart(tab(['Size', '14'], ['Bust', '36"']), 'cm').chart[0]!.body).toEqual({ bust: 914.4 })
    expect(parseChart(tab(['Size', 'bust (mm)'], ['14', '914']), 'inch').chart[0]!.body).toEqual({ bust: 914 })
  })
  it('takes "in" for inches at the end of a heading only', () => {
    expect(parseChart(`Bodies in this class\n${tab(['Size', 'Bust, in'], ['14', '36'])}`, 'cm').chart[0]!.body).toEqual({ bust: 914.4 })
    expect(parseChart(`Bodies in this class\n${tab(['Size', 'Bust'], ['14', '92'])}`, 'cm').chart[0]!.body).toEqual({ bust: 920 })
  })
  it('does not take the length of a garment for one of the body', () => expect(stops(tab(['Size', 'Hip', 'Skirt length'], ['14', '96', '60']))[0]!.message).toMatch(/"Skirt length"/))
  it('reads a chart printed in both units once, in the one asked for', () => {
    const both = tab(['Size', '14'], ['Bust (in)', '36'], ['Bust (cm)', '92'])
    expect(parseChart(both, 'cm')).toMatchObject({ chart: [{ body: { bust: 920 } }] })
    expect(parseChart(both, 'inch').chart[0]!.body.bust).toBe(914.4)
    expect(stops(both)).toEqual([])
  })
  it('knows measurements by code, by home name and by standard name', () => {
    const { chart } = parseChart(tab(['Size', 'high-bust', 'Body rise', 'Nape to waist', 'hip girth', 'Biceps', 'Inside leg length'], ['14', '92', '28', '41', '96', '28.5', '78']), 'cm')
    expect(chart[0]!.body).toEqual({ 'high-bust': 920, 'crotch-depth': 280, 'back-waist-length': 410, hip: 960, 'upper-arm': 285, 'inside-leg': 780 })
  })
  it('keeps finished measurements apart, by heading or under a title line', () => {
    const expected = [{ label: '14', body: { bust: 960 }, finished: { bust: 1020 } }]
    expect(parseChart(tab(['Size', 'Bust', 'Finished bust'], ['14', '96', '102']), 'cm').chart).toEqual(expected)
    expect(parseChart(tab(['Size', '14'], ['Body measurements'], ['Bust', '96'], ['Finished garment measurements'], ['Bust', '102']), 'cm').chart).toEqual(expected)
  })
  it('takes the middle of a range and says so', () => {
    const { chart, problems } = parseChart(tab(['Size', 'S', 'M'], ['Bust', '82–90', '90-98']), 'cm')
    expect(chart.map(({ body }) => body.bust)).toEqual([860, 940])
    expect(problems.map(({ severity }) => severity)).toEqual(['note', 'note'])
    expect(problems[1]!.message).toMatch(/Row 2, column 3 \(Full bust, size M\).*range.*middle/)
  })
})

describe('what cannot be read', () => {
  it('names row, column, measurement and size, and keeps the rest', () => {
    const { chart, problems } = parseChart(tab(['Size', '12', '14'], ['Bust', '34', '3B'], ['Hip', '36', '38']), 'inch')
    expect(chart).toEqual([{ label: '12', body: { bust: 863.6, hip: 914.4 } }, { label: '14', body: { hip: 965.2 } }])
    expect(problems).toEqual([{ severity: 'stop', row: 2, column: 3, message: 'Row 2, column 3 (Full bust, size 14): "3B" is not a length. Write it like 38 1/4, 38.25 or 97 cm.' }])
  })
  it('counts rows as pasted, empty lines included', () => expect(stops('Size\t12\n\n\nBust\twide')[0]).toMatchObject({ row: 4, column: 2 }))
  it('leaves out a heading it does not know, and says which', () => {
    expect(stops(tab(['Size', '14'], ['Bust', '96'], ['Wingspan', '170']))).toEqual([expect.objectContaining({ row: 3, message: expect.stringMatching(/Row 3 \("Wingspan"\).*left out/) })])
    expect(stops(tab(['Size', 'Bust', 'Wingspan', 'Hip'], ['14', '96', '170', '102']))[0]!.message).toMatch(/Column 3 \("Wingspan"\)/)
  })
  it('keeps the first of two sizes with one label', () => {
    const { chart, problems } = parseChart(tab(['Size', '14', '14'], ['Bust', '96', '100']), 'cm')
    expect(chart).toEqual([{ label: '14', body: { bust: 960 } }])
    expect(problems[0]!.message).toMatch(/Row 1, column 3: size "14" stands there twice/)
  })
  it('notes an empty cell', () => expect(parseChart(tab(['Size', '12', '14'], ['Bust', '92', ''], ['Hip', '98', '102']), 'cm').problems).toEqual([expect.objectContaining({ severity: 'note', row: 2, column: 3, message: 'Row 2, column 3 (Full bust, size 14) is empty.' })]))
  it('says when nothing is there and when nothing is known', () => {
    expect(parseChart('  \n ', 'cm')).toMatchObject({ chart: [], problems: [{ message: expect.stringMatching(/nothing to read/) }] })
    expect(parseChart('hello\tthere', 'cm')).toMatchObject({ chart: [], problems: [{ message: expect.stringMatching(/No measurement was recognised/) }] })
  })
  it('numbers sizes whose labels were not pasted', () => {
    const { chart, problems } = parseChart(tab(['Bust', '92', '96'], ['Hip', '98', '102']), 'cm')
    expect(chart.map(({ label }) => label)).toEqual(['1', '2'])
    expect(problems[0]!.message).toMatch(/numbered/)
  })
  it('suspects inches read as centimetres', () => expect(parseChart(misses, 'cm').problems[0]!.message).toMatch(/look like inches/))
  it('notes a value that shrinks as the sizes grow', () => expect(parseChart(tab(['Size', '12', '14', '16'], ['Bust', '92', '69', '100']), 'cm').problems[0]!.message).toMatch(/size 14 \(\{mm:690\}\) is smaller than of size 12/))
  it('suggests another separator where decimal commas break the columns', () => expect(stops('Size,36,38\nBust,84,5,88,5,92,5,96,5').some(({ message }) => /tabs or semicolons/.test(message))).toBe(true))
})
