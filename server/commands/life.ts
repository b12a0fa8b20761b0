export type Life = {
  /**
   * Begins something that must be ended again; not when the end has come already.
   * @param run - is let finish when the end comes meanwhile, so that what it has begun is known
   * @param undo - ends it
   */
  begin: <T>(run: () => Promise<T>, undo: (begun: T) => unknown) => Promise<T>
  /** Ends everything, what was begun last first, and the process with it. */
  end: (code: number) => Promise<never>
}

const never = () => new Promise<never>(() => {})

/**
 * Keeps what a command has begun and ends it in order: by hand, on Ctrl-C, when asked to terminate, and when the process that
 * started this one is gone. Being asked again changes nothing.
 * @param codeWhenAsked - exit code after a signal
 */
export function beginLife(codeWhenAsked = 0): Life {
  const undo: (() => unknown)[] = []
  const beginning = new Set<Promise<unknown>>()
  let ending: Promise<never> | null = null
  const end = (code: number) => (ending ??= close(code))

  async function close(code: number): Promise<never> {
    await Promise.allSettled(beginning)
    let result = code
    for (const step of undo.reverse()) {
      try {
        await step()
      } catch (error) {
        console.error(error)
        result = 1
      }
    }
    process.exit(result)
  }

  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, () => void end(codeWhenAsked))
  process.on('disconnect', () => void end(1))
  process.channel?.unref()
  // A terminal that was closed, or a pipe nobody reads any more, must not break off the ending.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {})

  return {
    end,
    async begin(run, undoIt) {
      if (ending) return never()
      const running = run().then((made) => { undo.push(() => undoIt(made)); return made })
      beginning.add(running)
      try {
        const made = await running
        return ending ? await never() : made
      } catch (error) {
        // The end itself has made it fail: nothing to tell.
        if (ending) return never()
        throw error
      } finally {
        beginning.delete(running)
      }
    },
  }
}
