import { type Rule } from '../rule.ts'

export const bustRules: readonly Rule[] = [
  {
    cause: 'full-bust',
    title: 'Add width and length over the bust',
    // What the cloth is; the body is never at fault.
    sentence: 'The front is too narrow and too short over the bust.',
    recognise: 'Slanting folds point at the bust, the armhole edge stands off and the front hem lifts, while neck and shoulder lie well.',
    words: ['full bust', 'bust too small', 'strain across the bust', 'front rides up'],
    // Princess seams and fronts without a dart are changed differently: they have rules of their own.
    when: { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'], without: ['princess-seams', 'dartless'] },
    sided: 'either',
    signs: [
      // The exact sign first, with its target; then the same sign seen less exactly. The strongest that fits counts.
      { sign: 'drag-lines', zone: 'bust', view: ['front', 'side'], towards: ['side-seam', 'bust', 'underarm'], weight: 'strong', because: 'the bust lifts the cloth and draws it in from the side seam', amounts: { cloth: 1 }, after: 'The lines to the bust are gone.' },
      { sign: 'drag-lines', zone: ['bust', 'shoulder', 'armhole'], view: ['front', 'side'], towards: ['shoulder-tip', 'bust'], weight: 'fair', because: 'lines that run down to the bust show where the cloth is caught' },
      // `amounts`: opened across the front, the gap is the missing width itself.
      { sign: 'tight', zone: 'bust', view: ['front', 'side'], weight: 'fair', because: 'the front alone is strained across the bust', amounts: { cloth: 1, gap: 1 }, after: 'The front lies over the bust without strain.' },
      { sign: 'gaping', zone: 'armhole', view: ['front', 'side'], weight: 'fair', because: 'a full bust pulls the armhole edge away', after: 'The armhole edge lies on the body.' },
      { sign: 'gaping', zone: 'bust', view: 'front', weight: 'fair', because: 'the closed edges are pulled apart over the bust' },
      { sign: 'rises', zone: ['hem', 'waist'], view: ['front', 'side'], weight: 'fair', because: 'the front is used up over the bust and lacks length below', after: 'The front edge hangs level.' },
      { sign: 'swings', zone: ['hip', 'bust', 'waist', 'whole', 'hem'], towards: 'front', line: 'side-seam', weight: 'slight', because: 'the bust draws the side seam forward' },
      // Against: what this cause never does.
      { sign: 'tight', zone: ['bust', 'upper-back'], view: 'back', weight: 'fair', against: true, because: 'a back as tight as the front asks for width all round, not for the bust alone' },
      { sign: 'excess', zone: 'bust', view: 'front', direction: ['vertical', 'horizontal'], weight: 'strong', against: true, because: 'loose cloth over the bust is the reverse of it' },
    ],
    measures: [
      {
        plus: ['body:bust'], minus: ['body:high-bust', 'drafted-cup'],
        grades: [{ from: 25, weight: 'strong' }, { from: 10, weight: 'fair' }, { from: 0, below: 10, weight: 'slight', against: true }, { below: 0, weight: 'strong', against: true }],
        // The whole amount on the front: (full − high) − drafted cup.
        amount: 1, alone: true, because: 'full bust less high bust is {value} more than the pattern is drafted for',
      },
    ],
    // 1 in is what most instructions show; a slight sign is half of that, a strong one half as much again.
    amounts: { direction: 1, usualMm: [13, 25, 38] },
    change: {
      operation: 'full-bust',
      steps: [
        { piece: 'bodice-front', edge: 'bust line', edges: 2, share: 'width', taper: 'to nothing at the armhole hinge', text: 'Slash from the waist to the bust point and on to a hinge on the armhole, and from the side seam to the bust point. Spread by {amount} across the bust on the {side} half-front.' },
        { piece: 'bodice-front', edge: 'centre front below the bust', edges: 2, share: 'length', times: 0, text: 'Cut across below the bust and lower the centre front until the hem meets again: the spread says how much.' },
      ],
      companions: [
        { piece: 'front-facing', text: 'Lengthen the front facing as the centre front.' },
        { piece: 'lining', text: 'Change the front lining alike.', when: { needs: ['lining'] } },
        { piece: 'bodice-front', text: 'Take the {whole} added at the waist into the waist dart or the side seams where the waist fitted.', when: { needs: ['darts', 'waist-seam'] } },
        { piece: 'front-facing', text: 'Divide the buttons again, one level with the bust point.', when: { needs: ['button-front'] } },
      ],
    },
    limits: { leastMm: 6, mostMm: 100, beyond: 'Share it between two darts, or begin from a pattern drafted for a larger cup.' },
    stage: 'bust',
    opposite: 'small-bust',
    moves: [{ cause: 'bust-point-low', note: 'A full-bust change lowers the bust point by itself: look at the dart point again on the next sample.' }],
    predicts: 'The front lies over the bust without strain.',
    recheck: ['front hem and front waist level', 'height of the dart point', 'armhole edge', 'width at the waist'],
    source: 'common practice; choice of size by the high bust: Principles of Pattern Alteration, E-372, Texas Cooperative Extension, 2006',
    rivals: [
      {
        cause: 'bust-girth-tight',
        // A yes speaks for this rule, a no for the rival.
        check: { ask: 'Look at the back at bust level. Does it lie without strain while the front is tight?', yes: 'Only the front lacks width: it is the bust.', no: 'The whole girth lacks width: let out front and back.' },
      },
      { cause: 'front-armhole-loose', check: { ask: 'Pin the spare cloth of the armhole towards the bust point. Does the bust strain more now?', yes: 'The armhole gapes because the bust lacks cloth.', no: 'Only the armhole edge is too long.' } },
      { cause: 'bust-point-low', check: { ask: 'Mark the fullest point on the sample. Does the dart point at it, within a finger’s width?', yes: 'The dart is in its place: width is what lacks.', no: 'Move the dart first.' } },
    ],
    drawing: {
      sign: {
        figure: 'front', region: [0.25, 0.12, 0.75, 0.55],
        strokes: [
          { kind: 'drag', from: [0.41, 0.28], to: [0.35, 0.36] }, { kind: 'drag', from: [0.59, 0.28], to: [0.65, 0.36] },
          { kind: 'gape', from: [0.35, 0.2], to: [0.35, 0.26], bend: -0.02 }, { kind: 'gape', from: [0.65, 0.2], to: [0.65, 0.26], bend: 0.02 },
          { kind: 'level', from: [0.36, 0.5], to: [0.64, 0.5], bend: 0.05 },
        ],
      },
      change: {
        piece: 'bodice-front',
        marks: [
          { kind: 'cut', from: [0.45, 1], to: [0.45, 0.5] }, { kind: 'cut', from: [0.45, 0.5], to: [0.85, 0.3] }, { kind: 'hinge', from: [0.85, 0.3], to: [0.85, 0.3] },
          { kind: 'cut', from: [0.95, 0.6], to: [0.45, 0.5] }, { kind: 'spread', from: [0.45, 0.5], to: [0.55, 0.5], label: 'half of the whole' },
        ],
      },
    },
  },
]
