import { type Rule } from '../rule.ts'

const belly = [0.28, 0.34, 0.72, 0.7] as const

export const abdomenRules: readonly Rule[] = [
  {
    cause: 'full-abdomen-skirt', title: 'Raise the front waist and give the front width', sentence: 'The front is shorter and narrower over the abdomen than it needs to be.',
    recognise: 'The front hem rises and swings out, folds run from the abdomen to the side seams, and these are drawn forward.', words: ['full tummy', 'front hem rises', 'skirt sticks out in front'],
    when: { kinds: ['skirt', 'dress'] }, sided: 'both',
    signs: [
      { sign: 'rises', zone: 'hem', view: ['front', 'side'], weight: 'fair', because: 'the front is used up over the abdomen', amounts: { gap: 1, shift: 1 }, after: 'The front hem hangs level.' },
      { sign: 'tight', zone: 'abdomen', weight: 'decisive', because: 'the front is strained over the abdomen', amounts: { gap: 1 }, after: 'The front lies easy over the abdomen.' },
      { sign: 'drag-lines', zone: ['abdomen', 'hip'], view: ['front', 'side'], towards: ['abdomen', 'side-seam'], weight: 'strong', because: 'the lines run from the abdomen to the side seams' },
      { sign: 'swings', zone: ['hem', 'hip', 'whole'], towards: 'front', line: 'side-seam', weight: 'fair', because: 'the abdomen draws the side seam forward' },
      { sign: 'tight', zone: ['hip', 'seat'], view: 'back', weight: 'fair', against: true, because: 'a back that is tight too asks for width all round' },
    ],
    measures: [{ plus: ['body:abdomen'], minus: ['body:hip'], lessMm: -60, grades: [{ from: 20, weight: 'slight' }], because: 'the abdomen is nearly as large as the hip' }],
    amounts: { direction: 1, usualMm: [8, 15, 25] },
    change: { operation: 'seam-shift', steps: [
      { piece: 'skirt-front', edge: 'waist at the centre front', edges: 1, share: 'length', taper: 'to nothing at the side seam', text: 'Raise the front waist by {amount} at the centre, to nothing at the side seam, and let the front dart be smaller by as much as the abdomen needs in width.' },
    ], companions: [{ piece: 'waistband', text: 'Walk the new edge against the band; add what the smaller darts give.', when: { waist: ['fitted'] } }, { piece: 'casing', text: 'Mark the fold line of the casing parallel to the raised edge.', when: { waist: ['elastic'] } }, { piece: 'lining', text: 'Change the front lining alike.', when: { needs: ['lining'] } }], noCompanions: 'a dress takes it from the bodice' },
    limits: { leastMm: 5, mostMm: 45, beyond: 'Slash the front across to hinges at the side seams instead, and let the side seams out in front.' }, stage: 'length',
    predicts: 'The front hem hangs level and the side seams hang plumb.', recheck: ['front hem', 'side seams', 'sitting down'],
    source: 'common practice; sign listed in Pattern Alteration: A Guide for Leaders in Clothing Programs, Home Economics Research Report 32, U.S. Department of Agriculture, 1965; ease over the abdomen: I. Ahn, Measurements for Fitting Pants, Guide C-209, New Mexico State University',
    rivals: [{ cause: 'hip-tight', check: { id: 'full-abdomen-skirt~hip-tight', ask: 'Let the front waist down until the hem is level. Does the strain go?', yes: 'Length was missing over the abdomen.', no: 'Width is missing all round.' } }, { cause: 'side-seam-forward', check: { ask: 'Is the front strained over the abdomen?', yes: 'The abdomen draws the seam forward.', no: 'Only the seam is misplaced.' } }],
    drawing: { sign: { figure: 'side', region: belly, strokes: [{ kind: 'drag', from: [0.42, 0.46], to: [0.5, 0.5] }, { kind: 'plumb', from: [0.5, 0.42], to: [0.45, 0.68] }, { kind: 'level', from: [0.4, 0.66], to: [0.58, 0.69] }] }, change: { piece: 'skirt-front', marks: [{ kind: 'taper', from: [0, 0], to: [0.9, 0.03], label: 'raised' }] } },
  },
  {
    cause: 'full-abdomen-trousers', title: 'Open a wedge across the front above the crotch', sentence: 'The front is shorter and narrower over the abdomen than it needs to be.',
    recognise: 'The front waist is dragged down, folds run from the crotch up to the hip bones, and the fly strains.', words: ['full tummy trousers', 'front waist dips', 'pockets gape'],
    when: { kinds: ['trousers'] }, sided: 'both',
    signs: [
      { sign: 'tight', zone: 'abdomen', weight: 'decisive', because: 'the front is strained over the abdomen', amounts: { gap: 1 }, after: 'The front lies easy over the abdomen.' },
      { sign: 'drops', zone: 'waist', view: ['front', 'side'], weight: 'strong', because: 'the front waist is dragged down', amounts: { gap: 1, shift: 1 } },
      { sign: 'gaping', zone: 'hip', view: 'front', weight: 'fair', because: 'the pockets are pulled open in front' },
      { sign: 'drag-lines', zone: 'crotch', towards: 'hip', weight: 'fair', because: 'the lines run from the crotch up to the hip bones' },
      { sign: 'tight', zone: 'seat', weight: 'fair', against: true, because: 'a back that is tight too asks for width all round' },
    ],
    measures: [], amounts: { direction: 1, usualMm: [8, 15, 25] },
    change: { operation: 'slash-hinge', steps: [{ piece: 'trouser-front', edge: 'centre front above the crotch', edges: 1, share: 'length', taper: 'to nothing at the side seam', text: 'Slash each front from the centre above the crotch to a hinge at the side seam and open it by {amount}; redraw the centre front and make the front dart smaller.' }], companions: [{ piece: 'fly', text: 'Lengthen fly and zip opening by {whole}.', times: 1, when: { needs: ['fly'] } }, { piece: 'waistband', text: 'Walk the new edge against the band.', when: { waist: ['fitted'] } }, { piece: 'pocket', text: 'Move the pocket with the cut.', when: { needs: ['pockets'] } }], noCompanions: 'the casing follows its edge' },
    limits: { leastMm: 5, mostMm: 45, beyond: 'Let the front side seams out as well.' }, stage: 'length',
    predicts: 'The front waist stays in its place.', recheck: ['sitting down', 'front crotch'], source: 'common practice',
    rivals: [{ cause: 'front-crotch-short', check: { ask: 'Is the strain above the crotch, on the abdomen?', yes: 'Room is missing over the abdomen.', no: 'The crotch itself is short.' } }, { cause: 'waist-front-low', check: { ask: 'Is the front strained as well as low?', yes: 'Room is missing over the abdomen.', no: 'Only the edge lies low.' } }],
    drawing: { sign: { figure: 'front', region: belly, strokes: [{ kind: 'press', from: [0.42, 0.45], to: [0.58, 0.45] }, { kind: 'level', from: [0.4, 0.41], to: [0.6, 0.41], bend: 0.03 }, { kind: 'drag', from: [0.5, 0.53], to: [0.41, 0.45] }] }, change: { piece: 'trouser-front', marks: [{ kind: 'cut', from: [0.95, 0.16], to: [0.05, 0.16] }, { kind: 'hinge', from: [0.05, 0.16], to: [0.05, 0.16] }, { kind: 'spread', from: [0.95, 0.16], to: [0.95, 0.21], label: 'opened' }] } },
  },
  {
    cause: 'flat-abdomen', title: 'Slim the front darts', sentence: 'The front darts make more room than there is to fill.',
    recognise: 'A pouch stands at the ends of the front darts, and the cloth is slack between them.', words: ['flat tummy', 'pouch at front darts'],
    when: { kinds: ['skirt', 'trousers'], without: ['dartless'] }, sided: 'both',
    signs: [
      { sign: 'excess', zone: 'abdomen', view: ['front', 'side'], weight: 'strong', because: 'the darts let out more than is there', amounts: { 'fold-depth': 1, cloth: 1 }, after: 'The front lies flat below the darts.' },
      { sign: 'tight', zone: 'abdomen', weight: 'decisive', against: true, because: 'an abdomen that strains is not too roomy' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [8, 14, 20] },
    change: { operation: 'dart-intake', steps: [
      { piece: 'skirt-front', edge: 'dart intake', edges: 2, share: 'width', text: 'Make each front dart {amount} narrower and take the same in at the side seam, so that the waist keeps its length.', when: { kinds: ['skirt'] } },
      { piece: 'trouser-front', edge: 'dart intake', edges: 2, share: 'width', text: 'Make each front dart {amount} narrower and take the same in at the side seam.', when: { kinds: ['trousers'] } },
    ], companions: [{ piece: 'lining', text: 'Change the lining darts alike.', when: { needs: ['lining'] } }], noCompanions: 'the waist keeps its length' },
    limits: { leastMm: 4, mostMm: 36, beyond: 'Turn the darts toward the hip bones.' }, stage: 'dart',
    predicts: 'The front lies flat below the darts.', recheck: ['side seam curve'], source: 'common practice',
    rivals: [{ cause: 'hip-dart-point', check: { id: 'hip-dart-point~flat-abdomen', ask: 'Unpick the dart halfway. Does the cloth lie flat at once?', yes: 'The tip was too long.', no: 'The dart takes out more than is there.', yesMeans: 'rival' } }],
    drawing: { sign: { figure: 'front', region: belly, strokes: [{ kind: 'fold', from: [0.44, 0.46], to: [0.48, 0.46], bend: 0.02 }, { kind: 'fold', from: [0.52, 0.46], to: [0.56, 0.46], bend: 0.02 }] }, change: { piece: 'skirt-front', marks: [{ kind: 'move', from: [0.55, 0], to: [0.52, 0], label: 'narrower' }] } },
  },
  {
    cause: 'large-waist-jacket', title: 'Give width at the side of the waist and at the front edge', sentence: 'The jacket is narrower at the waist than it needs to be.',
    recognise: 'The button strains at the waist, the fronts swing apart below it and the hem kicks.', words: ['jacket button strains', 'fronts swing apart'],
    when: { kinds: ['jacket', 'coat', 'shirt'] }, sided: 'both',
    signs: [
      { sign: 'tight', zone: ['waist', 'abdomen'], view: ['front', 'side'], weight: 'strong', because: 'the button strains at the waist', amounts: { cloth: 1, gap: 1 }, after: 'The button closes without strain.' },
      { sign: 'gaping', zone: ['waist', 'abdomen', 'hem'], view: 'front', line: 'centre-front', weight: 'strong', because: 'the fronts are drawn apart', amounts: { gap: 1, cloth: 1 } },
      { sign: 'swings', zone: ['hem', 'whole'], line: 'centre-front', weight: 'fair', because: 'the fronts swing apart at the hem' },
      { sign: 'tight', zone: 'bust', weight: 'fair', against: true, because: 'a chest that strains draws the fronts apart higher up' },
    ],
    measures: [{ plus: ['body:waist'], minus: ['pattern:waist'], grades: [{ from: 20, weight: 'fair' }, { below: 0, weight: 'fair', against: true }], amount: 1, because: 'the waist is {value} more than this size is drafted for' }],
    amounts: { direction: 1, usualMm: [12, 24, 40] },
    change: { operation: 'seam-shift', steps: [
      { piece: 'bodice-front', edge: 'side seam at the waist', edges: 2, share: 'width', taper: 'to nothing at the underarm', text: 'Move the side seam of the front out by {amount} at the waist, to nothing at the underarm, straight to the hem.' },
      { piece: 'bodice-back', edge: 'side seam at the waist', edges: 2, share: 'width', taper: 'to nothing at the underarm', text: 'Move the side seam of the back out by {amount} alike.' },
    ], companions: [{ piece: 'lining', text: 'Let the lining out alike.', when: { needs: ['lining'] } }, { piece: 'front-facing', text: 'Where the front edge is moved too, the facing follows.' }] },
    limits: { leastMm: 6, mostMm: 60, beyond: 'Give the rest at the front edge from the chest down.' }, stage: 'waist',
    predicts: 'The button closes without strain and the fronts hang straight.', recheck: ['fronts at the hem', 'armhole'], source: 'G. F. Hertzer, Garment Cutting in the Twentieth Century, screens 14 and 87 and the chapter on large waists; equal shares over the seams: common practice',
    rivals: [{ cause: 'jacket-hip-tight', check: { id: 'jacket-hip-tight~large-waist-jacket', ask: 'Open the last button. Do the fronts hang straight at the waist?', yes: 'Only the hip lacks width.', no: 'The waist lacks width.', yesMeans: 'rival' } }],
    drawing: { sign: { figure: 'front', region: belly, strokes: [{ kind: 'press', from: [0.42, 0.39], to: [0.58, 0.39] }, { kind: 'plumb', from: [0.5, 0.4], to: [0.44, 0.56] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'taper', from: [0.85, 0.45], to: [0.95, 0.7], label: 'out' }] } },
  },
]
