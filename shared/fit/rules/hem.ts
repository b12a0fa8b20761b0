import { type Rule } from '../rule.ts'

const all = ['skirt', 'trousers', 'bodice', 'shirt', 'dress', 'jacket', 'coat'] as const
const hemBox = [0.28, 0.4, 0.72, 0.95] as const
const whole = { piece: 'lining', text: 'Change the lining by {whole}.', times: 1, when: { needs: ['lining'] } } as const
const lengthSteps = (verb: string) => [
  { piece: 'skirt-front', edge: 'lengthen line', edges: 1, share: 'length', text: `${verb} the front by {amount} at its lengthen line; a straight piece at the hem.`, when: { kinds: ['skirt', 'dress'] } },
  { piece: 'skirt-back', edge: 'lengthen line', edges: 1, share: 'length', text: `${verb} the back by {amount} alike.`, when: { kinds: ['skirt', 'dress'] } },
  { piece: 'trouser-front', edge: 'lengthen line', edges: 1, share: 'length', text: `${verb} each front by {amount}, between knee and hem.`, when: { kinds: ['trousers'] } },
  { piece: 'trouser-back', edge: 'lengthen line', edges: 1, share: 'length', text: `${verb} each back by {amount} alike.`, when: { kinds: ['trousers'] } },
  { piece: 'bodice-front', edge: 'lengthen line below the waist', edges: 1, share: 'length', text: `${verb} the front by {amount} below the waist.`, when: { kinds: ['bodice', 'shirt', 'jacket', 'coat'] } },
  { piece: 'bodice-back', edge: 'lengthen line below the waist', edges: 1, share: 'length', text: `${verb} the back by {amount} alike.`, when: { kinds: ['bodice', 'shirt', 'jacket', 'coat'] } },
] as const

