import { describe, expect, it } from 'vitest'
import { PHOTO_PIXELS_MAX } from '#shared/domain/photo.schema'
import { readJpegSize } from '#shared/utils/image-size'
import { jpegSegments } from '#shared/utils/jpeg-segments'
import { makeRenditions } from '#server/photos/make-renditions'
import type { Rendition } from '#server/photos/make-renditions'
import { PHOTO_FILE_SIDES } from '#server/services/photo-store'
import { exifSegment } from '~/tests/support/photos/build-exif'
import { LEAK, headerOnlyJpeg, progressiveJpeg, withLeaks, withSegments } from '~/tests/support/photos/build-jpeg'
import { pngChunk, solidPng } from '~/tests/support/photos/build-png'
import { ascii, containsText } from '~/tests/support/photos/bytes'
import { gradient, jpegOf, pointsOf } from '~/tests/support/photos/encode-picture'
import { ORIENTATIONS, SCENE, quarterOf, storedScene } from '~/tests/support/photos/orientation'

// A decoder in plain JavaScript is slow on a machine that does other work.
const patience = { timeout: 60_000 }

async function renditionsOf(bytes: Uint8Array, sides = PHOTO_FILE_SIDES): Promise<Rendition[]> {
  const result = await makeRenditions({ bytes, sides, pixelsMax: PHOTO_PIXELS_MAX })
  if (!result.ok) throw new Error(result.reason)
  return result.renditions
}

describe('the files of a photo', patience, () => {
  it('have the longest sides asked for and keep the proportions', async () => {
    const renditions = await renditionsOf(await jpegOf(gradient(1_600, 900)))
    expect(renditions.map(({ side, widthPx, heightPx }) => [side, widthPx, heightPx])).toEqual([
      [1_280, 1_280, 720], [640, 640, 360], [320, 320, 180], [24, 24, 14],
    ])
    for (const { bytes, widthPx, heightPx } of renditions) expect(readJpegSize(bytes)).toEqual({ widthPx, heightPx })
  })

  it('are never larger than the photo', async () => {
    const renditions = await renditionsOf(await jpegOf(gradient(200, 500)))
    expect(renditions.map(({ widthPx, heightPx }) => [widthPx, heightPx])).toEqual([[200, 500], [200, 500], [128, 320], [10, 24]])
  })

  it('keep at least one point of a very thin photo', async () => {
    const [, , , placeholder] = await renditionsOf(await jpegOf(gradient(1_000, 3)))
    expect(placeholder).toMatchObject({ widthPx: 24, heightPx: 1 })
  })

  it('include a placeholder small enough to travel inside a record', async () => {
    const [, , , placeholder] = await renditionsOf(await jpegOf(gradient(640, 480)))
    expect(placeholder?.bytes.length).toBeLessThan(1_024)
  })

  it('are made of progressive pictures and of PNG', async () => {
    const [grey] = await renditionsOf(progressiveJpeg(), [16])
    expect((await pointsOf(grey!.bytes)).at(8, 8)).toEqual([128, 128, 128])
    const [green] = await renditionsOf(solidPng(20, 10, [30, 180, 30, 255]), [16])
    expect(quarterOf((await pointsOf(green!.bytes)).at(8, 4))).toBe('topRight')
  })

  it('show transparent points white', async () => {
    const [white] = await renditionsOf(solidPng(20, 10, [0, 0, 0, 0]), [16])
    expect((await pointsOf(white!.bytes)).at(8, 4)).toEqual([255, 255, 255])
  })
})

describe('the files of a photo held in any way', patience, () => {
  it.each(ORIENTATIONS)('are upright for orientation $value', async (orientation) => {
    const stored = withSegments(await jpegOf(storedScene(orientation)), exifSegment({ orientation: orientation.value }))
    const [upright] = await renditionsOf(stored, [SCENE.widthPx])
    const { widthPx, heightPx, at } = await pointsOf(upright!.bytes)
    expect({ widthPx, heightPx }).toEqual(SCENE)
    const [left, right, top, bottom] = [20, widthPx - 20, 15, heightPx - 15]
    expect([at(left, top), at(right, top), at(left, bottom), at(right, bottom)].map(quarterOf))
      .toEqual(['topLeft', 'topRight', 'bottomLeft', 'bottomRight'])
  })
})

describe('what a photo tells beside the picture', patience, () => {
  /** JFIF and the tables and headers without which a JPEG cannot be decoded. */
  const necessary = new Set([0xE0, 0xDB, 0xC0, 0xC4, 0xDA])

  function expectNothingTold(renditions: Rendition[]): void {
    expect(renditions).toHaveLength(PHOTO_FILE_SIDES.length)
    for (const { bytes } of renditions) {
      expect(containsText(bytes, LEAK)).toBe(false)
      expect([...jpegSegments(bytes)].map(({ marker }) => marker).filter(marker => !necessary.has(marker))).toEqual([])
    }
  }

  it('is gone from every file of a JPEG: place, maker, comment, XMP, IPTC and bytes behind the end', async () => {
    const exif = exifSegment({ place: [[38, 43, 12.5], [9, 8, 1]], maker: LEAK, dateTimeOriginal: '2026:06:09 07:40:00' })
    const telling = withSegments(withLeaks(await jpegOf(gradient(700, 500))), exif)
    expect(containsText(telling, LEAK)).toBe(true)
    expectNothingTold(await renditionsOf(telling))
  })

  it('is gone from every file of a PNG: text and EXIF chunks', async () => {
    const telling = solidPng(400, 300, [9, 9, 9, 255], pngChunk('tEXt', ascii(`Comment\0${LEAK}`)), pngChunk('eXIf', ascii(`MM\0*${LEAK}`)))
    expectNothingTold(await renditionsOf(telling))
  })
})

describe('what cannot be decoded', patience, () => {
  it('is an outcome, not an error', async () => {
    const whole = await jpegOf(gradient(700, 500))
    const halfWithAnEnd = Uint8Array.from([...whole.subarray(0, whole.length / 2), 0xFF, 0xD9])
    for (const bytes of [halfWithAnEnd, headerOnlyJpeg(40, 30), ascii('GIF89a'), new Uint8Array()]) {
      expect(await makeRenditions({ bytes, sides: [320], pixelsMax: PHOTO_PIXELS_MAX })).toEqual({ ok: false, reason: expect.any(String) })
    }
  })

  it('includes a frame with more points than allowed, should it ever get this far', async () => {
    expect(await makeRenditions({ bytes: await jpegOf(gradient(300, 300)), sides: [320], pixelsMax: 80_000 }))
      .toEqual({ ok: false, reason: expect.stringContaining('maxResolutionInMP') })
  })
})
