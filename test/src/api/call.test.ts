import { afterEach, describe, expect, it, vi } from 'vitest'
import { z } from 'zod'
import { defineRoute } from '#shared/contracts/route.ts'
import { ApiError, addressOf, call, whenSignedOut } from '../../../src/api/call.ts'

const read = defineRoute({
  id: 'hems.read', method: 'get', path: '/api/hems/:hemId', access: 'signed-in', summary: 'A hem',
  params: z.strictObject({ hemId: z.string() }), query: z.strictObject({ q: z.string().optional(), n: z.number().optional() }), response: z.object({ depthMm: z.number() }),
})
const create = defineRoute({
  id: 'hems.create', method: 'post', path: '/api/hems', access: 'signed-in', summary: 'Add a hem', idempotent: true,
  body: z.strictObject({ depthMm: z.number() }), response: z.object({ depthMm: z.number() }),
})
const remove = defineRoute({ id: 'hems.remove', method: 'delete', path: '/api/hems/:hemId', access: 'signed-in', summary: 'Remove a hem', params: z.strictObject({ hemId: z.string() }), response: null })

/** Answers every request with this, and notes what was asked. */
function server(answer: () => Response | Promise<Response>) {
  const asked: { url: string; init: RequestInit }[] = []
  vi.stubGlobal('fetch', async (url: string, init: RequestInit) => {
    asked.push({ url, init })
    return answer()
  })
  return asked
}
const json = (body: unknown, status = 200, headers = {}) => new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json', ...headers } })
const refusal = (code: string, details = {}) => ({ error: { code, message: 'The hem is too deep.', details } })
const failureOf = async (work: Promise<unknown>) => work.then(() => { throw new Error('it was not refused') }, (failure: unknown) => failure as ApiError)
afterEach(() => vi.unstubAllGlobals())

describe('address of a route', () => {
  it('fills in parameters so that none can reach another path', () => expect(addressOf(read, { hemId: '../me?x' })).toBe('/api/hems/..%2Fme%3Fx'))
  it('leaves out of the query what is not there', () => expect(addressOf(read, { hemId: 'a' }, { q: '', n: undefined })).toBe('/api/hems/a'))
  it('keeps a zero in the query', () => expect(addressOf(read, { hemId: 'a' }, { q: 'back & side', n: 0 })).toBe('/api/hems/a?q=back+%26+side&n=0'))
})

describe('call', () => {
  it('sends JSON with the key it may be repeated under, to its own origin only', async () => {
    const asked = server(() => json({ depthMm: 30 }))
    await expect(call(create, { body: { depthMm: 30 }, idempotencyKey: 'one-hem-only' })).resolves.toEqual({ depthMm: 30 })
    expect(asked[0]).toMatchObject({ url: '/api/hems', init: { method: 'POST', credentials: 'same-origin', body: '{"depthMm":30}' } })
    expect(asked[0]!.init.headers).toMatchObject({ 'Content-Type': 'application/json', 'Idempotency-Key': 'one-hem-only' })
  })
  it('reads nothing from an empty answer', async () => {
    server(() => new Response(null, { status: 204 }))
    await expect(call(remove, { params: { hemId: 'a' } })).resolves.toBeUndefined()
  })
  it('tells a refusal with its sentence, details and the wait', async () => {
    server(() => json(refusal('request.too-many', { depthMm: 'At most 80.' }), 429, { 'Retry-After': '12' }))
    const failure = await failureOf(call(create, { body: { depthMm: 90 } }))
    expect(failure).toBeInstanceOf(ApiError)
    expect(failure).toMatchObject({ status: 429, code: 'request.too-many', message: 'The hem is too deep.', details: { depthMm: 'At most 80.' }, retryAfterSeconds: 12 })
  })
  it('tells a dropped connection in words, and no exception of the browser', async () => {
    server(() => Promise.reject(new TypeError('Failed to fetch')))
    const failure = await failureOf(call(read, { params: { hemId: 'a' } }))
    expect(failure).toMatchObject({ status: 0, code: 'network' })
    expect(failure.message).toMatch(/^The connection dropped\./)
  })
  it('lets a cancelled request be a cancelled request', async () => {
    const stop = new AbortController()
    server(() => {
      stop.abort()
      return Promise.reject(new DOMException('stopped', 'AbortError'))
    })
    await expect(call(read, { params: { hemId: 'a' }, signal: stop.signal })).rejects.toMatchObject({ name: 'AbortError' })
  })
  it.each([['another shape', () => json({ depth: 30 })], ['no JSON at all', () => new Response('<!doctype html>')]])('does not pass on an answer of %s', async (_, answer) => {
    server(answer)
    await expect(call(read, { params: { hemId: 'a' } })).rejects.toMatchObject({ code: 'answer.unreadable' })
  })
  it('tells a broken proxy apart from a refusal', async () => {
    server(() => new Response('Bad gateway', { status: 502 }))
    await expect(call(read, { params: { hemId: 'a' } })).rejects.toMatchObject({ status: 502, code: 'network', message: 'The journal could not answer. Try again in a moment.' })
  })
  it('tells once that nobody is signed in any more', async () => {
    const told = vi.fn()
    whenSignedOut(told)
    server(() => json(refusal('sign-in.needed'), 401))
    await failureOf(call(read, { params: { hemId: 'a' } }))
    expect(told).toHaveBeenCalledTimes(1)
    server(() => json(refusal('sign-in.wrong'), 401))
    await failureOf(call(read, { params: { hemId: 'a' } }))
    expect(told).toHaveBeenCalledTimes(1)
    whenSignedOut(() => {})
  })
})
