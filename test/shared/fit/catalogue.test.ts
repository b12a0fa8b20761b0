import { describe, expect, it } from 'vitest'
import { ruleOf, rules, rulesByZone } from '#shared/fit/catalogue.ts'
import { causes, causesByZone } from '#shared/fit/causes.ts'
import { checkIdOf, listOf } from '#shared/fit/reasoning/ruleIndex.ts'
import { fitsGarment } from '#shared/fit/reasoning/fitsGarment.ts'
import { type Rule } from '#shared/fit/rule.ts'
import { findMeasurement } from '#shared/measurements/findMeasurement.ts'
import { garmentFeatures } from '#shared/fit/types.ts'
import { strengths } from '#shared/fit/weights.ts'

const each = (check: (rule: Rule) => void) => () => { for (const rule of rules) check(rule) }
/** What is said to the person: everything but names and sources. */
const textsOf = (rule: Rule): string[] => [
  rule.title, rule.sentence, rule.recognise, rule.predicts, rule.limits.beyond, ...rule.recheck, ...rule.signs.flatMap(({ because, after }) => [because, after ?? '']),
  ...rule.measures.map(({ because }) => because), ...rule.rivals.flatMap(({ check }) => [check.ask, check.yes, check.no]), ...rule.change.steps.map(({ text }) => text), ...rule.change.companions.map(({ text }) => text),
]

describe('the catalogue', () => {
  it('has at least 80 rules, and one for every cause that is listed', () => {
    expect(causes.filter((cause) => !ruleOf(cause))).toEqual([])
    expect(rules.length).toBeGreaterThanOrEqual(80)
    expect(new Set(rules.map(({ cause }) => cause)).size).toBe(rules.length)
  })
  it('keeps every rule in the file of its zone', () => {
    for (const [zone, own] of Object.entries(rulesByZone)) for (const { cause } of own) expect(causesByZone[zone as keyof typeof causesByZone], cause).toContain(cause)
  })
  it('covers skirts, trousers, bodices, shirts, dresses and jackets, and bodies that differ left and right', () => {
    for (const kind of ['skirt', 'trousers', 'bodice', 'shirt', 'dress', 'jacket'] as const) expect(rules.filter(({ when }) => when.kinds.includes(kind)).length, kind).toBeGreaterThan(10)
    expect(rules.filter(({ sided }) => sided === 'one').length).toBeGreaterThan(1)
  })
  it('is frozen through and through', () => {
    expect(Object.isFrozen(rules)).toBe(true)
    for (const rule of rules) expect(Object.isFrozen(rule.signs) && Object.isFrozen(rule.drawing.sign)).toBe(true)
  })
})

