import { type SampleCloth } from '../types.ts'

/** Stretch that differs by this many points between sample and final cloth makes a width amount unsure. Our own limit. */
const stretchApart = 5

/** What the sample's cloth does to an amount. Lengths hardly care; widths do. */
export function clothNotes(cloth: SampleCloth | undefined, isWidthChange: boolean): string[] {
  if (!cloth) return []
  const notes: string[] = []
  const { stretchPercent, finalStretchPercent, stiffer } = cloth
  if (isWidthChange && stretchPercent !== undefined && finalStretchPercent !== undefined && Math.abs(stretchPercent - finalStretchPercent) >= stretchApart) {
    notes.push(stretchPercent > finalStretchPercent
      ? `The sample stretches more than the final cloth (${stretchPercent} against ${finalStretchPercent} %): the final cloth will need more width than the sample shows.`
      : `The final cloth stretches more than the sample (${finalStretchPercent} against ${stretchPercent} %): it may need less width than the sample shows.`)
  }
  if (stiffer) notes.push('The sample is stiffer than the final cloth: folds stand out more here than they will later, and small amounts may not be needed.')
  return notes
}
