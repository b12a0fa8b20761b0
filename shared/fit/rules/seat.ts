import { type Rule } from '../rule.ts'

export const seatRules: readonly Rule[] = [
  {
    cause: 'hollow-back-skirt',
    title: 'Lower the centre back waist',
    sentence: 'The back is longer at its centre, from waist to hip, than it needs to be.',
    recognise: 'One soft fold lies straight across just under the back waistband. The front and the side seams are smooth.',
    words: ['sway back', 'fold under the back waistband', 'puddle of cloth at the back waist'],
    when: { kinds: ['skirt', 'trousers'] },
    // It is a centre-back matter: never on one side.
    sided: 'both',
    signs: [
      // A fold measured flat holds twice its depth: the engine doubles it and says so; the factor here stays 1.
      { sign: 'excess', zone: 'waist', view: 'back', direction: 'horizontal', side: 'both', weight: 'decisive', because: 'a fold across, under the back waist only, is spare length at the centre back', amounts: { 'fold-depth': 1, cloth: 1 }, after: 'The fold is gone and the waistband lies level.' },
      { sign: 'excess', zone: ['hip', 'seat'], view: 'back', direction: 'horizontal', line: 'centre-back', side: 'both', weight: 'fair', because: 'the fold lies at the centre back', amounts: { 'fold-depth': 1, cloth: 1 } },
      { sign: 'long', zone: 'waist', view: 'back', line: 'centre-back', weight: 'strong', because: 'the centre back is too long from waist to hip', amounts: { 'fold-depth': 1, cloth: 1 } },
      // Against: the same fold in front means length or width all round.
      { sign: 'excess', zone: 'waist', view: 'front', direction: 'horizontal', weight: 'strong', against: true, because: 'a fold that runs on over the front is not a matter of the centre back alone' },
      { sign: 'tight', zone: ['hip', 'seat'], weight: 'fair', against: true, because: 'a hip that is tight pushes the cloth up into folds at the waist' },
    ],
    measures: [],
    // Published range ¼ to ¾ in.
    amounts: { direction: -1, usualMm: [6, 13, 19] },
    change: {
      operation: 'seam-shift',
      steps: [
        { piece: 'skirt-back', edge: 'top edge at the centre back', edges: 1, share: 'length', taper: 'to nothing at the side seam', text: 'Mark {amount} down from the top edge at the centre back and redraw the edge, to nothing at the side seam.', when: { kinds: ['skirt'] } },
        { piece: 'trouser-back', edge: 'top edge at the centre back', edges: 2, share: 'length', taper: 'to nothing at the side seam', text: 'Mark {amount} down from the top edge at the centre back of each back and redraw the edge, to nothing at the side seam.', when: { kinds: ['trousers'] } },
      ],
      companions: [
        { piece: 'waistband', text: 'Keep the waistband’s length. The lowered edge is a little longer: ease it in, or deepen the back darts by the difference.', when: { waist: ['fitted'] } },
        { piece: 'casing', text: 'Mark the new fold line of the casing parallel to the lowered edge.', when: { waist: ['elastic'] } },
        { piece: 'lining', text: 'Change the back lining alike.', when: { needs: ['lining'] } },
        { piece: 'skirt-back', text: 'Shorten the back darts by as much as they rose against the body; the zip opening follows.', when: { kinds: ['skirt'], needs: ['darts'] } },
      ],
    },
    limits: { leastMm: 3, mostMm: 30, beyond: 'Look at the hip width first: a tight hip pushes the cloth up.' },
    stage: 'length',
    predicts: 'The back lies smooth under the waistband.',
    recheck: ['hem level at the centre back', 'length of the top edge against the band', 'points of the back darts'],
    source: 'Fitting Dresses, U.S. Department of Agriculture, 1946 (skirt top trimmed at the centre back); amount to nothing at the side seam: common practice',
    rivals: [
      { cause: 'hip-tight', check: { ask: 'Pull the skirt down until the fold is gone. Does it stay easy over the hip?', yes: 'The back is too long at its centre.', no: 'The hip is too tight and pushes the cloth up.' } },
      { cause: 'flat-seat-skirt', check: { ask: 'Look at the back hem from the side. Does it hang level with the front?', yes: 'Only the part above the hip is too long.', no: 'The back hangs long below the seat too.' } },
    ],
    drawing: {
      sign: { figure: 'back', region: [0.28, 0.33, 0.72, 0.6], strokes: [{ kind: 'fold', from: [0.41, 0.4], to: [0.59, 0.4], bend: -0.02 }, { kind: 'fold', from: [0.44, 0.42], to: [0.56, 0.42], bend: -0.015 }] },
      change: { piece: 'skirt-back', marks: [{ kind: 'taper', from: [0, 0.05], to: [0.9, 0], label: 'lowered at the centre back' }] },
    },
  },
]
