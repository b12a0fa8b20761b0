/**
 * The words of a fitting, one table: sign × zone (× line, target or direction) → the sentence a beginner recognises, and what
 * may be said beside a sign. Screens and prints read their words from here, never from code of their own.
 */
import {
  type Amount, type AmountKind, type Direction, type Line, type Observation, type PieceRole, type Severity, type Side, type Sign, type Target, type View, type Zone,
} from './types.ts'

export type MarkKind = 'drag-line' | 'gape' | 'tight' | 'excess' | 'length' | 'balance' | 'place'

export const zoneWords: Record<Zone, string> = {
  neck: 'neck', shoulder: 'shoulder', 'upper-back': 'upper back', bust: 'bust', armhole: 'armhole', sleeve: 'sleeve', waist: 'waist',
  midriff: 'midriff', abdomen: 'abdomen', hip: 'hip', seat: 'seat', crotch: 'crotch', thigh: 'thigh', knee: 'knee', leg: 'leg', hem: 'hem',
  whole: 'whole garment',
}
export const sideWords: Record<Side, string> = { left: 'Left', right: 'Right', both: 'Both sides', centre: 'Centre' }
export const viewWords: Record<View, string> = { front: 'Front', back: 'Back', left: 'Left', right: 'Right', detail: 'Detail' }
export const directionWords: Record<Direction, string> = { horizontal: 'across', vertical: 'up and down', diagonal: 'slanting', radiating: 'fanning out' }
export const severityWords: Record<Severity, string> = { 1: 'Slight', 2: 'Clear', 3: 'Strong' }
export const targetWords: Record<Target, string> = {
  front: 'the front', back: 'the back', up: 'upwards', down: 'downwards', in: 'inwards', out: 'outwards', neck: 'the neck',
  'shoulder-tip': 'the shoulder tip', bust: 'the bust point', underarm: 'the underarm', armhole: 'the armhole', 'shoulder-blade': 'the shoulder blade',
  'side-seam': 'the side seam', waist: 'the waist', abdomen: 'the abdomen', hip: 'the hip', seat: 'the seat', crotch: 'the crotch', thigh: 'the thigh',
  knee: 'the knee', elbow: 'the elbow', hem: 'the hem',
}
export const lineWords: Record<Line, string> = {
  'centre-front': 'centre front', 'centre-back': 'centre back', 'side-seam': 'side seam', front: 'front', back: 'back', inseam: 'inseam',
  crotch: 'crotch seam', waistband: 'waistband', collar: 'collar', cap: 'sleeve cap', dart: 'dart',
}
export const amountKindWords: Record<AmountKind, { name: string; hint: string }> = {
  'fold-depth': { name: 'Depth of a pinched fold', hint: 'The fold lies flat between two fingers; twice as much cloth is in it.' },
  cloth: { name: 'Cloth, all told', hint: 'The whole width or length of cloth to add or to take away.' },
  gap: { name: 'Opening that will not close', hint: 'From edge to edge, with nothing pulled.' },
  shift: { name: 'Distance off its place', hint: 'From where it is to where it belongs.' },
}

export const pieceWords: Record<PieceRole, string> = {
  'skirt-front': 'Skirt front', 'skirt-back': 'Skirt back', 'trouser-front': 'Trouser front', 'trouser-back': 'Trouser back', 'bodice-front': 'Front', 'bodice-back': 'Back',
  'side-front': 'Side front', 'side-back': 'Side back', yoke: 'Yoke', sleeve: 'Sleeve', 'under-sleeve': 'Under sleeve', cuff: 'Cuff', collar: 'Collar', 'collar-stand': 'Collar stand',
  waistband: 'Waistband', 'neck-facing': 'Neck facing', 'front-facing': 'Front facing', 'armhole-facing': 'Armhole facing', casing: 'Casing', pocket: 'Pocket', lining: 'Lining', fly: 'Fly',
  belt: 'Belt', tier: 'Tier',
}
export const markKindWords: Record<MarkKind, string> = { 'drag-line': 'Drag line', gape: 'Gape', tight: 'Tight', excess: 'Excess', length: 'Length', balance: 'Balance', place: 'Place' }

