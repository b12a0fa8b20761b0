import { sentenceOf } from '../vocabulary.ts'
import { type Rule, type SignPattern } from '../rule.ts'
import { type Evidence, type FitInput } from '../types.ts'
import { points, type Strength } from '../weights.ts'
import { fitsGarment } from './fitsGarment.ts'
import { type LedgerState } from './ledgerState.ts'
import { type CandidateSide, matchSign, type Seen, strengthOnSide } from './matchSign.ts'
import { type MeasureFact, measureEvidence } from './measureEvidence.ts'
import { type RuleIndex, signKey } from './ruleIndex.ts'

export type SignMatch = { pattern: SignPattern; strength: Strength }

/** A cause on one side of the body, with all that speaks for and against it. */
export type Candidate = {
  rule: Rule
  side: CandidateSide
  place: number
  /** column (observation id, or measured quantity) → points */
  columns: ReadonlyMap<string, number>
  /** what speaks whatever else is chosen: answers and earlier samples, less all that speaks against it */
  bonus: number
  /** observation id → the strongest sign that fits it */
  matches: ReadonlyMap<string, SignMatch>
  facts: readonly MeasureFact[]
  /** evidence that does not rest on an observation explained */
  aside: readonly Evidence[]
  /** may be raised although nothing was seen */
  alone: boolean
}

export type Gathered = { candidates: Candidate[]; missingFor: ReadonlyMap<string, readonly string[]> }

export const observationColumn = (id: string): string => `seen ${id}`

/** Every cause that anything at all speaks for. */
export function gatherCandidates(input: FitInput, seen: readonly Seen[], ledger: readonly LedgerState[], index: RuleIndex): Gathered {
  const matched = matchesByRule(input, seen, index)
  const missingFor = new Map<string, readonly string[]>()
  const answers = answersByCause(input, index)
  const candidates: Candidate[] = []
  for (const rule of index.rules) {
    const signs = matched.get(rule.cause)
    const done = ledger.filter((state) => state.entry.cause === rule.cause)
    if ((!signs && !rule.measures.length && !done.length) || !fitsGarment(rule.when, input.garment)) continue
    const { facts, missing } = measureEvidence(rule, input, (side) => done.filter((state) => state.side === side).reduce((sum, state) => sum + state.doneMm, 0))
    if (missing.length) missingFor.set(rule.cause, missing)
    for (const side of sidesFor(rule, signs ?? [], facts, done)) {
      const candidate = candidateOf(rule, side, signs ?? [], facts.filter((fact) => fact.side === side || rule.sided !== 'one' && fact.side === 'both'), answers.get(rule.cause) ?? [], ledger, index, isFirstLook(input))
      if (candidate) candidates.push(candidate)
    }
  }
  return { candidates, missingFor }
}

/** Before anything was looked at, every measurement that gives an amount may speak alone; afterwards the sample is the better witness. */
const isFirstLook = ({ observations, ledger }: FitInput): boolean => !observations.length && !ledger.length

type RuleMatch = { seen: Seen; pattern: SignPattern; strength: Strength }

function matchesByRule(input: FitInput, seen: readonly Seen[], index: RuleIndex): Map<string, RuleMatch[]> {
  const byRule = new Map<string, RuleMatch[]>()
  for (const one of seen) for (const { rule, pattern } of index.bySign.get(signKey(one.observation.sign, one.observation.zone)) ?? []) {
    const strength = matchSign(pattern, one)
    if (!strength) continue
    const list = byRule.get(rule.cause)
    if (list) list.push({ seen: one, pattern, strength })
    else byRule.set(rule.cause, [{ seen: one, pattern, strength }])
  }
  return byRule
}

function sidesFor(rule: Rule, signs: readonly RuleMatch[], facts: readonly MeasureFact[], done: readonly LedgerState[]): CandidateSide[] {
  const sides = new Set<CandidateSide>(done.map((state) => state.side))
  if (rule.sided !== 'one' && (signs.length || facts.length)) sides.add('both')
  if (rule.sided !== 'both') {
    for (const { seen: { observation: { side } } } of signs) if (side === 'left' || side === 'right') sides.add(side)
    for (const { side } of facts) sides.add(side)
  }
  return (['both', 'left', 'right'] as const).filter((side) => sides.has(side))
}

type Answer = { id: string; speaks: 'for' | 'against'; text: string }

/** What the answered checks say about each cause. */
function answersByCause(input: FitInput, index: RuleIndex): Map<string, Answer[]> {
  const byCause = new Map<string, Answer[]>()
  for (const [id, answer] of Object.entries(input.answers)) {
    const told = new Set<string>()
    for (const { rule, rival, yesSpeaksFor, noSpeaksFor } of index.byCheck.get(id) ?? []) {
      const check = rule.rivals.find((one) => one.cause === rival)!.check
      const [favoured, refused] = answer === 'yes' ? [yesSpeaksFor, noSpeaksFor] : [noSpeaksFor, yesSpeaksFor]
      const text = `${check.ask} ${answer === 'yes' ? 'Yes' : 'No'}: ${answer === 'yes' ? check.yes : check.no}`
      for (const [cause, speaks] of [[favoured, 'for'], [refused, 'against']] as const) {
        // Two rules may share a check: it still counts once for each cause.
        if (told.has(cause)) continue
        told.add(cause)
        byCause.set(cause, [...byCause.get(cause) ?? [], { id, speaks, text }])
      }
    }
  }
  return byCause
}

