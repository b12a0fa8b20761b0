import { defineStore } from 'pinia'
import { shallowRef } from 'vue'

export type Notice = { id: number; text: string; action?: { text: string; run: () => void } }
const shownMs = 6000

/** Short notices at the foot of the page, said by screen readers too; six seconds, with at most one action. */
export const useNoticesStore = defineStore('notices', () => {
  const notices = shallowRef<readonly Notice[]>([])
  /** said to screen readers only */
  const spoken = shallowRef('')
  let next = 1
  function drop(id: number) { notices.value = notices.value.filter((notice) => notice.id !== id) }
  function show(text: string, action?: Notice['action']) {
    const id = next++
    notices.value = [...notices.value.slice(-2), { id, text, action }]
    setTimeout(() => drop(id), shownMs)
    return id
  }
  function say(text: string) {
    // The same sentence twice is only read twice when it leaves in between.
    spoken.value = ''
    requestAnimationFrame(() => { spoken.value = text })
  }
  return { notices, spoken, show, drop, say }
})
