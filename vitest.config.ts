import { fileURLToPath } from 'node:url'
import { defineVitestProject } from '@nuxt/test-utils/config'
import { defineConfig } from 'vitest/config'

const here = (path: string) => fileURLToPath(new URL(path, import.meta.url))
const alias = { '#shared': here('./shared'), '#server': here('./server'), '~': here('./app') }

export default defineConfig({
  test: {
    coverage: { provider: 'v8', include: ['shared/**/*.ts'] },
    projects: [
      { resolve: { alias }, test: { name: 'unit', environment: 'node', include: ['tests/unit/**/*.spec.ts'], sequence: { shuffle: true } } },
      { resolve: { alias }, test: { name: 'db', environment: 'node', include: ['tests/db/**/*.spec.ts'], setupFiles: ['tests/support/db-setup.ts'], fileParallelism: false, testTimeout: 20_000, hookTimeout: 60_000 } },
      await defineVitestProject({ test: { name: 'nuxt', environment: 'nuxt', hookTimeout: 60_000, testTimeout: 20_000, include: ['tests/nuxt/**/*.spec.ts'], environmentOptions: { nuxt: { domEnvironment: 'happy-dom' } } } }),
      { resolve: { alias }, test: { name: 'api', environment: 'node', include: ['tests/api/**/*.spec.ts', 'tests/security/**/*.spec.ts', 'tests/reliability/**/*.spec.ts'], globalSetup: ['tests/support/api-server.ts'], fileParallelism: false, testTimeout: 30_000, hookTimeout: 60_000 } },
    ],
  },
})
