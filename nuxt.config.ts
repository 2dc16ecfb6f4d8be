export default defineNuxtConfig({
  compatibilityDate: '2026-11-01',
  modules: ['@pinia/nuxt', '@nuxtjs/tailwindcss', 'nuxt-auth-utils'],
  telemetry: { enabled: false },
  devtools: { enabled: false },
  // Everything from shared/ is imported by its written path, so that a reader sees where it comes from.
  imports: { scan: false },
  nitro: { imports: { dirs: [] } },
  css: ['~/assets/css/main.css'],
  typescript: { strict: true, tsConfig: { compilerOptions: { noUncheckedIndexedAccess: true } } },
  runtimeConfig: {
    databaseUrl: '',
    // NUXT_SESSION_COOKIE_SECURE=false where the site is served without https, as on loopback.
    session: { password: '', cookie: { secure: true } },
  },
})
