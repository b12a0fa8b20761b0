import { type Garment, type GarmentKind } from '../fit/types.ts'

export type SizeDimensions = { primary: readonly string[]; secondary: readonly string[] }
export type LabelGarment = GarmentKind | 'knit-top' | 'nightwear' | 'bra'

/**
 * The dimensions a size is labelled by: primary required, secondary optional (EN 13402-2:2002, ISO 8559-2:2017). Rows from memory.
 * The label standards lead skirts and trousers by the waist; home-pattern practice leads fitted ones by the hip. Both hold in their place.
 */
const women: Readonly<Record<LabelGarment, SizeDimensions>> = {
  jacket: { primary: ['bust'], secondary: ['height', 'hip'] },
  coat: { primary: ['bust'], secondary: ['height'] },
  dress: { primary: ['bust'], secondary: ['height', 'waist', 'hip'] },
  shirt: { primary: ['bust'], secondary: ['height'] },
  bodice: { primary: ['bust'], secondary: ['height'] },
  'knit-top': { primary: ['bust'], secondary: ['height'] },
  skirt: { primary: ['waist'], secondary: ['height', 'hip'] },
  trousers: { primary: ['waist'], secondary: ['height', 'hip', 'inside-leg'] },
  nightwear: { primary: ['bust'], secondary: ['height', 'waist', 'hip'] },
  bra: { primary: ['underbust'], secondary: ['bust'] },
}
const men: Readonly<Partial<Record<LabelGarment, SizeDimensions>>> = {
  jacket: { primary: ['chest'], secondary: ['height', 'waist'] },
  coat: { primary: ['chest'], secondary: ['height'] },
  shirt: { primary: ['neck'], secondary: ['height', 'arm-length'] },
  'knit-top': { primary: ['chest'], secondary: ['height'] },
  trousers: { primary: ['waist'], secondary: ['height', 'inside-leg'] },
  nightwear: { primary: ['chest'], secondary: ['height', 'waist'] },
}
/** Null where the standard has no row: no men's dress, skirt or bra. */
export const sizeDimensions = (garment: LabelGarment, cut: 'women' | 'men'): SizeDimensions | null => (cut === 'women' ? women[garment] : men[garment]) ?? null

export type NeededMeasurements = { needed: readonly string[]; helpful: readonly string[] }

/**
 * What to measure before a garment is sized: what the size is chosen by, and what makes the fit surer. A skirt never asks for the
 * bust. Common practice.
 */
export function measurementsFor(garment: Garment): NeededMeasurements {
  const has = (feature: NonNullable<Garment['features']>[number]) => garment.features?.includes(feature) ?? false
  const lower = garment.kind === 'skirt' || garment.kind === 'trousers'
  const needed = lower ? ['waist', 'hip'] : ['bust', 'high-bust', 'waist', ...(garment.kind === 'bodice' ? [] : ['hip']), 'back-waist-length']
  const helpful = lower ? ['waist-to-hip', 'abdomen'] : ['front-waist-length', 'bust-depth', 'bust-span', 'shoulder', 'back-width', 'neck', ...(garment.kind === 'bodice' ? ['hip'] : ['waist-to-hip'])]
  if (garment.kind === 'trousers') {
    needed.push('crotch-depth', 'thigh', 'inside-leg')
    helpful.push('crotch-length', 'crotch-front', 'crotch-back', 'knee', 'outside-leg')
  }
  if (garment.kind === 'skirt' || garment.kind === 'dress') helpful.push('waist-to-knee')
  if (!lower && garment.sleeves && garment.sleeves !== 'none') {
    needed.push('upper-arm', 'arm-length')
    helpful.push('elbow', 'wrist')
  }
  if (lower && garment.waist !== 'elastic' && !has('knit')) helpful.push('waist-seated', 'hip-seated')
  if (has('children')) needed.unshift('height')
  return { needed, helpful }
}
