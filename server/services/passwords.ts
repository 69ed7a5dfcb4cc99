import { hashPassword, verifyPassword } from '#auth-server/password'

/** Each hash takes 128 MiB for half a second; more at once would starve a small server. */
const HASHES_AT_ONCE = 2

let running = 0
const waiting: (() => void)[] = []

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= HASHES_AT_ONCE) await new Promise<void>(resolve => waiting.push(resolve))
  running += 1
  try {
    return await work()
  } finally {
    running -= 1
    waiting.shift()?.()
  }
}

/** The same characters typed on two keyboards are one password (NFC, RFC 8265 §4.2). */
function normalised(password: string): string {
  return password.normalize('NFC')
}

export function hashOf(password: string): Promise<string> {
  return inTurn(() => hashPassword(normalised(password)))
}

let decoy: Promise<string> | null = null

/**
 * True when the password belongs to the hash. Without a hash it takes as long
 * and answers false, so that nobody learns by the clock which accounts exist.
 */
export async function passwordMatches(hash: string | null, password: string): Promise<boolean> {
  decoy ??= hashOf('no account has this password')
  const against = hash ?? await decoy
  const matches = await inTurn(() => verifyPassword(against, normalised(password)))
  return hash !== null && matches
}
