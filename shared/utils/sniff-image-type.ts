/** What a file is by its first bytes; its name and its declared type are never believed. */
export type ImageType = 'jpeg' | 'png' | 'webp' | 'heic' | 'avif' | 'gif' | 'other'

// ISO/IEC 23008-12 (HEIF) brands, from memory; mif1 and msf1 name the container only.
const HEIC_BRANDS = ['heic', 'heix', 'hevc', 'hevx', 'heim', 'heis', 'mif1', 'msf1']
const AVIF_BRANDS = ['avif', 'avis']

export function sniffImageType(bytes: Uint8Array): ImageType {
  if (startsWith(bytes, [0xFF, 0xD8, 0xFF])) return 'jpeg'
  if (startsWith(bytes, [0x89, 0x50, 0x4E, 0x47, 0x0D, 0x0A, 0x1A, 0x0A])) return 'png'
  if (['GIF87a', 'GIF89a'].includes(asciiAt(bytes, 0, 6))) return 'gif'
  if (asciiAt(bytes, 0, 4) === 'RIFF' && asciiAt(bytes, 8, 4) === 'WEBP') return 'webp'
  return sniffIsoMedia(bytes)
}

function sniffIsoMedia(bytes: Uint8Array): ImageType {
  if (asciiAt(bytes, 4, 4) !== 'ftyp') return 'other'
  const brands = fileBrands(bytes)
  if (brands.some(brand => AVIF_BRANDS.includes(brand))) return 'avif'
  return brands.some(brand => HEIC_BRANDS.includes(brand)) ? 'heic' : 'other'
}

/** Major brand and compatible brands of the leading box; four bytes of version stand between them. */
function fileBrands(bytes: Uint8Array): string[] {
  const boxLength = bytes.length < 4 ? 0 : new DataView(bytes.buffer, bytes.byteOffset).getUint32(0)
  const end = Math.min(boxLength, bytes.length, 128)
  const brands = [asciiAt(bytes, 8, 4)]
  for (let at = 16; at + 4 <= end; at += 4) brands.push(asciiAt(bytes, at, 4))
  return brands
}

function startsWith(bytes: Uint8Array, signature: number[]): boolean {
  return signature.every((byte, index) => bytes[index] === byte)
}

function asciiAt(bytes: Uint8Array, start: number, length: number): string {
  return String.fromCharCode(...bytes.subarray(start, start + length))
}
