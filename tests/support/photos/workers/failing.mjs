/** Fails in the way that the first byte of its task asks for. */
export default function failing({ bytes }) {
  if (bytes[0] === 1) return { ok: false, reason: 'a damaged picture' }
  if (bytes[0] === 2) throw new Error('the worker itself is broken')
  const hoard = []
  for (;;) hoard.push(new Array(1_000_000).fill(0).map((_, index) => ({ index })))
}
