import { useEventListener } from '@vueuse/core'

const isTyping = (target: EventTarget | null) => target instanceof HTMLElement && (target.isContentEditable || ['INPUT', 'TEXTAREA', 'SELECT'].includes(target.tagName))

/** Runs on one key of the page, never while somebody types and never with Ctrl, Alt or Cmd, which belong to the browser. */
export function useShortcut(key: string, run: () => void) {
  useEventListener(window, 'keydown', (event) => {
    if (event.key.toLowerCase() !== key.toLowerCase() || event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return
    event.preventDefault()
    run()
  })
}
