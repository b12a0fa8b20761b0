import { type Mark } from '#shared/contracts/fitting.ts'
import { type View } from '#shared/fit/types.ts'
import { type FittingContext } from './fittingContext.ts'

const kinds: Record<string, Mark['kind']> = { d: 'drag-line', g: 'gape', t: 'tight', e: 'excess', l: 'length', b: 'balance', p: 'place' }
const viewsByKey: Record<string, View> = { 1: 'front', 2: 'back', 3: 'left', 4: 'right' }

type Actions = {
  startCrosshair: () => void
  accept: () => void
  takeBack: () => void
  /** opens the suggestion with its decision: alter and decline need a word more */
  openDecision: () => void
  compare: () => void
  list: () => void
  /** one step of the amount in the person's unit, mm */
  stepMm: () => number
  /** single letters may be turned off; undo and Escape stay */
  enabled: () => boolean
}

/** Keys of the board while it has the focus. Returns true when the key did something. */
export function useFittingKeys(context: FittingContext, actions: Actions) {
  const { photos, tool, can, step, adjustAmount, undo, redo, current, remove, edit, editing } = context

  function onKey(event: KeyboardEvent): boolean {
    const key = event.key.length === 1 ? event.key.toLowerCase() : event.key
    if ((event.ctrlKey || event.metaKey) && key === 'z') return done(event, () => void (event.shiftKey ? redo() : undo()))
    if ((event.ctrlKey || event.metaKey) && key === 'y') return done(event, () => void redo())
    if (event.ctrlKey || event.metaKey || event.altKey) return false
    if (key === 'Escape') return done(event, () => { tool.value = null; editing.value = null })
    if (!actions.enabled()) return false

    const view = viewsByKey[key]
    if (view) return done(event, () => photos.showView(view))
    if (key === 'ArrowLeft' || key === 'ArrowRight') return done(event, () => step(key === 'ArrowRight' ? 1 : -1))
    if (key === 'c') return done(event, actions.compare)
    if (key === '?') return done(event, actions.list)
    if (can.value.mark) {
      const kind = kinds[key]
      if (kind) return done(event, () => { tool.value = tool.value?.kind === kind ? null : { kind, shape: tool.value?.shape ?? 'stroke' } })
      if (key === 'm') return done(event, () => { tool.value ??= { kind: 'drag-line', shape: 'stroke' }; actions.startCrosshair() })
      if (key === 'ArrowUp' || key === 'ArrowDown') return done(event, () => adjustAmount(actions.stepMm() * (event.shiftKey ? 5 : 1) * (key === 'ArrowUp' ? 1 : -1)))
      if ((key === 'Delete' || key === 'Backspace') && current.value) return done(event, () => void remove(current.value!.id))
      if (key === 'Enter' && current.value) return done(event, () => edit(current.value!.id))
    }
    if (can.value.decide) {
      if (key === 'a') return done(event, actions.accept)
      if (key === 'z') return done(event, actions.takeBack)
      if (key === 'r' || key === 'x') return done(event, actions.openDecision)
    }
    return false
  }
  return { onKey }
}

function done(event: KeyboardEvent, work: () => void): true {
  event.preventDefault()
  work()
  return true
}
