import { type MaybeRefOrGetter, readonly, shallowRef, toValue, watch } from 'vue'

/** An address under which a file on this device can be shown. It ends with the component, or when another file takes its place. */
export function useObjectUrl(source: MaybeRefOrGetter<Blob | null | undefined>) {
  const url = shallowRef<string | null>(null)
  watch(() => toValue(source), (blob, _before, onCleanup) => {
    const made = blob ? URL.createObjectURL(blob) : null
    url.value = made
    if (made) onCleanup(() => URL.revokeObjectURL(made)) // until then the browser keeps the whole photograph in memory
  }, { immediate: true })
  return readonly(url)
}
