import { type ChangeDrawing, type SignDrawing } from '#shared/fit/rule.ts'
import { figureSize, type Pt } from './figureShapes.ts'
import { type PieceShape } from './pieceShapes.ts'
import { edgePoints } from './redrawPiece.ts'
import { type FigureStroke } from './signStrokes.ts'

const onSheet = ([x, y]: readonly [number, number]): Pt => [x * figureSize.width, y * figureSize.height]

/** A rule's drawing of its sign in the figure's own measure: strokes and the part of the sheet to show. */
export function figureOf(drawing: SignDrawing): { view: SignDrawing['figure']; box: string; strokes: FigureStroke[] } {
  const [left, top, right, bottom] = drawing.region
  const strokes = drawing.strokes.map(({ kind, from, to, bend = 0 }): FigureStroke => {
    const [a, b] = [onSheet(from), onSheet(to)]
    if (kind === 'level') {
      const length = Math.hypot(b[0] - a[0], b[1] - a[1]) || 1
      const off = bend * figureSize.width
      // To the right of the way, y down.
      return { kind, points: [a, b, [(a[0] + b[0]) / 2 - ((b[1] - a[1]) / length) * off, (a[1] + b[1]) / 2 + ((b[0] - a[0]) / length) * off]] }
    }
    return { kind, points: [a, b] }
  })
  return { view: drawing.figure, box: `${left * figureSize.width} ${top * figureSize.height} ${(right - left) * figureSize.width} ${(bottom - top) * figureSize.height}`, strokes }
}

/** Marks of a rule's change on a plain piece: fractions of the piece's box become points of the drawing sheet. */
export function marksOn(shape: PieceShape, drawing: ChangeDrawing): { kind: ChangeDrawing['marks'][number]['kind']; from: Pt; to: Pt; label: string }[] {
  const points = shape.edges.flatMap((edge) => edge.points)
  const [left, right] = [Math.min(...points.map((p) => p[0])), Math.max(...points.map((p) => p[0]))]
  const [top, bottom] = [Math.min(...points.map((p) => p[1])), Math.max(...points.map((p) => p[1]))]
  const place = ([x, y]: readonly [number, number]): Pt => [left + x * (right - left), top + y * (bottom - top)]
  return drawing.marks.map(({ kind, from, to, label = '' }) => ({ kind, from: onOutline(shape, place(from)), to: onOutline(shape, place(to)), label }))
}

/** An end meant to lie on the edge lies on it: outlines of drawings differ by a little. */
function onOutline(shape: PieceShape, p: Pt): Pt {
  const near = shape.edges.flatMap((edge) => edgePoints(edge)).map((q) => ({ q, far: Math.hypot(q[0] - p[0], q[1] - p[1]) })).toSorted((a, b) => a.far - b.far)[0]!
  return near.far < 22 ? near.q : p
}
