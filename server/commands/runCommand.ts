import { type Life, beginLife } from './life.ts'
import { plainLine } from './plainLine.ts'

/**
 * Runs a command to its end, or until it is asked to end.
 * @param run - returns the exit code, or nothing when the command goes on until Ctrl-C. What stands in its way on this machine is told
 *   in a line; anything else is a bug and shown whole.
 * @param options.codeWhenAsked - exit code when a signal ends it; what is broken off half done has not succeeded
 */
export async function runCommand(run: (life: Life) => Promise<number | void>, { codeWhenAsked = 0 } = {}): Promise<void> {
  const life = beginLife(codeWhenAsked)
  try {
    const code = await run(life)
    if (code !== undefined) await life.end(code)
  } catch (error) {
    console.error(plainLine(error) ?? error)
    await life.end(1)
  }
}
