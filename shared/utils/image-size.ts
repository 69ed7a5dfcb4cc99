import { jpegSegments } from './jpeg-segments'
import { pngChunks } from './png-chunks'

/**
 * Width and height as the file's header states them, before any rotation and
 * without decoding a pixel: a picture too large to decode must be known as such
 * before memory is asked for.
 */
export type ImageSize = { widthPx: number, heightPx: number }

/** Null when no header is found in the bytes at hand or a side is 0. */
export function readJpegSize(bytes: Uint8Array): ImageSize | null {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength)
  for (const { marker, start, end } of jpegSegments(bytes)) {
    // One byte of precision, then height, then width (ITU-T T.81, figure B.3).
    if (isFrameHeader(marker) && end - start >= 5) return positive(view.getUint16(start + 3), view.getUint16(start + 1))
  }
  return null
}

export function readPngSize(bytes: Uint8Array): ImageSize | null {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength)
  for (const { name, start, end } of pngChunks(bytes)) {
    if (name !== 'IHDR' || end - start < 8) return null
    return positive(view.getUint32(start), view.getUint32(start + 4))
  }
  return null
}

/** SOF0 to SOF15 without DHT, JPG and DAC, which lie among them. */
function isFrameHeader(marker: number): boolean {
  return marker >= 0xC0 && marker <= 0xCF && ![0xC4, 0xC8, 0xCC].includes(marker)
}

function positive(widthPx: number, heightPx: number): ImageSize | null {
  return widthPx > 0 && heightPx > 0 ? { widthPx, heightPx } : null
}
