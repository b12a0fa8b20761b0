import { createServer } from 'vite'
import { runCommand } from './ending.ts'
import { root } from './localSettings.ts'
import { startLocal } from './startLocal.ts'

// npm run dev: Vite's hot reload in front, the API behind it.
await runCommand(async () => {
  const { server } = await startLocal(async () => {})
  process.env.PROOFCLOTH_API = server.url
  const vite = await createServer({ root, server: { proxy: { '/api': server.url } } })
  await vite.listen()
  vite.printUrls()
})
