import { describe, expect, it } from 'vitest'
import { PHOTO_HEADER_SIDE_MAX_PX } from '#shared/domain/photo.schema'
import { checkPicture } from '#server/photos/check-picture'
import { ApiError } from '#server/utils/errors'
import { headerOnlyJpeg } from '~/tests/support/photos/build-jpeg'
import { pngHeader, pngOf, solidPng } from '~/tests/support/photos/build-png'
import { ascii, joinBytes, uint32 } from '~/tests/support/photos/bytes'

function refusal(bytes: Uint8Array): { status: number, code: string, message: string } | null {
  try {
    checkPicture(bytes)
    return null
  } catch (error) {
    if (error instanceof ApiError) return { status: error.status, code: error.code, message: error.message }
    throw error
  }
}

describe('pictures that would ask for too much memory', () => {
  it.each([
    ['a PNG of 30,000 × 30,000', pngOf(pngHeader(30_000, 30_000))],
    ['a PNG of 4,294,967,295 points a side', pngOf(pngHeader(0xFFFFFFFF, 0xFFFFFFFF))],
    ['a JPEG of 65,535 × 65,535', headerOnlyJpeg(65_535, 65_535)],
    ['a progressive JPEG of one point more than 24 million', headerOnlyJpeg(6_000, 4_001, [], 0xC2)],
    ['a strip with one side too long', headerOnlyJpeg(PHOTO_HEADER_SIDE_MAX_PX + 1, 1)],
  ])('refuses %s before anything is decoded', (_what, bytes) => {
    expect(bytes.length).toBeLessThan(1_000)
    expect(refusal(bytes)).toMatchObject({ status: 413, code: 'photo_too_many_pixels' })
  })

  it('lets the largest allowed pass', () => {
    expect(checkPicture(headerOnlyJpeg(6_000, 4_000))).toEqual({ widthPx: 6_000, heightPx: 4_000 })
    expect(checkPicture(headerOnlyJpeg(PHOTO_HEADER_SIDE_MAX_PX, 3_000))).toEqual({ widthPx: 8_000, heightPx: 3_000 })
  })

  it('refuses a second header, which the decoder would believe instead of the first', () => {
    expect(refusal(pngOf(pngHeader(10, 10), pngHeader(30_000, 30_000)))).toMatchObject({ status: 422, code: 'photo_undecodable' })
  })

  it('refuses an interlaced PNG, which the decoder inflates without a limit', () => {
    expect(refusal(pngOf(pngHeader(10, 10, true)))).toMatchObject({ status: 415, code: 'photo_type_unsupported' })
  })
})

describe('files that are no picture the server opens', () => {
  it.each([
    ['text', ascii('hello, I am a letter'), 415, 'photo_not_a_picture'],
    ['a drawing that could carry a script', ascii('<svg xmlns="http://www.w3.org/2000/svg"/>'), 415, 'photo_not_a_picture'],
    ['GIF', ascii('GIF89a……'), 415, 'photo_type_unsupported'],
    ['WebP', joinBytes(ascii('RIFF'), uint32(9), ascii('WEBP')), 415, 'photo_type_unsupported'],
    ['HEIC', joinBytes(uint32(16), ascii('ftypheic'), uint32(0)), 415, 'photo_heic'],
    ['nothing', new Uint8Array(), 400, 'photo_empty'],
  ])('refuses %s', (_what, bytes, status, code) => {
    expect(refusal(bytes)).toMatchObject({ status, code })
  })

  it('says with HEIC how to get a JPEG', () => {
    expect(refusal(joinBytes(uint32(16), ascii('ftypheic'), uint32(0)))?.message).toMatch(/Most compatible.*JPEG/)
  })

  it('says every time that the text is safe', () => {
    for (const bytes of [ascii('text…'), new Uint8Array(), headerOnlyJpeg(9_000, 9_000), ascii('GIF89a')]) {
      expect(refusal(bytes)?.message).toContain('The text of your entry is safe.')
    }
  })
})

describe('pictures of which a part is missing', () => {
  const jpeg = headerOnlyJpeg(40, 30)
  const png = solidPng(20, 10, [1, 2, 3, 255])

  it('refuses a JPEG without its end', () => {
    expect(refusal(jpeg)).toBeNull()
    expect(refusal(jpeg.subarray(0, -2))).toMatchObject({ status: 422, code: 'photo_cut_off' })
  })

  it('refuses a PNG without its end', () => {
    expect(refusal(png)).toBeNull()
    expect(refusal(png.subarray(0, -1))).toMatchObject({ status: 422, code: 'photo_cut_off' })
  })

  it('accepts what a camera appends behind the end', () => {
    expect(refusal(joinBytes(jpeg, ascii('a second picture')))).toBeNull()
  })

  it('does not take the end of a preview inside EXIF for the end of the picture', () => {
    const preview = joinBytes([0xFF, 0xE1, 0, 6], [0xFF, 0xD8, 0xFF, 0xD9])
    expect(refusal(headerOnlyJpeg(40, 30, [preview]).subarray(0, -2))).toMatchObject({ code: 'photo_cut_off' })
  })
})
