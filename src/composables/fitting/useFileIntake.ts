import { useEventListener } from '@vueuse/core'
import { ref, type Ref } from 'vue'

/** Pictures dropped on a place or pasted anywhere on the page. */
export function useFileIntake(place: Ref<HTMLElement | null>, may: () => boolean, take: (files: File[]) => void) {
  const over = ref(false)
  const carriesFiles = (transfer: DataTransfer | null) => transfer?.types.includes('Files') === true

  useEventListener(place, 'dragover', (event: DragEvent) => {
    if (!may() || !carriesFiles(event.dataTransfer)) return
    event.preventDefault()
    over.value = true
  })
  useEventListener(place, 'dragleave', (event: DragEvent) => { if (!place.value?.contains(event.relatedTarget as Node | null)) over.value = false })
  useEventListener(place, 'drop', (event: DragEvent) => {
    over.value = false
    if (!may() || !event.dataTransfer?.files.length) return
    event.preventDefault()
    take([...event.dataTransfer.files])
  })
  useEventListener(document, 'paste', (event: ClipboardEvent) => {
    const files = [...event.clipboardData?.files ?? []]
    if (!may() || files.length === 0) return // pasted words belong to the field they were pasted in
    event.preventDefault()
    take(files)
  })
  return { over }
}
