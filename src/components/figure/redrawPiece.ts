import { type ChangeStep, type Operation } from '#shared/fit/types.ts'
import { type Pt } from './figureShapes.ts'
import { type PieceShape } from './pieceShapes.ts'

/** The piece before and after one change, as paths on the drawing sheet. */
export type PieceDrawing = { old: string; next: string; slashes: string[]; hinges: Pt[]; arrows: { from: Pt; to: Pt }[]; dartsOld: string[]; dartsNew: string[]; label: Pt }

type Move = (p: Pt, edge: string, along: number) => Pt
/** Points drawn along each edge: enough for a smooth curve, few enough to stay fluid while the amount is turned. */
const samples = 16

/** How far an amount is drawn: enlarged so that 3 mm shows, held so that 10 cm stays on the sheet. */
export const drawnLength = (mm: number): number => Math.sign(mm) * Math.min(34, Math.max(9, Math.abs(mm) * 1.1))

const lerp = (a: Pt, b: Pt, t: number): Pt => [a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t]

/** Evenly spaced points along an edge: straight runs as they are, curves through the same smooth line as they are drawn with. */
function along(points: readonly Pt[], curved: boolean): Pt[] {
  const at = (i: number) => points[Math.min(points.length - 1, Math.max(0, i))]!
  return Array.from({ length: samples + 1 }, (_, i) => {
    const s = (i / samples) * (points.length - 1)
    const k = Math.min(points.length - 2, Math.floor(s))
    const t = s - k
    if (!curved) return lerp(at(k), at(k + 1), t)
    const [a, b, c, d] = [at(k - 1), at(k), at(k + 1), at(k + 2)]
    const axis = (n: 0 | 1) => 0.5 * (2 * b[n] + (c[n] - a[n]) * t + (2 * a[n] - 5 * b[n] + 4 * c[n] - d[n]) * t * t + (3 * b[n] - a[n] - 3 * c[n] + d[n]) * t ** 3)
    return [axis(0), axis(1)] as Pt
  })
}

/** Points along an edge as it is drawn. */
export const edgePoints = (edge: PieceShape['edges'][number]): Pt[] => along(edge.points, edge.curved === true)

/** How instructions call the edges of a drawing. */
const callings: readonly [edge: RegExp, said: RegExp][] = [
  [/^waist|^upper edge/, /top edge|upper edge|waist/], [/^centre/, /centre|fold edge/], [/^crotch/, /crotch|seat seam/], [/^neckline/, /neck/], [/^inseam/, /inseam|inside leg/], [/^side seam|^underarm/, /side ?seam|side|underarm/],
  [/^cap/, /cap/], [/^hem|^lower edge/, /hem|wrist|lower edge/], [/^shoulder/, /shoulder/], [/^armhole/, /arm/], [/^princess/, /princess/], [/^end|^front end/, /end/], [/^outer edge/, /outer/], [/^yoke seam/, /yoke seam/], [/^opening/, /opening/],
]
/** The edge an instruction names first, in the words of either; null where it names a line inside the piece. */
export function edgeOf(shape: PieceShape, words: string): string | null {
  const text = words.toLowerCase().replaceAll('-', ' ')
  const placed = shape.edges.flatMap(({ name }) => {
    const said = callings.find(([edge]) => edge.test(name))?.[1]
    const at = said ? text.search(said) : text.indexOf(name)
    return at < 0 ? [] : [{ name, at }]
  })
  return placed.toSorted((one, other) => one.at - other.at)[0]?.name ?? null
}
/** The height of the line an instruction means. */
function lineOf(shape: PieceShape, words: string): number {
  const text = words.toLowerCase()
  // The longest name wins: "back waist" lies above the "waist" edge.
  const found = Object.entries(shape.lines).filter(([name]) => text.includes(name)).toSorted(([one], [other]) => other.length - one.length)[0]
  const y = found?.[1] ?? shape.lines.lengthen ?? 300
  // A cut on the very edge would show nothing: it is drawn just inside.
  const [top, bottom] = [topOf(shape) + 6, bottomOf(shape) - 6]
  return Math.min(bottom - (bottom - top) * 0.14, Math.max(top + (bottom - top) * 0.1, y))
}

