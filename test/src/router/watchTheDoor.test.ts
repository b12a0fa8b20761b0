import { createPinia, setActivePinia } from 'pinia'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { createMemoryHistory, createRouter } from 'vue-router'
import { readMe } from '#shared/contracts/account.ts'
import { call } from '../../../src/api/call.ts'
import { watchTheDoor } from '../../../src/router/watchTheDoor.ts'
import { useSessionStore } from '../../../src/stores/session.ts'

const ilse = { id: '00000000-0000-4000-8000-000000000001', name: 'Ilse Moravec', email: 'ilse@moravec.example', units: 'cm', memberships: [] }
const json = (body: unknown, status = 200) => new Response(JSON.stringify(body), { status })
const nobody = () => json({ error: { code: 'sign-in.needed', message: 'Sign in first.', details: {} } }, 401)

const pages = ['/', '/account', '/sign-in', '/sign-up'].map((path) => ({ path, component: { template: '<h1>A page</h1>' }, meta: { open: path.startsWith('/sign'), title: path } }))

/** A page load: a router of its own, on a server that answers who is here. */
function load(answer: () => Response | Promise<Response>) {
  setActivePinia(createPinia())
  const asked = vi.fn(async () => answer())
  vi.stubGlobal('fetch', asked)
  const router = createRouter({ history: createMemoryHistory(), routes: pages })
  watchTheDoor(router)
  return { router, asked, session: useSessionStore() }
}
beforeEach(() => localStorage.clear())
afterEach(() => vi.unstubAllGlobals())

describe('who gets past the door', () => {
  it('leads a stranger to sign in, and remembers where they were going', async () => {
    const { router } = load(nobody)
    await router.push('/account?from=mail')
    expect(router.currentRoute.value).toMatchObject({ path: '/sign-in', query: { next: '/account?from=mail' } })
  })
  it('asks nothing of a stranger at the front door', async () => {
    const { router, asked } = load(nobody)
    await router.push('/sign-up')
    expect(router.currentRoute.value.path).toBe('/sign-up')
    expect(asked).not.toHaveBeenCalled()
  })
  it('lets in who is signed in, asking once, and spares them the front door', async () => {
    localStorage.setItem('proofcloth.was-in', 'true')
    const { router, asked } = load(() => json(ilse))
    await router.push('/account')
    expect(router.currentRoute.value.path).toBe('/account')
    await router.push('/sign-in')
    expect(router.currentRoute.value.path).toBe('/')
    expect(asked).toHaveBeenCalledTimes(1)
  })
  it('does not take a server that is away for a stranger', async () => {
    const { router, session } = load(() => Promise.reject(new TypeError('Failed to fetch')))
    await router.push('/account')
    expect(router.currentRoute.value.path).toBe('/account')
    expect(session.known).toBe(false)
    expect(session.away).toMatch(/^The connection dropped\./)
  })
  it('leads to the door when the session ended elsewhere', async () => {
    const { router, session } = load(() => json(ilse))
    await router.push('/account')
    vi.stubGlobal('fetch', async () => nobody())
    await call(readMe).catch(() => {})
    await vi.waitFor(() => expect(router.currentRoute.value.path).toBe('/sign-in'))
    expect(router.currentRoute.value.query.next).toBe('/account')
    expect(session.me).toBeNull()
  })
})
