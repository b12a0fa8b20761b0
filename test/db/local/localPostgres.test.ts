import { execFileSync, spawn } from 'node:child_process'
import { chmodSync, existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { setTimeout as delay } from 'node:timers/promises'
import pg from 'pg'
import { afterEach, beforeEach, expect, it } from 'vitest'
import { ensureDatabase } from '#db/local/ensureDatabase.ts'
import { type LocalPostgres, startLocalPostgres } from '#db/local/localPostgres.ts'
import { findPostmaster } from '#db/local/postmaster.ts'

let above: string
let folder: string
const running: LocalPostgres[] = []
beforeEach(() => {
  above = mkdtempSync(join(tmpdir(), 'local-postgres-'))
  chmodSync(above, 0o711) // as root the server is another user
  folder = join(above, 'postgres')
})
afterEach(async () => {
  for (const postgres of running.splice(0)) await postgres.stop()
  rmSync(above, { recursive: true })
})

async function start({ throwAway = true } = {}): Promise<LocalPostgres> {
  const postgres = await startLocalPostgres(folder, { throwAway })
  running.push(postgres)
  return postgres
}
const data = () => join(folder, 'data')
const lock = () => join(data(), 'postmaster.pid')
const killServer = () => process.kill(findPostmaster(data())!.pid, 'SIGKILL')

async function ask(postgres: LocalPostgres, query: string): Promise<unknown[]> {
  const client = new pg.Client({ connectionString: postgres.url('kept') })
  client.on('error', () => {}) // killed on purpose below
  await client.connect()
  const { rows } = await client.query(query)
  await client.end()
  return rows
}

it('keeps what was written, its password and its port over a stop', async () => {
  const first = await start()
  await ensureDatabase(first, 'kept')
  await ensureDatabase(first, 'kept')
  await ask(first, 'create table notes as select 1 as n')
  await first.stop()
  expect(findPostmaster(data())).toBeNull()
  await expect(ask(first, 'select 1')).rejects.toThrow(/ECONNREFUSED/)
  const second = await start()
  expect(second.url('kept')).toBe(first.url('kept'))
  expect(await ask(second, 'select n from notes')).toEqual([{ n: 1 }])
})

it('asks everybody for the password and listens on loopback only', async () => {
  const postgres = await start()
  const client = new pg.Client({ connectionString: postgres.url('postgres').replace(/:[^:@]+@/, ':guessed@') })
  await expect(client.connect()).rejects.toThrow(/password/)
  await ensureDatabase(postgres, 'kept')
  expect(await ask(postgres, `select current_setting('listen_addresses') as at, current_setting('unix_socket_directories') as sockets`)).toEqual([{ at: '127.0.0.1', sockets: '' }])
})

it('takes over a server that a killed command has left running', async () => {
  const first = await start()
  const { pid } = findPostmaster(data())!
  const second = await start()
  expect(second.url('postgres')).toBe(first.url('postgres'))
  expect(findPostmaster(data())!.pid).toBe(pid)
})

it('starts again after the server was killed, with what was written', async () => {
  const first = await start({ throwAway: false })
  await ensureDatabase(first, 'kept')
  await ask(first, 'create table notes as select 1 as n')
  killServer()
  await delay(200)
  expect(await ask(await start({ throwAway: false }), 'select n from notes')).toEqual([{ n: 1 }])
})

it('starts when the lock names a number that is another process’s by now', async () => {
  const first = await start()
  await first.stop()
  const [command, args] = process.getuid?.() === 0 ? ['runuser', ['-u', 'postgres', '--', 'sleep', '60']] : ['sleep', ['60']]
  const other = spawn(command as string, args as string[])
  await delay(200)
  // runuser waits for its child, which is the one that belongs to the server's user
  const pid = process.getuid?.() === 0 ? execFileSync('pgrep', ['-P', String(other.pid)]).toString().trim() : String(other.pid)
  writeFileSync(lock(), `${pid}\n${data()}\n0\n5432\n\n127.0.0.1\n0 0\nready\n`)
  expect(findPostmaster(data())).toBeNull()
  await start()
  expect(findPostmaster(data())!.pid).not.toBe(Number(pid))
  process.kill(Number(pid))
})

it('makes anew what a broken-off first start has left', async () => {
  mkdirSync(join(folder, 'making'), { recursive: true })
  writeFileSync(join(folder, 'making', 'PG_VERSION'), '15\n')
  await start()
  expect(existsSync(join(folder, 'making'))).toBe(false)
})

it('says which version the data was made by, and leaves it alone', async () => {
  const first = await start()
  await first.stop()
  const made = readFileSync(join(data(), 'PG_VERSION'), 'utf8')
  writeFileSync(join(data(), 'PG_VERSION'), '9\n')
  await expect(start()).rejects.toThrow(/^The database in .* was made by PostgreSQL 9 and this machine has \d+.*move that folder away to begin anew\.$/)
  writeFileSync(join(data(), 'PG_VERSION'), made)
  await start()
})

it('says what PostgreSQL said when it does not start', async () => {
  const first = await start()
  await first.stop()
  writeFileSync(join(data(), 'postgresql.conf'), 'no such setting\n')
  await expect(start()).rejects.toThrow(/^PostgreSQL did not start: .*postgresql\.conf.* What it said is in .*log\.$/)
})

it('says that the password is gone', async () => {
  await (await start()).stop()
  rmSync(join(folder, 'password'))
  await expect(start()).rejects.toThrow(/password of the database .* is gone/)
})
