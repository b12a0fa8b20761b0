import { fileURLToPath } from 'node:url'
import vue from '@vitejs/plugin-vue'
import { defineConfig } from 'vitest/config'

const resolve = { alias: { '@': fileURLToPath(new URL('./src', import.meta.url)) } }

export default defineConfig({
  test: {
    projects: [
      { resolve, test: { name: 'shared', include: ['test/shared/**/*.test.ts'], environment: 'node' } },
      { plugins: [vue()], resolve, test: { name: 'src', include: ['test/src/**/*.test.ts'], environment: 'happy-dom' } },
      // Each file makes its own database from one migrated template.
      { resolve, test: { name: 'server', include: ['test/server/**/*.test.ts', 'test/db/**/*.test.ts'], environment: 'node', testTimeout: 30_000, hookTimeout: 60_000 } },
    ],
  },
})