/** Draws one step of a change on a plain piece: old line, new line, where to slash and where the hinge is. */
export function redrawPiece(shape: PieceShape, operation: Operation, step: Pick<ChangeStep, 'edge' | 'amountMm' | 'taper'>): PieceDrawing {
  const by = drawnLength(step.amountMm)
  const { move, ...marks } = moveFor(shape, operation, step, by)
  const runs = shape.edges.map((edge) => ({ edge, points: along(edge.points, edge.curved === true) }))
  const oldPoints = runs.flatMap(({ points }) => points)
  const nextPoints = runs.flatMap(({ edge, points }) => points.map((p, i) => move(p, edge.name, i / samples)))
  const closed = (points: readonly Pt[]) => `M${points.map(([x, y]) => `${round(x)} ${round(y)}`).join('L')}Z`
  const legs = (apex: Pt, [a, b]: readonly [Pt, Pt]) => `M${round(a[0])} ${round(a[1])}L${round(apex[0])} ${round(apex[1])}L${round(b[0])} ${round(b[1])}`
  const free = (p: Pt): Pt => move(p, '', 0)
  return {
    old: closed(oldPoints), next: closed(nextPoints), slashes: marks.slashes ?? [], hinges: marks.hinges ?? [], arrows: marks.arrows ?? [], label: marks.label ?? shape.edges[0]!.points[0]!,
    dartsOld: shape.darts.map(({ apex, feet }) => legs(apex, feet)),
    dartsNew: shape.darts.map(({ apex, feet }, i) => {
      const [a, b] = [free(feet[0]), free(feet[1])]
      const tip = operation === 'dart-apex' && i === 0 ? free([apex[0], apex[1] + by]) : free(apex)
      const wide = operation === 'dart-intake' && i === shape.darts.length - 1 ? by / 2 : 0
      return legs(tip, [lerp(a, b, -wide / Math.max(1, Math.hypot(b[0] - a[0], b[1] - a[1]))), lerp(b, a, -wide / Math.max(1, Math.hypot(b[0] - a[0], b[1] - a[1])))])
    }),
  }
}

type Marks = { move: Move; slashes?: string[]; hinges?: Pt[]; arrows?: { from: Pt; to: Pt }[]; label?: Pt }
const round = (value: number) => Math.round(value * 10) / 10
const stay: Move = (p) => p
const rightAt = (shape: PieceShape, y: number) => Math.max(...shape.edges.flatMap(({ points, curved }) => along(points, curved === true)).filter((p) => Math.abs(p[1] - y) < 22).map(([x]) => x), 200)
const leftAt = (shape: PieceShape, y: number) => Math.min(...shape.edges.flatMap(({ points, curved }) => along(points, curved === true)).filter((p) => Math.abs(p[1] - y) < 22).map(([x]) => x), 100)
const topOf = (shape: PieceShape) => Math.min(...shape.edges.flatMap(({ points }) => points.map((p) => p[1]))) - 6
const bottomOf = (shape: PieceShape) => Math.max(...shape.edges.flatMap(({ points }) => points.map((p) => p[1]))) + 6
const path = (...points: Pt[]) => `M${points.map(([x, y]) => `${round(x)} ${round(y)}`).join('L')}`

