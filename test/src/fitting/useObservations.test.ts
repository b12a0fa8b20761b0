// @vitest-environment happy-dom
import { effectScope } from 'vue'
import { beforeEach, describe, expect, it } from 'vitest'
import { type FittingObservation } from '#shared/contracts/fitting.ts'
import { type Failure, type ObservationInput, type ObservationServer, useObservations } from '../../../src/composables/fitting/useObservations.ts'

const settle = () => new Promise((resolve) => setTimeout(resolve, 0))
const me = { id: '0d2c0c52-6f5e-4f5f-9d0a-111111111111', name: 'Ilse' }
const input = (more: Partial<ObservationInput> = {}): ObservationInput => ({
  photographId: null, mark: null, sign: 'gaping', zone: 'armhole', view: 'front', side: 'both', direction: null, towards: null, line: null, severity: 2, amount: null, note: '', ...more,
})
const seen = (more: Partial<FittingObservation> = {}): FittingObservation => ({
  ...input(), note: '', id: 'seen-1', number: 1, sampleNumber: 1, state: 'noted', letBeReason: '', readings: [], predicted: null, by: me, createdAt: '2025-11-12T10:00:00Z', version: 1, ...more,
} as FittingObservation)

class Refused extends Error { constructor(readonly kind: Failure['kind'], readonly theirs?: FittingObservation) { super(`${kind}.`) } }
const explain = (failure: unknown): Failure => ({ kind: (failure as Refused).kind, message: (failure as Refused).message, theirs: (failure as Refused).theirs })

function open(server: Partial<ObservationServer>) {
  const saved: FittingObservation[] = []
  const store = effectScope().run(() => useObservations({
    server: { create: async (body) => seen({ ...body, id: 'made' } as Partial<FittingObservation>), update: async (id, { version, ...patch }) => seen({ ...patch, id, version: version + 1 } as Partial<FittingObservation>), ...server },
    explain, storageKey: 'test.fitting', sampleNumber: () => 1, me: () => me, onSaved: (one) => saved.push(one),
  }))!
  return { store, saved }
}

beforeEach(() => localStorage.clear())

