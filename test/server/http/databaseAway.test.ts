import { createServer, connect as connectSocket, type Socket } from 'node:net'
import request from 'supertest'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { connect } from '#db/client.ts'
import { createApp } from '#server/createApp.ts'
import { isDatabaseAway } from '#server/http/isDatabaseAway.ts'
import { type TestApp, origin, password, testApp } from '../../support/testApp.ts'

let t: TestApp
beforeAll(async () => { t = await testApp() })
afterAll(() => t.close())

/** A line to PostgreSQL that can be cut and mended. */
async function line(databaseUrl: string) {
  const target = new URL(databaseUrl)
  const open = new Set<Socket>()
  let cut = false
  const server = createServer((socket) => {
    if (cut) return void socket.destroy()
    const onward = connectSocket(Number(target.port), target.hostname)
    for (const end of [socket, onward]) {
      open.add(end)
      end.on('error', () => {}).on('close', () => { open.delete(end); socket.destroy(); onward.destroy() })
    }
    socket.pipe(onward).pipe(socket)
  })
  await new Promise<void>((resolve) => { server.listen(0, '127.0.0.1', resolve) })
  const url = new URL(databaseUrl)
  url.hostname = '127.0.0.1'
  url.port = String((server.address() as { port: number }).port)
  return {
    url: url.href,
    cut() { cut = true; open.forEach((socket) => socket.destroy()) },
    mend() { cut = false },
    close: () => new Promise<void>((resolve) => { server.close(() => resolve()); open.forEach((socket) => socket.destroy()) }),
  }
}

it('answers 503 with Retry-After while the database is away, and is back by itself', async () => {
  const wire = await line(t.settings.databaseUrl)
  const { pool, db } = connect(wire.url)
  const app = createApp({ ...t.context, pool, db })
  const browser = request.agent(app).set('Origin', origin)
  await browser.post('/api/sign-in').send({ email: t.owner.email, password }).expect(200)
  await browser.get('/api/me').expect(200)

  wire.cut()
  for (const path of ['/api/me', '/api/ready', `/api/studios/${t.studioId}`]) {
    const { body, headers } = await browser.get(path).expect(503)
    expect(body.error.code, path).toBe('database.away')
    expect(Number(headers['retry-after']), path).toBeGreaterThan(0)
  }
  const { body } = await request(app).post('/api/sign-in').set('Origin', origin).send({ email: t.owner.email, password }).expect(503)
  expect(body.error.code).toBe('database.away')
  await browser.get('/api/health').expect(200)

  wire.mend()
  await browser.get('/api/me').expect(200)
  await browser.get('/api/ready').expect(200)
  await pool.end()
  await wire.close()
})

it.each([
  [{ code: 'ECONNREFUSED' }, true], [{ code: '57P01' }, true], [{ code: '53300' }, true], [{ code: '08006' }, true],
  [{ code: '23505' }, false], [{ code: '22P02' }, false], [{ code: '42P01' }, false], [{}, false],
])('tells an error of the line, %o, from one of the query', (fields, away) => {
  expect(isDatabaseAway(Object.assign(new Error('x'), fields))).toBe(away)
  expect(isDatabaseAway(new Error('Failed query', { cause: Object.assign(new Error('x'), fields) }))).toBe(away)
})
