import { fillAmounts } from '#shared/fit/amountText.ts'
import { sizePlan } from '#shared/fit/sizePlan.ts'
import { garmentFeatures, garmentKinds, sleeveKinds, waistKinds } from '#shared/fit/types.ts'
import { measurementTable } from '#shared/measurements/measurementTable.ts'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { en, inches, misses, top, withEase } from './charts.ts'

const sizes = (plan: ReturnType<typeof sizePlan>) => Object.fromEntries(plan.zones.map(({ code, size }) => [code, size]))
const zone = (plan: ReturnType<typeof sizePlan>, code: string) => plan.zones.find((one) => one.code === code)!

describe('a body that stands on a size', () => {
  it('takes size 14 everywhere for 36, 28 and 38 in', () => {
    const plan = sizePlan({ bust: inches(36), waist: inches(28), hip: inches(38) }, misses, { kind: 'dress' })
    expect(sizes(plan)).toEqual({ bust: '14', waist: '14', hip: '14' })
    expect(plan).toMatchObject({ label: '14', blends: [], refused: false })
    expect(plan.reason).toMatch(/^Exact at bust, waist and hip\./)
  })
})

describe('between two sizes', () => {
  const at = (bust: number, options = {}, garment = {}) => zone(sizePlan({ bust: inches(bust) }, misses, { kind: 'bodice', ...garment }, options), 'bust')
  it('takes the nearest and shows both with what each would need', () => {
    const bust = at(34.5)
    expect(bust).toMatchObject({ size: '12', t: 0.25 })
    expect(bust.neighbours.map(({ size }) => size)).toEqual(['12', '14'])
    expect(bust.neighbours[0]).toMatchObject({ bodyOverMm: 12.7, toChange: expect.stringMatching(/\{mm:12\.7\} smaller.*let that much out/) })
    expect(bust.neighbours[1]!.toChange).toMatch(/\{mm:38\.1\} larger.*take that much in/)
  })
  // Tie-break: common practice.
  it('half way, takes the larger in close cloth that does not stretch', () => expect(at(35)).toMatchObject({ t: 0.5, size: '14', recommended: { reason: expect.stringMatching(/easier to take in/) } }))
  it('half way, takes the smaller in a loose garment, in a knit, and from 25 % stretch on', () => {
    expect(at(35, {}, { features: ['gathered'] }).size).toBe('12')
    expect(at(35, { stretchPercent: 30 }, { features: ['knit'] }).size).toBe('12')
    expect(at(35, { stretchPercent: 25 }).size).toBe('12')
    expect(at(35, { stretchPercent: 24 }).size).toBe('14')
  })
  it('half way, lets a small frame take the smaller', () => expect(at(35, { frame: 'small' }).size).toBe('12'))
  it('takes the larger where finished measures show that the nearest leaves too little', () => {
    const plan = sizePlan({ bust: 935 }, withEase({ bust: 55 }), { kind: 'dress' })
    expect(zone(plan, 'bust')).toMatchObject({ size: '96', recommended: { reason: expect.stringMatching(/too little ease/) } })
  })
  it('does not go up for less than the noise of a tape', () => expect(zone(sizePlan({ bust: 924 }, withEase({ bust: 50 }), { kind: 'dress' }), 'bust').size).toBe('92'))
})

describe('which measurement leads (home-pattern practice)', () => {
  const body = { bust: 920, 'high-bust': 890, waist: 760, hip: 1000, thigh: 600, neck: 370 }
  const leads = (garment: Parameters<typeof sizePlan>[2], chart = en) => sizePlan(body, chart, garment).governing
  it('takes skirts and trousers by the hip, full skirts by the waist, tops by the bust', () => {
    expect(leads({ kind: 'skirt' })?.code).toBe('hip')
    expect(leads({ kind: 'trousers' })?.code).toBe('hip')
    expect(leads({ kind: 'skirt', features: ['full'] })?.code).toBe('waist')
    expect(leads({ kind: 'dress' })?.code).toBe('bust')
    expect(leads({ kind: 'skirt', features: ['full'] })?.reason).toMatch(/hangs free/)
  })
  it('tells a full skirt by more than 15 cm of room at the hip', () => {
    expect(leads({ kind: 'skirt' }, withEase({ hip: 160 }))?.code).toBe('waist')
    expect(leads({ kind: 'skirt', features: ['flared'] }, withEase({ hip: 100 }))?.code).toBe('hip')
  })
  it('takes a shirt by the neck where that asks for the larger size', () => {
    const shirts = ['S', 'M', 'L'].map((label, i) => ({ label, body: { chest: 920 + i * 80, neck: 370 + i * 20 } }))
    expect(sizePlan({ chest: 1000, neck: 410 }, shirts, { kind: 'shirt' })).toMatchObject({ governing: { code: 'neck' }, zones: [{ code: 'chest', size: 'L' }, { code: 'neck', size: 'L' }] })
    expect(sizePlan({ chest: 1000, neck: 372 }, shirts, { kind: 'shirt' }).governing?.code).toBe('chest')
  })
  it('lets the next level stand in, and says so, where chart or body lack the first', () => {
    const plan = sizePlan({ waist: 760 }, en, { kind: 'skirt' })
    expect(plan.governing?.code).toBe('waist')
    expect(plan.warnings.join(' ')).toMatch(/hip should lead.*measurements have none/)
    expect(zone(plan, 'hip')).toMatchObject({ size: '92', bodyMm: null, recommended: { reason: expect.stringMatching(/Not measured yet/) } })
  })
})

