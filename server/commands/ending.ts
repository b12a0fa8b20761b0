import { CommandError } from '#db/local/CommandError.ts'
import { SettingsError } from '../settings.ts'

/** Runs a command: what stands in its way is told in a line, anything else is a bug and shown whole. */
export async function runCommand(run: () => Promise<void>): Promise<void> {
  try {
    await run()
  } catch (error) {
    if (error instanceof CommandError || error instanceof SettingsError) console.error(error.message)
    else console.error(error)
    process.exit(1)
  }
}

/** Ends in order, once, on Ctrl-C or when asked to terminate. @returns a function that ends by hand */
export function endInOrder(steps: () => Promise<void>): (code?: number) => Promise<void> {
  let ending: Promise<void> | null = null
  const end = (code = 0) => (ending ??= steps().then(() => process.exit(code), (error) => { console.error(error); process.exit(1) }))
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, () => void end())
  return end
}
