import { type Rule } from '../rule.ts'

const uppers = { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'] } as const
const box = [0.28, 0.12, 0.72, 0.38] as const

export const armholeRules: readonly Rule[] = [
  {
    cause: 'front-armhole-loose', title: 'Turn the armhole’s spare edge into the bust dart', sentence: 'The front armhole edge is longer than the body under it.',
    recognise: 'The front armhole edge stands off, with a fold pointing at the bust, though the bust itself is easy.', words: ['gaping armhole', 'armhole stands away'],
    when: uppers, sided: 'either',
    signs: [
      { sign: 'gaping', zone: 'armhole', view: ['front', 'side'], weight: 'strong', because: 'the edge stands off', amounts: { gap: 1, 'fold-depth': 1, cloth: 1 }, perSide: ['gap', 'fold-depth', 'cloth'], after: 'The armhole edge lies on the body.' },
      { sign: 'excess', zone: 'armhole', view: 'front', weight: 'fair', because: 'a fold stands at the front armhole', amounts: { 'fold-depth': 1, cloth: 1 }, perSide: ['fold-depth', 'cloth'] },
      { sign: 'drag-lines', zone: 'bust', weight: 'strong', against: true, because: 'lines at the bust say that the bust lacks cloth' },
      { sign: 'tight', zone: 'bust', weight: 'strong', against: true, because: 'a bust that strains pulls the armhole open' },
      { sign: 'rises', zone: ['hem', 'waist'], view: 'front', weight: 'fair', against: true, because: 'a front that rises lacks cloth over the bust' },
    ],
    measures: [{ plus: ['body:bust'], minus: ['body:high-bust', 'drafted-cup'], grades: [{ from: 20, weight: 'fair', against: true }], because: 'full bust less high bust is {value} more than the pattern is drafted for' }],
    amounts: { direction: -1, usualMm: [8, 12, 20] },
    change: { operation: 'dart-rotate', steps: [{ piece: 'bodice-front', edge: 'armhole', edges: 2, share: 'width', taper: 'to nothing at the bust point', text: 'Fold a wedge of {amount} out of the {side} front armhole, to nothing at the bust point, and let the bust dart open by the same angle.' }], companions: [{ piece: 'armhole-facing', text: 'Recut the armhole facing by the new edge.', when: { sleeves: ['none'] } }, { piece: 'sleeve', text: 'Walk the sleeve cap against the shorter armhole.', when: { sleeves: ['set-in'] } }, { piece: 'lining', text: 'Change the front lining alike.', when: { needs: ['lining'] } }], noCompanions: 'a bound edge follows' },
    limits: { leastMm: 3, mostMm: 40, beyond: 'Look at the bust first: an armhole that stands off so far asks for cloth there.' }, stage: 'dart', predicts: 'The armhole edge lies on the body.', recheck: ['bust', 'armhole length'], source: 'drafting course, common practice (gape is moved to an existing dart)',
    rivals: [{ cause: 'full-bust', check: { id: 'full-bust~front-armhole-loose', ask: 'Pin the spare cloth of the armhole towards the bust point. Does the bust strain more now?', yes: 'The armhole gapes because the bust lacks cloth.', no: 'Only the armhole edge is too long.', yesMeans: 'rival' } }],
    drawing: { sign: { figure: 'front', region: box, strokes: [{ kind: 'gape', from: [0.35, 0.18], to: [0.35, 0.26], bend: -0.03 }, { kind: 'fold', from: [0.36, 0.23], to: [0.42, 0.26] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'overlap', from: [0.75, 0.25], to: [0.45, 0.5], label: 'closed' }, { kind: 'spread', from: [0.95, 0.6], to: [0.45, 0.5], label: 'dart opens' }] } },
  },
  {
    cause: 'armhole-high', title: 'Lower the underarm', sentence: 'The armhole is higher under the arm than it needs to be.',
    recognise: 'The armhole cuts into the underarm and folds lie round its lower edge.', words: ['armhole cuts', 'tight underarm'],
    when: uppers, sided: 'either',
    signs: [
      { sign: 'tight', zone: 'armhole', weight: 'strong', because: 'the edge cuts under the arm', amounts: { shift: 1, gap: 1, cloth: 1 }, after: 'The underarm is free.' },
      { sign: 'binds', zone: 'armhole', weight: 'strong', because: 'the arm is stopped by the edge', amounts: { shift: 1 } },
      { sign: 'gaping', zone: 'armhole', weight: 'strong', against: true, because: 'an edge that stands off does not cut' },
    ],
    measures: [], amounts: { direction: -1, usualMm: [6, 6, 13] },
    change: { operation: 'curve-depth', steps: [
      { piece: 'bodice-front', edge: 'underarm', edges: 1, share: 'length', taper: 'to nothing at the notches', text: 'Lower the underarm of the front by {amount}, blended to the notch; nothing is taken at the width.' },
      { piece: 'bodice-back', edge: 'underarm', edges: 1, share: 'length', taper: 'to nothing at the notches', text: 'Lower the underarm of the back by {amount} alike.' },
      { piece: 'sleeve', edge: 'underarm', edges: 1, share: 'length', taper: 'to nothing at the notches', text: 'Lower the sleeve’s underarm by {amount} too.', when: { sleeves: ['set-in'] } },
    ], companions: [{ piece: 'armhole-facing', text: 'Recut the armhole facing by the new edge.', when: { sleeves: ['none'] } }, { piece: 'lining', text: 'Change the lining alike.', when: { needs: ['lining'] } }], noCompanions: 'a bound edge follows' },
    limits: { leastMm: 3, mostMm: 25, beyond: 'Let the side seam or the shoulder out first.' }, stage: 'bust', opposite: 'armhole-low', predicts: 'The underarm is free.', recheck: ['raising the arm'], source: 'Home-economics text (let out or trim, never so that front or back get narrow); steps: common practice',
    rivals: [{ cause: 'broad-back', check: { ask: 'Does it cut under the arm and not at the sides?', yes: 'The armhole is too high.', no: 'The back lacks width.' } }, { cause: 'bust-girth-tight', check: { ask: 'Is the girth easy at bust level?', yes: 'Only the armhole is high.', no: 'The girth lacks width.' } }],
    drawing: { sign: { figure: 'front', region: box, strokes: [{ kind: 'press', from: [0.34, 0.26], to: [0.38, 0.28] }, { kind: 'fold', from: [0.36, 0.28], to: [0.4, 0.27] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'move', from: [0.92, 0.38], to: [0.92, 0.43], label: 'down' }] } },
  },
  {
    cause: 'armhole-low', title: 'Raise the underarm', sentence: 'The armhole is lower under the arm than it needs to be.',
    recognise: 'Raising the arm lifts the whole garment, and folds lie under the arm at rest.', words: ['low armhole', 'arm lifts the body'],
    when: { kinds: ['bodice', 'shirt', 'dress', 'jacket', 'coat'], sleeves: ['set-in', 'dropped'] }, sided: 'either',
    signs: [
      { sign: 'binds', zone: 'armhole', weight: 'fair', because: 'the raised arm lifts the whole garment', amounts: { shift: 1 } },
      { sign: 'rises', zone: ['whole', 'hem', 'waist'], weight: 'slight', because: 'the body goes up with the arm' },
      { sign: 'excess', zone: 'armhole', view: ['front', 'back', 'side'], weight: 'fair', because: 'folds lie under the arm at rest' },
      { sign: 'drops', zone: 'armhole', weight: 'decisive', because: 'the underarm lies below the arm', amounts: { shift: 1 }, after: 'The arm rises without the body.' },
      { sign: 'tight', zone: 'armhole', weight: 'strong', against: true, because: 'an edge that cuts is not low' },
    ],
    measures: [], amounts: { direction: 1, usualMm: [8, 13, 20] },
    change: { operation: 'curve-depth', steps: [
      { piece: 'bodice-front', edge: 'underarm', edges: 1, share: 'length', taper: 'to nothing at the notches', text: 'Raise the underarm of the front by {amount}, blended to the notch.' },
      { piece: 'bodice-back', edge: 'underarm', edges: 1, share: 'length', taper: 'to nothing at the notches', text: 'Raise the underarm of the back by {amount} alike.' },
      { piece: 'sleeve', edge: 'underarm', edges: 1, share: 'length', taper: 'to nothing at the notches', text: 'Raise the sleeve’s underarm by {amount} too.' },
    ], companions: [{ piece: 'lining', text: 'Change the lining alike.', when: { needs: ['lining'] } }], noCompanions: 'body and sleeve move together' },
    limits: { leastMm: 4, mostMm: 40, beyond: 'Look at cap height and biceps as well.' }, stage: 'bust', opposite: 'armhole-high', predicts: 'The arm rises without the body.', recheck: ['raising the arm', 'cap'], source: 'Home-economics text (take up at underarm or shoulder seam); article on armholes, common practice',
    rivals: [{ cause: 'full-upper-arm', check: { ask: 'Is the sleeve easy round the arm?', yes: 'The armhole is low.', no: 'The sleeve is narrow.' } }, { cause: 'broad-back', check: { ask: 'Does reaching forward stay easy?', yes: 'Only raising lifts the body.', no: 'The back lacks width.' } }],
    drawing: { sign: { figure: 'front', region: box, strokes: [{ kind: 'fold', from: [0.34, 0.29], to: [0.4, 0.28] }, { kind: 'level', from: [0.38, 0.36], to: [0.6, 0.35] }] }, change: { piece: 'bodice-front', marks: [{ kind: 'move', from: [0.92, 0.43], to: [0.92, 0.38], label: 'up' }] } },
  },
]
