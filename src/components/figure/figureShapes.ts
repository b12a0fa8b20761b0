/**
 * One figure in three views on a sheet of 200 × 400, drawn by us from points; the same shapes serve picking, drawings of signs and
 * print. Halves of front and back are mirrored about x = 100. The side view faces left.
 */
import { type GarmentKind } from '#shared/fit/types.ts'

export type FigureView = 'front' | 'back' | 'side'
export type Pt = readonly [number, number]
export const figureSize = { width: 200, height: 400 } as const
const middle = 100

const r = (value: number) => Math.round(value * 10) / 10

/** A smooth run through points (Catmull–Rom as Béziers); closed when asked. */
export function smoothPath(points: readonly Pt[], closed = false): string {
  const at = (i: number): Pt => (closed ? points[(i + points.length) % points.length]! : points[Math.min(points.length - 1, Math.max(0, i))]!)
  const spans = closed ? points.length : points.length - 1
  let d = `M${r(points[0]![0])} ${r(points[0]![1])}`
  for (let i = 0; i < spans; i++) {
    const [a, b, c, e] = [at(i - 1), at(i), at(i + 1), at(i + 2)]
    d += `C${r(b[0] + (c[0] - a[0]) / 6)} ${r(b[1] + (c[1] - a[1]) / 6)} ${r(c[0] - (e[0] - b[0]) / 6)} ${r(c[1] - (e[1] - b[1]) / 6)} ${r(c[0])} ${r(c[1])}`
  }
  return closed ? `${d}Z` : d
}
const straight = (points: readonly Pt[], closed = false) => `M${points.map(([x, y]) => `${r(x)} ${r(y)}`).join('L')}${closed ? 'Z' : ''}`

/** Half outlines as distance from the middle and height. */
const half = (points: readonly Pt[], way: 1 | -1): Pt[] => points.map(([dx, y]) => [middle + way * dx, y])
const both = (points: readonly Pt[]): Pt[] => [...half(points, 1), ...half(points, -1).toReversed()]

const halfBody: readonly Pt[] = [
  [6, 46], [6.5, 55], [9, 60], [22, 65], [34, 70], [40, 78], [44, 104], [48, 136], [54, 166], [58, 190], [59, 206], [54, 212], [50, 202], [49, 190], [44, 164], [38, 136], [34.5, 112],
]
const halfTrunk: readonly Pt[] = [
  [32.5, 100], [33, 112], [30, 127], [25.5, 147], [28, 164], [35, 188], [35.5, 210], [33, 240], [26, 285], [25, 312], [16, 366], [20, 382], [8, 385], [6, 366], [7, 312], [6.5, 285], [3, 232], [0.5, 212],
]
const sideBody: readonly Pt[] = [
  [95, 46], [95, 56], [89, 66], [81, 92], [74, 112], [79, 128], [84, 147], [79, 168], [80, 190], [82, 222], [88, 286], [92, 320], [95, 366], [78, 382], [80, 386], [108, 386], [106, 366], [113, 316], [107, 286],
  [115, 232], [119, 212], [125, 190], [113, 148], [119, 120], [121, 96], [114, 70], [107, 58], [107, 46],
]
const sideArm: readonly Pt[] = [[104, 72], [95, 82], [95, 112], [98, 142], [94, 176], [92, 202], [97, 211], [103, 202], [105, 178], [110, 144], [113, 112], [113, 84]]

/** Body lines drawn quietly behind the garment. */
export function bodyPaths(view: FigureView): { head: { cx: number; cy: number; rx: number; ry: number }; lines: string[] } {
  if (view === 'side') return { head: { cx: 99, cy: 30, rx: 16, ry: 18 }, lines: [smoothPath(sideBody, true), smoothPath(sideArm, true)] }
  return { head: { cx: 100, cy: 30, rx: 14, ry: 18 }, lines: [smoothPath(half(halfBody, 1)), smoothPath(half(halfBody, -1)), smoothPath(half(halfTrunk, 1)), smoothPath(half(halfTrunk, -1))] }
}

export type GarmentCut = { top: boolean; skirt: boolean; trousers: boolean; sleeves: boolean; hemY: number }
const cuts: Record<GarmentKind, GarmentCut> = {
  bodice: { top: true, skirt: false, trousers: false, sleeves: false, hemY: 186 },
  shirt: { top: true, skirt: false, trousers: false, sleeves: true, hemY: 206 },
  jacket: { top: true, skirt: false, trousers: false, sleeves: true, hemY: 214 },
  coat: { top: true, skirt: true, trousers: false, sleeves: true, hemY: 312 },
  dress: { top: true, skirt: true, trousers: false, sleeves: false, hemY: 292 },
  skirt: { top: false, skirt: true, trousers: false, sleeves: false, hemY: 286 },
  trousers: { top: false, skirt: false, trousers: true, sleeves: false, hemY: 366 },
}
/** What the figure wears for a kind of garment; without one, a dress with sleeves and the legs free, so that every zone shows. */
export const garmentCut = (kind: GarmentKind | null): GarmentCut => (kind ? cuts[kind] : { top: true, skirt: false, trousers: true, sleeves: true, hemY: 366 })

