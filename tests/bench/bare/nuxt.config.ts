// The least that the same framework can do: what the product's routes and pages are measured against.
export default defineNuxtConfig({
  telemetry: false,
  compatibilityDate: '2026-11-01',
  srcDir: '.',
  devtools: { enabled: false },
  nitro: { preset: 'node-server' },
})
