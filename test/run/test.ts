import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs'
import { CommandError } from '#db/local/CommandError.ts'
import { findChromium } from '#db/local/findChromium.ts'
import { freePort } from '#db/local/ports.ts'
import { postgresBinaries } from '#db/local/postgresBinaries.ts'
import { buildClient } from '#server/commands/buildClient.ts'
import { type Life } from '#server/commands/life.ts'
import { root } from '#server/commands/localSettings.ts'
import { plainLine } from '#server/commands/plainLine.ts'
import { runCommand } from '#server/commands/runCommand.ts'
import { type Count, addUp, readPlaywrightReport, readVitestReport, withExitCode } from './readReports.ts'
import { runTool } from './runTool.ts'
import { throwAwayPostgres } from './throwAwayPostgres.ts'

const reports = `${root}/test-results`

// npm test: type check, lint, unit, API and end-to-end tests against a throw-away PostgreSQL.
await runCommand(async (life) => {
  rmSync(reports, { recursive: true, force: true })
  mkdirSync(reports, { recursive: true })
  const chromium = await tools()
  const postgres = await life.begin(throwAwayPostgres, ({ stop }) => stop())
  // What the runners, the servers they start and the browsers leave about goes with the folder.
  const env = { TEST_DATABASE_URL: postgres.url('postgres'), CHROMIUM: chromium, TMPDIR: postgres.folder }
  const { passed, failed, failures } = addUp([
    // Each of the two keeps one core busy; the runners then take both.
    ...(await Promise.all([check(life, 'type check', 'vue-tsc', ['--noEmit']), check(life, 'lint', 'eslint', ['.'])])),
    await vitest(life, env),
    await playwright(life, env),
  ])
  if (failures.length) console.log(['', 'Failed:', ...failures.map((failure) => `  ${failure}`)].join('\n'))
  console.log(`\n${passed} passed, ${failed} failed`)
  return failed > 0 ? 1 : 0
}, { codeWhenAsked: 130 })

/** Path of Chromium. @throws CommandError with a line for each program that is missing, so that they are installed in one go */
async function tools(): Promise<string> {
  const [chromium, postgres] = await Promise.allSettled([(async () => findChromium())(), (async () => postgresBinaries(null, ''))()])
  const missing = [chromium, postgres].flatMap((one) => (one.status === 'rejected' ? [plainLine(one.reason) ?? String(one.reason)] : []))
  if (missing.length || chromium.status === 'rejected') throw new CommandError(missing.join('\n'))
  return chromium.value
}

/** A check that passes or fails as a whole counts as one test. */
async function check(life: Life, name: string, tool: string, args: readonly string[]): Promise<Count> {
  const failed = (await runTool(life, tool, { args })) !== 0
  console.log(`${name}: ${failed ? 'failed' : 'passed'}`)
  return { passed: failed ? 0 : 1, failed: failed ? 1 : 0, failures: failed ? [name] : [] }
}

async function vitest(life: Life, env: Record<string, string>): Promise<Count> {
  const report = `${reports}/vitest.json`
  const code = await runTool(life, 'vitest', { args: ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${report}`], env })
  return counted(report, (text) => readVitestReport(text, root), code, 'vitest')
}

async function playwright(life: Life, env: Record<string, string>): Promise<Count> {
  await buildClient()
  const report = `${reports}/playwright.json`
  const code = await runTool(life, 'playwright', {
    args: ['test', '--config', 'test/e2e/playwright.config.ts'],
    env: { ...env, E2E_PORT: String(await freePort()), PLAYWRIGHT_JSON_OUTPUT_NAME: report },
  })
  return counted(report, readPlaywrightReport, code, 'playwright')
}

function counted(report: string, read: (text: string) => Count, code: number, runner: string): Count {
  if (!existsSync(report)) return withExitCode({ passed: 0, failed: 0, failures: [] }, code || 1, runner)
  return withExitCode(read(readFileSync(report, 'utf8')), code, runner)
}
