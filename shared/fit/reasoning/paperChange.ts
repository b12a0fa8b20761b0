import { leastChangeMm, roundToStep } from '../amount.ts'
import { mmToken, signedToken } from '../amountText.ts'
import { bodyValue } from '../../measurements/findMeasurement.ts'
import { type CompanionRule, type Rule } from '../rule.ts'
import { type FitInput, type PaperChange } from '../types.ts'
import { clothNotes } from './clothNotes.ts'
import { fitsGarment } from './fitsGarment.ts'
import { type CandidateSide } from './matchSign.ts'
import { paperSteps } from './paperSteps.ts'
import { pullOnLackMm } from './pullOn.ts'
import { isWidth } from './wholeAmount.ts'

export type ChangeFacts = {
  rule: Rule
  side: CandidateSide
  /** signed as the rule's change is */
  amountMm: number
  amountFrom: PaperChange['amountFrom']
  otherAmount?: PaperChange['otherAmount']
  notes?: readonly string[]
  /** undoes an earlier change, wholly or in part */
  takesBack?: boolean
}

/** Smallest amount of a rule worth a change; never under the amount below which nothing is. */
export const leastOf = (rule: Rule): number => Math.max(leastChangeMm, rule.limits.leastMm)

/** The change on paper: steps, what follows, limits and what to look at next. */
export function paperChange(facts: ChangeFacts, input: FitInput, stepMm: number): PaperChange {
  const { rule, side, amountMm, takesBack = false } = facts
  const oneSided = side !== 'both'
  return {
    title: takesBack ? `Take back ${mmToken(amountMm)}: ${lowerFirst(rule.title)}` : rule.title,
    operation: rule.change.operation,
    amountMm,
    amountFrom: facts.amountFrom,
    ...(facts.otherAmount && { otherAmount: facts.otherAmount }),
    steps: paperSteps(rule, { garment: input.garment, side, wholeMm: amountMm, stepMm, takesBack }),
    companions: takesBack ? [] : rule.change.companions.flatMap((companion) => companionOf(companion, amountMm, input, stepMm)),
    limits: { leastMm: leastOf(rule), mostMm: rule.limits.mostMm, beyond: rule.limits.beyond, text: limitsText(rule, amountMm, takesBack) },
    recheck: rule.recheck,
    unfold: oneSided,
    notes: [
      ...(oneSided ? [`Only the ${side} side changes: unfold pieces cut on the fold, and trace left and right apart.`] : []),
      ...(facts.notes ?? []),
      ...(takesBack ? ['What followed the earlier change on other pieces goes back by the same.'] : keepNotes(rule, input)),
      ...clothNotes(input.cloth, isWidth(rule)),
    ],
    source: rule.source,
  }
}
const lowerFirst = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1)

/** A noted amount that is left alone: nothing on paper changes. */
export function noChange(change: PaperChange): PaperChange {
  return { ...change, operation: 'none', steps: [], companions: [], unfold: false, notes: [`${mmToken(change.amountMm)} is under the ${mmToken(change.limits.leastMm)} worth a change: leave it, and look again on the next sample.`] }
}

function companionOf(companion: CompanionRule, amountMm: number, input: FitInput, stepMm: number): PaperChange['companions'] {
  if (!fitsGarment(companion.when, input.garment)) return []
  const lack = companion.only === 'pull-on' ? pullOnLackMm(input) : null
  if (companion.only === 'pull-on' && (input.garment.waist !== 'elastic' || lack === 0)) return []
  const ownMm = companion.times === undefined ? undefined : roundToStep(amountMm * companion.times, stepMm)
  const mm = lack === null ? ownMm : roundToStep(lack, stepMm)
  const text = companion.text.replaceAll('{amount}', mmToken(mm ?? amountMm)).replaceAll('{whole}', mmToken(amountMm))
  return [{ pieceRole: companion.piece, text, ...(mm !== undefined && { amountMm: mm }) }]
}

function limitsText({ limits }: Rule, amountMm: number, takesBack: boolean): string {
  const range = `Under ${mmToken(limits.leastMm)} leave it. Over ${mmToken(limits.mostMm)}: ${lowerFirst(limits.beyond)}`
  if (takesBack) return `${signedToken(amountMm)} goes back. ${range}`
  return Math.abs(amountMm) > limits.mostMm ? `${signedToken(amountMm)} is over the ${mmToken(limits.mostMm)} this change carries well. ${limits.beyond}` : `${signedToken(amountMm)} lies within the limits of this change. ${range}`
}

/** Whether a place that should keep its measure has the ease for it. */
function keepNotes({ keeps }: Rule, { body, pattern }: FitInput): string[] {
  if (!keeps) return []
  const [worn, made] = [bodyValue(body, keeps.body), pattern.finished ? bodyValue(pattern.finished, keeps.finished) : null]
  if (worn === null || made === null) return [keeps.unknown]
  return [worn + keeps.easeMm <= made ? keeps.kept : keeps.short.replaceAll('{lack}', mmToken(worn + keeps.easeMm - made))]
}