export const hemRules: readonly Rule[] = [
  {
    cause: 'hem-short', title: 'Lengthen every piece at the lengthen line', sentence: 'The garment is shorter than it should be, evenly all round.',
    recognise: 'The hem is level and lies too high.', words: ['too short', 'hem too high'], when: { kinds: [...all] }, sided: 'both',
    signs: [
      { sign: 'short', zone: ['hem', 'leg', 'whole'], weight: 'strong', because: 'the hem lies too high all round', amounts: { shift: 1, cloth: 1, gap: 1 }, after: 'The hem lies at the length you want.' },
      { sign: 'rises', zone: 'hem', side: 'one', weight: 'strong', against: true, because: 'a hem that rises on one side is not a matter of length' },
    ],
    measures: [], amounts: { direction: 1, usualMm: [15, 30, 50] },
    change: { operation: 'lengthen', steps: lengthSteps('Lengthen'), companions: [whole, { piece: 'front-facing', text: 'Lengthen the facing by {whole}.', times: 1, when: { needs: ['button-front'] } }], noCompanions: 'nothing else reaches the hem' },
    limits: { leastMm: 5, mostMm: 200, beyond: 'Share it between two levels, so that the shape stays.' }, stage: 'hem', opposite: 'hem-long', predicts: 'The hem lies at the length you want.', recheck: ['hem from the floor, in the shoes'], source: 'Pattern Alterations, costume text ch. 17, Central Washington University; limit: common practice',
    rivals: [{ cause: 'hip-tight', check: { ask: 'Pull it down smooth. Does it stay?', yes: 'Length is missing.', no: 'It is tight and climbs.' } }],
    drawing: { sign: { figure: 'front', region: hemBox, strokes: [{ kind: 'level', from: [0.37, 0.66], to: [0.63, 0.66] }] }, change: { piece: 'skirt-front', marks: [{ kind: 'cut', from: [0, 0.6], to: [0.95, 0.6] }, { kind: 'spread', from: [0.5, 0.6], to: [0.5, 0.66], label: 'spread' }] } },
  },
  {
    cause: 'hem-long', title: 'Shorten every piece at the lengthen line', sentence: 'The garment is longer than it should be, evenly all round.',
    recognise: 'The hem is level and lies too low.', words: ['too long', 'hem too low'], when: { kinds: [...all] }, sided: 'both',
    signs: [
      { sign: 'long', zone: ['hem', 'leg', 'whole'], weight: 'strong', because: 'the hem lies too low all round', amounts: { shift: 1, cloth: 1, 'fold-depth': 1 }, after: 'The hem lies at the length you want.' },
      { sign: 'drops', zone: 'hem', side: 'one', weight: 'strong', against: true, because: 'a hem that drops on one side is not a matter of length' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [15, 30, 50] },
    change: { operation: 'lengthen', steps: lengthSteps('Shorten'), companions: [whole, { piece: 'front-facing', text: 'Shorten the facing by {whole}.', times: 1, when: { needs: ['button-front'] } }], noCompanions: 'nothing else reaches the hem' },
    limits: { leastMm: 5, mostMm: 200, beyond: 'Share it between two levels, so that the shape stays.' }, stage: 'hem', opposite: 'hem-short', predicts: 'The hem lies at the length you want.', recheck: ['hem from the floor, in the shoes'], source: 'Pattern Alterations, costume text ch. 17, Central Washington University; limit: common practice',
    rivals: [{ cause: 'skirt-slips', check: { ask: 'Hold the waist where it belongs. Is the hem still too low?', yes: 'Length is spare.', no: 'It slips from the waist.' } }],
    drawing: { sign: { figure: 'front', region: hemBox, strokes: [{ kind: 'level', from: [0.36, 0.85], to: [0.64, 0.85] }] }, change: { piece: 'skirt-front', marks: [{ kind: 'overlap', from: [0, 0.6], to: [0.95, 0.66], label: 'folded' }] } },
  },
  {
    cause: 'side-seam-forward', title: 'Move the side seam back', sentence: 'The front is wider than its share and the back narrower.',
    recognise: 'The side seam swings forward though lengths and widths are right.', words: ['side seam swings forward'], when: { kinds: ['skirt', 'trousers', 'dress', 'bodice'] }, sided: 'either',
    signs: [
      { sign: 'swings', zone: ['hem', 'hip', 'leg', 'whole'], towards: 'front', line: 'side-seam', weight: 'strong', because: 'the seam leaves the plumb line forward', amounts: { shift: 1 }, after: 'The side seam hangs plumb.' },
      { sign: 'tight', zone: ['abdomen', 'bust'], weight: 'strong', against: true, because: 'strain in front draws the seam forward by itself' },
      { sign: 'excess', zone: ['seat', 'waist'], view: 'back', weight: 'fair', against: true, because: 'spare length behind lets the seam go forward' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [6, 10, 16] },
    change: { operation: 'seam-shift', steps: [
      { piece: 'skirt-front', edge: 'side seam', edges: 1, share: 'length', taper: 'to nothing where it begins to swing', text: 'Take {amount} off the side of the front at the hem, to nothing where the seam begins to swing.', when: { kinds: ['skirt', 'dress'] } },
      { piece: 'skirt-back', edge: 'side seam', edges: 1, share: 'length', times: -1, taper: 'to nothing where it begins to swing', text: 'Add {amount} to the side of the back at the hem.', when: { kinds: ['skirt', 'dress'] } },
      { piece: 'trouser-front', edge: 'side seam', edges: 1, share: 'length', taper: 'to nothing at the hip', text: 'Take {amount} off the side of each front at the hem.', when: { kinds: ['trousers'] } },
      { piece: 'trouser-back', edge: 'side seam', edges: 1, share: 'length', times: -1, taper: 'to nothing at the hip', text: 'Add {amount} to the side of each back at the hem.', when: { kinds: ['trousers'] } },
      { piece: 'bodice-front', edge: 'side seam', edges: 1, share: 'length', taper: 'to nothing at the underarm', text: 'Take {amount} off the side of the front at the hem.', when: { kinds: ['bodice'] } },
      { piece: 'bodice-back', edge: 'side seam', edges: 1, share: 'length', times: -1, taper: 'to nothing at the underarm', text: 'Add {amount} to the side of the back at the hem.', when: { kinds: ['bodice'] } },
    ], companions: [{ piece: 'pocket', text: 'The pocket follows the seam.', when: { needs: ['pockets'] } }], noCompanions: 'what one piece gives the other takes' },
    limits: { leastMm: 4, mostMm: 30, beyond: 'Look for the cause in the lengths of front and back first.' }, stage: 'hem', opposite: 'side-seam-back', predicts: 'The side seam hangs plumb.', recheck: ['side seam against a plumb line'], source: 'Fitting Dresses, U.S. Department of Agriculture, rev. 1946 (side seams hang straight); order of work: common practice',
    rivals: [{ cause: 'full-abdomen-skirt', check: { id: 'full-abdomen-skirt~side-seam-forward', ask: 'Is the front strained over the abdomen?', yes: 'The abdomen draws the seam forward.', no: 'Only the seam is misplaced.', yesMeans: 'rival' } }, { cause: 'flat-seat-skirt', check: { ask: 'Does the back hem hang level?', yes: 'Only the seam is misplaced.', no: 'The back is too long.' } }],
    drawing: { sign: { figure: 'side', region: hemBox, strokes: [{ kind: 'plumb', from: [0.5, 0.42], to: [0.44, 0.84] }] }, change: { piece: 'skirt-front', marks: [{ kind: 'taper', from: [0.95, 0.35], to: [0.9, 1], label: 'in' }] } },
  },
  {
    cause: 'side-seam-back', title: 'Move the side seam forward', sentence: 'The back is wider than its share and the front narrower.',
    recognise: 'The side seam swings back though lengths and widths are right.', words: ['side seam swings back'], when: { kinds: ['skirt', 'trousers', 'dress', 'bodice'] }, sided: 'either',
    signs: [
      { sign: 'swings', zone: ['hem', 'hip', 'leg', 'whole'], towards: 'back', line: 'side-seam', weight: 'strong', because: 'the seam leaves the plumb line backward', amounts: { shift: 1 }, after: 'The side seam hangs plumb.' },
      { sign: 'tight', zone: 'seat', weight: 'strong', against: true, because: 'strain over the seat draws the seam back by itself' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [6, 10, 16] },
    change: { operation: 'seam-shift', steps: [
      { piece: 'skirt-back', edge: 'side seam', edges: 1, share: 'length', taper: 'to nothing where it begins to swing', text: 'Take {amount} off the side of the back at the hem.', when: { kinds: ['skirt', 'dress'] } },
      { piece: 'skirt-front', edge: 'side seam', edges: 1, share: 'length', times: -1, taper: 'to nothing where it begins to swing', text: 'Add {amount} to the side of the front at the hem.', when: { kinds: ['skirt', 'dress'] } },
      { piece: 'trouser-back', edge: 'side seam', edges: 1, share: 'length', taper: 'to nothing at the hip', text: 'Take {amount} off the side of each back at the hem.', when: { kinds: ['trousers'] } },
      { piece: 'trouser-front', edge: 'side seam', edges: 1, share: 'length', times: -1, taper: 'to nothing at the hip', text: 'Add {amount} to the side of each front at the hem.', when: { kinds: ['trousers'] } },
      { piece: 'bodice-back', edge: 'side seam', edges: 1, share: 'length', taper: 'to nothing at the underarm', text: 'Take {amount} off the side of the back at the hem.', when: { kinds: ['bodice'] } },
      { piece: 'bodice-front', edge: 'side seam', edges: 1, share: 'length', times: -1, taper: 'to nothing at the underarm', text: 'Add {amount} to the side of the front at the hem.', when: { kinds: ['bodice'] } },
    ], companions: [{ piece: 'pocket', text: 'The pocket follows the seam.', when: { needs: ['pockets'] } }], noCompanions: 'what one piece gives the other takes' },
    limits: { leastMm: 4, mostMm: 30, beyond: 'Look for the cause in the lengths of front and back first.' }, stage: 'hem', opposite: 'side-seam-forward', predicts: 'The side seam hangs plumb.', recheck: ['side seam against a plumb line'], source: 'Fitting Dresses, U.S. Department of Agriculture, rev. 1946 (side seams hang straight); order of work: common practice',
    rivals: [{ cause: 'full-seat-skirt', check: { ask: 'Is the back easy over the seat?', yes: 'Only the seam is misplaced.', no: 'The seat draws the seam back.' } }, { cause: 'back-crotch-short', check: { ask: 'Does the back waist stay up when sitting?', yes: 'Only the seam is misplaced.', no: 'The back crotch is short.' } }],
    drawing: { sign: { figure: 'side', region: hemBox, strokes: [{ kind: 'plumb', from: [0.5, 0.42], to: [0.56, 0.84] }] }, change: { piece: 'skirt-back', marks: [{ kind: 'taper', from: [0.95, 0.35], to: [0.9, 1], label: 'in' }] } },
  },
]
