import { hash } from '@node-rs/argon2'
import { eq, sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import { checkPassword } from '#server/account/checkPassword.ts'
import { isOutdated, parameters, verifyPassword } from '#server/account/passwords.ts'
import { passwordResets } from '#db/schema/passwordResets.ts'
import { users } from '#db/schema/users.ts'
import { type TestApp, password, testApp } from '../../support/testApp.ts'

let t: TestApp
beforeAll(async () => { t = await testApp() })
afterAll(() => t.close())

const hashOf = async (userId: string) => (await t.db.select().from(users).where(eq(users.id, userId)))[0]!.passwordHash
const next = 'nine green bottles on a shelf'

describe('a password is refused when', () => {
  it.each([
    ['a common word with digits', 'password12345'], ['a common word in disguise', 'P@ssw0rd!!2026'], ['a common word twice', 'sunshinesunshine'],
    ['a row of keys', 'qwertyuiop12'], ['a row of keys backwards', 'poiuytrewq09'], ['digits in order', '123456789012'], ['the alphabet', 'abcdefghijklm'],
    ['one character', 'aaaaaaaaaaaaaa'], ['a few characters repeated', 'xy7!xy7!xy7!xy'], ['the journal', 'proofcloth-2026'], ['the journal and a common word', 'ProofclothPassword1'],
    ['one’s name', 'IlseMarchetti1'], ['one’s name with a common word', 'ilse.marchetti.love'], ['one’s address', 'ilse@wendmouth.example'], ['the studio', 'Alder Lane 2026!'],
    ['a year after a month', 'december-1987'],
  ])('it is %s', (_name, candidate) => {
    expect(() => checkPassword(candidate, ['Ilse Marchetti', 'ilse@wendmouth.example', 'Alder Lane'])).toThrow(expect.objectContaining({ code: 'password.weak' }))
  })
  it.each(['copper kettles hum at dusk', 'xk7-Qm2v-Tr9p-Lw4z', 'große Füße tanzen leise', 'dragon wears linen on tuesdays', '縫い目を歩く夜の布です', 'sewing mirrors for nine owls', '            🧵 thread'.trim() + ' over the moon'])('but not %s', (candidate) => {
    expect(() => checkPassword(candidate, ['Ilse Marchetti', 'ilse@wendmouth.example', 'Alder Lane'])).not.toThrow()
  })
  it('signing up, with a sentence beside the field', async () => {
    const { body } = await t.browser().post('/api/sign-up').send({ name: 'Ida', email: 'ida@example.org', password: 'password12345' }).expect(400)
    expect(body.error).toMatchObject({ code: 'password.weak', details: { password: expect.stringContaining('“password”') } })
  })
})

describe('hashing', () => {
  it('is argon2id with at least 19 MiB, 2 passes, 1 lane', async () => { // OWASP Password Storage Cheat Sheet
    expect(await hashOf(t.owner.userId)).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/)
    expect(parameters.memoryCost).toBeGreaterThanOrEqual(19 * 1024)
  })
  it('takes one password typed in two Unicode forms as the same', async () => {
    const stored = await hash('caf\u00e9 au lait at noon', parameters)
    expect(await verifyPassword(stored, 'cafe\u0301 au lait at noon')).toBe(true)
  })
  it('never matches where there is no account, not even the password of the decoy', async () => {
    expect(await verifyPassword(null, 'no account has this password')).toBe(false)
  })
  it('is done again at sign-in when the parameters have risen', async () => {
    const { userId, email } = await t.person('Olda')
    const weak = await hash(password, { memoryCost: 8192, timeCost: 2, parallelism: 1 })
    await t.db.update(users).set({ passwordHash: weak }).where(eq(users.id, userId))
    await t.browser().post('/api/sign-in').send({ email, password }).expect(200)
    const stored = await hashOf(userId)
    expect(stored).not.toBe(weak)
    expect(isOutdated(stored)).toBe(false)
    await t.browser().post('/api/sign-in').send({ email, password }).expect(200)
    expect(await hashOf(userId)).toBe(stored)
  })
})

