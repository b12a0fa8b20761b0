import { mkdtempSync, rmSync } from 'node:fs'
import http from 'node:http'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startServer } from '#server/main.ts'
import { readSettings } from '#server/settings.ts'
import { type FreshDatabase, freshDatabase } from '../support/freshDatabase.ts'
import { memoryStore } from '../support/memoryStore.ts'
import { serverProcess } from '../support/serverProcess.ts'

let database: FreshDatabase
beforeAll(async () => { database = await freshDatabase() })
afterAll(() => database.drop())

const env = () => ({ DATABASE_URL: database.url, SESSION_SECRET: 'for tests only: 0123456789abcdefghij', PORT: '0', LOG_LEVEL: 'silent', RATE_LIMIT_SCALE: '1' })
const start = (storage = memoryStore()) => startServer(readSettings(env(), 'local'), { storage })

describe('the server', () => {
  it('answers where it says it listens, and refuses after its stop', async () => {
    const server = await start()
    expect(await (await fetch(`${server.url}/api/ready`)).json()).toEqual({ status: 'ready', database: 'ok', storage: 'ok' })
    await server.stop()
    await expect(fetch(`${server.url}/api/health`)).rejects.toThrow()
  })

  it('lets a request under way finish, closes connections that wait for nothing, and stops once however often it is asked', async () => {
    const store = memoryStore()
    let asked = () => {}
    let answer = (_has: boolean) => {}
    const under = new Promise<void>((resolve) => { asked = resolve })
    store.has = () => new Promise((resolve) => { answer = resolve; asked() })
    const server = await start(store)
    const agent = new http.Agent({ keepAlive: true })
    const get = (path: string) => new Promise<number>((resolve, reject) => {
      http.get(server.url + path, { agent }, (res) => { res.resume().on('end', () => resolve(res.statusCode!)) }).on('error', reject)
    })
    await get('/api/health') // leaves an idle connection open
    const slow = get('/api/ready')
    await under
    const stops = [server.stop(), server.stop()]
    await expect(fetch(`${server.url}/api/health`)).rejects.toThrow()
    answer(true)
    expect(await slow).toBe(200)
    await Promise.all(stops)
    agent.destroy()
  })

  it('says that its port is taken', async () => {
    const server = await start()
    const settings = readSettings({ ...env(), PORT: new URL(server.url).port }, 'local')
    await expect(startServer(settings, { storage: memoryStore() })).rejects.toThrow(/EADDRINUSE/)
    await server.stop()
  })
})

it('ends as a process, with success, when it is asked to terminate', async () => {
  const folder = mkdtempSync(join(tmpdir(), 'photographs-'))
  const { child, ended } = await serverProcess({ ...env(), PHOTO_STORAGE: `disk:${folder}` })
  child.kill('SIGTERM')
  expect(await ended).toEqual({ code: 0, signal: null })
  rmSync(folder, { recursive: true })
})
