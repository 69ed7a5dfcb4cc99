import { showTheme, storedTheme } from '~/utils/theme'

/** The page was painted in the right colours already; the browser's bar follows here. */
export default defineNuxtPlugin(() => {
  const theme = storedTheme()
  if (theme !== 'auto') showTheme(theme)
})
