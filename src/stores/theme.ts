import { usePreferredDark, useLocalStorage } from '@vueuse/core'
import { defineStore } from 'pinia'
import { computed, watchEffect } from 'vue'

/** Day or night: follows the system until the person chooses. Sets `data-theme`, which the tokens and naive-ui both go by. */
export const useThemeStore = defineStore('theme', () => {
  const chosen = useLocalStorage<'light' | 'dark' | ''>('proofcloth.theme', '')
  const systemDark = usePreferredDark()
  const dark = computed(() => (chosen.value ? chosen.value === 'dark' : systemDark.value))
  watchEffect(() => { document.documentElement.dataset.theme = dark.value ? 'dark' : 'light' })
  const toggle = () => { chosen.value = dark.value ? 'light' : 'dark' }
  return { chosen, dark, toggle }
})
