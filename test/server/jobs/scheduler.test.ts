import { pino } from 'pino'
import { afterEach, beforeEach, expect, it, vi } from 'vitest'
import { startScheduler } from '#server/jobs/scheduler.ts'

const logger = pino({ level: 'silent' })
beforeEach(() => { vi.useFakeTimers() })
afterEach(() => { vi.useRealTimers() })

it('runs a job at the start and again after each interval', async () => {
  const run = vi.fn(async () => {})
  const scheduler = startScheduler([{ name: 'count', everyMs: 1000, run }], logger)
  await vi.advanceTimersByTimeAsync(0)
  expect(run).toHaveBeenCalledTimes(1)
  await vi.advanceTimersByTimeAsync(2000)
  expect(run).toHaveBeenCalledTimes(3)
  await scheduler.stop()
  await vi.advanceTimersByTimeAsync(5000)
  expect(run).toHaveBeenCalledTimes(3)
})

it('tries a job that failed again', async () => {
  const run = vi.fn(async () => { throw new Error('no database') })
  const scheduler = startScheduler([{ name: 'fail', everyMs: 1000, run }], logger)
  await vi.advanceTimersByTimeAsync(1000)
  expect(run).toHaveBeenCalledTimes(2)
  await scheduler.stop()
})

it('never starts a slow job twice, and stops only when it is done', async () => {
  let finish = () => {}
  const run = vi.fn(() => new Promise<void>((resolve) => { finish = resolve }))
  const scheduler = startScheduler([{ name: 'slow', everyMs: 1000, run }], logger)
  await vi.advanceTimersByTimeAsync(10_000)
  expect(run).toHaveBeenCalledTimes(1)
  let stopped = false
  const stop = scheduler.stop().then(() => { stopped = true })
  await vi.advanceTimersByTimeAsync(0)
  expect(stopped).toBe(false)
  finish()
  await stop
  expect(stopped).toBe(true)
})
