/**
 * Whole fittings, with every rule of the catalogue competing: what leads, on which side, and how much. `why` gives the handbooks'
 * reason; where no publication is named it is common practice. Amounts are the whole on the body, unsigned, in mm.
 */
import { describe, expect, it } from 'vitest'
import { diagnose } from '#shared/fit/diagnose.ts'
import { type Cause } from '#shared/fit/causes.ts'
import { type FitInput, type Garment, type Side } from '#shared/fit/types.ts'
import { causesOf, fitting } from '../../support/fit.ts'
import { look } from '../../support/look.ts'

type Fitting = { why: string; garment: Garment; sees: readonly string[]; body?: FitInput['body']; pattern?: FitInput['pattern']; leads: Cause | readonly Cause[]; side?: Side; mm?: number; also?: readonly Cause[] }

const bodice: Garment = { kind: 'bodice', features: ['darts', 'waist-seam'] }
const sleeved: Garment = { kind: 'bodice', sleeves: 'set-in', features: ['darts'] }
const skirt: Garment = { kind: 'skirt', waist: 'fitted', features: ['darts', 'waistband', 'straight'] }
const trousers: Garment = { kind: 'trousers', waist: 'fitted', features: ['darts', 'waistband', 'fly'] }
const dress: Garment = { kind: 'dress', sleeves: 'none', features: ['darts'] }
const pullOn: Garment = { kind: 'skirt', waist: 'elastic', features: ['gathered'] }

const bust: Fitting[] = [
  { why: 'lines to the side seam, a gaping armhole and a lifting hem are one full bust', garment: bodice, sees: ['drag-lines@bust >side-seam', 'gaping@armhole', 'rises@hem =front'], leads: 'full-bust' },
  { why: 'choose by the high bust, then add what the drafted cup lacks (Texas E-372): (1040 − 940) − 50', garment: bodice, sees: ['drag-lines@bust >side-seam', 'tight@bust'], body: { bust: 1040, 'high-bust': 940 }, pattern: { body: {}, draftedCupMm: 50 }, leads: 'full-bust', mm: 50 },
  { why: 'bubbles over the bust and an empty dart tip: 50 drafted, 20 on the body', garment: bodice, sees: ['excess@bust ~vertical', 'excess@bust ~horizontal'], body: { bust: 880, 'high-bust': 860 }, pattern: { body: {}, draftedCupMm: 50 }, leads: 'small-bust', mm: 30 },
  { why: 'a dart that points above the fullest point is moved down by the distance', garment: bodice, sees: ['off-place@bust >down =dart shift:18'], leads: 'bust-point-low', mm: 18 },
  { why: 'a dart that points below it is moved up by the distance', garment: bodice, sees: ['off-place@bust >up =dart shift:12'], leads: 'bust-point-high', mm: 12 },
  { why: 'strain in front and behind, with a larger high bust, is the whole girth (CWU ch. 17)', garment: bodice, sees: ['tight@bust ~horizontal cloth:40', 'tight@bust back', 'tight@upper-back back'], body: { bust: 1000, 'high-bust': 950 }, pattern: { body: { bust: 960, 'high-bust': 910 }, draftedCupMm: 50 }, leads: 'bust-girth-tight', mm: 40 },
  { why: 'only the left bust strains: the change stays on the left', garment: bodice, sees: ['drag-lines@bust >side-seam L', 'gaping@armhole L'], leads: 'full-bust', side: 'left' },
]

