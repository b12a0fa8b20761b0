import { roundToStep } from '../amount.ts'
import { mmToken, signedToken } from '../amountText.ts'
import { sentenceOf, sideWords } from '../vocabulary.ts'
import { type Check, type Evidence, type Finding, type FitInput, type Observation, type Prediction } from '../types.ts'
import { clothOf } from '../amount.ts'
import { points } from '../weights.ts'
import { type Candidate, observationColumn } from './candidates.ts'
import { chosenPoints, type Competitor, competitorsOf, confidenceOf, leastRivalPoints } from './confidence.ts'
import { type Cover } from './cover.ts'
import { type LedgerState } from './ledgerState.ts'
import { leastOf, noChange, paperChange } from './paperChange.ts'
import { checkIdOf, type RuleIndex } from './ruleIndex.ts'
import { wholeAmount, type Whole } from './wholeAmount.ts'

export type FindingContext = { input: FitInput; cover: Cover; candidates: readonly Candidate[]; ledger: readonly LedgerState[]; stepMm: number; index: RuleIndex }

/** How many rivals are worth a fitter's time. */
const mostRivals = 4
/** What nobody saw on the sample is at most as likely as not. */
const mostUnseen = 0.5

/** A chosen cause with its trace, its rivals, its change and what the next sample should show. */
export function findingOf(candidate: Candidate, context: FindingContext): Finding {
  const { input, cover, candidates, stepMm, index } = context
  const { rule, side } = candidate
  const explained = input.observations.filter(({ id }) => cover.explainedBy.get(observationColumn(id)) === candidate)
  const whole = wholeAmount(candidate, explained, stepMm)
  const state = context.ledger.find((one) => one.entry.cause === rule.cause && one.side === side)
  const answered = answerOf(whole, state, stepMm)
  const competitors = competitorsOf(candidate, cover, candidates)
  const own = chosenPoints(candidate, cover)
  const confidence = confidenceOf(own, competitors[0]?.points ?? 0)
  const amountMm = rule.amounts.direction * answered.mm
  const full = paperChange({
    rule, side, amountMm, amountFrom: answered.from,
    ...(whole.other && !state?.reading && { otherAmount: { amountMm: rule.amounts.direction * whole.other.mm, amountFrom: whole.other.from } }),
    notes: whole.note && !state?.reading ? [whole.note] : [],
  }, input, stepMm)
  const leaveIt = Math.abs(amountMm) < leastOf(rule)
  return {
    cause: rule.cause, sentence: rule.sentence, side,
    confidence: explained.length || state ? confidence : Math.min(confidence, mostUnseen),
    explains: explained.map(({ id }) => id),
    because: [...explained.map((observation) => seenEvidence(observation, candidate, whole)), ...candidate.aside],
    rivals: namedRivals(candidate, own, competitors, index, input),
    change: leaveIt ? noChange(full) : full,
    predicts: leaveIt ? [] : explained.map((observation) => predictionOf(observation, candidate, whole, answered.remainingMm)),
    ...(answered.response && { response: answered.response }),
    advice: leaveIt ? 'leave-it' : 'change',
  }
}

function seenEvidence(observation: Observation, candidate: Candidate, whole: Whole): Evidence {
  const { pattern, strength } = candidate.matches.get(observation.id)!
  const where = observation.side === 'centre' ? 'at the centre' : sideWords[observation.side].toLowerCase() + (observation.side === 'both' ? '' : ' side')
  const trace = whole.traces.get(observation.id)
  return { text: `${sentenceOf(observation)}, ${where}: ${pattern.because}.${trace ? ` ${trace}` : ''}`, speaks: 'for', strength, from: { observation: observation.id } }
}

type Answered = { mm: number; from: Finding['change']['amountFrom']; remainingMm?: number; response?: NonNullable<Finding['response']> }

/** The amount with what earlier samples taught: what is left, divided by how well the cloth answered. */
function answerOf(whole: Whole, state: LedgerState | undefined, stepMm: number): Answered {
  if (!state) return whole
  const soFarMm = state.doneMm
  if (!state.reading || state.status === 'not-looked') return { ...whole, response: { value: state.response, soFarMm, text: `${mmToken(soFarMm)} is in the sample already; this is the first look at it.` } }
  const remainingMm = whole.from === 'measured on sample' ? whole.mm : state.remainingMm
  const mm = roundToStep(remainingMm / state.response, stepMm)
  const { beforeMm, afterMm, predictedMm } = state.reading
  const total = roundToStep(soFarMm + mm, stepMm)
  const text = `${mmToken(soFarMm)} was put in and ${mmToken(predictedMm)} should have gone; ${mmToken(beforeMm)} became ${mmToken(afterMm)}. The cloth answers ${state.response} to 1, so ${mmToken(remainingMm)} more asks for ${mmToken(mm)}: ${mmToken(total)} in all.`
  const doubt = state.status === 'same' ? ' It hardly answered: look at the rivals before changing more.' : ''
  return { mm, from: 'measured on sample', remainingMm, response: { value: state.response, soFarMm, text: text + doubt } }
}

