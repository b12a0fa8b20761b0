import { computed, readonly, ref, shallowRef } from 'vue'

/** One thing a person did that can be taken back and done again. Both ways may need the server. */
export type UndoStep = { label: string; undo: () => Promise<void> | void; redo: () => Promise<void> | void }

/** Steps kept; older ones can no longer be taken back. */
const depth = 100

/**
 * What was done here, newest last. A step that fails stays where it was, so that it can be tried again.
 * Returns names of the next step back and forward for the buttons.
 */
export function useUndo() {
  const done = shallowRef<readonly UndoStep[]>([])
  const undone = shallowRef<readonly UndoStep[]>([])
  const busy = ref(false)

  /** Notes a step that has been done already. What was undone before can no longer be redone. */
  function note(step: UndoStep) {
    done.value = [...done.value, step].slice(-depth)
    undone.value = []
  }

  async function move(way: 'undo' | 'redo'): Promise<UndoStep | null> {
    const [from, to] = way === 'undo' ? [done, undone] : [undone, done]
    const step = from.value.at(-1)
    if (!step || busy.value) return null
    busy.value = true
    try {
      await step[way]()
      from.value = from.value.slice(0, -1)
      to.value = [...to.value, step]
      return step
    } finally {
      busy.value = false
    }
  }

  return {
    note, undo: () => move('undo'), redo: () => move('redo'), busy: readonly(busy),
    clear: () => { done.value = []; undone.value = [] },
    canUndo: computed(() => done.value.at(-1)?.label ?? null),
    canRedo: computed(() => undone.value.at(-1)?.label ?? null),
  }
}
