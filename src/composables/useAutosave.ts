import { onScopeDispose, readonly, ref, shallowRef } from 'vue'
import { ApiError } from '@/api/call.ts'

export type SaveState = 'saved' | 'saving' | 'waiting' | 'failed' | 'clash'

/**
 * Saves a moment after the last change, one save at a time; what changes while a save is under way is saved after it.
 * @param save - sends the newest state; throws ApiError
 * @param options.delayMs - how long to wait for the next change
 * @param options.onClash - somebody else saved meanwhile: told with their state, nothing is thrown away
 */
export function useAutosave(save: () => Promise<void>, { delayMs = 600, onClash = (_theirs: unknown) => {} } = {}) {
  const state = ref<SaveState>('saved')
  const problem = ref('')
  const savedAt = shallowRef<Date | null>(null)
  let timer: ReturnType<typeof setTimeout> | undefined
  let changed = false
  let running = false

  function touch() {
    changed = true
    if (state.value !== 'clash') state.value = 'waiting'
    clearTimeout(timer)
    timer = setTimeout(() => void flush(), delayMs)
  }
  async function flush(): Promise<void> {
    clearTimeout(timer)
    if (running || !changed) return
    running = true
    changed = false
    state.value = 'saving'
    try {
      await save()
      problem.value = ''
      savedAt.value = new Date()
      state.value = changed ? 'waiting' : 'saved'
    } catch (failure) {
      changed = true
      problem.value = failure instanceof Error ? failure.message : 'This did not reach the journal.'
      if (failure instanceof ApiError && failure.code === 'version.stale') {
        state.value = 'clash'
        onClash(failure.details.theirs)
      } else {
        state.value = 'failed'
      }
      return
    } finally {
      running = false
    }
    if (changed) await flush()
  }
  const leaving = (event: BeforeUnloadEvent) => { if (changed || running) event.preventDefault() }
  // What could not be sent goes out by itself when the line is back.
  const back = () => { if (state.value === 'failed') void flush() }
  window.addEventListener('beforeunload', leaving)
  window.addEventListener('online', back)
  onScopeDispose(() => {
    window.removeEventListener('beforeunload', leaving)
    window.removeEventListener('online', back)
    void flush()
  })
  return { state: readonly(state), problem: readonly(problem), savedAt: readonly(savedAt), touch, flush }
}
