/**
 * One whole fitting for every rule from the waist down, with the whole catalogue competing: what leads, on which side, how much, and
 * what else is found. `from` names the publication the sign and the kind of correction come from; amounts are the whole on the body,
 * unsigned, in mm, and their arithmetic is ours.
 */
import { describe, expect, it } from 'vitest'
import { causesByZone, type Cause } from '#shared/fit/causes.ts'
import { diagnose } from '#shared/fit/diagnose.ts'
import { type FitInput, type Garment, type Side } from '#shared/fit/types.ts'
import { causesOf, fitting } from '../../../support/fit.ts'
import { look } from '../../../support/look.ts'

type Row = { leads: Cause; from: string; garment: Garment; sees: readonly string[]; body?: FitInput['body']; pattern?: FitInput['pattern']; answers?: FitInput['answers']; side?: Side; mm?: number; also?: readonly Cause[] }

const usda = 'Fitting Dresses, USDA, rev. 1946'
const cwu = 'Pattern Alterations, Central Washington University, ch. 17'
const hertzer = 'Hertzer, Garment Cutting in the Twentieth Century'
const thickett = 'Thickett, ch. XXII of The Modern Tailor, Outfitter and Clothier'
const usual = 'common practice'

const skirt: Garment = { kind: 'skirt', waist: 'fitted', features: ['darts', 'waistband', 'straight'] }
const trousers: Garment = { kind: 'trousers', waist: 'fitted', features: ['darts', 'waistband', 'fly'] }
const bodice: Garment = { kind: 'bodice', features: ['darts', 'waist-seam'] }
const dress: Garment = { kind: 'dress', features: ['darts'] }
const coat: Garment = { kind: 'coat', sleeves: 'set-in', features: ['lining', 'button-front', 'collar', 'vent'] }
const gathered: Garment = { kind: 'skirt', waist: 'fitted', features: ['gathered', 'waistband'] }
const pullOn: Garment = { kind: 'skirt', waist: 'elastic' }
const pullOnTrousers: Garment = { kind: 'trousers', waist: 'elastic' }
const elasticDress: Garment = { kind: 'dress', waist: 'elastic', features: ['gathered'] }

const waist: Row[] = [
  { leads: 'bodice-short', from: `${cwu}; Guide C-228, New Mexico State University`, garment: bodice, sees: ['short@waist shift:20'], mm: 20 },
  { leads: 'bodice-long', from: `${cwu} (the tuck is half as deep)`, garment: bodice, sees: ['excess@waist ~horizontal fold:10', 'excess@waist ~horizontal back fold:10'], mm: 20 },
  { leads: 'hollow-back', from: usual, garment: dress, sees: ['excess@waist ~horizontal =centre-back back C fold:8'], mm: 16 },
  { leads: 'waist-front-low', from: usda, garment: skirt, sees: ['drops@waist C shift:10'], mm: 10 },
  { leads: 'waist-front-high', from: usda, garment: skirt, sees: ['rises@waist C shift:10'], mm: 10 },
  { leads: 'waist-tight', from: `${cwu}; school handbook: one inch larger, one inch in all`, garment: skirt, sees: ['tight@waist cloth:25'], mm: 25 },
  { leads: 'waist-loose', from: usda, garment: skirt, sees: ['excess@waist ~vertical fold:6', 'gaping@waist'], mm: 12 },
  { leads: 'skirt-slips', from: usda, garment: skirt, sees: ['drops@waist side', 'excess@hip ~vertical', 'drops@hem'] },
  { leads: 'midriff-tight', from: usual, garment: bodice, sees: ['tight@midriff cloth:16'], mm: 16 },
  { leads: 'waist-back-loose', from: usual, garment: trousers, sees: ['gaping@waist =centre-back back C fold:10'], mm: 20 },
  { leads: 'waistband-top-loose', from: usual, garment: skirt, sees: ['gaping@waist =waistband fold:6'], mm: 12 },
  { leads: 'waist-shape-high', from: usual, garment: { kind: 'dress' }, sees: ['off-place@waist >down shift:15', 'tight@midriff'] },
  { leads: 'waist-shape-low', from: usual, garment: { kind: 'dress' }, sees: ['off-place@waist >up shift:15', 'excess@midriff ~horizontal'], mm: 15 },
]

