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
