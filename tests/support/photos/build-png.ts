import { crc32, deflateSync } from 'node:zlib'
import { ascii, joinBytes, uint32 } from './bytes'

const SIGNATURE = [0x89, 0x50, 0x4E, 0x47, 0x0D, 0x0A, 0x1A, 0x0A]

export function pngChunk(name: string, content: Uint8Array | number[]): Uint8Array {
  const named = joinBytes(ascii(name), content)
  return joinBytes(uint32(content.length), named, uint32(crc32(named)))
}

export function pngHeader(widthPx: number, heightPx: number, interlaced = false): Uint8Array {
  const rgbaOf8Bits = [8, 6, 0, 0, interlaced ? 1 : 0]
  return pngChunk('IHDR', [...uint32(widthPx), ...uint32(heightPx), ...rgbaOf8Bits])
}

export function pngOf(...chunks: Uint8Array[]): Uint8Array<ArrayBuffer> {
  return joinBytes(SIGNATURE, ...chunks, pngChunk('IEND', []))
}

/** A whole picture of one colour. */
export function solidPng(widthPx: number, heightPx: number, rgba: number[], ...extra: Uint8Array[]): Uint8Array<ArrayBuffer> {
  const row = [0, ...Array.from({ length: widthPx }, () => rgba).flat()]
  const rows = joinBytes(...Array.from({ length: heightPx }, () => row))
  return pngOf(pngHeader(widthPx, heightPx), ...extra, pngChunk('IDAT', deflateSync(rows)))
}