describe('a full bust', () => {
  const body = { bust: inches(38), 'high-bust': inches(34.5), waist: inches(28), hip: inches(38) }
  // Rule of general sewing courses and Texas extension: high bust in the bust column; the other from the drafted difference.
  it('is led by the high bust, in the chart’s bust less the drafted difference: 14, and 1 1/2 in to add', () => {
    const { cup, governing, zones } = sizePlan(body, misses, { kind: 'bodice' }, { draftedCupMm: inches(2) })
    expect(governing?.reason).toMatch(/high bust leads/)
    expect(cup).toMatchObject({ rule: 'high-bust-column', size: '14', addition: { wholeMm: 38.1, halfFrontMm: 19.05 }, toRowMm: 50.8 })
    expect(zones[0]).toMatchObject({ code: 'bust', leadCode: 'high-bust', size: '14', addedMm: 38.1 })
  })
  it('or in the bust column: 12, and 4 in to add; each names the other', () => {
    const { cup } = sizePlan(body, misses, { kind: 'bodice' }, { draftedCupMm: inches(2), highBustRule: 'bust-column' })
    expect(cup).toMatchObject({ rule: 'bust-column', size: '12', addition: { wholeMm: expect.closeTo(inches(4), 6) }, other: { rule: 'high-bust-column', size: '14' }, text: expect.stringMatching(/whose bust equals this high bust/) })
  })
  it('uses the chart’s own high bust where it has one', () => {
    const chart = [[34, 36], [36, 38]].map(([high, bust], i) => ({ label: ['14', '16'][i]!, body: { 'high-bust': inches(high!), bust: inches(bust!) } }))
    expect(sizePlan({ bust: inches(38), 'high-bust': inches(34) }, chart, { kind: 'bodice' }).cup).toMatchObject({ size: '14', draftedMm: 50.8, draftedAssumed: false, addition: { wholeMm: expect.closeTo(inches(2), 6), halfFrontMm: expect.closeTo(inches(1), 6) } })
  })
  it('says when the drafted difference is the usual one and not the pattern’s', () => expect(sizePlan(body, misses, { kind: 'bodice' }).cup).toMatchObject({ draftedAssumed: true, text: expect.stringMatching(/as most are/) }))
  it('does not lead below 2 in, and never in a skirt', () => {
    expect(sizePlan({ bust: 960, 'high-bust': 915 }, misses, { kind: 'bodice' }, { draftedCupMm: 50 }).cup).toBeNull()
    expect(sizePlan(body, misses, { kind: 'skirt' }).cup).toBeNull()
  })
  it('adds 50 whole and 25 half for 1020 over 920 drafted for 50', () => {
    const chart = withEase({ bust: 80 })
    const plan = sizePlan({ bust: 1020, 'high-bust': 920 }, chart, { kind: 'dress' }, { draftedCupMm: 50 })
    expect(plan.cup).toMatchObject({ size: '96', addition: { wholeMm: 50, halfFrontMm: 25 } })
    expect(zone(plan, 'bust')).toMatchObject({ addedMm: 50, easeMm: 1040 + 50 - 1020, warnings: [] })
    expect(plan.pattern.draftedCupMm).toBe(50)
  })
  it('takes out of the front for a smaller bust than drafted', () => expect(sizePlan({ bust: 900, 'high-bust': 890 }, en, { kind: 'dress' }, { draftedCupMm: 50 }).cup?.addition.advice).toBe('take-away'))
})

