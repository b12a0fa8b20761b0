import { fileURLToPath } from 'node:url'
import vue from '@vitejs/plugin-vue'
import { defineConfig } from 'vitest/config'

const resolve = { alias: { '@': fileURLToPath(new URL('./src', import.meta.url)) } }

export default defineConfig({
  test: {
    // The default leaves one core to a person who watches; on two cores that is half of the time.
    maxWorkers: 2,
    projects: [
      { resolve, test: { name: 'shared', include: ['test/shared/**/*.test.ts', 'test/run/**/*.test.ts'], environment: 'node' } },
      { plugins: [vue()], resolve, test: { name: 'src', include: ['test/src/**/*.test.ts'], environment: 'happy-dom' } },
      // Each file makes its own database from one migrated template.
      { resolve, test: { name: 'server', include: ['test/server/**/*.test.ts', 'test/db/**/*.test.ts'], environment: 'node', globalSetup: 'test/support/testPostgres.ts', testTimeout: 30_000, hookTimeout: 60_000 } },
    ],
  },
})
