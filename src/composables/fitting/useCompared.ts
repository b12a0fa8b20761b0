import { type View } from '#shared/fit/types.ts'
import { type FittingObservation } from '#shared/contracts/fitting.ts'
import { type StorySample } from '../project/useStory.ts'
import { type BoardMark } from '../../components/fitting/boardMark.ts'
import { type Format, readingOn, spokenLabel } from './observationWords.ts'

const views: readonly View[] = ['front', 'back', 'left', 'right', 'detail']

/** Observations of earlier samples that the later one asks again, in order of number, each once and in its newest state. */
export function askedBetween(samples: readonly StorySample[], a: number, b: number): FittingObservation[] {
  const newest = new Map<string, FittingObservation>()
  for (const story of samples) for (const one of story.observations) if (one.sampleNumber <= a && one.sampleNumber < b && one.state !== 'let-be') newest.set(one.id, newer(newest.get(one.id), one))
  return [...newest.values()].toSorted((x, y) => x.sampleNumber - y.sampleNumber || x.number - y.number)
}
const newer = (known: FittingObservation | undefined, one: FittingObservation) => (known && known.version > one.version ? known : one)

/** Views that at least one of the two samples has, in their usual order. */
export const viewsOf = (...stories: (StorySample | undefined)[]): View[] => views.filter((view) => stories.some((story) => story?.photographs.some((photograph) => photograph.view === view)))

/** Marks to show on one sample's photograph: as seen there; on the newer one only what is still open. */
export function marksOn(story: StorySample, photographId: string, format: Format): BoardMark[] {
  return story.observations.flatMap((one) => (one.mark && one.photographId === photographId && one.state !== 'let-be'
    ? [{ id: one.id, number: one.number, ...one.mark, state: one.state, label: spokenLabel(one, story.changes, format) }] : []))
}

/** The first view after this one with something not yet looked at, else simply the next. */
export function nextView(view: View, offered: readonly View[], asked: readonly FittingObservation[], b: number): View | null {
  const after = [...offered.slice(offered.indexOf(view) + 1), ...offered.slice(0, Math.max(0, offered.indexOf(view)))]
  return after.find((one) => asked.some((seen) => seen.view === one && !readingOn(seen, b))) ?? null
}
