import { type ChildProcess, spawn } from 'node:child_process'
import { fileURLToPath } from 'node:url'

const script = `
  import { startServer, stopOnSignals } from '#server/main.ts'
  import { readSettings } from '#server/settings.ts'
  const server = await startServer(readSettings(process.env, 'local'))
  stopOnSignals(server)
  console.log('listening on http://127.0.0.1:' + server.port)
`

/** The server as a process of its own, so that it can be killed. @param env - its environment variables */
export async function serverProcess(env: Record<string, string>): Promise<{ url: string; child: ChildProcess; ended: Promise<{ code: number | null; signal: string | null }> }> {
  const child = spawn(process.execPath, ['--import', 'tsx', '--input-type=module', '-e', script], {
    cwd: fileURLToPath(new URL('../..', import.meta.url)), env: { ...process.env, LOG_LEVEL: 'silent', PORT: '0', ...env }, stdio: ['ignore', 'pipe', 'inherit'],
  })
  const ended = new Promise<{ code: number | null; signal: string | null }>((resolve) => { child.once('exit', (code, signal) => resolve({ code, signal })) })
  const url = await new Promise<string>((resolve, reject) => {
    child.stdout!.on('data', (data: Buffer) => {
      const found = /listening on (\S+)/.exec(data.toString())?.[1]
      if (found) resolve(found)
    })
    void ended.then(({ code }) => reject(new Error(`The server ended with ${code} before it listened.`)))
  })
  return { url, child, ended }
}
