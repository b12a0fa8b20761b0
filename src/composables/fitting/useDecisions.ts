import { type Change, type createOwnChange, type decideChange, type putReading } from '#shared/contracts/fitting.ts'
import { type RouteInput } from '#shared/contracts/route.ts'
import { type Finding, type PieceRole, type Side } from '#shared/fit/types.ts'
import { suggestionId } from './suggestions.ts'
import { type FittingSession } from './useFitting.ts'

export type Decision = RouteInput<typeof decideChange, 'body'>
export type OwnChange = RouteInput<typeof createOwnChange, 'body'>
export type ReadingInput = RouteInput<typeof putReading, 'body'>

/** What is decided on this sample: readings of earlier observations, answers to checks, changes taken or refused. Each with a way back. */
export function useDecisions(session: FittingSession) {
  const { api, act, history, notes, patch, putChange, dropChange, refreshSoon, fitting } = session

  /** Looks at an earlier observation again; null takes the reading back. */
  async function read(observationId: string, reading: ReadingInput | null) {
    const before = session.observations.value.find(({ id }) => id === observationId)?.readings.find(({ sampleNumber }) => sampleNumber === session.number)
    const was: ReadingInput | null = before ? { gone: before.gone, reversed: before.reversed, amount: before.amount, note: before.note } : null
    const put = async (next: ReadingInput | null) => {
      notes.place(next ? await api.putReading(observationId, next) : await api.removeReading(observationId))
      refreshSoon()
    }
    const done = await act(`reading:${observationId}`, async () => { await put(reading); return true })
    if (done) history.note({ label: 'Reading', undo: () => put(was), redo: () => put(reading) })
    return done !== null
  }

  /** Answers a check; shown at once, since it moves the suggestions. */
  async function answer(checkId: string, given: 'yes' | 'no' | null) {
    const was = fitting.value?.answers[checkId] ?? null
    const put = async (next: 'yes' | 'no' | null) => {
      const { [checkId]: _, ...others } = fitting.value?.answers ?? {}
      patch({ answers: next ? { ...others, [checkId]: next } : others })
      await api.putAnswer(checkId, next)
      // Moves the list now, not after the pause that gathers marks.
      await session.load()
    }
    const done = await act(`answer:${checkId}`, async () => { await put(given); return true })
    if (done) history.note({ label: 'Answer', undo: () => put(was), redo: () => put(given) })
    return done !== null
  }

  /** Takes, alters or refuses a suggestion. */
  async function decide(decision: Decision): Promise<Change | null> {
    const key = `change:${suggestionId(decision)}`
    let made = await act(key, () => api.decide(decision, crypto.randomUUID()))
    if (!made) return null
    putChange(made)
    const words = { accepted: 'Accept', altered: 'Alter', declined: 'Decline' }[decision.decision]
    history.note({
      label: `${words}: ${made.title}`,
      undo: async () => { await api.takeBack(made!.id); dropChange(made!.id); refreshSoon() },
      redo: async () => { made = await api.decide(decision, crypto.randomUUID()); putChange(made); refreshSoon() },
    })
    return made
  }

  async function own(change: OwnChange): Promise<Change | null> {
    let made = await act('change:own', () => api.ownChange(change, crypto.randomUUID()))
    if (!made) return null
    putChange(made)
    history.note({
      label: `Own change: ${made.title}`,
      undo: async () => { await api.takeBack(made!.id); dropChange(made!.id); refreshSoon() },
      redo: async () => { made = await api.ownChange(change, crypto.randomUUID()); putChange(made); refreshSoon() },
    })
    return made
  }

  /** Alters what was decided already. */
  async function alter(change: Change, next: { amountMm?: number; pieceRoles?: PieceRole[]; note?: string }): Promise<Change | null> {
    const was = { amountMm: change.amountMm, pieceRoles: [...new Set(change.paper.steps.map(({ pieceRole }) => pieceRole))], note: change.note }
    const put = async (values: typeof next) => {
      const version = fitting.value?.changes.find(({ id }) => id === change.id)?.version ?? change.version
      const saved = await api.updateChange(change.id, { ...values, version })
      putChange(saved)
      refreshSoon()
      return saved
    }
    const done = await act(`change:${change.id}`, () => put(next))
    if (done) history.note({ label: `Alter: ${change.title}`, undo: async () => { await put(was) }, redo: async () => { await put(next) } })
    return done
  }

  /** Takes a decision back; its observations are noted again. `finding` lets it be redone by undo. */
  async function takeBack(change: Change, finding: Pick<Finding, 'cause' | 'side'> | null): Promise<boolean> {
    const done = await act(`change:${change.id}`, async () => { await api.takeBack(change.id); return true })
    if (!done) return false
    dropChange(change.id)
    const again = againOf(change, finding?.side ?? sideOf(change))
    let made: Change | null = null
    history.note({
      label: `Take back: ${change.title}`,
      undo: async () => { made = await (again.own ? api.ownChange(again.own, crypto.randomUUID()) : api.decide(again.decision!, crypto.randomUUID())); putChange(made); refreshSoon() },
      redo: async () => { if (made) { await api.takeBack(made.id); dropChange(made.id); refreshSoon() } },
    })
    return true
  }

  return { read, answer, decide, own, alter, takeBack }
}
export type Decisions = ReturnType<typeof useDecisions>

/** The side a kept change is for, read from its paper steps. */
const sideOf = (change: Change): Side => {
  const sides = new Set(change.paper.steps.map(({ side }) => side))
  return sides.size === 1 ? [...sides][0]! : 'both'
}

/** The request that makes the same decision once more. */
function againOf(change: Change, side: Side): { decision?: Decision; own?: OwnChange } {
  if (change.decision === 'own' || !change.cause) {
    return { own: {
      title: change.title, note: change.note, observationIds: change.observationIds,
      steps: change.paper.steps.map(({ pieceRole, side: stepSide, edge, amountMm, edges, taper }) => ({ pieceRole, side: stepSide, edge, amountMm, edges, ...(taper ? { taper } : {}) })),
    } }
  }
  return { decision: {
    cause: change.cause, side, decision: change.decision, note: change.note, ...(change.reason ? { reason: change.reason } : {}),
    ...(change.decision === 'altered' ? { amountMm: change.amountMm, pieceRoles: [...new Set(change.paper.steps.map(({ pieceRole }) => pieceRole))] } : {}),
  } }
}
