import { type FinalCut, agreeToCut, clearToCut, markCut, readFinalCut, updateFinalCut } from '#shared/contracts/finalCut.ts'
import { type RouteInput } from '#shared/contracts/route.ts'
import { useQueryCache } from '@pinia/colada'
import { onScopeDispose, ref, shallowRef } from 'vue'
import { ApiError, call } from '@/api/call.ts'
import { projectKey } from './useProject.ts'

type Change = Omit<RouteInput<typeof updateFinalCut, 'body'>, 'version'>
export type SaveState = 'saved' | 'saving' | 'failed'

/**
 * The list before the cut, saved as it is changed: changes made while a save is under way wait and go together.
 * When somebody else changed it meanwhile, theirs is taken over and this change is made on top: ticks and cloth facts do not contradict.
 */
export function useFinalCut(projectId: string) {
  const finalCut = shallowRef<FinalCut | null>(null)
  const problem = ref('')
  const saveProblem = ref('')
  const state = ref<SaveState>('saved')
  const cache = useQueryCache()
  const stop = new AbortController()
  onScopeDispose(() => stop.abort())
  const params = { projectId }

  async function load() {
    problem.value = ''
    try {
      finalCut.value = await call(readFinalCut, { params, signal: stop.signal })
    } catch (failure) {
      if (!stop.signal.aborted) problem.value = wordsOf(failure)
    }
  }

  let waiting: Change | null = null
  let sending = false
  function change(next: Change) {
    if (!finalCut.value) return
    waiting = together(waiting, next)
    show(next)
    void send()
  }
  /** Shows a change before the server has answered. */
  function show(next: Change) {
    const now = finalCut.value!
    finalCut.value = {
      ...now,
      cloth: { ...now.cloth, ...next.cloth }, shrinkage: { ...now.shrinkage, ...next.shrinkage }, note: next.note ?? now.note,
      items: now.items.map((item) => ({ ...item, ticked: next.ticks?.[item.id] ?? item.ticked })),
    }
  }
  async function send() {
    if (sending) return
    sending = true
    state.value = 'saving'
    while (waiting) {
      const body: Change = waiting
      waiting = null
      try {
        finalCut.value = await call(updateFinalCut, { params, body: { ...body, version: finalCut.value!.version } })
        // What was ticked while this was on its way is not in the answer yet and stays on screen.
        if (waiting) show(waiting)
        saveProblem.value = ''
      } catch (failure) {
        waiting = together(body, waiting)
        if (failure instanceof ApiError && failure.code === 'version.stale' && failure.details.theirs) {
          finalCut.value = failure.details.theirs as FinalCut
          show(waiting)
          continue
        }
        saveProblem.value = wordsOf(failure)
        state.value = 'failed'
        sending = false
        return
      }
    }
    sending = false
    state.value = 'saved'
  }

  /** Runs one of the decisions; a refusal is shown in words. */
  async function decide(work: () => Promise<FinalCut>): Promise<boolean> {
    saveProblem.value = ''
    try {
      finalCut.value = await work()
      await cache.invalidateQueries({ key: [...projectKey(projectId)] })
      return true
    } catch (failure) {
      saveProblem.value = wordsOf(failure)
      return false
    }
  }
  return {
    finalCut, problem, saveProblem, state, load, change, again: send,
    agree: (agreed: boolean) => decide(() => call(agreeToCut, { params, body: { agreed } })),
    clear: () => decide(() => call(clearToCut, { params })),
    cut: () => decide(() => call(markCut, { params })),
  }
}

/** Two changes as one, tick by tick and fact by fact; the later wins. */
function together(earlier: Change | null, later: Change | null): Change {
  const of = <K extends 'ticks' | 'cloth' | 'shrinkage'>(key: K) => (earlier?.[key] || later?.[key] ? { [key]: { ...earlier?.[key], ...later?.[key] } } : {})
  return { ...earlier, ...later, ...of('ticks'), ...of('cloth'), ...of('shrinkage') }
}

const wordsOf = (failure: unknown) => (failure instanceof Error ? failure.message : 'This did not reach the journal.')
