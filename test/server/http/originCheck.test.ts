import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { originCheck } from '#server/http/originCheck.ts'
import { readSettings } from '#server/settings.ts'
import { type TestApp, origin, testApp } from '../../support/testApp.ts'

let t: TestApp
beforeAll(async () => { t = await testApp() })
afterAll(() => t.close())

const post = (headers: Record<string, string>) => request(t.server).post('/api/sign-out').set(headers)

describe('a request that changes something', () => {
  it.each([
    ['our own origin', { Origin: origin }, 204],
    ['our own origin, said by the browser too', { 'Origin': origin, 'Sec-Fetch-Site': 'same-origin' }, 204],
    ['another origin', { Origin: 'https://elsewhere.example' }, 403],
    ['our origin with another port', { Origin: `${origin}:8080` }, 403],
    ['our origin as the beginning of another', { Origin: `${origin}.elsewhere.example` }, 403],
    ['an opaque origin', { Origin: 'null' }, 403],
    ['a subdomain', { 'Origin': origin, 'Sec-Fetch-Site': 'same-site' }, 403],
    ['another site', { 'Origin': origin, 'Sec-Fetch-Site': 'cross-site' }, 403],
    ['no origin at all', {}, 403],
    ['same-origin without an Origin header', { 'Sec-Fetch-Site': 'same-origin' }, 403],
  ] as const)('from %s', async (_name, headers, status) => {
    const { body } = await post(headers).expect(status)
    if (status === 403) expect(body.error.code).toBe('request.origin')
  })
  it.each(['put', 'patch', 'delete'] as const)('by %s is checked too', async (method) => {
    await request(t.server)[method]('/api/me').expect(403)
  })
})

it('lets reading through from anywhere: nothing is changed by it, and no other origin may read the answer', async () => {
  await request(t.server).get('/api/health').set('Origin', 'https://elsewhere.example').expect(200)
})

describe('without a public address', () => {
  const check = (headers: Record<string, string>) => {
    const settings = readSettings({ DATABASE_URL: 'postgres://app@127.0.0.1/x', SESSION_SECRET: 'only for this test 0123456789 abcdef' }, 'local')
    let refused: unknown
    const req = { method: 'POST', protocol: 'http', get: (name: string) => headers[name] }
    originCheck(settings)(req as never, {} as never, (error?: unknown) => { refused = error })
    return refused === undefined
  }
  it('takes the host that was asked for, and what the browser calls one origin behind a development proxy', () => {
    expect(check({ host: '127.0.0.1:4310', origin: 'http://127.0.0.1:4310' })).toBe(true)
    expect(check({ 'host': '127.0.0.1:4310', 'origin': 'http://127.0.0.1:5173', 'sec-fetch-site': 'same-origin' })).toBe(true)
    expect(check({ host: '127.0.0.1:4310', origin: 'http://127.0.0.1:5173' })).toBe(false)
    expect(check({ 'host': '127.0.0.1:4310', 'origin': 'https://elsewhere.example', 'sec-fetch-site': 'cross-site' })).toBe(false)
  })
})
