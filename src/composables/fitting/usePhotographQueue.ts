import { type Photograph, photographLimits } from '#shared/contracts/photograph.ts'
import { type View } from '#shared/fit/types.ts'
import { computed, type MaybeRefOrGetter, onScopeDispose, shallowRef, toValue } from 'vue'
import { type PendingPhotographs } from './pendingPhotographs.ts'

export type QueuedPhotograph = {
  /** also the key the upload is repeated under, so that a retry never makes a second photograph */
  key: string
  file: File
  view: View
  /** the view said at the first attempt: a repeated request must be the same request; a view chosen since is set afterwards */
  sentView: View | null
  state: 'waiting' | 'sending' | 'failed' | 'refused'
  /** part sent, 0..1 */
  part: number
  message: string
  preview: string
}
export type SendPhotograph = (item: QueuedPhotograph, options: { signal: AbortSignal; onProgress: (part: number) => void }) => Promise<Photograph>
type Options = {
  send: SendPhotograph
  /** views that have a photograph already */
  filled: MaybeRefOrGetter<readonly View[]>
  onSent: (photograph: Photograph, item: QueuedPhotograph) => void
  /** keeps files over a reload */
  pending: PendingPhotographs
  explain: (failure: unknown) => { message: string; again: boolean }
}

const slots: readonly View[] = ['front', 'back', 'left', 'right']

/** Photographs on their way, one at a time: on a bad line one that arrives is worth more than four that do not. */
export function usePhotographQueue({ send, filled, onSent, pending, explain }: Options) {
  const items = shallowRef<readonly QueuedPhotograph[]>([])
  const running = new Map<string, AbortController>()

  const set = (key: string, change: Partial<QueuedPhotograph>) => { items.value = items.value.map((item) => (item.key === key ? { ...item, ...change } : item)) }
  const find = (key: string) => items.value.find((item) => item.key === key)
  const emptySlot = (taken: readonly View[]): View => slots.find((view) => !taken.includes(view)) ?? 'detail'

  /** Takes files in; what cannot be a photograph is refused by name, the others go on. */
  function add(files: Iterable<File>, view?: View) {
    let wanted = view
    for (const file of files) {
      const taken = [...toValue(filled), ...items.value.filter((item) => item.state !== 'refused').map((item) => item.view)]
      const item: QueuedPhotograph = { key: crypto.randomUUID(), file, view: wanted ?? emptySlot(taken), sentView: null, state: 'waiting', part: 0, message: '', preview: '' }
      wanted = undefined // only the first file was meant for the chosen view
      const refusal = refuse(file)
      if (refusal) items.value = [...items.value, { ...item, state: 'refused', message: refusal }]
      else {
        items.value = [...items.value, { ...item, preview: URL.createObjectURL(file) }]
        void pending.keep({ key: item.key, file, view: item.view })
      }
    }
    void next()
  }

  /** Photographs that were on their way when the page was left. */
  async function resume() {
    const kept = (await pending.all()).filter(({ key }) => !find(key))
    items.value = [...items.value, ...kept.map((one): QueuedPhotograph => ({ ...one, sentView: one.view, state: 'waiting', part: 0, message: '', preview: URL.createObjectURL(one.file) }))]
    void next()
  }

  async function next() {
    if (running.size > 0) return
    const first = items.value.find(({ state }) => state === 'waiting')
    if (!first) return
    const item = { ...first, sentView: first.sentView ?? first.view }
    const abort = new AbortController()
    running.set(item.key, abort)
    set(item.key, { state: 'sending', part: 0, message: '', sentView: item.sentView })
    try {
      const photograph = await send(item, { signal: abort.signal, onProgress: (part) => set(item.key, { part }) })
      // Only now is it stored on the server; until then the file stays on the device.
      const view = find(item.key)?.view ?? item.view
      await drop(item.key)
      onSent(photograph, { ...item, view })
    } catch (failure) {
      if (!abort.signal.aborted) {
        const { message, again } = explain(failure)
        // The uploader says how far it got and that the photograph is still here.
        set(item.key, { state: again ? 'failed' : 'refused', message })
        if (!again) void pending.drop(item.key)
      }
    } finally {
      running.delete(item.key)
    }
    void next()
  }

  async function drop(key: string) {
    const item = find(key)
    items.value = items.value.filter((one) => one.key !== key)
    if (item?.preview) URL.revokeObjectURL(item.preview)
    await pending.drop(key)
  }

  function retry(key: string) {
    if (find(key)?.state === 'failed') set(key, { state: 'waiting', message: '' })
    void next()
  }
  /** Puts every failed one back in line; they still go one after the other. */
  function retryAll() {
    items.value = items.value.map((item) => (item.state === 'failed' ? { ...item, state: 'waiting', message: '' } : item))
    void next()
  }
  async function cancel(key: string) {
    running.get(key)?.abort()
    await drop(key)
  }
  function setView(key: string, view: View) {
    set(key, { view })
    const item = find(key)
    // Kept under the view it was first sent with: after a reload it is repeated as it was.
    if (item && !item.sentView) void pending.keep({ key, file: item.file, view })
  }

  const back = () => retryAll()
  globalThis.addEventListener?.('online', back)
  onScopeDispose(() => {
    globalThis.removeEventListener?.('online', back)
    for (const abort of running.values()) abort.abort()
    for (const { preview } of items.value) if (preview) URL.revokeObjectURL(preview)
  })

  return { items: computed(() => items.value), add, retry, retryAll, cancel, setView, resume }
}

const megabytes = (bytes: number) => Math.round(bytes / 1024 / 1024)
function refuse(file: File): string | null {
  // Some systems leave the type of a HEIC file empty; the server looks at the content.
  const known = file.type === '' ? /\.(jpe?g|png|webp|avif|hei[cf])$/i.test(file.name) : (photographLimits.types as readonly string[]).includes(file.type)
  if (!known) return 'This is not a photograph we can read. Take JPEG, PNG, WebP, AVIF or HEIC.'
  if (file.size > photographLimits.bytes) return `This file has ${megabytes(file.size)} MB; at most ${megabytes(photographLimits.bytes)} MB can be kept. Save it smaller and add it again.`
  return null
}
