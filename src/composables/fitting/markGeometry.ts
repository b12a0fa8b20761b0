import { type Mark } from '#shared/contracts/fitting.ts'

/** [x, y] in picture pixels (the picture as it fits the board), y down. */
export type Px = readonly [number, number]
export type MarkKind = Mark['kind']
export type MarkShape = Mark['shape']

/** What is drawn of a mark: an open line, what is dashed of it, and nothing filled. */
export type MarkPaths = { solid: string; dashed: string }

const round = (value: number) => Math.round(value * 10) / 10
const at = ([x, y]: Px) => `${round(x)} ${round(y)}`
const line = (...points: Px[]) => `M${points.map(at).join('L')}`
const add = ([x, y]: Px, [dx, dy]: Px, k = 1): Px => [x + dx * k, y + dy * k]
const between = (a: Px, b: Px, t: number): Px => [a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t]
export const distance = (a: Px, b: Px): number => Math.hypot(a[0] - b[0], a[1] - b[1])

/** Unit vector from a to b and its left-hand normal; straight down where both are one point. */
function frame(a: Px, b: Px): { along: Px; across: Px; length: number } {
  const length = distance(a, b)
  if (length < 1e-6) return { along: [0, 1], across: [-1, 0], length: 0 }
  const along: Px = [(b[0] - a[0]) / length, (b[1] - a[1]) / length]
  return { along, across: [-along[1], along[0]], length }
}

function arrowHead(tip: Px, from: Px, size: number): string {
  const { along, across } = frame(from, tip)
  const back = add(tip, along, -size * 0.87)
  return line(add(back, across, size * 0.5), tip, add(back, across, -size * 0.5))
}

const ring = ([x, y]: Px, r: number) => `M${at([x - r, y])}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0`
const polyline = (points: readonly Px[]) => line(...points)
/** Arrow size for a stroke this long: in proportion, within what reads well on a phone. */
const arrowSize = (length: number) => Math.min(26, Math.max(10, length * 0.18))

/** Three strokes fanning out from an arrowhead; the last point is where the cloth is caught. */
function dragLine(points: readonly Px[]): MarkPaths {
  const tail = points[0]!
  const head = points.at(-1)!
  const { along, across, length } = frame(tail, head)
  const sideStroke = (way: 1 | -1) => {
    const outer = add(add(tail, along, length * (way > 0 ? 0.1 : 0.17)), across, way * length * 0.19)
    const inner = add(add(tail, along, length * 0.64), across, way * length * 0.1)
    return line(outer, inner)
  }
  return { solid: polyline(points) + arrowHead(head, points.at(-2) ?? tail, arrowSize(length)) + sideStroke(1) + sideStroke(-1), dashed: '' }
}

/** The edge and a bowed edge with a bar between; it bows to the right of the way it was drawn. */
function gape(a: Px, b: Px): MarkPaths {
  const { across, length } = frame(a, b)
  const middle = between(a, b, 0.5)
  const bow = (k: number) => `M${at(a)}Q${at(add(middle, across, -length * k))} ${at(b)}`
  return { solid: bow(0.14) + bow(0.6) + line(add(middle, across, -length * 0.07), add(middle, across, -length * 0.3)), dashed: '' }
}

/** Two arrows pressing against a bar half way. */
function tight(a: Px, b: Px): MarkPaths {
  const { along, across, length } = frame(a, b)
  const middle = between(a, b, 0.5)
  const bar = Math.max(14, length * 0.2)
  const gap = Math.max(5, length * 0.1)
  const left = add(middle, along, -gap)
  const right = add(middle, along, gap)
  const size = arrowSize(length)
  return { solid: line(add(middle, across, bar), add(middle, across, -bar)) + line(a, left) + line(b, right) + arrowHead(left, a, size) + arrowHead(right, b, size), dashed: '' }
}

/** A hatched lens along the fold. */
function excess(a: Px, b: Px): MarkPaths {
  const { along, across, length } = frame(a, b)
  const half = Math.max(7, length * 0.12)
  const middle = between(a, b, 0.5)
  const lens = `M${at(a)}Q${at(add(middle, across, half * 2))} ${at(b)}Q${at(add(middle, across, -half * 2))} ${at(a)}Z`
  const hatch = [0.2, 0.35, 0.5, 0.65, 0.8].map((t) => {
    const reach = half * 4 * t * (1 - t) * 0.9
    const foot = between(a, b, t)
    return line(add(add(foot, across, reach), along, -reach * 0.4), add(add(foot, across, -reach), along, reach * 0.4))
  })
  return { solid: lens + hatch.join(''), dashed: '' }
}

/** A line between two end bars; the arrow shows the way the edge should move. */
function lengthMark(a: Px, b: Px): MarkPaths {
  const { across, length } = frame(a, b)
  const bar = Math.min(25, Math.max(12, length * 0.3))
  const ends = [a, b].map((p) => line(add(p, across, bar), add(p, across, -bar))).join('')
  return { solid: line(a, b) + ends + arrowHead(b, a, arrowSize(length * 1.6)), dashed: '' }
}

/** A dash-dot plumb line below the pivot, and the line as it really runs. */
function balance(a: Px, b: Px): MarkPaths {
  const plumbLength = Math.max(distance(a, b), 20)
  return { solid: line(a, b) + ring(a, 7), dashed: line(a, [a[0], a[1] + plumbLength]) }
}

/** A crossed ring, and an arrow to the right place. */
function place(a: Px, b: Px): MarkPaths {
  const r = 10
  const { along, length } = frame(a, b)
  const cross = ring(a, r) + line([a[0] - 6, a[1]], [a[0] + 6, a[1]]) + line([a[0], a[1] - 6], [a[0], a[1] + 6])
  if (length < r * 1.5) return { solid: cross, dashed: '' }
  return { solid: cross + line(add(a, along, r), b) + arrowHead(b, a, arrowSize(length)), dashed: '' }
}

