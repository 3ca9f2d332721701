import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const alias = {
  '@': fileURLToPath(new URL('.', import.meta.url)).replace(/\/$/, ''),
  // The marker throws outside the site's own bundler; a test is a server too.
  'server-only': fileURLToPath(new URL('tests/fixtures/server-only.ts', import.meta.url)),
}

export default defineConfig({
  resolve: { alias },
  test: {
    projects: [
      {
        resolve: { alias },
        test: { name: 'unit', include: ['tests/{lib,components,api,scripts}/**/*.test.{ts,tsx}'], testTimeout: 60_000 },
      },
      {
        resolve: { alias },
        test: {
          name: 'database',
          include: ['tests/db/**/*.test.ts'],
          testTimeout: 60_000,
          hookTimeout: 120_000,
          // One database, so one file at a time.
          fileParallelism: false,
        },
      },
    ],
  },
})
