import { type Garment } from '../fit/types.ts'

export type Caution = {
  id: string
  /** where it belongs: beside the scissors, at the iron, in a fitting, on the layout, for children */
  place: 'cutting' | 'pressing' | 'fitting' | 'layout' | 'children'
  text: string
  source: string
}

const common = 'common practice'
const isFor = (place: Caution['place']) => (row: readonly [string, string]): Caution => ({ id: `${place}.${row[0]}`, place, text: row[1], source: common })

export const layoutCautions: readonly Caution[] = ([
  ['grain', 'Measure every grainline to the selvedge at both ends; a piece off grain hangs crooked for good.'],
  ['fold', 'Lay fold edges exactly on a fold along the straight grain, selvedges level.'],
  ['large-first', 'Lay the large pieces first and look at the whole lay before the first cut.'],
  ['one-way', 'On cloth with nap, shine or a print with a top, all pieces point the same way.'],
  ['matching', 'Match stripes and checks at the notches on the stitching line, not at the cut edge.'],
  ['pairs', 'Of pieces cut once on single cloth, turn one over: there must be a left and a right.'],
  ['count', 'Count the pieces against the list before the cloth is put away.'],
] as const).map(isFor('layout'))

export const safetyCautions: readonly Caution[] = [
  ...([
    ['rotary-cutter', 'Close the guard of a rotary cutter every time it is put down, cut away from yourself, and keep fingers off the ruler’s edge.'],
    ['shears', 'Carry shears closed and keep them away from the edge of the table.'],
    ['needle', 'When a needle breaks, find every part of it.'],
  ] as const).map(isFor('cutting')),
  ...([
    ['iron', 'Steam scalds. Test the heat on a scrap, keep the cord out of the way, and unplug the iron when you leave it.'],
  ] as const).map(isFor('pressing')),
  ...([
    ['pins', 'Pin along the body, not towards it; count the pins in and out, and let nobody sit or walk in a pinned sample.'],
    ['scissors', 'Never cut a sample open towards the body: slide a hand underneath, or take it off first.'],
    ['starting-point', 'A suggestion is a starting point. The sample proves it; never cut the good cloth on a change that was not tried.'],
  ] as const).map(isFor('fitting')),
]

/** Shown with children's garments; the rules of the place where it is worn or sold come first. */
export const childrenCautions: readonly Caution[] = [
  {
    id: 'children.cords', place: 'children',
    text: 'Leave out cords and drawstrings at the hood and neck: they catch in play equipment and doors. Rules differ by country and age; look up those that hold where the child lives, and ask a qualified person before selling or giving away.',
    source: 'US CPSC drawstring guidance and 16 CFR 1120, in force since 18 August 2011; EN 14682 in Europe',
  },
  {
    id: 'children.waist-cords', place: 'children',
    text: 'Cords at waist and hem are kept short and fixed in the middle, without knots or toggles at free ends. Lengths are set by local rules; look them up before you cut.',
    source: 'US 16 CFR 1120 (at most 3 in outside the channel, sizes 2T to 16); EN 14682',
  },
  {
    id: 'children.nightwear', place: 'children',
    text: 'Cloth and cut of children’s nightwear are regulated because they can catch fire; robes count as nightwear. The journal cannot say what passes: follow the local rules and the advice of a qualified person.',
    source: 'US 16 CFR 1615 and 1616; local rules elsewhere',
  },
  {
    id: 'children.small-parts', place: 'children',
    text: 'Under three years, buttons, snaps and trims can be swallowed: leave them out where you can, sew the rest on twice and pull hard at each.',
    source: common,
  },
  { id: 'children.pins', place: 'children', text: 'Count the pins before and after every fitting of a child.', source: common },
]
/** Outside what the journal may advise on. */
export const outsideAdvice = 'Compression, medical and protective garments are outside what this journal may advise on.'

/** The cautions for one garment at one place; children's rows only where the garment is for a child. */
export function cautionsFor(garment: Garment, place: Caution['place']): Caution[] {
  const rows = [...layoutCautions, ...safetyCautions, ...(garment.features?.includes('children') ? childrenCautions : [])]
  return rows.filter((row) => row.place === place)
}
