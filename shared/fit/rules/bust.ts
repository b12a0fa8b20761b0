import { type Rule } from '../rule.ts'

export const bustRules: readonly Rule[] = [
  {
    cause: 'full-bust',
    title: 'Add width and length over the bust',
    // What the cloth is; the body is never at fault.
    sentence: 'The front is too narrow and too short over the bust.',
    recognise: 'Slanting folds point at the bust, the armhole edge stands off and the front hem lifts, while neck and shoulder lie well.',
    words: ['full bust', 'bust too small', 'strain across the bust', 'front rides up'],
    when: { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'] },
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
        { piece: 'bodice-front', edge: 'bust line', edges: 2, share: 'width', taper: 'to nothing at the armhole hinge', text: 'Slash from the waist to the bust point and on to a hinge on the armhole, and from the side seam to the bust point. Spread by {amount} across the bust on the {side} half-front.', when: { without: ['princess-seams', 'dartless'] } },
        // Most goes onto the side front, so that the seam stays over the bust point: 7/8 in and 1/2 in where both were let out.
        { piece: 'side-front', edge: 'princess seam at bust level', edges: 2, share: 'width', group: 'side-front', taper: 'to nothing at the armhole hinge', text: 'Slash the {side} side front across at the bust point, to a hinge at the side seam, and from there to a hinge on the armhole. Spread by {amount} and redraw the curve of the seam.', when: { needs: ['princess-seams'] } },
        { piece: 'bodice-front', edge: 'princess seam at bust level', edges: 2, share: 'width', group: 'front panel', taper: 'to nothing above and below the bust', text: 'Let the seam of the {side} front panel out by {amount} at bust level, to nothing above and below; walk both edges of the seam.', when: { needs: ['princess-seams'] } },
        { piece: 'bodice-front', edge: 'bust line', edges: 2, share: 'width', taper: 'to nothing at the armhole hinge', text: 'Slash from the hem to the bust point and on to a hinge on the armhole, and from the side seam to the bust point. Spread by {amount} across the bust on the {side} half-front. The dart that opens at the side is sewn, or turned into the hem or the armhole.', when: { needs: ['dartless'], without: ['princess-seams'] } },
        { piece: 'bodice-front', edge: 'centre front below the bust', edges: 2, share: 'length', times: 0, text: 'Cut across below the bust and lower the centre front until the hem meets again: the spread says how much.', when: { without: ['princess-seams'] } },
        { piece: 'bodice-front', edge: 'front panel at bust level', edges: 2, share: 'length', times: 0, text: 'Cut the front panel across at bust level and lengthen it by as much as the side front opened there.', when: { needs: ['princess-seams'] } },
      ],
      parts: { 'side-front': 0.64, 'front panel': 0.36 },
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
    source: 'common practice (darted, princess seams and without a dart); choice of size by the high bust: Principles of Pattern Alteration, E-372, Texas Cooperative Extension, 2006',
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
  {
    cause: 'small-bust', title: 'Take width and length out over the bust', sentence: 'The front is wider and longer over the bust than it needs to be.',
    recognise: 'The cloth bubbles over or under the bust and the tip of the dart is empty, while the rest fits.', words: ['small bust', 'empty dart', 'bubbles at the bust'],
    when: { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'] }, sided: 'either',
    signs: [
      { sign: 'excess', zone: 'bust', view: ['front', 'side'], weight: 'strong', because: 'loose cloth over the bust is spare width and length', amounts: { cloth: 1, 'fold-depth': 1 }, after: 'The front lies smooth over the bust.' },
      { sign: 'drops', zone: ['hem', 'waist'], view: 'front', weight: 'slight', because: 'the front hangs low' },
      { sign: 'tight', zone: 'bust', weight: 'decisive', against: true, because: 'a bust that strains is not too roomy' },
      { sign: 'excess', zone: ['bust', 'upper-back'], view: 'back', weight: 'fair', against: true, because: 'a back as loose as the front asks for a smaller size' },
      { sign: 'excess', zone: 'bust', line: 'side-seam', weight: 'slight', against: true, because: 'folds at the side seams are spare girth' },
    ],
    measures: [{ plus: ['drafted-cup', 'body:high-bust'], minus: ['body:bust'], grades: [{ from: 20, weight: 'strong' }, { from: 10, weight: 'fair' }, { below: 0, weight: 'strong', against: true }], amount: 1, alone: true, because: 'the pattern is drafted for a cup {value} larger' }],
    amounts: { direction: -1, usualMm: [13, 25, 38] },
    change: { operation: 'full-bust', steps: [{ piece: 'bodice-front', edge: 'bust line', edges: 2, share: 'width', taper: 'to nothing at the armhole hinge', text: 'Slash as for a full bust and overlap {amount} across the bust on the {side} half-front; shorten the centre front until the hem meets.', when: { without: ['princess-seams'] } },
      { piece: 'side-front', edge: 'princess seam at bust level', edges: 2, share: 'width', taper: 'to nothing at the armhole hinge', text: 'Flatten the curve of the {side} side front: overlap {amount} at bust level and shorten the front panel until the seam meets.', when: { needs: ['princess-seams'] } }], companions: [{ piece: 'front-facing', text: 'Shorten the front facing as the centre front.' }, { piece: 'lining', text: 'Change the front lining alike.', when: { needs: ['lining'] } }] },
    limits: { leastMm: 6, mostMm: 80, beyond: 'Begin from a pattern drafted for a smaller cup.' }, stage: 'bust', opposite: 'full-bust', predicts: 'The front lies smooth over the bust.', recheck: ['dart tip', 'front hem'], source: 'common practice (overlap at the bust point, hinge a third up the armhole)',
    rivals: [{ cause: 'bust-girth-loose', check: { ask: 'Is the back at bust level close?', yes: 'Only the front is too roomy.', no: 'The whole girth is loose.' } }, { cause: 'bust-point-low', check: { ask: 'Does the dart point at the fullest place?', yes: 'The dart is in place: cloth is spare.', no: 'Move the dart first.' } }],
    drawing: { sign: { figure: 'front', region: [0.25, 0.12, 0.75, 0.5], strokes: [{ kind: 'fold', from: [0.4, 0.26], to: [0.46, 0.26], bend: 0.03 }, { kind: 'fold', from: [0.54, 0.26], to: [0.6, 0.26], bend: 0.03 }] }, change: { piece: 'bodice-front', marks: [{ kind: 'cut', from: [0.45, 1], to: [0.45, 0.5] }, { kind: 'overlap', from: [0.45, 0.5], to: [0.5, 0.5], label: 'overlapped' }] } },
  },
  {
    cause: 'bust-girth-tight', title: 'Let the side seams out at bust level', sentence: 'The whole girth is narrower at bust level than it needs to be.',
    recognise: 'Front and back strain at bust level and the side seams stay in their place.', words: ['tight all round', 'size too small', 'tight chest'],
    when: { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'] }, sided: 'both',
    signs: [
      { sign: 'tight', zone: ['bust', 'upper-back'], view: 'back', weight: 'strong', because: 'the back strains at bust level too', amounts: { cloth: 1, gap: 1 }, after: 'The girth is easy at bust level.' },
      { sign: 'tight', zone: 'bust', view: ['front', 'side'], weight: 'fair', because: 'the front strains at bust level', amounts: { cloth: 1, gap: 1 } },
      { sign: 'tight', zone: 'bust', line: 'side-seam', weight: 'strong', because: 'the side seams strain', amounts: { cloth: 1, gap: 1 } },
      { sign: 'gaping', zone: 'armhole', weight: 'fair', against: true, because: 'an armhole that stands off says that the bust lacks shape, not girth' },
      { sign: 'rises', zone: ['hem', 'waist'], view: 'front', weight: 'fair', against: true, because: 'a front that rises lacks length over the bust' },
    ],
    measures: [{ plus: ['body:bust'], minus: ['pattern:bust'], grades: [{ from: 25, weight: 'fair' }, { from: 8, weight: 'slight' }, { below: 0, weight: 'strong', against: true }], amount: 1, because: 'the bust is {value} more than this size is drafted for' }, { plus: ['body:bust'], minus: ['body:high-bust', 'drafted-cup'], grades: [{ from: 25, weight: 'fair', against: true }], because: 'full bust less high bust is {value} more than the pattern is drafted for' }],
    amounts: { direction: 1, usualMm: [14, 24, 40] },
    change: { operation: 'seam-shift', steps: [
      { piece: 'bodice-front', edge: 'side seam at bust level', edges: 2, share: 'width', text: 'Move the side seam of the front out by {amount} from the underarm down, and carry the underarm out with it.' },
      { piece: 'bodice-back', edge: 'side seam at bust level', edges: 2, share: 'width', text: 'Move the side seam of the back out by {amount} alike.' },
    ], companions: [{ piece: 'sleeve', text: 'Let both edges of the sleeve’s underarm out by as much as one edge of the body.', when: { sleeves: ['set-in', 'dropped', 'raglan'] } }, { piece: 'armhole-facing', text: 'Lengthen the armhole facing.', when: { sleeves: ['none'] } }, { piece: 'lining', text: 'Let the lining out alike.', when: { needs: ['lining'] } }], noCompanions: 'the armhole is bound' },
    limits: { leastMm: 6, mostMm: 50, beyond: 'Trace the next size.' }, stage: 'bust', opposite: 'bust-girth-loose', predicts: 'The girth is easy at bust level.', recheck: ['reach', 'armhole'], source: 'Pattern Alterations, costume text ch. 17, Central Washington University (small additions divided by the seams); limit: common practice',
    rivals: [{ cause: 'full-bust', check: { id: 'full-bust~bust-girth-tight', ask: 'Look at the back at bust level. Does it lie without strain while the front is tight?', yes: 'Only the front lacks width: it is the bust.', no: 'The whole girth lacks width: let out front and back.', yesMeans: 'rival' } }, { cause: 'broad-back', check: { ask: 'Is the front tight as well?', yes: 'The whole girth lacks width.', no: 'Only the back lacks width.' } }],
    drawing: { sign: { figure: 'front', region: [0.25, 0.12, 0.75, 0.45], strokes: [{ kind: 'press', from: [0.37, 0.25], to: [0.63, 0.25] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'taper', from: [0.95, 0.4], to: [1, 1], label: 'out' }] } },
  },
  {
    cause: 'bust-girth-loose', title: 'Take the side seams in at bust level', sentence: 'The whole girth is wider at bust level than it needs to be.',
    recognise: 'Upright folds stand in front and behind.', words: ['loose all round', 'size too large'],
    when: { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'] }, sided: 'both',
    signs: [
      { sign: 'excess', zone: ['bust', 'upper-back'], view: 'back', direction: 'vertical', weight: 'fair', because: 'the back is loose at bust level too', amounts: { 'fold-depth': 1, cloth: 1 } },
      { sign: 'excess', zone: 'bust', line: 'side-seam', direction: 'vertical', weight: 'strong', because: 'upright folds at the sides are spare girth', amounts: { 'fold-depth': 1, cloth: 1 }, after: 'The girth lies close with ease to breathe.' },
      { sign: 'excess', zone: 'whole', direction: 'vertical', weight: 'strong', because: 'upright folds stand all round', amounts: { 'fold-depth': 1, cloth: 1 } },
      { sign: 'tight', zone: ['bust', 'upper-back'], weight: 'decisive', against: true, because: 'a girth that strains is not loose' },
    ],
    measures: [{ plus: ['pattern:bust'], minus: ['body:bust'], grades: [{ from: 25, weight: 'fair' }, { below: 0, weight: 'strong', against: true }], amount: 1, because: 'the size is drafted for a bust {value} larger' }],
    amounts: { direction: -1, usualMm: [14, 24, 40] },
    change: { operation: 'seam-shift', steps: [
      { piece: 'bodice-front', edge: 'side seam at bust level', edges: 2, share: 'width', text: 'Move the side seam of the front in by {amount}; keep the wearing ease.' },
      { piece: 'bodice-back', edge: 'side seam at bust level', edges: 2, share: 'width', text: 'Move the side seam of the back in by {amount} alike.' },
    ], companions: [{ piece: 'sleeve', text: 'Take the sleeve’s underarm in alike.', when: { sleeves: ['set-in', 'dropped', 'raglan'] } }, { piece: 'lining', text: 'Take the lining in alike.', when: { needs: ['lining'] } }], noCompanions: 'the armhole facing is shortened' },
    limits: { leastMm: 8, mostMm: 60, beyond: 'Trace the next smaller size.' }, stage: 'bust', opposite: 'bust-girth-tight', predicts: 'The girth lies close with ease to breathe.', recheck: ['reach'], source: 'Pattern Alterations, costume text ch. 17, Central Washington University',
    rivals: [{ cause: 'small-bust', check: { id: 'small-bust~bust-girth-loose', ask: 'Is the back at bust level close?', yes: 'Only the front is too roomy.', no: 'The whole girth is loose.', yesMeans: 'rival' } }],
    drawing: { sign: { figure: 'front', region: [0.25, 0.12, 0.75, 0.45], strokes: [{ kind: 'fold', from: [0.38, 0.22], to: [0.38, 0.34] }, { kind: 'fold', from: [0.62, 0.22], to: [0.62, 0.34] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'taper', from: [0.95, 0.4], to: [0.9, 1], label: 'in' }] } },
  },
  {
    cause: 'bust-point-low', title: 'Lower the bust dart', sentence: 'The dart points higher than the fullest place.',
    recognise: 'There is slack at the tip of the dart and strain below it.', words: ['dart too high', 'bust point low'],
    when: { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'], without: ['dartless'] }, sided: 'either',
    signs: [
      { sign: 'off-place', zone: 'bust', towards: 'down', weight: 'decisive', because: 'the dart has to come down to the fullest place', amounts: { shift: 1 }, after: 'The dart points at the fullest place.' },
      { sign: 'excess', zone: 'bust', line: 'dart', weight: 'slight', because: 'the tip of the dart is empty' },
    ],
    measures: [{ plus: ['body:bust-depth'], minus: ['pattern:bust-depth'], grades: [{ from: 8, weight: 'strong' }, { below: 0, weight: 'slight', against: true }], amount: 1, because: 'the bust point lies {value} lower than the pattern’s' }],
    amounts: { direction: -1, usualMm: [8, 13, 25] },
    change: { operation: 'dart-apex', steps: [{ piece: 'bodice-front', edge: 'bust dart', edges: 1, share: 'length', text: 'Draw a box round the dart, cut it out and slide it down by {amount}; true the side seam with the dart folded.' }], companions: [], noCompanions: 'the seams keep their lengths' },
    limits: { leastMm: 4, mostMm: 60, beyond: 'Look at the length of the whole front.' }, stage: 'dart', opposite: 'bust-point-high', predicts: 'The dart points at the fullest place.', recheck: ['tip of the dart'], source: 'common practice (full bust before the dart is moved)',
    rivals: [{ cause: 'full-bust', check: { id: 'full-bust~bust-point-low', ask: 'Mark the fullest point on the sample. Does the dart point at it, within a finger’s width?', yes: 'The dart is in its place: width is what lacks.', no: 'Move the dart first.', yesMeans: 'rival' } }],
    drawing: { sign: { figure: 'front', region: [0.25, 0.12, 0.75, 0.45], strokes: [{ kind: 'place', from: [0.42, 0.24], to: [0.42, 0.28] }, { kind: 'place', from: [0.58, 0.24], to: [0.58, 0.28] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'move', from: [0.5, 0.45], to: [0.5, 0.52], label: 'down' }] } },
  },
  {
    cause: 'bust-point-high', title: 'Raise the bust dart', sentence: 'The dart points lower than the fullest place.',
    recognise: 'There is strain above the tip of the dart and slack at it.', words: ['dart too low', 'bust point high'],
    when: { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'], without: ['dartless'] }, sided: 'either',
    signs: [{ sign: 'off-place', zone: 'bust', towards: 'up', weight: 'decisive', because: 'the dart has to go up to the fullest place', amounts: { shift: 1 }, after: 'The dart points at the fullest place.' }],
    measures: [{ plus: ['pattern:bust-depth'], minus: ['body:bust-depth'], grades: [{ from: 8, weight: 'strong' }, { below: 0, weight: 'slight', against: true }], amount: 1, because: 'the bust point lies {value} higher than the pattern’s' }],
    amounts: { direction: 1, usualMm: [8, 13, 25] },
    change: { operation: 'dart-apex', steps: [{ piece: 'bodice-front', edge: 'bust dart', edges: 1, share: 'length', text: 'Draw a box round the dart, cut it out and slide it up by {amount}; true the side seam with the dart folded.' }], companions: [], noCompanions: 'the seams keep their lengths' },
    limits: { leastMm: 4, mostMm: 60, beyond: 'Look at the length of the whole front.' }, stage: 'dart', opposite: 'bust-point-low', predicts: 'The dart points at the fullest place.', recheck: ['tip of the dart'], source: 'common practice',
    rivals: [{ cause: 'full-bust', check: { ask: 'Is the front easy across the bust?', yes: 'Only the dart is misplaced.', no: 'The bust lacks width.' } }],
    drawing: { sign: { figure: 'front', region: [0.25, 0.12, 0.75, 0.45], strokes: [{ kind: 'place', from: [0.42, 0.3], to: [0.42, 0.26] }, { kind: 'place', from: [0.58, 0.3], to: [0.58, 0.26] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'move', from: [0.5, 0.52], to: [0.5, 0.45], label: 'up' }] } },
  },
]
