import { type Cause, type ZoneFile } from './causes.ts'
import { type Rule } from './rule.ts'
import { abdomenRules } from './rules/abdomen.ts'
import { armholeRules } from './rules/armhole.ts'
import { bustRules } from './rules/bust.ts'
import { crotchRules } from './rules/crotch.ts'
import { elasticRules } from './rules/elastic.ts'
import { hemRules } from './rules/hem.ts'
import { hipRules } from './rules/hip.ts'
import { legRules } from './rules/leg.ts'
import { neckRules } from './rules/neck.ts'
import { seatRules } from './rules/seat.ts'
import { shoulderRules } from './rules/shoulder.ts'
import { sleeveRules } from './rules/sleeve.ts'
import { upperBackRules } from './rules/upperBack.ts'
import { waistRules } from './rules/waist.ts'

/** The rules by zone, in the order the catalogue shows them: from the neck down. */
export const rulesByZone: Readonly<Record<ZoneFile, readonly Rule[]>> = Object.freeze({
  neck: neckRules, shoulder: shoulderRules, upperBack: upperBackRules, bust: bustRules, armhole: armholeRules, sleeve: sleeveRules, waist: waistRules,
  abdomen: abdomenRules, hip: hipRules, seat: seatRules, crotch: crotchRules, leg: legRules, hem: hemRules, elastic: elasticRules,
})

function freezeDeep<T>(value: T): T {
  if (typeof value === 'object' && value !== null && !Object.isFrozen(value)) Object.values(Object.freeze(value)).forEach(freezeDeep)
  return value
}

/** Every rule, frozen through and through. */
export const rules: readonly Rule[] = Object.freeze(Object.values(rulesByZone).flat().map(freezeDeep))

const byCause = new Map<string, Rule>(rules.map((rule) => [rule.cause, rule]))
/** The rule of a cause; null where the catalogue has none. */
export const ruleOf = (cause: Cause | (string & {})): Rule | null => byCause.get(cause) ?? null
