import { existsSync, readFileSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { setTimeout as delay } from 'node:timers/promises'
import { CommandError } from './CommandError.ts'

export type Postmaster = { pid: number; port: number; isReady: boolean }

/** The server that runs on this data; null when none does, whatever an old lock file says. */
export function findPostmaster(data: string): Postmaster | null {
  const lock = join(data, 'postmaster.pid')
  if (!existsSync(lock)) return null
  const [pid = '', folder = '', , port = '', , , , status = ''] = readFileSync(lock, 'utf8').split('\n')
  // The number may be another process’s by now, even another PostgreSQL’s: only its own arguments tell.
  const about = `/proc/${Number(pid)}/cmdline`
  if (!existsSync(about)) return null
  const [program = '', ...args] = readFileSync(about, 'utf8').split('\0')
  return /(^|\/)postgres$/.test(program) && args.includes(folder) ? { pid: Number(pid), port: Number(port), isReady: status.trim() === 'ready' } : null
}

/** The same, waiting for one that is just starting or stopping. @throws CommandError when it does neither in a minute */
export async function settledPostmaster(data: string): Promise<Postmaster | null> {
  for (let tries = 0; tries < 300; tries += 1) {
    const found = findPostmaster(data)
    if (!found || found.isReady) return found
    await delay(200)
  }
  throw new CommandError(`The PostgreSQL of ${data} neither starts nor stops. Look at the log beside it, or end process ${findPostmaster(data)?.pid ?? ''} and start again.`)
}

/**
 * After a crash the lock may name a number that another process of the same user has since; PostgreSQL would believe it. A lock whose
 * process is gone stays: PostgreSQL looks by it whether parts of the killed server still work on the data.
 */
export function dropStaleLock(data: string): void {
  const lock = join(data, 'postmaster.pid')
  if (!existsSync(lock) || findPostmaster(data)) return
  const pid = Number(readFileSync(lock, 'utf8').split('\n')[0])
  if (!(pid > 0) || existsSync(`/proc/${pid}`)) rmSync(lock)
}
