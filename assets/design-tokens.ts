/**
 * Every colour of the app, once. Tailwind, the style sheet and the contrast
 * test read this file; no component names a colour by its number.
 */
const dayColours = {
  'ink': '#12303a',
  'ink-soft': '#3c545c',
  'paper': '#fbf8f1',
  'card': '#ffffff',
  'line': '#d9e2df',
  'edge': '#6f868d',
  'action': '#1b5d68',
  'on-action': '#ffffff',
  'strong': '#12303a',
  'on-strong': '#ffffff',
  'water': '#2b7a86',
  'water-line': '#8fc9c9',
  'water-deep': '#1b5d68',
  'on-water-deep': '#ffffff',
  'water-guess': '#8cbabd',
  'water-soft': '#dcefed',
  'water-ink': '#17525b',
  'root': '#efe3cc',
  'root-line': '#a8792f',
  'root-wet': '#f6ead0',
  'limit': '#7d4a00',
  'cup': '#12303a',
  'foliage': '#4f9150',
  'foliage-deep': '#3f7a43',
  'leaf': '#1f5727',
  'leaf-soft': '#e4f0e2',
  'amber': '#714504',
  'amber-soft': '#fdf0d8',
  'chilli': '#8f2514',
  'chilli-soft': '#fbe6e1',
} as const

export type ColourName = keyof typeof dayColours
type Palette = Record<ColourName, string>

export const day: Palette = dayColours

export const night: Palette = {
  'ink': '#eef3f0',
  'ink-soft': '#b4c6ca',
  'paper': '#0e1f26',
  'card': '#17323b',
  'line': '#274651',
  'edge': '#7d99a1',
  'action': '#86cdcf',
  'on-action': '#0e1f26',
  'strong': '#245059',
  'on-strong': '#ffffff',
  'water': '#2c7481',
  'water-line': '#7cc4c6',
  'water-deep': '#1d5560',
  'on-water-deep': '#ffffff',
  'water-guess': '#315d67',
  'water-soft': '#1b3f47',
  'water-ink': '#bfe3e3',
  'root': '#3a3324',
  'root-line': '#b99a62',
  'root-wet': '#f0dfbc',
  'limit': '#f3c98a',
  'cup': '#081317',
  'foliage': '#5f9f5e',
  'foliage-deep': '#4a8350',
  'leaf': '#a6d6a2',
  'leaf-soft': '#1c3322',
  'amber': '#f3c98a',
  'amber-soft': '#3a2a12',
  'chilli': '#f5ab9c',
  'chilli-soft': '#3d1c16',
}

/** Contrast that text keeps against its ground, because it is read in full sun (WCAG 2.2, 1.4.6). */
export const TEXT_CONTRAST_MIN = 7
/** Contrast of the edge of a control and of a line that carries meaning (WCAG 2.2, 1.4.11). */
export const MARK_CONTRAST_MIN = 3

/** Every ground that text stands on, with the colours of that text. */
export const textOnGround: Partial<Record<ColourName, readonly ColourName[]>> = {
  'paper': ['ink', 'ink-soft', 'action', 'leaf', 'amber', 'chilli'],
  'card': ['ink', 'ink-soft', 'action', 'leaf', 'amber', 'chilli'],
  'action': ['on-action'],
  'strong': ['on-strong'],
  'water-deep': ['on-water-deep'],
  'water-soft': ['water-ink', 'ink'],
  'root': ['ink'],
  'leaf-soft': ['leaf', 'ink'],
  'amber-soft': ['amber', 'ink'],
  'chilli-soft': ['chilli', 'ink'],
}

/** Edges and lines that must be seen, with what lies behind them. */
export const markOnGround: Partial<Record<ColourName, readonly ColourName[]>> = {
  paper: ['edge', 'action'],
  card: ['edge', 'action'],
  root: ['limit', 'root-line'],
  water: ['root-wet'],
}

/** "#12303a" as "18 48 58", the form in which Tailwind adds an opacity. */
export function channels(hex: string): string {
  return [1, 3, 5].map(start => Number.parseInt(hex.slice(start, start + 2), 16)).join(' ')
}

/** The custom properties of one palette. */
export function customProperties(palette: Palette): Record<string, string> {
  return Object.fromEntries(Object.entries(palette).map(([name, hex]) => [`--${name}`, channels(hex)]))
}