/** Which views of a photograph show a zone; a detail shows any. */
export const zoneViews: Record<Zone, readonly View[]> = {
  neck: ['front', 'back', 'left', 'right'], shoulder: ['front', 'back', 'left', 'right'], 'upper-back': ['back', 'left', 'right'], bust: ['front', 'left', 'right'],
  armhole: ['front', 'back', 'left', 'right'], sleeve: ['front', 'back', 'left', 'right'], waist: ['front', 'back', 'left', 'right'],
  midriff: ['front', 'back', 'left', 'right'], abdomen: ['front', 'left', 'right'], hip: ['front', 'back', 'left', 'right'], seat: ['back', 'left', 'right'],
  crotch: ['front', 'back'], thigh: ['front', 'back', 'left', 'right'], knee: ['front', 'back', 'left', 'right'], leg: ['front', 'back', 'left', 'right'],
  hem: ['front', 'back', 'left', 'right'], whole: ['front', 'back', 'left', 'right'],
}

export type SignWords = {
  /** what one says when pointing at it */
  name: string
  /** how to tell it from its neighbours */
  hint: string
  mark: MarkKind
  /** offered first where the sign was not chosen yet */
  zones: readonly Zone[]
  directions: readonly Direction[]
  targets: readonly Target[]
  lines: readonly Line[]
  /** ways to measure it and the question for each, the usual one first */
  asks: readonly { as: AmountKind; ask: string }[]
}

const torso = ['neck', 'shoulder', 'upper-back', 'bust', 'armhole', 'sleeve', 'waist', 'midriff', 'abdomen', 'hip', 'seat'] as const
const legs = ['crotch', 'thigh', 'knee', 'leg'] as const
/** Any seam or line may be named with any sign. */
const seams: readonly Line[] = ['centre-front', 'centre-back', 'side-seam', 'front', 'back', 'inseam', 'crotch', 'waistband', 'collar', 'cap', 'dart']
const places: readonly Target[] = ['bust', 'shoulder-tip', 'neck', 'side-seam', 'underarm', 'armhole', 'shoulder-blade', 'waist', 'abdomen', 'hip', 'seat', 'crotch', 'thigh', 'knee', 'elbow', 'hem']
const ways: readonly Target[] = ['front', 'back', 'up', 'down', 'in', 'out']

