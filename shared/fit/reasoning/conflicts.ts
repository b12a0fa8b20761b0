import { sentenceOf, zoneWords } from '../vocabulary.ts'
import { type Diagnosis, type Finding, type Observation, type Sign } from '../types.ts'
import { type RuleIndex } from './ruleIndex.ts'
import { overlaps } from './confidence.ts'
import { sideOfEntry } from './ledgerState.ts'

type Conflict = Diagnosis['conflicts'][number]

/** Pairs of signs that cannot both be true of one place. */
const opposites: readonly (readonly [Sign, Sign])[] = [['tight', 'excess'], ['short', 'long'], ['rises', 'drops']]

/** Signs that contradict each other at the same zone, side and view. They are left out of the reasoning until one is taken back. */
export function contradictoryObservations(observations: readonly Observation[]): Conflict[] {
  const conflicts: Conflict[] = []
  for (const [i, a] of observations.entries()) for (const b of observations.slice(i + 1)) {
    if (!contradict(a, b)) continue
    conflicts.push({
      observationIds: [a.id, b.id],
      text: `“${sentenceOf(a)}” and “${sentenceOf(b)}” contradict each other at the ${zoneWords[a.zone]}, same side and same view. Look again, and keep the one that is there when the body stands still.`,
    })
  }
  return conflicts
}

function contradict(a: Observation, b: Observation): boolean {
  if (a.zone !== b.zone || a.side !== b.side || a.view !== b.view) return false
  if (a.line && b.line && a.line !== b.line) return false
  if (!opposites.some(([one, other]) => (a.sign === one && b.sign === other) || (a.sign === other && b.sign === one))) return false
  // Folds that lie across are spare length, and slanting ones are pulled: neither denies that width lacks there.
  const folds = [a, b].find(({ sign }) => sign === 'excess')
  return !folds?.direction || folds.direction === 'vertical'
}

/** Findings whose changes undo each other on the same side. */
export function contradictoryChanges(findings: readonly Finding[], index: RuleIndex): { conflicts: Conflict[]; involved: ReadonlySet<Finding> } {
  const conflicts: Conflict[] = []
  const involved = new Set<Finding>()
  for (const [i, a] of findings.entries()) for (const b of findings.slice(i + 1)) {
    if (a.advice !== 'change' || b.advice !== 'change' || !undoEachOther(a, b, index)) continue
    involved.add(a).add(b)
    conflicts.push({
      observationIds: [...a.explains, ...b.explains],
      text: `“${a.change.title}” and “${b.change.title}” undo each other. Nothing is suggested for either until it is clear which of them the cloth asks for.`,
    })
  }
  return { conflicts, involved }
}

function undoEachOther(a: Finding, b: Finding, { byCause }: RuleIndex): boolean {
  if (!overlaps(sideOfEntry(a.side), sideOfEntry(b.side))) return false
  const [ruleA, ruleB] = [byCause.get(a.cause)!, byCause.get(b.cause)!]
  return ruleA.opposite === b.cause || ruleB.opposite === a.cause || (ruleA.conflictsWith?.some((cause) => cause === b.cause) ?? false) || (ruleB.conflictsWith?.some((cause) => cause === a.cause) ?? false)
}
