import { defineStore } from 'pinia'
import { shallowRef } from 'vue'

export type Notice = { id: number; text: string; action?: { text: string; run: () => void } }
const shownMs = 6000

/** Short notices at the foot of the page, said by screen readers too; six seconds, longer under the pointer, with at most one action. */
export const useNoticesStore = defineStore('notices', () => {
  const notices = shallowRef<readonly Notice[]>([])
  /** said to screen readers only */
  const spoken = shallowRef('')
  let next = 1
  const timers = new Map<number, ReturnType<typeof setTimeout>>()
  function drop(id: number) {
    hold(id)
    notices.value = notices.value.filter((notice) => notice.id !== id)
  }
  /** A notice that is being read or reached for stays. */
  function hold(id: number) {
    clearTimeout(timers.get(id))
    timers.delete(id)
  }
  function release(id: number) {
    hold(id)
    timers.set(id, setTimeout(() => drop(id), shownMs))
  }
  function show(text: string, action?: Notice['action']) {
    const id = next++
    notices.value = [...notices.value.slice(-2), { id, text, action }]
    release(id)
    return id
  }
  function say(text: string) {
    // The same sentence twice is only read twice when it leaves in between.
    spoken.value = ''
    requestAnimationFrame(() => { spoken.value = text })
  }
  return { notices, spoken, show, drop, hold, release, say }
})
