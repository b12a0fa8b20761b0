import { bodyValue } from '../../measurements/findMeasurement.ts'
import { mmToken } from '../amountText.ts'
import { type MeasurePattern, type MeasureRef, type Rule } from '../rule.ts'
import { type FitInput } from '../types.ts'
import { type Strength } from '../weights.ts'
import { type CandidateSide } from './matchSign.ts'

export type MeasureFact = {
  pattern: MeasurePattern
  /** what the measurements say, mm; never below zero where left and right are compared */
  valueMm: number
  strength: Strength
  against: boolean
  side: CandidateSide
  /** the same quantity in another rule has the same key, so that it is counted once */
  key: string
  code: string
  text: string
}

/**
 * What the measurements say about a rule.
 * @param doneMm - the whole amount already in the sample for this cause, unsigned: what was added is no longer missing
 * @returns the facts, and the codes without which a pattern could say nothing
 */
export function measureEvidence(rule: Rule, input: FitInput, doneMm: (side: CandidateSide) => number): { facts: MeasureFact[]; missing: string[] } {
  const facts: MeasureFact[] = []
  const missing: string[] = []
  for (const pattern of rule.measures) {
    const raw = valueOf(pattern, input, missing)
    if (raw === null) continue
    const side: CandidateSide = !pattern.leftRight ? 'both' : (raw > 0) === (pattern.leftRight === 'larger-side') ? 'left' : 'right'
    const done = doneMm(side) / (pattern.amount ?? 1)
    const whole = pattern.leftRight ? Math.abs(raw) : raw
    const valueMm = done > 0 ? Math.max(0, whole - done) : whole
    const grade = pattern.grades.find(({ from = -Infinity, below = Infinity }) => from <= valueMm && valueMm < below)
    // What an earlier change took care of neither speaks for it nor against it.
    if (!grade || (done > 0 && grade.against)) continue
    facts.push({
      pattern, valueMm, strength: grade.weight, against: grade.against ?? false, side, key: keyOf(pattern), code: codesOf(pattern)[0] ?? 'body',
      text: `${capital(pattern.because.replaceAll('{value}', mmToken(valueMm)))}.`,
    })
  }
  return { facts, missing }
}

function valueOf(pattern: MeasurePattern, input: FitInput, missing: string[]): number | null {
  const suffixes = pattern.leftRight ? ['-left', '-right'] : ['']
  const values = suffixes.map((suffix) => {
    const read = (refs: readonly MeasureRef[]) => refs.map((ref) => readRef(ref, suffix, input, missing))
    const [plus, minus] = [read(pattern.plus), read(pattern.minus)]
    return [...plus, ...minus].includes(null) ? null : sum(plus as number[]) - sum(minus as number[])
  })
  if (values.includes(null)) return null
  const [left, right] = values as [number, number?]
  return (right === undefined ? left : left - right) - (pattern.lessMm ?? 0)
}
const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0)

function readRef(ref: MeasureRef, suffix: string, { body, pattern }: FitInput, missing: string[]): number | null {
  if (ref === 'drafted-cup') return pattern.draftedCupMm ?? (missing.push('drafted-cup'), null)
  const [where, code] = ref.split(':') as ['body' | 'pattern' | 'finished', string]
  const values = { body, pattern: pattern.body, finished: pattern.finished ?? {} }[where]
  const value = suffix ? values[code + suffix] ?? null : bodyValue(values, code)
  if (value === null) missing.push(where === 'body' ? code + suffix : ref)
  return value
}

const codesOf = (pattern: MeasurePattern): string[] => [...pattern.plus, ...pattern.minus].filter((ref) => ref.startsWith('body:')).map((ref) => ref.slice(5))
const keyOf = (pattern: MeasurePattern): string => `${[...pattern.plus].sort().join('+')}-${[...pattern.minus].sort().join('-')}`
const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1)
