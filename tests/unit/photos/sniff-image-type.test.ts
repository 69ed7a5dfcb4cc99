import { describe, expect, it } from 'vitest'
import { sniffImageType } from '#shared/utils/sniff-image-type'
import { headerOnlyJpeg } from '~/tests/support/photos/build-jpeg'
import { pngHeader, pngOf } from '~/tests/support/photos/build-png'
import { ascii, joinBytes, uint32 } from '~/tests/support/photos/bytes'

function isoMedia(major: string, ...compatible: string[]): Uint8Array {
  const brands = joinBytes(ascii(major), uint32(0), ...compatible.map(ascii))
  return joinBytes(uint32(8 + brands.length), ascii('ftyp'), brands, ascii('meta…'))
}

describe('the type of a picture by its first bytes', () => {
  it.each([
    ['jpeg', headerOnlyJpeg(10, 10)],
    ['png', pngOf(pngHeader(1, 1))],
    ['gif', ascii('GIF89a……')],
    ['gif', ascii('GIF87a……')],
    ['webp', joinBytes(ascii('RIFF'), uint32(100), ascii('WEBPVP8 '))],
    ['heic', isoMedia('heic', 'mif1', 'heic')],
    ['heic', isoMedia('mif1', 'mif1', 'heic')],
    ['avif', isoMedia('avif', 'mif1', 'avif')],
    ['avif', isoMedia('mif1', 'avif')],
  ])('knows a %s', (type, bytes) => {
    expect(sniffImageType(bytes)).toBe(type)
  })

  it.each([
    ['nothing', new Uint8Array()],
    ['three bytes', Uint8Array.of(0xFF, 0xD8, 0x00)],
    ['text', ascii('<svg xmlns="http://www.w3.org/2000/svg">')],
    ['a video', isoMedia('isom', 'mp42')],
    ['a sound in the same wrapper as WebP', joinBytes(ascii('RIFF'), uint32(100), ascii('WAVEfmt '))],
    ['a wrapper cut off in its first box', ascii('\0\0\0\x18ftyp')],
  ])('takes %s for no picture', (_what, bytes) => {
    expect(sniffImageType(bytes)).toBe('other')
  })

  it('looks at the bytes of a view, not at the buffer behind it', () => {
    const wide = joinBytes(ascii('GIF89a'), isoMedia('heic'))
    expect(sniffImageType(wide.subarray(6))).toBe('heic')
  })
})
