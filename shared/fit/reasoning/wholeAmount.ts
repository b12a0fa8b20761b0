import { clothOf, doublingText, leastChangeMm, roundToStep } from '../amount.ts'
import { mmToken } from '../amountText.ts'
import { type Rule } from '../rule.ts'
import { type AmountKind, type Observation, type PaperChange } from '../types.ts'
import { points } from '../weights.ts'
import { type Candidate, type SignMatch } from './candidates.ts'
import { type CandidateSide } from './matchSign.ts'

export type Whole = {
  /** unsigned, mm, rounded to the paper's step */
  mm: number
  from: PaperChange['amountFrom']
  other?: { mm: number; from: PaperChange['amountFrom'] }
  /** observation id → what was done to its amount, in words */
  traces: ReadonlyMap<string, string>
  note?: string
}

/** Two ways to an amount that are further apart than this are both shown. */
const disagreeMm = 10

const clothKinds: readonly AmountKind[] = ['cloth', 'gap', 'fold-depth']

/** The whole amount: measured on the sample before computed from measurements before usual for the sign. */
export function wholeAmount(candidate: Candidate, explained: readonly Observation[], stepMm: number): Whole {
  const traces = new Map<string, string>()
  const sample = fromSample(candidate, explained, traces)
  const measured = candidate.facts.filter((fact) => !fact.against && fact.pattern.amount !== undefined && fact.valueMm > 0)
    .map((fact) => fact.valueMm * fact.pattern.amount!)
  const found: { mm: number; from: PaperChange['amountFrom'] }[] = []
  if (sample.length) found.push({ mm: mean(sample), from: 'measured on sample' })
  if (measured.length) found.push({ mm: Math.max(...measured), from: 'measurements' })
  found.push({ mm: usualFor(candidate.rule, explained), from: 'usual for this sign' })
  const [first, second] = found.map(({ mm, from }) => ({ mm: roundToStep(mm, stepMm), from }))
  const disagrees = second && second.from !== 'usual for this sign' && Math.abs(second.mm - first!.mm) > disagreeMm
  return {
    ...first!, traces,
    ...(disagrees && { other: second, note: `The sample says ${mmToken(first!.mm)}, the measurements say ${mmToken(second.mm)}. The sample is followed; measure again before cutting.` }),
    ...(sample.length > 1 && Math.max(...sample) - Math.min(...sample) >= leastChangeMm && { note: `Measured at ${sample.length} signs, from ${mmToken(Math.min(...sample))} to ${mmToken(Math.max(...sample))}: their mean is taken.` }),
  }
}
const mean = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length

/** Wholes from the strongest signs that were measured; signs as strong as each other are averaged, weaker ones are left aside. */
function fromSample(candidate: Candidate, explained: readonly Observation[], traces: Map<string, string>): number[] {
  const wholes: { mm: number; weight: number }[] = []
  for (const observation of explained) {
    const match = candidate.matches.get(observation.id)
    const whole = match && wholeFrom(observation, match, candidate)
    if (!whole) continue
    wholes.push({ mm: whole.mm, weight: points[match.strength] })
    if (whole.trace) traces.set(observation.id, whole.trace)
  }
  const most = Math.max(...wholes.map(({ weight }) => weight))
  return wholes.filter(({ weight }) => weight === most).map(({ mm }) => mm)
}

/** What one observation says about the whole; null where it was not measured, or not in a way that says it. */
function wholeFrom({ amount, side }: Observation, { pattern }: SignMatch, candidate: Candidate): { mm: number; trace: string | null } | null {
  const times = amount && factorFor(amount.as, pattern.amounts)
  if (!amount || times === undefined) return null
  const cloth = clothOf(amount)
  const sides = sidesCounted(amount.as, side, candidate.side, candidate.rule, pattern.perSide ?? [])
  const mm = cloth * times * sides
  const parts = [doublingText(amount), times !== 1 && `${mmToken(cloth)} here means ${mmToken(cloth * times)} of change`, sides === 2 && `on both sides together that is ${mmToken(mm)}`]
  const said = parts.filter((part) => typeof part === 'string')
  return { mm, trace: said.length ? `${said.join('; ')}.` : null }
}

/** Cloth, gap and fold are all cloth and stand in for each other; a distance off its place does not. */
function factorFor(kind: AmountKind, amounts: Partial<Record<AmountKind, number>> | undefined): number | undefined {
  if (!amounts || amounts[kind] !== undefined || kind === 'shift') return amounts?.[kind]
  return clothKinds.map((other) => amounts[other]).find((factor) => factor !== undefined)
}

/** 2 where one side was measured and the whole is for both, as width adds up over the body. A length stands whole on each side. */
function sidesCounted(kind: AmountKind, seen: Observation['side'], change: CandidateSide, rule: Rule, perSide: readonly AmountKind[]): 1 | 2 {
  if (change !== 'both') return 1
  if (seen === 'both') return perSide.includes(kind) ? 2 : 1
  return seen !== 'centre' && isWidth(rule) ? 2 : 1
}
export const isWidth = (rule: Rule): boolean => rule.change.steps.some((step) => step.share === 'width')

function usualFor(rule: Rule, explained: readonly Observation[]): number {
  const severity = explained.length ? Math.max(...explained.map((observation) => observation.severity)) : 2
  return rule.amounts.usualMm[severity - 1]!
}
