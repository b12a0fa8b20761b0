/** Laws that hold for any fitting, whatever the rules say, over the whole catalogue. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { rules } from '#shared/fit/catalogue.ts'
import { diagnose } from '#shared/fit/diagnose.ts'
import { isWidth } from '#shared/fit/reasoning/wholeAmount.ts'
import { listOf } from '#shared/fit/reasoning/ruleIndex.ts'
import { ruleOf } from '#shared/fit/catalogue.ts'
import {
  amountKinds, directions, type Finding, type FitInput, garmentFeatures, garmentKinds, lines, type Observation, sides, signs, targets, views, waistKinds, zones,
} from '#shared/fit/types.ts'
import { sum } from '../../support/fit.ts'

const optional = <T>(values: readonly T[]) => fc.option(fc.constantFrom(...values), { nil: undefined })
const anything = fc.record({
  sign: fc.constantFrom(...signs), zone: fc.constantFrom(...zones), view: fc.constantFrom(...views), side: fc.constantFrom(...sides), direction: optional(directions), towards: optional(targets), line: optional(lines),
  severity: fc.constantFrom(1 as const, 2 as const, 3 as const), amount: fc.option(fc.record({ mm: fc.integer({ min: 1, max: 80 }), as: fc.constantFrom(...amountKinds) }), { nil: undefined }),
})
/** Half of what is seen is a sign some rule asks for: blind choice would hardly ever hit one. */
const known = fc.constantFrom(...rules.flatMap((rule) => rule.signs)).chain((pattern) => anything.map((one) => ({
  ...one, sign: listOf(pattern.sign)[0]!, zone: listOf(pattern.zone)[0]!, direction: listOf(pattern.direction)[0] ?? one.direction, towards: listOf(pattern.towards)[0] ?? one.towards, line: listOf(pattern.line)[0] ?? one.line,
})))
const observations = fc.array(fc.oneof(known, anything), { minLength: 1, maxLength: 6 }).map((list): Observation[] => list.map((one, i) => ({ id: `o${i}`, ...one })))
const mm = fc.integer({ min: 150, max: 1200 })
const body = fc.dictionary(fc.constantFrom('bust', 'high-bust', 'waist', 'hip', 'upper-arm', 'crotch-depth', 'back-waist-length'), mm, { maxKeys: 4 })
const inputs: fc.Arbitrary<FitInput> = fc.record({
  garment: fc.record({ kind: fc.constantFrom(...garmentKinds), waist: optional(waistKinds), features: fc.uniqueArray(fc.constantFrom(...garmentFeatures), { maxLength: 3 }) }),
  body, pattern: fc.record({ body, draftedCupMm: fc.option(fc.integer({ min: 20, max: 80 }), { nil: undefined }) }), observations,
  answers: fc.constant({}), ledger: fc.constant([]), unit: fc.constantFrom('cm' as const, 'inch' as const),
})

const swap = { left: 'right', right: 'left', both: 'both', centre: 'centre', front: 'front', back: 'back', detail: 'detail' } as const
const mirrored = (input: FitInput): FitInput => ({ ...input, observations: input.observations.map((one) => ({ ...one, side: swap[one.side], view: swap[one.view] })) })
const inShort = ({ cause, side, confidence, explains, change, advice }: Finding) => ({ cause, side, confidence, explains: explains.toSorted(), amount: change.amountMm, advice, operation: change.operation })
const sorted = (findings: readonly ReturnType<typeof inShort>[]) => findings.toSorted((a, b) => (JSON.stringify(a) < JSON.stringify(b) ? -1 : 1))

// The same cases on every run, so that a failure is about the change at hand.
fc.configureGlobal({ seed: 51015 })

