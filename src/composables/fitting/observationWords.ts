import { type Change, type FittingObservation, type Mark, type Reading } from '#shared/contracts/fitting.ts'
import { clothMm, placeOf, sentenceOf } from '#shared/fit/vocabulary.ts'

export type Format = (mm: number) => string

/** How the icons name the kinds of marks. */
export const markIcons: Record<Mark['kind'], string> = { 'drag-line': 'drag', gape: 'gape', tight: 'tight', excess: 'excess', length: 'length', balance: 'balance', place: 'place' }

/** Word of a state: "Carried to sample 2". */
export function stateWords(observation: Pick<FittingObservation, 'state' | 'id'>, changes: readonly Change[]): string {
  const carriedTo = changes.find((change) => change.observationIds.includes(observation.id) && change.carriedTo)?.carriedTo
  return { noted: 'Noted', chosen: 'Change chosen', carried: carriedTo ? `Carried to sample ${carriedTo}` : 'Carried on', settled: 'Settled', 'let-be': 'Let be' }[observation.state]
}

/** What its pin says: "Observation 3, tight across the bust, 2.0 cm, noted". */
export function spokenLabel(observation: FittingObservation, changes: readonly Change[], format: Format): string {
  const sentence = sentenceOf(observation)
  const parts = [`Observation ${observation.number}`, sentence[0]!.toLowerCase() + sentence.slice(1), observation.amount ? format(observation.amount.mm) : 'not measured', stateWords(observation, changes).toLowerCase()]
  return parts.join(', ')
}

/** Below the sentence: where it is, and why it was let be. */
export const belowWords = (observation: FittingObservation): string => (observation.state === 'let-be' && observation.letBeReason ? observation.letBeReason : placeOf(observation))

/** Cloth in the measure an observation was taken in: half of it where that is the depth of a fold. */
export const inMeasureOf = (observation: Pick<FittingObservation, 'amount'>, mm: number): number => (observation.amount?.as === 'fold-depth' ? mm / 2 : mm)

/** What was foretold for this sample: "should be gone", "0.4 cm left". */
export function foretold(observation: Pick<FittingObservation, 'predicted' | 'amount'>, format: Format): string {
  if (!observation.predicted) return ''
  return observation.predicted.expectedMm < 1 ? 'should be gone' : `${format(inMeasureOf(observation, observation.predicted.expectedMm))} left`
}

/** What became of it: "Better by 0.8 cm". */
export function outcomeWords(observation: Pick<FittingObservation, 'amount'>, reading: Reading, format: Format): string {
  if (reading.gone) return 'Gone'
  const before = observation.amount ? clothMm(observation.amount) : null
  const now = reading.amount ? clothMm(reading.amount) : null
  const by = before !== null && now !== null && Math.abs(before - now) >= 1 ? ` by ${format(inMeasureOf(observation, Math.abs(before - now)))}` : ''
  switch (reading.outcome) {
    case 'settled': return 'Settled'
    case 'better': return `Better${by}`
    case 'worse': return `Worse${by}`
    case 'overdone': return `Went too far${now !== null ? ` by ${format(now)}` : ''}`
    case 'same': return 'The same'
    case null: return reading.reversed ? 'Went too far' : 'Still there'
  }
}

/** The reading of one sample, if it was looked at there. */
export const readingOn = (observation: FittingObservation, sampleNumber: number): Reading | null => observation.readings.find((reading) => reading.sampleNumber === sampleNumber) ?? null
