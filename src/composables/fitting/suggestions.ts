import { type Change, type Fitting } from '#shared/contracts/fitting.ts'
import { type Finding, type PaperChange, type Side } from '#shared/fit/types.ts'

/** Address of a suggestion: what it says and which side it is for. */
export const suggestionId = ({ cause, side }: { cause: string; side: Side }): string => `${cause}~${side}`

/** One card of "What you could change": a suggestion, what was decided about it, or an own change. */
export type ChangeCard = {
  id: string
  finding: Finding | null
  change: Change | null
  /** observations it would settle or answers, ids */
  explains: readonly string[]
  /** 1 is the first in working order; the number of notches on its edge */
  notches: number
}

const overlap = (a: readonly string[], b: readonly string[]) => a.filter((id) => b.includes(id)).length

/**
 * Suggestions in working order with the decisions taken on them; decisions whose suggestion is no longer made follow, the refused ones last.
 * A decision belongs to the suggestion with its cause; where both sides have one, to the one that shares most observations with it.
 */
export function changeCards({ diagnosis, changes }: Pick<Fitting, 'diagnosis' | 'changes'>): { open: ChangeCard[]; declined: ChangeCard[] } {
  const free = new Set(changes)
  const cards = diagnosis.findings.map((finding): Omit<ChangeCard, 'notches'> => {
    const mine = [...free].filter((change) => change.cause === finding.cause)
      .toSorted((a, b) => overlap(b.observationIds, finding.explains) - overlap(a.observationIds, finding.explains))[0] ?? null
    const sides = diagnosis.findings.filter(({ cause }) => cause === finding.cause).length
    const change = mine && (sides === 1 || overlap(mine.observationIds, finding.explains) > 0) ? mine : null
    if (change) free.delete(change)
    return { id: suggestionId(finding), finding, change, explains: finding.explains }
  })
  const rest = [...free].map((change): Omit<ChangeCard, 'notches'> => ({ id: change.id, finding: null, change, explains: change.observationIds }))
  const numbered = [...cards, ...rest].filter(({ change }) => change?.decision !== 'declined').map((card, i) => ({ ...card, notches: Math.min(4, i + 1) }))
  return { open: numbered, declined: [...cards, ...rest].filter(({ change }) => change?.decision === 'declined').map((card) => ({ ...card, notches: 0 })) }
}

/** The card an address means: a suggestion's `cause~side`, or a change's id. */
export const findCard = (cards: readonly ChangeCard[], address: string): ChangeCard | null => cards.find(({ id, change }) => id === address || change?.id === address) ?? null

/** Number of notches on the edge of each observation: those of the first card that answers it. */
export function notchesOf(cards: readonly ChangeCard[]): Map<string, number> {
  const map = new Map<string, number>()
  for (const card of cards) for (const id of card.explains) if (!map.has(id)) map.set(id, card.notches)
  return map
}

/** Where an amount came from, beside it. */
export const amountFromWords: Record<PaperChange['amountFrom'], string> = { 'measured on sample': 'measured on the sample', measurements: 'from the measurements', 'usual for this sign': 'usual for this sign' }

/** Beyond what the rule allows: the sentence that says so, or empty. */
export function limitWarning(finding: Pick<Finding, 'change'>, amountMm: number, format: (mm: number) => string): string {
  const { leastMm, mostMm, beyond } = finding.change.limits
  const size = Math.abs(amountMm)
  if (mostMm > 0 && size > mostMm) return `${format(size)} is more than this change should take (at most ${format(mostMm)}). ${beyond}`
  if (size > 0 && size < leastMm) return `${format(size)} is less than is worth doing (${format(leastMm)}). Leave it and look again on the next sample.`
  if (amountMm !== 0 && finding.change.amountMm !== 0 && Math.sign(amountMm) !== Math.sign(finding.change.amountMm)) return 'This goes the other way than suggested. Check the sign.'
  return ''
}
