import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { fileURLToPath } from 'node:url'
import { expect, it } from 'vitest'

const cwd = fileURLToPath(new URL('../../..', import.meta.url))

/** Runs a command's lines in a process of its own. @returns what it printed and its exit code; `act` is called when it prints “ready” */
function command(lines: string, act: (child: ReturnType<typeof spawn>) => void = () => {}): Promise<{ said: string[]; code: number | null }> {
  const script = `
    import { setTimeout as delay } from 'node:timers/promises'
    import { runCommand } from '#server/commands/runCommand.ts'
    import { CommandError } from '#db/local/CommandError.ts'
    await runCommand(async (life) => { ${lines} })
    setInterval(() => {}, 1000)
  `
  const child = spawn(process.execPath, ['--import', 'tsx', '--input-type=module', '-e', script], { cwd, stdio: ['ignore', 'pipe', 'pipe', 'ipc'] })
  let said = ''
  const listen = (data: Buffer) => {
    const before = said.includes('ready')
    said += data.toString()
    if (!before && said.includes('ready')) act(child)
  }
  child.stdout!.on('data', listen)
  child.stderr!.on('data', listen)
  // “close” never comes once the channel was cut, so each end is waited for
  return Promise.all([once(child, 'exit'), once(child.stdout!, 'end'), once(child.stderr!, 'end')]).then(([[code]]) => ({ said: said.trim().split('\n'), code }))
}
const begin = (name: string) => `await life.begin(async () => {}, async () => { await delay(50); console.log('end ${name}') });`

it('ends what was begun, last first, however often it is asked', async () => {
  const { said, code } = await command(`${begin('database')} ${begin('server')} console.log('ready')`, (child) => { child.kill('SIGINT'); child.kill('SIGINT'); child.kill('SIGTERM') })
  expect(said).toEqual(['ready', 'end server', 'end database'])
  expect(code).toBe(0)
})

it('lets what is just beginning finish, ends it too, and begins nothing more', async () => {
  const { said, code } = await command(
    `await life.begin(async () => { console.log('ready'); await delay(300) }, () => console.log('end database')); ${begin('server')}`,
    (child) => child.kill('SIGTERM'),
  )
  expect(said).toEqual(['ready', 'end database'])
  expect(code).toBe(0)
})

it('ends when the process that started it is gone', async () => {
  const { said } = await command(`${begin('server')} console.log('ready')`, (child) => child.disconnect())
  expect(said).toEqual(['ready', 'end server'])
})

it('tells what stands in its way in one line, and ends what was begun', async () => {
  const { said, code } = await command(`${begin('database')} throw new CommandError('Port 4310 is in use.')`)
  expect(said).toEqual(['Port 4310 is in use.', 'end database'])
  expect(code).toBe(1)
})
