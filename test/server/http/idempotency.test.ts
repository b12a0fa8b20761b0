import { sql } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { sweepExpired } from '#server/jobs/sweepExpired.ts'
import { type TestApp, testApp } from '../../support/testApp.ts'

let t: TestApp
let patterns: string
beforeAll(async () => {
  t = await testApp()
  patterns = `/api/studios/${t.studioId}/patterns`
})
afterAll(() => t.close())

const create = (key: string, body: object = { name: 'Skirt', garment: { kind: 'skirt' } }, by = t.owner) => by.post(patterns).set('Idempotency-Key', key).send(body)
const count = async () => (await t.owner.get(patterns).expect(200)).body.patterns.length

describe('a creating request with a key', () => {
  it('makes one thing however often it is repeated, and hears the same answer', async () => {
    const before = await count()
    const first = await create('key-repeat-1').expect(201)
    const second = await create('key-repeat-1').expect(201)
    expect(second.body).toEqual(first.body)
    expect(await count()).toBe(before + 1)
  })
  it('makes one thing when it arrives ten times at once', async () => {
    const before = await count()
    const answers = await Promise.all(Array.from({ length: 10 }, () => create('key-at-once-1')))
    expect(new Set(answers.map(({ body }) => body.id)).size).toBe(1)
    expect(answers.every(({ status }) => status === 201)).toBe(true)
    expect(await count()).toBe(before + 1)
  })
  it('makes two things with two keys or none', async () => {
    const before = await count()
    await create('key-two-1').expect(201)
    await create('key-two-2').expect(201)
    await t.owner.post(patterns).send({ name: 'Skirt', garment: { kind: 'skirt' } }).expect(201)
    expect(await count()).toBe(before + 3)
  })
  it('is refused when the key was used for something else', async () => {
    await create('key-other-1').expect(201)
    const { body } = await create('key-other-1', { name: 'Coat', garment: { kind: 'coat' } }).expect(409)
    expect(body.error.code).toBe('state.wrong')
    await t.owner.post(`/api/studios/${t.studioId}/wearers`).set('Idempotency-Key', 'key-other-1').send({ name: 'Ida' }).expect(409)
  })
  it('keeps people’s keys apart', async () => {
    const mine = await create('key-shared-1').expect(201)
    const theirs = await create('key-shared-1', undefined, t.maker).expect(201)
    expect(theirs.body.id).not.toBe(mine.body.id)
  })
  it('may be tried again when it failed', async () => {
    await create('key-failed-1', { name: 'Skirt', garment: { kind: 'skirt' }, chart: [{ label: '12', body: {} }, { label: '12', body: {} }] }).expect(400)
    await create('key-failed-1').expect(201)
  })
  it('leaves nothing behind when the answer was lost before it was stored', async () => {
    const before = await count()
    // The row of the key and the pattern are one transaction: breaking the last step takes both back.
    await t.db.execute(sql`create function refuse() returns trigger language plpgsql as $$ begin raise exception 'stop here'; end $$`)
    await t.db.execute(sql`create trigger refuse before update on request_keys for each row execute function refuse()`)
    await create('key-broken-1').expect(500)
    await t.db.execute(sql`drop trigger refuse on request_keys`)
    expect(await count()).toBe(before)
    await create('key-broken-1').expect(201)
    expect(await count()).toBe(before + 1)
  })
  it.each(['short', 'with spaces in it', 'x'.repeat(101)])('is refused when the key is %s', async (key) => {
    await create(key).expect(400)
  })
  it('is forgotten after a day', async () => {
    await create('key-old-1').expect(201)
    await t.db.execute(sql`update request_keys set created_at = now() - interval '25 hours' where key = 'key-old-1'`)
    await create('key-new-1').expect(201)
    await sweepExpired(t.db)
    const { rows } = await t.db.execute<{ key: string }>(sql`select key from request_keys where key in ('key-old-1', 'key-new-1')`)
    expect(rows).toEqual([{ key: 'key-new-1' }])
  })
})
