import { type Rule } from '../rule.ts'

const pullOn = { kinds: ['skirt', 'trousers'], waist: ['elastic'] } as const
const top = [0.28, 0.32, 0.72, 0.52] as const

export const elasticRules: readonly Rule[] = [
  {
    cause: 'pull-on-narrow', title: 'Widen the top edge straight up from the hip', sentence: 'The top edge is narrower than the girth it has to pass.',
    recognise: 'The garment will not go over the hips, or only with a struggle.', words: ['will not pull on', 'too tight to get on'],
    when: pullOn, sided: 'both',
    signs: [
      { sign: 'binds', zone: ['waist', 'hip'], weight: 'decisive', because: 'the top edge stops at the hip', amounts: { gap: 1, cloth: 1 }, after: 'It goes over the hips.' },
      { sign: 'short', zone: 'waist', weight: 'slight', because: 'the top edge is short' },
      { sign: 'tight', zone: 'hip', weight: 'slight', against: true, because: 'once on, the hip itself should be easy' },
    ],
    measures: [{ plus: ['body:hip'], minus: ['finished:waist'], lessMm: -25, grades: [{ from: 1, weight: 'strong' }, { below: -25, weight: 'strong', against: true }], amount: 1, alone: true, because: 'the edge pulled out is {value} less than hip and a little ease' }],
    amounts: { direction: 1, usualMm: [20, 40, 60] },
    change: { operation: 'seam-shift', steps: [
      { piece: 'skirt-front', edge: 'side seam at the waist', edges: 2, share: 'width', taper: 'to nothing at hip level', text: 'Draw the side seam of the front straight up from the hip: {amount} out at the waist.', when: { kinds: ['skirt'] } },
      { piece: 'skirt-back', edge: 'side seam at the waist', edges: 2, share: 'width', taper: 'to nothing at hip level', text: 'Draw the side seam of the back straight up alike: {amount} out at the waist.', when: { kinds: ['skirt'] } },
      { piece: 'trouser-front', edge: 'side seam at the waist', edges: 2, share: 'width', taper: 'to nothing at hip level', text: 'Draw the side seam of each front straight up from the hip: {amount} out at the waist.', when: { kinds: ['trousers'] } },
      { piece: 'trouser-back', edge: 'side seam at the waist', edges: 2, share: 'width', taper: 'to nothing at hip level', text: 'Draw the side seam of each back straight up alike: {amount} out at the waist.', when: { kinds: ['trousers'] } },
    ], companions: [{ piece: 'casing', text: 'Lengthen the casing by {whole}.', times: 1 }] },
    limits: { leastMm: 5, mostMm: 160, beyond: 'Put in an opening instead.' }, stage: 'waist', predicts: 'It goes over the hips without a struggle.', recheck: ['pulling on', 'bulk at the waist'],
    source: 'common practice (the casing has to pass over the hips)',
    rivals: [{ cause: 'hip-tight', check: { ask: 'Once it is on, is the hip easy?', yes: 'Only the top edge is too narrow.', no: 'The hip is too tight too.' } }],
    drawing: { sign: { figure: 'front', region: top, strokes: [{ kind: 'press', from: [0.37, 0.46], to: [0.63, 0.46] }, { kind: 'level', from: [0.38, 0.44], to: [0.62, 0.44] }] }, change: { piece: 'skirt-front', marks: [{ kind: 'taper', from: [1, 0], to: [1, 0.35], label: 'straight up' }] } },
  },
  {
    cause: 'elastic-short', title: 'Cut the elastic longer', sentence: 'The elastic is shorter than the waist needs.',
    recognise: 'The band cuts in and leaves a mark; the cloth itself is easy.', words: ['elastic too tight', 'band cuts in'],
    when: pullOn, sided: 'both',
    signs: [
      { sign: 'tight', zone: 'waist', weight: 'decisive', because: 'the elastic cuts in', amounts: { cloth: 1, gap: 1 }, after: 'The band holds without cutting.' },
      { sign: 'drops', zone: 'waist', weight: 'strong', against: true, because: 'a band that slips is not short' },
    ],
    measures: [], amounts: { direction: 1, usualMm: [20, 30, 50] },
    change: { operation: 'elastic-length', steps: [{ piece: 'casing', edge: 'elastic', edges: 1, share: 'width', text: 'Cut the elastic {amount} longer. The paper stays.' }], companions: [], noCompanions: 'the cloth stays as it is' },
    limits: { leastMm: 5, mostMm: 120, beyond: 'Take a softer elastic.' }, stage: 'waist', opposite: 'elastic-long', predicts: 'The band holds without cutting.', recheck: ['sitting down'], source: 'common practice (waist less one to three inches, by width)',
    rivals: [{ cause: 'pull-on-narrow', check: { ask: 'Does the garment go over the hips easily?', yes: 'Only the elastic is short.', no: 'The top edge is too narrow.' } }],
    drawing: { sign: { figure: 'front', region: top, strokes: [{ kind: 'press', from: [0.4, 0.38], to: [0.6, 0.38] }] }, change: { piece: 'casing', marks: [{ kind: 'move', from: [0.9, 0.5], to: [1, 0.5], label: 'longer elastic' }] } },
  },
  {
    cause: 'elastic-long', title: 'Cut the elastic shorter', sentence: 'The elastic is longer than the waist needs.',
    recognise: 'The band slips down though the cloth fits.', words: ['elastic too loose', 'band slips'],
    when: pullOn, sided: 'both',
    signs: [
      { sign: 'drops', zone: 'waist', line: 'waistband', weight: 'decisive', because: 'the band does not hold', after: 'The band stays at the waist.' },
      { sign: 'drops', zone: ['waist', 'whole'], weight: 'fair', because: 'it hangs below the waist' },
      { sign: 'gaping', zone: 'waist', weight: 'strong', because: 'the band stands off', amounts: { gap: 1, cloth: 1 } },
      { sign: 'tight', zone: 'waist', weight: 'decisive', against: true, because: 'a band that cuts in is not long' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [20, 30, 50] },
    change: { operation: 'elastic-length', steps: [{ piece: 'casing', edge: 'elastic', edges: 1, share: 'width', text: 'Cut the elastic {amount} shorter. The paper stays.' }], companions: [], noCompanions: 'the cloth stays as it is' },
    limits: { leastMm: 5, mostMm: 120, beyond: 'Take a firmer elastic.' }, stage: 'waist', opposite: 'elastic-short', predicts: 'The band stays at the waist.', recheck: ['sitting down'], source: 'common practice (waist less one to three inches, by width)',
    rivals: [{ cause: 'hip-loose', check: { ask: 'Is the hip easy but not loose?', yes: 'Only the elastic is long.', no: 'The whole is too wide.' } }],
    drawing: { sign: { figure: 'front', region: top, strokes: [{ kind: 'level', from: [0.4, 0.42], to: [0.6, 0.43] }] }, change: { piece: 'casing', marks: [{ kind: 'move', from: [1, 0.5], to: [0.9, 0.5], label: 'shorter elastic' }] } },
  },
  {
    cause: 'elastic-front-low', title: 'Raise the casing’s fold line in front', sentence: 'The front is shorter above the hip than it needs to be.',
    recognise: 'The girths are right, yet the front waist is drawn down and the hem rises in front.', words: ['hikes in front', 'elastic waist uneven'],
    when: pullOn, sided: 'both',
    signs: [
      { sign: 'drops', zone: 'waist', view: 'front', weight: 'strong', because: 'the front waist is drawn down', amounts: { shift: 1 } },
      { sign: 'rises', zone: 'hem', view: ['front', 'side'], weight: 'strong', because: 'the hem rises in front', amounts: { shift: 1, gap: 1 }, after: 'The hem hangs level.' },
      { sign: 'tight', zone: ['hip', 'abdomen'], weight: 'fair', against: true, because: 'a garment that is tight climbs where it is tight' },
    ],
    measures: [], amounts: { direction: 1, usualMm: [6, 12, 20] },
    change: { operation: 'seam-shift', steps: [
      { piece: 'skirt-front', edge: 'casing fold line at the centre front', edges: 1, share: 'length', taper: 'to nothing at the side seam', text: 'Raise the fold line of the front by {amount} at the centre, to nothing at the side seam; the casing runs parallel.', when: { kinds: ['skirt'] } },
      { piece: 'trouser-front', edge: 'casing fold line at the centre front', edges: 1, share: 'length', taper: 'to nothing at the side seam', text: 'Raise the fold line of each front by {amount} at the centre, to nothing at the side seam.', when: { kinds: ['trousers'] } },
    ], companions: [{ piece: 'casing', text: 'The casing is cut parallel to the new line.' }] },
    limits: { leastMm: 4, mostMm: 40, beyond: 'Measure from a string at the waist to the floor in front, at the sides and behind.' }, stage: 'length', predicts: 'The hem hangs level.', recheck: ['hem from the floor'], source: 'Cunningham, article on elastic waistbands (heights from the floor at centre and side)',
    rivals: [{ cause: 'full-abdomen-skirt', check: { ask: 'Is the front easy over the abdomen?', yes: 'Only the height of the casing is at fault.', no: 'Room is missing over the abdomen.' } }],
    drawing: { sign: { figure: 'front', region: [0.28, 0.32, 0.72, 0.75], strokes: [{ kind: 'level', from: [0.4, 0.38], to: [0.6, 0.38], bend: 0.03 }, { kind: 'level', from: [0.37, 0.7], to: [0.63, 0.7], bend: -0.03 }] }, change: { piece: 'skirt-front', marks: [{ kind: 'taper', from: [0, 0], to: [0.9, 0.03], label: 'raised' }] } },
  },
  {
    cause: 'elastic-back-low', title: 'Raise the casing’s fold line behind', sentence: 'The back is shorter above the hip than it needs to be.',
    recognise: 'The girths are right, yet the back waist is drawn down and the hem rises behind.', words: ['hikes at the back', 'elastic waist uneven'],
    when: pullOn, sided: 'both',
    signs: [
      { sign: 'drops', zone: 'waist', view: 'back', weight: 'strong', because: 'the back waist is drawn down', amounts: { shift: 1 } },
      { sign: 'rises', zone: 'hem', view: 'back', weight: 'strong', because: 'the hem rises behind', amounts: { shift: 1, gap: 1 }, after: 'The hem hangs level.' },
      { sign: 'tight', zone: 'seat', weight: 'strong', against: true, because: 'a seat that strains lifts the back' },
    ],
    measures: [], amounts: { direction: 1, usualMm: [6, 12, 20] },
    change: { operation: 'seam-shift', steps: [
      { piece: 'skirt-back', edge: 'casing fold line at the centre back', edges: 1, share: 'length', taper: 'to nothing at the side seam', text: 'Raise the fold line of the back by {amount} at the centre, to nothing at the side seam; the casing runs parallel.', when: { kinds: ['skirt'] } },
      { piece: 'trouser-back', edge: 'casing fold line at the centre back', edges: 1, share: 'length', taper: 'to nothing at the side seam', text: 'Raise the fold line of each back by {amount} at the centre, to nothing at the side seam.', when: { kinds: ['trousers'] } },
    ], companions: [{ piece: 'casing', text: 'The casing is cut parallel to the new line.' }] },
    limits: { leastMm: 4, mostMm: 50, beyond: 'Measure from a string at the waist to the floor in front, at the sides and behind.' }, stage: 'length', predicts: 'The hem hangs level.', recheck: ['hem from the floor'], source: 'Cunningham, article on elastic waistbands (heights from the floor at centre and side)',
    rivals: [{ cause: 'full-seat-skirt', check: { ask: 'Is the back easy over the seat?', yes: 'Only the height of the casing is at fault.', no: 'Room is missing over the seat.' } }],
    drawing: { sign: { figure: 'back', region: [0.28, 0.32, 0.72, 0.75], strokes: [{ kind: 'level', from: [0.4, 0.38], to: [0.6, 0.38], bend: 0.03 }, { kind: 'level', from: [0.37, 0.7], to: [0.63, 0.7], bend: -0.03 }] }, change: { piece: 'skirt-back', marks: [{ kind: 'taper', from: [0, 0], to: [0.9, 0.03], label: 'raised' }] } },
  },
  {
    cause: 'gathers-much', title: 'Overlap the top edge and keep the hem', sentence: 'There is more fullness at the waist than this cloth can take.',
    recognise: 'The gathers are bulky and stand out from the waist.', words: ['bulky gathers', 'too much fullness'],
    when: { kinds: ['skirt', 'dress'], needs: ['gathered'] }, sided: 'both',
    signs: [
      { sign: 'excess', zone: 'waist', direction: ['vertical', 'radiating'], weight: 'strong', because: 'the gathers stand out at the waist', amounts: { cloth: 1 }, after: 'The gathers fall soft.' },
      { sign: 'excess', zone: 'hip', view: 'front', direction: 'vertical', weight: 'slight', because: 'the fullness is carried down' },
      { sign: 'tight', zone: 'hip', weight: 'strong', against: true, because: 'a hip that strains needs the fullness' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [100, 200, 300] },
    change: { operation: 'slash-hinge', steps: [
      { piece: 'skirt-front', edge: 'waist', edges: 2, share: 'width', taper: 'to nothing at the hem', text: 'Slash each half of the front from the waist to hinges at the hem in five places and overlap {amount} in all at the waist.' },
      { piece: 'skirt-back', edge: 'waist', edges: 2, share: 'width', taper: 'to nothing at the hem', text: 'Slash and overlap each half of the back by {amount} alike.' },
    ], companions: [{ piece: 'casing', text: 'Shorten the casing by {whole}, while it still passes over the hip.', times: 1, when: { waist: ['elastic'] } }], noCompanions: 'a band keeps its length: only the gathers change' },
    limits: { leastMm: 20, mostMm: 600, beyond: 'Choose a softer cloth.' }, stage: 'waist', predicts: 'The gathers fall soft from the waist.', recheck: ['pulling on', 'hem sweep'], source: 'common practice (one and a half times the waist instead of twice)',
    rivals: [{ cause: 'hip-loose', check: { ask: 'Is it only the top that is bulky?', yes: 'The waist has too much fullness.', no: 'The whole is too wide.' } }],
    drawing: { sign: { figure: 'front', region: top, strokes: [{ kind: 'fold', from: [0.42, 0.38], to: [0.4, 0.48] }, { kind: 'fold', from: [0.47, 0.38], to: [0.46, 0.49] }, { kind: 'fold', from: [0.53, 0.38], to: [0.54, 0.49] }, { kind: 'fold', from: [0.58, 0.38], to: [0.6, 0.48] }] }, change: { piece: 'skirt-front', marks: [{ kind: 'cut', from: [0.3, 0], to: [0.3, 0.95] }, { kind: 'cut', from: [0.6, 0], to: [0.6, 0.95] }, { kind: 'overlap', from: [0.3, 0], to: [0.36, 0], label: 'overlapped' }] } },
  },
]