describe('observations', () => {
  it('show a new one at once with the next number, and keep its place when the server answers', async () => {
    const { store } = open({ create: async (body) => seen({ ...body, id: 'made', number: 2 } as Partial<FittingObservation>) })
    store.receive([seen()])
    const id = store.add(input({ zone: 'bust' }))
    expect(store.observations.value.map(({ number, unsent }) => [number, unsent])).toEqual([[1, false], [2, true]])
    await settle()
    expect(store.observations.value.map(({ id, unsent }) => [id, unsent])).toEqual([['seen-1', false], ['made', false]])
    expect(store.idOf(id)).toBe('made')
    expect(store.saveState.value).toBe('saved')
  })

  it('keep a mark on the device without a connection and send it again under the same key', async () => {
    const keys: string[] = []
    let offline = true
    const server: Partial<ObservationServer> = { create: async (body, key) => { keys.push(key); if (offline) throw new Refused('offline'); return seen({ ...body, id: 'made' } as Partial<FittingObservation>) } }
    const { store } = open(server)
    store.add(input())
    await settle()
    expect(store.saveState.value).toBe('kept')
    expect(store.waitingCount.value).toBe(1)
    // The page is loaded again.
    const { store: again } = open(server)
    expect(again.observations.value).toHaveLength(1)
    offline = false
    again.sendAll()
    await settle()
    expect(new Set(keys).size).toBe(1)
    expect(again.observations.value.map(({ id }) => id)).toEqual(['made'])
    expect(localStorage.getItem('test.fitting')).toBeNull()
  })

  it('send what was changed before the mark itself had arrived', async () => {
    const updates: unknown[] = []
    let release = () => {}
    const { store } = open({
      create: (body) => new Promise((resolve) => { release = () => resolve(seen({ ...body, id: 'made' } as Partial<FittingObservation>)) }),
      update: async (id, body) => { updates.push([id, body]); return seen({ id, version: 2, note: 'left only' }) },
    })
    const id = store.add(input())
    store.edit(id, { note: 'left only' })
    expect(store.observations.value[0]!.note).toBe('left only')
    release()
    await settle()
    expect(updates).toEqual([['made', { note: 'left only', version: 1 }]])
  })

  it('send one request at a time and the newest words last', async () => {
    const bodies: { note?: string; version: number }[] = []
    const { store } = open({ update: async (id, body) => { bodies.push(body); await settle(); return seen({ id, note: body.note ?? '', version: body.version + 1 }) } })
    store.receive([seen()])
    store.edit('seen-1', { note: 'a' })
    store.edit('seen-1', { note: 'ab' })
    store.edit('seen-1', { note: 'abc' })
    await settle(); await settle(); await settle()
    expect(bodies).toEqual([{ note: 'a', version: 1 }, { note: 'abc', version: 2 }])
    expect(store.observations.value[0]!.note).toBe('abc')
  })

  it('keep both states when someone else was faster, until one is picked', async () => {
    const theirs = seen({ note: 'hers', version: 5 })
    const versions: number[] = []
    const { store } = open({ update: async (id, body) => { versions.push(body.version); if (body.version < 5) throw new Refused('stale', theirs); return seen({ id, note: body.note ?? '', version: 6 }) } })
    store.receive([seen()])
    store.edit('seen-1', { note: 'mine' })
    await settle()
    expect(store.saveState.value).toBe('clash')
    expect(store.clashes.value).toEqual([{ id: 'seen-1', mine: { note: 'mine' }, theirs }])
    expect(store.observations.value[0]!.note).toBe('mine')
    store.settleClash('seen-1', 'mine')
    await settle()
    expect(versions).toEqual([1, 5])
    expect(store.saveState.value).toBe('saved')
    expect(store.observations.value[0]!.note).toBe('mine')
  })

  it('do not overwrite what someone else changed while this device was away', async () => {
    const { store } = open({ update: async () => { throw new Refused('offline') } })
    store.receive([seen({ version: 1 })])
    store.edit('seen-1', { note: 'mine' })
    await settle()
    const versions: number[] = []
    const { store: again } = open({ update: async (_id, body) => { versions.push(body.version); throw new Refused('stale', seen({ note: 'hers', version: 4 })) } })
    again.receive([seen({ note: 'hers', version: 4 })])
    await settle()
    expect(versions).toEqual([1])
    expect(again.saveState.value).toBe('clash')
  })

  it('take theirs where the person says so', async () => {
    const theirs = seen({ note: 'hers', version: 5 })
    const { store } = open({ update: async () => { throw new Refused('stale', theirs) } })
    store.receive([seen()])
    store.edit('seen-1', { note: 'mine' })
    await settle()
    store.settleClash('seen-1', 'theirs')
    expect(store.observations.value[0]).toMatchObject({ note: 'hers', version: 5, unsent: false })
  })

  it('do not bounce: what the server refused is sent again only by hand', async () => {
    let calls = 0
    const { store } = open({ update: async () => { calls++; throw new Refused('refused') } })
    store.receive([seen()])
    store.edit('seen-1', { note: 'mine' })
    await settle()
    store.receive([seen()])
    window.dispatchEvent(new Event('online'))
    await settle()
    expect(calls).toBe(1)
    expect(store.messageFor('seen-1')).toBe('refused.')
    store.sendAll()
    await settle()
    expect(calls).toBe(2)
    store.giveUp('seen-1')
    expect(store.observations.value[0]).toMatchObject({ note: '', unsent: false })
  })

  it('show an observation let be before the server says so', () => {
    const { store } = open({ update: () => new Promise(() => {}) })
    store.receive([seen()])
    store.edit('seen-1', { letBe: { reason: 'gone when she stands straight' } })
    expect(store.observations.value[0]).toMatchObject({ state: 'let-be', letBeReason: 'gone when she stands straight' })
  })

  it('lay unsent words over a list read meanwhile', async () => {
    const { store } = open({ update: async () => { throw new Refused('offline') } })
    store.receive([seen()])
    store.edit('seen-1', { note: 'mine' })
    await settle()
    store.receive([seen({ note: '', version: 1 }), seen({ id: 'seen-2', number: 2 })])
    expect(store.observations.value.map(({ note }) => note)).toEqual(['mine', ''])
  })
})
