import type { Config } from 'tailwindcss'
import plugin from 'tailwindcss/plugin'
import { customProperties, day, night } from './assets/design-tokens'

const colours = Object.fromEntries(
  Object.keys(day).map(name => [name, `rgb(var(--${name}) / <alpha-value>)`]),
)

export default {
  content: [
    './components/**/*.{vue,ts}', './pages/**/*.vue', './layouts/**/*.vue', './app.vue', './error.vue',
    './stores/**/*.ts', './composables/**/*.ts', './utils/**/*.ts', './shared/**/*.ts',
  ],
  darkMode: ['selector', '[data-theme="night"]'],
  theme: {
    colors: { ...colours, transparent: 'transparent', current: 'currentColor' },
    fontFamily: { sans: ['Nunito', 'system-ui', 'sans-serif'] },
    fontSize: {
      secondary: ['0.8125rem', '1.15rem'],
      body: ['0.9375rem', '1.4rem'],
      input: ['1.0625rem', '1.5rem'],
      section: ['1.0625rem', '1.4rem'],
      title: ['1.5rem', '1.85rem'],
      figure: ['1.75rem', '2rem'],
    },
    fontWeight: { normal: '400', semibold: '600', bold: '700', extrabold: '800' },
    extend: {
      borderRadius: { card: '18px', control: '14px' },
      spacing: { page: '18px', control: '48px', main: '56px' },
      minHeight: { control: '48px', main: '56px' },
      minWidth: { control: '48px' },
      maxWidth: { column: '45rem' },
      transitionDuration: { DEFAULT: '150ms' },
      transitionTimingFunction: { DEFAULT: 'cubic-bezier(0, 0, 0.2, 1)' },
    },
  },
  plugins: [
    plugin(({ addBase }) => {
      const nightBase = { ...customProperties(night), colorScheme: 'dark' }
      addBase({
        ':root': { ...customProperties(day), colorScheme: 'light' },
        // The device decides until the person does.
        '@media (prefers-color-scheme: dark)': { ':root:not([data-theme="day"])': nightBase },
        ':root[data-theme="night"]': nightBase,
        '@media print': { ':root, :root[data-theme]': { ...customProperties(day), colorScheme: 'light' } },
      })
    }),
  ],
} satisfies Config