function candidateOf(rule: Rule, side: CandidateSide, signs: readonly RuleMatch[], facts: readonly MeasureFact[], answers: readonly Answer[], ledger: readonly LedgerState[], index: RuleIndex, firstLook: boolean): Candidate | null {
  const matches = new Map<string, SignMatch>()
  const refusals = new Map<string, Evidence & { points: number }>()
  const aside: Evidence[] = []
  let bonus = 0
  for (const { seen, pattern, strength: exact } of signs) {
    const strength = strengthOnSide(exact, rule.sided, side, seen)
    if (!strength) continue
    const { observation } = seen
    if (pattern.against) {
      if ((refusals.get(observation.id)?.points ?? 0) < points[strength])
        refusals.set(observation.id, { points: points[strength], text: `${sentenceOf(observation)}: ${pattern.because}.`, speaks: 'against', strength, from: { observation: observation.id } })
      continue
    }
    const known = matches.get(observation.id)
    const gives = (one: SignPattern) => Number(observation.amount !== undefined && one.amounts !== undefined)
    if (!known || points[strength] > points[known.strength] || (strength === known.strength && gives(pattern) > gives(known.pattern))) matches.set(observation.id, { pattern, strength })
  }
  for (const { points: weight, ...evidence } of refusals.values()) {
    bonus -= weight
    aside.push(evidence)
  }
  const columns = new Map([...matches].map(([id, match]) => [observationColumn(id), points[match.strength]]))
  for (const fact of facts) {
    if (fact.against) bonus -= points[fact.strength]
    else columns.set(fact.key, Math.max(columns.get(fact.key) ?? 0, points[fact.strength]))
    aside.push({ text: fact.text, speaks: fact.against ? 'against' : 'for', strength: fact.strength, from: { measurement: fact.code } })
  }
  for (const { id, speaks, text } of answers) {
    bonus += speaks === 'for' ? points.decisive : -points.decisive
    aside.push({ text, speaks, strength: 'decisive', from: { answer: id } })
  }
  for (const told of ledgerEvidence(rule, side, ledger, index)) {
    if (told.column) columns.set(told.column, points[told.evidence.strength])
    else bonus += told.evidence.speaks === 'for' ? points[told.evidence.strength] : -points[told.evidence.strength]
    aside.push(told.evidence)
  }
  if (!columns.size) return null
  const alone = facts.some((fact) => !fact.against && (fact.pattern.alone || (firstLook && fact.pattern.amount !== undefined))) || [...columns.keys()].some((column) => column.startsWith('ledger '))
  return { rule, side, place: index.placeOf.get(rule.cause)!, columns, bonus, matches, facts, aside, alone }
}

/** A change that helped speaks for its cause; one that made it worse speaks against it and for its rivals. */
function ledgerEvidence(rule: Rule, side: CandidateSide, ledger: readonly LedgerState[], index: RuleIndex): { column?: string; evidence: Evidence }[] {
  const told: { column?: string; evidence: Evidence }[] = []
  for (const state of ledger) {
    const { cause } = state.entry
    if (cause === rule.cause && state.side === side) {
      if (state.status === 'worse') told.push({ evidence: { text: 'The change made for it was followed by more of the same, not less.', speaks: 'against', strength: 'decisive', from: { ledger: cause } } })
      if (state.status === 'better') told.push({ column: `ledger ${cause} ${side}`, evidence: { text: 'The change made for it helped, and part of it is left.', speaks: 'for', strength: 'strong', from: { ledger: cause } } })
      if (state.status === 'same') told.push({ column: `ledger ${cause} ${side}`, evidence: { text: 'The change made for it was hardly answered by the cloth, and the sign is still there.', speaks: 'for', strength: 'strong', from: { ledger: cause } } })
    } else if ((state.status === 'worse' || state.status === 'same') && areRivals(rule, index.byCause.get(cause))) {
      const strength = state.status === 'worse' ? 'strong' : 'slight'
      told.push({ evidence: { text: state.status === 'worse' ? `“${state.rule.title}” made it worse: the next likely cause moves up.` : `“${state.rule.title}” was hardly answered.`, speaks: 'for', strength, from: { ledger: cause } } })
    }
  }
  return told
}

export const areRivals = (a: Rule, b: Rule | undefined): boolean =>
  b !== undefined && (a.rivals.some((rival) => rival.cause === b.cause) || b.rivals.some((rival) => rival.cause === a.cause))