describe('a pull-on elastic waist (common practice)', () => {
  const skirt = { kind: 'skirt', waist: 'elastic' } as const
  it('keeps the hip’s size where the edge is not known, and says what to measure', () => {
    const plan = sizePlan({ waist: 680, hip: 1000 }, en, skirt)
    expect(plan.governing).toMatchObject({ code: 'hip', reason: expect.stringMatching(/must pass over it/) })
    expect(sizes(plan)).toEqual({ waist: '92', hip: '92' })
    expect(plan.opening).toMatchObject({ passes: null, neededMm: 1025 })
  })
  it('may follow the waist where that edge passes the hip', () => {
    const plan = sizePlan({ waist: 720, hip: 1000 }, withEase({ waist: 310, hip: 100 }), skirt)
    expect(sizes(plan)).toEqual({ waist: '88', hip: '92' })
    expect(plan.opening).toMatchObject({ passes: true, edgeMm: 1030 })
  })
  it('goes up until the edge passes', () => {
    const plan = sizePlan({ waist: 680, hip: 1000 }, withEase({ waist: 270, hip: 100 }), skirt)
    expect(zone(plan, 'waist')).toMatchObject({ size: '92', recommended: { reason: expect.stringMatching(/smallest size/i) } })
    expect(plan.opening?.passes).toBe(true)
  })
  it('warns where no edge passes: 980 over a hip of 1000 is 45 to 70 short', () => {
    const chart = [{ label: 'S', body: { waist: 700, hip: 1000 }, finished: { waist: 980, hip: 1100 } }]
    const plan = sizePlan({ waist: 700, hip: 1000 }, chart, skirt)
    expect(plan.opening).toMatchObject({ passes: false, shortMm: 45 })
    expect(plan.warnings.join(' ')).toMatch(/\{mm:45\} to \{mm:70\} short/)
  })
  it('recomputes the opening for the maker’s own choice', () => {
    const chart = withEase({ waist: 270, hip: 100 })
    const plan = sizePlan({ waist: 680, hip: 1000 }, chart, skirt, { choices: { waist: '84' } })
    expect(zone(plan, 'waist')).toMatchObject({ size: '84', chosen: true, recommended: { size: '92' } })
    expect(plan.opening).toMatchObject({ passes: false, edgeMm: 950 })
  })
  it('counts the stretch of a knit', () => {
    const chart = [{ label: 'S', body: { waist: 700, hip: 1000 }, finished: { waist: 700, hip: 980 } }]
    const knit = { kind: 'skirt', waist: 'elastic', features: ['knit'] } as const
    expect(sizePlan({ hip: 1000, waist: 700 }, chart, knit, { stretchPercent: 43 }).opening?.passes).toBe(true)
    expect(sizePlan({ hip: 1000, waist: 700 }, chart, knit, { stretchPercent: 42 }).opening?.passes).toBe(false)
  })
  it('says how long to cut the elastic: 650 for a waist of 680, and 57 % (56.35 rounded up) to pass 960', () => expect(sizePlan({ waist: 680, hip: 960 }, withEase({ waist: 350, hip: 100 }), skirt).opening?.text).toMatch(/\{mm:650\}.*57 %/))
})

