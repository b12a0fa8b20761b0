import { sql } from 'drizzle-orm'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { sweepExpired } from '#server/jobs/sweepExpired.ts'
import { type TestApp, testApp } from '../../support/testApp.ts'

let t: TestApp
beforeAll(async () => { t = await testApp() })
afterAll(() => t.close())

const count = async (table: string) => Number((await t.db.execute<{ n: string }>(sql`select count(*) n from ${sql.identifier(table)}`)).rows[0]!.n)

it('removes sessions, links and counts that ran out, and nothing else', async () => {
  await t.anonymous.post('/api/password-resets').send({ email: t.owner.email }).expect(204)
  await t.anonymous.post('/api/password-resets').send({ email: t.maker.email }).expect(204)
  const sessions = await count('sessions')
  await t.db.execute(sql`update password_resets set expires_at = now() - interval '1 minute' where user_id = ${t.owner.userId}`)
  await t.db.execute(sql`update sessions set expire = now() - interval '1 minute' where sess->>'userId' = ${t.fitter.userId}`)
  await t.db.execute(sql`insert into rate_limits (key, points, expire) values ('past', 1, 1), ('ahead', 1, ${Date.now() + 60_000})`)

  await sweepExpired(t.db)
  expect(await count('password_resets')).toBe(1)
  expect(await count('sessions')).toBe(sessions - 1)
  const { rows } = await t.db.execute<{ key: string }>(sql`select key from rate_limits where key in ('past', 'ahead')`)
  expect(rows).toEqual([{ key: 'ahead' }])
  await t.fitter.get('/api/me').expect(401)
  await t.maker.get('/api/me').expect(200)
})
