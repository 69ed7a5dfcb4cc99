import { PHOTO_HEADER_SIDE_MAX_PX, PHOTO_PIXELS_MAX } from '#shared/domain/photo.schema'
import { readJpegSize, readPngSize } from '#shared/utils/image-size'
import type { ImageSize } from '#shared/utils/image-size'
import { JPEG_START_OF_SCAN, jpegSegments } from '#shared/utils/jpeg-segments'
import { pngChunks } from '#shared/utils/png-chunks'
import { sniffImageType } from '#shared/utils/sniff-image-type'
import { photoCutOff, photoEmpty, photoHeic, photoNotAPicture, photoTooManyPixels, photoTypeUnsupported, photoUndecodable } from './photo-errors'

/**
 * Refuses what must not reach the decoder. Decoding asks for memory by the
 * header's word: 854 kB of grey PNG can ask for 5 GB (measured), so everything
 * here is read from the bytes alone.
 */
export function checkPicture(bytes: Uint8Array): ImageSize {
  if (bytes.length === 0) throw photoEmpty()
  const type = sniffImageType(bytes)
  switch (type) {
    case 'jpeg': return checkJpeg(bytes)
    case 'png': return checkPng(bytes)
    case 'heic': throw photoHeic()
    case 'other': throw photoNotAPicture()
    default: throw photoTypeUnsupported(type.toUpperCase())
  }
}

function checkJpeg(bytes: Uint8Array): ImageSize {
  const size = checkSize(readJpegSize(bytes))
  const scan = [...jpegSegments(bytes)].find(({ marker }) => marker === JPEG_START_OF_SCAN)
  if (!scan || !hasEndOfImage(bytes, scan.end)) throw photoCutOff()
  return size
}

/** Coded data never holds FF D9 itself, so its absence means that the end is missing. Cameras may append more after it. */
function hasEndOfImage(bytes: Uint8Array, from: number): boolean {
  return Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength).lastIndexOf(Buffer.from([0xFF, 0xD9])) >= from
}

function checkPng(bytes: Uint8Array): ImageSize {
  const size = checkSize(readPngSize(bytes))
  const headers: number[] = []
  let ended = false
  for (const { name, start } of pngChunks(bytes)) {
    if (name === 'IHDR') headers.push(start)
    ended = name === 'IEND'
  }
  if (!ended) throw photoCutOff()
  // The decoder believes the last of several headers, not the first.
  if (headers.length !== 1) throw photoUndecodable()
  // It also inflates an interlaced picture without any limit.
  if (headers.some(start => bytes[start + 12] !== 0)) throw photoTypeUnsupported('an interlaced PNG')
  return size
}

function checkSize(size: ImageSize | null): ImageSize {
  if (!size) throw photoCutOff()
  const { widthPx, heightPx } = size
  const tooLong = Math.max(widthPx, heightPx) > PHOTO_HEADER_SIDE_MAX_PX
  if (tooLong || widthPx * heightPx > PHOTO_PIXELS_MAX) throw photoTooManyPixels(widthPx, heightPx)
  return size
}
