import { type FittingObservation, type createObservation, type updateObservation } from '#shared/contracts/fitting.ts'
import { type RouteInput } from '#shared/contracts/route.ts'
import { computed, onScopeDispose, ref, shallowRef, watch } from 'vue'

export type ObservationInput = RouteInput<typeof createObservation, 'body'>
export type ObservationPatch = Omit<RouteInput<typeof updateObservation, 'body'>, 'version'>
export type Failure = { kind: 'offline' | 'stale' | 'refused'; message: string; theirs?: FittingObservation }

/** An observation as the screen shows it: the server's, with what this person changed and is still being sent laid over it. */
export type ShownObservation = FittingObservation & { unsent: boolean }
export type Clash = { id: string; mine: ObservationPatch; theirs: FittingObservation }
/** `base` is the version the change was made on: null while the observation itself is still unsent. */
type Pending = { patch: ObservationPatch; base: number | null; sending: boolean; message: string; refused: boolean; clash: FittingObservation | null }
type Creation = { id: string; key: string; body: ObservationInput; createdAt: string; sending: boolean; message: string; refused: boolean }

export type ObservationServer = {
  create: (body: ObservationInput, key: string) => Promise<FittingObservation>
  update: (id: string, body: ObservationPatch & { version: number }) => Promise<FittingObservation>
}
type Options = {
  server: ObservationServer
  explain: (failure: unknown) => Failure
  /** where unsent work is kept over a reload */
  storageKey: string
  sampleNumber: () => number
  me: () => { id: string; name: string }
  onSaved: (observation: FittingObservation) => void
}

const retryMs = 15_000

/**
 * What the cloth shows, saved at once and never lost: every change is shown first and sent behind it, one request at a time for each
 * observation. Without a connection it is kept on the device and sent when the connection returns; when someone else changed the same
 * observation, both states stay until the person picks one.
 */