/** A single point: the crossed ring, whatever was seen there. */
const pointMark = (p: Px): MarkPaths => ({ solid: ring(p, 9) + line([p[0] - 13, p[1]], [p[0] + 13, p[1]]) + line([p[0], p[1] - 13], [p[0], p[1] + 13]), dashed: '' })

/** An area: its outline, closed, with a few hatches where cloth is spare. */
const areaMark = (points: readonly Px[]): MarkPaths => ({ solid: points.length > 2 ? `${polyline(points)}Z` : polyline(points), dashed: '' })

/** Strokes of a mark in picture pixels; needs one point, two to be more than a dot. */
export function markPaths(kind: MarkKind, shape: MarkShape, points: readonly Px[]): MarkPaths {
  const first = points[0]
  if (!first) return { solid: '', dashed: '' }
  if (shape === 'area') return areaMark(points)
  if (shape === 'point' || points.length === 1) return pointMark(first)
  const last = points.at(-1)!
  switch (kind) {
    case 'drag-line': return dragLine(points)
    case 'gape': return gape(first, last)
    case 'tight': return tight(first, last)
    case 'excess': return excess(first, last)
    case 'length': return lengthMark(first, last)
    case 'balance': return balance(first, last)
    case 'place': return place(first, last)
  }
}

/** Where the pin with the number goes: beside the start, outside the mark. */
export function pinAnchor(kind: MarkKind, shape: MarkShape, points: readonly Px[]): Px {
  const first = points[0] ?? [0, 0]
  if (shape === 'point' || points.length === 1) return add(first, [20, -16])
  if (shape === 'area') return points.reduce((top, p) => (p[1] < top[1] ? p : top), first)
  const last = points.at(-1)!
  const { across, along, length } = frame(first, last)
  if (kind === 'tight') {
    const bar = add(between(first, last, 0.5), across, Math.max(14, length * 0.2) + 16)
    const other = add(between(first, last, 0.5), across, -(Math.max(14, length * 0.2) + 16))
    return bar[1] < other[1] ? bar : other
  }
  if (kind === 'length') return add(between(first, last, 0.5), [34, 0])
  if (kind === 'balance') return add(first, [0, -24])
  // Clear of the handle at the start, which is a target of its own.
  return add(first, along, -26)
}

/** Shortest way from a point to the drawn stroke, in the same pixels. */
export function distanceToMark(p: Px, shape: MarkShape, points: readonly Px[]): number {
  const corners = shape === 'area' && points.length > 2 ? [...points, points[0]!] : points
  if (corners.length === 1) return distance(p, corners[0]!)
  return Math.min(...corners.slice(1).map((b, i) => {
    const a = corners[i]!
    const square = distance(a, b) ** 2
    const t = square === 0 ? 0 : Math.min(1, Math.max(0, ((p[0] - a[0]) * (b[0] - a[0]) + (p[1] - a[1]) * (b[1] - a[1])) / square))
    return distance(p, between(a, b, t))
  }))
}

/**
 * Fewer points with the same run: those nearer than the tolerance to the line between their neighbours go.
 * Ends stay. Source: Douglas and Peucker 1973.
 */
export function thinStroke(points: readonly Px[], tolerancePx: number): Px[] {
  if (points.length < 3) return [...points]
  const first = points[0]!
  const last = points.at(-1)!
  let far = 0
  let index = 0
  points.slice(1, -1).forEach((p, i) => {
    const d = distanceToMark(p, 'stroke', [first, last])
    if (d > far) [far, index] = [d, i + 1]
  })
  if (far <= tolerancePx) return [first, last]
  return [...thinStroke(points.slice(0, index + 1), tolerancePx).slice(0, -1), ...thinStroke(points.slice(index), tolerancePx)]
}

/** Points a finished mark keeps: drag lines their run, areas their outline, all others two ends. */
export function finishPoints(kind: MarkKind, shape: MarkShape, drawn: readonly Px[]): Px[] {
  if (shape === 'point') return drawn.slice(0, 1)
  if (shape === 'area') return thinStroke(drawn, 3).slice(0, 200)
  if (kind === 'drag-line') return thinStroke(drawn, 6).slice(0, 200)
  return drawn.length < 2 ? [...drawn] : [drawn[0]!, drawn.at(-1)!]
}

export type Size = { width: number; height: number }
/** Picture pixels to fractions of the picture, held inside it. */
export const toFractions = (points: readonly Px[], size: Size): [number, number][] =>
  points.map(([x, y]) => [hold(x / size.width), hold(y / size.height)])
export const toPixels = (points: readonly (readonly [number, number])[], size: Size): Px[] => points.map(([x, y]) => [x * size.width, y * size.height])
/** Four decimals are a third of a pixel on the largest stored picture. */
const hold = (fraction: number) => Math.round(Math.min(1, Math.max(0, fraction)) * 1e4) / 1e4

/** The same mark moved as a whole, as far as it stays inside the picture. */
export function moveMark(points: readonly (readonly [number, number])[], by: readonly [number, number]): [number, number][] {
  const free = (axis: 0 | 1) => {
    const low = Math.min(...points.map((p) => p[axis]))
    const high = Math.max(...points.map((p) => p[axis]))
    return Math.min(1 - high, Math.max(-low, by[axis]))
  }
  const [dx, dy] = [free(0), free(1)]
  return points.map(([x, y]) => [hold(x + dx), hold(y + dy)])
}
