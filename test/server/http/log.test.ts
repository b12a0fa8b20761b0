import { sql } from 'drizzle-orm'
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'
import { type TestApp, password, testApp } from '../../support/testApp.ts'

const lines: string[] = []
let t: TestApp
beforeAll(async () => { t = await testApp({ log: (line) => lines.push(line) }) })
afterAll(() => t.close())
beforeEach(() => { lines.length = 0 })

const entries = () => lines.map((line) => JSON.parse(line) as Record<string, unknown>)

describe('the log', () => {
  it('has one line a request with id, person, route, status and time', async () => {
    const { headers } = await t.owner.get(`/api/studios/${t.studioId}`).expect(200)
    expect(entries()).toEqual([expect.objectContaining({
      requestId: headers['x-request-id'], method: 'GET', status: 200, route: '/api/studios/:studioId', userId: t.owner.userId, tookMs: expect.any(Number),
    })])
  })
  it('holds no cookie, password, address, token or id of a path', async () => {
    const email = 'lotta.quiet@example.org'
    const browser = t.browser()
    const { headers } = await browser.post('/api/sign-up').send({ name: 'Lotta Quiet', email, password }).expect(201)
    const secret = String(headers['set-cookie']).split('=')[1]!.split(';')[0]!
    await browser.post('/api/sign-in').send({ email, password: 'a wrong guess, that is' }).expect(401)
    await browser.post('/api/password-resets').send({ email }).expect(204)
    await vi.waitFor(() => expect(t.outbox.mails.at(-1)?.to).toBe(email))
    const token = /#([\w-]+)/.exec(t.outbox.mails.at(-1)!.text)![1]!
    await browser.post('/api/password-resets/use').send({ token, password: 'nine green bottles on a shelf' }).expect(204)
    await browser.get(`/api/studios/${t.studioId}?token=${token}&q=Lotta`)

    expect(lines.length).toBeGreaterThanOrEqual(5)
    const all = lines.join('')
    for (const private_ of [secret, decodeURIComponent(secret).slice(2, 20), email, 'Lotta', password, 'wrong guess', token, t.studioId]) expect(all).not.toContain(private_)
  })
  it('says of a failure nobody expected what it was, without what was typed', async () => {
    const broken = await testApp({ log: (line) => lines.push(line), given: { storage: { has: async () => { throw new Error('no such volume') } } as never } })
    lines.length = 0
    const { headers } = await broken.anonymous.get('/api/ready').expect(500)
    const failure = entries().find(({ msg }) => msg === 'unexpected error')
    expect(failure).toMatchObject({ requestId: headers['x-request-id'], err: { message: 'no such volume', stack: expect.any(String) } })
    await broken.close()
  })
  it('names a failed query without its values', async () => {
    await t.db.execute(sql`alter table wearers rename column note to note_`)
    await t.owner.post(`/api/studios/${t.studioId}/wearers`).send({ name: 'Ottilie Private', note: 'nothing for a log' }).expect(500)
    await t.db.execute(sql`alter table wearers rename column note_ to note`)
    expect(entries().find(({ msg }) => msg === 'unexpected error')).toMatchObject({ err: { message: expect.stringContaining('insert into "wearers"'), cause: { code: '42703' } } })
    expect(lines.join('')).not.toMatch(/Ottilie|nothing for a log/)
  })
})
