import { cp } from 'node:fs/promises'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { build } from 'esbuild'

const isDev = process.env.NODE_ENV === 'development'

const here = fileURLToPath(new URL('.', import.meta.url))

/** Nitro does not bundle a worker thread's entry: it is built beside the server, as the migrations lie beside it. */
async function buildBeside(folder: string) {
  await build({
    entryPoints: [join(here, 'server/jobs/workers/fit.ts')],
    outfile: join(folder, 'workers/fit.mjs'),
    bundle: true,
    platform: 'node',
    target: 'node20',
    format: 'esm',
    minify: true,
    alias: { '#shared': join(here, 'shared') },
    logLevel: 'warning',
  })
}

export default defineNuxtConfig({
  modules: ['@nuxt/eslint', '@nuxtjs/tailwindcss', '@pinia/nuxt', 'nuxt-auth-utils', 'nuxt-security'],
  // Components carry their folder's name (BoatFields -> <BoatFields> in components/boat/Fields.vue).
  imports: { dirs: [] },
  devtools: { enabled: false },
  app: {
    head: {
      htmlAttrs: { lang: 'en' },
      meta: [
        { charset: 'utf-8' },
        { name: 'viewport', content: 'width=device-width, initial-scale=1' },
        { name: 'color-scheme', content: 'light dark' },
      ],
      link: [{ rel: 'icon', type: 'image/svg+xml', href: '/mark.svg' }],
    },
  },
  css: ['~/assets/css/fonts.css'],
  vue: { runtimeCompiler: false },
  runtimeConfig: {
    session: { name: 'kedgewise', maxAge: 90 * 24 * 3600, sessionHeader: false },
  },
  future: { compatibilityVersion: 4 },
  experimental: { componentIslands: false, appManifest: false },
  compatibilityDate: '2026-11-01',
  nitro: {
    preset: 'node-server',
    esbuild: { options: { target: 'node20' } },
    typescript: { tsConfig: { compilerOptions: { noUncheckedIndexedAccess: true } } },
  },
  typescript: {
    strict: true,
    tsConfig: { compilerOptions: { noUncheckedIndexedAccess: true } },
    nodeTsConfig: {
      compilerOptions: { noUncheckedIndexedAccess: true, allowJs: true, paths: { '~/*': ['../app/*'] } },
      include: ['../*.config.ts', '../tests/**/*.ts', '../seed/**/*.ts'],
    },
  },
  telemetry: false,
  hooks: {
    'nitro:init': (nitro) => {
      nitro.hooks.hook('compiled', async () => {
        const { serverDir } = nitro.options.output
        if (nitro.options.dev) return buildBeside(join(here, '.nuxt'))
        await buildBeside(serverDir)
        await cp(join(here, 'drizzle'), join(serverDir, 'drizzle'), { recursive: true })
      })
    },
    'vite:extendConfig': (config) => {
      // The hot-reload socket would otherwise listen on every interface.
      if (isDev && config.server) Object.assign(config.server, { hmr: { host: '127.0.0.1' } })
    },
  },
  eslint: { config: { stylistic: { semi: false, quotes: 'single', braceStyle: 'stroustrup', commaDangle: 'always-multiline' } } },
  security: {
    headers: {
      contentSecurityPolicy: {
        'default-src': ['\'none\''],
        'script-src': ['\'self\'', '\'nonce-{{nonce}}\'', '\'strict-dynamic\''],
        'style-src': ['\'self\'', '\'unsafe-inline\''],
        'img-src': ['\'self\'', 'data:'],
        'font-src': ['\'self\''],
        'connect-src': isDev ? ['\'self\'', 'ws:'] : ['\'self\''],
        'manifest-src': ['\'self\''],
        'form-action': ['\'self\''],
        'base-uri': ['\'none\''],
        'frame-ancestors': ['\'none\''],
        'object-src': ['\'none\''],
        'script-src-attr': ['\'none\''],
        'upgrade-insecure-requests': false,
      },
      crossOriginEmbedderPolicy: false,
      referrerPolicy: 'strict-origin-when-cross-origin',
      xFrameOptions: 'DENY',
    },
    nonce: true,
    sri: false,
    // Each of these looks only at headers a client can forge or at text it should let pass: ours stand in server/.
    rateLimiter: false,
    requestSizeLimiter: false,
    xssValidator: false,
    corsHandler: false,
    allowedMethodsRestricter: false,
    hidePoweredBy: true,
    basicAuth: false,
    csrf: false,
    removeLoggers: false,
  },
  tailwindcss: { cssPath: '~/assets/css/main.css', viewer: false },
})
