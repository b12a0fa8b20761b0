import { type Change, type Fitting } from '#shared/contracts/fitting.ts'
import { computed, onScopeDispose, ref, shallowRef } from 'vue'
import { fittingApi } from '@/api/fitting.ts'
import { useUndo } from '../useUndo.ts'
import { explainFailure } from './explainFailure.ts'
import { useObservations } from './useObservations.ts'

/** Observations by number, earlier samples' first: the order of the list and of the pins. */
const inOrder = <T extends { sampleNumber: number; number: number }>(list: readonly T[]) => list.toSorted((a, b) => a.sampleNumber - b.sampleNumber || a.number - b.number)
const refreshMs = 250

/**
 * One sample on the fitting screen: read once, changed here, read again behind every change so that suggestions follow.
 * @param me - who notes what is seen, for marks the server has not answered yet
 */
export function useFitting(projectId: string, number: number, me: () => { id: string; name: string }) {
  const api = fittingApi(projectId, number)
  const fitting = shallowRef<Fitting | null>(null)
  const problem = ref('')
  /** what went wrong beside which control: key → sentence */
  const problems = shallowRef<ReadonlyMap<string, string>>(new Map())
  /** requests under way: key */
  const busy = shallowRef<ReadonlySet<string>>(new Set())
  const history = useUndo()
  const notes = useObservations({
    server: { create: api.createObservation, update: api.updateObservation }, explain: explainFailure, storageKey: `proofcloth.fitting.${projectId}.${number}`,
    sampleNumber: () => number, me, onSaved: () => refreshSoon(),
  })

  let reading: AbortController | null = null
  async function load() {
    reading?.abort()
    const mine = reading = new AbortController()
    try {
      const read = await api.read(mine.signal)
      if (mine.signal.aborted) return
      fitting.value = read
      notes.receive(read.observations)
      problem.value = ''
    } catch (failure) {
      if (!mine.signal.aborted) problem.value = explainFailure(failure).message
    }
  }
  let timer: ReturnType<typeof setTimeout> | undefined
  function refreshSoon() {
    clearTimeout(timer)
    timer = setTimeout(() => void load(), refreshMs)
  }
  onScopeDispose(() => { clearTimeout(timer); reading?.abort() })

  /** Runs a request that belongs to one control; a failure is kept under its key, in words. Returns null when it failed. */
  async function act<T>(key: string, work: () => Promise<T>): Promise<T | null> {
    busy.value = new Set(busy.value).add(key)
    setProblem(key, '')
    try {
      const done = await work()
      refreshSoon()
      return done
    } catch (failure) {
      const { kind, message } = explainFailure(failure)
      setProblem(key, message)
      // Someone was faster: what they made is shown beside the message.
      if (kind === 'stale') refreshSoon()
      return null
    } finally {
      const left = new Set(busy.value)
      left.delete(key)
      busy.value = left
    }
  }
  function setProblem(key: string, message: string) {
    const map = new Map(problems.value)
    if (message) map.set(key, message)
    else map.delete(key)
    problems.value = map
  }

  /** Changes the fitting in place before it is read again. */
  const patch = (change: Partial<Fitting>) => { if (fitting.value) fitting.value = { ...fitting.value, ...change } }
  const putChange = (change: Change) => patch({ changes: [...(fitting.value?.changes ?? []).filter(({ id }) => id !== change.id), change] })
  const dropChange = (id: string) => patch({ changes: (fitting.value?.changes ?? []).filter((one) => one.id !== id) })

  const observations = computed(() => inOrder(notes.observations.value))
  return {
    projectId, number, api, fitting, problem, problems, busy, history, notes, load, refreshSoon, act, patch, putChange, dropChange, observations,
    /** first seen on this sample */
    seenHere: computed(() => observations.value.filter(({ sampleNumber }) => sampleNumber === number)),
    /** of earlier samples, asked again here */
    askedAgain: computed(() => observations.value.filter(({ sampleNumber, state }) => sampleNumber < number && state !== 'let-be')),
  }
}
export type FittingSession = ReturnType<typeof useFitting>
