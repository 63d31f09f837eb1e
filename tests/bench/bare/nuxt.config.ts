// The least that the same framework can do: what the product's routes and pages are measured against.
export default defineNuxtConfig({
  devtools: { enabled: false },
  srcDir: '.',
  compatibilityDate: '2026-11-01',
  nitro: { preset: 'node-server' },
  telemetry: false,
})
