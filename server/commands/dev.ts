import { createServer } from 'vite'
import { root } from './localSettings.ts'
import { runCommand } from './runCommand.ts'
import { startLocal } from './startLocal.ts'

// npm run dev: Vite's hot reload in front, the API behind it.
await runCommand(async (life) => {
  const { server } = await startLocal(life, async () => {})
  const vite = await life.begin(() => createServer({ root, server: { proxy: { '/api': server.url } } }), (begun) => begun.close())
  await vite.listen()
  vite.printUrls()
})
