// @vitest-environment happy-dom
import { effectScope } from 'vue'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import { type Photograph } from '#shared/contracts/photograph.ts'
import { type KeptPhotograph, type PendingPhotographs } from '../../../src/composables/fitting/pendingPhotographs.ts'
import { type QueuedPhotograph, usePhotographQueue } from '../../../src/composables/fitting/usePhotographQueue.ts'

const jpeg = (name: string, type = 'image/jpeg') => new File(['light'], name, { type })
const settle = () => new Promise((resolve) => setTimeout(resolve, 0))

function memory(kept: KeptPhotograph[] = []): PendingPhotographs & { kept: Map<string, KeptPhotograph> } {
  const map = new Map(kept.map((one) => [one.key, one]))
  return { kept: map, keep: async (one) => { map.set(one.key, one) }, drop: async (key) => { map.delete(key) }, all: async () => [...map.values()] }
}
type Attempt = { key: string; name: string; resolve: () => void; reject: (failure: Error) => void; progress: (part: number) => void; signal: AbortSignal }

function queueOf(pending = memory(), filled: QueuedPhotograph['view'][] = []) {
  const attempts: Attempt[] = []
  const sent: string[] = []
  const queue = effectScope().run(() => usePhotographQueue({
    filled, pending,
    send: (item, { signal, onProgress }) => new Promise<Photograph>((resolve, reject) => {
      attempts.push({ key: item.key, name: item.file.name, signal, progress: onProgress, resolve: () => resolve({ id: item.key } as Photograph), reject })
      signal.addEventListener('abort', () => reject(new Error('aborted')))
    }),
    onSent: (_photograph, item) => sent.push(item.file.name),
    explain: (failure) => ({ message: (failure as Error).message, again: !(failure as Error).message.includes('cannot') }),
  }))!
  return { queue, attempts, sent, pending, states: () => queue.items.value.map(({ file, state }) => [file.name, state]) }
}

describe('photographs on their way', () => {
  beforeEach(() => {
    vi.stubGlobal('URL', Object.assign(URL, { createObjectURL: () => 'blob:preview', revokeObjectURL: () => {} }))
  })

  it('go one after the other into the empty views', async () => {
    const { queue, attempts, sent } = queueOf(memory(), ['front'])
    queue.add([jpeg('a.jpg'), jpeg('b.jpg')])
    expect(queue.items.value.map(({ view }) => view)).toEqual(['back', 'left'])
    expect(attempts.map(({ name }) => name)).toEqual(['a.jpg'])
    attempts[0]!.resolve()
    await settle()
    expect(attempts.map(({ name }) => name)).toEqual(['a.jpg', 'b.jpg'])
    expect(sent).toEqual(['a.jpg'])
  })

  it('stay with a retry when they fail, and the others arrive', async () => {
    const { queue, attempts, sent, states, pending } = queueOf()
    queue.add([jpeg('a.jpg'), jpeg('b.jpg'), jpeg('c.jpg')])
    attempts[0]!.resolve()
    await settle()
    attempts[1]!.progress(0.62)
    attempts[1]!.reject(new Error('The connection dropped at 62 %.'))
    await settle()
    attempts[2]!.resolve()
    await settle()
    expect(sent).toEqual(['a.jpg', 'c.jpg'])
    expect(states()).toEqual([['b.jpg', 'failed']])
    expect(queue.items.value[0]!.message).toBe('The connection dropped at 62 %.')
    expect([...pending.kept.values()].map(({ file }) => file.name)).toEqual(['b.jpg'])
  })

  it('are sent again under the same key', async () => {
    const { queue, attempts, sent } = queueOf()
    queue.add([jpeg('a.jpg')])
    attempts[0]!.reject(new Error('The connection dropped.'))
    await settle()
    queue.retry(attempts[0]!.key)
    expect(attempts[1]!.key).toBe(attempts[0]!.key)
    attempts[1]!.resolve()
    await settle()
    expect(sent).toEqual(['a.jpg'])
    expect(queue.items.value).toEqual([])
  })

  it('are tried again when the connection is back, never all at once', async () => {
    const { queue, attempts } = queueOf()
    queue.add([jpeg('a.jpg'), jpeg('b.jpg')])
    attempts[0]!.reject(new Error('offline'))
    await settle()
    attempts[1]!.reject(new Error('offline'))
    await settle()
    expect(attempts).toHaveLength(2)
    window.dispatchEvent(new Event('online'))
    await settle()
    expect(attempts).toHaveLength(3)
    attempts[2]!.resolve()
    await settle()
    expect(attempts).toHaveLength(4)
  })

  it('two of one name stay two', async () => {
    const { queue, attempts, sent } = queueOf()
    queue.add([jpeg('image.jpg'), jpeg('image.jpg')])
    attempts[0]!.resolve()
    await settle()
    attempts[1]!.resolve()
    await settle()
    expect(sent).toEqual(['image.jpg', 'image.jpg'])
    expect(attempts[0]!.key).not.toBe(attempts[1]!.key)
  })

  it('keep the view of the first attempt in a repeated request, and report the one chosen since', async () => {
    const views: (string | null)[] = []
    const sent: string[] = []
    let fail = true
    const queue = effectScope().run(() => usePhotographQueue({
      filled: [], pending: memory(), explain: () => ({ message: 'The connection dropped.', again: true }),
      send: async (item) => { views.push(item.sentView); if (fail) throw new Error('offline'); return { id: item.key } as Photograph },
      onSent: (_photograph, item) => sent.push(item.view),
    }))!
    queue.add([jpeg('a.jpg')])
    await settle()
    queue.setView(queue.items.value[0]!.key, 'left')
    fail = false
    queue.retryAll()
    await settle()
    expect(views).toEqual(['front', 'front'])
    expect(sent).toEqual(['left'])
  })

  it('are refused by name where they cannot be photographs, in place, without stopping the rest', () => {
    const { queue, attempts, states } = queueOf()
    queue.add([jpeg('notes.txt', 'text/plain'), jpeg('a.heic', '')])
    expect(states()).toEqual([['notes.txt', 'refused'], ['a.heic', 'sending']])
    expect(queue.items.value[0]!.message).toContain('JPEG')
    expect(attempts.map(({ name }) => name)).toEqual(['a.heic'])
  })

  it('do not bounce: what the server will never take is refused for good', async () => {
    const { queue, attempts, states, pending } = queueOf()
    queue.add([jpeg('a.jpg')])
    attempts[0]!.reject(new Error('We cannot read this picture.'))
    await settle()
    expect(states()).toEqual([['a.jpg', 'refused']])
    queue.retryAll()
    expect(attempts).toHaveLength(1)
    expect(pending.kept.size).toBe(0)
  })

  it('can be cancelled on the way, and the next one starts', async () => {
    const { queue, attempts, sent } = queueOf()
    queue.add([jpeg('a.jpg'), jpeg('b.jpg')])
    await queue.cancel(attempts[0]!.key)
    await settle()
    expect(attempts[0]!.signal.aborted).toBe(true)
    expect(attempts[1]!.name).toBe('b.jpg')
    attempts[1]!.resolve()
    await settle()
    expect(sent).toEqual(['b.jpg'])
  })

  it('are taken up again after a reload, under the key they had', async () => {
    const { queue, attempts } = queueOf(memory([{ key: 'kept-key', file: jpeg('a.jpg'), view: 'left' }]))
    await queue.resume()
    expect(attempts[0]!.key).toBe('kept-key')
    expect(queue.items.value[0]!.view).toBe('left')
  })
})
