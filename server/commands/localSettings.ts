import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, statfsSync, writeFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { CommandError } from '#db/local/CommandError.ts'

/** The folder of this project. */
export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '')
/** What this machine keeps for it: database, photographs, stamps. */
export const dataFolder = `${root}/.data`
const leastFreeMb = 200

export function ensureDataFolder(): void {
  mkdirSync(dataFolder, { recursive: true })
  const { bavail, bsize } = statfsSync(dataFolder)
  const freeMb = Math.floor((bavail * bsize) / 1e6)
  if (freeMb < leastFreeMb) throw new CommandError(`The disk is nearly full: ${freeMb} MB are free and ${leastFreeMb} are needed. Make room and start again.`)
}

/** The secret sessions are signed with on this machine; made once. */
export function sessionSecret(): string {
  const file = `${dataFolder}/session-secret`
  if (!existsSync(file)) writeFileSync(file, randomBytes(48).toString('base64url'), { mode: 0o600 })
  return readFileSync(file, 'utf8')
}

/** Only one start at a time works on this folder. @returns a function that gives it free again */
export function takeFolder(): () => void {
  const file = `${dataFolder}/start.pid`
  const pid = existsSync(file) ? Number(readFileSync(file, 'utf8')) : 0
  const runs = pid > 0 && existsSync(`/proc/${pid}/cmdline`) && readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes('server/commands/')
  if (runs && pid !== process.pid) throw new CommandError(`Proofcloth runs from this folder already (process ${pid}). Stop it first, or open it in the browser.`)
  writeFileSync(file, String(process.pid))
  return () => { if (existsSync(file) && readFileSync(file, 'utf8') === String(process.pid)) writeFileSync(file, '') }
}
