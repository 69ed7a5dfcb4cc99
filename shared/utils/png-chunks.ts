/** One chunk of a PNG: its four-letter name and where its content lies. */
export type PngChunk = { name: string, start: number, end: number }

const SIGNATURE_BYTES = 8
/** Length and name before the content, checksum after it. */
const CHUNK_OVERHEAD_BYTES = 12

/** The chunks of a PNG whose content is wholly there, up to and including IEND. */
export function* pngChunks(bytes: Uint8Array): Generator<PngChunk> {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength)
  let at = SIGNATURE_BYTES
  while (at + CHUNK_OVERHEAD_BYTES <= bytes.length) {
    const length = view.getUint32(at)
    const end = at + 8 + length
    if (end + 4 > bytes.length) return
    const name = String.fromCharCode(...bytes.subarray(at + 4, at + 8))
    yield { name, start: at + 8, end }
    if (name === 'IEND') return
    at = end + 4
  }
}
