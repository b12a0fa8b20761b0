import { type Change } from '#shared/contracts/fitting.ts'
import { type Photograph } from '#shared/contracts/photograph.ts'
import { type Finding } from '#shared/fit/types.ts'
import { type ShownObservation } from '../../../src/composables/fitting/useObservations.ts'

const by = { id: '0d2c0c52-6f5e-4f5f-9d0a-111111111111', name: 'Ilse' }

export const shown = (more: Partial<ShownObservation> = {}): ShownObservation => ({
  id: 'o1', number: 1, sampleNumber: 1, photographId: 'ph', mark: { kind: 'gape', shape: 'stroke', points: [[0.3, 0.2], [0.3, 0.4]] }, sign: 'gaping', zone: 'armhole', view: 'front', side: 'both',
  direction: null, towards: null, line: null, severity: 2, amount: { mm: 12, as: 'fold-depth' }, note: '', state: 'noted', letBeReason: '', readings: [], predicted: null, by, createdAt: '2025-11-12T10:00:00Z', version: 1, unsent: false, ...more,
})
export const photograph = (more: Partial<Photograph> = {}): Photograph => ({
  id: 'ph', sampleNumber: 1, view: 'front', caption: '', width: 900, height: 1200, drawing: true, pose: '', takenBy: by, createdAt: '2025-11-12T10:00:00Z', version: 1, ...more,
})
export const finding = (more: Partial<Finding> = {}): Finding => ({
  cause: 'full-bust', sentence: 'The front is too narrow over the bust.', side: 'both', confidence: 0.8, explains: ['o1'], predicts: [], advice: 'change',
  because: [{ text: 'A full bust pulls the armhole edge away', speaks: 'for', strength: 'fair', from: { observation: 'o1' } }, { text: 'The back is as tight', speaks: 'against', strength: 'slight', from: { measurement: 'bust' } }],
  rivals: [{ cause: 'slope', sentence: 'The shoulder slopes more.', confidence: 0.3, tellApart: { id: 'full-bust~slope', ask: 'Open {mm:60} of side seam. Do the lines drop?', yes: 'It is the bust.', no: 'Look at the shoulder.' } }],
  change: {
    title: 'Add room over the bust', operation: 'full-bust', amountMm: 30, amountFrom: 'measured on sample', companions: [], recheck: [], unfold: false, notes: [], source: 'common practice',
    steps: [{ pieceRole: 'bodice-front', side: 'both', edge: 'bust line', amountMm: 15, edges: 2, text: 'Spread by {mm:15}.' }], limits: { leastMm: 5, mostMm: 50, beyond: 'Take a larger size.', text: '' },
  },
  ...more,
})
export const changeOf = (of: Finding, more: Partial<Change> = {}): Change => ({
  id: 'c1', sampleNumber: 1, cause: of.cause, decision: 'accepted', title: of.change.title, suggestedMm: of.change.amountMm, amountMm: of.change.amountMm, paper: of.change, observationIds: [...of.explains], reason: null, note: '',
  carriedTo: null, by, at: '2025-11-12T10:00:00Z', version: 1, transfers: [], ...more,
})
