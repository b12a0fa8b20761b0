import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { type Candidate } from '#shared/fit/reasoning/candidates.ts'
import { coverObservations } from '#shared/fit/reasoning/cover.ts'
import { causes } from '#shared/fit/causes.ts'
import { points } from '#shared/fit/weights.ts'
import { rule, sum } from '../../support/fit.ts'

const columns = ['seen a', 'seen b', 'seen c', 'seen d']
const candidateOf = (place: number, strengths: readonly number[], bonus: number): Candidate => ({
  rule: rule(causes[place]!), side: 'both', place, bonus, columns: new Map(columns.map((column, i) => [column, strengths[i]!] as const).filter(([, value]) => value > 0)),
  matches: new Map(columns.map((column, i) => [column.slice(5), strengths[i]!] as const).filter(([, value]) => value > 0).map(([id]) => [id, { pattern: rule('hip-tight').signs[0]!, strength: 'fair' as const }])),
  facts: [], aside: [], alone: false,
})
const strength = fc.constantFrom(0, 0, 0, points.slight, points.fair, points.strong, points.decisive)
const candidates = fc.array(fc.tuple(strength, strength, strength, strength, fc.constantFrom(0, 0, 0, -4, -8, 14)), { minLength: 1, maxLength: 6 })
  .map((list) => list.map(([a, b, c, d, bonus], place) => candidateOf(place, [a, b, c, d], bonus)).filter((candidate) => candidate.columns.size))

/** What the documentation of the search promises: strengths, 3 for each observation explained at least fairly, less 6 for each cause unless an answer speaks for it. */
const worth = (set: readonly Candidate[]): number => sum(columns.map((column) => {
  const best = Math.max(0, ...set.map((candidate) => candidate.columns.get(column) ?? 0))
  return best < points.fair ? best : best + 3
})) + sum(set.map(({ bonus }) => Math.min(bonus, 6) - 6))
const explainsNothing = (set: readonly Candidate[]): boolean => set.some((candidate) => columns.every((column) => {
  const own = candidate.columns.get(column) ?? 0
  return own === 0 || set.some((other) => other !== candidate && (other.columns.get(column) ?? 0) >= own)
}))

describe('the search for the fewest causes', () => {
  it('finds the best of all sets where there are few enough to try them all', () => fc.assert(fc.property(candidates, (list) => {
    const sets = Array.from({ length: 2 ** list.length }, (_, bits) => list.filter((_one, i) => bits & (1 << i))).filter((set) => !explainsNothing(set))
    expect(worth(coverObservations(list).chosen)).toBeGreaterThanOrEqual(Math.max(...sets.map(worth)))
  }), { numRuns: 600 }))
  it('gives each observation to one cause, and each cause at least one', () => fc.assert(fc.property(candidates, (list) => {
    const { chosen, explainedBy } = coverObservations(list)
    for (const [column, by] of explainedBy) expect(by.columns.get(column)).toBe(Math.max(...chosen.map((candidate) => candidate.columns.get(column) ?? 0)))
    for (const candidate of chosen) expect([...explainedBy.values()]).toContain(candidate)
  })))
  it('does not depend on the order of the candidates', () => fc.assert(fc.property(candidates, (list) => {
    expect(new Set(coverObservations(list.toReversed()).chosen)).toEqual(new Set(coverObservations(list).chosen))
  })))
  it('finds nothing in nothing', () => expect(coverObservations([]).chosen).toEqual([]))
})
