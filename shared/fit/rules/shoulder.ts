import { type Rule } from '../rule.ts'

const uppers = { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'] } as const
const box = [0.28, 0.1, 0.72, 0.34] as const
const facing = { piece: 'neck-facing', text: 'Look whether the neck facing still meets its edge; the armhole facing is recut.' } as const
const liningAlike = { piece: 'lining', text: 'Change the lining alike.', when: { needs: ['lining'] } } as const
const capWalk = { piece: 'sleeve', text: 'Walk the sleeve cap against the new armhole.', when: { sleeves: ['set-in', 'raglan'] } } as const
const slope = 'Handbook series by Cowan on the shoulder (pinned at the tip, armhole lowered equally); Fitting Dresses, U.S. Department of Agriculture, 1946 (slanting shoulders); amounts: common practice'

// A fold pinned along the shoulder seam comes off front and back by its depth each, hence half of the cloth in it.
export const shoulderRules: readonly Rule[] = [
  {
    cause: 'sloping-shoulders', title: 'Lower both shoulder tips and the armholes with them', sentence: 'The shoulder seam is higher at the tip than it needs to be.',
    recognise: 'Slanting folds run from the side of the neck into the armhole, and the armhole collapses.', words: ['sloping shoulders', 'folds from neck to armhole'],
    when: uppers, sided: 'both',
    signs: [
      { sign: 'drag-lines', zone: ['shoulder', 'neck'], side: 'both', direction: 'diagonal', towards: ['armhole', 'underarm'], weight: 'strong', because: 'folds from the neck to the armhole say that the tip stands too high', amounts: { shift: 1, 'fold-depth': 0.5, cloth: 1 }, after: 'The folds from neck to armhole are gone.' },
      { sign: 'excess', zone: ['shoulder', 'armhole'], side: 'both', direction: 'diagonal', weight: 'strong', because: 'spare cloth slants into the armhole', amounts: { shift: 1, 'fold-depth': 0.5, cloth: 0.5 } },
      { sign: 'drops', zone: 'hem', side: 'both', weight: 'slight', because: 'the side hem drops' },
      { sign: 'drag-lines', zone: 'shoulder', towards: 'shoulder-tip', weight: 'strong', against: true, because: 'lines that point to the tip say that the tip is too low' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [6, 10, 14] },
    change: { operation: 'shoulder-slope', steps: [
      { piece: 'bodice-front', edge: 'shoulder tip', edges: 1, share: 'length', taper: 'to nothing at the neck', text: 'Lower the tip of the front by {amount}, to nothing at the neck, and lower the underarm by the same, so that the armhole keeps its length.' },
      { piece: 'bodice-back', edge: 'shoulder tip', edges: 1, share: 'length', taper: 'to nothing at the neck', text: 'Lower the tip of the back and its underarm by {amount} alike.' },
    ], companions: [facing, liningAlike] },
    limits: { leastMm: 4, mostMm: 25, beyond: 'Prefer a pad to a deeper change.' }, stage: 'shoulder', opposite: 'square-shoulders', predicts: 'The shoulder lies smooth from neck to tip.', recheck: ['armhole', 'side seam length', 'bust level'], source: slope,
    rivals: [{ cause: 'low-shoulder', check: { ask: 'Are the folds on both sides alike?', yes: 'Both shoulders slope.', no: 'One shoulder is lower.' } }, { cause: 'square-shoulders', check: { ask: 'Pin a fold along the seam, deepest at the tip. Do the folds vanish?', yes: 'The tip stood too high.', no: 'The tip is too low.' } }],
    drawing: { sign: { figure: 'front', region: box, strokes: [{ kind: 'fold', from: [0.45, 0.15], to: [0.36, 0.22] }, { kind: 'fold', from: [0.55, 0.15], to: [0.64, 0.22] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'taper', from: [0.3, 0], to: [0.75, 0.08], label: 'tip down' }, { kind: 'move', from: [0.95, 0.38], to: [0.95, 0.44], label: 'underarm' }] } },
  },
  {
    cause: 'low-shoulder', title: 'Lower one shoulder tip and its armhole', sentence: 'The shoulder seam is higher at one tip than it needs to be.',
    recognise: 'Slanting folds run from the neck into one armhole only; neckline and hem tilt.', words: ['one shoulder lower', 'uneven shoulders', 'asymmetric'],
    when: uppers, sided: 'one',
    signs: [
      { sign: 'drag-lines', zone: ['shoulder', 'neck', 'armhole'], side: 'one', weight: 'strong', because: 'the folds are on that side only', amounts: { shift: 1, 'fold-depth': 0.5, cloth: 1 } },
      { sign: 'drag-lines', zone: ['shoulder', 'neck'], side: 'one', direction: 'diagonal', towards: ['armhole', 'underarm'], weight: 'decisive', because: 'folds from the neck to one armhole say that this shoulder is lower', amounts: { shift: 1, 'fold-depth': 0.5, cloth: 1 }, after: 'Both shoulders lie alike.' },
      { sign: 'drops', zone: ['shoulder', 'armhole'], side: 'one', weight: 'decisive', because: 'that shoulder lies lower', amounts: { shift: 1 }, after: 'Both shoulders lie alike.' },
      { sign: 'excess', zone: ['shoulder', 'armhole'], side: 'one', weight: 'strong', because: 'spare cloth lies on that side only', amounts: { shift: 1, 'fold-depth': 0.5, cloth: 0.5 } },
    ],
    measures: [], amounts: { direction: -1, usualMm: [6, 10, 14] },
    change: { operation: 'shoulder-slope', steps: [
      { piece: 'bodice-front', edge: 'shoulder tip', edges: 1, share: 'length', taper: 'to nothing at the neck', text: 'Unfold the front. Lower the {side} tip by {amount}, to nothing at the neck.' },
      { piece: 'bodice-front', edge: 'underarm', edges: 1, share: 'length', taper: 'to nothing at the notches', text: 'Lower the {side} underarm of the front by {amount}, so that the armhole keeps its length.' },
      { piece: 'bodice-back', edge: 'shoulder tip', edges: 1, share: 'length', taper: 'to nothing at the neck', text: 'Lower the {side} tip of the back by {amount} alike.' },
      { piece: 'bodice-back', edge: 'underarm', edges: 1, share: 'length', taper: 'to nothing at the notches', text: 'Lower the {side} underarm of the back by {amount}; trace left and right apart.' },
    ], companions: [facing, liningAlike] },
    limits: { leastMm: 6, mostMm: 30, beyond: 'Prefer a pad on the lower side.' }, stage: 'shoulder', predicts: 'Both shoulders lie alike and the neckline is level.', recheck: ['neckline', 'hem from the floor on both sides'], source: 'common practice',
    rivals: [{ cause: 'sloping-shoulders', check: { id: 'sloping-shoulders~low-shoulder', ask: 'Are the folds on both sides alike?', yes: 'Both shoulders slope.', no: 'One shoulder is lower.', yesMeans: 'rival' } }],
    drawing: { sign: { figure: 'front', region: box, strokes: [{ kind: 'fold', from: [0.45, 0.15], to: [0.36, 0.22] }, { kind: 'level', from: [0.44, 0.14], to: [0.56, 0.13] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'taper', from: [0.3, 0], to: [0.75, 0.08], label: 'one tip down' }, { kind: 'move', from: [0.95, 0.38], to: [0.95, 0.44], label: 'underarm' }] } },
  },
  {
    cause: 'square-shoulders', title: 'Raise both shoulder tips and the armholes with them', sentence: 'The shoulder seam is lower at the tip than it needs to be.',
    recognise: 'Slanting folds run from the shoulder tips toward the centre, the seam stands off near the neck and a roll may lie under the back neck.', words: ['square shoulders', 'folds from the tip'],
    when: uppers, sided: 'either',
    signs: [
      { sign: 'drag-lines', zone: ['shoulder', 'neck'], direction: 'diagonal', towards: 'shoulder-tip', weight: 'decisive', because: 'lines that point to the tip say that the tip is too low', amounts: { gap: 1, shift: 2 }, after: 'The lines from the tip are gone.' },
      { sign: 'tight', zone: ['shoulder', 'armhole'], weight: 'fair', because: 'the tip is strained', amounts: { gap: 1 } },
      { sign: 'excess', zone: 'neck', view: 'back', direction: 'horizontal', weight: 'fair', because: 'a roll lies under the back neck' },
      { sign: 'drag-lines', zone: 'shoulder', towards: ['armhole', 'underarm'], weight: 'strong', against: true, because: 'folds into the armhole say that the tip stands too high' },
    ],
    measures: [], amounts: { direction: 1, usualMm: [8, 14, 22] },
    change: { operation: 'shoulder-slope', steps: [
      { piece: 'bodice-front', edge: 'shoulder tip', edges: 2, share: 'side', taper: 'to nothing at the neck', text: 'Raise the tip of the front by {amount}, to nothing at the neck, and raise the underarm by the same.' },
      { piece: 'bodice-back', edge: 'shoulder tip', edges: 2, share: 'side', taper: 'to nothing at the neck', text: 'Raise the tip of the back and its underarm by {amount} alike.' },
    ], companions: [facing, liningAlike, capWalk] },
    limits: { leastMm: 5, mostMm: 40, beyond: 'Look at pads and posture first.' }, stage: 'shoulder', opposite: 'sloping-shoulders', predicts: 'The shoulder lies smooth from neck to tip.', recheck: ['armhole', 'neck', 'bust level'], source: 'H. L. Roberts, Garment Fitting, E.M. 2246, Washington State University Extension, 1962 (folds and two corrections); amounts: common practice',
    rivals: [{ cause: 'neck-tight', check: { ask: 'Open the seam from the tip. Does a gap open at the tip and none at the neck?', yes: 'The tip is too low.', no: 'The neckline is too small.' } }],
    drawing: { sign: { figure: 'front', region: box, strokes: [{ kind: 'drag', from: [0.48, 0.22], to: [0.37, 0.16] }, { kind: 'drag', from: [0.52, 0.22], to: [0.63, 0.16] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'taper', from: [0.3, 0], to: [0.75, 0.02], label: 'tip up' }] } },
  },
  {
    cause: 'forward-shoulder', title: 'Move the shoulder tip of the seam forward', sentence: 'The shoulder seam lies behind its place at the tip.',
    recognise: 'The seam is right at the neck and lies behind the shoulder bone at the tip; the garment creeps back.', words: ['forward shoulder', 'shoulder seam too far back'],
    when: uppers, sided: 'either',
    signs: [
      { sign: 'off-place', zone: 'shoulder', towards: 'front', weight: 'decisive', because: 'the tip of the seam has to come forward to the bone', amounts: { shift: 1 }, after: 'The seam meets the bone at the tip.' },
      { sign: 'drag-lines', zone: 'armhole', view: 'front', towards: 'shoulder-tip', weight: 'fair', because: 'the front armhole is caught at the tip' },
      { sign: 'swings', zone: ['shoulder', 'whole'], towards: 'back', weight: 'slight', because: 'the garment creeps back' },
    ],
    measures: [], amounts: { direction: 1, usualMm: [6, 10, 13] },
    change: { operation: 'shoulder-forward', steps: [
      { piece: 'bodice-front', edge: 'shoulder tip', edges: 1, share: 'length', times: -1, taper: 'to nothing at the neck', text: 'Lower the tip of the front by {amount}; the neck point stays.' },
      { piece: 'bodice-back', edge: 'shoulder tip', edges: 1, share: 'length', taper: 'to nothing at the neck', text: 'Raise the tip of the back by {amount}; the neck point stays.' },
      { piece: 'sleeve', edge: 'cap notch', edges: 1, share: 'length', text: 'Move the notch at the top of the cap {amount} forward, and the crown with it.', when: { sleeves: ['set-in', 'raglan'] } },
    ], companions: [facing, liningAlike] },
    limits: { leastMm: 4, mostMm: 25, beyond: 'Look at the roundness of the upper back as well.' }, stage: 'shoulder', predicts: 'The seam meets the bone at the tip.', recheck: ['front armhole', 'back width'], source: 'common practice (the seam meets the shoulder bone; half an inch in an example)',
    rivals: [{ cause: 'round-back', check: { ask: 'Does the back hem hang level?', yes: 'Only the shoulder lies forward.', no: 'The back is short over its roundness.' } }],
    drawing: { sign: { figure: 'side', region: box, strokes: [{ kind: 'place', from: [0.52, 0.17], to: [0.47, 0.17] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'taper', from: [0.3, 0], to: [0.75, 0.07], label: 'tip down' }] } },
  },
  {
    cause: 'shoulder-long', title: 'Bring the armhole in at the shoulder tip', sentence: 'The shoulder is longer than it needs to be.',
    recognise: 'The armhole seam lies down on the arm and the sleeve head droops.', words: ['shoulder too wide', 'drooping shoulder'],
    when: { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'], sleeves: ['set-in', 'none'] }, sided: 'either',
    signs: [
      { sign: 'long', zone: 'shoulder', weight: 'decisive', because: 'the seam lies beyond the joint', amounts: { shift: 1, cloth: 1, 'fold-depth': 1 }, after: 'The armhole seam lies on the joint.' },
      { sign: 'off-place', zone: ['shoulder', 'armhole'], towards: 'in', weight: 'decisive', because: 'the armhole seam has to come in to the joint', amounts: { shift: 1 } },
      { sign: 'drops', zone: ['shoulder', 'sleeve'], weight: 'fair', because: 'the sleeve head droops', amounts: { shift: 1 } },
      { sign: 'tight', zone: 'shoulder', weight: 'strong', against: true, because: 'a shoulder that strains is not long' },
    ],
    measures: [{ plus: ['pattern:shoulder'], minus: ['body:shoulder'], grades: [{ from: 10, weight: 'fair' }, { from: 4, weight: 'slight' }, { below: -4, weight: 'fair', against: true }], amount: 1, because: 'the size is drafted for a shoulder {value} longer' }],
    amounts: { direction: -1, usualMm: [6, 10, 15] },
    change: { operation: 'point-move', steps: [
      { piece: 'bodice-front', edge: 'armhole at the tip', edges: 1, share: 'length', taper: 'to nothing at the armhole notch', text: 'Redraw the armhole of the front {amount} further in at the tip, to nothing at the notch.' },
      { piece: 'bodice-back', edge: 'armhole at the tip', edges: 1, share: 'length', taper: 'to nothing at the armhole notch', text: 'Redraw the armhole of the back {amount} further in alike.' },
    ], companions: [capWalk, { piece: 'armhole-facing', text: 'Recut the armhole facing.', when: { sleeves: ['none'] } }, liningAlike], noCompanions: 'the neck stays' },
    limits: { leastMm: 3, mostMm: 25, beyond: 'Choose the size by the high bust, or slash and overlap at the middle of the shoulder.' }, stage: 'shoulder', opposite: 'shoulder-short', predicts: 'The armhole seam lies on the joint.', recheck: ['sleeve cap', 'reach'], source: 'H. L. Roberts, Garment Fitting, E.M. 2246, Washington State University Extension, 1962; Fitting Dresses, U.S. Department of Agriculture, 1946; limits: common practice',
    rivals: [{ cause: 'sloping-shoulders', check: { ask: 'Pinch only the tip. Does that clear it?', yes: 'Length alone is spare.', no: 'The tip stands too high.' } }],
    drawing: { sign: { figure: 'front', region: box, strokes: [{ kind: 'place', from: [0.33, 0.19], to: [0.37, 0.18] }, { kind: 'place', from: [0.67, 0.19], to: [0.63, 0.18] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'taper', from: [0.7, 0.05], to: [0.72, 0.25], label: 'in' }] } },
  },
  {
    cause: 'shoulder-short', title: 'Let the armhole out at the shoulder tip', sentence: 'The shoulder is shorter than it needs to be.',
    recognise: 'The armhole seam sits inside the joint, the sleeve rides up and lines run from the tip into its head.', words: ['shoulder too narrow', 'broad shoulders'],
    when: { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'], sleeves: ['set-in', 'none'] }, sided: 'either',
    signs: [
      { sign: 'short', zone: 'shoulder', weight: 'decisive', because: 'the seam lies inside the joint', amounts: { shift: 1, cloth: 1, gap: 1 }, after: 'The armhole seam lies on the joint.' },
      { sign: 'off-place', zone: ['shoulder', 'armhole'], towards: 'out', weight: 'decisive', because: 'the armhole seam has to go out to the joint', amounts: { shift: 1 } },
      { sign: 'drag-lines', zone: 'sleeve', towards: 'shoulder-tip', weight: 'fair', because: 'the sleeve head is caught at the tip' },
      { sign: 'long', zone: 'shoulder', weight: 'decisive', against: true, because: 'a seam on the arm is too long' },
    ],
    measures: [{ plus: ['body:shoulder'], minus: ['pattern:shoulder'], grades: [{ from: 10, weight: 'fair' }, { from: 4, weight: 'slight' }, { below: -4, weight: 'fair', against: true }], amount: 1, because: 'the shoulder is {value} longer than the size is drafted for' }],
    amounts: { direction: 1, usualMm: [6, 10, 15] },
    change: { operation: 'point-move', steps: [
      { piece: 'bodice-front', edge: 'armhole at the tip', edges: 1, share: 'length', taper: 'to nothing at the armhole notch', text: 'Let the tip of the front out by {amount}, to nothing at the notch.' },
      { piece: 'bodice-back', edge: 'armhole at the tip', edges: 1, share: 'length', taper: 'to nothing at the armhole notch', text: 'Let the tip of the back out by {amount} alike.' },
    ], companions: [capWalk, { piece: 'armhole-facing', text: 'Recut the armhole facing.', when: { sleeves: ['none'] } }, liningAlike], noCompanions: 'the neck stays' },
    limits: { leastMm: 3, mostMm: 25, beyond: 'Take a larger size at the shoulder.' }, stage: 'shoulder', opposite: 'shoulder-long', predicts: 'The armhole seam lies on the joint.', recheck: ['sleeve cap', 'reach'], source: 'H. L. Roberts, Garment Fitting, E.M. 2246, Washington State University Extension, 1962; first step half an inch: common practice',
    rivals: [{ cause: 'full-upper-arm', check: { ask: 'Release the sleeve at the top. Does it fall clear and lie flat?', yes: 'The shoulder was short.', no: 'The sleeve is narrow.' } }],
    drawing: { sign: { figure: 'front', region: box, strokes: [{ kind: 'place', from: [0.4, 0.17], to: [0.36, 0.18] }, { kind: 'place', from: [0.6, 0.17], to: [0.64, 0.18] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'taper', from: [0.78, 0.04], to: [0.72, 0.25], label: 'out' }] } },
  },
]
