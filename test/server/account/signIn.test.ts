import { and, eq } from 'drizzle-orm'
import { auditEntries } from '#db/schema/auditEntries.ts'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { type TestApp, password, testApp } from '../../support/testApp.ts'

let t: TestApp
beforeAll(async () => { t = await testApp() })
afterAll(() => t.close())

it('signs up with a studio of one and the person as its first wearer', async () => {
  const ana = t.browser()
  const { body: me } = await ana.post('/api/sign-up').send({ name: 'Ana Brook', email: 'Ana.Brook@Example.org ', password: 'copper kettles hum at dusk' }).expect(201)
  expect(me).toMatchObject({ name: 'Ana Brook', email: 'ana.brook@example.org', units: 'cm', memberships: [{ role: 'owner' }] })
  const { body } = await ana.get(`/api/studios/${me.memberships[0].studioId}/wearers`).expect(200)
  expect(body.wearers).toMatchObject([{ name: 'Ana Brook', hasAccount: true, projectCount: 0 }])
})

it('answers an unknown address and a wrong password alike', async () => {
  const unknown = await t.browser().post('/api/sign-in').send({ email: 'nobody@example.org', password }).expect(401)
  const wrong = await t.browser().post('/api/sign-in').send({ email: t.owner.email, password: 'not this one at all' }).expect(401)
  expect({ ...unknown.body.error, requestId: '' }).toEqual({ ...wrong.body.error, requestId: '' })
  expect(unknown.body.error.code).toBe('sign-in.wrong')
})

it('refuses a second account for one address, also when two are made at once', async () => {
  const make = () => t.browser().post('/api/sign-up').send({ name: 'Bo', email: 'bo@example.org', password: 'copper kettles hum at dusk' })
  const answers = await Promise.all([make(), make()])
  expect(answers.map(({ status }) => status).toSorted()).toEqual([201, 409])
  expect((await make().expect(409)).body.error.code).toBe('sign-up.taken')
})

it('takes the address in any case', async () => {
  await t.browser().post('/api/sign-in').send({ email: ` ${t.owner.email.toUpperCase()}`, password }).expect(200)
})

it('notes sign-ins and failures without the address', async () => {
  const { userId, email } = await t.person('Cleo')
  await t.browser().post('/api/sign-in').send({ email, password: 'wrong again, sorry' }).expect(401)
  const failed = await t.db.select().from(auditEntries).where(and(eq(auditEntries.userId, userId), eq(auditEntries.event, 'sign-in.failed')))
  const done = await t.db.select().from(auditEntries).where(and(eq(auditEntries.userId, userId), eq(auditEntries.event, 'sign-in')))
  expect([failed.length, done.length]).toEqual([1, 1])
  expect(JSON.stringify([failed, done])).not.toContain(email)
})

it('changes name and units, and leaves alone what is not named', async () => {
  const cleo = await t.person('Dora')
  expect((await cleo.patch('/api/me').send({ units: 'inch' }).expect(200)).body).toMatchObject({ name: 'Dora', units: 'inch' })
  expect((await cleo.patch('/api/me').send({ name: 'Dora Fenn' }).expect(200)).body).toMatchObject({ name: 'Dora Fenn', units: 'inch' })
  expect((await cleo.get('/api/me').expect(200)).body).toMatchObject({ name: 'Dora Fenn', units: 'inch' })
  await cleo.patch('/api/me').send({ email: 'other@example.org' }).expect(400)
})
