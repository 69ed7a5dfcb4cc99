import { describe, expect, it } from 'vitest'
import { readJpegSize, readPngSize } from '#shared/utils/image-size'
import { frameHeader, headerOnlyJpeg, progressiveJpeg, segment } from '~/tests/support/photos/build-jpeg'
import { exifSegment } from '~/tests/support/photos/build-exif'
import { pngChunk, pngHeader, pngOf } from '~/tests/support/photos/build-png'
import { ascii, joinBytes } from '~/tests/support/photos/bytes'

describe('the size of a JPEG by its header', () => {
  it.each([
    ['baseline', 0xC0],
    ['extended', 0xC1],
    ['progressive', 0xC2],
    ['lossless', 0xC3],
  ])('reads a %s frame', (_what, marker) => {
    expect(readJpegSize(headerOnlyJpeg(4_032, 3_024, [], marker))).toEqual({ widthPx: 4_032, heightPx: 3_024 })
  })

  it('reads a real progressive picture', () => {
    expect(readJpegSize(progressiveJpeg())).toEqual({ widthPx: 16, heightPx: 16 })
  })

  it('does not take the preview inside EXIF for the picture', () => {
    const preview = segment(0xE1, joinBytes(ascii('Exif\0\0'), headerOnlyJpeg(160, 120)))
    expect(readJpegSize(headerOnlyJpeg(4_000, 3_000, [exifSegment({ orientation: 6 }), preview]))).toEqual({ widthPx: 4_000, heightPx: 3_000 })
  })

  it('does not take a Huffman table for a frame', () => {
    expect(readJpegSize(headerOnlyJpeg(20, 10, [segment(0xC4, [0, 9, 9, 9, 9, 9, 9])]))).toEqual({ widthPx: 20, heightPx: 10 })
  })

  it('passes fill bytes before a marker', () => {
    expect(readJpegSize(joinBytes([0xFF, 0xD8, 0xFF, 0xFF, 0xFF], frameHeader(0xC0, 7, 5)))).toEqual({ widthPx: 7, heightPx: 5 })
  })

  it.each([
    ['cut off inside the frame header', headerOnlyJpeg(100, 100).subarray(0, 8)],
    ['a height of 0', headerOnlyJpeg(100, 0)],
    ['a segment shorter than its own length field', joinBytes([0xFF, 0xD8, 0xFF, 0xE0, 0, 1], frameHeader(0xC0, 7, 5))],
    ['no frame before the scan', joinBytes([0xFF, 0xD8], segment(0xDA, [1, 1, 0, 0, 63, 0]), frameHeader(0xC0, 7, 5))],
    ['nothing', new Uint8Array()],
  ])('finds none with %s', (_what, bytes) => {
    expect(readJpegSize(bytes)).toBeNull()
  })
})

describe('the size of a PNG by its header', () => {
  it('reads sides of more than 65,535 points', () => {
    expect(readPngSize(pngOf(pngHeader(70_000, 3)))).toEqual({ widthPx: 70_000, heightPx: 3 })
  })

  it('finds none when another chunk comes first or the header is cut off', () => {
    expect(readPngSize(pngOf(pngChunk('tEXt', ascii('a note')), pngHeader(5, 5)))).toBeNull()
    expect(readPngSize(pngOf(pngHeader(5, 5)).subarray(0, 20))).toBeNull()
  })
})
