import { cpSync, rmSync } from 'node:fs'
import { build } from 'esbuild'
import { buildClient } from './buildClient.ts'
import { root } from './localSettings.ts'
import { runCommand } from './runCommand.ts'

// npm run build: the client, and the server as one file beside its worker and the migrations.
await runCommand(async () => {
  await buildClient()
  rmSync(`${root}/dist/server`, { recursive: true, force: true })
  await build({
    entryPoints: { serve: `${root}/server/commands/serve.ts`, heicWorker: `${root}/server/photographs/heicWorker.ts` },
    outdir: `${root}/dist/server`, bundle: true, platform: 'node', format: 'esm', target: 'node20', packages: 'external', sourcemap: true, logLevel: 'warning',
  })
  cpSync(`${root}/db/migrations`, `${root}/dist/server/migrations`, { recursive: true })
  return 0
})
