import { type ProjectRow } from '#db/schema/projects.ts'
import { sampleStates } from '#shared/contracts/project.ts'

/** Part of the thread already sewn, 0..1: a tenth for the hanging, a fifth for the size, then the samples, the whole when it is cleared. */
export function progress({ stage, restedFrom, sampleNumber, sampleState }: Pick<ProjectRow, 'stage' | 'restedFrom' | 'sampleNumber' | 'sampleState'>): number {
  const now = stage === 'resting' ? restedFrom ?? 'size' : stage
  if (now === 'cleared' || now === 'cut') return 1
  if (now === 'size') return 0.1
  if (sampleNumber === null) return 0.2
  // Each sample gets half of what is left before the cut: nobody knows beforehand how many it will be.
  const done = 1 - 0.5 ** (sampleNumber - 1)
  const inThis = 0.5 ** sampleNumber * (sampleStates.indexOf(sampleState ?? 'to-sew') / (sampleStates.length - 1))
  return 0.25 + 0.7 * (done + inThis)
}
