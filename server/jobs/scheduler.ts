import { type Logger } from 'pino'

export type Job = { name: string; everyMs: number; run: () => Promise<unknown> }

/**
 * Runs each job now and then again after its interval; one at a time, so a slow one is never started twice.
 * Several instances may run the same job at once: each job must be safe to run twice.
 * @returns stop: resolves when the job under way has finished
 */
export function startScheduler(jobs: readonly Job[], logger: Logger): { stop: () => Promise<void> } {
  const timers = new Set<NodeJS.Timeout>()
  const running = new Set<Promise<void>>()
  let stopped = false

  const runJob = async (job: Job) => {
    try {
      await job.run()
    } catch (err) {
      // The next round tries again; a database that is away must not end the process.
      logger.warn({ err, job: job.name }, 'job failed')
    }
  }
  const plan = (job: Job, delayMs: number) => {
    const timer = setTimeout(() => {
      timers.delete(timer)
      const run: Promise<void> = runJob(job).finally(() => {
        running.delete(run)
        if (!stopped) plan(job, job.everyMs)
      })
      running.add(run)
    }, delayMs)
    timer.unref()
    timers.add(timer)
  }
  for (const job of jobs) plan(job, 0)

  return {
    async stop() {
      stopped = true
      timers.forEach(clearTimeout)
      await Promise.all(running)
    },
  }
}
