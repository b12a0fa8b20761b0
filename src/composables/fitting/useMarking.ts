import { type FittingObservation } from '#shared/contracts/fitting.ts'
import { sentenceOf } from '#shared/fit/vocabulary.ts'
import { type FittingSession } from './useFitting.ts'
import { type ObservationInput, type ObservationPatch } from './useObservations.ts'

/** Steps on one field that follow each other within this are taken back together: a swipe along the tape is one step. */
const togetherMs = 1500

/** Noting, changing and removing observations, each with a way back. */
export function useMarking(session: FittingSession) {
  const { notes, history, api, act, refreshSoon } = session
  let last: { id: string; fields: string; at: number; before: ObservationPatch; after: ObservationPatch } | null = null

  const find = (id: string) => session.observations.value.find((one) => one.id === notes.idOf(id))

  function note(input: ObservationInput): string {
    const first = notes.add(input)
    let id = first
    let stored = false
    history.note({
      label: `Mark: ${sentenceOf(input)}`,
      undo: async () => { stored = !(await notes.isOnlyHere(id)); await takeAway(id) },
      redo: async () => { id = await bringBack(id, input, stored) },
    })
    return first
  }

  /** Out of the list; an observation the server does not know yet is simply dropped. */
  async function takeAway(id: string) {
    if (await notes.isOnlyHere(id)) return notes.giveUp(id)
    await api.removeObservation(notes.idOf(id))
    notes.forget(id)
    refreshSoon()
  }
  /** Back as it was; one that never reached the server is noted anew. */
  async function bringBack(id: string, input: ObservationInput, wasStored: boolean): Promise<string> {
    if (!wasStored) return notes.add(input)
    notes.place(await api.restoreObservation(notes.idOf(id)))
    refreshSoon()
    return id
  }

  function change(id: string, patch: ObservationPatch) {
    const before = find(id)
    if (!before) return
    notes.edit(id, patch)
    const fields = Object.keys(patch).join()
    const was = previous(before, patch)
    if (last && last.id === id && last.fields === fields && Date.now() - last.at < togetherMs) {
      Object.assign(last.after, patch)
      last.at = Date.now()
      return
    }
    const step = { id, fields, at: Date.now(), before: was, after: { ...patch } }
    last = step
    history.note({ label: `Change to ${before.number}`, undo: () => { last = null; notes.edit(id, step.before) }, redo: () => { last = null; notes.edit(id, step.after) } })
  }

  async function remove(id: string): Promise<boolean> {
    const gone = find(id)
    if (!gone) return false
    const input = inputOf(gone)
    let current = gone.id
    const stored = !(await notes.isOnlyHere(current))
    const done = await act(`observation:${gone.id}`, async () => { await takeAway(current); return true })
    if (!done) return false
    history.note({ label: `Remove ${gone.number}`, undo: async () => { current = await bringBack(current, input, stored) }, redo: () => takeAway(current) })
    return true
  }

  return { note, change, remove, letBe: (id: string, reason: string) => change(id, { letBe: { reason } }), takeUp: (id: string) => change(id, { letBe: null }), find }
}

/** The values a patch replaces. */
function previous(before: FittingObservation, patch: ObservationPatch): ObservationPatch {
  const was: Record<string, unknown> = {}
  for (const field of Object.keys(patch)) {
    if (field === 'letBe') was.letBe = before.state === 'let-be' ? { reason: before.letBeReason } : null
    else was[field] = before[field as keyof FittingObservation]
  }
  return was as ObservationPatch
}

export const inputOf = ({ photographId, mark, sign, zone, view, side, direction, towards, line, severity, amount, note }: FittingObservation): ObservationInput =>
  ({ photographId, mark, sign, zone, view, side, direction, towards, line, severity, amount, note })
