import { measurementName } from '../../measurements/findMeasurement.ts'
import { askFor, sentenceOf } from '../vocabulary.ts'
import { type Diagnosis, type Finding, type FitInput, type Observation } from '../types.ts'
import { type Candidate, observationColumn } from './candidates.ts'
import { ownPoints } from './cover.ts'
import { type RuleIndex } from './ruleIndex.ts'

/** What to look at for an observation that no cause explains well enough. */
export function lookNext(observation: Observation, candidates: readonly Candidate[], index: RuleIndex): Diagnosis['unexplained'][number] {
  const best = candidates.filter((candidate) => candidate.columns.has(observationColumn(observation.id))).sort((a, b) => ownPoints(b) - ownPoints(a) || a.place - b.place)[0]
  const rival = best?.rule.rivals[0]
  if (rival && index.byCause.has(rival.cause)) return { observationId: observation.id, lookNext: `It could be this: ${lower(best.rule.sentence)} ${rival.check.ask}` }
  if (best) return { observationId: observation.id, lookNext: `It could be this: ${lower(best.rule.sentence)} ${askFor(observation.sign).ask}` }
  return { observationId: observation.id, lookNext: `“${sentenceOf(observation)}” alone says too little. ${nextLook(observation)} ${askFor(observation.sign).ask}` }
}
const lower = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1)

/** The view that would show more. */
function nextLook({ view, towards, direction, sign }: Observation): string {
  if (view === 'detail') return 'Photograph the whole side as well, to see where it begins.'
  if ((sign === 'drag-lines' || sign === 'excess') && !towards && !direction) return 'Say which way the folds run and where they point.'
  return view === 'front' || view === 'back' ? 'Look from the side too: is the hem level, do the seams hang plumb?' : 'Look from the front and the back too.'
}

/** What would make the answers surer: amounts not measured, measurements not taken, findings nobody saw. */
export function missingFor(findings: readonly Finding[], missing: ReadonlyMap<string, readonly string[]>, input: FitInput): string[] {
  const told = new Set<string>()
  for (const { cause, change, explains, advice, sentence, response } of findings) {
    if (!explains.length && advice !== 'bring-back' && !response) told.add(`Nothing was seen for this yet, only measured: ${lower(sentence)} Look for it on the sample before changing the paper.`)
    const seen = input.observations.find((observation) => explains.includes(observation.id))
    if (seen && change.amountFrom === 'usual for this sign' && advice === 'change') told.add(`${sentenceOf(seen)}: measure it. ${askFor(seen.sign, seen.amount?.as).ask}`)
    const codes = missing.get(cause) ?? []
    const body = [...new Set(codes.filter((code) => !code.includes(':') && code !== 'drafted-cup'))]
    if (body.length) told.add(`Measure: ${body.map(measurementName).join(', ')}. It would say more about this: ${lower(sentence)}`)
    if (codes.includes('drafted-cup')) told.add('Say what bust difference the pattern is drafted for: it stands with the size chart or the block.')
  }
  return [...told]
}