describe('the ease that results', () => {
  it('calls 80 mm at the bust of a dress fitted', () => expect(zone(sizePlan({ bust: 920 }, withEase({ bust: 80 }), { kind: 'dress' }), 'bust')).toMatchObject({ easeMm: 80, band: 'fitted', reads: 'as drafted', warnings: [] }))
  it('warns of 30 mm at the hip of a skirt unless it stretches', () => {
    expect(zone(sizePlan({ hip: 960 }, withEase({ hip: 30 }), { kind: 'skirt' }), 'hip')).toMatchObject({ easeMm: 30, band: 'below-fitted', warnings: [expect.stringMatching(/\{mm:30\} of ease; \{mm:50\} is the least.*pattern itself means \{mm:30\}/)] })
    expect(zone(sizePlan({ hip: 960 }, withEase({ hip: 30 }), { kind: 'skirt', features: ['knit'] }, { stretchPercent: 30 }), 'hip').warnings).toEqual([])
  })
  it('reads what the wearer gets against what the pattern means', () => {
    const plan = sizePlan({ bust: 970, waist: 795, hip: 1060, 'back-waist-length': 402 }, top, { kind: 'bodice' })
    expect(plan.zones.map(({ code, easeMm, designEaseMm, reads }) => [code, easeMm, designEaseMm, reads])).toEqual([['bust', 50, 60, '{mm:10} under'], ['waist', 65, 80, '{mm:15} under'], ['hip', 60, 60, 'as drafted']])
    expect(plan.label).toBe('14→16 from waist to hip')
    expect(plan.reason).toMatch(/^Nearest at bust and waist, exact at the hip\./)
    expect(plan.reason).toMatch(/Bust and waist come out a little closer than the pattern means/)
  })
  it('knows the difference from the design without finished measures, and says that the ease cannot be told', () => {
    const plan = sizePlan({ hip: 1010, waist: 760 }, en, { kind: 'skirt' })
    expect(zone(plan, 'hip')).toMatchObject({ easeMm: null, band: null, againstDesignMm: -10, reads: '{mm:10} under' })
    expect(plan.warnings.join(' ')).toMatch(/no finished measurements/)
  })
  it('warns where a skirt that does not stretch is too small to sit in (common practice)', () => {
    const body = { hip: 960, 'hip-seated': 1035 }
    expect(zone(sizePlan(body, withEase({ hip: 60 }), { kind: 'skirt' }), 'hip').warnings).toEqual([expect.stringMatching(/\{mm:15\} short in sitting/)])
    expect(zone(sizePlan(body, withEase({ hip: 80 }), { kind: 'skirt' }), 'hip').warnings).toEqual([])
  })
  it('refuses a knit smaller than its stretch can span, and warns from half of that', () => {
    const chart = (finished: number) => [{ label: 'M', body: { bust: 914.4 }, finished: { bust: finished } }]
    const knit = { kind: 'bodice', features: ['knit'] } as const
    const warn = (finished: number) => zone(sizePlan({ bust: 914.4 }, chart(finished), knit, { stretchPercent: 50 }), 'bust').warnings.join(' ')
    expect(warn(600)).toMatch(/at the very most/)
    expect(warn(700)).toMatch(/more than half/)
    expect(warn(800)).toBe('')
  })
})

describe('the maker’s own choice', () => {
  const body = { bust: 970, waist: 795, hip: 1060 }
  it('stands, keeps the recommendation beside it, and moves ease, blend and label', () => {
    const plan = sizePlan(body, top, { kind: 'bodice' }, { choices: { bust: '16', waist: '16' } })
    expect(zone(plan, 'bust')).toMatchObject({ size: '16', chosen: true, easeMm: 90, recommended: { size: '14' } })
    expect(plan).toMatchObject({ label: '16', blends: [] })
    expect(plan.reason).toMatch(/your own choice at bust and waist/)
  })
  it('that left the chart is said, and the recommendation stands in', () => expect(zone(sizePlan(body, top, { kind: 'bodice' }, { choices: { bust: '22' } }), 'bust')).toMatchObject({ size: '14', chosen: false, warnings: [expect.stringMatching(/Size 22 was chosen.*no longer in the chart/)] }))
  it('is what the rules module takes as drafted', () => expect(sizePlan(body, top, { kind: 'bodice' }).pattern).toEqual({ body: { bust: 960, waist: 780, hip: 1060, 'back-waist-length': 412 }, finished: { bust: 1020, waist: 860, hip: 1120 } }))
})

describe('off the chart (limits ours)', () => {
  const hip = (mm: number) => sizePlan({ hip: mm, waist: 1120 }, en, { kind: 'skirt' })
  it('shifts the outermost line up to one grade', () => expect(zone(hip(1350), 'hip')).toMatchObject({ size: '128', t: null, offChart: { side: 'above', byMm: 30, verdict: 'shift', text: expect.stringMatching(/\{mm:30\} outside/) } }))
  it('asks for a check beyond one grade and refuses beyond two', () => {
    expect(zone(hip(1370), 'hip').offChart?.verdict).toBe('shift')
    expect(zone(hip(1371), 'hip').offChart?.verdict).toBe('check')
    expect(hip(1420).refused).toBe(false)
    expect(hip(1421)).toMatchObject({ refused: true })
  })
  it('works below the smallest size too', () => expect(zone(sizePlan({ hip: 820, waist: 600 }, en, { kind: 'skirt' }), 'hip').offChart).toMatchObject({ side: 'below', byMm: 20, grades: 0.5 }))
})

