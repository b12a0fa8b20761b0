import { existsSync } from 'node:fs'
import { setTimeout as delay } from 'node:timers/promises'
import { CommandError } from '#db/local/CommandError.ts'
import { findChromium } from '#db/local/findChromium.ts'
import { freePort } from '#db/local/ports.ts'
import { buildClient } from '#server/commands/buildClient.ts'
import { root } from '#server/commands/localSettings.ts'
import { runCommand } from '#server/commands/runCommand.ts'
import { runTool } from './runTool.ts'
import { throwAwayPostgres } from './throwAwayPostgres.ts'

const script = 'test/e2e/screenshots.ts'

// npm run screenshots: the script is given a running demo (BASE_URL) and a browser (CHROMIUM).
await runCommand(async (life) => {
  if (!existsSync(`${root}/${script}`)) throw new CommandError(`There is no ${script}.`)
  const chromium = findChromium()
  await buildClient()
  const postgres = await life.begin(throwAwayPostgres, ({ stop }) => stop())
  const port = String(await freePort())
  const url = `http://127.0.0.1:${port}`
  const run = (file: string, env: Record<string, string>) => runTool(life, process.execPath, { args: ['--import', 'tsx', file], env })
  const server = run('test/e2e/server.ts', { PORT: port, TEST_DATABASE_URL: postgres.url('postgres'), TMPDIR: postgres.folder }).then((code) => { throw new CommandError(`The server ended with code ${code}.`) })
  const made = ready(url).then(() => run(script, { BASE_URL: url, CHROMIUM: chromium }))
  return Promise.race([server, made])
}, { codeWhenAsked: 130 })

async function ready(url: string): Promise<void> {
  for (let tries = 0; tries < 240; tries += 1) {
    const answer = await fetch(`${url}/api/ready`).catch(() => null)
    if (answer?.ok) return
    await delay(250)
  }
  throw new CommandError('The server was not ready in a minute.')
}
