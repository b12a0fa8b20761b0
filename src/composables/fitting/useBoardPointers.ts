import { onScopeDispose, ref, type Ref } from 'vue'
import { type useBoardView } from './useBoardView.ts'
import { distance, type Px } from './markGeometry.ts'
import { type useMarkDrawing } from './useMarkDrawing.ts'

type Options = {
  board: Ref<HTMLElement | null>
  view: ReturnType<typeof useBoardView>
  drawing: ReturnType<typeof useMarkDrawing>
  /** true while a mark is to be put on */
  canDraw: () => boolean
  /** true while the hand tool is held: space */
  panHeld: () => boolean
  /** a touch on the picture that draws nothing, board pixels */
  onTap: (spot: Px) => void
}
const tapPx = 7

/**
 * Finger, pen and mouse on the board: one pointer draws (or pans), two pinch, the wheel zooms at the cursor, space or the middle button pans.
 * Moves are gathered and handed on once a frame, so that a stroke stays fluid however many events a pen sends.
 */
export function useBoardPointers({ board, view, drawing, canDraw, panHeld, onTap }: Options) {
  const pointers = new Map<number, Px>()
  let mode: 'none' | 'draw' | 'pan' | 'pinch' = 'none'
  let start: Px = [0, 0]
  let gathered: Px[] = []
  let frame = 0
  /** where a finger is, for the magnifier; null for mouse and pen, which hide nothing */
  const finger = ref<Px | null>(null)

  const spotOf = (event: { clientX: number; clientY: number }): Px => {
    const box = board.value!.getBoundingClientRect()
    return [event.clientX - box.left, event.clientY - box.top]
  }
  const zoom = () => view.view.value.scale

  function down(event: PointerEvent) {
    if ((event.target as Element).closest('[data-control]')) return
    board.value!.setPointerCapture?.(event.pointerId)
    const spot = spotOf(event)
    pointers.set(event.pointerId, spot)
    if (pointers.size === 2) {
      drawing.cancel()
      finger.value = null
      mode = 'pinch'
      return
    }
    if (pointers.size > 2) return
    start = spot
    mode = event.button === 1 || panHeld() || !canDraw() ? 'pan' : 'draw'
    if (event.button === 1) event.preventDefault() // no scroll compass
    if (mode === 'draw') {
      drawing.press(view.toPicture(spot))
      if (event.pointerType === 'touch') finger.value = spot
    }
  }

  function move(event: PointerEvent) {
    if (pointers.size === 0) {
      // A mouse on its way to the second end of a stroke.
      if (canDraw() && event.pointerType !== 'touch') drawing.hoverAt(view.toPicture(spotOf(event)))
      return
    }
    const before = pointers.get(event.pointerId)
    if (!before) return
    const spot = spotOf(event)
    if (mode === 'pinch' && pointers.size === 2) pinch(event.pointerId, before, spot)
    else if (mode === 'pan') view.pan(spot[0] - before[0], spot[1] - before[1])
    else if (mode === 'draw') {
      const run = event.getCoalescedEvents?.() ?? []
      gathered.push(...(run.length > 0 ? run : [event]).map((one) => view.toPicture(spotOf(one))))
      if (event.pointerType === 'touch') finger.value = spot
      frame ||= requestAnimationFrame(flush)
    }
    pointers.set(event.pointerId, spot)
  }

  function pinch(id: number, before: Px, spot: Px) {
    const other = [...pointers].find(([one]) => one !== id)![1]
    const middle = (a: Px): Px => [(a[0] + other[0]) / 2, (a[1] + other[1]) / 2]
    const [was, is] = [middle(before), middle(spot)]
    view.pan(is[0] - was[0], is[1] - was[1])
    view.zoom(distance(spot, other) / Math.max(1, distance(before, other)), is)
  }

  function flush() {
    frame = 0
    if (gathered.length > 0) drawing.move(gathered, zoom())
    gathered = []
  }

  function up(event: PointerEvent) {
    if (!pointers.delete(event.pointerId)) return
    const spot = spotOf(event)
    finger.value = null
    if (mode === 'draw') {
      cancelAnimationFrame(frame)
      flush()
      drawing.release(view.toPicture(spot), zoom())
    } else if (mode === 'pan' && distance(start, spot) < tapPx) onTap(spot)
    if (pointers.size === 0) mode = 'none'
    else if (mode === 'pinch') mode = 'pan'
  }

  function cancel(event: PointerEvent) {
    pointers.delete(event.pointerId)
    finger.value = null
    drawing.cancel()
    if (pointers.size === 0) mode = 'none'
  }

  function wheel(event: WheelEvent) {
    event.preventDefault()
    if (event.shiftKey) view.pan(-event.deltaX || -event.deltaY, 0)
    else view.zoom(Math.exp(-event.deltaY * (event.deltaMode === 1 ? 0.05 : 0.0016)), spotOf(event))
  }

  onScopeDispose(() => cancelAnimationFrame(frame))
  return { down, move, up, cancel, wheel, finger }
}
