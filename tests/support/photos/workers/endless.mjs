/** A decoder that never finishes, unless the task says so by its first byte. */
export default function endless({ bytes, sides }) {
  while (bytes[0] !== 1) Math.sqrt(bytes.length)
  return { ok: true, renditions: sides.map(side => ({ side, widthPx: side, heightPx: side, bytes: new Uint8Array([9]) })) }
}
