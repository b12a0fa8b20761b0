import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { deepestLevel } from '#server/http/checkText.ts'
import { type TestApp, origin, testApp } from '../../support/testApp.ts'

let t: TestApp
let wearers: string
beforeAll(async () => {
  t = await testApp()
  wearers = `/api/studios/${t.studioId}/wearers`
})
afterAll(() => t.close())

describe('a body', () => {
  it('with an unknown key is refused, naming it', async () => {
    const { body } = await t.owner.post(wearers).send({ name: 'Ida', admin: true }).expect(400)
    expect(body.error).toMatchObject({ code: 'request.invalid', details: { admin: 'This field is not known here.' } })
  })
  it('with a wrong field is refused with a sentence for the form', async () => {
    const { body } = await t.anonymous.post('/api/sign-up').send({ name: 'Ida', email: 'ida', password: 'short' }).expect(400)
    expect(body.error.details).toMatchObject({ email: expect.stringContaining('whole address'), password: 'Use at least 12 characters.' })
  })
  it.each([
    ['a NUL in text', '{"name":"Ida\\u0000","note":""}'],
    ['a NUL in a key', '{"name":"Ida","a\\u0000":1}'],
    ['half a surrogate pair', '{"name":"Ida","note":"\\ud83d"}'],
    ['a control character in one line of text', '{"name":"Ida\\u0007"}'],
    ['broken JSON', '{"name":'],
    ['JSON that is no object', '"Ida"'],
    ['a prototype as a key', '{"name":"Ida","__proto__":{"admin":true}}'],
    ['deep nesting', `{"name":${'['.repeat(deepestLevel + 1)}${']'.repeat(deepestLevel + 1)}}`],
    ['very deep nesting', `{"name":${'['.repeat(100_000)}${']'.repeat(100_000)}}`],
  ])('with %s is refused and nothing is made', async (_name, text) => {
    const { body } = await t.owner.post(wearers).set('Content-Type', 'application/json').send(text).expect(400)
    expect(body.error.code).toBe('request.invalid')
    expect((await t.owner.get(wearers)).body.wearers).toHaveLength(3)
  })
  it('over a megabyte is refused', async () => {
    const { body } = await t.owner.post(wearers).send({ name: 'Ida', note: 'x'.repeat(1024 * 1024) }).expect(413)
    expect(body.error.code).toBe('request.too-large')
  })
  it.each(['text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data; boundary=x'])('sent as %s is refused', async (type) => {
    const { body } = await t.owner.post(wearers).set('Content-Type', type).send('{"name":"Ida"}').expect(400)
    expect(body.error.message).toContain('application/json')
  })
  it('in an encoding that is none is refused without a crash', async () => {
    await t.owner.post(wearers).set('Content-Type', 'application/json').set('Content-Encoding', 'no-such').send('{}').expect(400)
  })
})

it('takes no query where the contract names none', async () => {
  const { body } = await t.owner.get(`${wearers}?nmae=Ida`).expect(400)
  expect(body.error.details).toHaveProperty('nmae')
})

describe('text', () => {
  it('is kept in composed form, trimmed, with every script as typed', async () => {
    const { body } = await t.owner.post(wearers).send({ name: '  Zoe\u0308 李 🧵 ', note: '<b>"; drop table wearers; --' }).expect(201)
    expect(body).toMatchObject({ name: 'Zo\u00eb 李 🧵', note: '<b>"; drop table wearers; --' })
    const { body: again } = await t.owner.get(`${wearers}/${body.id}`).expect(200)
    expect(again.wearer).toEqual(body)
  })
})

describe('an address', () => {
  it('that cannot be decoded is refused', async () => {
    await t.owner.get('/api/studios/%E0%A4%A').expect(400)
  })
  it('with a NUL is refused', async () => {
    await t.owner.get(`/api/me/sessions/%00`).expect(404)
    await t.owner.delete(`/api/me/sessions/${'a'.repeat(20)}%00`).expect(400)
  })
  it('with an id that is none is refused, naming the part', async () => {
    const { body } = await t.owner.get(`${wearers}/17`).expect(400)
    expect(body.error.details).toHaveProperty('wearerId')
  })
})

it('tells nothing of its insides when something unexpected fails', async () => {
  const broken = await testApp({ given: { storage: { has: async () => { throw new Error('disk /srv/photographs is gone') } } as never } })
  const { body } = await request(broken.server).get('/api/ready').set('Origin', origin).expect(500)
  expect(JSON.stringify(body)).not.toContain('/srv')
  expect(body.error).toMatchObject({ code: 'server.failed', requestId: expect.any(String) })
  await broken.close()
})
