import { type Direction, type GarmentKind, type Side, type Sign, type Target, type Zone } from '#shared/fit/types.ts'
import { markPaths } from '../../composables/fitting/markGeometry.ts'
import { type FigureView, type Pt } from './figureShapes.ts'
import { landmark, spotPoints, zoneSpot, type ZoneSpot } from './figureZones.ts'

/** The strokes every sign is drawn with, in the figure's 200 × 400. */
export type FigureStroke = { kind: 'drag' | 'fold' | 'gape' | 'press' | 'level' | 'plumb' | 'place' | 'span'; points: readonly Pt[] }
export type SignOnFigure = {
  sign: Sign; zone: Zone; view: FigureView; garment?: GarmentKind | null; side?: Side; direction?: Direction | null; towards?: Target | null
}

const usualDirection: Partial<Record<Zone, Direction>> = {
  waist: 'horizontal', midriff: 'horizontal', seat: 'diagonal', crotch: 'vertical', bust: 'vertical', armhole: 'diagonal', neck: 'horizontal', 'upper-back': 'horizontal', hip: 'vertical', abdomen: 'vertical', hem: 'vertical',
}

/** Strokes for a sign at a zone; empty where the view does not show the zone. */
export function strokesOf(seen: SignOnFigure): FigureStroke[] {
  const { sign, zone, view, garment = null, side = 'both' } = seen
  const spot = zone === 'whole' ? { x: 100, y: 170, rx: 30, ry: 70, paired: false } : zoneSpot(zone, view, garment)
  if (!spot) return []
  // Across the hip, cloth is tight from side to side, not on each hip for itself.
  if (sign === 'tight' && zone === 'hip' && side === 'both' && view !== 'side') return [{ kind: 'press', points: [[62, spot.y], [138, spot.y]] }]
  return spotPoints(spot, side, view).flatMap((at) => strokesAt(sign, at, spot, seen))
}

function strokesAt(sign: Sign, [x, y]: Pt, spot: ZoneSpot, seen: SignOnFigure): FigureStroke[] {
  const out = spot.paired ? Math.sign(x - 100) : 1
  const { rx, ry } = spot
  switch (sign) {
    case 'drag-lines': return dragStrokes([x, y], spot, seen)
    case 'gaping': return spot.paired
      ? [{ kind: 'gape', points: out > 0 ? [[x, y - ry], [x, y + ry]] : [[x, y + ry], [x, y - ry]] }]
      : [{ kind: 'gape', points: [[x - rx, y], [x + rx, y]] }]
    case 'tight': return [{ kind: 'press', points: [[x - Math.max(rx, 16), y], [x + Math.max(rx, 16), y]] }]
    case 'binds': return [{ kind: 'press', points: [[x - Math.max(rx, 16), y + 4], [x + Math.max(rx, 16), y + 4]] }, { kind: 'level', points: [[x - 12, y - ry - 2], [x + 12, y - ry - 2], [x, y - ry - 14]] }]
    case 'excess': return foldStrokes([x, y], spot, seen)
    case 'rises': return [{ kind: 'level', points: [[x - rx, y], [x + rx, y], [x, y - 13]] }]
    case 'drops': return [{ kind: 'level', points: [[x - rx, y], [x + rx, y], [x, y + 13]] }]
    case 'short': return [{ kind: 'span', points: [[x, y - Math.max(ry, 12)], [x, y + Math.max(ry, 12)]] }]
    case 'long': return [{ kind: 'span', points: [[x, y + Math.max(ry, 12)], [x, y - Math.max(ry, 12)]] }]
    case 'swings': {
      const lean = seen.towards === 'front' ? -1 : seen.towards === 'in' ? -out : 1
      return [{ kind: 'plumb', points: [[x, y - ry - 4], [x + lean * 13 * (seen.towards === 'in' || seen.towards === 'out' ? out : 1), y + ry + 20]] }]
    }
    case 'off-place': return [{ kind: 'place', points: [[x, y], placeTip([x, y], seen.towards ?? 'out', out)] }]
  }
}

const placeTip = ([x, y]: Pt, towards: Target, out: number): Pt => {
  const ways: Partial<Record<Target, Pt>> = { up: [0, -22], down: [0, 22], in: [-out * 20, 0], out: [out * 20, 0], front: [-20, 4], back: [20, 4] }
  const [dx, dy] = ways[towards] ?? [out * 16, -14]
  return [x + dx, y + dy]
}

