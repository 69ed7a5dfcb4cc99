import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { dirname } from 'node:path'

// 48 bytes are 64 characters in base64url: more than the 32 that sealing a session cookie needs.
const SECRET_BYTES = 48

export function randomSecret() {
  return randomBytes(SECRET_BYTES).toString('base64url')
}

/**
 * A secret that stays the same from start to start, readable by its owner alone.
 * @param {string} file
 */
export function keptSecret(file) {
  if (existsSync(file)) {
    const kept = readFileSync(file, 'utf8').trim()
    if (kept) return kept
  }
  const secret = randomSecret()
  mkdirSync(dirname(file), { recursive: true })
  writeFileSync(file, `${secret}\n`, { mode: 0o600 })
  return secret
}