export const signWords: Record<Sign, SignWords> = {
  'drag-lines': {
    name: 'Drag lines', hint: 'Taut lines that start or end at one point.', mark: 'drag-line', zones: [...torso, ...legs], directions: ['diagonal', 'horizontal', 'vertical', 'radiating'],
    targets: [...places, ...ways], lines: seams,
    asks: [
      { as: 'cloth', ask: 'Open the seam or let the cloth down until the lines drop. How much does it need?' },
      { as: 'fold-depth', ask: 'Pin a fold until the lines drop, then lay it flat. How deep is it?' },
    ],
  },
  gaping: {
    name: 'Stands off', hint: 'An edge that does not lie on the body.', mark: 'gape', zones: ['neck', 'armhole', 'waist', 'bust', 'upper-back', 'hip', 'hem', 'sleeve'], directions: [], targets: [],
    lines: seams,
    asks: [
      { as: 'fold-depth', ask: 'Pinch the edge until it lies on the body. How deep is the fold?' },
      { as: 'gap', ask: 'Let the edges hang as they will. How far apart do they stay?' },
    ],
  },
  tight: {
    name: 'Tight', hint: 'The cloth is strained across; no fold can be pinched.', mark: 'tight', zones: [...torso, ...legs, 'hem'], directions: ['horizontal', 'vertical'], targets: [], lines: seams,
    asks: [
      { as: 'cloth', ask: 'Open the seam and let it spread. How wide does it open, all round?' },
      { as: 'gap', ask: 'Bring the edges together without pulling. How far apart do they stay?' },
    ],
  },
  binds: {
    name: 'Binds', hint: 'It fits standing still and stops a movement.', mark: 'tight', zones: ['armhole', 'sleeve', 'upper-back', 'neck', 'shoulder', 'crotch', 'thigh', 'knee', 'seat', 'hip', 'waist', 'leg'],
    directions: [], targets: [], lines: seams,
    asks: [
      { as: 'cloth', ask: 'Open the seam and make the movement. How wide does it open?' },
      { as: 'gap', ask: 'Make the movement. How far apart do the edges stay?' },
    ],
  },
  excess: {
    name: 'Spare cloth', hint: 'Soft folds that can be pinched and pinned out.', mark: 'excess', zones: [...torso, ...legs, 'hem'], directions: ['horizontal', 'vertical', 'diagonal', 'radiating'],
    targets: places, lines: seams,
    asks: [
      { as: 'fold-depth', ask: 'Pinch the fold flat. How deep is it?' },
      { as: 'cloth', ask: 'Pin out what is spare. How much cloth is it, all told?' },
    ],
  },
  rises: {
    name: 'Rises', hint: 'An edge or seam sits above its place.', mark: 'length', zones: ['hem', 'waist', 'neck', 'bust', 'armhole', 'sleeve', 'hip', 'crotch', 'leg', 'shoulder'], directions: [], targets: [],
    lines: seams,
    asks: [{ as: 'shift', ask: 'Measure from the edge down to where it should be. How far is it?' }],
  },
  drops: {
    name: 'Drops', hint: 'An edge or seam sits below its place.', mark: 'length', zones: ['hem', 'waist', 'neck', 'shoulder', 'bust', 'armhole', 'sleeve', 'hip', 'crotch', 'seat'], directions: [], targets: [],
    lines: seams,
    asks: [{ as: 'shift', ask: 'Measure from the edge up to where it should be. How far is it?' }],
  },
  short: {
    name: 'Too short', hint: 'The whole part is too short.', mark: 'length', zones: ['whole', 'sleeve', 'crotch', 'hem', 'leg', 'upper-back', 'bust', 'shoulder', 'midriff', 'waist', 'armhole', 'knee'], directions: [], targets: [],
    lines: seams,
    asks: [{ as: 'cloth', ask: 'Measure on to where it should end. How much longer must it be?' }, { as: 'gap', ask: 'How far is it from reaching its place?' }],
  },
  long: {
    name: 'Too long', hint: 'The whole part is too long.', mark: 'length', zones: ['whole', 'sleeve', 'crotch', 'hem', 'leg', 'upper-back', 'bust', 'shoulder', 'midriff', 'waist', 'armhole', 'knee'], directions: [], targets: [],
    lines: seams,
    asks: [{ as: 'cloth', ask: 'Measure back to where it should end. How much shorter must it be?' }, { as: 'fold-depth', ask: 'Pin a fold across and lay it flat. How deep is it?' }],
  },
  swings: {
    name: 'Swings', hint: 'A seam or the grain leaves the plumb line.', mark: 'balance', zones: ['hip', 'leg', 'hem', 'sleeve', 'whole', 'waist', 'bust', 'upper-back', 'knee', 'thigh'], directions: [], targets: ['front', 'back', 'in', 'out'],
    lines: seams,
    asks: [{ as: 'shift', ask: 'Hold a plumb line at the top of the seam. How far off is the seam at the bottom?' }],
  },
  'off-place': {
    name: 'Off its place', hint: 'A dart point, seam or pocket sits somewhere else.', mark: 'place', zones: ['bust', 'shoulder', 'waist', 'neck', 'armhole', 'sleeve', 'hip', 'seat', 'knee', 'upper-back', 'abdomen', 'crotch', 'midriff'], directions: [],
    targets: ['up', 'down', 'in', 'out', 'front', 'back'], lines: seams,
    asks: [{ as: 'shift', ask: 'Measure from where it is to where it belongs. How far is it?' }],
  },
}

