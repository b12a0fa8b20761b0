import { type Mark } from '#shared/contracts/fitting.ts'
import { may } from '#shared/contracts/permissions.ts'
import { type Project } from '#shared/contracts/project.ts'
import { askFor, sentenceOf } from '#shared/fit/vocabulary.ts'
import { computed, inject, type InjectionKey, ref } from 'vue'
import { type BoardMark } from '../../components/fitting/boardMark.ts'
import { explainFailure } from './explainFailure.ts'
import { guessObservation } from './guessObservation.ts'
import { type Format, spokenLabel } from './observationWords.ts'
import { changeCards, notchesOf } from './suggestions.ts'
import { useDecisions } from './useDecisions.ts'
import { useFitting } from './useFitting.ts'
import { type MarkTool } from './useMarkDrawing.ts'
import { useMarking } from './useMarking.ts'
import { usePhotographs } from './usePhotographs.ts'
import { changesToCarry, useSample } from './useSample.ts'

type Options = { project: () => Project; number: number; me: () => { id: string; name: string }; format: Format; say: (text: string) => void; tell: (text: string, action?: { text: string; run: () => void }) => void }

/** Everything the fitting screen works with, for desk and phone alike: what is selected, what is edited, what one may do. */
export function createFitting({ project, number, me, format, say, tell }: Options) {
  const session = useFitting(project().id, number, me)
  const marking = useMarking(session)
  const decisions = useDecisions(session)
  const sampleWork = useSample(session)
  const photos = usePhotographs(session, say, () => tell('Photograph removed.', { text: 'Undo', run: () => void go('undo') }))

  const can = computed(() => {
    const { role } = project()
    return { mark: may(role, 'fitting.mark'), photograph: may(role, 'photograph.add'), decide: may(role, 'change.decide'), edit: may(role, 'project.edit'), comment: may(role, 'comment.add'), wearer: role === 'wearer' }
  })

  const selected = ref<string | null>(null)
  const selectedId = computed(() => (selected.value ? session.notes.idOf(selected.value) : null))
  const tool = ref<MarkTool | null>(null)
  /** the observation in the editor; `fresh` until it is left the first time */
  const editing = ref<{ id: string; fresh: boolean } | null>(null)
  const showLetBe = ref(false)

  const changes = computed(() => [...session.fitting.value?.changes ?? [], ...session.fitting.value?.carriedIn ?? []])
  const cards = computed(() => (session.fitting.value ? changeCards(session.fitting.value).open : []))
  const notches = computed(() => notchesOf(cards.value))
  const current = computed(() => session.observations.value.find(({ id }) => id === selectedId.value) ?? null)
  const edited = computed(() => (editing.value ? marking.find(editing.value.id) ?? null : null))
  const isOpen = ({ state }: { state: string }) => state !== 'settled' && state !== 'let-be'

  const boardMarks = computed<BoardMark[]>(() => session.observations.value.flatMap((one) => {
    const onThis = one.mark && one.photographId === photos.current.value?.id && (one.state !== 'let-be' || showLetBe.value || one.id === selectedId.value)
    return onThis ? [{ id: one.id, number: one.number, ...one.mark!, state: one.state, label: spokenLabel(one, changes.value, format) }] : []
  }))
  const counts = computed(() => {
    const map = new Map<string, number>()
    for (const one of session.observations.value) if (one.photographId && isOpen(one)) map.set(one.photographId, (map.get(one.photographId) ?? 0) + 1)
    return map
  })

  function select(id: string | null) {
    selected.value = id
    const one = session.observations.value.find((seen) => seen.id === id)
    if (one?.photographId && photos.photographs.value.some((photograph) => photograph.id === one.photographId)) photos.show(one.photographId)
    if (one) say(spokenLabel(one, changes.value, format))
    if (editing.value && editing.value.id !== id) editing.value = id && editing.value ? null : editing.value
  }
  /** The observation before or after in the list. */
  function step(by: 1 | -1) {
    const list = session.observations.value
    if (list.length === 0) return
    const at = list.findIndex(({ id }) => id === selectedId.value)
    select(list[(at + by + list.length) % list.length]!.id)
  }
  function edit(id: string) {
    select(id)
    editing.value = { id, fresh: false }
  }
  function leaveEditor() {
    const one = edited.value
    if (editing.value?.fresh && one) say(`${spokenLabel(one, changes.value, format)}.`)
    editing.value = null
  }

  /** A mark was put on the photograph: noted at once with its first reading, then corrected in the editor. */
  function place(mark: Mark) {
    const photograph = photos.current.value
    if (!photograph) return
    const input = guessObservation(mark, photograph.view, project().garment.kind, photograph.id, photograph.width / photograph.height)
    begin(marking.note(input), sentenceOf(input))
  }
  /** An observation in words alone. */
  function writeDown() {
    const view = photos.view.value
    begin(marking.note({ photographId: null, mark: null, sign: 'excess', zone: 'waist', view, side: 'both', direction: null, towards: null, line: null, severity: 2, amount: null, note: '' }), 'Without a mark')
  }
  function begin(id: string, words: string) {
    tool.value = null
    selected.value = id
    editing.value = { id, fresh: true }
    say(`${words}. Say what it is and how much.`)
  }
  async function remove(id: string) {
    const one = marking.find(id)
    if (!one || !await marking.remove(id)) return
    if (editing.value && session.notes.idOf(editing.value.id) === one.id) editing.value = null
    if (selectedId.value === one.id) selected.value = null
    tell(`Observation ${one.number} removed.`, { text: 'Undo', run: () => void go('undo') })
  }
  function adjustAmount(byMm: number) {
    const one = current.value
    if (!one || !can.value.mark) return
    const mm = Math.min(500, Math.max(0, Math.round(((one.amount?.mm ?? 0) + byMm) * 1000) / 1000))
    marking.change(one.id, { amount: { mm, as: one.amount?.as ?? askFor(one.sign).as } })
    say(format(mm))
  }
  async function go(way: 'undo' | 'redo') {
    try {
      const done = await session.history[way]()
      if (done) say(`${way === 'undo' ? 'Taken back' : 'Done again'}: ${done.label}.`)
    } catch (failure) {
      session.problem.value = `${explainFailure(failure).message} It can be tried again.`
    }
  }

  const isNewest = computed(() => number >= Math.max(...project().samples.map((sample) => sample.number), number))
  const stepCounts = computed(() => ({
    photographs: photos.photographs.value.length, open: session.observations.value.filter(({ state }) => state === 'noted').length, toCarry: changesToCarry(session.fitting.value?.changes ?? []),
  }))

  /** in the words of the visible save state: what is kept on the device is not saved yet */
  const saveWord = computed(() => { const { value } = session.notes.saveState; return value === 'kept' ? 'failed' : value })

  return {
    project, number, saveWord, session, marking, decisions, sampleWork, photos, can, selectedId, tool, editing, edited, showLetBe, changes, cards, notches, current, boardMarks, counts,
    select, step, edit, leaveEditor, place, writeDown, remove, adjustAmount, undo: () => go('undo'), redo: () => go('redo'), isNewest, stepCounts, say, format,
    base: `/p/${project().id}/samples/${number}`,
  }
}
export type FittingContext = ReturnType<typeof createFitting>
export const fittingKey: InjectionKey<FittingContext> = Symbol('fitting')

export function useFittingContext(): FittingContext {
  const context = inject(fittingKey)
  if (!context) throw new Error('The fitting is used outside its screen.')
  return context
}
