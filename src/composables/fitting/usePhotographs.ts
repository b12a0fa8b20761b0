import { type Photograph } from '#shared/contracts/photograph.ts'
import { type View } from '#shared/fit/types.ts'
import { computed, ref } from 'vue'
import { explainFailure } from './explainFailure.ts'
import { pendingPhotographs } from './pendingPhotographs.ts'
import { type FittingSession } from './useFitting.ts'
import { usePhotographQueue } from './usePhotographQueue.ts'

const order: readonly View[] = ['front', 'back', 'left', 'right', 'detail']

/** The photographs of a sample: which one is on the board, what is on its way, views and removal. */
export function usePhotographs(session: FittingSession, say: (text: string) => void, onRemoved: () => void) {
  const { fitting, api, act, history, patch, refreshSoon } = session
  const photographs = computed(() => [...(fitting.value?.photographs ?? [])].sort((a, b) => order.indexOf(a.view) - order.indexOf(b.view) || a.createdAt.localeCompare(b.createdAt)))
  const chosenId = ref<string | null>(null)
  /** a view chosen that has no photograph yet */
  const wanted = ref<View | null>(null)
  const current = computed<Photograph | null>(() => (wanted.value ? null : photographs.value.find(({ id }) => id === chosenId.value) ?? photographs.value[0] ?? null))
  const filled = computed(() => [...new Set(photographs.value.map(({ view }) => view))])
  const view = computed<View>(() => wanted.value ?? current.value?.view ?? order.find((one) => !filled.value.includes(one)) ?? 'front')

  const put = (photograph: Photograph) => patch({ photographs: [...(fitting.value?.photographs ?? []).filter(({ id }) => id !== photograph.id), photograph] })
  const drop = (id: string) => patch({ photographs: (fitting.value?.photographs ?? []).filter((one) => one.id !== id) })

  const queue = usePhotographQueue({
    filled, pending: pendingPhotographs(session.projectId, session.number), explain: explainFailure,
    send: (item, { signal, onProgress }) => api.uploadPhotograph(item.file, { view: item.sentView ?? item.view }, { idempotencyKey: item.key, signal, onProgress }),
    onSent: (photograph, item) => {
      put(photograph)
      if (wanted.value === item.view || !chosenId.value) show(photograph.id)
      if (photograph.view !== item.view) void setView(photograph, item.view)
      say(`${item.file.name} arrived.`)
      refreshSoon()
    },
  })

  function show(id: string) {
    chosenId.value = id
    wanted.value = null
  }
  /** Puts a view on the board: its photograph, or the place for it. */
  function showView(next: View) {
    const there = photographs.value.find((photograph) => photograph.view === next)
    if (there) show(there.id)
    else wanted.value = next
  }
  async function setView(photograph: Photograph, next: View) {
    const change = async (to: View) => {
      const version = photographs.value.find(({ id }) => id === photograph.id)?.version ?? photograph.version
      put(await api.updatePhotograph(photograph.id, { view: to, version }))
      return true
    }
    const was = photograph.view
    if (await act(`photograph:${photograph.id}`, () => change(next))) history.note({ label: 'View of the photograph', undo: async () => { await change(was) }, redo: async () => { await change(next) } })
  }
  async function remove(photograph: Photograph) {
    const gone = async () => { await api.removePhotograph(photograph.id); drop(photograph.id); refreshSoon(); return true }
    if (!await act(`photograph:${photograph.id}`, gone)) return false
    history.note({ label: 'Remove the photograph', undo: async () => { put(await api.restorePhotograph(photograph.id)); refreshSoon() }, redo: async () => { await gone() } })
    onRemoved()
    return true
  }

  return { photographs, current, view, filled, wanted, queue, show, showView, setView, remove }
}
