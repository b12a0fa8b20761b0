import { type checkGroups } from '../contracts/finalCut.ts'
import { type Garment } from '../fit/types.ts'

export type CheckGroup = (typeof checkGroups)[number]
/** What the product can tell by itself; the item ticks itself and says from what. */
export const verifiedFacts = [
  'observations-settled', 'fitter-agreed', 'size-kept', 'measurements-fresh', 'changes-transferred', 'seams-walked', 'marks-complete', 'pieces-complete', 'shrinkage-measured', 'cloth-long-enough',
] as const
export type VerifiedFact = (typeof verifiedFacts)[number]

export type ChecklistItem = {
  id: string
  group: CheckGroup
  title: string
  /** what to do, or to look at */
  help: string
  /** null: a person ticks it */
  verifiedBy: VerifiedFact | null
}
type Row = ChecklistItem & { when?: (garment: Garment, cloth: ChecklistCloth) => boolean }
export type ChecklistCloth = { oneWay?: boolean; matching?: boolean; /** a fitter is on the project */ hasFitter?: boolean }

const item = (id: string, group: CheckGroup, title: string, help: string, verifiedBy: VerifiedFact | null = null, when?: Row['when']): Row => ({ id, group, title, help, verifiedBy, ...(when && { when }) })
const has = (feature: NonNullable<Garment['features']>[number]) => (garment: Garment) => garment.features?.includes(feature) ?? false

/** Everything looked at before the good cloth is cut. Common practice. */
const rows: readonly Row[] = [
  item('fit.observations', 'fit', 'Every observation is settled or let be', 'Nothing is left open on the last sample.', 'observations-settled'),
  item('fit.moved', 'fit', 'The last sample was moved in', 'Sit, reach, bend and walk in it, in the shoes and underwear of the garment.'),
  item('fit.ease', 'fit', 'The good cloth needs no more ease than the sample', 'Crisp, thick or lined cloth takes up more; a cloth that gives less than the sample needs more.'),
  item('fit.fitter', 'fit', 'The fitter agreed to the cut', 'The fitter says so in their own name.', 'fitter-agreed', (_garment, { hasFitter }) => hasFitter ?? false),
  item('fit.measurements', 'fit', 'The measurements are not older than a month', 'Check bust, waist and hip once more if they are.', 'measurements-fresh'),

  item('pattern.size', 'pattern', 'Size and blend are written down', 'The size plan was kept.', 'size-kept'),
  item('pattern.pieces', 'pattern', 'Every piece is traced', 'Facings, linings and interlinings too.', 'pieces-complete'),
  item('pattern.marks', 'pattern', 'Every tracing carries its marks', 'Name, view, size, how many to cut, fold, grainline, notches, darts.', 'marks-complete'),
  item('pattern.changes', 'pattern', 'Every change is drawn on every piece it touches', 'Waistband, facing, lining and pocket follow their neighbours.', 'changes-transferred'),
  item('pattern.seams', 'pattern', 'Seams that meet are the same length', 'Walk them from notch to notch.', 'seams-walked'),
  item('pattern.allowances', 'pattern', 'Seam and hem allowances are on the paper', 'Sewn at another width than cut, eight edges of 5/8 in at 15 mm add 7 mm round the garment.'),
  item('pattern.print', 'pattern', 'The printed test square is true', 'Within half a millimetre on 5 cm, both ways. Paper that was not printed needs no look.'),

  item('cloth.washed', 'cloth', 'The cloth is washed, dried and pressed', 'As the garment will be; interlining and tapes too, cotton twice.'),
  item('cloth.shrinkage', 'cloth', 'Shrinkage is measured', 'Mark a square, wash it, measure both ways.', 'shrinkage-measured'),
  item('cloth.length', 'cloth', 'The cloth is long enough at its own width', 'Measured after the wash.', 'cloth-long-enough'),
  item('cloth.grain', 'cloth', 'The grain is pulled straight', 'Ends squared along a thread, selvedges level.'),
  item('cloth.right-side', 'cloth', 'The right side is marked', 'With chalk or thread, on every piece where it is hard to tell.'),
  item('cloth.one-way', 'cloth', 'All pieces lie the same way', 'Stroke the nap or look at the print once more.', null, (_garment, { oneWay }) => oneWay ?? false),
  item('cloth.matching', 'cloth', 'Stripes or checks meet at the notches', 'On the stitching line, not at the cut edge.', null, (_garment, { matching }) => matching ?? false),
  item('cloth.stretch', 'cloth', 'The stretch runs round the body', 'And is what the sample had.', null, has('knit')),
  item('cloth.bias', 'cloth', 'Bias pieces hang a day before hemming', 'Cut them single, and let them rest.', null, has('bias')),
  item('cloth.lay', 'cloth', 'The whole lay was looked at before the first cut', 'Left and right are both there; the count agrees with the list.'),
  item('cloth.children', 'cloth', 'The rules for children’s clothes were looked up', 'Cords, small parts and nightwear: local rules come first, and a qualified person’s advice.', null, has('children')),
]

/** The list for one garment and cloth: only what applies to it, in groups. */
export function finalChecklist(garment: Garment, cloth: ChecklistCloth = {}): ChecklistItem[] {
  return rows.filter(({ when }) => when?.(garment, cloth) ?? true).map(({ when: _when, ...kept }) => kept)
}
