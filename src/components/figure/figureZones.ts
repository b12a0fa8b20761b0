import { type GarmentKind, type Side, type Target, type Zone } from '#shared/fit/types.ts'
import { type FigureView, type Pt, garmentCut } from './figureShapes.ts'

/** A zone on the figure: its middle, how far it reaches, and whether it is there once or on both sides. */
export type ZoneSpot = { x: number; y: number; rx: number; ry: number; paired: boolean }

const pair = (x: number, y: number, rx: number, ry: number): ZoneSpot => ({ x, y, rx, ry, paired: true })
const one = (y: number, rx: number, ry: number, x = 100): ZoneSpot => ({ x, y, rx, ry, paired: false })

/** Paired spots are given for the side at larger x; the other mirrors about x = 100. */
const spots: Record<FigureView, Partial<Record<Zone, ZoneSpot>>> = {
  front: {
    neck: one(70, 13, 10), shoulder: pair(125, 74, 11, 8), armhole: pair(131, 92, 9, 13), bust: one(112, 26, 13), sleeve: pair(148, 148, 11, 42), midriff: one(133, 25, 9), waist: one(149, 25, 8),
    abdomen: one(167, 24, 10), hip: pair(127, 190, 12, 12), crotch: one(210, 11, 10), thigh: pair(118, 238, 15, 22), knee: pair(115, 286, 13, 14), leg: pair(115, 328, 12, 26),
  },
  back: {
    neck: one(63, 13, 9), shoulder: pair(125, 73, 11, 8), 'upper-back': one(94, 22, 16), armhole: pair(131, 94, 9, 13), sleeve: pair(148, 148, 11, 42), midriff: one(126, 26, 13), waist: one(149, 25, 8),
    hip: pair(129, 178, 10, 12), seat: one(190, 24, 14), crotch: one(212, 11, 9), thigh: pair(118, 238, 15, 22), knee: pair(115, 286, 13, 14), leg: pair(115, 328, 12, 26),
  },
  side: {
    neck: one(58, 10, 8, 101), shoulder: one(71, 10, 6, 104), 'upper-back': one(92, 9, 14, 119), bust: one(112, 11, 12, 80), armhole: one(96, 9, 11, 104), sleeve: one(158, 8, 36, 99), midriff: one(130, 10, 9, 86), waist: one(149, 15, 7, 99),
    abdomen: one(168, 9, 10, 82), hip: one(186, 11, 12, 101), seat: one(192, 9, 13, 121), thigh: one(240, 17, 22, 99), knee: one(288, 12, 14, 98), leg: one(328, 12, 24, 101),
  },
}

/** Where a zone is on this view; null where it cannot be seen there. The hem is where the garment ends. */
export function zoneSpot(zone: Zone, view: FigureView, garment: GarmentKind | null): ZoneSpot | null {
  if (zone === 'hem') {
    const { hemY, trousers } = garmentCut(garment)
    return trousers && view !== 'side' ? pair(116, hemY, 13, 8) : one(hemY, view === 'side' ? 26 : 38, 8, view === 'side' ? 100 : 100)
  }
  return spots[view][zone] ?? null
}
/** The view a zone is best seen on. */
export const bestView = (zone: Zone): FigureView => (zone === 'upper-back' || zone === 'seat' ? 'back' : 'front')

/** The middles of a zone as one side or both ask for; the wearer's left is at larger x seen from the front. */
export function spotPoints(spot: ZoneSpot, side: Side, view: FigureView): Pt[] {
  if (!spot.paired) return [[spot.x, spot.y]]
  const far: Pt = [spot.x, spot.y]
  const near: Pt = [200 - spot.x, spot.y]
  if (side === 'both' || side === 'centre') return [near, far]
  return (side === 'left') === (view === 'front') ? [far] : [near]
}

/** Landmarks a drag line may run to, for the side at larger x. */
const landmarks: Record<FigureView, Partial<Record<Target, Pt>>> = {
  front: {
    neck: [109, 66], 'shoulder-tip': [132, 72], bust: [115, 112], underarm: [133, 104], armhole: [130, 92], 'side-seam': [130, 134], waist: [112, 148], abdomen: [106, 168], hip: [134, 188], crotch: [101, 210], thigh: [118, 240],
    knee: [115, 286], elbow: [147, 138], hem: [128, 282], front: [112, 150], seat: [130, 190], 'shoulder-blade': [118, 94],
  },
  back: {
    neck: [109, 62], 'shoulder-tip': [132, 72], 'shoulder-blade': [115, 92], underarm: [133, 104], armhole: [130, 94], 'side-seam': [130, 134], waist: [112, 148], hip: [134, 184], seat: [114, 192], crotch: [101, 212], thigh: [118, 240],
    knee: [115, 286], elbow: [147, 138], hem: [128, 282], back: [112, 150], bust: [130, 112], abdomen: [128, 168],
  },
  side: {
    neck: [101, 60], 'shoulder-tip': [104, 72], bust: [76, 112], underarm: [104, 106], armhole: [104, 98], 'shoulder-blade': [121, 96], 'side-seam': [100, 134], waist: [100, 148], abdomen: [80, 168], hip: [100, 188], seat: [124, 192],
    crotch: [96, 212], thigh: [99, 240], knee: [97, 288], elbow: [101, 142], hem: [100, 286], front: [80, 150], back: [116, 150],
  },
}
export const landmark = (target: Target, view: FigureView): Pt | null => landmarks[view][target] ?? null

/** The zone whose middle is nearest to a spot on the figure, in its own reach. */
export function zoneAt([x, y]: Pt, view: FigureView, garment: GarmentKind | null, allowed: readonly Zone[]): Zone {
  const reach = (zone: Zone) => {
    const spot = zoneSpot(zone, view, garment)
    if (!spot) return Infinity
    return Math.min(...spotPoints(spot, 'both', view).map(([sx, sy]) => Math.hypot((x - sx) / spot.rx, (y - sy) / spot.ry)))
  }
  return allowed.reduce((best, zone) => (reach(zone) < reach(best) ? zone : best), allowed[0] ?? 'whole')
}