describe('every rule', () => {
  it('names rivals, each an existing cause with a check, or says why there are none', each(({ cause, rivals, noRivals }) => {
    expect(rivals.length > 0 || (noRivals ?? '').length > 10, cause).toBe(true)
    for (const rival of rivals) {
      expect(ruleOf(rival.cause), `${cause} names ${rival.cause}`).not.toBeNull()
      expect(rival.cause, cause).not.toBe(cause)
    }
  }))
  it('asks its checks as questions, under an id an address can carry', each((rule) => {
    for (const rival of rule.rivals) {
      expect(rival.check.ask, rule.cause).toMatch(/\?$/)
      for (const means of [rival.check.yes, rival.check.no]) expect(means, rule.cause).toMatch(/^[A-Z].{8,}\.$/)
      expect(checkIdOf(rule.cause, rival)).toMatch(/^[a-z0-9~-]{3,120}$/)
    }
  }))
  it('speaks for a cause by at least one sign, on the named scale', each(({ cause, signs, measures }) => {
    expect(signs.some(({ against }) => !against), cause).toBe(true)
    for (const { weight, because } of signs) {
      expect(strengths).toContain(weight)
      expect(because, cause).toMatch(/^[^A-Z].{6,}[^.]$/)
    }
    for (const { grades } of measures) for (const { weight } of grades) expect(strengths).toContain(weight)
  }))
  it('reads only measurements the journal knows', each(({ cause, measures, keeps }) => {
    const refs = [...measures.flatMap(({ plus, minus }) => [...plus, ...minus]), ...(keeps ? [`body:${keeps.body}`, `finished:${keeps.finished}`] : [])]
    for (const ref of refs) if (ref !== 'drafted-cup') expect(findMeasurement(ref.split(':')[1]!), `${cause}: ${ref}`).not.toBeNull()
    for (const { leftRight, plus, minus } of measures) if (leftRight) for (const ref of [...plus, ...minus]) expect(findMeasurement(`${ref.split(':')[1]}-left`), `${cause}: ${ref} has no sides`).not.toBeNull()
  }))
  it('says what follows on other pieces, or why nothing does', each(({ cause, change }) => {
    expect(change.companions.length > 0 || (change.noCompanions ?? '').length > 10, cause).toBe(true)
  }))
  it('has limits with what to do beyond them, and usual amounts that grow with the sign', each(({ cause, limits, amounts }) => {
    expect(limits.leastMm, cause).toBeGreaterThanOrEqual(0)
    expect(limits.mostMm, cause).toBeGreaterThan(limits.leastMm)
    expect(limits.beyond, cause).toMatch(/^[A-Z].+\.$/)
    expect(amounts.usualMm[0] <= amounts.usualMm[1] && amounts.usualMm[1] <= amounts.usualMm[2], cause).toBe(true)
    expect(amounts.usualMm[2], cause).toBeLessThanOrEqual(limits.mostMm)
  }))
  it('has an instruction for each kind of garment it is for', each(({ cause, when, change }) => {
    for (const kind of when.kinds) {
      const wanted = change.operation === 'none' || change.steps.some((step) => [[], ...garmentFeatures.map((feature) => [feature])].some((features) => fitsGarment(step.when, { kind, features })))
      expect(wanted, `${cause} on a ${kind}`).toBe(true)
    }
  }))
  it('shares an amount between groups so that nothing is lost', each(({ cause, change }) => {
    const groups = new Set(change.steps.map(({ group }) => group).filter(Boolean))
    if (change.parts) expect(Object.values(change.parts).reduce((a, b) => a + b, 0), cause).toBeCloseTo(1, 9)
    for (const group of Object.keys(change.parts ?? {})) expect(groups, cause).toContain(group)
    for (const step of change.steps) {
      expect(step.edges, cause).toBeGreaterThanOrEqual(1)
      if (step.share !== 'length') expect(step.times, `${cause}: only a length is multiplied`).toBeUndefined()
    }
  }))
  it('leaves no placeholder the engine does not fill', each((rule) => {
    for (const { text } of rule.change.steps) expect(text.replaceAll(/\{(amount|whole|half|side)\}/g, ''), rule.cause).not.toMatch(/[{}]/)
    for (const { text } of rule.change.companions) expect(text.replaceAll(/\{(amount|whole)\}/g, ''), rule.cause).not.toMatch(/[{}]/)
    for (const { because } of rule.measures) expect(because.replaceAll('{value}', ''), rule.cause).not.toMatch(/[{}]/)
  }))
  it('writes no length into its texts that would not change with the reader’s unit', each((rule) => {
    for (const text of textsOf(rule)) expect(text.replaceAll(/\{\+?mm:-?[\d.]+\}/g, ''), rule.cause).not.toMatch(/\d\s?(mm|cm|in|inch|inches)\b/)
  }))
  it('never blames the body', each((rule) => {
    for (const text of textsOf(rule)) expect(text.toLowerCase(), rule.cause).not.toMatch(/\b(problem|flaw|ideal|abnormal|deform|fat|overweight|bad figure|your body)/)
    expect(rule.sentence, rule.cause).toMatch(/^[A-Z].+\.$/)
    expect(rule.title, rule.cause).toMatch(/^[A-Z].+[^.]$/)
  }))
  it('says where it comes from', each(({ cause, source }) => expect(source.length, cause).toBeGreaterThan(6)))
  it('has a drawing of the sign and one of the change, inside their frames', each(({ cause, drawing }) => {
    expect(drawing.sign.strokes.length, cause).toBeGreaterThan(0)
    expect(drawing.change.marks.length, cause).toBeGreaterThan(0)
    const [left, top, right, bottom] = drawing.sign.region
    expect(left < right && top < bottom, cause).toBe(true)
    for (const { from, to } of [...drawing.sign.strokes, ...drawing.change.marks]) for (const part of [...from, ...to]) expect(part >= 0 && part <= 1, `${cause}: ${part}`).toBe(true)
  }))
  it('has an opposite that names it back, and moves only causes that exist', each(({ cause, opposite, moves, conflictsWith }) => {
    if (opposite) expect(ruleOf(opposite)?.opposite, `${cause} → ${opposite}`).toBe(cause)
    for (const { cause: moved } of moves ?? []) expect(ruleOf(moved), `${cause} moves ${moved}`).not.toBeNull()
    for (const other of conflictsWith ?? []) expect(ruleOf(other), `${cause} conflicts with ${other}`).not.toBeNull()
  }))
  it('points off-place signs the way they have to go: a seam above its place goes down', each(({ cause, signs }) => {
    const other = { up: /\b(above|too high|higher)\b/, down: /\b(below|too low|lower)\b/, front: /\b(in front|forward of)\b/, back: /\b(behind|too far back)\b/ } as const
    for (const { sign, towards, because } of signs) for (const target of listOf(towards)) {
      if (listOf(sign).includes('off-place') && target in other) expect(because, `${cause}: towards ${target} means it has to go ${target}`).not.toMatch(other[target as keyof typeof other])
    }
  }))
  it('gives one meaning to a check that two rules share', () => {
    const meaning = new Map<string, string>()
    for (const { cause, rivals } of rules) for (const rival of rivals) {
      const id = checkIdOf(cause, rival)
      const yes = rival.check.yesMeans === 'rival' ? rival.cause : cause
      expect(meaning.get(id) ?? yes, id).toBe(yes)
      meaning.set(id, yes)
    }
  })
})
