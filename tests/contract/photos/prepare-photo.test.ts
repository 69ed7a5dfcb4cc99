import { describe, expect, it, vi } from 'vitest'
import { PHOTO_BYTES_MAX, PHOTO_SIDE_MAX_PX, photoFieldsSchema } from '#shared/domain/photo.schema'
import { readJpegSize } from '#shared/utils/image-size'
import { jpegSegments } from '#shared/utils/jpeg-segments'
import { sniffImageType } from '#shared/utils/sniff-image-type'
import { exifSegment } from '~/tests/support/photos/build-exif'
import { headerOnlyJpeg, LEAK, progressiveJpeg, withLeaks, withSegments } from '~/tests/support/photos/build-jpeg'
import { ascii, containsText, joinBytes, uint32 } from '~/tests/support/photos/bytes'
import { ORIENTATIONS, quarterOf, SCENE, storedScene } from '~/tests/support/photos/orientation'
import type { Raster } from '~/tests/support/photos/orientation'
import { PhotoProblem } from '~/utils/photos/photo-problem'
import { preparePhoto } from '~/utils/photos/prepare-photo'

async function encoded({ widthPx, heightPx, rgba }: Raster, type = 'image/jpeg'): Promise<Uint8Array<ArrayBuffer>> {
  const canvas = new OffscreenCanvas(widthPx, heightPx)
  canvas.getContext('2d')!.putImageData(new ImageData(rgba, widthPx, heightPx), 0, 0)
  return new Uint8Array(await (await canvas.convertToBlob({ type, quality: 0.95 })).arrayBuffer())
}

function noise(widthPx: number, heightPx: number): Raster {
  const rgba = new Uint8ClampedArray(widthPx * heightPx * 4)
  for (let at = 0; at < rgba.length; at += 65_536) crypto.getRandomValues(rgba.subarray(at, at + 65_536))
  return { widthPx, heightPx, rgba: rgba.map((value, index) => index % 4 === 3 ? 255 : value) }
}

function solid(widthPx: number, heightPx: number, colour: number[]): Raster {
  return { widthPx, heightPx, rgba: Uint8ClampedArray.from({ length: widthPx * heightPx * 4 }, (_, index) => colour[index % 4]!) }
}

async function pointsOf(bytes: ArrayBuffer): Promise<(x: number, y: number) => number[]> {
  const bitmap = await createImageBitmap(new Blob([bytes], { type: 'image/jpeg' }))
  const context = new OffscreenCanvas(bitmap.width, bitmap.height).getContext('2d')!
  context.drawImage(bitmap, 0, 0)
  return (x, y) => [...context.getImageData(x, y, 1, 1).data.subarray(0, 3)]
}

async function problemOf(file: Blob): Promise<string> {
  const problem: unknown = await preparePhoto(file).then(() => 'no problem', (error: unknown) => error)
  if (!(problem instanceof PhotoProblem)) throw new Error(`expected a PhotoProblem, got ${String(problem)}`)
  expect(problem.message).toContain('What you wrote is safe.')
  return problem.code
}

