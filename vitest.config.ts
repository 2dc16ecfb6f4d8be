import { fileURLToPath } from 'node:url'
import { defineVitestProject } from '@nuxt/test-utils/config'
import { defineConfig } from 'vitest/config'

const folder = (name: string) => fileURLToPath(new URL(name, import.meta.url))

/** The written-out aliases of the application, for tests that run without Nuxt. */
const alias = { '#shared': folder('shared'), '~~': folder('.'), '~': folder('app') }

const nodeProject = (name: string, more: object = {}) => ({
  resolve: { alias },
  test: { name, environment: 'node', include: [`tests/${name}/**/*.test.ts`], ...more },
})

export default defineConfig(async () => ({
  test: {
    projects: [
      // A thousand random runs a law, and a password hash is slow by design.
      nodeProject('unit', { testTimeout: 30_000 }),
      nodeProject('reference'),
      nodeProject('architecture'),
      nodeProject('integration', {
        globalSetup: ['tests/integration/global-setup.ts'],
        // One database, so one file after the other.
        fileParallelism: false,
        testTimeout: 20_000,
        // The demo is loaded in one hook: four password hashes and some hundred writes.
        hookTimeout: 60_000,
      }),
      nodeProject('bench', { include: [], benchmark: { include: ['tests/bench/**/*.bench.ts'] } }),
      await defineVitestProject({
        test: {
          name: 'nuxt',
          environment: 'nuxt',
          testTimeout: 30_000,
          include: ['tests/nuxt/**/*.test.ts'],
          setupFiles: ['tests/nuxt/setup.ts'],
          environmentOptions: { nuxt: { domEnvironment: 'happy-dom' } },
        },
      }),
    ],
  },
}))
