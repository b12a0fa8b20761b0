import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, statfsSync, writeFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { CommandError } from '#db/local/CommandError.ts'
import { whyTaken } from '#db/local/ports.ts'
import { portInUse } from './plainLine.ts'

/** The folder of this project. */
export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '')
/** What this machine keeps for it: database, photographs, mails, stamps. */
export const dataFolder = `${root}/.data`
const leastFreeMb = 200

/** The port people open, from PORT. @throws CommandError with one line when nobody can listen there */
export async function localPort(): Promise<number> {
  const port = Number(process.env.PORT || 4310)
  if (!Number.isInteger(port) || port < 1 || port > 65_535) throw new CommandError(`PORT is ${process.env.PORT}; it must be a number from 1 to 65535.`)
  const why = await whyTaken(port)
  if (why === 'EACCES') throw new CommandError(`Port ${port} is kept for root. Choose another above 1023: PORT=4310 npm start`)
  if (why !== null) throw new CommandError(portInUse(port))
  return port
}

/** @throws CommandError when the disk has too little room to work on */
export function checkRoom(folder: string): void {
  const { bavail, bsize } = statfsSync(folder)
  const freeMb = Math.floor((bavail * bsize) / 1e6)
  if (freeMb < leastFreeMb) throw new CommandError(`The disk is nearly full: ${freeMb} MB are free and ${leastFreeMb} are needed. Make room and start again.`)
}

export function ensureDataFolder(): void {
  mkdirSync(dataFolder, { recursive: true })
  checkRoom(dataFolder)
}

/** The secret sessions are signed with on this machine; made once. */
export function sessionSecret(): string {
  const file = `${dataFolder}/session-secret`
  if (!existsSync(file) || readFileSync(file, 'utf8').length < 32) writeFileSync(file, randomBytes(48).toString('base64url'), { mode: 0o600 })
  return readFileSync(file, 'utf8')
}

/**
 * Only one command at a time works on the data folder.
 * @returns a function that gives it free again
 * @throws CommandError when one does already
 */
export function takeFolder(): () => void {
  const file = `${dataFolder}/start.pid`
  const pid = existsSync(file) ? Number(readFileSync(file, 'utf8')) : 0
  // After a crash the number may be anybody's: only a process of this very folder counts.
  const runs = pid > 0 && pid !== process.pid && existsSync(`/proc/${pid}/cmdline`) && readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes(`${root}/server/commands/`)
  if (runs) throw new CommandError(`Proofcloth runs from this folder already (process ${pid}). Open it in the browser, or stop it first.`)
  writeFileSync(file, String(process.pid))
  return () => { if (readFileSync(file, 'utf8') === String(process.pid)) writeFileSync(file, '') }
}
