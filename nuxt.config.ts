import { fileURLToPath } from 'node:url'
import { photoWorkerPlugin } from './server/build/photo-worker-plugin'
import { themeBeforePaint } from './utils/theme'

const nunitoFiles = '**/nunito-latin*-{400,600,700,800}-normal-*.woff2'

export default defineNuxtConfig({
  modules: [
    '@pinia/nuxt',
    '@nuxtjs/tailwindcss',
    '@nuxt/icon',
    '@nuxt/eslint',
    '@vite-pwa/nuxt',
    'nuxt-auth-utils',
  ],
  components: [{ path: '~/components', pathPrefix: true }],
  imports: { scan: true },
  devtools: { enabled: false },
  app: {
    head: {
      htmlAttrs: { lang: 'en' },
      title: 'Stillroot',
      meta: [
        { name: 'viewport', content: 'width=device-width, initial-scale=1, viewport-fit=cover' },
        { name: 'description', content: 'A journal for plants that grow in still water.' },
        { name: 'theme-color', content: '#fbf8f1', media: '(prefers-color-scheme: light)' },
        { name: 'theme-color', content: '#0e1f26', media: '(prefers-color-scheme: dark)' },
      ],
      // Before the first picture: a chosen night must not begin with a flash of day.
      script: [{ innerHTML: themeBeforePaint }],
      link: [
        { rel: 'icon', href: '/icons/stillroot.svg', type: 'image/svg+xml' },
        { rel: 'apple-touch-icon', href: '/icons/stillroot-180.png' },
      ],
    },
  },
  css: ['~/assets/css/main.css'],
  runtimeConfig: {
    databaseUrl: '',
    smtpUrl: '',
    uploadsDir: '',
    demo: false,
    session: {
      name: 'stillroot-session',
      password: '',
      maxAge: 60 * 60 * 24 * 90,
      sessionHeader: false,
      cookie: { sameSite: 'lax', httpOnly: true, secure: true, path: '/' },
    },
  },
  srcDir: '.',
  buildDir: process.env.STILLROOT_BUILD_DIR ?? '.nuxt',
  // The server names its imports; the module offers its functions only to automatic ones.
  alias: {
    '#auth-server': fileURLToPath(new URL('./node_modules/nuxt-auth-utils/dist/runtime/server/utils', import.meta.url)),
  },
  routeRules: {
    '/today': { ssr: false },
    '/plants/**': { ssr: false },
    '/plants': { ssr: false },
    '/log/**': { ssr: false },
    '/club/**': { ssr: false },
    '/club': { ssr: false },
    '/attention': { ssr: false },
    '/settings': { ssr: false },
  },
  compatibilityDate: '2026-11-01',
  nitro: {
    imports: { autoImport: false },
    compressPublicAssets: true,
    output: process.env.STILLROOT_OUTPUT_DIR ? { dir: process.env.STILLROOT_OUTPUT_DIR } : {},
    prerender: { routes: ['/200.html'], crawlLinks: false },
    rollupConfig: { plugins: [photoWorkerPlugin()] },
  },
  vite: {
    server: { fs: { deny: ['.env', '.env.*', '*.{crt,pem}', '**/.git/**', '**/server/uploads/**', '**/.data/**'] } },
  },
  typescript: { strict: true },
  telemetry: false,
  // The app asks for its session itself, with a time limit: the module's own
  // plugin would hold the first screen back for as long as a server hangs.
  auth: { loadStrategy: 'none', hash: { scrypt: { cost: 131_072, blockSize: 8, maxMemory: 201_326_592 } } },
  eslint: { config: { stylistic: { semi: false, quotes: 'single', commaDangle: 'always-multiline', indent: 2, braceStyle: '1tbs' } } },
  icon: {
    provider: 'server',
    fallbackToApi: false,
    serverBundle: { collections: ['lucide'] },
    clientBundle: { scan: { globInclude: ['**/*.{vue,ts}'], globExclude: ['node_modules', 'dist', 'build', 'coverage', 'test', 'tests', '.*'] }, sizeLimitKb: 64 },
  },
  pwa: {
    strategies: 'injectManifest',
    srcDir: 'service-worker',
    filename: 'sw.ts',
    registerType: 'prompt',
    injectManifest: {
      globPatterns: ['**/*.{js,css,svg,png,ico,webmanifest}', '200.html', nunitoFiles],
      globIgnores: ['**/sw.js'],
      // The module would turn 200.html into the address "200", which does not
      // exist; the worker would then never install.
      manifestTransforms: [entries => ({ manifest: entries, warnings: [] })],
    },
    client: { registerPlugin: true },
    manifest: {
      id: '/',
      name: 'Stillroot',
      short_name: 'Stillroot',
      description: 'A journal for plants that grow in still water.',
      start_url: '/today',
      scope: '/',
      display: 'standalone',
      background_color: '#fbf8f1',
      theme_color: '#fbf8f1',
      icons: [
        { src: '/icons/stillroot-192.png', sizes: '192x192', type: 'image/png' },
        { src: '/icons/stillroot-512.png', sizes: '512x512', type: 'image/png' },
        { src: '/icons/stillroot-maskable-512.png', sizes: '512x512', type: 'image/png', purpose: 'maskable' },
      ],
    },
  },
  tailwindcss: { cssPath: false, exposeConfig: false, viewer: false },
})