const abdomen: Row[] = [
  { leads: 'full-abdomen-skirt', from: usual, garment: skirt, sees: ['drag-lines@abdomen >side-seam', 'rises@hem =centre-front C gap:15', 'swings@hem >front =side-seam side'], mm: 15 },
  { leads: 'full-abdomen-trousers', from: usual, garment: trousers, sees: ['tight@abdomen gap:14', 'drops@waist C', 'gaping@hip'], mm: 14 },
  { leads: 'flat-abdomen', from: usual, garment: skirt, sees: ['excess@abdomen ~vertical fold:7'], mm: 14 },
  { leads: 'large-waist-jacket', from: `${hertzer}, screens 14 and 87`, garment: coat, sees: ['tight@waist cloth:24', 'swings@hem =centre-front'], mm: 24 },
  { leads: 'full-abdomen-bodice', from: usual, garment: bodice, sees: ['rises@waist C shift:12', 'tight@waist'], mm: 12 },
  { leads: 'full-abdomen-gathers', from: usual, garment: gathered, sees: ['rises@hem C shift:15', 'gaping@hem C'], mm: 15 },
]

const hip: Row[] = [
  { leads: 'hip-tight', from: `${usda}; ${cwu}`, garment: skirt, sees: ['tight@hip =side-seam cloth:40', 'excess@waist ~horizontal', 'rises@whole'], mm: 40 },
  { leads: 'hip-loose', from: usda, garment: skirt, sees: ['excess@hip ~vertical cloth:24'], mm: 24 },
  { leads: 'hip-high-one-side', from: 'Montana State College Bulletin 265, Home Economics Research Report 32 (both list it)', garment: skirt, sees: ['rises@hem =side-seam L', 'excess@waist ~diagonal L'], side: 'left' },
  { leads: 'hip-high-one-side', from: usual, garment: skirt, sees: ['rises@hem R'], body: { 'waist-to-hip-left': 205, 'waist-to-hip-right': 217 }, side: 'right', mm: 12 },
  { leads: 'hip-full-one-side', from: usual, garment: skirt, sees: ['tight@hip L cloth:16'], side: 'left', mm: 16 },
  { leads: 'hip-square', from: usual, garment: skirt, sees: ['excess@waist =side-seam ~horizontal', 'gaping@hip =side-seam'], body: { abdomen: 916 }, pattern: { body: { abdomen: 900 } }, mm: 16 },
  { leads: 'hip-low', from: usual, garment: skirt, sees: ['tight@thigh =side-seam cloth:20', 'excess@hip =side-seam'], mm: 20 },
  { leads: 'hip-dart-point', from: usual, garment: skirt, sees: ['off-place@hip =dart shift:20'], mm: 20 },
  { leads: 'side-seam-sewn', from: usda, garment: skirt, sees: ['swings@hip =side-seam L'], side: 'left' },
  { leads: 'hem-narrow', from: usual, garment: skirt, sees: ['binds@hem cloth:80'], mm: 80 },
  { leads: 'pleats-spread', from: usda, garment: { kind: 'skirt', waist: 'fitted', features: ['pleats'] }, sees: ['gaping@hem gap:24', 'tight@hip'], mm: 24 },
  { leads: 'jacket-hip-tight', from: usual, garment: coat, sees: ['gaping@seat back gap:28', 'tight@hip back'], mm: 28 },
]

const seat: Row[] = [
  { leads: 'full-seat-skirt', from: usual, garment: skirt, sees: ['rises@hem =centre-back back C', 'tight@seat back gap:18', 'swings@hem >back =side-seam side'], mm: 18 },
  { leads: 'flat-seat-skirt', from: usual, garment: skirt, sees: ['drops@hem =centre-back back C', 'excess@seat ~horizontal back C fold:8', 'swings@hem >front =side-seam side'], mm: 16 },
  { leads: 'hollow-back-skirt', from: `${usda} (top trimmed at the centre back)`, garment: skirt, sees: ['excess@waist ~horizontal =centre-back back C fold:8'], mm: 16 },
]

