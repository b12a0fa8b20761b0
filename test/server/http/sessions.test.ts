import request from 'supertest'
import { sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { sessions } from '#db/schema/sessions.ts'
import { type Browser, type TestApp, password, testApp } from '../../support/testApp.ts'

let t: TestApp
beforeAll(async () => { t = await testApp() })
afterAll(() => t.close())

const cookieOf = (response: request.Response) => (response.headers['set-cookie'] as unknown as string[] | undefined)?.[0] ?? ''
const valueOf = (cookie: string) => cookie.split(';')[0]!
const signIn = (browser: Browser, email: string) => browser.post('/api/sign-in').send({ email, password }).expect(200)
const withCookie = (cookie: string) => request(t.server).get('/api/me').set('Cookie', valueOf(cookie))
const sidOf = (cookie: string) => decodeURIComponent(valueOf(cookie).split('=')[1]!).slice(2).split('.')[0]!
const change = (cookie: string, set: object) => t.db.update(sessions)
  .set({ sess: sql`(${sessions.sess}::jsonb || ${JSON.stringify(set)}::jsonb)::json` }).where(sql`${sessions.sid} = ${sidOf(cookie)}`)

describe('the cookie', () => {
  it('is out of reach of scripts and of other sites', async () => {
    const cookie = cookieOf(await signIn(t.browser(), t.owner.email))
    expect(cookie).toMatch(/^proofcloth=/)
    expect(cookie).toMatch(/HttpOnly/)
    expect(cookie).toMatch(/SameSite=Lax/)
    expect(cookie).toMatch(/Path=\//)
    expect(sidOf(cookie).length).toBeGreaterThanOrEqual(32) // 24 random bytes in base64
  })
  it('is bound to host and https where the public address is https', async () => {
    const secure = await testApp({ env: { PUBLIC_URL: 'https://journal.example.org' } })
    const answer = await secure.browser().post('/api/sign-in').set('X-Forwarded-Proto', 'https').send({ email: secure.owner.email, password }).expect(200)
    expect(cookieOf(answer)).toMatch(/^__Host-proofcloth=.*Path=\/;.*Secure/)
    expect(cookieOf(answer)).not.toMatch(/Domain/)
    await secure.close()
  })
  it('is not given to who is not signed in', async () => {
    expect(cookieOf(await t.browser().post('/api/sign-in').send({ email: t.owner.email, password: 'wrong one here' }).expect(401))).toBe('')
    expect(cookieOf(await t.browser().get('/api/me').expect(401))).toBe('')
  })
  it('with another signature is nobody’s', async () => {
    const cookie = cookieOf(await signIn(t.browser(), t.owner.email))
    await withCookie(cookie).expect(200)
    await request(t.server).get('/api/me').set('Cookie', `${valueOf(cookie)}x`).expect(401)
  })
})

describe('the session’s id', () => {
  it('is new at sign-in, and the one before is worth nothing', async () => {
    const browser = t.browser()
    const before = cookieOf(await signIn(browser, t.owner.email))
    const after = cookieOf(await signIn(browser, t.owner.email))
    expect(valueOf(after)).not.toBe(valueOf(before))
    await withCookie(before).expect(401)
    await withCookie(after).expect(200)
  })
  it('is new after a change of role; the old one serves only requests under way', async () => {
    const browser = t.browser()
    const before = cookieOf(await signIn(browser, t.fitter.email))
    await t.owner.patch(`/api/studios/${t.studioId}/members/${t.fitter.userId}`).send({ role: 'maker' }).expect(200)

    const first = await withCookie(before).expect(200)
    const after = cookieOf(first)
    expect(valueOf(after)).not.toBe(valueOf(before))
    expect(first.body.memberships).toContainEqual(expect.objectContaining({ studioId: t.studioId, role: 'maker' }))
    const second = await withCookie(before).expect(200)
    expect(cookieOf(second)).toBe('')
    await withCookie(after).expect(200)

    const [row] = (await t.db.execute<{ left: number }>(sql`select extract(epoch from expire - now())::float8 as left from sessions where sid = ${sidOf(before)}`)).rows
    expect(row!.left).toBeGreaterThan(0)
    expect(row!.left).toBeLessThanOrEqual(30)
    await t.owner.patch(`/api/studios/${t.studioId}/members/${t.fitter.userId}`).send({ role: 'fitter' }).expect(200)
  })
  it('ends with sign-out', async () => {
    const browser = t.browser()
    const cookie = cookieOf(await signIn(browser, t.owner.email))
    expect(cookieOf(await browser.post('/api/sign-out').expect(204))).toMatch(/proofcloth=;.*Expires=Thu, 01 Jan 1970/)
    await withCookie(cookie).expect(401)
  })
})

describe('limits', () => {
  const day = 24 * 3600 * 1000
  it('ends after thirty days however often it is used', async () => {
    const cookie = cookieOf(await signIn(t.browser(), t.owner.email))
    await change(cookie, { startedAt: Date.now() - 29.9 * day })
    await withCookie(cookie).expect(200)
    await change(cookie, { startedAt: Date.now() - 30.1 * day })
    await withCookie(cookie).expect(401)
  })
  it('ends after its idle time', async () => {
    const cookie = cookieOf(await signIn(t.browser(), t.owner.email))
    await t.db.update(sessions).set({ expire: sql`now() - interval '1 second'` }).where(sql`${sessions.sid} = ${sidOf(cookie)}`)
    await withCookie(cookie).expect(401)
  })
  it('notes use at most every five minutes, and then lives two weeks on', async () => {
    const cookie = cookieOf(await signIn(t.browser(), t.owner.email))
    expect(cookieOf(await withCookie(cookie).expect(200))).toBe('')
    await change(cookie, { lastSeenAt: Date.now() - 6 * 60 * 1000 })
    await t.db.update(sessions).set({ expire: sql`now() + interval '1 day'` }).where(sql`${sessions.sid} = ${sidOf(cookie)}`)
    const expires = Date.parse(/Expires=([^;]+)/.exec(cookieOf(await withCookie(cookie).expect(200)))![1]!)
    expect(expires - Date.now()).toBeGreaterThan(13.9 * day)
    const [row] = (await t.db.execute<{ days: number }>(sql`select extract(epoch from expire - now())::float8 / 86400 as days from sessions where sid = ${sidOf(cookie)}`)).rows
    expect(row!.days).toBeGreaterThan(13.9)
  })
})

describe('the list of sessions', () => {
  it('names devices, marks one’s own, shows no id that could be used, and ends one', async () => {
    const email = (await t.person('Lena')).email
    const [phone, desk] = [t.browser().set('User-Agent', 'Mozilla/5.0 (iPhone; CPU iPhone OS 19_0 like Mac OS X) Safari/604.1'), t.browser().set('User-Agent', 'Mozilla/5.0 (X11; Linux x86_64; rv:140.0) Gecko Firefox/140.0')]
    const phoneCookie = cookieOf(await signIn(phone, email))
    await signIn(desk, email)
    const { body } = await desk.get('/api/me/sessions').expect(200)
    const devices = body.sessions.map(({ device, current }: { device: string; current: boolean }) => ({ device, current }))
    expect(devices).toContainEqual({ device: 'Firefox on Linux', current: true })
    expect(devices).toContainEqual({ device: 'Safari on iPhone', current: false })
    expect(JSON.stringify(body)).not.toContain(sidOf(phoneCookie))

    const { id } = body.sessions.find(({ device }: { device: string }) => device.includes('iPhone'))
    await t.owner.delete(`/api/me/sessions/${id}`).expect(404)
    await desk.delete(`/api/me/sessions/${id}`).expect(204)
    await phone.get('/api/me').expect(401)
    await desk.get('/api/me').expect(200)
  })
})
