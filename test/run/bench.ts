import { root } from '#server/commands/localSettings.ts'
import { runCommand } from '#server/commands/runCommand.ts'
import { runTool } from './runTool.ts'
import { throwAwayPostgres } from './throwAwayPostgres.ts'

// npm run bench: timings, with a throw-away PostgreSQL for those that want one.
await runCommand(async (life) => {
  const postgres = await life.begin(throwAwayPostgres, ({ stop }) => stop())
  return await runTool(life, 'vitest', { args: ['bench', '--run', '--root', root, '--project', 'shared', ...process.argv.slice(2)], env: { TEST_DATABASE_URL: postgres.url('postgres'), TMPDIR: postgres.folder } })
}, { codeWhenAsked: 130 })
