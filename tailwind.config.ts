import type { Config } from 'tailwindcss'

/** Colours by what they mean; their values per theme stand in app/assets/css/theme.css. */
const meanings = [
  'paper',
  'sheet',
  'ink',
  'ink-soft',
  'rule',
  'rule-strong',
  'trouble',
  'trouble-paper',
  'heat-0',
  'heat-1',
  'heat-2',
  'heat-3',
  'heat-4',
  'heat-5',
  'heat-6',
]

export default {
  content: ['./app/**/*.{vue,ts}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      ...Object.fromEntries(meanings.map((name) => [name, `var(--${name})`])),
    },
    fontFamily: { sans: ['Inter', 'system-ui', 'sans-serif'] },
    extend: {
      spacing: { touch: '2.75rem' },
      minHeight: { touch: '2.75rem' },
      minWidth: { touch: '2.75rem' },
      maxWidth: { sheet: '88rem', prose: '42rem' },
    },
  },
} satisfies Config
