/** What a runner has counted; `failures` names every failed test, or what else went wrong. */
export type Count = { passed: number; failed: number; failures: readonly string[] }

type VitestReport = { numPassedTests: number; numFailedTests: number; testResults: { name: string; status: string; message?: string; assertionResults: { status: string; fullName: string }[] }[] }

/** Counts a report of Vitest. A file that could not even be loaded names no test and counts as one that failed. */
export function readVitestReport(text: string, root: string): Count {
  const { numPassedTests, testResults } = JSON.parse(text) as VitestReport
  const failures = testResults.flatMap(({ name, status, assertionResults }) => {
    const file = name.replace(`${root}/`, '')
    const named = assertionResults.filter((one) => one.status === 'failed').map(({ fullName }) => `${file}: ${fullName}`)
    return named.length || status !== 'failed' ? named : [`${file}: could not be run`]
  })
  return { passed: numPassedTests, failed: failures.length, failures }
}

type PlaywrightSuite = { title: string; specs?: { title: string; tests: { projectName: string; status: string }[] }[]; suites?: PlaywrightSuite[] }
type PlaywrightReport = { stats: { expected: number; unexpected: number; flaky: number }; suites: PlaywrightSuite[]; errors?: { message?: string }[] }

/** Counts a report of Playwright; one story in two sizes of window is two tests. */
export function readPlaywrightReport(text: string): Count {
  const { stats, suites, errors = [] } = JSON.parse(text) as PlaywrightReport
  const named = suites.flatMap((suite) => failedIn(suite, []))
  const failures = [...named, ...errors.map(({ message = 'an error outside of the tests' }) => message.split('\n')[0]!)]
  return { passed: stats.expected + stats.flaky, failed: failures.length, failures }
}

function failedIn({ title, specs = [], suites = [] }: PlaywrightSuite, above: readonly string[]): string[] {
  const path = [...above, title]
  const own = specs.flatMap((spec) => spec.tests.filter(({ status }) => status === 'unexpected').map(({ projectName }) => `${projectName}: ${[...path, spec.title].join(' › ')}`))
  return [...own, ...suites.flatMap((suite) => failedIn(suite, path))]
}

/** A runner that ends badly without naming a failure has failed all the same. */
export const withExitCode = (count: Count, code: number, runner: string): Count =>
  (code !== 0 && count.failed === 0 ? { ...count, failed: 1, failures: [`${runner} ended with code ${code}; the reason is in its output above`] } : count)

export function addUp(counts: readonly Count[]): Count {
  const sum = (key: 'passed' | 'failed') => counts.reduce((total, count) => total + count[key], 0)
  return { passed: sum('passed'), failed: sum('failed'), failures: counts.flatMap(({ failures }) => failures) }
}
