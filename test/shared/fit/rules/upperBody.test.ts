/**
 * One whole fitting for every rule from the neck to the sleeve, with the whole catalogue competing: what leads, on which side, how
 * much, and that nothing else is found. `from` names the publication the sign and the kind of correction come from; amounts are the whole on
 * the body, unsigned, in mm, and their arithmetic is ours.
 */
import { describe, expect, it } from 'vitest'
import { causesByZone, type Cause } from '#shared/fit/causes.ts'
import { diagnose } from '#shared/fit/diagnose.ts'
import { type FitInput, type Garment, type Side } from '#shared/fit/types.ts'
import { causesOf, edgeAmounts, findingFor, fitting, sum } from '../../../support/fit.ts'
import { look } from '../../../support/look.ts'

type Row = { leads: Cause; from: string; garment: Garment; sees: readonly string[]; body?: FitInput['body']; pattern?: FitInput['pattern']; side?: Side; mm?: number }

const usda = 'Fitting Dresses, USDA, rev. 1946'
const cwu = 'Pattern Alterations, Central Washington University, ch. 17'
const herr = 'Home Economics Research Report 32, USDA, 1965 (lists it)'
const roberts = 'Garment Fitting, E.M. 2246, Washington State University Extension, 1962'
const usual = 'common practice'

const bodice: Garment = { kind: 'bodice', features: ['darts', 'waist-seam'] }
const sleeveless: Garment = { kind: 'dress', sleeves: 'none', features: ['darts'] }
const princess: Garment = { kind: 'dress', sleeves: 'none', features: ['princess-seams'] }
const sleeved: Garment = { kind: 'bodice', sleeves: 'set-in', features: ['darts'] }
const coat: Garment = { kind: 'coat', sleeves: 'set-in', features: ['lining', 'button-front', 'collar', 'two-piece-sleeve'] }

const neck: Row[] = [
  { leads: 'neck-tight', from: `${usda}; ${usual}`, garment: bodice, sees: ['tight@neck shift:9', 'drag-lines@neck ~radiating'], mm: 9 },
  { leads: 'neck-front-loose', from: 'L. Cutting, article on necklines, 2019; a fold of 6 on each side holds 24', garment: sleeveless, sees: ['gaping@neck fold:6'], mm: 24 },
  { leads: 'neck-back-loose', from: usual, garment: bodice, sees: ['gaping@neck back C fold:7'], mm: 14 },
]

const shoulder: Row[] = [
  { leads: 'shoulder-long', from: `${roberts}; ${usda}`, garment: sleeved, sees: ['long@shoulder shift:10', 'drops@sleeve'], mm: 10 },
  { leads: 'shoulder-long', from: `${roberts}; 138 drafted, 126 measured`, garment: sleeved, sees: ['off-place@armhole >in'], body: { shoulder: 126 }, pattern: { body: { shoulder: 138 } }, mm: 12 },
  { leads: 'shoulder-short', from: roberts, garment: sleeved, sees: ['short@shoulder shift:12', 'drag-lines@sleeve >shoulder-tip'], mm: 12 },
  { leads: 'square-shoulders', from: roberts, garment: bodice, sees: ['drag-lines@shoulder ~diagonal >shoulder-tip gap:14', 'excess@neck ~horizontal back'], mm: 14 },
  { leads: 'sloping-shoulders', from: 'Cowan, series on shoulders: the depth pinned at the tip is what comes off', garment: bodice, sees: ['drag-lines@neck ~diagonal >armhole fold:8'], mm: 8 },
  { leads: 'low-shoulder', from: 'Liechty, Pottberg and Rasband, 1986 (bodies that differ left and right)', garment: bodice, sees: ['drag-lines@shoulder ~diagonal R cloth:12'], side: 'right', mm: 12 },
  { leads: 'low-shoulder', from: usual, garment: coat, sees: ['drops@shoulder L shift:10'], side: 'left', mm: 10 },
  { leads: 'forward-shoulder', from: `${usual}: half an inch in an example`, garment: sleeved, sees: ['off-place@shoulder >front side shift:13', 'drag-lines@armhole >shoulder-tip'], mm: 13 },
]