/** Every sign at every zone, as a beginner would say it on seeing it. */
const sentences: Record<Sign, Record<Zone, string>> = {
  'drag-lines': {
    neck: 'Drag lines run to the neck', shoulder: 'Drag lines run to the shoulder', 'upper-back': 'Drag lines run across the upper back', bust: 'Drag lines run to the bust point',
    armhole: 'Drag lines run into the armhole', sleeve: 'Drag lines run across the sleeve', waist: 'Drag lines run from the waist', midriff: 'Drag lines run across the midriff',
    abdomen: 'Drag lines fan out from the abdomen', hip: 'Drag lines run across the hip', seat: 'Drag lines run to the fullest part of the seat', crotch: 'Drag lines run to the crotch point',
    thigh: 'Drag lines run across the thigh', knee: 'Drag lines run to the knee', leg: 'Drag lines run down the leg', hem: 'Drag lines run to the hem', whole: 'Drag lines run through the whole garment',
  },
  gaping: {
    neck: 'Neckline stands off', shoulder: 'Shoulder seam stands off', 'upper-back': 'Back neck stands away', bust: 'Front edge gapes at the bust', armhole: 'Armhole stands off', sleeve: 'Sleeve edge stands off',
    waist: 'Waist edge stands off', midriff: 'Edge stands off at the midriff', abdomen: 'Opening gapes over the abdomen', hip: 'Pocket or opening gapes at the hip', seat: 'Edge stands off at the seat',
    crotch: 'Fly or opening gapes at the crotch', thigh: 'Opening gapes at the thigh', knee: 'Opening gapes at the knee', leg: 'Leg edge stands off', hem: 'Hem stands off', whole: 'Opening gapes all the way down',
  },
  tight: {
    neck: 'Tight round the neck', shoulder: 'Tight across the shoulder', 'upper-back': 'Tight across the upper back', bust: 'Tight across the bust', armhole: 'Armhole cuts in', sleeve: 'Tight round the upper arm',
    waist: 'Tight at the waist', midriff: 'Tight across the midriff', abdomen: 'Tight across the abdomen', hip: 'Tight across the hip', seat: 'Tight across the seat', crotch: 'Tight at the crotch',
    thigh: 'Tight round the thigh', knee: 'Tight round the knee', leg: 'Tight round the lower leg', hem: 'Tight round the hem', whole: 'Tight all over',
  },
  binds: {
    neck: 'Neck binds when the head turns', shoulder: 'Shoulder binds when the arm lifts', 'upper-back': 'Back binds when the arms reach forward', bust: 'Binds across the bust on breathing in',
    armhole: 'Armhole binds when the arm lifts', sleeve: 'Sleeve binds when the elbow bends', waist: 'Waist binds on sitting', midriff: 'Binds at the midriff on bending', abdomen: 'Binds at the abdomen on sitting',
    hip: 'Hip binds on sitting', seat: 'Seat binds on sitting', crotch: 'Crotch binds on sitting', thigh: 'Thigh binds on a long step', knee: 'Knee binds on bending', leg: 'Leg binds on a long step',
    hem: 'Hem binds on a long step', whole: 'Binds on moving',
  },
  excess: {
    neck: 'Cloth folds at the neck', shoulder: 'Cloth folds below the shoulder', 'upper-back': 'Cloth folds across the upper back', bust: 'Cloth hangs loose over the bust', armhole: 'Cloth folds beside the armhole',
    sleeve: 'Cloth folds in the sleeve', waist: 'Cloth folds at the waist', midriff: 'Cloth folds at the midriff', abdomen: 'Cloth hangs loose over the abdomen', hip: 'Cloth hangs loose at the hip', seat: 'Cloth folds under the seat',
    crotch: 'Cloth folds at the crotch', thigh: 'Cloth folds down the thigh', knee: 'Cloth folds at the knee', leg: 'Cloth hangs loose down the leg', hem: 'Hem flutes with spare cloth', whole: 'Loose all over',
  },
  rises: {
    neck: 'Neckline sits too high', shoulder: 'Shoulder seam rises towards the neck', 'upper-back': 'Back edge rises', bust: 'Bust seam sits too high', armhole: 'Armhole sits too high', sleeve: 'Sleeve hem rises', waist: 'Waist seam rises',
    midriff: 'Seam rises at the midriff', abdomen: 'Waist rises over the abdomen', hip: 'Hip line rises', seat: 'Seam rises at the seat', crotch: 'Crotch seam sits too high', thigh: 'Seam rises at the thigh', knee: 'Knee line sits too high',
    leg: 'Leg hem rises', hem: 'Hem rises', whole: 'The garment rides up',
  },
  drops: {
    neck: 'Neckline sits too low', shoulder: 'Shoulder seam drops off the shoulder', 'upper-back': 'Back edge drops', bust: 'Bust seam sits too low', armhole: 'Armhole sits too low', sleeve: 'Sleeve hem drops', waist: 'Waist seam drops',
    midriff: 'Seam drops at the midriff', abdomen: 'Waist drops below the abdomen', hip: 'Hip line drops', seat: 'Cloth drops below the seat', crotch: 'Crotch seam hangs too low', thigh: 'Seam drops at the thigh', knee: 'Knee line sits too low',
    leg: 'Leg hem drops', hem: 'Hem drops', whole: 'The garment slides down',
  },
  short: {
    neck: 'Neck is too short', shoulder: 'Shoulder seam is too short', 'upper-back': 'Back is too short above the waist', bust: 'Front is too short over the bust', armhole: 'Armhole is too shallow', sleeve: 'Sleeve is too short',
    waist: 'Bodice ends above the waist', midriff: 'Body is too short at the midriff', abdomen: 'Front is too short over the abdomen', hip: 'Too short between waist and hip', seat: 'Back is too short over the seat',
    crotch: 'Rise is too short', thigh: 'Leg is too short above the knee', knee: 'Knee shaping sits too high', leg: 'Leg is too short', hem: 'Hem ends too high', whole: 'Too short as a whole',
  },
  long: {
    neck: 'Neck is too long', shoulder: 'Shoulder seam is too long', 'upper-back': 'Back is too long above the waist', bust: 'Front is too long over the bust', armhole: 'Armhole is too deep', sleeve: 'Sleeve is too long',
    waist: 'Bodice ends below the waist', midriff: 'Body is too long at the midriff', abdomen: 'Front is too long over the abdomen', hip: 'Too long between waist and hip', seat: 'Back is too long over the seat',
    crotch: 'Rise is too long', thigh: 'Leg is too long above the knee', knee: 'Knee shaping sits too low', leg: 'Leg is too long', hem: 'Hem ends too low', whole: 'Too long as a whole',
  },
  swings: {
    neck: 'Neckline pulls to one side', shoulder: 'Shoulder seam swings off its line', 'upper-back': 'Back grain leaves the plumb line', bust: 'Front grain leaves the plumb line', armhole: 'Side seam swings below the armhole',
    sleeve: 'Sleeve swings off the arm', waist: 'Side seam swings at the waist', midriff: 'Side seam swings at the midriff', abdomen: 'Front grain swings over the abdomen', hip: 'Side seam swings below the hip', seat: 'Back grain swings below the seat',
    crotch: 'Crotch seam pulls to one side', thigh: 'Leg seam swings at the thigh', knee: 'Leg seam swings at the knee', leg: 'Trouser leg swings off the plumb line', hem: 'Hem swings to one side', whole: 'The garment swings off the plumb line',
  },
  'off-place': {
    neck: 'Neck seam is off its place', shoulder: 'Shoulder seam is off its place', 'upper-back': 'Back dart or yoke is off its place', bust: 'Dart misses the bust point', armhole: 'Armhole seam is off its place', sleeve: 'Sleeve dart or notch is off its place',
    waist: 'Waist seam is off its place', midriff: 'Seam is off its place at the midriff', abdomen: 'Dart ends off the abdomen', hip: 'Pocket or dart is off its place at the hip', seat: 'Dart ends off the seat', crotch: 'Crotch point is off its place',
    thigh: 'Seam is off its place at the thigh', knee: 'Knee shaping is off its place', leg: 'Seam is off its place down the leg', hem: 'Hem mark is off its place', whole: 'Seams are off their places',
  },
}