describe('whatever is seen', () => {
  it('every observation is explained once, or left open, or in a conflict', () => fc.assert(fc.property(inputs, (input) => {
    const { findings, unexplained, conflicts } = diagnose(input)
    const told = [...findings.flatMap(({ explains }) => explains), ...unexplained.map(({ observationId }) => observationId)]
    expect(new Set(told).size).toBe(told.length)
    expect(new Set([...told, ...conflicts.flatMap(({ observationIds }) => observationIds)])).toEqual(new Set(input.observations.map(({ id }) => id)))
  })))
  it('confidence lies between 0 and 1, amounts are finite, texts hold no placeholder', () => fc.assert(fc.property(inputs, (input) => {
    const diagnosis = diagnose(input)
    for (const { confidence, rivals, change } of diagnosis.findings) {
      for (const value of [confidence, ...rivals.map((rival) => rival.confidence)]) expect(value >= 0 && value <= 1).toBe(true)
      for (const value of [change.amountMm, ...change.steps.map(({ amountMm }) => amountMm)]) expect(Number.isFinite(value)).toBe(true)
    }
    expect(JSON.stringify(diagnosis)).not.toMatch(/\{(amount|whole|half|side|value|lack)\}|undefined|NaN/)
  })))
  it('the order things were noted in does not matter', () => fc.assert(fc.property(inputs, fc.infiniteStream(fc.nat()), (input, stream) => {
    const keys = input.observations.map(() => stream.next().value as number)
    const shuffled = input.observations.map((one, i) => [keys[i]!, one] as const).toSorted(([a], [b]) => a - b).map(([, one]) => one)
    const [a, b] = [diagnose(input), diagnose({ ...input, observations: shuffled })]
    expect(b.findings).toEqual(a.findings)
    expect(b.conflicts).toEqual(a.conflicts)
    expect(new Set(b.unexplained.map(({ observationId }) => observationId))).toEqual(new Set(a.unexplained.map(({ observationId }) => observationId)))
  })))
  it('left and right exchanged gives the same changes, exchanged', () => fc.assert(fc.property(inputs, (input) => {
    const turned = diagnose(mirrored(input)).findings.map((finding) => inShort({ ...finding, side: swap[finding.side] }))
    expect(sorted(turned)).toEqual(sorted(diagnose(input).findings.map(inShort)))
  })))
  it('the same input gives the same answer, and is not changed', () => fc.assert(fc.property(inputs, (input) => {
    const before = structuredClone(input)
    expect(diagnose(input)).toEqual(diagnose(structuredClone(input)))
    expect(input).toEqual(before)
  })))
  it('width over all edges adds up exactly to the whole', () => fc.assert(fc.property(inputs, (input) => {
    for (const { cause, change, advice } of diagnose(input).findings) {
      const rule = ruleOf(cause)!
      const widthEdges = new Set(rule.change.steps.filter(({ share }) => share === 'width').map(({ piece, edge }) => `${piece} ${edge}`))
      const width = change.steps.filter(({ pieceRole, edge }) => widthEdges.has(`${pieceRole} ${edge}`))
      if (advice === 'leave-it' || !isWidth(rule) || !width.length) continue
      expect(sum(width.map(({ amountMm, edges }) => amountMm * edges)), cause).toBeCloseTo(change.amountMm, 3)
    }
  })))
})

describe('one observation more', () => {
  const lone = fc.constantFrom(...rules.flatMap((rule) => rule.signs.filter(({ against }) => !against).map((pattern) => ({ rule, pattern }))))
  const seenAs = ({ rule, pattern }: { rule: (typeof rules)[number]; pattern: (typeof rules)[number]['signs'][number] }, id: string): Observation => ({
    id, sign: listOf(pattern.sign)[0]!, zone: listOf(pattern.zone)[0]!, view: listOf(pattern.view)[0] === 'side' ? 'left' : listOf(pattern.view)[0] === 'back' ? 'back' : 'front',
    side: pattern.side === 'centre' ? 'centre' : pattern.side === 'one' || rule.sided === 'one' ? 'left' : 'both', severity: 2,
    direction: listOf(pattern.direction)[0], towards: listOf(pattern.towards)[0], line: listOf(pattern.line)[0],
  })
  const garmentOf = (rule: (typeof rules)[number]) => ({ kind: rule.when.kinds[0]!, waist: rule.when.waist?.[0], sleeves: rule.when.sleeves?.[0], features: rule.when.needs?.slice(0, 1) })
  const diagnosed = (rule: (typeof rules)[number], list: Observation[]) => diagnose({ garment: garmentOf(rule), body: {}, pattern: { body: {} }, observations: list, answers: {}, ledger: [] })

  it('of the same sign never lowers the cause that leads', () => fc.assert(fc.property(lone, (one) => {
    const before = diagnosed(one.rule, [seenAs(one, 'a')]).findings[0]
    if (!before) return
    const after = diagnosed(one.rule, [seenAs(one, 'a'), seenAs(one, 'b')]).findings.find(({ cause, side }) => cause === before.cause && side === before.side)
    expect(after?.confidence, before.cause).toBeGreaterThanOrEqual(before.confidence)
  })))
  it('that has nothing to do with a cause changes nothing about it', () => fc.assert(fc.property(lone, lone, (one, other) => {
    const list = [seenAs(one, 'a')]
    const before = diagnosed(one.rule, list)
    const more = seenAs(other, 'z')
    const leading = new Set(before.findings.map(({ cause }) => cause))
    // What speaks for a named rival has to do with the cause, seen or not.
    const named = rules.filter(({ cause, rivals }) => rivals.some((rival) => leading.has(rival.cause)) || (leading.has(cause) && rivals.length)).flatMap(({ cause, rivals }) => [cause, ...(leading.has(cause) ? rivals.map((rival) => rival.cause) : [])])
    const touches = new Set<string>([...before.findings.flatMap(({ cause, rivals }) => [cause, ...rivals.map((rival) => rival.cause)]), ...named, ...rules.filter((rule) => rule.signs.some((pattern) => listOf(pattern.sign).includes(list[0]!.sign) && listOf(pattern.zone).includes(list[0]!.zone))).map(({ cause }) => cause)])
    const related = rules.some((rule) => touches.has(rule.cause) && rule.signs.some((pattern) => listOf(pattern.sign).includes(more.sign) && listOf(pattern.zone).includes(more.zone)))
    if (related || more.zone === list[0]!.zone) return
    const after = diagnosed(one.rule, [...list, more])
    if (after.conflicts.length) return
    for (const finding of before.findings) expect(after.findings.map(inShort)).toContainEqual(inShort(finding))
  })))
})