/** Half width of the garment at a height. */
function skirtHalf(hemY: number): Pt[] {
  return [[26.5, 146], [30, 162], [37, 188], [38.5, 212], [41, hemY]]
}
/** The upper part from the side, down to the waist or over the hip. */
function sideTop(hemY: number): string {
  const front: Pt[] = [[92, 62], [82, 88], [72.5, 112], [78, 130], [83, 148]]
  const back: Pt[] = [[113, 148], [121, 118], [122, 96], [113, 68], [108, 60]]
  if (hemY > 150) {
    front.push([77, 168], [77.5, hemY])
    back.unshift([127, hemY], [126, 190])
  }
  return `${smoothPath(front)}L${smoothPath(back).slice(1)}Z`
}
const trouserHalf: readonly Pt[] = [[26.5, 146], [30, 162], [37, 188], [37.5, 212], [34, 250], [29, 288], [27, 366]]

/** Outlines of the garment, each a closed path, and its seams and darts, each a line. */
export function garmentPaths(view: FigureView, kind: GarmentKind | null): { shapes: string[]; seams: string[] } {
  const cut = garmentCut(kind)
  const shapes: string[] = []
  const seams: string[] = []
  if (view === 'side') {
    if (cut.skirt) shapes.push(straight([[83, 147], [114, 147], [126, 190], [128, cut.hemY], [73, cut.hemY], [78, 190], [78, 168]], true))
    if (cut.trousers) shapes.push(straight([[83, 147], [114, 147], [126.5, 190], [120, 214], [117, 250], [111, 290], [111, 366], [86, 366], [86, 290], [80, 222], [78, 170]], true))
    if (cut.top) shapes.push(sideTop(cut.skirt ? 148 : Math.min(cut.hemY, 214)))
    if (cut.sleeves) shapes.push(smoothPath([[104, 70], [94, 82], [94, 112], [96, 142], [92, 176], [91, 196], [105, 197], [107, 176], [112, 144], [115, 112], [114, 84]], true))
    else if (cut.top) seams.push(smoothPath([[102, 68], [94, 80], [96, 98], [104, 106], [112, 98], [114, 80], [106, 68]]))
    seams.push(straight([[100, cut.top ? 106 : 147], [100, cut.hemY]]))
    return { shapes, seams }
  }
  const neckY = view === 'front' ? 80 : 66
  const topHem = cut.skirt ? 147 : Math.min(cut.hemY, 214)
  if (cut.skirt) shapes.push(straight(both(skirtHalf(cut.hemY)), true))
  if (cut.trousers) shapes.push(straight([...half(trouserHalf, 1), [middle + 6, 366], [middle + 5, 288], [middle, 214], [middle - 5, 288], [middle - 6, 366], ...half(trouserHalf, -1).toReversed()], true))
  if (cut.top) {
    const side: Pt[] = topHem < 150 ? [[34, 104], [34.5, 113], [31, 128], [27, 147]] : [[34, 104], [34.5, 113], [31.5, 128], [27.5, 147], [30.5, 164], [36.5, Math.min(188, topHem)], [37.5, topHem]]
    const armhole: Pt[] = [[32, 71], [29, 84], [30, 96], [34, 104]]
    const run = (way: 1 | -1) => [...half([[11, 61], [32, 71]], way), ...half(armhole.slice(1), way), ...half(side.slice(1), way)]
    const neck = `C${middle - 9} ${neckY - 4} ${middle - 6} ${neckY} ${middle} ${neckY}C${middle + 6} ${neckY} ${middle + 9} ${neckY - 4} ${middle + 11} 61Z`
    const [right, left] = [run(1), run(-1).toReversed()]
    shapes.push(`${straight([...right, ...left])}${neck}`)
    if (view === 'front') seams.push(...([1, -1] as const).map((way) => straight(half([[33, 122], [15, 114]], way))))
    seams.push(...([1, -1] as const).map((way) => straight(half([[13, 147], [14.5, 124]], way))))
  }
  if (cut.sleeves) for (const way of [1, -1] as const) shapes.push(smoothPath(half([[32, 70], [40, 76], [45, 104], [50, 136], [56, 166], [60, 190], [49, 193], [43, 164], [38, 138], [34, 108], [30, 96], [29, 84]], way), true))
  if (!cut.top) seams.push(straight(half([[13, 147], [14.5, 168]], 1)), straight(half([[13, 147], [14.5, 168]], -1)))
  if (cut.skirt || cut.trousers) seams.push(straight([[middle - 27, 147], [middle + 27, 147]]))
  return { shapes, seams }
}
