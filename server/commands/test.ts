import { spawn } from 'node:child_process'
import { existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { findChromium } from '#db/local/installPackage.ts'
import { startLocalPostgres } from '#db/local/LocalPostgres.ts'
import { buildClient } from './buildClient.ts'
import { endInOrder, runCommand } from './ending.ts'
import { root } from './localSettings.ts'

type Count = { passed: number; failed: number; failures: readonly string[] }
const reports = `${root}/test-results`

// npm test: type check, lint, unit, API and end-to-end tests against a throw-away PostgreSQL.
await runCommand(async () => {
  rmSync(reports, { recursive: true, force: true })
  mkdirSync(reports, { recursive: true })
  const chromium = findChromium()
  const folder = mkdtempSync(join(tmpdir(), 'proofcloth-test-'))
  let stopDatabase = () => {}
  const end = endInOrder(async () => {
    stopDatabase()
    rmSync(folder, { recursive: true, force: true })
  })
  try {
    const postgres = await startLocalPostgres(join(folder, 'postgres'), { throwAway: true })
    stopDatabase = postgres.stop
    const env = { TEST_DATABASE_URL: postgres.url('postgres'), CHROMIUM: chromium }
    const counts = [
      // Two cores: the checks that read files share them, then the tests take both.
      ...(await Promise.all([check('type check', 'vue-tsc', ['--noEmit']), check('lint', 'eslint', ['.'])])),
      await vitest(env),
      await playwright(env),
    ]
    const passed = counts.reduce((sum, count) => sum + count.passed, 0)
    const failed = counts.reduce((sum, count) => sum + count.failed, 0)
    for (const failure of counts.flatMap(({ failures }) => failures)) console.error(`failed: ${failure}`)
    console.log(`\n${passed} passed, ${failed} failed`)
    await end(failed > 0 ? 1 : 0)
  } catch (error) {
    console.error(error instanceof Error ? error.message : error)
    await end(1)
  }
})

/** Runs one of the project's tools with its output shown. @returns its exit code */
function run(tool: string, args: readonly string[], env: Record<string, string> = {}): Promise<number> {
  return new Promise((done) => {
    const child = spawn(join(root, 'node_modules/.bin', tool), args, { cwd: root, stdio: ['ignore', 'inherit', 'inherit'], env: { ...process.env, ...env } })
    child.on('error', () => done(1))
    child.on('exit', (code) => done(code ?? 1))
  })
}

/** A check that passes or fails as a whole counts as one test. */
async function check(name: string, tool: string, args: readonly string[]): Promise<Count> {
  const failed = (await run(tool, args)) !== 0
  console.log(`${name}: ${failed ? 'failed' : 'passed'}`)
  return { passed: failed ? 0 : 1, failed: failed ? 1 : 0, failures: failed ? [name] : [] }
}

/** A runner that ends badly without naming a failure has failed all the same. */
const withExitCode = (count: Count, code: number, runner: string): Count =>
  (code !== 0 && count.failed === 0 ? { ...count, failed: 1, failures: [`${runner} ended with ${code}`] } : count)

async function vitest(env: Record<string, string>): Promise<Count> {
  const report = `${reports}/vitest.json`
  const code = await run('vitest', ['run', '--reporter=dot', '--reporter=json', `--outputFile.json=${report}`], env)
  if (!existsSync(report)) return { passed: 0, failed: 1, failures: ['vitest made no report'] }
  const { numPassedTests, numFailedTests, testResults } = JSON.parse(readFileSync(report, 'utf8')) as VitestReport
  const failures = testResults.flatMap(({ name, status, assertionResults }) => {
    const named = assertionResults.filter((one) => one.status === 'failed').map(({ fullName }) => `${name.replace(`${root}/`, '')}: ${fullName}`)
    return named.length || status !== 'failed' ? named : [name.replace(`${root}/`, '')]
  })
  return withExitCode({ passed: numPassedTests, failed: Math.max(numFailedTests, failures.length), failures }, code, 'vitest')
}
type VitestReport = { numPassedTests: number; numFailedTests: number; testResults: { name: string; status: string; assertionResults: { status: string; fullName: string }[] }[] }

async function playwright(env: Record<string, string>): Promise<Count> {
  await buildClient()
  const report = `${reports}/playwright.json`
  const code = await run('playwright', ['test', '--config', 'test/e2e/playwright.config.ts'], { ...env, PLAYWRIGHT_JSON_OUTPUT_NAME: report })
  if (!existsSync(report)) return { passed: 0, failed: 1, failures: ['playwright made no report'] }
  const { stats, suites } = JSON.parse(readFileSync(report, 'utf8')) as PlaywrightReport
  return withExitCode({ passed: stats.expected + stats.flaky, failed: stats.unexpected, failures: failedIn(suites) }, code, 'playwright')
}
type PlaywrightSuite = { title: string; specs?: { title: string; ok: boolean }[]; suites?: PlaywrightSuite[] }
type PlaywrightReport = { stats: { expected: number; unexpected: number; flaky: number }; suites: PlaywrightSuite[] }
const failedIn = (suites: readonly PlaywrightSuite[] = []): string[] => suites.flatMap(({ title, specs = [], suites: inner }) => [...specs.filter(({ ok }) => !ok).map((spec) => `${title}: ${spec.title}`), ...failedIn(inner)])