const shouldersAndBack: Fitting[] = [
  { why: 'folds from the neck to both armholes: shoulders slope more than the pattern (Cowan)', garment: bodice, sees: ['drag-lines@neck >armhole', 'excess@armhole ~diagonal', 'excess@armhole ~diagonal back'], leads: 'sloping-shoulders' },
  { why: 'the same on one side only is one lower shoulder (Liechty, Pottberg and Rasband: asymmetry)', garment: bodice, sees: ['drag-lines@neck >armhole R', 'drops@shoulder R shift:12'], leads: ['low-shoulder', 'sloping-shoulders'], side: 'right', mm: 12 },
  { why: 'folds from the tips to the neck, and a seam that opens 14 at the tip (WSU E.M. 2246)', garment: bodice, sees: ['drag-lines@shoulder >neck', 'tight@shoulder gap:14'], leads: 'square-shoulders' },
  { why: 'an armhole seam that lies down on the arm (WSU E.M. 2246)', garment: sleeved, sees: ['drops@shoulder shift:12'], leads: 'shoulder-long', mm: 12 },
  { why: 'an armhole seam that sits inside the joint', garment: sleeved, sees: ['rises@shoulder shift:10', 'drag-lines@sleeve >shoulder-tip'], leads: 'shoulder-short' },
  { why: 'a shoulder seam right at the neck and behind the bone at the tip', garment: sleeved, sees: ['off-place@shoulder >front side shift:9'], leads: 'forward-shoulder', mm: 9 },
  { why: 'the back rides up, its neck stands off and it strains over the blades (Woman’s Institute §50)', garment: bodice, sees: ['rises@hem =centre-back back', 'gaping@neck =centre-back back', 'tight@upper-back back'], leads: 'round-back' },
  { why: 'slack folds across the upper back and a back hem that hangs low (USDA, Fitting Dresses); a fold of 6 holds 12', garment: bodice, sees: ['excess@upper-back ~horizontal back C fold:6', 'drops@hem =centre-back back C'], leads: 'flat-back', mm: 12 },
  { why: 'strain straight across the back that binds on reaching (Betzina)', garment: sleeved, sees: ['tight@upper-back ~horizontal back cloth:30', 'binds@upper-back back'], leads: 'broad-back', mm: 30 },
  { why: 'vertical folds beside the back armhole (listed in HERR-32)', garment: sleeved, sees: ['excess@upper-back ~vertical back'], leads: 'narrow-back' },
  { why: 'two folds, two causes: shoulders from the neck, bust from the side seam', garment: bodice, sees: ['drag-lines@neck >armhole', 'excess@armhole ~diagonal back', 'drag-lines@bust >side-seam', 'rises@hem =front'], leads: 'sloping-shoulders', also: ['full-bust'] },
]

const neckArmholeSleeve: Fitting[] = [
  { why: 'a neckline that binds with fine folds round it', garment: bodice, sees: ['tight@neck', 'excess@neck ~radiating'], leads: 'neck-tight' },
  { why: 'a front neckline that stands off, a fold of 6 on each side: 24', garment: dress, sees: ['gaping@neck =centre-front fold:6'], leads: 'neck-front-loose', mm: 24 },
  { why: 'a back neckline that stands off by itself, a fold of 6 at the centre: 12', garment: dress, sees: ['gaping@neck =centre-back back C fold:6'], leads: 'neck-back-loose', mm: 12 },
  { why: 'an armhole that cuts in all round', garment: sleeved, sees: ['tight@armhole'], leads: 'armhole-high' },
  { why: 'an arm that lifts the whole body: the armhole is too low', garment: sleeved, sees: ['binds@armhole', 'drops@armhole'], leads: 'armhole-low' },
  { why: 'only the front armhole edge stands off, in a sleeveless bodice', garment: { ...dress }, sees: ['gaping@armhole fold:5'], leads: 'front-armhole-loose', mm: 20 },
  { why: 'strain round the upper arm: arm 330 and ease 50 less 340 (biceps ease at least 2 in)', garment: sleeved, sees: ['tight@sleeve ~horizontal cloth:40'], leads: 'full-upper-arm', mm: 40 },
  { why: 'vertical folds down the upper sleeve, 10 deep: 20', garment: sleeved, sees: ['excess@sleeve ~vertical fold:10'], leads: 'thin-upper-arm', mm: 20 },
  { why: 'a sleeve that covers the hand', garment: sleeved, sees: ['long@sleeve cloth:25'], leads: 'sleeve-long', mm: 25 },
  { why: 'a sleeve that draws up when the arm bends (USDA, Fitting Dresses)', garment: sleeved, sees: ['short@sleeve cloth:20'], leads: 'sleeve-short', mm: 20 },
  { why: 'the right arm alone is longer', garment: sleeved, sees: ['short@sleeve R cloth:12'], leads: 'sleeve-short', side: 'right', mm: 12 },
]

