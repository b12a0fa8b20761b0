import { randomUUID } from 'node:crypto'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { setTimeout as delay } from 'node:timers/promises'
import request from 'supertest'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { serverProcess } from '../support/serverProcess.ts'
import { type TestApp, password, testApp } from '../support/testApp.ts'

let t: TestApp
let patterns: string
let cookie: string
const folder = mkdtempSync(join(tmpdir(), 'photographs-'))
beforeAll(async () => {
  t = await testApp()
  patterns = `/api/studios/${t.studioId}/patterns`
  const { headers } = await t.browser().post('/api/sign-in').send({ email: t.owner.email, password }).expect(200)
  cookie = String(headers['set-cookie']).split(';')[0]!
})
afterAll(async () => {
  await t.close()
  rmSync(folder, { recursive: true })
})

const start = () => serverProcess({ DATABASE_URL: t.settings.databaseUrl, SESSION_SECRET: t.settings.sessionSecret, PUBLIC_URL: t.settings.publicUrl!, PHOTO_STORAGE: `disk:${folder}` })
const create = (url: string, key: string) => request(url).post(patterns).set({ 'Origin': t.settings.publicUrl!, 'Cookie': cookie, 'Idempotency-Key': key }).send({ name: key, garment: { kind: 'skirt' } })
const named = async (name: string) => (await t.owner.get(patterns).expect(200)).body.patterns.filter((pattern: { name: string }) => pattern.name === name)

it('keeps what it answered for when it is killed right after, and makes nothing twice when it is killed meanwhile', async () => {
  const key = randomUUID()
  let server = await start()
  const { body } = await create(server.url, key).expect(201)
  server.child.kill('SIGKILL')
  await server.ended
  expect(await named(key)).toEqual([body])

  // Killed at different moments of the same request: before it, within its transaction, after it.
  for (const afterMs of [1, 4, 8]) {
    const lost = randomUUID()
    server = await start()
    const answer = create(server.url, lost).then(({ status }) => status, () => 'broken off')
    await delay(afterMs)
    server.child.kill('SIGKILL')
    await Promise.all([answer, server.ended])

    server = await start()
    const again = await create(server.url, lost).expect(201)
    expect(await named(lost)).toEqual([again.body])
    server.child.kill('SIGKILL')
    await server.ended
  }
}, 60_000)
