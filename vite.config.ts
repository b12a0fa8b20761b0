import { fileURLToPath } from 'node:url'
import vue from '@vitejs/plugin-vue'
import { defineConfig } from 'vite'

const apiOrigin = process.env.PROOFCLOTH_API ?? 'http://127.0.0.1:4310'

export default defineConfig({
  plugins: [vue()],
  resolve: { alias: { '@': fileURLToPath(new URL('./src', import.meta.url)) } },
  build: { outDir: 'dist/client', target: 'es2022', assetsInlineLimit: 0 },
  server: { host: '127.0.0.1', proxy: { '/api': apiOrigin } },
})
