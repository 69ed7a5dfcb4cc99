import { hashPassword, verifyPassword } from '#auth-server/password'
import { atMost } from '../utils/at-most'

/** Each hash takes 128 MiB (N = 2^17, r = 8) and a core; more at once would starve a small server. */
const inTurn = atMost(2)

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
