export const THEMES = ['system', 'day', 'night'] as const
export type Theme = (typeof THEMES)[number]

/** Day or night sheet. Kept in a cookie, so that the server draws the right one at once. */
export function useTheme() {
  const cookie = useCookie<Theme>('cowlbook-theme', {
    default: () => 'system',
    sameSite: 'lax',
    maxAge: 365 * 24 * 3600,
  })
  const theme = computed({
    get: (): Theme => (THEMES.includes(cookie.value) ? cookie.value : 'system'),
    set: (choice: Theme) => {
      cookie.value = choice
    },
  })
  const htmlClass = computed(() => (theme.value === 'system' ? '' : `theme-${theme.value}`))
  return { theme, htmlClass }
}
