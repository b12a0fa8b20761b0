import { rules } from '../catalogue.ts'
import { type OneOrMore, type Rule, type SignPattern } from '../rule.ts'
import { type Sign, type Zone } from '../types.ts'

export const listOf = <T>(value: OneOrMore<T> | undefined): readonly T[] => (value === undefined ? [] : Array.isArray(value) ? value as readonly T[] : [value as T])

export type IndexedPattern = { rule: Rule; pattern: SignPattern }
export type IndexedCheck = { rule: Rule; rival: string; yesSpeaksFor: string; noSpeaksFor: string }

export type RuleIndex = {
  rules: readonly Rule[]
  /** place in the catalogue: the last word wherever two causes are equal */
  placeOf: ReadonlyMap<string, number>
  /** `sign@zone` → patterns that ask for it */
  bySign: ReadonlyMap<string, readonly IndexedPattern[]>
  byCheck: ReadonlyMap<string, readonly IndexedCheck[]>
  byCause: ReadonlyMap<string, Rule>
}

export const signKey = (sign: Sign, zone: Zone): string => `${sign}@${zone}`
/** Answers are kept under this. */
export const checkIdOf = (cause: string, rival: Rule['rivals'][number]): string => rival.check.id ?? `${cause}~${rival.cause}`

/** Built once: looking up an observation then costs only the patterns that can fit it. */
export function indexRules(all: readonly Rule[]): RuleIndex {
  const bySign = new Map<string, IndexedPattern[]>()
  const byCheck = new Map<string, IndexedCheck[]>()
  for (const rule of all) {
    for (const pattern of rule.signs) for (const sign of listOf(pattern.sign)) for (const zone of listOf(pattern.zone)) {
      const key = signKey(sign, zone)
      bySign.set(key, [...bySign.get(key) ?? [], { rule, pattern }])
    }
    for (const rival of rule.rivals) {
      const id = checkIdOf(rule.cause, rival)
      const [yesSpeaksFor, noSpeaksFor] = rival.check.yesMeans === 'rival' ? [rival.cause, rule.cause] : [rule.cause, rival.cause]
      byCheck.set(id, [...byCheck.get(id) ?? [], { rule, rival: rival.cause, yesSpeaksFor, noSpeaksFor }])
    }
  }
  return { rules: all, bySign, byCheck, byCause: new Map(all.map((rule) => [rule.cause, rule])), placeOf: new Map(all.map((rule, i) => [rule.cause, i])) }
}

export const catalogueIndex: RuleIndex = indexRules(rules)
