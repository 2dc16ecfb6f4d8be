import { useTheme } from '~/composables/useTheme'

/** What every page has in its head, the error page included. */
export default defineNuxtPlugin(() => {
  const { htmlClass } = useTheme()
  useHead({
    htmlAttrs: { lang: 'en-GB', class: htmlClass },
    titleTemplate: (title) => (title ? `${title} · Cowlbook` : 'Cowlbook'),
    link: [{ rel: 'icon', type: 'image/svg+xml', href: '/favicon.svg' }],
  })
})
