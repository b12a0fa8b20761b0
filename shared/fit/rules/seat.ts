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
    source: 'Fitting Dresses, U.S. Department of Agriculture, rev. 1946 (skirt top trimmed at the centre back); to nothing at the side seam, and usual amounts: common practice',
    rivals: [
      { cause: 'hip-tight', check: { ask: 'Pull the skirt down until the fold is gone. Does it stay easy over the hip?', yes: 'The back is too long at its centre.', no: 'The hip is too tight and pushes the cloth up.' } },
      { cause: 'flat-seat-skirt', check: { ask: 'Look at the back hem from the side. Does it hang level with the front?', yes: 'Only the part above the hip is too long.', no: 'The back hangs long below the seat too.' } },
    ],
    drawing: {
      sign: { figure: 'back', region: [0.28, 0.33, 0.72, 0.6], strokes: [{ kind: 'fold', from: [0.41, 0.4], to: [0.59, 0.4], bend: -0.02 }, { kind: 'fold', from: [0.44, 0.42], to: [0.56, 0.42], bend: -0.015 }] },
      change: { piece: 'skirt-back', marks: [{ kind: 'taper', from: [0, 0.05], to: [0.9, 0], label: 'lowered at the centre back' }] },
    },
  },
  {
    cause: 'full-seat-skirt',
    title: 'Open a wedge across the back at hip level',
    sentence: 'The back is shorter and narrower over the seat than it needs to be.',
    recognise: 'The back hem rises and sticks out, the back cups under the seat and the side seams swing back.',
    words: ['full seat', 'back hem rises', 'cups under the seat'],
    when: { kinds: ['skirt', 'dress'] }, sided: 'both',
    signs: [
      { sign: 'rises', zone: 'hem', view: ['back', 'side'], weight: 'strong', because: 'the back is used up over the seat and lacks length below', amounts: { gap: 1 }, after: 'The back hem hangs level.' },
      { sign: 'tight', zone: 'seat', weight: 'strong', because: 'the back is strained over the seat', amounts: { gap: 1 }, after: 'The back lies over the seat without strain.' },
      { sign: 'drag-lines', zone: ['seat', 'hip'], view: ['back', 'side'], towards: ['seat', 'side-seam'], weight: 'fair', because: 'the lines run to the seat' },
      { sign: 'swings', zone: ['hem', 'hip', 'whole'], towards: 'back', line: 'side-seam', weight: 'fair', because: 'the seat draws the side seam back' },
      { sign: 'tight', zone: ['hip', 'abdomen'], view: 'front', weight: 'strong', against: true, because: 'a front that is tight too asks for width all round' },
      { sign: 'excess', zone: 'seat', weight: 'strong', against: true, because: 'spare cloth under the seat is the reverse of it' },
    ],
    measures: [],
    amounts: { direction: 1, usualMm: [10, 18, 28] },
    change: {
      operation: 'slash-hinge',
      steps: [{ piece: 'skirt-back', edge: 'centre back at hip level', edges: 1, share: 'length', taper: 'to nothing at the side seam', text: 'Slash the back from the centre to a hinge at the side seam at the level of the seat and open it by {amount} at the centre; straighten the centre back and deepen the back dart by what opens at the waist.' }],
      companions: [{ piece: 'lining', text: 'Change the back lining alike.', when: { needs: ['lining'] } }, { piece: 'skirt-back', text: 'Where width is missing too, add it with an upright slash beside the dart.' }],
    },
    limits: { leastMm: 5, mostMm: 50, beyond: 'Give the width through a centre back seam as well.' },
    stage: 'length', opposite: 'flat-seat-skirt',
    predicts: 'The back hem hangs level and the side seams hang plumb.',
    recheck: ['back hem', 'side seams', 'back waist'],
    source: 'common practice (sample cut across below the zip and let open until the hem is level)',
    rivals: [{ cause: 'hip-tight', check: { id: 'full-seat-skirt~hip-tight', ask: 'Let the side seams out at the hip. Does the back hem still rise?', yes: 'Room is missing over the seat.', no: 'Width was missing all round.' } }, { cause: 'round-back', check: { ask: 'Does the garment have a waist seam that lies level at the back?', yes: 'The seat draws the hem up.', no: 'Look at the upper back first.' } }],
    drawing: {
      sign: { figure: 'back', region: [0.28, 0.4, 0.72, 0.75], strokes: [{ kind: 'drag', from: [0.4, 0.5], to: [0.48, 0.5] }, { kind: 'drag', from: [0.6, 0.5], to: [0.52, 0.5] }, { kind: 'level', from: [0.37, 0.7], to: [0.63, 0.7], bend: 0.04 }] },
      change: { piece: 'skirt-back', marks: [{ kind: 'cut', from: [0, 0.3], to: [0.95, 0.3] }, { kind: 'hinge', from: [0.95, 0.3], to: [0.95, 0.3] }, { kind: 'spread', from: [0, 0.3], to: [0, 0.36], label: 'opened' }] },
    },
  },
  {
    cause: 'flat-seat-skirt',
    title: 'Take a wedge out across the back',
    sentence: 'The back is longer over the seat than it needs to be.',
    recognise: 'The back hem hangs low, folds lie under the seat and the back swings in.',
    words: ['flat seat', 'back hem drops', 'baggy seat'],
    when: { kinds: ['skirt', 'dress'] }, sided: 'both',
    signs: [
      { sign: 'drops', zone: 'hem', view: ['back', 'side'], weight: 'strong', because: 'the back is too long over the seat', amounts: { shift: 1 }, after: 'The back hem hangs level.' },
      { sign: 'excess', zone: 'seat', view: ['back', 'side'], weight: 'strong', because: 'spare cloth hangs under the seat', amounts: { 'fold-depth': 1, cloth: 1 }, after: 'The back falls straight from the hip.' },
      { sign: 'swings', zone: ['hem', 'hip', 'whole'], towards: 'front', line: 'side-seam', weight: 'fair', because: 'the back hangs in and lets the side seam go forward' },
      { sign: 'tight', zone: 'seat', weight: 'decisive', against: true, because: 'a seat that strains is not too long' },
    ],
    measures: [],
    amounts: { direction: -1, usualMm: [8, 15, 25] },
    change: {
      operation: 'slash-hinge',
      steps: [{ piece: 'skirt-back', edge: 'centre back at hip level', edges: 1, share: 'length', taper: 'to nothing at the side seam', text: 'Slash the back from the centre to a hinge at the side seam and overlap {amount} at the centre; straighten the centre back and make the back dart smaller by what closes at the waist.' }],
      companions: [{ piece: 'lining', text: 'Change the back lining alike.', when: { needs: ['lining'] } }], noCompanions: 'the waist edge keeps its length',
    },
    limits: { leastMm: 5, mostMm: 40, beyond: 'Narrow the half back as well.' },
    stage: 'length', opposite: 'full-seat-skirt',
    predicts: 'The back falls straight and the hem hangs level.',
    recheck: ['back hem', 'side seams'],
    source: 'common practice',
    rivals: [{ cause: 'hollow-back-skirt', check: { ask: 'Is the cloth smooth just under the waistband?', yes: 'The spare length lies at the seat.', no: 'The spare length lies at the waist.' } }, { cause: 'hip-loose', check: { ask: 'Do the sides lie close at the hip?', yes: 'Only the back is too long.', no: 'Width is spare all round.' } }],
    drawing: {
      sign: { figure: 'back', region: [0.28, 0.4, 0.72, 0.75], strokes: [{ kind: 'fold', from: [0.42, 0.54], to: [0.58, 0.54], bend: 0.02 }, { kind: 'fold', from: [0.43, 0.57], to: [0.57, 0.57], bend: 0.02 }, { kind: 'level', from: [0.37, 0.7], to: [0.63, 0.7], bend: -0.03 }] },
      change: { piece: 'skirt-back', marks: [{ kind: 'cut', from: [0, 0.3], to: [0.95, 0.3] }, { kind: 'hinge', from: [0.95, 0.3], to: [0.95, 0.3] }, { kind: 'overlap', from: [0, 0.3], to: [0, 0.35], label: 'overlapped' }] },
    },
  },
]
