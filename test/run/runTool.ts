import { type ChildProcess, spawn } from 'node:child_process'
import { join } from 'node:path'
import { type Life } from '#server/commands/life.ts'
import { root } from '#server/commands/localSettings.ts'

export type Tool = { args: readonly string[]; env?: Readonly<Record<string, string>> }

/**
 * Runs a program with its output shown. It is ended with everything it has begun when the command ends before it.
 * @param program - a path, or the name of one of the project's tools
 * @returns its exit code
 */
export async function runTool(life: Life, program: string, { args, env = {} }: Tool): Promise<number> {
  const path = program.includes('/') ? program : join(root, 'node_modules/.bin', program)
  // A group of its own: Ctrl-C reaches it once, from here, and with it its workers and browsers.
  const child = await life.begin(
    async () => spawn(path, args, { cwd: root, stdio: ['ignore', 'inherit', 'inherit'], detached: true, env: { ...process.env, ...env } }),
    endGroup,
  )
  return exitCode(child)
}

const exitCode = (child: ChildProcess): Promise<number> => new Promise((done) => {
  child.on('error', (error) => { console.error(error.message); done(1) })
  child.on('exit', (code) => done(code ?? 1))
})

/** Asks once, then no longer. */
async function endGroup(child: ChildProcess): Promise<void> {
  if (child.pid === undefined || child.exitCode !== null || child.signalCode !== null) return
  const group = -child.pid
  const gone = exitCode(child)
  process.kill(group, 'SIGTERM')
  const late = setTimeout(() => process.kill(group, 'SIGKILL'), 8000)
  await gone
  clearTimeout(late)
}
