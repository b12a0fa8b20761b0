import { garmentFeatures, garmentKinds, type GarmentFeature, sleeveKinds, waistKinds } from '#shared/fit/types.ts'
import { allReady, isReady, missingMarks, missingSentence } from '#shared/tracing/missingMarks.ts'
import { clothPieces, openedWidth } from '#shared/tracing/openedWidth.ts'
import { pairedNotches } from '#shared/tracing/pairedNotches.ts'
import { pieceTemplates, startMarks } from '#shared/tracing/pieceTemplates.ts'
import { seamsAmong } from '#shared/tracing/seamPartners.ts'
import { marksFor, tracingMarkKinds, tracingMarkTable, type TracedPiece } from '#shared/tracing/tracingMarks.ts'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

const front: TracedPiece = { role: 'skirt-front', view: 'A', cutCount: 1, onFold: true, notchCount: 2, dartCount: 2, marks: {} }
const traced = (piece: TracedPiece, ...without: string[]): TracedPiece => ({ ...piece, marks: Object.fromEntries(marksFor(piece).filter((mark) => !without.includes(mark)).map((mark) => [mark, 'marked'])) })

describe('a tracing', () => {
  it('is ready with all its marks', () => expect(isReady(traced(front))).toBe(true))
  // A tracing without one of these cuts a wrong piece; common practice.
  it.each(['fold', 'grainline', 'notches', 'view', 'size'])('is not ready without its %s', (mark) => {
    const piece = traced(front, mark)
    expect(missingMarks(piece)).toEqual([mark])
    expect(isReady(piece)).toBe(false)
  })
  it('is not asked for marks that do not apply', () => {
    const band: TracedPiece = { role: 'waistband', view: 'A', cutCount: 1, onFold: false, notchCount: 0, dartCount: 0, marks: { fold: 'missing' } }
    expect(marksFor(band)).not.toEqual(expect.arrayContaining(['fold']))
    for (const mark of ['notches', 'darts', 'hip-line', 'bust-point', 'zip-place'] as const) expect(marksFor(band)).not.toContain(mark)
  })
  it('asks for darts and notches until they are counted as none', () => {
    expect(marksFor({ ...front, dartCount: null, notchCount: null })).toEqual(expect.arrayContaining(['darts', 'notches']))
    expect(marksFor({ ...front, dartCount: 0, notchCount: 0 })).not.toContain('darts')
  })
  it('takes "not needed" for a lengthen line, never for a grainline, a fold or counted notches', () => {
    const waived = (mark: string) => missingMarks({ ...traced(front, mark), marks: { ...traced(front, mark).marks, [mark]: 'not-needed' } })
    expect(waived('lengthen-line')).toEqual([])
    for (const mark of ['grainline', 'fold', 'notches', 'darts', 'size']) expect(waived(mark)).toEqual([mark])
  })
  it('asks for marks the template lists beyond the usual', () => expect(missingMarks({ ...traced(front), marks: { ...traced(front).marks, 'pocket-place': 'missing' } })).toEqual(['pocket-place']))
  it('says in one sentence what is missing', () => {
    expect(missingSentence(traced(front, 'grainline', 'notches', 'fold'))).toBe('Missing: the fold, the grainline and the notches.')
    expect(missingSentence(traced(front))).toBe('')
  })
  it('list is not ready when it is empty or one piece lacks a mark', () => {
    expect(allReady([])).toBe(false)
    expect(allReady([traced(front), traced(front, 'size')])).toBe(false)
    expect(allReady([traced(front)])).toBe(true)
  })
  it('knows words for every mark', () => { for (const mark of tracingMarkKinds) expect(tracingMarkTable[mark].how).toMatch(/\.$/) })
})

