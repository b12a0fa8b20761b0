import { type Change, type Sample, type updateSample } from '#shared/contracts/fitting.ts'
import { type RouteInput } from '#shared/contracts/route.ts'
import { computed, ref } from 'vue'
import { explainFailure } from './explainFailure.ts'
import { type FittingSession } from './useFitting.ts'

export type SampleFacts = Omit<RouteInput<typeof updateSample, 'body'>, 'version'>
export type SampleStep = {
  /** what the button says; null where nothing is to be done by this person */
  action: string | null
  /** where the sample stands, in a sentence */
  words: string
  next: Sample['state'] | 'start-next' | null
}

/** The one next step of a sample. Only the newest sample moves on; an older one was closed by the next. */
export function nextStep(sample: Pick<Sample, 'state' | 'number'>, counts: { photographs: number; open: number; toCarry: number }, isNewest: boolean): SampleStep {
  const carry = counts.toCarry === 1 ? 'Carry 1 change' : `Carry ${counts.toCarry} changes`
  if (!isNewest) return { action: null, words: 'Closed; its changes are in the next sample.', next: null }
  switch (sample.state) {
    case 'to-sew': return { action: 'The sample is sewn', words: 'To sew. Baste what you want to move.', next: 'to-photograph' }
    case 'to-photograph': return counts.photographs === 0
      ? { action: null, words: 'To photograph: front, back and both sides.', next: null }
      : { action: 'Ask the fitter', words: 'Photographed. Put your marks, then ask the fitter.', next: 'with-fitter' }
    case 'with-fitter': return { action: 'The look is done', words: 'With the fitter.', next: 'reviewed' }
    case 'reviewed': return counts.toCarry > 0
      ? { action: `${carry} into sample ${sample.number + 1}`, words: counts.open > 0 ? `Reviewed; ${counts.open} still open without a change.` : 'Reviewed.', next: 'start-next' }
      : { action: null, words: counts.open > 0 ? `Reviewed; ${counts.open} still open. Choose a change, or let it be.` : `Everything on sample ${sample.number} is settled. The final cut is open.`, next: null }
    case 'closed': return { action: null, words: 'Closed.', next: null }
  }
}

/** How many changes would go into the next sample. */
export const changesToCarry = (changes: readonly Change[]): number => changes.filter(({ decision, carriedTo }) => decision !== 'declined' && carriedTo === null).length

/** Facts of the sample, kept while typing, and its moves. One request at a time, on the newest version; a clash keeps the person's words. */
export function useSample(session: FittingSession) {
  const { api, fitting, act, patch } = session
  const waiting = ref<SampleFacts>({})
  const sending = ref(false)
  const message = ref('')
  const savedOnce = ref(false)
  const state = computed<'idle' | 'saving' | 'saved' | 'kept'>(() => (message.value ? 'kept' : sending.value ? 'saving' : savedOnce.value ? 'saved' : 'idle'))
  /** the sample with what is still on its way */
  const shown = computed<Sample | null>(() => fitting.value && { ...fitting.value.sample, ...waiting.value })

  function change(facts: SampleFacts) {
    waiting.value = { ...waiting.value, ...facts }
    void send()
  }
  async function send(retried = false) {
    const sample = fitting.value?.sample
    if (!sample || sending.value || Object.keys(waiting.value).length === 0) return
    const facts = waiting.value
    sending.value = true
    message.value = ''
    try {
      const saved = await api.updateSample({ ...facts, version: sample.version })
      patch({ sample: saved })
      waiting.value = Object.fromEntries(Object.entries(waiting.value).filter(([field, value]) => value !== facts[field as keyof SampleFacts]))
      savedOnce.value = true
    } catch (failure) {
      const { kind, message: words } = explainFailure(failure)
      // Facts are told field by field: on a newer version the same fields are simply told again.
      if (kind === 'stale' && !retried) {
        await session.load()
        sending.value = false
        return send(true)
      }
      message.value = `${words} What you wrote is kept here.`
    } finally {
      sending.value = false
    }
    if (!message.value) void send()
  }

  async function move(to: Sample['state']): Promise<boolean> {
    const sample = fitting.value?.sample
    if (!sample) return false
    const saved = await act('sample:move', () => api.updateSample({ state: to, version: sample.version }))
    if (saved) patch({ sample: saved })
    return saved !== null
  }
  const startKey = crypto.randomUUID()
  const startNext = () => act('sample:move', () => api.startSample({ cloth: fitting.value?.sample.cloth ?? '' }, startKey))

  return { shown, change, state, message, move, startNext }
}
