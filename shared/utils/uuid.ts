/**
 * Builds a UUID of version 7 (RFC 9562 §5.7): 48 bits of Unix time in
 * milliseconds, then random bits. The time part only helps the database keep
 * its index compact; nothing orders or trusts records by it, because a phone's
 * clock may be wrong by years.
 *
 * @param unixMilliseconds clock reading, 0 to 2^48 - 1
 * @param random 16 random bytes; the first six are not used
 * @throws RangeError when the time or the number of bytes is out of range
 */
export function uuidV7(unixMilliseconds: number, random: Uint8Array): string {
  if (!Number.isSafeInteger(unixMilliseconds) || unixMilliseconds < 0 || unixMilliseconds >= 2 ** 48) {
    throw new RangeError('unixMilliseconds must be a whole number from 0 to 2^48 - 1')
  }
  if (random.length !== 16) throw new RangeError('random must hold 16 bytes')
  const bytes = Uint8Array.from(random)
  let rest = unixMilliseconds
  for (let index = 5; index >= 0; index -= 1) {
    bytes[index] = rest % 256
    rest = Math.floor(rest / 256)
  }
  bytes[6] = ((bytes[6] ?? 0) & 0x0f) | 0x70
  bytes[8] = ((bytes[8] ?? 0) & 0x3f) | 0x80
  const hex = Array.from(bytes, byte => byte.toString(16).padStart(2, '0')).join('')
  return [hex.slice(0, 8), hex.slice(8, 12), hex.slice(12, 16), hex.slice(16, 20), hex.slice(20)].join('-')
}
