import { ascii, joinBytes, uint16 } from './bytes'

const SOI = [0xFF, 0xD8]
const EOI = [0xFF, 0xD9]

export function segment(marker: number, content: Uint8Array | number[]): Uint8Array {
  return joinBytes([0xFF, marker], uint16(content.length + 2), content)
}

/** A frame header with one component; `marker` 0xC0 is baseline, 0xC2 progressive. */
export function frameHeader(marker: number, widthPx: number, heightPx: number): Uint8Array {
  return segment(marker, [8, ...uint16(heightPx), ...uint16(widthPx), 1, 1, 0x11, 0])
}

/** Looks like a JPEG up to its first scan; its pixels are nonsense. For everything that reads headers only. */
export function headerOnlyJpeg(widthPx: number, heightPx: number, before: Uint8Array[] = [], marker = 0xC0): Uint8Array<ArrayBuffer> {
  return joinBytes(SOI, ...before, frameHeader(marker, widthPx, heightPx), segment(0xDA, [1, 1, 0, 0, 63, 0]), [0x12, 0x34], EOI)
}

/**
 * A whole progressive picture of 16 × 16 grey points: one scan of DC values,
 * each of the four blocks the single bit 0, which says "no difference".
 */
export function progressiveJpeg(): Uint8Array<ArrayBuffer> {
  const quantization = segment(0xDB, [0, ...Array.from({ length: 64 }, () => 1)])
  const oneCode = segment(0xC4, [0x00, 1, ...Array.from({ length: 15 }, () => 0), 0])
  return joinBytes(SOI, quantization, frameHeader(0xC2, 16, 16), oneCode, segment(0xDA, [1, 1, 0, 0, 0, 0]), [0x0F], EOI)
}

/** Puts segments right behind the start of a picture, where cameras put them. */
export function withSegments(jpeg: Uint8Array, ...segments: Uint8Array[]): Uint8Array<ArrayBuffer> {
  return joinBytes(SOI, ...segments, jpeg.subarray(2))
}

/** A word that no picture contains by chance, in the places where files carry what nobody sees. */
export const LEAK = 'LEAKED-PLACE-OF-THE-GARDEN'

/** Everything that may tell more than the picture: comment, XMP, colour profile, IPTC, an unknown segment, bytes behind the end. */
export function withLeaks(jpeg: Uint8Array): Uint8Array<ArrayBuffer> {
  const secret = ascii(LEAK)
  const carrying = withSegments(
    jpeg,
    segment(0xFE, secret),
    segment(0xE1, joinBytes(ascii('http://ns.adobe.com/xap/1.0/\0<x:xmpmeta>'), secret, ascii('</x:xmpmeta>'))),
    segment(0xED, joinBytes(ascii('Photoshop 3.0\0'), secret)),
    segment(0xEB, secret),
  )
  return joinBytes(carrying, secret)
}
