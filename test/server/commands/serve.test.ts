import { spawn } from 'node:child_process'
import { mkdtempSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { connect } from '#db/client.ts'
import { freePort } from '#db/local/ports.ts'
import { users } from '#db/schema/users.ts'
import { type FreshDatabase, freshDatabase } from '../../support/freshDatabase.ts'

const cwd = fileURLToPath(new URL('../../..', import.meta.url))
let database: FreshDatabase
beforeAll(async () => { database = await freshDatabase() })
afterAll(() => database.drop())

const settings = async () => ({
  DATABASE_URL: database.url, SESSION_SECRET: 'for tests only: 0123456789abcdefghij', PUBLIC_URL: 'https://journal.example.org', PHOTO_STORAGE: `disk:${mkdtempSync(join(tmpdir(), 'photographs-'))}`,
  SMTP_URL: 'smtp://127.0.0.1:2525', MAIL_FROM: 'Proofcloth <no-reply@example.org>', HOST: '127.0.0.1', PORT: String(await freePort()), LOG_LEVEL: 'info',
})

/** The production server from source. @param whenListening - called with its output so far once it listens */
function serve(env: Record<string, string>, whenListening: (child: ReturnType<typeof spawn>) => void = () => {}): Promise<{ said: string; code: number | null }> {
  const { PATH = '', TMPDIR = tmpdir() } = process.env
  const child = spawn(process.execPath, ['--import', 'tsx', 'server/commands/serve.ts'], { cwd, stdio: ['ignore', 'pipe', 'pipe'], env: { PATH, TMPDIR, ...env } })
  let said = ''
  const listen = (data: Buffer) => {
    const before = said.includes('listening')
    said += data.toString()
    if (!before && said.includes('listening')) whenListening(child)
  }
  child.stdout.on('data', listen)
  child.stderr.on('data', listen)
  return new Promise((done) => { child.on('close', (code) => done({ said, code })) })
}

it('refuses to start without its settings, one line for each', async () => {
  const { said, code } = await serve({})
  expect(code).toBe(1)
  expect(said.trim().split('\n').map((line) => line.split(' ')[0]).sort()).toEqual(['DATABASE_URL', 'MAIL_FROM', 'PHOTO_STORAGE', 'PUBLIC_URL', 'SESSION_SECRET', 'SMTP_URL'])
})

it('refuses to start with a weak secret', async () => {
  const { said, code } = await serve({ ...await settings(), SESSION_SECRET: 'secret' })
  expect(code).toBe(1)
  expect(said.trim()).toMatch(/^SESSION_SECRET is too short: .*$/)
})

it('says in a line that the database does not answer', async () => {
  const { said, code } = await serve({ ...await settings(), DATABASE_URL: `postgres://somebody@127.0.0.1:${await freePort()}/proofcloth` })
  expect(code).toBe(1)
  expect(said.trim()).toMatch(/^The database does not answer \(.*\)\. Start it, or correct DATABASE_URL\.$/)
})

it('makes no demo account, and takes a second Ctrl-C as it took the first', async () => {
  const { code } = await serve(await settings(), (child) => { child.kill('SIGINT'); setTimeout(() => child.kill('SIGINT'), 5) })
  expect(code).toBe(0)
  const { db, pool } = connect(database.url)
  expect(await db.$count(users)).toBe(0)
  await pool.end()
})