describe('changing the password', () => {
  it('asks for the current one, ends every other session and renews one’s own', async () => {
    const here = await t.person('Petra')
    const elsewhere = t.browser()
    await elsewhere.post('/api/sign-in').send({ email: here.email, password }).expect(200)

    await here.put('/api/me/password').send({ current: 'not the one at all', next }).expect(401)
    await here.put('/api/me/password').send({ current: password, next: 'petra@example.org' }).expect(400)
    await elsewhere.get('/api/me').expect(200)

    const { headers } = await here.put('/api/me/password').send({ current: password, next }).expect(204)
    expect(headers['set-cookie']).toBeDefined()
    await here.get('/api/me').expect(200)
    await elsewhere.get('/api/me').expect(401)
    await t.browser().post('/api/sign-in').send({ email: here.email, password }).expect(401)
    await t.browser().post('/api/sign-in').send({ email: here.email, password: next }).expect(200)
  })
})

describe('a link for a new password', () => {
  const request = async (email: string) => {
    const before = t.outbox.mails.length
    await t.anonymous.post('/api/password-resets').send({ email }).expect(204)
    await vi.waitFor(() => expect(t.outbox.mails.length).toBe(before + 1))
    return /#([\w-]+)/.exec(t.outbox.mails.at(-1)!.text)![1]!
  }

  it('is sent to a known address only, and the answer does not tell', async () => {
    const before = t.outbox.mails.length
    const unknown = await t.anonymous.post('/api/password-resets').send({ email: 'nobody@example.org' }).expect(204)
    const known = await t.anonymous.post('/api/password-resets').send({ email: t.maker.email }).expect(204)
    await vi.waitFor(() => expect(t.outbox.mails.slice(before).map(({ to }) => to)).toEqual([t.maker.email]))
    const { date: _a, 'x-request-id': _b, 'content-security-policy': _c, ...rest } = unknown.headers
    expect(known.headers).toMatchObject(rest)
  })
  it('works once, ends every session, and only its digest is stored', async () => {
    const person = await t.person('Rita')
    const token = await request(person.email)
    expect(Buffer.from(token, 'base64url').length).toBeGreaterThanOrEqual(16) // 128 bits
    expect((await t.db.select().from(passwordResets)).map(({ tokenHash }) => tokenHash)).not.toContain(token)

    await t.anonymous.post('/api/password-resets/use').send({ token, password: next }).expect(204)
    await person.get('/api/me').expect(401)
    await t.browser().post('/api/sign-in').send({ email: person.email, password: next }).expect(200)
    const { body } = await t.anonymous.post('/api/password-resets/use').send({ token, password: 'eleven pipers in a barn' }).expect(400)
    expect(body.error.code).toBe('token.invalid')
  })
  it('is used by one of two who try at once', async () => {
    const token = await request((await t.person('Rolf')).email)
    const answers = await Promise.all([1, 2].map(() => t.anonymous.post('/api/password-resets/use').send({ token, password: next })))
    expect(answers.map(({ status }) => status).toSorted()).toEqual([204, 400])
  })
  it('stays good when the new password was refused', async () => {
    const token = await request((await t.person('Runa')).email)
    await t.anonymous.post('/api/password-resets/use').send({ token, password: 'password12345' }).expect(400)
    await t.anonymous.post('/api/password-resets/use').send({ token, password: next }).expect(204)
  })
  it('runs out after an hour', async () => {
    const token = await request((await t.person('Rosa')).email)
    await t.db.update(passwordResets).set({ expiresAt: sql`${passwordResets.expiresAt} - interval '61 minutes'` })
    await t.anonymous.post('/api/password-resets/use').send({ token, password: next }).expect(400)
  })
  it('that was sent before is worth nothing once the password was changed', async () => {
    const person = await t.person('Ruth')
    const token = await request(person.email)
    await person.put('/api/me/password').send({ current: password, next }).expect(204)
    await t.anonymous.post('/api/password-resets/use').send({ token, password: 'eleven pipers in a barn' }).expect(400)
  })
})
