import { type Rule } from '../rule.ts'

const uppers = { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'] } as const
const box = [0.28, 0.1, 0.72, 0.4] as const
const followers = [{ piece: 'yoke', text: 'Change the yoke alike.', when: { needs: ['yoke'] } }, { piece: 'lining', text: 'Change the back lining alike.', when: { needs: ['lining'] } }, { piece: 'neck-facing', text: 'Look whether the back neck facing still meets its edge.' }] as const

export const upperBackRules: readonly Rule[] = [
  {
    cause: 'round-back', title: 'Open a wedge across the back at blade level', sentence: 'The back is shorter over the blades than it needs to be.',
    recognise: 'The back rides up: its hem or waist rises at the centre, the neck stands off or is pulled back, and the blades strain.', words: ['round back', 'rounded shoulders', 'back rides up'],
    when: uppers, sided: 'both',
    signs: [
      { sign: 'rises', zone: ['waist', 'hem'], view: ['back', 'side'], weight: 'strong', because: 'the back is used up over the blades', amounts: { gap: 1 }, after: 'The back hem hangs level.' },
      { sign: 'short', zone: ['upper-back', 'waist'], view: ['back', 'side'], weight: 'strong', because: 'the back is short above the waist', amounts: { gap: 1, shift: 1, cloth: 1 } },
      { sign: 'gaping', zone: 'neck', view: 'back', weight: 'fair', because: 'the back neck stands off' },
      { sign: 'tight', zone: 'upper-back', weight: 'fair', because: 'the blades strain', amounts: { gap: 1 } },
      { sign: 'swings', zone: ['shoulder', 'neck', 'whole'], towards: 'back', weight: 'slight', because: 'the neck is drawn back' },
      { sign: 'excess', zone: 'upper-back', direction: 'horizontal', weight: 'decisive', against: true, because: 'spare folds across the upper back are the reverse of it' },
    ],
    measures: [], amounts: { direction: 1, usualMm: [8, 14, 24] },
    change: { operation: 'slash-hinge', steps: [{ piece: 'bodice-back', edge: 'centre back at blade level', edges: 1, share: 'length', taper: 'to nothing at the armhole', text: 'Slash the back from the centre to a hinge at the armhole at the fullest level and open it by {amount} at the centre; keep the centre straight by passing what it gains into a neck or shoulder dart.' }], companions: [...followers] },
    limits: { leastMm: 5, mostMm: 40, beyond: 'Share it between a neck dart and a shoulder dart.' }, stage: 'length', opposite: 'flat-back', predicts: 'The back hem hangs level and the neck lies close.', recheck: ['back neck', 'hem level', 'shoulder dart'], source: 'Woman’s Institute, text on close-fitting patterns, section 50 (back slashed at the blade line); range: common practice',
    rivals: [{ cause: 'broad-back', check: { ask: 'Slash the sample across at the blades. Does it open?', yes: 'Length is missing over the blades.', no: 'Width is missing across the back.' } }, { cause: 'forward-shoulder', check: { ask: 'Does the back hem rise at its centre?', yes: 'The back is short.', no: 'Only the shoulder lies forward.' } }],
    drawing: { sign: { figure: 'side', region: box, strokes: [{ kind: 'press', from: [0.56, 0.2], to: [0.58, 0.28] }, { kind: 'level', from: [0.42, 0.38], to: [0.58, 0.36] }] }, change: { piece: 'bodice-back', marks: [{ kind: 'cut', from: [0, 0.3], to: [0.75, 0.3] }, { kind: 'hinge', from: [0.75, 0.3], to: [0.75, 0.3] }, { kind: 'spread', from: [0, 0.3], to: [0, 0.35], label: 'opened' }] } },
  },
  {
    cause: 'flat-back', title: 'Take a wedge out across the upper back', sentence: 'The back is longer above the armhole than it needs to be.',
    recognise: 'Slack folds lie across the upper back between the armholes and the back hem hangs low.', words: ['flat back', 'erect back', 'folds across the upper back'],
    when: uppers, sided: 'both',
    signs: [
      { sign: 'excess', zone: 'upper-back', direction: 'horizontal', weight: 'decisive', because: 'folds across the upper back are spare length there', amounts: { 'fold-depth': 1, cloth: 1 }, after: 'The upper back lies smooth.' },
      { sign: 'excess', zone: 'upper-back', weight: 'fair', because: 'the upper back is slack', amounts: { 'fold-depth': 1, cloth: 1 } },
      { sign: 'drops', zone: 'hem', view: 'back', weight: 'fair', because: 'the back hem hangs low' },
      { sign: 'tight', zone: 'upper-back', weight: 'decisive', against: true, because: 'a back that strains is not long' },
      { sign: 'excess', zone: 'upper-back', direction: 'vertical', weight: 'strong', against: true, because: 'upright folds are spare width' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [6, 12, 20] },
    change: { operation: 'slash-hinge', steps: [{ piece: 'bodice-back', edge: 'centre back at blade level', edges: 1, share: 'length', taper: 'to nothing at the armhole', text: 'Slash the back from the centre to a hinge at the armhole and overlap {amount} at the centre; make the shoulder dart smaller and redraw the centre back neck.' }], companions: [...followers] },
    limits: { leastMm: 4, mostMm: 30, beyond: 'Take the rest at the back shoulder, at its neck end.' }, stage: 'length', opposite: 'round-back', predicts: 'The upper back lies smooth.', recheck: ['back neck', 'hem level'], source: 'Fitting Dresses, U.S. Department of Agriculture, 1946; half an inch to nothing above the armhole: common practice',
    rivals: [{ cause: 'hollow-back', check: { id: 'hollow-back~flat-back', ask: 'Pin the fold at the waist. Is the upper back smooth now?', yes: 'The spare length is at the waist.', no: 'The back is too long above the armhole.', yesMeans: 'rival' } }, { cause: 'bodice-long', check: { ask: 'Does the fold lie above the armhole?', yes: 'The upper back is long.', no: 'The whole bodice is long.' } }],
    drawing: { sign: { figure: 'back', region: box, strokes: [{ kind: 'fold', from: [0.4, 0.22], to: [0.6, 0.22], bend: 0.02 }, { kind: 'fold', from: [0.41, 0.25], to: [0.59, 0.25], bend: 0.02 }] }, change: { piece: 'bodice-back', marks: [{ kind: 'overlap', from: [0, 0.3], to: [0.75, 0.3], label: 'overlapped' }] } },
  },
  {
    cause: 'broad-back', title: 'Spread the back from mid-shoulder to the hem', sentence: 'The back is narrower across the blades than it needs to be.',
    recognise: 'The cloth strains straight across between the armholes and reaching forward binds.', words: ['broad back', 'cannot reach', 'tight across the back'],
    when: uppers, sided: 'both',
    signs: [
      { sign: 'tight', zone: 'upper-back', weight: 'strong', because: 'the back is strained across', amounts: { cloth: 1, gap: 1 }, after: 'Reaching forward is easy.' },
      { sign: 'binds', zone: ['upper-back', 'armhole'], view: ['back', 'side'], weight: 'strong', because: 'reaching forward is stopped across the back', amounts: { cloth: 1, gap: 1 } },
      { sign: 'drag-lines', zone: 'upper-back', direction: 'horizontal', weight: 'strong', because: 'lines straight across say that width is missing' },
      { sign: 'rises', zone: ['hem', 'waist'], view: 'back', weight: 'fair', against: true, because: 'a back that rises lacks length' },
      { sign: 'excess', zone: 'upper-back', weight: 'decisive', against: true, because: 'spare cloth is the reverse of it' },
    ],
    measures: [{ plus: ['body:back-width'], minus: ['pattern:back-width'], grades: [{ from: 12, weight: 'strong' }, { from: 5, weight: 'fair' }, { below: -5, weight: 'strong', against: true }], amount: 1, because: 'the back is {value} wider than the size is drafted for' }],
    amounts: { direction: 1, usualMm: [12, 20, 32] },
    change: { operation: 'spread', steps: [{ piece: 'bodice-back', edge: 'mid-shoulder to hem', edges: 2, share: 'width', text: 'Slash each half back upright from mid-shoulder to the hem and spread it by {amount}; ease or dart the excess at the shoulder, and take it into the dart or side seam at the waist.' }], companions: [...followers, { piece: 'sleeve', text: 'Walk the back of the sleeve cap against the armhole.', when: { sleeves: ['set-in'] } }] },
    limits: { leastMm: 6, mostMm: 50, beyond: 'Trace the back a size larger.' }, stage: 'bust', opposite: 'narrow-back', predicts: 'Reaching forward is easy.', recheck: ['reaching', 'shoulder length'], source: 'S. Betzina, Fast Fit (broad back); limits: common practice',
    rivals: [{ cause: 'full-upper-arm', check: { ask: 'Release the back armhole seam. Does a gap open there?', yes: 'The back lacks width.', no: 'The sleeve is narrow.' } }, { cause: 'round-back', check: { id: 'round-back~broad-back', ask: 'Slash the sample across at the blades. Does it open?', yes: 'Length is missing over the blades.', no: 'Width is missing across the back.', yesMeans: 'rival' } }],
    drawing: { sign: { figure: 'back', region: box, strokes: [{ kind: 'press', from: [0.38, 0.23], to: [0.62, 0.23] }, { kind: 'drag', from: [0.46, 0.24], to: [0.38, 0.24] }, { kind: 'drag', from: [0.54, 0.24], to: [0.62, 0.24] }] }, change: { piece: 'bodice-back', marks: [{ kind: 'cut', from: [0.45, 0.03], to: [0.45, 1] }, { kind: 'spread', from: [0.45, 0.5], to: [0.5, 0.5], label: 'spread' }] } },
  },
  {
    cause: 'narrow-back', title: 'Overlap the back from mid-shoulder to the hem', sentence: 'The back is wider across the blades than it needs to be.',
    recognise: 'Upright folds stand beside the back armholes and the armhole seam lies in on the arm.', words: ['narrow back', 'folds beside the back armhole'],
    when: uppers, sided: 'either',
    signs: [
      { sign: 'excess', zone: ['upper-back', 'armhole'], view: 'back', direction: 'vertical', weight: 'decisive', because: 'upright folds beside the armhole are spare width', amounts: { 'fold-depth': 1, cloth: 1 }, perSide: ['fold-depth', 'cloth'], after: 'The back lies smooth beside the armholes.' },
      { sign: 'tight', zone: 'upper-back', weight: 'decisive', against: true, because: 'a back that strains is not wide' },
    ],
    measures: [{ plus: ['pattern:back-width'], minus: ['body:back-width'], grades: [{ from: 12, weight: 'fair' }, { below: -5, weight: 'fair', against: true }], amount: 1, because: 'the size is drafted for a back {value} wider' }],
    amounts: { direction: -1, usualMm: [12, 20, 28] },
    change: { operation: 'spread', steps: [{ piece: 'bodice-back', edge: 'mid-shoulder to hem', edges: 2, share: 'width', text: 'Slash the {side} half back upright from mid-shoulder to the hem and overlap {amount}; leave enough to reach forward.' }], companions: [...followers] },
    limits: { leastMm: 6, mostMm: 40, beyond: 'Trace the back a size smaller.' }, stage: 'bust', opposite: 'broad-back', predicts: 'The back lies smooth beside the armholes.', recheck: ['reaching'], source: 'Pattern Alteration: A Guide for Leaders in Clothing Programs, Home Economics Research Report 32, U.S. Department of Agriculture, 1965 (narrow back); change: common practice',
    rivals: [{ cause: 'shoulder-long', check: { ask: 'Does the fold run on to mid-armhole?', yes: 'Width is spare.', no: 'Only the shoulder is long.' } }],
    drawing: { sign: { figure: 'back', region: box, strokes: [{ kind: 'fold', from: [0.38, 0.18], to: [0.38, 0.28] }, { kind: 'fold', from: [0.62, 0.18], to: [0.62, 0.28] }] }, change: { piece: 'bodice-back', marks: [{ kind: 'overlap', from: [0.45, 0.03], to: [0.48, 1], label: 'overlapped' }] } },
  },
]