const upperBack: Row[] = [
  { leads: 'round-back', from: 'Woman’s Institute, close-fitting patterns, section 50', garment: bodice, sees: ['rises@waist back gap:18', 'gaping@neck back', 'tight@upper-back back'], mm: 18 },
  { leads: 'flat-back', from: usda, garment: bodice, sees: ['excess@upper-back ~horizontal back C fold:6.5', 'drops@hem back'], mm: 13 },
  { leads: 'broad-back', from: 'S. Betzina, Fast Fit (broad back)', garment: sleeved, sees: ['tight@upper-back back cloth:30', 'binds@armhole back'], mm: 30 },
  { leads: 'narrow-back', from: herr, garment: sleeved, sees: ['excess@upper-back ~vertical back fold:5'], mm: 20 },
]

const bust: Row[] = [
  { leads: 'full-bust', from: 'E-372, Texas Cooperative Extension, 2006: the size by the high bust; (1020 − 920) − 50', garment: bodice, sees: ['drag-lines@bust ~diagonal >side-seam', 'rises@hem', 'gaping@armhole'], body: { bust: 1020, 'high-bust': 920 }, pattern: { body: {}, draftedCupMm: 50 }, mm: 50 },
  { leads: 'full-bust', from: 'L. Hoffmann, choosing size: bust 5 in over the chest, size drafted for 4: an inch over the front', garment: princess, sees: ['drag-lines@bust ~diagonal >side-seam', 'tight@bust'], body: { bust: 1000, 'high-bust': 873 }, pattern: { body: {}, draftedCupMm: 102 }, mm: 25 },
  { leads: 'small-bust', from: `${usual}; 50 drafted, 20 on the body`, garment: bodice, sees: ['excess@bust'], body: { bust: 880, 'high-bust': 860 }, pattern: { body: {}, draftedCupMm: 50 }, mm: 30 },
  { leads: 'bust-point-low', from: usual, garment: bodice, sees: ['off-place@bust >down =dart shift:15'], mm: 15 },
  { leads: 'bust-point-high', from: usual, garment: bodice, sees: ['off-place@bust >up =dart shift:15'], mm: 15 },
  { leads: 'bust-girth-tight', from: cwu, garment: bodice, sees: ['tight@bust cloth:32', 'tight@bust back cloth:32', 'tight@bust =side-seam'], mm: 32 },
  { leads: 'bust-girth-loose', from: cwu, garment: bodice, sees: ['excess@bust ~vertical =side-seam cloth:36', 'excess@bust ~vertical back'], mm: 36 },
]

const armhole: Row[] = [
  { leads: 'armhole-high', from: 'school text on making a dress: lower it, never narrower in front or behind', garment: sleeved, sees: ['tight@armhole shift:6'], mm: 6 },
  { leads: 'armhole-low', from: usual, garment: sleeved, sees: ['drops@armhole shift:14', 'rises@whole'], mm: 14 },
  { leads: 'front-armhole-loose', from: 'drafting course: moved into a dart that is there; a fold of 4 on each side holds 16', garment: sleeveless, sees: ['gaping@armhole fold:4'], mm: 16 },
]

const sleeve: Row[] = [
  { leads: 'full-upper-arm', from: 'sewing magazine, 2021: two inches of ease; 330 + 50 − 340', garment: sleeved, sees: ['tight@sleeve ~horizontal'], body: { 'upper-arm': 330 }, pattern: { body: {}, finished: { 'upper-arm': 340 } }, mm: 40 },
  { leads: 'thin-upper-arm', from: herr, garment: sleeved, sees: ['excess@sleeve ~vertical fold:9'], mm: 18 },
  { leads: 'sleeve-long', from: usda, garment: coat, sees: ['long@sleeve shift:22'], mm: 22 },
  { leads: 'sleeve-short', from: usda, garment: coat, sees: ['short@sleeve shift:16', 'rises@sleeve'], mm: 16 },
]

const tables = { neck, shoulder, upperBack, bust, armhole, sleeve }

