import { effectScope } from 'vue'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { ApiError } from '../../../src/api/call.ts'
import { useAutosave } from '../../../src/composables/useAutosave.ts'

const scopes: ReturnType<typeof effectScope>[] = []
/** A save the test lets through or refuses. */
function setUp(options: Parameters<typeof useAutosave>[1] = {}) {
  const scope = effectScope()
  scopes.push(scope)
  const open: { resolve: () => void; reject: (failure: Error) => void }[] = []
  const save = vi.fn(() => new Promise<void>((resolve, reject) => { open.push({ resolve, reject }) }))
  const autosave = scope.run(() => useAutosave(save, { delayMs: 600, ...options }))!
  const tick = (ms = 0) => vi.advanceTimersByTimeAsync(ms)
  return { scope, save, autosave, tick, done: async () => { open.shift()!.resolve(); await tick() }, refuse: async (failure: Error) => { open.shift()!.reject(failure); await tick() } }
}
beforeEach(() => { vi.useFakeTimers() })
afterEach(() => {
  for (const scope of scopes.splice(0)) scope.stop()
  vi.useRealTimers()
})

describe('useAutosave', () => {
  it('saves once, a moment after the last of several changes', async () => {
    const { save, autosave, tick, done } = setUp()
    autosave.touch()
    await tick(500)
    autosave.touch()
    await tick(500)
    expect(save).not.toHaveBeenCalled()
    expect(autosave.state.value).toBe('waiting')
    await tick(100)
    expect(autosave.state.value).toBe('saving')
    await done()
    expect(autosave.state.value).toBe('saved')
    expect(save).toHaveBeenCalledTimes(1)
    expect(autosave.savedAt.value).toBeInstanceOf(Date)
  })
  it('never has two saves under way; a change meanwhile is saved after', async () => {
    const { save, autosave, tick, done } = setUp()
    autosave.touch()
    await tick(600)
    autosave.touch()
    await tick(600)
    expect(save).toHaveBeenCalledTimes(1)
    await done()
    expect(save).toHaveBeenCalledTimes(2)
    await done()
    expect(autosave.state.value).toBe('saved')
  })
  it('keeps what could not be sent, says why, and sends it when the line is back', async () => {
    const { save, autosave, tick, done, refuse } = setUp()
    autosave.touch()
    await tick(600)
    await refuse(new ApiError(0, 'network', 'The connection dropped.'))
    expect([autosave.state.value, autosave.problem.value]).toEqual(['failed', 'The connection dropped.'])
    window.dispatchEvent(new Event('online'))
    await done()
    expect(save).toHaveBeenCalledTimes(2)
    expect([autosave.state.value, autosave.problem.value]).toEqual(['saved', ''])
  })
  it('hands over what somebody else saved meanwhile and does not save over it by itself', async () => {
    const onClash = vi.fn()
    const { save, autosave, tick, refuse } = setUp({ onClash })
    autosave.touch()
    await tick(600)
    await refuse(new ApiError(409, 'version.stale', 'Rosalind changed this.', { theirs: { version: 4 } }))
    expect(onClash).toHaveBeenCalledWith({ version: 4 })
    expect(autosave.state.value).toBe('clash')
    window.dispatchEvent(new Event('online'))
    await tick(5000)
    expect(save).toHaveBeenCalledTimes(1)
  })
  it('holds the page back only while something is not saved, and sends the rest when the view closes', async () => {
    const { scope, save, autosave, tick } = setUp()
    const leave = () => {
      const event = new Event('beforeunload', { cancelable: true })
      window.dispatchEvent(event)
      return event.defaultPrevented
    }
    expect(leave()).toBe(false)
    autosave.touch()
    expect(leave()).toBe(true)
    scope.stop()
    await tick()
    expect(save).toHaveBeenCalledTimes(1)
    expect(leave()).toBe(false)
  })
})