const waistAndAbdomen: Fitting[] = [
  { why: 'a waist seam above the waist all round (NMSU C-228)', garment: bodice, sees: ['off-place@waist >down shift:20'], leads: 'bodice-short', mm: 20 },
  { why: 'folds at the waist that run on over the front: the bodice is long (CWU ch. 17)', garment: bodice, sees: ['excess@waist ~horizontal fold:10', 'excess@waist ~horizontal back fold:10', 'off-place@waist >up'], leads: 'bodice-long', mm: 20 },
  { why: 'folds across the back waist alone, strongest at the centre', garment: dress, sees: ['excess@waist ~horizontal =centre-back back C fold:8'], leads: 'hollow-back', mm: 16 },
  { why: 'a bust and a hollow back in one dress are two changes', garment: dress, sees: ['drag-lines@bust >side-seam', 'gaping@armhole', 'excess@waist ~horizontal =centre-back back C fold:8'], leads: 'hollow-back', also: ['full-bust'] },
  { why: 'a waist that will not fasten', garment: skirt, sees: ['tight@waist cloth:36'], leads: 'waist-tight', mm: 36 },
  { why: 'a waist that stands off evenly', garment: skirt, sees: ['gaping@waist cloth:24', 'excess@waist ~vertical'], leads: 'waist-loose' },
  { why: 'a band that gapes at the centre back only: a fold of 10 is 20', garment: trousers, sees: ['gaping@waist =centre-back back C fold:10'], leads: 'waist-back-loose', mm: 20 },
  { why: 'strain across the ribs with the waist free', garment: bodice, sees: ['tight@midriff cloth:20'], leads: 'midriff-tight', mm: 20 },
  { why: 'the front hem lifts and folds run from the belly to the sides', garment: skirt, sees: ['drag-lines@abdomen >side-seam', 'rises@hem =centre-front C'], leads: 'full-abdomen-skirt' },
  { why: 'the front waist is dragged down and the front strains', garment: trousers, sees: ['tight@abdomen', 'drops@waist =centre-front C', 'drag-lines@crotch >hip'], leads: 'full-abdomen-trousers' },
  { why: 'a pouch at the ends of the front darts', garment: skirt, sees: ['excess@abdomen'], leads: 'flat-abdomen' },
]

const hipAndSeat: Fitting[] = [
  { why: 'side seams that strain, 40 short all round (USDA; CWU ch. 17)', garment: skirt, sees: ['tight@hip =side-seam cloth:40'], leads: 'hip-tight', mm: 40 },
  { why: 'folds under the waist come with the tight hip: the skirt climbs', garment: skirt, sees: ['tight@hip =side-seam cloth:40', 'excess@waist ~horizontal', 'rises@whole'], leads: 'hip-tight', mm: 40 },
  { why: 'the measurements alone: hip 1040 on a size for 1000', garment: skirt, sees: [], body: { hip: 1040 }, pattern: { body: { hip: 1000 } }, leads: 'hip-tight', mm: 40 },
  { why: 'vertical folds at the hips (USDA, Fitting Dresses)', garment: skirt, sees: ['excess@hip ~vertical cloth:24'], leads: 'hip-loose', mm: 24 },
  { why: 'the back hem rises and the back strains over the seat', garment: skirt, sees: ['rises@hem =centre-back back C', 'tight@seat back'], leads: 'full-seat-skirt' },
  { why: 'the back hem hangs low with folds under the seat', garment: skirt, sees: ['drops@hem =centre-back back C', 'excess@seat ~horizontal back C'], leads: 'flat-seat-skirt' },
  { why: 'one fold under the back band, sides smooth (USDA): 8 deep is 16', garment: skirt, sees: ['excess@waist ~horizontal =centre-back back C fold:8'], leads: 'hollow-back-skirt', mm: 16 },
  { why: 'the same in trousers', garment: trousers, sees: ['excess@waist ~horizontal =centre-back back C fold:6'], leads: 'hollow-back-skirt', mm: 12 },
  { why: 'the left side rides up and the hem with it', garment: skirt, sees: ['rises@hem =side-seam L', 'excess@waist ~diagonal L'], leads: 'hip-high-one-side', side: 'left' },
  { why: 'only the left hip is tight', garment: skirt, sees: ['tight@hip L cloth:16'], leads: ['hip-full-one-side', 'hip-tight'], side: 'left', mm: 16 },
  { why: 'a straight skirt one cannot step in (HERR-32 lists the narrow bottom)', garment: skirt, sees: ['binds@hem'], leads: 'hem-narrow' },
  { why: 'tight hips on a pull-on skirt', garment: pullOn, sees: ['tight@hip cloth:32'], leads: 'hip-tight', mm: 32 },
]

