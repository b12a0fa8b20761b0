import { describe, expect, it } from 'vitest'
import { useUndo } from '../../../src/composables/useUndo.ts'

const onList = (list: string[], name: string) => ({ label: `Mark ${name}`, undo: () => { list.splice(list.indexOf(name), 1) }, redo: () => { list.push(name) } })

describe('undo', () => {
  it('takes back and redoes in order', async () => {
    const list = ['a', 'b']
    const history = useUndo()
    history.note(onList(list, 'a'))
    history.note(onList(list, 'b'))
    expect(history.canUndo.value).toBe('Mark b')
    await history.undo()
    await history.undo()
    expect(list).toEqual([])
    expect(await history.undo()).toBeNull()
    await history.redo()
    expect(list).toEqual(['a'])
    expect(history.canRedo.value).toBe('Mark b')
  })
  it('forgets what was undone once something new is done', async () => {
    const list = ['a']
    const history = useUndo()
    history.note(onList(list, 'a'))
    await history.undo()
    list.push('c')
    history.note(onList(list, 'c'))
    expect(history.canRedo.value).toBeNull()
    expect(await history.redo()).toBeNull()
  })
  it('keeps a step that failed, so that it can be tried again', async () => {
    const history = useUndo()
    let fail = true
    history.note({ label: 'Remove', undo: () => { if (fail) throw new Error('no connection') }, redo: () => {} })
    await expect(history.undo()).rejects.toThrow('no connection')
    expect(history.canUndo.value).toBe('Remove')
    expect(history.busy.value).toBe(false)
    fail = false
    await history.undo()
    expect(history.canUndo.value).toBeNull()
  })
  it('does not start a second step while one is under way', async () => {
    const history = useUndo()
    let release = () => {}
    history.note({ label: 'first', undo: () => {}, redo: () => {} })
    history.note({ label: 'second', undo: () => new Promise<void>((resolve) => { release = resolve }), redo: () => {} })
    const slow = history.undo()
    expect(await history.undo()).toBeNull()
    release()
    await slow
    expect(history.canUndo.value).toBe('first')
  })
})