describe('lengths', () => {
  const back = (mm: number) => sizePlan({ bust: 960, 'back-waist-length': mm }, top, { kind: 'bodice' }).lengths[0]!
  it('are shortened or lengthened against the size that is cut', () => {
    expect(back(402)).toMatchObject({ amountMm: -10, size: '14', leave: false, text: expect.stringMatching(/\{mm:10\} shorter than size 14\. Fold it out/) })
    expect(back(422)).toMatchObject({ amountMm: 10, text: expect.stringMatching(/longer.*Spread/) })
  })
  it('are left under 5 mm', () => expect(back(409)).toMatchObject({ leave: true }))
  // Rise ease by hip: New Mexico State University Extension, Guide C-209.
  it('compare a rise given only finished with the body and its ease', () => {
    const chart = [{ label: '12', body: { hip: inches(37), waist: 720 }, finished: { 'crotch-depth': 300 } }]
    expect(sizePlan({ hip: inches(37), waist: 720, 'crotch-depth': 270 }, chart, { kind: 'trousers' }).lengths).toMatchObject([{ code: 'crotch-depth', amountMm: expect.closeTo(270 + inches(0.75) - 300, 6) }])
  })
})

it('takes a child’s lengths by height, and nothing by age (common practice)', () => {
  const chart = ['110', '116', '122'].map((label, i) => ({ label, body: { height: 1100 + 60 * i, chest: 580 + 20 * i } }))
  const plan = sizePlan({ height: 1215, chest: 585 }, chart, { kind: 'bodice', features: ['children'] })
  expect(plan.label).toBe('110')
  expect(plan.warnings.join(' ')).toMatch(/never by age\. By height, trace the lengths of size 122/)
})

describe('what is missing', () => {
  it('never asks a skirt for the bust, whatever chart, body and features', () => {
    fc.assert(fc.property(fc.constantFrom(...waistKinds), fc.subarray([...garmentFeatures]), fc.subarray(['waist', 'hip', 'abdomen', 'bust', 'high-bust']), (waist, features, taken) => {
      const plan = sizePlan(Object.fromEntries(taken.map((code) => [code, 900])), en, { kind: 'skirt', waist, features })
      expect(plan.missing.filter(({ code }) => /bust|chest/.test(code))).toEqual([])
      expect(plan.zones.filter(({ code }) => /bust|chest/.test(code))).toEqual([])
      expect(plan.governing?.code ?? 'hip').not.toMatch(/bust|chest/)
    }))
  })
  it('asks a bodice for the high bust, trousers for what their chart has', () => {
    expect(sizePlan({ bust: 920 }, en, { kind: 'bodice' }).missing.map(({ code }) => code)).toEqual(['waist', 'hip', 'high-bust'])
    expect(sizePlan({ hip: 1000 }, en.map((row) => ({ ...row, body: { ...row.body, 'crotch-depth': 280 } })), { kind: 'trousers' }).missing.map(({ code }) => code)).toEqual(['waist', 'crotch-depth'])
  })
  it('answers an empty chart and an empty body', () => {
    expect(sizePlan({ hip: 1000 }, [], { kind: 'skirt' })).toMatchObject({ zones: [], label: '', governing: null, warnings: [expect.stringMatching(/no size chart yet/)] })
    const plan = sizePlan({}, en, { kind: 'skirt' })
    expect(plan).toMatchObject({ governing: null, reason: '' })
    expect(plan.zones.every(({ bodyMm }) => bodyMm === null)).toBe(true)
  })
})

it('answers any body, chart and garment with sizes of the chart and sentences without holes', () => {
  const length = fc.integer({ min: 100, max: 1600 })
  const body = fc.dictionary(fc.constantFrom(...measurementTable.map(({ code }) => code)), length)
  const row = fc.record({ label: fc.string({ minLength: 1, maxLength: 4 }), body, finished: fc.option(body, { nil: undefined }) })
  const chart = fc.uniqueArray(row, { selector: ({ label }) => label, maxLength: 8 }).map((rows) => rows.map(({ finished, ...rest }) => ({ ...rest, ...(finished && { finished }) })))
  const garment = fc.record({ kind: fc.constantFrom(...garmentKinds), waist: fc.constantFrom(...waistKinds), sleeves: fc.constantFrom(...sleeveKinds), features: fc.subarray([...garmentFeatures]) })
  fc.assert(fc.property(body, chart, garment, fc.option(fc.integer({ min: 0, max: 120 }), { nil: undefined }), (measured, rows, kind, stretchPercent) => {
    const plan = sizePlan(measured, rows, kind, { ...(stretchPercent !== undefined && { stretchPercent }) })
    for (const one of plan.zones) {
      expect(rows[one.index]?.label).toBe(one.size)
      if (one.t !== null) { expect(one.t).toBeGreaterThanOrEqual(0); expect(one.t).toBeLessThanOrEqual(1) }
    }
    expect(JSON.stringify(plan)).not.toMatch(/NaN|undefined|Infinity|\{mm:-/)
    expect(fillAmounts(JSON.stringify(plan), String)).not.toMatch(/mm:/)
  }), { numRuns: 300 })
})