const crotch: Row[] = [
  { leads: 'rise-short', from: 'Guide C-209, New Mexico State University', garment: trousers, sees: ['short@crotch cloth:20', 'tight@crotch'], mm: 20 },
  { leads: 'rise-long', from: usual, garment: trousers, sees: ['drops@crotch shift:16', 'excess@crotch ~horizontal'] },
  { leads: 'back-crotch-short', from: `${hertzer}, screen 21; Loftin, Altering the crotch pattern, 2009`, garment: trousers, sees: ['drops@waist =centre-back back C', 'short@crotch =back back cloth:24', 'swings@leg >back =side-seam side'], mm: 24 },
  { leads: 'full-seat-trousers', from: usual, garment: trousers, sees: ['tight@seat back gap:18', 'drag-lines@seat >side-seam back'], mm: 18 },
  { leads: 'flat-seat-trousers', from: usual, garment: trousers, sees: ['excess@seat ~horizontal back fold:8', 'swings@leg >front =side-seam side'], mm: 16 },
  { leads: 'front-crotch-short', from: usual, garment: trousers, sees: ['drag-lines@crotch >hip cloth:6'], mm: 6 },
  { leads: 'front-crotch-long', from: usual, garment: trousers, sees: ['drag-lines@crotch >thigh', 'excess@thigh fold:3'], mm: 6 },
  { leads: 'front-crotch-curve', from: usual, garment: trousers, sees: ['excess@crotch ~vertical', 'binds@crotch'] },
  { leads: 'seat-angle-large', from: `${thickett}, diagram 53 § 2`, garment: trousers, sees: ['excess@seat ~diagonal back'], answers: { 'flat-seat-trousers~seat-angle-large': 'yes' } },
  { leads: 'fly-recedes', from: `${thickett}, § 1`, garment: trousers, sees: ['excess@abdomen ~horizontal', 'binds@waist'] },
  { leads: 'seat-seam-short', from: `${thickett}, § 4`, garment: trousers, sees: ['excess@seat ~vertical =crotch back', 'binds@knee'] },
  { leads: 'front-waist-wide', from: `${hertzer}, screen 19`, garment: trousers, sees: ['swings@waist >back side', 'excess@whole back'] },
  { leads: 'front-waist-tilt', from: usual, garment: trousers, sees: ['rises@waist C shift:10', 'binds@waist'], mm: 10 },
  { leads: 'legs-crawl', from: `${hertzer}, screens 19 and 21`, garment: trousers, sees: ['rises@leg', 'binds@seat side'] },
]

const leg: Row[] = [
  { leads: 'thigh-inner-tight', from: 'Loftin, Altering the crotch pattern, 2009', garment: trousers, sees: ['tight@thigh =inseam back cloth:16'], mm: 32 },
  { leads: 'thigh-front-tight', from: usual, garment: trousers, sees: ['tight@thigh ~horizontal cloth:10', 'gaping@hip'], mm: 20 },
  { leads: 'thigh-loose', from: usual, garment: trousers, sees: ['excess@thigh ~vertical back fold:6'], mm: 24 },
  { leads: 'calf-tight', from: usual, garment: trousers, sees: ['excess@knee ~horizontal back', 'tight@leg back cloth:16'], mm: 32 },
  { leads: 'knee-inward', from: `${hertzer}, screen 11`, garment: trousers, sees: ['tight@knee =inseam', 'swings@leg >out shift:10'], mm: 10 },
  { leads: 'knee-outward', from: `${hertzer}, screen 11`, garment: trousers, sees: ['tight@knee =side-seam', 'swings@leg >in shift:10'], mm: 10 },
  { leads: 'leg-open', from: `${hertzer}, screens 20 and 21 (five eighths of an inch at the bottom); ${thickett}, § 3`, garment: trousers, sees: ['drag-lines@leg =inseam >front', 'excess@thigh =inseam'], mm: 16 },
  { leads: 'leg-twist', from: usual, garment: trousers, sees: ['swings@knee =inseam L'], side: 'left' },
  { leads: 'leg-wide', from: 'Howland, column on tapering trousers', garment: trousers, sees: ['excess@leg cloth:40', 'excess@hem'], mm: 80 },
  { leads: 'knee-loose', from: `${hertzer}, screen 11 and the chapter on tight pants`, garment: trousers, sees: ['excess@knee ~vertical =side-seam cloth:18'], mm: 15 },
]

const hem: Row[] = [
  { leads: 'hem-short', from: cwu, garment: skirt, sees: ['short@hem cloth:30'], mm: 30 },
  { leads: 'hem-long', from: cwu, garment: dress, sees: ['long@hem cloth:25'], mm: 25 },
  { leads: 'hem-uneven', from: usda, garment: skirt, sees: ['off-place@hem'] },
  { leads: 'hem-bias-drop', from: usual, garment: { kind: 'skirt', waist: 'fitted', features: ['bias', 'flared'] }, sees: ['drops@hem =side-seam shift:12'], mm: 12 },
  { leads: 'side-seam-forward', from: usda, garment: skirt, sees: ['swings@hem >front =side-seam side shift:10'], side: 'both', mm: 10 },
  { leads: 'side-seam-back', from: usda, garment: skirt, sees: ['swings@hem >back =side-seam side shift:10'], side: 'both', mm: 10 },
  { leads: 'grain-off-level', from: `${usda}; Garment Fitting, E.M. 2246, Washington State University, 1962`, garment: skirt, sees: ['drops@hip L shift:8'], side: 'left', mm: 8 },
  { leads: 'balance-back-short', from: `${thickett}; ${hertzer}, screen 89`, garment: coat, sees: ['swings@hem =centre-front >in', 'gaping@neck =collar back'] },
  { leads: 'balance-back-long', from: `${hertzer}, screens 89 to 92`, garment: coat, sees: ['swings@hem =centre-front >out', 'excess@waist ~horizontal back fold:5'], mm: 10 },
  { leads: 'hem-corner', from: usual, garment: skirt, sees: ['gaping@hem =side-seam', 'drops@hem =side-seam shift:6'], mm: 6 },
]