describe('pieces on the fold', () => {
  it('open to twice the paper', () => {
    expect(openedWidth(255, true)).toBe(510)
    expect(openedWidth(255, false)).toBe(255)
    fc.assert(fc.property(fc.double({ min: 0, max: 3000, noNaN: true }), (half) => { expect(openedWidth(half, true)).toBe(half + half) }))
  })
  it('count as one piece of cloth each', () => expect(clothPieces([{ cutCount: 1 }, { cutCount: 2 }])).toBe(3))
})

describe('paired notches', () => {
  it('meet where they lie at the same distance on both edges', () => expect(pairedNotches([120, 250], [250.5, 120])).toMatchObject({ meets: true, text: '' }))
  it('do not meet where one is off, and say which and how far', () => expect(pairedNotches([120, 250], [120, 256])).toMatchObject({ meets: false, text: 'Notch 2 is {mm:6} off its partner. Walk the seam again, or move one of them.' }))
  it('need a partner each', () => expect(pairedNotches([120], [120, 250])).toMatchObject({ meets: false, alone: { a: [], b: [250] }, text: expect.stringMatching(/1 notch, the other 2/) }))
  it('may drift by the ease of a sleeve cap, and only forwards', () => {
    expect(pairedNotches([100, 200], [110, 230], 35).meets).toBe(true)
    expect(pairedNotches([100, 200], [110, 230], 20).meets).toBe(false)
    expect(pairedNotches([100, 200], [90, 200], 35).meets).toBe(false)
  })
  it('meet on any two edges walked alike', () => {
    fc.assert(fc.property(fc.array(fc.integer({ min: 0, max: 1000 }), { maxLength: 6 }), (at) => { expect(pairedNotches(at, at.toReversed()).meets).toBe(true) }))
  })
})

describe('templates', () => {
  const roles = (garment: Parameters<typeof pieceTemplates>[0]) => pieceTemplates(garment).map(({ role }) => role)
  it('give a pull-on skirt a casing and no darts, a fitted one a waistband and the end of its zip', () => {
    expect(roles({ kind: 'skirt', waist: 'elastic' })).toEqual(['skirt-front', 'skirt-back', 'casing'])
    expect(pieceTemplates({ kind: 'skirt', waist: 'elastic' }).every(({ dartCount }) => dartCount === 0)).toBe(true)
    const fitted = pieceTemplates({ kind: 'skirt', waist: 'fitted' })
    expect(fitted.map(({ role }) => role)).toContain('waistband')
    expect(fitted.find(({ role }) => role === 'skirt-back')).toMatchObject({ cutCount: 2, onFold: false, extraMarks: ['zip-place'] })
  })
  it('give a sleeved shirt its yoke, sleeves, cuffs, collar and stand', () => expect(roles({ kind: 'shirt', sleeves: 'set-in', features: ['collar'] })).toEqual(['bodice-front', 'bodice-back', 'yoke', 'sleeve', 'cuff', 'collar', 'collar-stand']))
  it('give a sleeveless top armhole facings', () => expect(roles({ kind: 'bodice', sleeves: 'none' })).toContain('armhole-facing'))
  it('are usable for every garment: pieces, none ready untouched, seams that belong together', () => {
    fc.assert(fc.property(fc.constantFrom(...garmentKinds), fc.constantFrom(...waistKinds), fc.constantFrom(...sleeveKinds), fc.subarray<GarmentFeature>([...garmentFeatures]), (kind, waist, sleeves, features) => {
      const pieces = pieceTemplates({ kind, waist, sleeves, features })
      expect(pieces.length).toBeGreaterThanOrEqual(3)
      for (const template of pieces) {
        expect(template.cutCount).toBeGreaterThanOrEqual(1)
        const piece: TracedPiece = { ...template, view: '', marks: startMarks(template) }
        expect(missingMarks(piece)).toEqual(expect.arrayContaining(['name', 'view', 'size', 'grainline', ...template.extraMarks]))
      }
      expect(seamsAmong(pieces.map(({ role }) => role)).length).toBeGreaterThan(0)
    }))
  })
})
