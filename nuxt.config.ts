import { SESSION_COOKIE, SESSION_SECONDS } from './server/auth/sessionCookie'

export default defineNuxtConfig({
  compatibilityDate: '2026-11-01',
  modules: ['@pinia/nuxt', '@nuxtjs/tailwindcss', 'nuxt-auth-utils'],
  telemetry: { enabled: false },
  devtools: { enabled: false },
  // Everything from shared/ is imported by its written path, so that a reader sees where it comes from.
  imports: { scan: false },
  nitro: { imports: { dirs: [] } },
  // The application asks for its account itself; the session stays on the server.
  auth: { loadStrategy: 'none' },
  // Inline styles would need a hole in the content security policy.
  features: { inlineStyles: false },
  tailwindcss: { cssPath: '~/assets/css/main.css', viewer: false },
  typescript: { strict: true, tsConfig: { compilerOptions: { noUncheckedIndexedAccess: true } } },
  runtimeConfig: {
    databaseUrl: '',
    // NUXT_SESSION_COOKIE_SECURE=false where the site is served without https, as on loopback.
    session: {
      name: SESSION_COOKIE,
      password: '',
      maxAge: SESSION_SECONDS,
      // The page never needs the session by header.
      sessionHeader: false,
      cookie: { secure: true, httpOnly: true, sameSite: 'lax' },
    },
    // NUXT_BEHIND_PROXY=true where a proxy in front sets X-Forwarded-For: without one, anybody could.
    behindProxy: false,
  },
})