/** A fan of lines to where the cloth is caught: the target where one is named, the zone itself where not. */
function dragStrokes([x, y]: Pt, spot: ZoneSpot, { zone, view, towards, direction }: SignOnFigure): FigureStroke[] {
  const named = towards ? landmark(towards, view) : null
  // A zone there once still pulls from both sides: one fan each way.
  const ways = spot.paired || view === 'side' ? [x >= 100 ? 1 : -1] : [1, -1]
  return ways.map((way) => {
    const centreX = spot.paired || view === 'side' ? x : x + way * (zone === 'bust' ? 15 : spot.rx * 0.35)
    if (named) {
      const tip: Pt = [way > 0 || view === 'side' ? named[0] : 200 - named[0], named[1]]
      const far = Math.hypot(tip[0] - centreX, tip[1] - y) > 8
      if (far) return { kind: 'drag', points: [[centreX, y], tip] }
    }
    const reach = Math.max(26, spot.rx)
    const from: Record<Direction, Pt> = { horizontal: [way * reach, 1], vertical: [way * 3, reach], diagonal: [way * reach * 0.75, reach * 0.9], radiating: [way * reach * 0.9, reach * 0.5] }
    const [dx, dy] = from[direction ?? 'diagonal']
    return { kind: 'drag', points: [[centreX + dx, y + dy], [centreX, y]] }
  })
}

/** Two or three lenses of spare cloth lying the way the folds run. */
function foldStrokes([x, y]: Pt, { rx, ry, paired }: ZoneSpot, { zone, direction }: SignOnFigure): FigureStroke[] {
  const way = paired && x < 100 ? -1 : 1
  const run = direction ?? usualDirection[zone] ?? 'vertical'
  const length = { horizontal: Math.max(rx, 15), vertical: Math.max(ry, 15), diagonal: 15, radiating: 15 }[run]
  const lens = (cx: number, cy: number, dx: number, dy: number): FigureStroke => ({ kind: 'fold', points: [[cx - dx, cy - dy], [cx + dx, cy + dy]] })
  if (run === 'horizontal') return [lens(x, y - 4, length, 0), lens(x, y + 6, length * 0.8, 0)]
  if (run === 'vertical') return paired ? [lens(x, y, 0, length)] : [lens(x - rx * 0.4, y, 0, length), lens(x + rx * 0.4, y, 0, length)]
  if (run === 'radiating') return [lens(x - 12, y + 4, 7, 12), lens(x, y + 4, 0, 14), lens(x + 12, y + 4, -7, 12)]
  return paired ? [lens(x, y, way * 11, -11)] : [lens(x - 13, y + 6, 10, 9), lens(x + 13, y + 6, -10, 9)]
}

/** Larger on the drawing board, so that arrowheads keep the proportions of a mark on a photograph. */
const enlarge = 3
const marks = { drag: 'drag-line', fold: 'excess', gape: 'gape', press: 'tight', plumb: 'balance', place: 'place', span: 'length' } as const

/** Path data at three times the figure's size: draw it in a group scaled by `strokeScale`. */
export const strokeScale = 1 / enlarge
export function strokePaths({ kind, points }: FigureStroke): { solid: string; dashed: string } {
  const big = points.map(([x, y]): Pt => [x * enlarge, y * enlarge])
  if (kind !== 'level') return markPaths(marks[kind], 'stroke', big)
  const [a, b, off] = [big[0]!, big[1]!, big[2]!]
  const foot: Pt = [off[0], (a[1] + b[1]) / 2]
  const down = Math.sign(off[1] - foot[1])
  // A quadratic reaches half way to its control point: doubled, it passes through `off`.
  const curve = `M${a[0]} ${a[1]}Q${off[0]} ${2 * off[1] - foot[1]} ${b[0]} ${b[1]}`
  const tip = off[1] - down * 2
  return { solid: `${curve}M${off[0] - 11} ${tip - down * 14}L${off[0]} ${tip}L${off[0] + 11} ${tip - down * 14}`, dashed: `M${a[0]} ${a[1]}L${b[0]} ${b[1]}` }
}