/** Sentences that a line, a target or a direction makes sharper; the first that fits is taken. */
const sharper: readonly { sign: Sign; zone: Zone; line?: Line; towards?: Target; direction?: Direction; view?: View; text: string }[] = [
  { sign: 'drag-lines', zone: 'bust', towards: 'side-seam', text: 'Drag lines run from the bust to the side seam' },
  { sign: 'drag-lines', zone: 'bust', towards: 'shoulder-tip', text: 'Drag lines run from the bust to the shoulder tip' },
  { sign: 'drag-lines', zone: 'armhole', towards: 'bust', text: 'Drag lines run from the armhole to the bust point' },
  { sign: 'drag-lines', zone: 'shoulder', towards: 'neck', text: 'Drag lines run from the shoulder tip to the neck' },
  { sign: 'drag-lines', zone: 'waist', towards: 'hip', text: 'Drag lines run from the waist to the hip' },
  { sign: 'drag-lines', zone: 'crotch', towards: 'thigh', text: 'Drag lines run from the crotch down the thigh' },
  { sign: 'drag-lines', zone: 'seat', towards: 'crotch', text: 'Drag lines run from the seat to the crotch' },
  { sign: 'gaping', zone: 'waist', line: 'centre-back', text: 'Waist stands off at centre back' },
  { sign: 'gaping', zone: 'waist', line: 'waistband', text: 'Waistband stands off' },
  { sign: 'gaping', zone: 'neck', line: 'centre-back', text: 'Back neck stands away' },
  { sign: 'gaping', zone: 'neck', line: 'centre-front', text: 'Front neckline stands off' },
  { sign: 'gaping', zone: 'neck', line: 'collar', text: 'Collar stands off the neck' },
  { sign: 'excess', zone: 'waist', direction: 'horizontal', view: 'back', text: 'Cloth folds across the back waist' },
  { sign: 'excess', zone: 'waist', direction: 'horizontal', line: 'centre-back', text: 'Cloth folds across the back waist' },
  { sign: 'excess', zone: 'waist', direction: 'horizontal', text: 'Cloth folds across the waist' },
  { sign: 'excess', zone: 'waist', direction: 'vertical', text: 'Cloth folds up and down at the waist' },
  { sign: 'excess', zone: 'upper-back', direction: 'vertical', text: 'Cloth folds up and down at the upper back' },
  { sign: 'excess', zone: 'armhole', direction: 'vertical', text: 'Cloth folds up and down beside the armhole' },
  { sign: 'excess', zone: 'armhole', direction: 'diagonal', text: 'Slanting folds fall from the armhole' },
  { sign: 'excess', zone: 'seat', direction: 'diagonal', text: 'Slanting folds hang under the seat' },
  { sign: 'excess', zone: 'crotch', direction: 'vertical', text: 'Cloth folds up and down at the crotch' },
  { sign: 'excess', zone: 'neck', direction: 'horizontal', line: 'centre-back', text: 'Cloth folds across below the back neck' },
  { sign: 'rises', zone: 'hem', line: 'centre-front', text: 'Hem rises at centre front' },
  { sign: 'rises', zone: 'hem', line: 'front', text: 'Front hem rises' },
  { sign: 'rises', zone: 'hem', line: 'centre-back', text: 'Hem rises at centre back' },
  { sign: 'rises', zone: 'hem', line: 'back', text: 'Back hem rises' },
  { sign: 'rises', zone: 'hem', line: 'side-seam', text: 'Hem rises at the side seam' },
  { sign: 'drops', zone: 'hem', line: 'centre-front', text: 'Hem drops at centre front' },
  { sign: 'drops', zone: 'hem', line: 'front', text: 'Front hem drops' },
  { sign: 'drops', zone: 'hem', line: 'centre-back', text: 'Hem drops at centre back' },
  { sign: 'drops', zone: 'hem', line: 'back', text: 'Back hem drops' },
  { sign: 'drops', zone: 'hem', line: 'side-seam', text: 'Hem drops at the side seam' },
  { sign: 'drops', zone: 'waist', line: 'centre-back', text: 'Waist drops at centre back' },
  { sign: 'drops', zone: 'waist', line: 'centre-front', text: 'Waist drops at centre front' },
  { sign: 'short', zone: 'crotch', line: 'back', text: 'Back rise is too short' },
  { sign: 'short', zone: 'crotch', line: 'front', text: 'Front rise is too short' },
  { sign: 'long', zone: 'crotch', line: 'front', text: 'Front rise is too long' },
  { sign: 'long', zone: 'crotch', line: 'back', text: 'Back rise is too long' },
  { sign: 'short', zone: 'sleeve', line: 'cap', text: 'Sleeve cap is too short' },
  { sign: 'swings', zone: 'hip', towards: 'front', text: 'Side seam swings forward below the hip' },
  { sign: 'swings', zone: 'hip', towards: 'back', text: 'Side seam swings back below the hip' },
  { sign: 'swings', zone: 'hem', towards: 'front', text: 'Side seam swings forward at the hem' },
  { sign: 'swings', zone: 'hem', towards: 'back', text: 'Side seam swings back at the hem' },
  { sign: 'swings', zone: 'leg', towards: 'out', text: 'Trouser leg swings outwards' },
  { sign: 'swings', zone: 'leg', towards: 'in', text: 'Trouser leg swings inwards' },
  { sign: 'swings', zone: 'sleeve', towards: 'front', text: 'Sleeve swings forward of the arm' },
  { sign: 'swings', zone: 'sleeve', towards: 'back', text: 'Sleeve swings behind the arm' },
  { sign: 'off-place', zone: 'bust', towards: 'up', text: 'Dart point sits below the bust point' },
  { sign: 'off-place', zone: 'bust', towards: 'down', text: 'Dart point sits above the bust point' },
  { sign: 'off-place', zone: 'bust', towards: 'in', text: 'Dart point sits outside the bust point' },
  { sign: 'off-place', zone: 'bust', towards: 'out', text: 'Dart point sits inside the bust point' },
  { sign: 'off-place', zone: 'shoulder', towards: 'front', text: 'Shoulder seam sits behind the shoulder' },
  { sign: 'off-place', zone: 'shoulder', towards: 'back', text: 'Shoulder seam sits in front of the shoulder' },
  { sign: 'off-place', zone: 'waist', towards: 'down', text: 'Waist seam sits above the waist' },
  { sign: 'off-place', zone: 'waist', towards: 'up', text: 'Waist seam sits below the waist' },
]

