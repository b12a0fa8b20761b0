import { paperStepMm } from '../units/unit.ts'
import { leastChangeMm } from './amount.ts'
import { type Diagnosis, type Finding, type FitInput, type Observation } from './types.ts'
import { type Candidate, gatherCandidates, observationColumn } from './reasoning/candidates.ts'
import { contradictoryChanges, contradictoryObservations } from './reasoning/conflicts.ts'
import { coverObservations } from './reasoning/cover.ts'
import { bringBackFinding, type FindingContext, findingOf, overdoneFinding } from './reasoning/findings.ts'
import { isReversal, ledgerState, type LedgerState, mergeEntries } from './reasoning/ledgerState.ts'
import { pairSides } from './reasoning/matchSign.ts'
import { lookNext, missingFor } from './reasoning/openQuestions.ts'
import { correctForEarlier, inWorkingOrder } from './reasoning/order.ts'
import { catalogueIndex, type RuleIndex } from './reasoning/ruleIndex.ts'
import { wholeAmount } from './reasoning/wholeAmount.ts'

/**
 * From what was seen, measured and changed so far to the changes on paper, with the whole trace.
 * Same input, same answer; the order of the observations does not matter.
 * @param index - the rules, indexed; the whole catalogue unless a test asks for fewer
 * @returns findings in working order; lengths in mm, texts with amount tokens (see types.ts)
 */
export function diagnose(given: FitInput, index: RuleIndex = catalogueIndex): Diagnosis {
  // One order for everything that follows, whatever order things were noted in.
  const input = { ...given, observations: [...given.observations].sort((a, b) => (a.id < b.id ? -1 : 1)) }
  const stepMm = paperStepMm[input.unit ?? 'cm']
  const contradictions = contradictoryObservations(input.observations)
  const contradicted = new Set(contradictions.flatMap(({ observationIds }) => observationIds))
  const ledger = mergeEntries(input.ledger).flatMap((entry) => (index.byCause.has(entry.cause) ? [ledgerState(entry, index.byCause.get(entry.cause)!)] : []))

  const overdone = ledger.filter(({ status, doneMm }) => status === 'overdone' && doneMm >= leastChangeMm).map((state) => ({ state, reversed: input.observations.filter((one) => !contradicted.has(one.id) && isReversed(state, one)) }))
  const accounted = new Set(overdone.flatMap(({ reversed }) => reversed.map(({ id }) => id)))
  const seen = pairSides(input.observations.filter(({ id }) => !contradicted.has(id) && !accounted.has(id)))

  const { candidates, missingFor: missing } = gatherCandidates(input, seen, ledger, index)
  const cover = coverObservations(candidates)
  const context: FindingContext = { input, cover, candidates, ledger, stepMm, index }

  // A cause that is the opposite of an overdone change is that change once more.
  const again = overdone.map(({ state, reversed }) => ({ state, reversed: [...reversed, ...cover.chosen.filter((candidate) => isOpposite(state, candidate)).flatMap((candidate) => explainedOf(candidate, context))] }))
  const fresh = cover.chosen.filter((candidate) => !overdone.some(({ state }) => isOpposite(state, candidate)))
  const back = [
    ...ledger.filter(({ status, doneMm }) => status === 'worse' && doneMm >= leastChangeMm).map((state) => bringBackFinding(state, context)),
    ...again.map(({ state, reversed }) => overdoneFinding(state, -state.remainingMm, reversed, context)),
  ]
  const suggested = fresh.map((candidate) => takenTooFar(candidate, context) ?? findingOf(candidate, context))
  const undone = contradictoryChanges(suggested, index)
  const found = [...back, ...suggested]
  const ordered = correctForEarlier(inWorkingOrder(found.filter((finding) => !undone.involved.has(finding)), index), input, stepMm, index)
  const explained = new Set([...found.flatMap(({ explains }) => explains), ...contradicted])
  return {
    findings: ordered,
    unexplained: input.observations.filter(({ id }) => !explained.has(id)).map((observation) => lookNext(observation, candidates, index)),
    conflicts: [...contradictions, ...undone.conflicts],
    missing: missingFor(ordered, missing, input),
  }
}

/** Whether an observation is an overdone change's own sign turned round, on its side. */
function isReversed(state: LedgerState, observation: Observation): boolean {
  if (state.side !== 'both' && (observation.side === 'left' || observation.side === 'right') && observation.side !== state.side) return false
  return state.reading !== null && isReversal(state.reading, observation)
}

const isOpposite = (state: LedgerState, candidate: Candidate): boolean =>
  state.side === candidate.side && (state.rule.opposite === candidate.rule.cause || candidate.rule.opposite === state.rule.cause)

const explainedOf = (candidate: Candidate, { input, cover }: FindingContext): Observation[] =>
  input.observations.filter(({ id }) => cover.explainedBy.get(observationColumn(id)) === candidate)

/** The opposite of a change that is in the sample and was not looked at since: that change went too far. */
function takenTooFar(candidate: Candidate, context: FindingContext): Finding | null {
  const state = context.ledger.find((one) => one.status === 'not-looked' && isOpposite(one, candidate))
  const explained = state ? explainedOf(candidate, context) : []
  return state && explained.length ? overdoneFinding(state, wholeAmount(candidate, explained, context.stepMm).mm, explained, context) : null
}