const elastic: Row[] = [
  { leads: 'pull-on-narrow', from: usual, garment: pullOn, sees: ['binds@waist gap:40'], mm: 40 },
  { leads: 'pull-on-narrow', from: 'common practice: hip 1040 and an inch of ease, less an edge of 1000', garment: pullOn, sees: [], body: { hip: 1040 }, pattern: { body: {}, finished: { waist: 1000 } }, mm: 65 },
  { leads: 'elastic-short', from: usual, garment: pullOn, sees: ['tight@waist cloth:25'], mm: 25 },
  { leads: 'elastic-long', from: usual, garment: pullOn, sees: ['drops@waist =waistband', 'gaping@waist gap:30'], mm: 30 },
  { leads: 'elastic-front-low', from: 'Cunningham, article on elastic waistbands', garment: pullOn, sees: ['drops@waist =centre-front C shift:10', 'rises@hem =centre-front C shift:10'], mm: 10 },
  { leads: 'elastic-back-low', from: 'Cunningham, article on elastic waistbands', garment: pullOn, sees: ['drops@waist =centre-back back C shift:15', 'rises@hem =centre-back back C shift:15'], mm: 15 },
  { leads: 'gathers-much', from: 'common practice: twice the waist becomes one and a half', garment: gathered, sees: ['excess@waist ~vertical cloth:380'], mm: 380 },
  { leads: 'gathers-tight', from: 'common practice: the hip and four inches', garment: gathered, sees: ['tight@hip', 'drag-lines@waist =side-seam'], body: { hip: 1000 }, pattern: { body: {}, finished: { hip: 1040 } }, mm: 60 },
  { leads: 'gathers-uneven', from: usual, garment: gathered, sees: ['excess@hem ~vertical'] },
  { leads: 'casing-narrow', from: usual, garment: pullOn, sees: ['off-place@waist =waistband'] },
  { leads: 'pull-on-rise-long', from: 'common practice; principle as Cunningham', garment: pullOnTrousers, sees: ['excess@waist ~horizontal fold:7', 'excess@waist ~horizontal back fold:7'], mm: 14 },
  { leads: 'smock-front-short', from: usual, garment: { kind: 'shirt', sleeves: 'set-in', features: ['dartless', 'full'] }, sees: ['excess@bust ~diagonal >hem', 'rises@hem =front shift:20'], mm: 20 },
  { leads: 'blouse-uneven', from: usual, garment: elasticDress, sees: ['short@midriff cloth:16', 'excess@midriff back'], mm: 16 },
  { leads: 'yoke-tight', from: usual, garment: { kind: 'skirt', waist: 'fitted', features: ['yoke'] }, sees: ['tight@hip cloth:24'], mm: 24 },
  { leads: 'loose-crotch-low', from: usual, garment: { kind: 'trousers', waist: 'elastic', features: ['full'] }, sees: ['binds@knee', 'drops@crotch'] },
]

const tables = { waist, abdomen, hip, seat, crotch, leg, hem, elastic }

describe.each(Object.entries(tables))('%s', (zone, rows) => {
  it('has a fitting for every rule', () => expect([...new Set(rows.map(({ leads }) => leads))].toSorted()).toEqual([...causesByZone[zone as keyof typeof tables]].toSorted()))
  it.each(rows)('$leads ($from)', ({ garment, sees, body = {}, pattern = { body: {} }, answers = {}, leads, side = 'both', mm, also = [] }) => {
    const diagnosis = diagnose(fitting({ garment, body, pattern, answers, observations: sees.map((text, i) => look(text, `o${i}`)) }))
    const [first] = diagnosis.findings
    expect(first?.cause, `found ${causesOf(diagnosis).join(', ') || 'nothing'}`).toBe(leads)
    expect(first!.side).toBe(side)
    if (mm !== undefined) expect(Math.abs(first!.change.amountMm)).toBe(mm)
    expect(causesOf(diagnosis).slice(1).toSorted()).toEqual([...also].toSorted())
  })
})
