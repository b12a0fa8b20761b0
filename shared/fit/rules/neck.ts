import { type Rule } from '../rule.ts'

const uppers = { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'] } as const
const box = [0.32, 0.08, 0.68, 0.28] as const
const facing = { piece: 'neck-facing', text: 'Recut the neck facing by the new edge.' } as const

export const neckRules: readonly Rule[] = [
  {
    cause: 'neck-tight', title: 'Lower the neckline where it binds', sentence: 'The neckline is smaller than it needs to be.',
    recognise: 'The neckline binds, fine folds ring it and a collar will not close.', words: ['tight neck', 'neck binds', 'collar too small'],
    when: uppers, sided: 'both',
    signs: [
      { sign: 'tight', zone: 'neck', weight: 'decisive', because: 'the neckline binds', amounts: { shift: 1, gap: 1, cloth: 1 }, after: 'The neckline lies easy.' },
      { sign: 'binds', zone: 'neck', weight: 'strong', because: 'it stops the head from turning', amounts: { shift: 1 } },
      { sign: 'drag-lines', zone: 'neck', direction: 'radiating', weight: 'strong', because: 'fine folds ring the neck' },
      { sign: 'gaping', zone: 'neck', weight: 'strong', against: true, because: 'a neckline that stands off does not bind' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [6, 6, 12] },
    change: { operation: 'curve-depth', steps: [
      { piece: 'bodice-front', edge: 'neckline', edges: 1, share: 'length', taper: 'to nothing at the shoulder', text: 'Lower the front neckline by {amount} at the centre, to nothing at the shoulder.' },
      { piece: 'bodice-back', edge: 'neckline', edges: 1, share: 'length', times: 0.25, taper: 'to nothing at the shoulder', text: 'Lower the back neckline by {amount} at the centre.' },
    ], companions: [facing, { piece: 'collar', text: 'Measure the new neckline and lengthen the collar at the centre back and at the shoulder mark.', when: { needs: ['collar'] } }] },
    limits: { leastMm: 3, mostMm: 30, beyond: 'Look at the shoulder slope first.' }, stage: 'neck', predicts: 'The neckline lies easy.', recheck: ['collar', 'back neck'], source: 'Fitting Dresses, U.S. Department of Agriculture, 1946; quarter-inch steps: common practice',
    rivals: [{ cause: 'square-shoulders', check: { id: 'square-shoulders~neck-tight', ask: 'Open the seam from the tip. Does a gap open at the tip and none at the neck?', yes: 'The tip is too low.', no: 'The neckline is too small.', yesMeans: 'rival' } }],
    drawing: { sign: { figure: 'front', region: box, strokes: [{ kind: 'press', from: [0.46, 0.14], to: [0.54, 0.14] }, { kind: 'drag', from: [0.46, 0.16], to: [0.43, 0.14] }, { kind: 'drag', from: [0.54, 0.16], to: [0.57, 0.14] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'move', from: [0.05, 0.2], to: [0.05, 0.25], label: 'down' }] } },
  },
  {
    cause: 'neck-front-loose', title: 'Turn the neckline’s spare edge into the bust dart', sentence: 'The front neckline is longer than the body under it.',
    recognise: 'The front neckline stands away, with a fold from the edge toward the bust.', words: ['gaping neckline', 'neckline stands away'],
    when: { kinds: ['bodice', 'shirt', 'dress'] }, sided: 'both',
    signs: [
      { sign: 'gaping', zone: 'neck', view: 'front', weight: 'decisive', because: 'the edge stands off in front', amounts: { 'fold-depth': 1, cloth: 1, gap: 1 }, perSide: ['fold-depth'], after: 'The neckline lies on the body.' },
      { sign: 'excess', zone: 'neck', view: 'front', weight: 'strong', because: 'a fold stands at the front neckline', amounts: { 'fold-depth': 1, cloth: 1 }, perSide: ['fold-depth'] },
      { sign: 'tight', zone: 'bust', weight: 'fair', against: true, because: 'a bust that strains pulls the neckline open' },
      { sign: 'tight', zone: 'neck', weight: 'decisive', against: true, because: 'a neckline that binds is not long' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [10, 16, 24] },
    change: { operation: 'dart-rotate', steps: [{ piece: 'bodice-front', edge: 'neckline', edges: 2, share: 'width', taper: 'to nothing at the bust point', text: 'Fold a wedge of {amount} out of the neckline of the half-front, to nothing at the bust point, and let the bust dart open by the same angle.' }], companions: [facing, { piece: 'lining', text: 'Change the front lining alike.', when: { needs: ['lining'] } }] },
    limits: { leastMm: 4, mostMm: 50, beyond: 'Look at bust and shoulder again.' }, stage: 'neck', predicts: 'The neckline lies on the body.', recheck: ['bust dart'], source: 'drafting course and magazine column, common practice (three ways; into the dart keeps neckline and bust)',
    rivals: [{ cause: 'full-bust', check: { ask: 'Pin the fold toward the bust point. Is the bust still easy?', yes: 'Only the edge is too long.', no: 'The bust lacks cloth.' } }],
    drawing: { sign: { figure: 'front', region: box, strokes: [{ kind: 'gape', from: [0.46, 0.15], to: [0.54, 0.15], bend: 0.03 }, { kind: 'fold', from: [0.47, 0.17], to: [0.44, 0.24] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'overlap', from: [0.15, 0.12], to: [0.45, 0.5], label: 'closed' }] } },
  },
  {
    cause: 'neck-back-loose', title: 'Open a neck dart that points to the blade', sentence: 'The back neckline is longer than the body under it.',
    recognise: 'The back neckline stands off, with a fold at the centre back neck.', words: ['back neck gapes', 'back neck stands off'],
    when: uppers, sided: 'both',
    signs: [
      { sign: 'gaping', zone: 'neck', view: 'back', weight: 'strong', because: 'the edge stands off behind', amounts: { 'fold-depth': 1, cloth: 1, gap: 1 }, after: 'The back neckline lies on the body.' },
      { sign: 'excess', zone: 'neck', view: 'back', weight: 'fair', because: 'a fold stands at the back neckline', amounts: { 'fold-depth': 1, cloth: 1 } },
      { sign: 'rises', zone: ['hem', 'waist'], view: 'back', weight: 'strong', against: true, because: 'a back that rises lacks length over the blades' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [8, 13, 20] },
    change: { operation: 'dart-intake', steps: [{ piece: 'bodice-back', edge: 'neckline', edges: 2, share: 'width', taper: 'to nothing toward the blade', text: 'Take {amount} out of each half back neckline in a dart that points to the blade, or share it as ease.' }], companions: [facing, { piece: 'yoke', text: 'Change the yoke alike.', when: { needs: ['yoke'] } }] },
    limits: { leastMm: 4, mostMm: 36, beyond: 'Look at the roundness of the upper back.' }, stage: 'neck', predicts: 'The back neckline lies on the body.', recheck: ['shoulder length'], source: 'common practice (usual back shoulder dart half to three quarters of an inch)',
    rivals: [{ cause: 'round-back', check: { ask: 'Does the back hem hang level?', yes: 'Only the neckline is long.', no: 'The back is short over the blades.' } }],
    drawing: { sign: { figure: 'back', region: box, strokes: [{ kind: 'gape', from: [0.46, 0.13], to: [0.54, 0.13], bend: -0.03 }] }, change: { piece: 'bodice-back', marks: [{ kind: 'overlap', from: [0.15, 0], to: [0.25, 0.25], label: 'dart' }] } },
  },
]