type Said = { sign: Sign; zone: Zone; line?: Line | null; towards?: Target | null; direction?: Direction | null; view?: View | null }

/** The sentence for what was seen, as sharp as its line, target and direction allow. */
export function sentenceOf(said: Said): string {
  const fit = sharper.find((row) => row.sign === said.sign && row.zone === said.zone
    && (row.line === undefined || row.line === said.line) && (row.towards === undefined || row.towards === said.towards)
    && (row.direction === undefined || row.direction === said.direction) && (row.view === undefined || row.view === said.view))
  return fit?.text ?? sentences[said.sign][said.zone]
}

/** True where this sign is offered at this zone without searching further down the list. */
export const isOffered = (sign: Sign, zone: Zone): boolean => signWords[sign].zones.includes(zone)

/** Signs for one kind of mark, in the order they are offered. */
export const signsOfMark = (kind: MarkKind): Sign[] => (Object.keys(signWords) as Sign[]).filter((sign) => signWords[sign].mark === kind)

/** Signs to offer at a zone: those usual there first, the rest after. */
export function signsAt(zone: Zone): { usual: Sign[]; others: Sign[] } {
  const all = Object.keys(signWords) as Sign[]
  return { usual: all.filter((sign) => isOffered(sign, zone)), others: all.filter((sign) => !isOffered(sign, zone)) }
}

