import { effectScope } from 'vue'
import { afterEach, expect, it, vi } from 'vitest'
import { ApiError } from '../../../src/api/call.ts'
import { useFinalCut } from '../../../src/composables/project/useFinalCut.ts'

type Sent = { version: number; ticks?: Record<string, boolean> }
const server = vi.hoisted(() => ({ call: vi.fn() }))
vi.mock('@pinia/colada', () => ({ useQueryCache: () => ({ invalidateQueries: vi.fn() }) }))
vi.mock('../../../src/api/call.ts', async (original) => ({ ...(await original<object>()), call: server.call }))

const list = (version: number, ticked: string[]) => ({ version, cloth: {}, shrinkage: {}, note: '', items: ['moved', 'pressed'].map((id) => ({ id, ticked: ticked.includes(id) })) })
const scope = effectScope()
afterEach(() => { server.call.mockReset() })

async function opened() {
  server.call.mockResolvedValueOnce(list(1, []))
  const cut = scope.run(() => useFinalCut('p'))!
  await cut.load()
  const open: { resolve: (value: unknown) => void; reject: (failure: Error) => void }[] = []
  server.call.mockImplementation(() => new Promise((resolve, reject) => { open.push({ resolve, reject }) }))
  const settle = async (work: (one: (typeof open)[number]) => void) => { work(open.shift()!); await new Promise((done) => { setTimeout(done) }) }
  const sent = (n: number) => (server.call.mock.calls[n]![1] as { body: Sent }).body
  return { cut, settle, sent, ticked: () => cut.finalCut.value!.items.filter(({ ticked }) => ticked).map(({ id }) => id) }
}

it('keeps a tick on screen while an earlier one is still on its way', async () => {
  const { cut, settle, sent, ticked } = await opened()
  cut.change({ ticks: { moved: true } })
  cut.change({ ticks: { pressed: true } })
  await settle(({ resolve }) => resolve(list(2, ['moved'])))
  expect(ticked()).toEqual(['moved', 'pressed'])
  expect(sent(2)).toEqual({ version: 2, ticks: { pressed: true } })
})

it('sends both again when the first did not arrive', async () => {
  const { cut, settle, sent } = await opened()
  cut.change({ ticks: { moved: true } })
  cut.change({ ticks: { pressed: true } })
  await settle(({ reject }) => reject(new ApiError(503, 'away', 'Away')))
  expect(cut.state.value).toBe('failed')
  void cut.again()
  expect(sent(2)).toEqual({ version: 1, ticks: { moved: true, pressed: true } })
})
