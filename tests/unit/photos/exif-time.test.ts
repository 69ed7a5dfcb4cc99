import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { readTakenAt } from '~/utils/photos/exif-time'
import { exifSegment } from '~/tests/support/photos/build-exif'
import type { ExifContent } from '~/tests/support/photos/build-exif'
import { headerOnlyJpeg, segment } from '~/tests/support/photos/build-jpeg'
import { ascii, joinBytes } from '~/tests/support/photos/bytes'

const zone = process.env.TZ
beforeEach(() => {
  process.env.TZ = 'Pacific/Auckland'
})
afterEach(() => {
  if (zone === undefined) delete process.env.TZ
  else process.env.TZ = zone
})

function takenAt(content: ExifContent): string | null {
  return readTakenAt(headerOnlyJpeg(40, 30, [segment(0xE0, ascii('JFIF\0\x01\x01\0\0\x01\0\x01\0\0')), exifSegment(content)]))
}

describe('when a photo was taken', () => {
  it.each([true, false])('is read with its offset, little-endian: %s', (littleEndian) => {
    expect(takenAt({ maker: 'A maker of cameras', orientation: 6, dateTimeOriginal: '2026:06:09 07:40:00', offsetTimeOriginal: '+02:00', littleEndian }))
      .toBe('2026-06-09T05:40:00.000Z')
  })

  it('is read behind a place, which is not looked at', () => {
    expect(takenAt({ place: [[38, 43, 12.5], [9, 8, 1]], dateTimeOriginal: '2026:06:09 07:40:00', offsetTimeOriginal: '-03:30' }))
      .toBe('2026-06-09T11:10:00.000Z')
  })

  it('counts as this phone’s own time without an offset', () => {
    // Auckland: UTC+12 in June, UTC+13 in January.
    expect(takenAt({ dateTimeOriginal: '2026:06:09 07:40:00' })).toBe('2026-06-08T19:40:00.000Z')
    expect(takenAt({ dateTimeOriginal: '2026:01:09 07:40:00' })).toBe('2026-01-08T18:40:00.000Z')
  })

  it('counts as this phone’s own time when the offset makes no sense', () => {
    for (const offsetTimeOriginal of ['   :  ', '+25:00', 'Z', '+2']) {
      expect(takenAt({ dateTimeOriginal: '2026:06:09 07:40:00', offsetTimeOriginal })).toBe('2026-06-08T19:40:00.000Z')
    }
  })

  it.each([
    '0000:00:00 00:00:00', '    :  :     :  :  ', '2026:02:30 10:00:00', '2026:13:01 10:00:00', '2026:06:09 24:30:00', '2026-06-09 07:40:00', '',
  ])('is unknown for "%s"', (dateTimeOriginal) => {
    expect(takenAt({ dateTimeOriginal, offsetTimeOriginal: '+00:00' })).toBeNull()
  })

  it('is unknown without EXIF, without that tag and in a file that is no JPEG', () => {
    expect(readTakenAt(headerOnlyJpeg(40, 30))).toBeNull()
    expect(takenAt({ orientation: 3, place: [[1, 2, 3], [4, 5, 6]] })).toBeNull()
    expect(readTakenAt(ascii('no picture at all'))).toBeNull()
  })
})

describe('EXIF from a hostile hand', () => {
  const whole = joinBytes([0xFF, 0xD8], exifSegment({ dateTimeOriginal: '2026:06:09 07:40:00', offsetTimeOriginal: '+02:00' }), [0xFF, 0xD9])

  it('is read or left, never an error, wherever it is cut off', () => {
    for (let length = 0; length < whole.length; length++) {
      expect([null, '2026-06-09T05:40:00.000Z']).toContain(readTakenAt(whole.slice(0, length)))
    }
  })

  it('is read or left, never an error, whichever byte is turned over', () => {
    for (let at = 0; at < whole.length; at++) {
      for (const value of [0x00, 0x7F, 0xFF]) {
        const broken = whole.slice()
        broken[at] = value
        const result = readTakenAt(broken)
        expect(result === null || !Number.isNaN(Date.parse(result)), `byte ${at} as ${value}`).toBe(true)
      }
    }
  })
})
