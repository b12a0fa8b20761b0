import { type GarmentKind, type PieceRole } from '../fit/types.ts'

export type SeamPartner = { a: { role: PieceRole; edge: string }; b: { role: PieceRole; edge: string }; /** the second edge is eased onto the first */ eased?: boolean; garments?: readonly GarmentKind[] }

/** Edges that are sewn to each other: they carry the same notches, the same blend and the same change. Common practice. */
export const seamPartners: readonly SeamPartner[] = [
  { a: { role: 'skirt-front', edge: 'side-seam' }, b: { role: 'skirt-back', edge: 'side-seam' } },
  { a: { role: 'trouser-front', edge: 'side-seam' }, b: { role: 'trouser-back', edge: 'side-seam' } },
  { a: { role: 'trouser-front', edge: 'inseam' }, b: { role: 'trouser-back', edge: 'inseam' } },
  { a: { role: 'bodice-front', edge: 'side-seam' }, b: { role: 'bodice-back', edge: 'side-seam' } },
  { a: { role: 'bodice-front', edge: 'shoulder' }, b: { role: 'bodice-back', edge: 'shoulder' }, eased: true },
  { a: { role: 'bodice-front', edge: 'armhole' }, b: { role: 'sleeve', edge: 'cap' }, eased: true },
  { a: { role: 'bodice-back', edge: 'armhole' }, b: { role: 'sleeve', edge: 'cap' }, eased: true },
  { a: { role: 'sleeve', edge: 'underarm-seam' }, b: { role: 'sleeve', edge: 'underarm-seam' } },
  { a: { role: 'sleeve', edge: 'front-seam' }, b: { role: 'under-sleeve', edge: 'front-seam' } },
  { a: { role: 'sleeve', edge: 'back-seam' }, b: { role: 'under-sleeve', edge: 'back-seam' } },
  { a: { role: 'bodice-front', edge: 'waist' }, b: { role: 'skirt-front', edge: 'waist' } },
  { a: { role: 'bodice-back', edge: 'waist' }, b: { role: 'skirt-back', edge: 'waist' } },
  { a: { role: 'waistband', edge: 'waist' }, b: { role: 'skirt-front', edge: 'waist' } },
  { a: { role: 'waistband', edge: 'waist' }, b: { role: 'trouser-front', edge: 'waist' } },
  { a: { role: 'collar-stand', edge: 'neckline' }, b: { role: 'bodice-back', edge: 'neckline' } },
  { a: { role: 'collar', edge: 'neckline' }, b: { role: 'collar-stand', edge: 'top' } },
  { a: { role: 'neck-facing', edge: 'neckline' }, b: { role: 'bodice-front', edge: 'neckline' } },
  { a: { role: 'cuff', edge: 'top' }, b: { role: 'sleeve', edge: 'wrist' }, eased: true },
  { a: { role: 'yoke', edge: 'lower' }, b: { role: 'bodice-back', edge: 'top' } },
]

/** The seams a list of pieces has among itself. */
export const seamsAmong = (roles: readonly PieceRole[]): SeamPartner[] => seamPartners.filter(({ a, b }) => roles.includes(a.role) && roles.includes(b.role))
