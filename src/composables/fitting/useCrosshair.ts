import { ref, shallowRef } from 'vue'
import { type Px, type Size } from './markGeometry.ts'

const ways: Record<string, Px> = { ArrowLeft: [-1, 0], ArrowRight: [1, 0], ArrowUp: [0, -1], ArrowDown: [0, 1] }

/** The pointer of the keyboard: moved by arrow keys (Shift moves further), in board pixels, held on the board. */
export function useCrosshair(board: () => Size) {
  const on = ref(false)
  const at = shallowRef<Px>([0, 0])
  return {
    on, at,
    start: () => { on.value = true; at.value = [board().width / 2, board().height / 2] },
    stop: () => { on.value = false },
    /** true when the key moved it */
    moveBy: (key: string, far: boolean): boolean => {
      const way = ways[key]
      if (!way) return false
      const step = far ? 32 : 4
      const inside = (value: number, room: number) => Math.min(room, Math.max(0, value))
      at.value = [inside(at.value[0] + way[0] * step, board().width), inside(at.value[1] + way[1] * step, board().height)]
      return true
    },
  }
}
