/** One marker segment of a JPEG: its marker's second byte and where its content lies. */
export type JpegSegment = { marker: number, start: number, end: number }

/** Start of scan: coded pixels follow it, so walking ends there. */
export const JPEG_START_OF_SCAN = 0xDA
/** APP1: EXIF or XMP. */
export const JPEG_APP1 = 0xE1

/**
 * The segments of a JPEG up to and including the first start of scan
 * (ITU-T T.81, annex B.1.1). Ends early, without an error, where the bytes end
 * or stop making sense: what was read so far is still good.
 */
export function* jpegSegments(bytes: Uint8Array): Generator<JpegSegment> {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength)
  if (bytes.length < 4 || view.getUint16(0) !== 0xFFD8) return
  let at = 2
  while (at + 4 <= bytes.length && bytes[at] === 0xFF) {
    const marker = view.getUint8(at + 1)
    if (marker === 0xFF) {
      at += 1 // any number of fill bytes may stand before a marker
      continue
    }
    if (isStandalone(marker)) {
      at += 2
      continue
    }
    const length = view.getUint16(at + 2)
    if (length < 2 || at + 2 + length > bytes.length) return
    yield { marker, start: at + 4, end: at + 2 + length }
    if (marker === JPEG_START_OF_SCAN) return
    at += 2 + length
  }
}

/** TEM, RST0 to RST7 and SOI have no length after them. */
function isStandalone(marker: number): boolean {
  return marker === 0x01 || (marker >= 0xD0 && marker <= 0xD8)
}
