import { type Rule } from '../rule.ts'

const trousers = { kinds: ['trousers'] } as const
const legBox = [0.3, 0.5, 0.7, 0.95] as const
const liningAlike = { piece: 'lining', text: 'Change the lining alike.', when: { needs: ['lining'] } } as const

export const legRules: readonly Rule[] = [
  {
    cause: 'thigh-inner-tight', title: 'Extend both inseam points', sentence: 'The leg is narrower at the top of the thigh than it needs to be.',
    recognise: 'The cloth strains or folds at the inner thigh and rubs, while hip and crotch depth are right.', words: ['tight thighs', 'inner thigh rubs'],
    when: trousers, sided: 'either',
    signs: [
      { sign: 'tight', zone: 'thigh', weight: 'decisive', because: 'the leg is strained at the thigh', amounts: { cloth: 1, gap: 1 }, perSide: ['cloth', 'gap'], after: 'The thigh is easy.' },
      { sign: 'drag-lines', zone: 'thigh', towards: ['crotch', 'thigh'], weight: 'fair', because: 'the lines are caught at the inner thigh' },
      { sign: 'excess', zone: 'thigh', weight: 'decisive', against: true, because: 'spare cloth at the thigh is the reverse of it' },
      { sign: 'tight', zone: 'thigh', view: 'front', direction: 'horizontal', weight: 'fair', against: true, because: 'strain straight across the front is a matter of the front' },
    ],
    measures: [{ plus: ['body:thigh'], minus: ['pattern:thigh'], grades: [{ from: 15, weight: 'strong' }, { from: 6, weight: 'fair' }, { below: -6, weight: 'fair', against: true }], because: 'the thigh is {value} more than the size is drafted for' }],
    amounts: { direction: 1, usualMm: [16, 24, 40] },
    change: { operation: 'crotch-extension', steps: [
      { piece: 'trouser-front', edge: 'inseam below the crotch', edges: 2, share: 'width', taper: 'to nothing at the knee', text: 'Let the inseam of the {side} front out by {amount} at the thigh, to nothing at the knee.' },
      { piece: 'trouser-back', edge: 'inseam below the crotch', edges: 2, share: 'width', taper: 'to nothing at the knee', text: 'Let the inseam of the {side} back out by {amount} alike.' },
    ], companions: [liningAlike], noCompanions: 'the inseams stay alike' },
    limits: { leastMm: 4, mostMm: 80, beyond: 'Share it with the side seams below the hip.' }, stage: 'hip', predicts: 'The thigh is easy, standing and sitting.', recheck: ['crotch curve', 'inseams against each other'],
    source: 'L. Loftin, Altering the crotch pattern, 2009 (a change of the crotch point changes the thigh); amounts: common practice',
    rivals: [{ cause: 'front-crotch-short', check: { id: 'front-crotch-short~thigh-inner-tight', ask: 'Is the thigh easy below the crotch?', yes: 'It is the crotch.', no: 'The thigh lacks width.', yesMeans: 'rival' } }],
    drawing: { sign: { figure: 'front', region: legBox, strokes: [{ kind: 'press', from: [0.42, 0.58], to: [0.58, 0.58] }, { kind: 'drag', from: [0.44, 0.62], to: [0.49, 0.56] }] }, change: { piece: 'trouser-front', marks: [{ kind: 'taper', from: [1, 0.27], to: [0.85, 0.6], label: 'out' }] } },
  },
  {
    cause: 'thigh-loose', title: 'Take inseam and side seam in below the hip', sentence: 'The leg is wider at the thigh than it needs to be.',
    recognise: 'Upright folds stand down the thigh.', words: ['baggy thigh', 'loose leg'],
    when: trousers, sided: 'either',
    signs: [
      { sign: 'excess', zone: ['thigh', 'leg'], direction: 'vertical', weight: 'strong', because: 'upright folds at the thigh are spare width', amounts: { 'fold-depth': 1, cloth: 1 }, perSide: ['fold-depth', 'cloth'], after: 'The thigh lies smooth.' },
      { sign: 'tight', zone: 'thigh', weight: 'decisive', against: true, because: 'a thigh that strains is not wide' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [16, 24, 40] },
    change: { operation: 'seam-shift', steps: [
      { piece: 'trouser-front', edge: 'inseam and side seam at the thigh', edges: 4, share: 'width', taper: 'to nothing at the knee', text: 'Take inseam and side seam of the {side} front in by {amount} each at the thigh.' },
      { piece: 'trouser-back', edge: 'inseam and side seam at the thigh', edges: 4, share: 'width', taper: 'to nothing at the knee', text: 'Take inseam and side seam of the {side} back in by {amount} each alike.' },
    ], companions: [liningAlike], noCompanions: 'the seams stay alike' },
    limits: { leastMm: 8, mostMm: 80, beyond: 'Trace a smaller size from the hip down.' }, stage: 'hip', predicts: 'The thigh lies smooth.', recheck: ['sitting down'], source: 'common practice',
    rivals: [{ cause: 'hip-loose', check: { ask: 'Is the hip close while the thigh is loose?', yes: 'Only the leg is wide.', no: 'The hip is wide too.' } }],
    drawing: { sign: { figure: 'front', region: legBox, strokes: [{ kind: 'fold', from: [0.42, 0.56], to: [0.42, 0.7] }, { kind: 'fold', from: [0.58, 0.56], to: [0.58, 0.7] }] }, change: { piece: 'trouser-front', marks: [{ kind: 'taper', from: [0.95, 0.3], to: [0.85, 0.6], label: 'in' }] } },
  },
  {
    cause: 'knee-inward', title: 'Shift the leg inward below the crotch', sentence: 'The leg of the pattern is straighter than the hang of this leg.',
    recognise: 'Folds run from the crotch to the outer knee, the inner knee is tight and the hem swings out.', words: ['knock knees', 'folds to the outer knee'],
    when: trousers, sided: 'either',
    signs: [
      { sign: 'drag-lines', zone: ['leg', 'knee', 'thigh'], towards: ['out', 'knee'], weight: 'fair', because: 'the folds run to the outer knee' },
      { sign: 'tight', zone: 'knee', weight: 'slight', because: 'the knee is tight', amounts: { cloth: 1 } },
      { sign: 'swings', zone: ['hem', 'leg'], towards: 'out', weight: 'strong', because: 'the hem swings out', amounts: { shift: 1 }, after: 'The leg hangs straight.' },
      { sign: 'swings', zone: ['hem', 'leg'], towards: 'in', weight: 'decisive', against: true, because: 'a hem that swings in is the reverse of it' },
    ],
    measures: [], amounts: { direction: 1, usualMm: [6, 10, 16] },
    change: { operation: 'seam-shift', steps: [
      { piece: 'trouser-front', edge: 'inseam at the knee', edges: 1, share: 'length', taper: 'to nothing at the crotch', text: 'Add {amount} at the inner knee of the {side} front and take the same off the outer; redraw the crease.' },
      { piece: 'trouser-back', edge: 'inseam at the knee', edges: 1, share: 'length', taper: 'to nothing at the crotch', text: 'Add {amount} at the inner knee of the {side} back and take the same off the outer.' },
    ], companions: [liningAlike], noCompanions: 'the width of the leg stays' },
    limits: { leastMm: 4, mostMm: 30, beyond: 'Shape the seams at the knee instead of shifting the whole leg.' }, stage: 'balance', opposite: 'knee-outward', predicts: 'The leg hangs straight.', recheck: ['crease', 'inseam and outseam lengths'], source: 'G. F. Hertzer, Garment Cutting in the Twentieth Century, screen 11',
    rivals: [{ cause: 'front-crotch-short', check: { ask: 'Do the folds begin at the crotch and end at the knee, not at the hip?', yes: 'The leg is shifted.', no: 'The front crotch is short.' } }],
    drawing: { sign: { figure: 'front', region: legBox, strokes: [{ kind: 'drag', from: [0.48, 0.56], to: [0.4, 0.74] }, { kind: 'drag', from: [0.52, 0.56], to: [0.6, 0.74] }] }, change: { piece: 'trouser-front', marks: [{ kind: 'move', from: [0.5, 0.6], to: [0.56, 0.6], label: 'inward' }] } },
  },
  {
    cause: 'knee-outward', title: 'Shift the leg outward below the crotch', sentence: 'The leg of the pattern is straighter than the hang of this leg.',
    recognise: 'Folds run from the side of the hip to the inner knee and the outer knee is tight.', words: ['bow legs', 'folds to the inner knee'],
    when: trousers, sided: 'either',
    signs: [
      { sign: 'drag-lines', zone: ['leg', 'knee', 'thigh'], towards: 'in', weight: 'fair', because: 'the folds run to the inner knee' },
      { sign: 'tight', zone: 'knee', weight: 'slight', because: 'the knee is tight', amounts: { cloth: 1 } },
      { sign: 'swings', zone: ['hem', 'leg'], towards: 'in', weight: 'strong', because: 'the hem swings in', amounts: { shift: 1 }, after: 'The leg hangs straight.' },
      { sign: 'swings', zone: ['hem', 'leg'], towards: 'out', weight: 'decisive', against: true, because: 'a hem that swings out is the reverse of it' },
    ],
    measures: [], amounts: { direction: 1, usualMm: [6, 10, 16] },
    change: { operation: 'seam-shift', steps: [
      { piece: 'trouser-front', edge: 'side seam at the knee', edges: 1, share: 'length', taper: 'to nothing at the hip', text: 'Add {amount} at the outer knee of the {side} front and take a little less off the inner; redraw the crease.' },
      { piece: 'trouser-back', edge: 'side seam at the knee', edges: 1, share: 'length', taper: 'to nothing at the hip', text: 'Add {amount} at the outer knee of the {side} back and take a little less off the inner.' },
    ], companions: [liningAlike], noCompanions: 'the width of the leg stays' },
    limits: { leastMm: 4, mostMm: 30, beyond: 'Leave the inside full: it hides the line of the leg.' }, stage: 'balance', opposite: 'knee-inward', predicts: 'The leg hangs straight.', recheck: ['crease', 'inseam and outseam lengths'], source: 'G. F. Hertzer, Garment Cutting in the Twentieth Century, screen 11',
    rivals: [{ cause: 'hip-tight', check: { ask: 'Is the hip easy where the folds begin?', yes: 'The leg is shifted.', no: 'The hip is tight.' } }],
    drawing: { sign: { figure: 'front', region: legBox, strokes: [{ kind: 'drag', from: [0.38, 0.54], to: [0.46, 0.74] }, { kind: 'drag', from: [0.62, 0.54], to: [0.54, 0.74] }] }, change: { piece: 'trouser-front', marks: [{ kind: 'move', from: [0.5, 0.6], to: [0.44, 0.6], label: 'outward' }] } },
  },
  {
    cause: 'thigh-front-tight', title: 'Let the front out at inseam and side seam', sentence: 'The front is narrower at the thigh than it needs to be.',
    recognise: 'The front strains straight across the thigh, the pockets stand open and the crease bows.', words: ['full front thigh', 'front thigh tight'],
    when: trousers, sided: 'either',
    signs: [
      { sign: 'tight', zone: 'thigh', view: 'front', direction: 'horizontal', weight: 'decisive', because: 'the front alone is strained across the thigh', amounts: { cloth: 1, gap: 1 }, perSide: ['cloth', 'gap'], after: 'The front thigh is easy.' },
      { sign: 'gaping', zone: 'hip', view: 'front', weight: 'slight', because: 'the pockets are pulled open' },
      { sign: 'tight', zone: 'thigh', view: 'back', weight: 'strong', against: true, because: 'a back that is tight too asks for width all round' },
    ],
    measures: [], amounts: { direction: 1, usualMm: [12, 20, 32] },
    change: { operation: 'seam-shift', steps: [{ piece: 'trouser-front', edge: 'inseam and side seam at the thigh', edges: 4, share: 'width', taper: 'to nothing at the knee', text: 'Let inseam and side seam of the {side} front out by {amount} each below the crotch, to nothing at the knee; set the crease in the middle again.' }], companions: [liningAlike, { piece: 'pocket', text: 'The pocket opening follows the side seam.', when: { needs: ['pockets'] } }], noCompanions: 'the back stays' },
    limits: { leastMm: 5, mostMm: 60, beyond: 'Take a larger size for the front from the crotch down.' }, stage: 'hip', predicts: 'The front thigh is easy.', recheck: ['crease', 'inseams against each other'], source: 'common practice',
    rivals: [{ cause: 'thigh-inner-tight', check: { ask: 'Does the strain lie across the front and not at the inner seam?', yes: 'The front is narrow.', no: 'The inner thigh lacks width.' } }, { cause: 'hip-tight', check: { ask: 'Is the hip easy?', yes: 'Only the thigh is tight.', no: 'Let the hip out first.' } }],
    drawing: { sign: { figure: 'front', region: legBox, strokes: [{ kind: 'press', from: [0.4, 0.6], to: [0.48, 0.6] }, { kind: 'press', from: [0.52, 0.6], to: [0.6, 0.6] }] }, change: { piece: 'trouser-front', marks: [{ kind: 'taper', from: [0.95, 0.3], to: [1, 0.5], label: 'out' }] } },
  },
]
