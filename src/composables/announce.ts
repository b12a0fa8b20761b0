import { useNoticesStore } from '@/stores/notices.ts'

/** Says a sentence to screen readers, without showing it. */
export const announce = (text: string): void => useNoticesStore().say(text)
