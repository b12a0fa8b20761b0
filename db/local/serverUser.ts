import { execFileSync, spawn, spawnSync } from 'node:child_process'
import { chownSync } from 'node:fs'
import { CommandError } from './CommandError.ts'

/** PostgreSQL refuses to run as root. Root therefore gives the data to Debian’s user for it and runs the server as that user. */
export const isRoot = process.getuid?.() === 0
const user = 'postgres'
const inherit = (program: string, args: readonly string[]): [string, string[]] => (isRoot ? ['runuser', ['-u', user, '--', program, ...args]] : [program, [...args]])

/** Number of the user the server runs as. @throws CommandError when root has nobody to hand the data to */
export function serverUserId(): number {
  if (!isRoot) return process.getuid!()
  try {
    return Number(execFileSync('id', ['-u', user], { stdio: ['ignore', 'pipe', 'ignore'] }).toString())
  } catch {
    throw new CommandError(`Root cannot run PostgreSQL, and there is no user ${user} to run it. Install Debian’s package: apt-get install postgresql`)
  }
}

/** Gives a file or folder to the user the server runs as. */
export function handOver(path: string): void {
  if (isRoot) chownSync(path, serverUserId(), Number(execFileSync('id', ['-g', user]).toString()))
}

/** Whether the server’s user can get into a folder. */
export const canReach = (folder: string): boolean => spawnSync(...inherit('test', ['-x', folder]), { cwd: '/' }).status === 0

/**
 * Runs one of PostgreSQL’s programs as the user the server runs as. It gets a session of its own, so that Ctrl-C in the terminal does
 * not break it off in the middle: the command that started it ends it in order.
 * @param listen - false for pg_ctl: the server keeps what it inherits, and waiting for the end of a pipe would wait for its end
 * @returns the exit code and what was said
 */
export function runAsServer(program: string, args: readonly string[], listen = true): Promise<{ code: number; said: string }> {
  return new Promise((done) => {
    const [command, all] = inherit(program, args)
    const child = spawn(command, all, { cwd: '/', detached: true, stdio: ['ignore', 'ignore', listen ? 'pipe' : 'ignore'] })
    let said = ''
    child.stderr?.on('data', (data: Buffer) => { said += data.toString() })
    child.on('error', (error) => done({ code: 1, said: error.message }))
    child.on(listen ? 'close' : 'exit', (code: number | null) => done({ code: code ?? 1, said: said.trim() }))
  })
}