/** Zones that can be seen on a view; a detail may show any. */
export const zonesOfView = (view: View): Zone[] => (Object.keys(zoneViews) as Zone[]).filter((zone) => view === 'detail' || zoneViews[zone].includes(view))

/** The question a fitter would ask for the missing amount. */
export function askFor(sign: Sign, as?: AmountKind): { as: AmountKind; ask: string } {
  const asks = signWords[sign].asks
  return asks.find((ask) => ask.as === as) ?? asks[0]!
}

/** Where it is, in a few words below the sentence: "Both sides, at the side seam, towards the hip". */
export function placeOf(o: Pick<Observation, 'side'> & Said): string {
  // "Centre, at the centre back" says one thing twice.
  const parts = o.side === 'centre' && o.line?.startsWith('centre') && !sentenceOf(o).toLowerCase().includes(lineWords[o.line]) ? [capital(lineWords[o.line])] : [sideWords[o.side]]
  if (o.line && parts[0] !== capital(lineWords[o.line]) && !sentenceOf(o).toLowerCase().includes(lineWords[o.line])) parts.push(`at the ${lineWords[o.line]}`)
  if (o.towards && !sentenceOf(o).includes(targetWords[o.towards])) parts.push(['up', 'down', 'in', 'out'].includes(o.towards) ? targetWords[o.towards] : `towards ${targetWords[o.towards]}`)
  if (o.direction && o.sign === 'excess' && !sentenceOf(o).includes(directionWords[o.direction])) parts.push(`folds ${directionWords[o.direction]}`)
  return parts.join(', ')
}

const capital = (text: string) => text[0]!.toUpperCase() + text.slice(1)

/** Cloth in an amount, in mm: a pinched fold holds twice its depth. */
export const clothMm = (amount: Amount): number => (amount.as === 'fold-depth' ? amount.mm * 2 : amount.mm)
