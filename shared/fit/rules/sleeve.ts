import { type Rule } from '../rule.ts'

const sleeved = { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'], sleeves: ['set-in', 'dropped', 'raglan'] } as const
const box = [0.2, 0.12, 0.5, 0.5] as const
const liningAlike = { piece: 'lining', text: 'Change the sleeve lining alike.', when: { needs: ['lining'] } } as const

export const sleeveRules: readonly Rule[] = [
  {
    cause: 'full-upper-arm', title: 'Spread the sleeve at the upper arm', sentence: 'The sleeve is narrower at the upper arm than it needs to be.',
    recognise: 'The cloth strains round the upper arm, the sleeve rides up and the arm cannot bend or reach.', words: ['tight sleeve', 'full upper arm', 'sleeve too tight'],
    when: sleeved, sided: 'either',
    signs: [
      { sign: 'tight', zone: 'sleeve', weight: 'decisive', because: 'the sleeve is strained round the arm', amounts: { cloth: 1, gap: 1 }, after: 'The arm bends and reaches easily.' },
      { sign: 'binds', zone: 'sleeve', weight: 'strong', because: 'it stops the arm', amounts: { cloth: 1, gap: 1 } },
      { sign: 'drag-lines', zone: 'sleeve', direction: 'horizontal', weight: 'strong', because: 'lines straight across say that width is missing' },
      { sign: 'excess', zone: 'sleeve', weight: 'decisive', against: true, because: 'spare cloth in the sleeve is the reverse of it' },
    ],
    measures: [{ plus: ['body:upper-arm'], minus: ['finished:upper-arm'], lessMm: -50, grades: [{ from: 15, weight: 'strong' }, { from: 5, weight: 'fair' }, { below: 0, weight: 'fair', against: true }], amount: 1, because: 'arm and ease are {value} more than the sleeve' }],
    amounts: { direction: 1, usualMm: [10, 18, 26] },
    change: { operation: 'sleeve-biceps', steps: [{ piece: 'sleeve', edge: 'biceps line', edges: 1, share: 'length', text: 'Slash the {side} sleeve down its middle and across at the biceps, hinge at cap top, underarm points and hem, and spread it by {amount}; the cap falls a little.' }], companions: [liningAlike, { piece: 'cuff', text: 'The cuff stays unless the hem was opened.' }] },
    limits: { leastMm: 5, mostMm: 60, beyond: 'Add at the underarm seam of sleeve and body as well.' }, stage: 'sleeve', opposite: 'thin-upper-arm', predicts: 'The arm bends and reaches easily.', recheck: ['cap ease', 'reach'], source: 'sewing magazine, 2021 (two inches of ease at the biceps); Sleeve Fundamentals, Santa Rosa Junior College; slash: common practice',
    rivals: [{ cause: 'broad-back', check: { id: 'broad-back~full-upper-arm', ask: 'Release the back armhole seam. Does a gap open there?', yes: 'The back lacks width.', no: 'The sleeve is narrow.', yesMeans: 'rival' } }, { cause: 'shoulder-short', check: { id: 'shoulder-short~full-upper-arm', ask: 'Release the sleeve at the top. Does it fall clear and lie flat?', yes: 'The shoulder was short.', no: 'The sleeve is narrow.', yesMeans: 'rival' } }],
    drawing: { sign: { figure: 'front', region: box, strokes: [{ kind: 'press', from: [0.3, 0.27], to: [0.37, 0.27] }, { kind: 'drag', from: [0.36, 0.25], to: [0.31, 0.25] }] }, change: { piece: 'sleeve', marks: [{ kind: 'cut', from: [0.5, 0], to: [0.5, 1] }, { kind: 'cut', from: [0.05, 0.3], to: [0.95, 0.3] }, { kind: 'spread', from: [0.5, 0.3], to: [0.56, 0.3], label: 'spread' }] } },
  },
  {
    cause: 'thin-upper-arm', title: 'Overlap the sleeve at the upper arm', sentence: 'The sleeve is wider at the upper arm than it needs to be.',
    recognise: 'Upright folds stand down the upper sleeve.', words: ['loose sleeve', 'thin arm'],
    when: sleeved, sided: 'either',
    signs: [
      { sign: 'excess', zone: 'sleeve', direction: 'vertical', weight: 'decisive', because: 'upright folds are spare width', amounts: { 'fold-depth': 1, cloth: 1 }, after: 'The sleeve hangs smooth.' },
      { sign: 'tight', zone: 'sleeve', weight: 'decisive', against: true, because: 'a sleeve that strains is not wide' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [10, 18, 26] },
    change: { operation: 'sleeve-biceps', steps: [{ piece: 'sleeve', edge: 'biceps line', edges: 1, share: 'length', text: 'Slash the {side} sleeve as for a fuller arm and overlap {amount} at the biceps; the cap rises a little, ease it out.' }], companions: [liningAlike, { piece: 'cuff', text: 'The cuff stays unless the hem was closed.' }] },
    limits: { leastMm: 5, mostMm: 50, beyond: 'Keep the ease the arm needs to bend.' }, stage: 'sleeve', opposite: 'full-upper-arm', predicts: 'The sleeve hangs smooth.', recheck: ['cap ease', 'bending the arm'], source: 'Pattern Alteration: A Guide for Leaders in Clothing Programs, Home Economics Research Report 32, U.S. Department of Agriculture, 1965 (thin arm); Sleeve Fundamentals, Santa Rosa Junior College (ease)',
    rivals: [{ cause: 'shoulder-long', check: { ask: 'Does the armhole seam lie on the joint?', yes: 'Only the sleeve is wide.', no: 'The shoulder is long.' } }],
    drawing: { sign: { figure: 'front', region: box, strokes: [{ kind: 'fold', from: [0.33, 0.22], to: [0.32, 0.32] }, { kind: 'fold', from: [0.36, 0.22], to: [0.35, 0.32] }] }, change: { piece: 'sleeve', marks: [{ kind: 'overlap', from: [0.48, 0.3], to: [0.54, 0.3], label: 'overlapped' }] } },
  },
  {
    cause: 'sleeve-long', title: 'Shorten the sleeve above and below the elbow', sentence: 'The sleeve is longer than it needs to be.',
    recognise: 'The sleeve covers the hand at rest.', words: ['sleeve too long'],
    when: sleeved, sided: 'either',
    signs: [{ sign: 'long', zone: 'sleeve', weight: 'decisive', because: 'the hem lies below the wrist bone', amounts: { shift: 1, cloth: 1, 'fold-depth': 1 }, after: 'The sleeve ends at the wrist bone.' }, { sign: 'drops', zone: 'sleeve', weight: 'fair', because: 'the hem hangs low', amounts: { shift: 1 } }, { sign: 'long', zone: 'shoulder', weight: 'fair', against: true, because: 'a long shoulder pushes the sleeve down' }],
    measures: [{ plus: ['pattern:arm-length'], minus: ['body:arm-length'], grades: [{ from: 12, weight: 'fair' }, { below: 0, weight: 'fair', against: true }], amount: 1, because: 'the size is drafted for an arm {value} longer' }],
    amounts: { direction: -1, usualMm: [10, 18, 30] },
    change: { operation: 'lengthen', steps: [{ piece: 'sleeve', edge: 'lengthen lines', edges: 1, share: 'length', text: 'Fold the {side} sleeve shorter by {amount} in all, above and below the elbow, so that the elbow keeps its place.' }], companions: [liningAlike, { piece: 'under-sleeve', text: 'Shorten the under sleeve by {whole}.', times: 1, when: { needs: ['two-piece-sleeve'] } }], noCompanions: 'the cuff stays' },
    limits: { leastMm: 4, mostMm: 80, beyond: 'Look at the shoulder length first.' }, stage: 'sleeve', opposite: 'sleeve-short', predicts: 'The sleeve ends at the wrist bone.', recheck: ['arm bent, fingertips at the ear'], source: 'Fitting Dresses, U.S. Department of Agriculture, 1946 (test with the bent arm); split: common practice',
    rivals: [{ cause: 'shoulder-long', check: { ask: 'Does the armhole seam lie on the joint?', yes: 'The sleeve itself is long.', no: 'The shoulder is long.' } }],
    drawing: { sign: { figure: 'front', region: [0.2, 0.3, 0.5, 0.6], strokes: [{ kind: 'level', from: [0.27, 0.52], to: [0.33, 0.52] }] }, change: { piece: 'sleeve', marks: [{ kind: 'overlap', from: [0.05, 0.5], to: [0.95, 0.54], label: 'folded' }] } },
  },
  {
    cause: 'sleeve-short', title: 'Lengthen the sleeve above and below the elbow', sentence: 'The sleeve is shorter than it needs to be.',
    recognise: 'The sleeve draws up from the wrist when the arm bends.', words: ['sleeve too short'],
    when: sleeved, sided: 'either',
    signs: [{ sign: 'short', zone: 'sleeve', weight: 'decisive', because: 'the hem lies above the wrist bone', amounts: { shift: 1, cloth: 1, gap: 1 }, after: 'The sleeve covers the wrist bone with the arm bent.' }, { sign: 'rises', zone: 'sleeve', weight: 'fair', because: 'the hem draws up', amounts: { shift: 1 } }, { sign: 'tight', zone: 'sleeve', weight: 'fair', against: true, because: 'a tight sleeve rides up' }],
    measures: [{ plus: ['body:arm-length'], minus: ['pattern:arm-length'], grades: [{ from: 12, weight: 'fair' }, { below: 0, weight: 'fair', against: true }], amount: 1, because: 'the arm is {value} longer than the size is drafted for' }],
    amounts: { direction: 1, usualMm: [10, 18, 30] },
    change: { operation: 'lengthen', steps: [{ piece: 'sleeve', edge: 'lengthen lines', edges: 1, share: 'length', text: 'Lengthen the {side} sleeve by {amount} in all, above and below the elbow, so that the elbow keeps its place.' }], companions: [liningAlike, { piece: 'under-sleeve', text: 'Lengthen the under sleeve by {whole}.', times: 1, when: { needs: ['two-piece-sleeve'] } }], noCompanions: 'the cuff stays' },
    limits: { leastMm: 4, mostMm: 80, beyond: 'Look at the upper arm first.' }, stage: 'sleeve', opposite: 'sleeve-long', predicts: 'The sleeve covers the wrist bone with the arm bent.', recheck: ['arm bent, fingertips at the ear'], source: 'Fitting Dresses, U.S. Department of Agriculture, 1946 (test with the bent arm); split: common practice',
    rivals: [{ cause: 'full-upper-arm', check: { ask: 'Is the upper arm easy?', yes: 'Length is missing.', no: 'The sleeve is tight and rides up.' } }],
    drawing: { sign: { figure: 'front', region: [0.2, 0.3, 0.5, 0.6], strokes: [{ kind: 'level', from: [0.28, 0.45], to: [0.34, 0.45] }] }, change: { piece: 'sleeve', marks: [{ kind: 'spread', from: [0.05, 0.5], to: [0.05, 0.55], label: 'spread' }] } },
  },
]
