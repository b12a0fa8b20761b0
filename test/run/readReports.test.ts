import { describe, expect, it } from 'vitest'
import { addUp, readPlaywrightReport, readVitestReport, withExitCode } from './readReports.ts'

const file = (name: string, status: string, ...tests: [string, string][]) => ({ name: `/p/${name}`, status, assertionResults: tests.map(([fullName, one]) => ({ fullName, status: one })) })
const vitest = (...testResults: object[]) => readVitestReport(JSON.stringify({ numPassedTests: 4, numFailedTests: 0, testResults }), '/p')

describe('a report of Vitest', () => {
  it('names failed tests with their file', () => {
    expect(vitest(file('test/a.test.ts', 'failed', ['adds', 'passed'], ['divides', 'failed'], ['subtracts', 'failed'])))
      .toEqual({ passed: 4, failed: 2, failures: ['test/a.test.ts: divides', 'test/a.test.ts: subtracts'] })
  })
  it('counts a file that could not be loaded as one failure', () => {
    expect(vitest(file('test/a.test.ts', 'failed'), file('test/b.test.ts', 'passed', ['adds', 'passed']))).toEqual({ passed: 4, failed: 1, failures: ['test/a.test.ts: could not be run'] })
  })
})

describe('a report of Playwright', () => {
  const spec = (title: string, ...statuses: string[]) => ({ title, tests: statuses.map((status, i) => ({ projectName: ['desk', 'phone'][i], status })) })
  const read = (specs: object[], errors: object[] = []) => readPlaywrightReport(JSON.stringify({ stats: { expected: 3, unexpected: 1, flaky: 0 }, suites: [{ title: 'job.spec.ts', suites: [{ title: 'a skirt', specs }] }], errors }))

  it('names failed stories with their window and what they are part of', () => {
    expect(read([spec('is hung', 'expected', 'expected'), spec('is cut', 'expected', 'unexpected')])).toEqual({ passed: 3, failed: 1, failures: ['phone: job.spec.ts › a skirt › is cut'] })
  })
  it('counts what went wrong outside of the stories', () => {
    expect(read([], [{ message: 'Error: port is taken\n  at x' }])).toMatchObject({ failed: 1, failures: ['Error: port is taken'] })
  })
})

it('fails a runner that ends badly and names nothing', () => {
  const fine = { passed: 3, failed: 0, failures: [] }
  expect(withExitCode(fine, 0, 'vitest')).toBe(fine)
  expect(withExitCode(fine, 1, 'vitest')).toMatchObject({ passed: 3, failed: 1 })
  expect(withExitCode({ passed: 3, failed: 2, failures: ['a', 'b'] }, 1, 'vitest').failed).toBe(2)
})

it('adds up what the runners have counted', () => {
  expect(addUp([{ passed: 3, failed: 1, failures: ['a'] }, { passed: 4, failed: 2, failures: ['b', 'c'] }])).toEqual({ passed: 7, failed: 3, failures: ['a', 'b', 'c'] })
})
