import { day, night } from '../assets/design-tokens'

/** Whether the device decides between day and night, or the person did. */
export const THEMES = ['auto', 'day', 'night'] as const
export type Theme = (typeof THEMES)[number]

const THEME_KEY = 'stillroot-theme'

/**
 * Runs in the head of every page, before anything is painted: a night that came
 * on after the first paint would blind whoever stands in the dark.
 */
export const themeBeforePaint = `try{const t=localStorage.getItem('${THEME_KEY}');if(t==='day'||t==='night')document.documentElement.dataset.theme=t}catch{}`

export function storedTheme(): Theme {
  try {
    const kept = localStorage.getItem(THEME_KEY)
    return THEMES.find(theme => theme === kept) ?? 'auto'
  } catch {
    // A browser that keeps nothing follows the device.
    return 'auto'
  }
}

/** Shows the theme and remembers it on this device. */
export function chooseTheme(theme: Theme): void {
  showTheme(theme)
  try {
    if (theme === 'auto') localStorage.removeItem(THEME_KEY)
    else localStorage.setItem(THEME_KEY, theme)
  } catch {
    // It lasts until the page is closed.
  }
}

/** Puts the theme on the page and its ground on the browser's own bar. */
export function showTheme(theme: Theme): void {
  if (theme === 'auto') delete document.documentElement.dataset.theme
  else document.documentElement.dataset.theme = theme
  for (const bar of document.querySelectorAll<HTMLMetaElement>('meta[name="theme-color"]')) {
    const devicePaper = bar.media.includes('dark') ? night.paper : day.paper
    bar.content = theme === 'auto' ? devicePaper : theme === 'night' ? night.paper : day.paper
  }
}