function predictionOf(observation: Observation, candidate: Candidate, whole: Whole, remainingMm: number | undefined): Prediction {
  const { pattern } = candidate.matches.get(observation.id)!
  // Cloth that is in the sign itself goes; where it was not measured, what the change moves is the best guess.
  const changeMm = observation.amount ? clothOf(observation.amount) : remainingMm ?? whole.mm
  return { observationId: observation.id, text: pattern.after ?? candidate.rule.predicts, expectedMm: 0, changeMm }
}

function namedRivals({ rule }: Candidate, own: number, competitors: readonly Competitor[], index: RuleIndex, input: FitInput): Finding['rivals'] {
  return competitors.map(({ candidate, points: sum }) => ({ candidate, sum, check: checkBetween(rule.cause, candidate.rule.cause, index) }))
    .filter(({ sum, check }) => sum >= leastRivalPoints || (check && input.answers[check.id] !== undefined))
    .slice(0, mostRivals)
    .map(({ candidate, sum, check }) => ({ cause: candidate.rule.cause, sentence: candidate.rule.sentence, confidence: confidenceOf(sum, own), tellApart: check }))
}

/** The check that tells two causes apart, from either of their rules; null where neither names the other. */
export function checkBetween(a: string, b: string, { byCause }: RuleIndex): Check | null {
  for (const [one, other] of [[a, b], [b, a]] as const) {
    const rule = byCause.get(one)
    const rival = rule?.rivals.find(({ cause }) => cause === other)
    if (rule && rival) return { id: checkIdOf(rule.cause, rival), ask: rival.check.ask, yes: rival.check.yes, no: rival.check.no }
  }
  return null
}

/** A change that did too much: exactly the overshoot goes back. */
export function overdoneFinding(state: LedgerState, overshootMm: number, explained: readonly Observation[], { input, stepMm }: FindingContext): Finding {
  const { rule, side, doneMm } = state
  const backMm = Math.min(roundToStep(overshootMm, stepMm), doneMm)
  const total = doneMm - backMm
  const change = paperChange({ rule, side, amountMm: -rule.amounts.direction * backMm, amountFrom: 'measured on sample', takesBack: true }, input, stepMm)
  const folded = explained.map((observation) => observation.amount).find((amount) => amount?.as === 'fold-depth')
  const doubled = folded ? ` A fold {mm:${folded.mm}} deep holds {mm:${folded.mm * 2}} of cloth.` : ''
  const text = `${mmToken(doneMm)} was put in and it is now ${mmToken(backMm)} past its place.${doubled} Take back ${mmToken(backMm)}: ${mmToken(total)} stays.`
  return {
    cause: rule.cause, sentence: 'The earlier change went further than the cloth needed.', side, confidence: confidenceOf(points.decisive, 0),
    explains: explained.map(({ id }) => id),
    because: [{ text, speaks: 'for', strength: 'decisive', from: { ledger: rule.cause } }],
    rivals: [], change,
    predicts: [...new Set([...(state.reading ? [state.reading.observationId] : []), ...explained.map(({ id }) => id)])].map((observationId) => ({ observationId, text: rule.predicts, expectedMm: 0, changeMm: backMm })),
    response: { value: state.response, soFarMm: doneMm, text }, advice: 'change',
  }
}

/** A change that made it worse comes out whole: its cause was another one. */
export function bringBackFinding(state: LedgerState, { input, stepMm }: FindingContext): Finding {
  const { rule, side, doneMm, reading } = state
  const text = `${mmToken(doneMm)} was put in, and ${mmToken(reading!.beforeMm)} became ${signedToken(reading!.afterMm)}: worse, not better. The cause was another one. Bring the change back out and look at its rivals.`
  return {
    cause: rule.cause, sentence: 'The earlier change made it worse.', side, confidence: confidenceOf(points.decisive, 0), explains: [],
    because: [{ text, speaks: 'against', strength: 'decisive', from: { ledger: rule.cause } }], rivals: [],
    change: paperChange({ rule, side, amountMm: -rule.amounts.direction * doneMm, amountFrom: 'measured on sample', takesBack: true }, input, stepMm),
    predicts: [], response: { value: state.response, soFarMm: doneMm, text }, advice: 'bring-back',
  }
}