describe('preparing a photo', { timeout: 60_000 }, () => {
  it('makes a JPEG of at most 2,048 px, of which checksum and size are true', async () => {
    const { bytes, sha256, widthPx, heightPx } = await preparePhoto(new Blob([await encoded(solid(3_000, 1_500, [30, 120, 60, 255]))]))
    expect(sniffImageType(new Uint8Array(bytes))).toBe('jpeg')
    expect({ widthPx, heightPx }).toEqual({ widthPx: PHOTO_SIDE_MAX_PX, heightPx: 1_024 })
    expect(readJpegSize(new Uint8Array(bytes))).toEqual({ widthPx, heightPx })
    const digest = new Uint8Array(await crypto.subtle.digest('SHA-256', bytes))
    expect(sha256).toBe([...digest].map(byte => byte.toString(16).padStart(2, '0')).join(''))
  })

  it('gives what a photo record accepts', async () => {
    const { bytes, ...fields } = await preparePhoto(new Blob([await encoded(noise(60, 4_000))]))
    const id = '0b3c2a51-7f0e-4c1d-9a55-3d2f6c8e1b47'
    const record = { ...fields, byteLength: bytes.byteLength, plantId: id, entryId: id, subject: 'roots' }
    expect(photoFieldsSchema.safeParse(record)).toMatchObject({ success: true })
  })

  it('never enlarges', async () => {
    expect(await preparePhoto(new Blob([await encoded(noise(40, 30))]))).toMatchObject({ widthPx: 40, heightPx: 30 })
  })

  it('stays within the bytes that the server takes, even for pure noise', async () => {
    const { bytes } = await preparePhoto(new Blob([await encoded(noise(2_600, 2_600))]))
    expect(bytes.byteLength).toBeLessThanOrEqual(PHOTO_BYTES_MAX)
  })

  it('opens progressive JPEG, PNG and WebP', async () => {
    const files = [progressiveJpeg(), await encoded(noise(20, 10), 'image/png'), await encoded(noise(20, 10), 'image/webp')]
    expect(files.map(sniffImageType)).toEqual(['jpeg', 'png', 'webp'])
    for (const file of files) {
      expect(sniffImageType(new Uint8Array((await preparePhoto(new Blob([file]))).bytes))).toBe('jpeg')
    }
  })

  it('shows transparent points white', async () => {
    const { bytes } = await preparePhoto(new Blob([await encoded(solid(20, 10, [0, 0, 0, 0]), 'image/png')]))
    expect((await pointsOf(bytes))(10, 5)).toEqual([255, 255, 255])
  })

  it.each(ORIENTATIONS)('turns it upright for orientation $value', async (orientation) => {
    const stored = withSegments(await encoded(storedScene(orientation)), exifSegment({ orientation: orientation.value }))
    const { bytes, widthPx, heightPx } = await preparePhoto(new Blob([stored]))
    expect({ widthPx, heightPx }).toEqual(SCENE)
    const at = await pointsOf(bytes)
    expect([at(20, 15), at(76, 15), at(20, 49), at(76, 49)].map(quarterOf)).toEqual(['topLeft', 'topRight', 'bottomLeft', 'bottomRight'])
  })

  it('keeps the time and drops the place and everything else that is not the picture', async () => {
    const exif = exifSegment({ place: [[38, 43, 12.5], [9, 8, 1]], maker: LEAK, dateTimeOriginal: '2026:06:09 07:40:00', offsetTimeOriginal: '+02:00' })
    const telling = withSegments(withLeaks(await encoded(noise(300, 200))), exif)
    expect(containsText(telling, LEAK)).toBe(true)
    const { bytes, takenAt } = await preparePhoto(new Blob([telling]))
    expect(takenAt).toBe('2026-06-09T05:40:00.000Z')
    expect(containsText(new Uint8Array(bytes), LEAK)).toBe(false)
    // A canvas may write JFIF and the profile of its own colour space, whatever was drawn on it.
    const extras = [...jpegSegments(new Uint8Array(bytes))].filter(({ marker }) => (marker >= 0xE0 && marker <= 0xEF) || marker === 0xFE)
    const names = extras.map(({ start }) => new TextDecoder().decode(bytes.slice(start, start + 4)))
    expect(names.filter(name => name !== 'JFIF' && name !== 'ICC_')).toEqual([])
  })

  it('does not invent a time', async () => {
    expect(await preparePhoto(new Blob([await encoded(noise(20, 10))]))).toMatchObject({ takenAt: null })
  })

  it('takes several at once, one after the other, and goes on after one that fails', async () => {
    const good = new Blob([await encoded(noise(20, 10))])
    const outcomes = await Promise.allSettled([good, new Blob(['no picture']), good].map(preparePhoto))
    expect(outcomes.map(({ status }) => status)).toEqual(['fulfilled', 'rejected', 'fulfilled'])
  })

  it('works in a browser without OffscreenCanvas', async () => {
    const file = new Blob([await encoded(solid(50, 30, [30, 180, 30, 255]))])
    vi.stubGlobal('OffscreenCanvas', undefined)
    try {
      expect(await preparePhoto(file)).toMatchObject({ widthPx: 50, heightPx: 30 })
    } finally {
      vi.unstubAllGlobals()
    }
  })
})

describe('what cannot become a photo', { timeout: 60_000 }, () => {
  it('is told apart in words', async () => {
    const whole = await encoded(noise(300, 200))
    expect(await problemOf(new Blob(['a letter, not a picture']))).toBe('not-a-picture')
    expect(await problemOf(new Blob([]))).toBe('not-a-picture')
    expect(await problemOf(new Blob([joinBytes(ascii('RIFF'), uint32(99), ascii('WEBP and then nothing'))]))).toBe('damaged')
    expect(await problemOf(new Blob([whole.slice(0, 100)]))).toBe('damaged')
  })

  it('includes HEIC where the browser cannot open it, with a way out', async () => {
    const heic = new Blob([joinBytes(uint32(24), ascii('ftypheic'), uint32(0), ascii('mif1heic'), new Uint8Array(500))])
    expect(await problemOf(heic)).toBe('heic')
    await expect(preparePhoto(heic)).rejects.toThrow(/JPEG.*Most compatible/)
  })

  it('includes pictures too large for a phone, by their header alone', async () => {
    const decoder = vi.spyOn(globalThis, 'createImageBitmap')
    expect(await problemOf(new Blob([headerOnlyJpeg(30_000, 30_000)]))).toBe('too-large')
    expect(await problemOf(new Blob([headerOnlyJpeg(40, 30), new Uint8Array(81 * 1024 * 1024)]))).toBe('too-large')
    expect(decoder).not.toHaveBeenCalled()
    decoder.mockRestore()
  })

  it('includes files that the phone does not hand out', async () => {
    const kept = new Blob([await encoded(noise(20, 10))])
    kept.slice = () => {
      throw new DOMException('The file could not be read', 'NotReadableError')
    }
    expect(await problemOf(kept)).toBe('unreadable')
  })

  it('includes every photo while the phone has no memory for a canvas', async () => {
    const file = new Blob([await encoded(noise(20, 10))])
    const canvas = vi.spyOn(OffscreenCanvas.prototype, 'getContext').mockReturnValue(null)
    expect(await problemOf(file)).toBe('out-of-memory')
    canvas.mockRestore()
    await expect(preparePhoto(file)).resolves.toHaveProperty('sha256')
  })
})
