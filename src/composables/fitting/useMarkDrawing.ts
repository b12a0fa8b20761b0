import { computed, type Ref, shallowRef } from 'vue'
import { distance, finishPoints, type MarkKind, type MarkShape, type Px } from './markGeometry.ts'

export type MarkTool = { kind: MarkKind; shape: MarkShape }
export type FinishedMark = { kind: MarkKind; shape: MarkShape; points: Px[] }

/** A press that moved less than this is a touch, not a stroke; in picture pixels at zoom 1. */
const strokePx = 8

/**
 * Putting one mark on: drag from end to end, or touch where it starts and then where it ends. A point needs one touch; an area is drawn
 * round, or touched corner by corner and closed at its first corner. The same steps serve finger, mouse and the crosshair of the keyboard.
 * Points are picture pixels.
 */
export function useMarkDrawing(tool: Ref<MarkTool | null>, onFinish: (mark: FinishedMark) => void) {
  const points = shallowRef<readonly Px[]>([])
  /** the free end: where the pointer is now */
  const hover = shallowRef<Px | null>(null)
  let pressed: Px | null = null
  let strokeLength = 0

  const drawing = computed(() => points.value.length > 0)
  const draft = computed<FinishedMark | null>(() => {
    if (!tool.value || points.value.length === 0) return null
    const run = hover.value && tool.value.shape !== 'point' ? [...points.value, hover.value] : [...points.value]
    return { ...tool.value, points: tool.value.shape === 'stroke' && tool.value.kind !== 'drag-line' && run.length > 2 ? [run[0]!, run.at(-1)!] : run }
  })

  function finish(run: readonly Px[]) {
    const { kind, shape } = tool.value!
    const kept = finishPoints(kind, shape, run)
    cancel()
    const enough = shape === 'point' ? 1 : shape === 'area' ? 3 : 2
    if (kept.length >= enough) onFinish({ kind, shape, points: kept })
  }

  /** Sets a point: the first, the last, or a corner of an area. */
  function touch(p: Px, zoom = 1) {
    if (!tool.value) return
    const first = points.value[0]
    if (tool.value.shape === 'point') return finish([p])
    if (!first) {
      points.value = [p]
      hover.value = null
    } else if (tool.value.shape === 'area') {
      if (points.value.length >= 3 && distance(first, p) * zoom < 16) finish(points.value)
      else points.value = [...points.value, p]
    } else if (distance(first, p) * zoom > 4) finish([...points.value, p])
  }

  function press(p: Px) {
    if (!tool.value) return
    pressed = p
    strokeLength = 0
    if (points.value.length === 0 && tool.value.shape !== 'area') points.value = [p]
  }
  function move(run: readonly Px[], zoom = 1) {
    const last = run.at(-1)
    if (!tool.value || !last) return
    if (!pressed) {
      if (drawing.value) hover.value = last
      return
    }
    for (const p of run) strokeLength += distance(points.value.at(-1) ?? pressed, p)
    if (distance(pressed, last) * zoom < strokePx && strokeLength * zoom < strokePx) return
    const follows = tool.value.shape === 'area' || tool.value.kind === 'drag-line'
    if (follows) {
      points.value = [...(points.value.length === 0 ? [pressed] : points.value), ...run]
      hover.value = null
    } else hover.value = last
  }
  function release(p: Px, zoom = 1) {
    const start = pressed
    pressed = null
    if (!tool.value || !start) return
    const stroked = distance(start, p) * zoom >= strokePx || strokeLength * zoom > strokePx * 3
    if (stroked && tool.value.shape !== 'point') return finish([...points.value, p])
    // A touch: the press already set the first point of a stroke; the second touch ends it.
    if (points.value.length === 1 && points.value[0] === start && tool.value.shape !== 'point') {
      hover.value = null
      return
    }
    if (tool.value.shape === 'point') points.value = []
    touch(p, zoom)
  }
  function cancel() {
    points.value = []
    hover.value = null
    pressed = null
  }

  return { draft, drawing, press, move, release, touch, cancel, hoverAt: (p: Px | null) => { if (drawing.value) hover.value = p } }
}
