import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const shared = fileURLToPath(new URL('./shared', import.meta.url))

export default defineConfig({
  resolve: { alias: { '#shared': shared } },
  test: {
    projects: [
      { extends: true, test: { name: 'unit', include: ['tests/unit/**/*.test.ts'], testTimeout: 20_000 } },
      { extends: true, test: { name: 'reference', include: ['tests/reference/**/*.test.ts'], testTimeout: 120_000 } },
      { extends: true, test: { name: 'architecture', include: ['tests/architecture/**/*.test.ts'], testTimeout: 30_000 } },
    ],
  },
})