describe.each(Object.entries(tables))('%s', (zone, rows) => {
  it('has a fitting for every rule', () => expect([...new Set(rows.map(({ leads }) => leads))].toSorted()).toEqual([...causesByZone[zone as keyof typeof tables]].toSorted()))
  it.each(rows)('$leads ($from)', ({ garment, sees, body = {}, pattern = { body: {} }, leads, side = 'both', mm }) => {
    const diagnosis = diagnose(fitting({ garment, body, pattern, observations: sees.map((text, i) => look(text, `o${i}`)) }))
    const [first] = diagnosis.findings
    expect(first?.cause, `found ${causesOf(diagnosis).join(', ') || 'nothing'}`).toBe(leads)
    expect(first!.side).toBe(side)
    if (mm !== undefined) expect(Math.abs(first!.change.amountMm)).toBe(mm)
    expect(causesOf(diagnosis)).toEqual([leads])
  })
})

const fit = (garment: Garment, sees: readonly string[], more: Partial<FitInput> = {}) => diagnose(fitting({ garment, observations: sees.map((text, i) => look(text, `o${i}`)), ...more }))
const changeOf = (cause: Cause, ...what: Parameters<typeof fit>) => findingFor(fit(...what), cause)
/** Piece, edge and amount of every step. */
const stepsOf = (...what: Parameters<typeof changeOf>) => changeOf(...what).change.steps.map(({ pieceRole, edge, amountMm }) => `${pieceRole}, ${edge}: ${amountMm}`)

