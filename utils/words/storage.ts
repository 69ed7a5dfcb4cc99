import { number } from './numbers'

const MEGABYTE = 1_000_000

/** "12.4 MB" as shops and phones count. */
export function bytesWords(bytes: number, locale?: string): string {
  if (bytes < MEGABYTE) return `${number(Math.ceil(bytes / 1_000), 0, locale)} kB`
  return `${number(bytes / MEGABYTE, bytes < 10 * MEGABYTE ? 1 : 0, locale)} MB`
}

/** Whether the browser may clear the journal, and what helps. */
export function keptWords(kept: boolean | null): string {
  if (kept === null) return 'This browser does not say whether it keeps the journal. What is sent is safe on the server.'
  return kept
    ? 'The browser keeps it until you clear it yourself.'
    : 'The browser may clear it when the device runs out of room. What is sent is safe on the server; what is not sent yet is only here. Putting Stillroot on the home screen makes most browsers keep it.'
}
