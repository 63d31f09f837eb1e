import { fileURLToPath } from 'node:url'
import vue from '@vitejs/plugin-vue'
import { defineConfig, type TestProjectInlineConfiguration } from 'vitest/config'

const folder = (name: string) => fileURLToPath(new URL(`./${name}`, import.meta.url))

const project = (name: string, include: string, test: TestProjectInlineConfiguration['test'] = {}): TestProjectInlineConfiguration =>
  ({ extends: true, test: { name, include: [include], ...test } })

const served = { globalSetup: './tests/api/globalSetup.ts', hookTimeout: 120_000, testTimeout: 60_000 }

export default defineConfig({
  resolve: { alias: { '#shared': folder('shared'), '~': folder('app') } },
  test: {
    maxWorkers: 2,
    projects: [
      project('unit', 'tests/unit/**/*.test.ts', { testTimeout: 30_000 }),
      { ...project('nuxt', 'tests/nuxt/**/*.test.ts', { environment: 'happy-dom', testTimeout: 30_000 }), plugins: [vue()] },
      project('reference', 'tests/reference/**/!(*.long).test.ts', { testTimeout: 120_000 }),
      project('architecture', 'tests/architecture/**/*.test.ts', { testTimeout: 60_000 }),
      project('api', 'tests/api/**/*.test.ts', served),
      project('browser', 'tests/browser/**/*.test.ts', served),
      project('long', 'tests/**/*.long.test.ts', { testTimeout: 3_600_000 }),
    ],
  },
})
