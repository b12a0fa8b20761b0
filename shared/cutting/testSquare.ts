import { clothNeeded, dimensionalChange } from '../sizes/shrinkage.ts'

/** A square marked on the cloth, then washed and dried as the garment will be. 25 cm is usual. Common practice. */
export const usualSquareMm = 250
export type TestSquare = { markedMm: number | null; lengthAfterMm: number | null; widthAfterMm: number | null }
export type ClothShrinkage = { lengthPercent: number; widthPercent: number; text: string }

const noticeablePercent = 0.5 // about 1 mm on the usual square: what a tape shows
const muchPercent = 3 // what a "pre-shrunk" label usually allows

/**
 * Dimensional change from a measured square; negative is shrinkage. Null until all three lengths are there.
 * Source: AATCC test method 135, its form; the limit of 3 % as labels use it
 */
export function shrinkageOf({ markedMm, lengthAfterMm, widthAfterMm }: TestSquare): ClothShrinkage | null {
  if (!markedMm || !lengthAfterMm || !widthAfterMm) return null
  const lengthPercent = dimensionalChange(markedMm, lengthAfterMm)
  const widthPercent = dimensionalChange(markedMm, widthAfterMm)
  return { lengthPercent, widthPercent, text: shrinkageText(lengthPercent, widthPercent) }
}

function shrinkageText(lengthPercent: number, widthPercent: number): string {
  const most = Math.max(Math.abs(lengthPercent), Math.abs(widthPercent))
  if (most < noticeablePercent) return 'The cloth keeps its size in the wash.'
  const part = (percent: number, way: string) => `${Math.abs(percent).toFixed(1)} % ${percent < 0 ? 'shorter' : 'longer'} in the ${way}`
  const said = [[lengthPercent, 'length'], [widthPercent, 'width']].filter(([percent]) => Math.abs(percent as number) >= noticeablePercent).map(([percent, way]) => part(percent as number, way as string))
  return `The cloth comes out ${said.join(' and ')}. Wash and dry all of it before cutting${most > muchPercent ? ', twice if it is cotton' : ''}, and buy for it.`
}

/** What to have before the wash so that a length and a width are left after it. */
export const clothToBuy = (lengthMm: number, widthMm: number, { lengthPercent, widthPercent }: Pick<ClothShrinkage, 'lengthPercent' | 'widthPercent'>) => ({ lengthMm: clothNeeded(lengthMm, lengthPercent), widthMm: clothNeeded(widthMm, widthPercent) })