describe('amounts on paper', () => {
  it.each(['drag-lines@shoulder ~diagonal R shift:12', 'drag-lines@shoulder ~diagonal R cloth:12', 'drag-lines@neck ~diagonal >armhole R fold:12', 'excess@shoulder R fold:12'])('one shoulder 12 lower (%s): that tip and that underarm, left and right traced apart', (sees) => { // common practice
    const { change, side } = changeOf('low-shoulder', bodice, [sees])
    expect(side).toBe('right')
    expect(change.unfold).toBe(true)
    expect(change.steps.map(({ pieceRole, edge, side: on, amountMm }) => [pieceRole, edge, on, amountMm])).toEqual([
      ['bodice-front', 'shoulder tip', 'right', -12], ['bodice-front', 'underarm', 'right', -12], ['bodice-back', 'shoulder tip', 'right', -12], ['bodice-back', 'underarm', 'right', -12],
    ])
  })
  it('a shoulder that opens 14 at the tip: 7 on the front, 7 on the back', () => // opened from the tip: E.M. 2246
    expect(edgeAmounts(changeOf('square-shoulders', bodice, ['drag-lines@shoulder ~diagonal >shoulder-tip gap:14'])).map(Math.abs)).toEqual([7, 7, 7, 7]))
  it('a fold pinned 8 deep along both shoulders: 8 off the front and 8 off the back, to nothing at the neck', () => { // Cowan
    const { change } = changeOf('sloping-shoulders', bodice, ['drag-lines@neck ~diagonal >armhole fold:8'])
    expect(change.steps.map(({ pieceRole, amountMm, taper }) => [pieceRole, amountMm, taper])).toEqual([['bodice-front', -8, 'to nothing at the neck'], ['bodice-back', -8, 'to nothing at the neck']])
    expect(change.steps.every(({ text }) => text.includes('underarm'))).toBe(true)
  })
  it('a seam 9 behind the bone: front tip down, back tip up, cap notch forward, each 9', () => { // common practice
    expect(stepsOf('forward-shoulder', sleeved, ['off-place@shoulder >front side shift:9'])).toEqual(['bodice-front, shoulder tip: -9', 'bodice-back, shoulder tip: 9', 'sleeve, cap notch: 9'])
    expect(stepsOf('forward-shoulder', sleeveless, ['off-place@shoulder >front side shift:9'])).toEqual(['bodice-front, shoulder tip: -9', 'bodice-back, shoulder tip: 9'])
  })
  it('a back 30 short across: 15 on each half-back and nothing in front', () => // Betzina, Fast Fit
    expect(changeOf('broad-back', sleeved, ['tight@upper-back back cloth:30']).change.steps).toMatchObject([{ pieceRole: 'bodice-back', edges: 2, amountMm: 15 }]))
  it('a neckline with a fold of 6 on each side: 24 in all, 12 from each half-front', () => // L. Cutting, 2019
    expect(edgeAmounts(changeOf('neck-front-loose', sleeveless, ['gaping@neck fold:6'])).map(Math.abs)).toEqual([12, 12]))
  it('a bust an inch over the drafted cup: half an inch on each half-front', () => { // L. Hoffmann, choosing size
    const { change } = changeOf('full-bust', bodice, ['drag-lines@bust >side-seam'], { unit: 'inch', body: { bust: 36 * 25.4, 'high-bust': 31 * 25.4 }, pattern: { body: {}, draftedCupMm: 4 * 25.4 } })
    expect(change.steps[0]).toMatchObject({ pieceRole: 'bodice-front', edges: 2 })
    expect(change.steps[0]!.amountMm).toBeCloseTo(12.7, 5)
  })
  it('princess seams take the same whole, most of it on the side front; a dartless front takes it at the bust', () => { // articles, common practice: 7/8 in on the side front, 1/2 in on the front
    const sees = ['drag-lines@bust >side-seam', 'rises@hem']
    const measured = { body: { bust: 1000, 'high-bust': 880 }, pattern: { body: {}, draftedCupMm: 50 } }
    const finding = changeOf('full-bust', princess, sees, measured)
    const moved = finding.change.steps.filter(({ amountMm }) => amountMm !== 0)
    expect(sum(edgeAmounts(finding))).toBe(70)
    const on = (role: string) => sum(moved.filter(({ pieceRole }) => pieceRole === role).map(({ amountMm, edges }) => amountMm * edges))
    expect([on('side-front'), on('bodice-front')]).toEqual([45, 25])
    expect(edgeAmounts(changeOf('full-bust', { kind: 'shirt', features: ['dartless'] }, sees, measured)).filter(Boolean)).toEqual([35, 35])
    expect(edgeAmounts(changeOf('full-bust', bodice, sees, measured)).filter(Boolean)).toEqual([35, 35])
  })
  it('a princess front that is spare over the bust is flattened on the side front', () =>
    expect(changeOf('small-bust', princess, ['excess@bust fold:6']).change.steps).toMatchObject([{ pieceRole: 'side-front', amountMm: -6 }]))
  it('a girth 32 short at bust level: 8 on each of four edges, and the sleeve follows', () => { // small additions divided by the seams: CWU, ch. 17
    const finding = changeOf('bust-girth-tight', sleeved, ['tight@bust back cloth:32', 'tight@bust =side-seam'])
    expect(edgeAmounts(finding)).toEqual([8, 8, 8, 8])
    expect(finding.change.companions.map(({ pieceRole }) => pieceRole)).toContain('sleeve')
  })
  it('a girth 33 too wide loses nothing in the sharing', () => expect(sum(edgeAmounts(changeOf('bust-girth-loose', bodice, ['excess@bust ~vertical =side-seam cloth:33'])))).toBe(-33))
  it('a sleeve 40 short of arm and ease takes the 40 whole', () => // two inches of ease at the biceps: sewing magazine, 2021
    expect(stepsOf('full-upper-arm', sleeved, ['tight@sleeve cloth:40'])).toEqual(['sleeve, biceps line: 40']))
  it('one sleeve that is short stays one sleeve', () => {
    const { side, change } = changeOf('sleeve-short', sleeved, ['short@sleeve L shift:14'])
    expect(side).toBe('left')
    expect(change.steps).toMatchObject([{ pieceRole: 'sleeve', side: 'left', amountMm: 14 }])
  })
  it('an underarm that goes down or up takes body and sleeve along', () => { // school text on making a dress
    expect(stepsOf('armhole-high', sleeved, ['tight@armhole shift:6'])).toEqual(['bodice-front, underarm: -6', 'bodice-back, underarm: -6', 'sleeve, underarm: -6'])
    expect(stepsOf('armhole-low', sleeved, ['drops@armhole shift:14'])).toEqual(['bodice-front, underarm: 14', 'bodice-back, underarm: 14', 'sleeve, underarm: 14'])
  })
  it('a fold across the upper back comes out at the centre, to nothing at the armhole', () => // Fitting Dresses, USDA
    expect(changeOf('flat-back', bodice, ['excess@upper-back ~horizontal back C fold:6']).change.steps).toMatchObject([{ pieceRole: 'bodice-back', amountMm: -12, taper: 'to nothing at the armhole' }]))
})

