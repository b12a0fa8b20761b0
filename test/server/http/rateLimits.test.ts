import request from 'supertest'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { sql } from 'drizzle-orm'
import { createApp } from '#server/createApp.ts'
import { limits } from '#server/http/rateLimits.ts'
import { contracts } from '../../support/contracts.ts'
import { type TestApp, origin, password, testApp } from '../../support/testApp.ts'

let t: TestApp
beforeAll(async () => { t = await testApp({ env: { RATE_LIMIT_SCALE: '1' } }) })
afterAll(() => t.close())

const times = (routeId: string, per: string) => limits[routeId]!.find((limit) => limit.per === per)!.times
const from = (address: string) => ({ 'Origin': origin, 'X-Forwarded-For': address })
const signIn = (address: string, email: string, secret: string) => request(t.server).post('/api/sign-in').set(from(address)).send({ email, password: secret })

it('limits routes that exist', () => {
  for (const id of Object.keys(limits)) expect(contracts.map((route) => route.id)).toContain(id)
})

it('stops guessing one person’s password from one place, says how long, and lets that person in from elsewhere', async () => {
  for (let i = 0; i < times('account.sign-in', 'email and address'); i++) await signIn('198.51.100.1', t.maker.email, `guess number ${i}`).expect(401)
  const stopped = await signIn('198.51.100.1', t.maker.email, password).expect(429)
  expect(stopped.body.error).toMatchObject({ code: 'request.too-many', details: { retryAfterSeconds: expect.any(Number) } })
  expect(Number(stopped.headers['retry-after'])).toBeGreaterThan(0)
  expect(Number(stopped.headers['retry-after'])).toBeLessThanOrEqual(15 * 60)
  await signIn('198.51.100.2', t.maker.email, password).expect(200)
})

it('stops one address from guessing many people’s passwords, known or not', async () => {
  for (let i = 0; i < times('account.sign-in', 'address'); i++) await signIn('198.51.100.3', `nobody${i}@example.org`, 'guess').expect(401)
  await signIn('198.51.100.3', t.fitter.email, password).expect(429)
})

it('counts a whole IPv6 network of one household as one address', async () => {
  for (let i = 0; i < times('account.sign-in', 'address'); i++) await signIn(`2001:db8:0:1::${i + 1}`, `no${i}@example.org`, 'guess').expect(401)
  await signIn('2001:db8:0:1:ffff::1', t.fitter.email, password).expect(429)
  await signIn('2001:db8:0:2::1', t.fitter.email, password).expect(200)
})

it('counts over all instances of the server', async () => {
  const second = createApp({ ...t.context })
  for (let i = 0; i < times('account.request-reset', 'email'); i++) {
    await request(i % 2 ? t.app : second).post('/api/password-resets').set(from(`198.51.100.${10 + i}`)).send({ email: t.wearer.email }).expect(204)
  }
  await request(second).post('/api/password-resets').set(from('198.51.100.20')).send({ email: t.wearer.email }).expect(429)
})

it('limits making accounts from one address', async () => {
  const answers = []
  for (let i = 0; i <= times('account.sign-up', 'address'); i++) {
    answers.push((await request(t.server).post('/api/sign-up').set(from('198.51.100.30')).send({ name: 'Ida', email: `ida${i}@example.org`, password })).status)
  }
  expect(answers.at(0)).toBe(201)
  expect(answers.at(-1)).toBe(429)
})

it('stores no e-mail address with its counts', async () => {
  const { rows } = await t.db.execute<{ key: string }>(sql`select key from rate_limits`)
  expect(rows.length).toBeGreaterThan(0)
  expect(rows.filter(({ key }) => key.includes('@'))).toEqual([])
})
