import { type When } from '../rule.ts'
import { type Garment } from '../types.ts'

/** Whether a rule, a step or a companion is for this garment. What the garment does not say about waist and sleeves is no obstacle. */
export function fitsGarment(when: When | undefined, garment: Garment): boolean {
  if (!when) return true
  const features = garment.features ?? []
  return (!when.kinds || when.kinds.includes(garment.kind))
    && (!when.waist || !garment.waist || when.waist.includes(garment.waist))
    && (!when.sleeves || !garment.sleeves || when.sleeves.includes(garment.sleeves))
    && (!when.needs || when.needs.some((feature) => features.includes(feature)))
    && !when.without?.some((feature) => features.includes(feature))
}