function moveFor(shape: PieceShape, operation: Operation, step: Pick<ChangeStep, 'edge' | 'amountMm' | 'taper'>, by: number): Marks {
  const y = lineOf(shape, step.edge)
  const [left, right] = [leftAt(shape, y), rightAt(shape, y)]
  switch (operation) {
    case 'lengthen': return { move: (p) => (p[1] > y ? [p[0], p[1] + by] : p), slashes: [path([left - 6, y], [right + 6, y])], arrows: [{ from: [right + 20, y], to: [right + 20, y + by] }], label: [right + 28, y + by / 2 + 4] }
    case 'slash-hinge': {
      // Full at the named edge, nothing at the hinge across; a small turn is drawn as a shear.
      const at = edgeOf(shape, step.edge)
      const fullLeft = at === null || (shape.edges.find(({ name }) => name === at)?.points[0]?.[0] ?? 0) < 130
      const share = (x: number) => Math.min(1, Math.max(0, fullLeft ? (right - x) / (right - left) : (x - left) / (right - left)))
      const open: Pt = fullLeft ? [left, y] : [right, y]
      return { move: (p) => (p[1] > y ? [p[0], p[1] + by * share(p[0])] : p), slashes: [path([left, y], [right, y])], hinges: [fullLeft ? [right, y] : [left, y]], arrows: [{ from: [open[0], y], to: [open[0], y + by] }], label: [fullLeft ? left - 46 : right + 10, y + by / 2 + 4] }
    }
    case 'spread': {
      const x = (left + right) / 2
      return { move: (p) => (p[0] > x ? [p[0] + by, p[1]] : p), slashes: [path([x, topOf(shape)], [x, bottomOf(shape)])], arrows: [{ from: [x, bottomOf(shape) + 8], to: [x + by, bottomOf(shape) + 8] }], label: [x + by + 8, bottomOf(shape) + 14] }
    }
    case 'full-bust': {
      const apex = shape.apex ?? [(left + right) / 2, y]
      const hinge: Pt = [198, 160]
      const share = (p: Pt) => Math.min(1, Math.max(0, (p[1] - hinge[1]) / (apex[1] - hinge[1])))
      return {
        move: (p) => (p[0] > apex[0] - 2 ? [p[0] + by * share(p), p[1] + by * 0.35 * share(p)] : p[1] > apex[1] ? [p[0], p[1] + by * 0.35] : p),
        slashes: [path([apex[0], 374], apex, hinge), path(apex, [240, 246])], hinges: [hinge], arrows: [{ from: [242, 214], to: [242 + by, 214 + by * 0.35] }], label: [242 + Math.max(by, 0) + 4, 206],
      }
    }
    case 'shoulder-slope': case 'shoulder-forward':
      return { move: (p, edge, t) => (edge === 'shoulder' ? [p[0], p[1] + by * t] : edge === 'armhole' ? [p[0], p[1] + by * (1 - t * 0.35)] : p), hinges: [shape.edges.find(({ name }) => name === 'shoulder')?.points[0] ?? [110, 60]], arrows: [{ from: [212, 90], to: [212, 90 + by] }], label: [220, 96 + by / 2] }
    case 'curve-depth': {
      const edge = edgeOf(shape, step.edge)
      return { move: (p, name, t) => (name === edge ? shift(p, shape, name, t, -by * Math.sin(Math.PI * t)) : p), ...edgeMarks(shape, edge, -by) }
    }
    case 'crotch-extension': return { move: (p, name, t) => (name === 'inseam' ? [p[0] - by * t * t, p[1]] : name === 'crotch curve' ? [p[0] - by * (1 - t) ** 2, p[1]] : p), arrows: [{ from: [leftAt(shape, 192), 204], to: [leftAt(shape, 192) - by, 204] }], label: [leftAt(shape, 192) - 16, 224] }
    case 'sleeve-biceps': return { move: (p) => [p[0] + (p[0] > 150 ? 1 : -1) * (by / 2) * Math.min(1, Math.max(0, (p[1] - 60) / 100)) * (1 - 0.7 * Math.min(1, Math.max(0, (p[1] - 160) / 216))), p[1]], slashes: [path([150, 52], [150, 376]), path([38, 160], [262, 160])], hinges: [[38, 160], [262, 160]], arrows: [{ from: [262, 172], to: [262 + by / 2, 172] }], label: [230, 196] }
    case 'dart-apex': case 'dart-intake': case 'dart-rotate': case 'point-move': {
      const dart = operation === 'dart-intake' ? shape.darts.at(-1) : shape.darts[0]
      const from = dart?.apex ?? shape.apex ?? [150, 200]
      return operation === 'dart-intake' ? { move: stay, label: dart ? [dart.feet[1][0] + 8, dart.feet[1][1] - 14] : from } : { move: stay, arrows: [{ from, to: [from[0], from[1] + by] }], label: [from[0] + 14, from[1] + by / 2] }
    }
    case 'unfold': case 'elastic-length': case 'none': case 'seam-shift': {
      const edge = edgeOf(shape, step.edge)
      if (!edge || operation === 'unfold' || operation === 'none') return { move: stay }
      const profile = profileOf(shape, edge, step.taper ?? '')
      return { move: (p, name, t) => (name === edge ? shift(p, shape, name, t, by * profile(t)) : neighbour(shape, edge, name, p, t, by, profile)), ...edgeMarks(shape, edge, by) }
    }
  }
}

