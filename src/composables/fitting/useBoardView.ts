import { computed, type MaybeRefOrGetter, shallowRef, toValue, watch } from 'vue'
import { type Px, type Size } from './markGeometry.ts'

/** Zoom (1 = the whole picture fits) and where the picture's corner stands on the board, screen pixels. */
export type BoardView = { scale: number; x: number; y: number }
export const zoomLimits = { least: 1, most: 8 } as const

const hold = (value: number, least: number, most: number) => Math.min(most, Math.max(least, value))

/** The picture as it fits a board, kept in proportion. */
export function fitSize(picture: Size, board: Size): Size {
  if (picture.width <= 0 || picture.height <= 0) return { width: board.width, height: board.height }
  const scale = Math.min(board.width / picture.width, board.height / picture.height)
  return { width: picture.width * scale, height: picture.height * scale }
}

/** A view held so that the picture never leaves the board: centred where it is smaller, edge to edge where it is larger. */
export function heldView(view: BoardView, fit: Size, board: Size): BoardView {
  const scale = hold(view.scale, zoomLimits.least, zoomLimits.most)
  const axis = (at: number, picture: number, room: number) => (picture <= room ? (room - picture) / 2 : hold(at, room - picture, 0))
  return { scale, x: axis(view.x, fit.width * scale, board.width), y: axis(view.y, fit.height * scale, board.height) }
}

/** The view after zooming by a factor with one spot of the board kept under the finger. */
export function zoomedAt(view: BoardView, spot: Px, factor: number): BoardView {
  const scale = hold(view.scale * factor, zoomLimits.least, zoomLimits.most)
  const k = scale / view.scale
  return { scale, x: spot[0] - (spot[0] - view.x) * k, y: spot[1] - (spot[1] - view.y) * k }
}

/** Zoom and pan of one photograph. Points of marks live in pixels of the fitted picture, so neither ever touches them. */
export function useBoardView(picture: MaybeRefOrGetter<Size>, board: MaybeRefOrGetter<Size>) {
  const fit = computed(() => fitSize(toValue(picture), toValue(board)))
  const view = shallowRef<BoardView>({ scale: 1, x: 0, y: 0 })
  const set = (next: BoardView) => { view.value = heldView(next, fit.value, toValue(board)) }

  watch(fit, (now, before) => {
    // The board changed its size: what was in the middle stays there.
    const k = before && before.width > 0 ? now.width / before.width : 1
    set({ scale: view.value.scale, x: view.value.x * k, y: view.value.y * k })
  }, { immediate: true })

  return {
    view, fit,
    reset: () => set({ scale: 1, x: 0, y: 0 }),
    pan: (dx: number, dy: number) => set({ ...view.value, x: view.value.x + dx, y: view.value.y + dy }),
    zoom: (factor: number, spot?: Px) => set(zoomedAt(view.value, spot ?? [toValue(board).width / 2, toValue(board).height / 2], factor)),
    /** brings a spot of the fitted picture into the board, if it is outside */
    show: ([x, y]: Px, marginPx = 48) => {
      const { scale, x: vx, y: vy } = view.value
      const room = toValue(board)
      const [sx, sy] = [vx + x * scale, vy + y * scale]
      set({ scale, x: vx + hold(sx, marginPx, room.width - marginPx) - sx, y: vy + hold(sy, marginPx, room.height - marginPx) - sy })
    },
    toPicture: ([x, y]: Px): Px => [(x - view.value.x) / view.value.scale, (y - view.value.y) / view.value.scale],
    toBoard: ([x, y]: Px): Px => [view.value.x + x * view.value.scale, view.value.y + y * view.value.scale],
  }
}