const trousersAndHem: Fitting[] = [
  { why: 'the crotch cuts up in front and behind: depth, whole on every piece (NMSU C-209)', garment: trousers, sees: ['short@crotch cloth:20', 'rises@crotch'], leads: 'rise-short', mm: 20 },
  { why: 'the crotch hangs low, with folds across below it', garment: trousers, sees: ['drops@crotch shift:16', 'excess@crotch ~horizontal'], leads: 'rise-long' },
  { why: 'the back waist is pulled down on sitting (Hertzer, screen 21)', garment: trousers, sees: ['short@crotch =back back cloth:24', 'drops@waist =centre-back back C'], leads: 'back-crotch-short', mm: 24 },
  { why: 'folds radiate from a tight seat', garment: trousers, sees: ['tight@seat back', 'drag-lines@seat >crotch back'], leads: 'full-seat-trousers' },
  { why: 'sagging folds under the seat, 8 deep: 16', garment: trousers, sees: ['excess@seat ~diagonal back fold:8'], leads: 'flat-seat-trousers' },
  { why: 'folds rise from the front crotch: short in front', garment: trousers, sees: ['drag-lines@crotch >hip', 'short@crotch =front cloth:12'], leads: 'front-crotch-short' },
  { why: 'folds fall from the front crotch: long in front', garment: trousers, sees: ['drag-lines@crotch >thigh', 'long@crotch =front'], leads: 'front-crotch-long' },
  { why: 'inner knee tight, hem swings out (Hertzer, screen 11)', garment: trousers, sees: ['tight@knee =inseam', 'swings@leg >out'], leads: 'knee-inward' },
  { why: 'outer knee tight, hem swings in (Hertzer, screen 11)', garment: trousers, sees: ['tight@knee =side-seam', 'swings@leg >in'], leads: 'knee-outward' },
  { why: 'strain across the front thigh', garment: trousers, sees: ['tight@thigh ~horizontal cloth:24'], leads: 'thigh-front-tight' },
  { why: 'an even hem that is too short (CWU ch. 17)', garment: skirt, sees: ['short@hem cloth:30'], leads: 'hem-short', mm: 30 },
  { why: 'an even hem that is too long', garment: dress, sees: ['long@hem cloth:25'], leads: 'hem-long', mm: 25 },
  { why: 'an elastic that cuts in changes the elastic, not the cloth', garment: pullOn, sees: ['tight@waist =waistband'], leads: 'elastic-short' },
  { why: 'an elastic band that slips', garment: pullOn, sees: ['drops@waist =waistband'], leads: 'elastic-long' },
]

const tables = { bust, 'shoulders and back': shouldersAndBack, 'neck, armhole and sleeve': neckArmholeSleeve, 'waist and abdomen': waistAndAbdomen, 'hip and seat': hipAndSeat, 'trousers, hem and elastic': trousersAndHem }

it('are at least sixty', () => expect(Object.values(tables).flat().length).toBeGreaterThanOrEqual(60))

describe.each(Object.entries(tables))('%s', (_, rows) => {
  it.each(rows)('$why', ({ garment, sees, body = {}, pattern = { body: {} }, leads, side = 'both', mm, also = [] }) => {
    const diagnosis = diagnose(fitting({ garment, body, pattern, observations: sees.map((text, i) => look(text, `o${i}`)) }))
    const [first] = diagnosis.findings
    expect([leads].flat(), `found ${causesOf(diagnosis).join(', ') || 'nothing'}`).toContain(first?.cause)
    expect(first!.side).toBe(side)
    if (mm !== undefined) expect(Math.abs(first!.change.amountMm)).toBe(mm)
    expect(causesOf(diagnosis).slice(1).toSorted()).toEqual([...also].toSorted())
    expect(diagnosis.conflicts).toEqual([])
  })
})
