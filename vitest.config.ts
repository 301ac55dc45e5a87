// Three projects: pure units, integration on real SQLite files, and browser journeys against the production build.
import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const alias = {
  '@': fileURLToPath(new URL('.', import.meta.url)).replace(/\/$/, ''),
  // server-only throws outside the framework's bundler; here it only marks a room.
  'server-only': fileURLToPath(new URL('./tests/support/server-only.ts', import.meta.url)),
}
const project = (name: string, extra: object) => ({
  resolve: { alias },
  test: { name, include: [`tests/${name}/**/*.test.{ts,tsx}`], setupFiles: ['tests/support/setup.ts'], ...extra },
})

// Limits of time are part of what is tested, and the build machine has two cores: one more try, never more.
const retry = 1

export default defineConfig({
  resolve: { alias },
  test: {
    projects: [
      project('unit', { retry, testTimeout: 10_000, sequence: { groupOrder: 0 } }),
      project('integration', { retry, testTimeout: 30_000, hookTimeout: 60_000, globalSetup: ['tests/support/template-database.ts'], maxWorkers: 2, sequence: { groupOrder: 1 } }),
      project('e2e', { retry, testTimeout: 120_000, hookTimeout: 180_000, globalSetup: ['tests/support/production-server.ts'], fileParallelism: false, sequence: { groupOrder: 2 } }),
    ],
  },
})