export function useObservations({ server, explain, storageKey, sampleNumber, me, onSaved }: Options) {
  const stored = shallowRef<readonly FittingObservation[]>([])
  const pending = shallowRef<ReadonlyMap<string, Pending>>(new Map())
  const creations = shallowRef<readonly Creation[]>([])
  /** id given on the device → id given by the server */
  const aliases = shallowRef<ReadonlyMap<string, string>>(new Map())
  const savedOnce = ref(false)

  const idOf = (id: string) => aliases.value.get(id) ?? id
  const setPending = (id: string, change: Partial<Pending> | null) => {
    const map = new Map(pending.value)
    if (change === null) map.delete(id)
    else map.set(id, { ...(map.get(id) ?? { patch: {}, base: stored.value.find((one) => one.id === id)?.version ?? null, sending: false, message: '', refused: false, clash: null }), ...change })
    pending.value = map
  }
  const setCreation = (id: string, change: Partial<Creation>) => { creations.value = creations.value.map((one) => (one.id === id ? { ...one, ...change } : one)) }
  const place = (observation: FittingObservation) => {
    const known = stored.value.some(({ id }) => id === observation.id)
    // Our own doing moved it on: what is still unsent stands on the new version.
    if (pending.value.get(observation.id)) setPending(observation.id, { base: observation.version })
    stored.value = known ? stored.value.map((one) => (one.id === observation.id ? observation : one)) : [...stored.value, observation]
  }

  const observations = computed<ShownObservation[]>(() => {
    const lastNumber = Math.max(0, ...stored.value.map(({ number }) => number))
    const drafts = creations.value.map((one, i): ShownObservation => ({
      ...one.body, id: one.id, number: lastNumber + i + 1, sampleNumber: sampleNumber(),
      state: 'noted', letBeReason: '', readings: [], predicted: null, by: me(), createdAt: one.createdAt, version: 1, unsent: true,
    }))
    return [...stored.value.map((one) => ({ ...one, unsent: false })), ...drafts].map((one) => laidOver(one, pending.value.get(one.id)?.patch))
  })

  /** Notes what was seen; shown at once. Returns the id it has until the server gives one. */
  function add(body: ObservationInput): string {
    const id = crypto.randomUUID()
    creations.value = [...creations.value, { id, key: crypto.randomUUID(), body, createdAt: new Date().toISOString(), sending: false, message: '', refused: false }]
    void sendCreation(id)
    return id
  }

  const onTheWay = new Map<string, Promise<void>>()
  function sendCreation(id: string): Promise<void> {
    const sending = onTheWay.get(id) ?? deliver(id).finally(() => onTheWay.delete(id))
    onTheWay.set(id, sending)
    return sending
  }
  async function deliver(id: string) {
    const creation = creations.value.find((one) => one.id === id)
    if (!creation || creation.sending) return
    setCreation(id, { sending: true, message: '' })
    try {
      const made = await server.create(creation.body, creation.key)
      place(made)
      aliases.value = new Map(aliases.value).set(id, made.id)
      creations.value = creations.value.filter((one) => one.id !== id)
      const waiting = pending.value.get(id)
      setPending(id, null)
      if (waiting) setPending(made.id, { ...waiting, base: made.version })
      savedOnce.value = true
      onSaved(made)
      if (waiting) void send(made.id)
    } catch (failure) {
      const { kind, message } = explain(failure)
      setCreation(id, { sending: false, message, refused: kind === 'refused' })
    }
  }

  /** Changes an observation; shown at once, sent behind it. */
  function edit(givenId: string, patch: ObservationPatch) {
    const id = idOf(givenId)
    setPending(id, { patch: { ...pending.value.get(id)?.patch, ...patch }, message: '', refused: false })
    void send(id)
  }

  async function send(id: string) {
    const waiting = pending.value.get(id)
    const base = stored.value.find((one) => one.id === id)
    if (!waiting || !base || waiting.sending || waiting.clash) return
    const patch = waiting.patch
    setPending(id, { sending: true, message: '' })
    try {
      const saved = await server.update(id, { ...patch, version: waiting.base ?? base.version })
      place(saved)
      savedOnce.value = true
      // What was typed while this was on its way is newer and goes next.
      const left = remaining(pending.value.get(id)?.patch ?? {}, patch)
      setPending(id, Object.keys(left).length > 0 ? { patch: left, sending: false } : null)
      onSaved(saved)
      void send(id)
    } catch (failure) {
      const { kind, message, theirs } = explain(failure)
      setPending(id, { sending: false, message, refused: kind === 'refused', clash: kind === 'stale' && theirs ? theirs : null })
    }
  }

  /** After a clash: their state stands, or mine goes on top of it. */
  function settleClash(givenId: string, pick: 'theirs' | 'mine') {
    const id = idOf(givenId)
    const clash = pending.value.get(id)?.clash
    if (!clash) return
    place(clash)
    if (pick === 'theirs') return setPending(id, null)
    setPending(id, { clash: null, message: '' })
    void send(id)
  }

  /** Sends everything that is still here. By itself it never repeats what the server refused: only a person does. */
  function sendAll({ byItself = false } = {}) {
    for (const { id, refused } of creations.value) if (!(byItself && refused)) void sendCreation(id)
    for (const [id, { refused }] of pending.value) if (!(byItself && refused)) void send(id)
  }
  /** Gives up a change the server will not take; the observation goes back to what is stored. */
  function giveUp(givenId: string) {
    const id = idOf(givenId)
    creations.value = creations.value.filter((one) => one.id !== id)
    setPending(id, null)
  }

  /** True where the server does not have it, once a request under way has ended. */
  async function isOnlyHere(id: string): Promise<boolean> {
    await onTheWay.get(id)
    return creations.value.some((one) => one.id === id)
  }

  const waitingCount = computed(() => creations.value.length + [...pending.value.keys()].filter((id) => !creations.value.some((one) => one.id === id)).length)
  const saveState = computed<'idle' | 'saving' | 'saved' | 'kept' | 'clash'>(() => {
    const patches = [...pending.value.values()]
    if (patches.some(({ clash }) => clash)) return 'clash'
    if (patches.some(({ message }) => message) || creations.value.some(({ message }) => message)) return 'kept'
    if (waitingCount.value > 0) return 'saving'
    return savedOnce.value ? 'saved' : 'idle'
  })
  const clashes = computed<Clash[]>(() => [...pending.value].flatMap(([id, { patch, clash }]) => (clash ? [{ id, mine: patch, theirs: clash }] : [])))
  const messageFor = (givenId: string) => pending.value.get(idOf(givenId))?.message || creations.value.find(({ id }) => id === givenId)?.message || ''

  const storage = deviceStorage(storageKey)
  const kept = storage.read()
  creations.value = kept.creations
  pending.value = new Map(kept.patches.map(([id, patch, base]) => [id, { patch, base, sending: false, message: '', refused: false, clash: null }]))
  watch([creations, pending], () => storage.write(
    creations.value, [...pending.value].map(([id, { patch, base }]): KeptPatch => [id, patch, base]),
  ), { flush: 'sync' })
  const timer = setInterval(() => { if (waitingCount.value > 0 && saveState.value !== 'clash') sendAll({ byItself: true }) }, retryMs)
  const backOnline = () => sendAll({ byItself: true })
  globalThis.addEventListener?.('online', backOnline)
  onScopeDispose(() => {
    clearInterval(timer)
    globalThis.removeEventListener?.('online', backOnline)
  })

  return {
    observations, saveState, waitingCount, clashes, add, edit, settleClash, sendAll, giveUp, isOnlyHere, idOf, messageFor, place,
    /** the server's list, as read */
    receive: (list: readonly FittingObservation[]) => { stored.value = list; sendAll({ byItself: true }) },
    forget: (id: string) => { stored.value = stored.value.filter((one) => one.id !== idOf(id)); setPending(idOf(id), null) },
  }
}

function laidOver(observation: ShownObservation, patch: ObservationPatch | undefined): ShownObservation {
  if (!patch) return observation
  const { letBe, ...fields } = patch
  const state = letBe === undefined ? {} : letBe ? { state: 'let-be' as const, letBeReason: letBe.reason } : { state: 'noted' as const, letBeReason: '' }
  return { ...observation, ...fields, ...state, unsent: true }
}

/** Fields of the newer patch that differ from what was just sent. */
function remaining(newer: ObservationPatch, sent: ObservationPatch): ObservationPatch {
  return Object.fromEntries(Object.entries(newer).filter(([field, value]) => value !== sent[field as keyof ObservationPatch]))
}

type KeptPatch = [id: string, patch: ObservationPatch, base: number | null]
type Kept = { creations: Creation[]; patches: KeptPatch[] }
function deviceStorage(key: string) {
  return {
    read(): Kept {
      try {
        const kept = JSON.parse(localStorage.getItem(key) ?? 'null') as Kept | null
        return { creations: (kept?.creations ?? []).map((one) => ({ ...one, sending: false, message: '', refused: false })), patches: kept?.patches ?? [] }
      } catch {
        return { creations: [], patches: [] } // an unreadable store is no reason to keep the fitting shut
      }
    },
    write(creations: readonly Creation[], patches: KeptPatch[]) {
      try {
        if (creations.length + patches.length === 0) localStorage.removeItem(key)
        else localStorage.setItem(key, JSON.stringify({ creations, patches }))
      } catch { /* a full or forbidden store: the work stays on the page and in the visible state */ }
    },
  }
}
