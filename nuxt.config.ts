import { fileURLToPath } from 'node:url'

const here = (path: string) => fileURLToPath(new URL(path, import.meta.url))

export default defineNuxtConfig({
  modules: ['@nuxt/eslint', '@pinia/nuxt', '@nuxtjs/tailwindcss', 'nuxt-auth-utils', '@vee-validate/nuxt', 'nuxt-security'],
  compatibilityDate: '2026-05-01',
  telemetry: false,
  devtools: { enabled: false },
  // Server components are off and routes are case-sensitive: two advisories touch the Nuxt that Node 20 allows (decision 3).
  experimental: { componentIslands: false },
  router: { options: { sensitive: true } },
  alias: { '#server': here('./server') },
  css: ['~/assets/css/fonts.css', '~/assets/css/tokens.css', '~/assets/css/print.css'],
  app: {
    head: {
      htmlAttrs: { lang: 'en-GB' },
      titleTemplate: '%s · Copperplate',
      meta: [{ name: 'viewport', content: 'width=device-width, initial-scale=1' }, { name: 'color-scheme', content: 'light dark' }],
      link: [{ rel: 'icon', type: 'image/svg+xml', href: '/icon.svg' }],
    },
  },
  tailwindcss: { viewer: false, exposeConfig: false, cssPath: '~/assets/css/tailwind.css' },
  veeValidate: { typedSchemaPackage: 'none' },
  // OWASP's floor for scrypt (Password Storage Cheat Sheet): N = 2^17, r = 8, p = 1, which needs 128 MiB a hash.
  auth: { loadStrategy: 'none', hash: { scrypt: { cost: 131_072, blockSize: 8, parallelization: 1, maxMemory: 256 * 1024 * 1024 } } },
  typescript: {
    strict: true,
    tsConfig: { compilerOptions: { noUncheckedIndexedAccess: true } },
    nodeTsConfig: { include: ['../*.config.ts', '../scripts/**/*.ts', '../tests/**/*.ts'], compilerOptions: { paths: { '#server/*': ['../server/*'], '#shared/*': ['../shared/*'], '~/*': ['../app/*'] } } },
  },
  // Fonts stay files of their own: the page's policy loads none that is written into a style sheet.
  vite: { build: { assetsInlineLimit: 0 } },
  nitro: {
    compressPublicAssets: { gzip: true, brotli: true },
    esbuild: { options: { target: 'es2022' } },
    serverAssets: [{ baseName: 'fonts', dir: here('./server/assets/fonts') }],
  },
  security: {
    rateLimiter: false,
    requestSizeLimiter: false,
    xssValidator: false,
    corsHandler: false,
    nonce: true,
    sri: false,
    headers: {
      crossOriginEmbedderPolicy: false,
      crossOriginResourcePolicy: 'same-origin',
      strictTransportSecurity: { maxAge: 31_536_000, includeSubdomains: true },
      permissionsPolicy: { 'camera': ['self'], 'geolocation': [], 'microphone': [], 'display-capture': [] },
      contentSecurityPolicy: {
        'default-src': ['\'self\''],
        'script-src': ['\'self\'', '\'nonce-{{nonce}}\''],
        'script-src-attr': ['\'none\''],
        'style-src': ['\'self\'', '\'unsafe-inline\''],
        'img-src': ['\'self\'', 'data:', 'blob:'],
        'font-src': ['\'self\''],
        'connect-src': ['\'self\''],
        'worker-src': ['\'self\''],
        'object-src': ['\'none\''],
        'base-uri': ['\'none\''],
        'frame-ancestors': ['\'none\''],
        'form-action': ['\'self\''],
        'upgrade-insecure-requests': false,
      },
    },
  },
  runtimeConfig: {
    session: { name: '__Host-copperplate', password: '', maxAge: 60 * 60 * 12, sessionHeader: false, cookie: { path: '/', httpOnly: true, secure: true, sameSite: 'lax' } },
  },
})
