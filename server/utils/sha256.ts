import { createHash } from 'node:crypto'

/** SHA-256 of a text, as 64 hexadecimal digits. */
export function sha256Of(text: string): string {
  return createHash('sha256').update(text).digest('hex')
}
