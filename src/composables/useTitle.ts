import { type MaybeRefOrGetter, toValue, watchEffect } from 'vue'

/** Sets the page's title while the view is shown. */
export function useTitle(title: MaybeRefOrGetter<string | null | undefined>) {
  watchEffect(() => {
    const words = toValue(title)
    document.title = words ? `${words} · Proofcloth` : 'Proofcloth'
  })
}