describe('neighbours are told apart', () => {
  it.each([
    ['into both armholes', ['drag-lines@shoulder ~diagonal >armhole'], 'sloping-shoulders'],
    ['into one armhole', ['drag-lines@shoulder ~diagonal >armhole L'], 'low-shoulder'],
    ['to the tips', ['drag-lines@shoulder ~diagonal >shoulder-tip'], 'square-shoulders'],
  ] as const)('lines at the shoulder: %s', (_, sees, leads) => expect(causesOf(fit(bodice, sees))).toEqual([leads]))
  it.each([
    ['across', ['excess@upper-back ~horizontal back'], 'flat-back'],
    ['upright', ['excess@upper-back ~vertical back'], 'narrow-back'],
  ] as const)('folds in the upper back: %s', (_, sees, leads) => expect(causesOf(fit(bodice, sees))).toEqual([leads]))
  it.each([
    ['the back rides up', ['tight@upper-back back', 'rises@hem back'], 'round-back'],
    ['it binds on reaching', ['tight@upper-back back', 'binds@upper-back back'], 'broad-back'],
  ] as const)('a back that strains: %s', (_, sees, leads) => expect(causesOf(fit(sleeved, sees))).toEqual([leads]))
  it.each([
    ['alone', ['gaping@armhole'], 'front-armhole-loose'],
    ['with lines at the bust and a hem that rises', ['gaping@armhole', 'drag-lines@bust >side-seam', 'rises@hem'], 'full-bust'],
  ] as const)('an armhole edge that stands off: %s', (_, sees, leads) => expect(causesOf(fit(sleeveless, sees))).toEqual([leads]))
  it.each([
    ['slash across opens', 'round-back~broad-back', 'yes', ['tight@upper-back back'], 'round-back'],
    ['slash across stays shut', 'round-back~broad-back', 'no', ['tight@upper-back back'], 'broad-back'],
    ['a gap at the released back armhole', 'broad-back~full-upper-arm', 'yes', ['binds@armhole back', 'binds@sleeve back'], 'broad-back'],
    ['a hem that hangs level', 'neck-back-loose~round-back', 'yes', ['gaping@neck back'], 'neck-back-loose'],
    ['a hem that rises', 'neck-back-loose~round-back', 'no', ['gaping@neck back'], 'round-back'],
  ] as const)('a check turns the leading cause: %s', (_, check, answer, sees, leads) => expect(fit(sleeved, sees, { answers: { [check]: answer } }).findings[0]?.cause).toBe(leads))
  it('a garment without sleeves is given no change on a sleeve', () => {
    expect(causesOf(fit(sleeveless, ['tight@sleeve']))).not.toContain('full-upper-arm')
  })
})

describe('a change that went too far is taken back, not answered with its opposite', () => {
  it.each([
    ['full-upper-arm', 20, 'excess@sleeve ~vertical fold:3', -6],
    ['armhole-high', -12, 'drops@armhole shift:5', 5],
    ['broad-back', 24, 'excess@upper-back ~vertical back cloth:6', -12],
  ] as const)('%s', (cause, amountMm, sees, backMm) => {
    const { findings } = fit(sleeved, [sees], { ledger: [{ cause, amountMm, side: 'both', readings: [] }] })
    expect(findings.map((finding) => finding.cause)).toEqual([cause])
    expect(findings[0]!.change.amountMm).toBe(backMm)
  })
})