/** A point moved square to its edge; the outside is at the left of the way it runs, seen with y down. */
function shift(p: Pt, shape: PieceShape, name: string, t: number, by: number): Pt {
  const edge = shape.edges.find((one) => one.name === name)!
  const points = along(edge.points, edge.curved === true)
  const i = Math.round(t * samples)
  const [a, b] = [points[Math.max(0, i - 1)]!, points[Math.min(samples, i + 1)]!]
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]) || 1
  return [p[0] + ((b[1] - a[1]) / length) * by, p[1] - ((b[0] - a[0]) / length) * by]
}
/** Full where nothing else is said; to nothing at the end whose neighbour the words name. */
function profileOf(shape: PieceShape, edge: string, taper: string): (t: number) => number {
  const end = taper ? edgeOf(shape, taper) : null
  const at = shape.edges.findIndex(({ name }) => name === edge)
  if (end && end === shape.edges[(at + 1) % shape.edges.length]!.name) return (t) => 1 - t
  if (end && end === shape.edges.at(at - 1)!.name) return (t) => t
  // To nothing at a line or at both ends: fullest in the middle.
  return taper ? (t) => Math.sin(Math.PI * Math.min(1, Math.max(0, t))) : () => 1
}
/** Ends of the neighbouring edges follow, so that the outline stays closed. */
function neighbour(shape: PieceShape, moved: string, name: string, p: Pt, t: number, by: number, profile: (t: number) => number): Pt {
  const at = shape.edges.findIndex((one) => one.name === moved)
  const edge = shape.edges[at]!
  const next = shape.edges[(at + 1) % shape.edges.length]!.name
  const before = shape.edges.at(at - 1)!.name
  const ease = 0.5
  if (name === next && t < ease) { const [x, y] = shift(edge.points.at(-1)!, shape, moved, 1, by * profile(1)); const k = 1 - t / ease; return [p[0] + (x - edge.points.at(-1)![0]) * k, p[1] + (y - edge.points.at(-1)![1]) * k] }
  if (name === before && t > 1 - ease) { const [x, y] = shift(edge.points[0]!, shape, moved, 0, by * profile(0)); const k = (t - (1 - ease)) / ease; return [p[0] + (x - edge.points[0]![0]) * k, p[1] + (y - edge.points[0]![1]) * k] }
  return p
}
function edgeMarks(shape: PieceShape, name: string | null, by: number): Pick<Marks, 'arrows' | 'label'> {
  const edge = shape.edges.find((one) => one.name === name)
  if (!edge) return {}
  const from = along(edge.points, edge.curved === true)[samples / 2]!
  const to = shift(from, shape, edge.name, 0.5, by)
  return { arrows: [{ from, to }], label: [Math.min(246, Math.max(6, (from[0] > 150 ? Math.max(from[0], to[0]) + 8 : Math.min(from[0], to[0]) - 50))), from[1] > 340 ? Math.max(from[1], to[1]) + 22 : from[1] - 8] }
}

/** The grainline with its two heads. */
export const grainPath = ([a, b]: readonly [Pt, Pt]): string => {
  const down = Math.abs(b[1] - a[1]) > Math.abs(b[0] - a[0])
  const head = (p: Pt, way: 1 | -1) => (down ? path([p[0] - 4, p[1] + way * 9], p, [p[0] + 4, p[1] + way * 9]) : path([p[0] + way * 9, p[1] - 4], p, [p[0] + way * 9, p[1] + 4]))
  return `${path(a, b)}${head(a, 1)}${head(b, -1)}`
}
