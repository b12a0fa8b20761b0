import { type Mark } from '#shared/contracts/fitting.ts'
import { type Direction, type GarmentKind, type Line, type Sign, type Target, type View, type Zone } from '#shared/fit/types.ts'
import { signsOfMark, signWords, zonesOfView } from '#shared/fit/vocabulary.ts'
import { type FigureView, type Pt } from '../../components/figure/figureShapes.ts'
import { landmark, zoneAt, zoneSpot } from '../../components/figure/figureZones.ts'
import { type ObservationInput } from './useObservations.ts'

/**
 * Which part of the figure a photograph of this garment usually shows, figure units: tops from the head to the hip, skirts and trousers
 * from the waist to the floor, long garments whole. A guess to start from; the person corrects it with one touch.
 */
const windows: Record<GarmentKind, { top: number; bottom: number }> = {
  bodice: { top: 14, bottom: 279 }, shirt: { top: 14, bottom: 285 }, jacket: { top: 14, bottom: 290 }, coat: { top: 5, bottom: 395 }, dress: { top: 5, bottom: 395 },
  skirt: { top: 112, bottom: 395 }, trousers: { top: 125, bottom: 400 },
}

const figureViewOf = (view: View): FigureView => (view === 'back' ? 'back' : view === 'left' || view === 'right' ? 'side' : 'front')

/** Where a spot of the picture lies on the figure. */
export function onFigure([fx, fy]: readonly [number, number], view: View, garment: GarmentKind, aspect: number): Pt {
  const { top, bottom } = windows[garment]
  const height = bottom - top
  const x = (fx - 0.5) * height * aspect
  return [100 + (view === 'right' ? -x : x), top + fy * height]
}

/** The first reading of a mark: what it most likely is and where, so that it can be kept at once and corrected after. */
export function guessObservation(mark: Mark, view: View, garment: GarmentKind, photographId: string, aspect: number): ObservationInput {
  const figureView = figureViewOf(view)
  const points = mark.points.map((p) => onFigure(p, view, garment, aspect))
  const first = points[0]!
  const last = points.at(-1)!
  const middle: Pt = [mean(points.map(([x]) => x)), mean(points.map(([, y]) => y))]
  const sign = signOf(mark.kind, first, last)
  // A drag line names where the cloth is caught, a plumb line its pivot, an arrow where it starts; all else is seen at its middle.
  const spot = mark.kind === 'drag-line' ? last : mark.kind === 'balance' || mark.kind === 'place' || mark.kind === 'length' ? first : middle
  const usual = signWords[sign].zones.filter((zone) => zone !== 'whole' && zonesOfView(view).includes(zone) && zoneSpot(zone, figureView, garment))
  const zone: Zone = usual.length > 0 ? zoneAt(spot, figureView, garment, usual) : signWords[sign].zones[0]!
  const inMiddle = Math.abs(middle[0] - 100) < 10 && figureView !== 'side'
  const paired = zoneSpot(zone, figureView, garment)?.paired === true
  return {
    photographId, mark, sign, zone, view, side: inMiddle && !paired ? 'centre' : 'both', severity: 2, amount: null, note: '',
    direction: signWords[sign].directions.length > 0 && mark.shape === 'stroke' ? directionOf(first, last, signWords[sign].directions) : null,
    towards: towardsOf(sign, first, last, figureView, view), line: lineOf(sign, zone, figureView, inMiddle),
  }
}

function signOf(kind: Mark['kind'], first: Pt, last: Pt): Sign {
  // The arrow shows the way the edge should move: down where it sits too high.
  if (kind === 'length') return last[1] >= first[1] ? 'rises' : 'drops'
  return signsOfMark(kind)[0]!
}

function directionOf([ax, ay]: Pt, [bx, by]: Pt, offered: readonly Direction[]): Direction | null {
  const [dx, dy] = [Math.abs(bx - ax), Math.abs(by - ay)]
  const direction: Direction = dy < dx * 0.4 ? 'horizontal' : dx < dy * 0.4 ? 'vertical' : 'diagonal'
  return offered.includes(direction) ? direction : null
}

const caughtAt: readonly Target[] = ['neck', 'shoulder-tip', 'bust', 'underarm', 'shoulder-blade', 'abdomen', 'hip', 'seat', 'crotch', 'knee']

function towardsOf(sign: Sign, [ax, ay]: Pt, [bx, by]: Pt, figureView: FigureView, view: View): Target | null {
  if (sign === 'swings') {
    if (figureView !== 'side') return null
    return bx < ax ? 'front' : 'back' // the figure of a side view faces left, a right view was mirrored before
  }
  if (sign === 'off-place') {
    if (Math.abs(by - ay) >= Math.abs(bx - ax)) return by < ay ? 'up' : 'down'
    if (figureView === 'side') return bx < ax ? 'front' : 'back'
    return Math.abs(bx - 100) < Math.abs(ax - 100) ? 'in' : 'out'
  }
  if (sign !== 'drag-lines') return null
  const near = caughtAt.map((target) => {
    const at = landmark(target, figureView)
    // Landmarks stand for both sides except in profile.
    const x = figureView === 'side' || bx >= 100 ? bx : 200 - bx
    return { target, far: at ? Math.hypot(x - at[0], by - at[1]) : Infinity }
  }).toSorted((a, b) => a.far - b.far)[0]!
  return near.far < 14 && view !== 'detail' ? near.target : null
}

function lineOf(sign: Sign, zone: Zone, figureView: FigureView, inMiddle: boolean): Line | null {
  if (sign === 'swings' && figureView === 'side') return 'side-seam'
  if ((sign === 'rises' || sign === 'drops') && (zone === 'hem' || zone === 'waist')) {
    if (figureView === 'side') return 'side-seam'
    return inMiddle ? (figureView === 'back' ? 'centre-back' : 'centre-front') : figureView
  }
  return null
}

const mean = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length
