import { Jimp } from 'jimp'
import type { Raster } from './orientation'

/** Pixels as a JPEG, for tests in Node. */
export async function jpegOf({ widthPx, heightPx, rgba }: Raster): Promise<Uint8Array<ArrayBuffer>> {
  const picture = Jimp.fromBitmap({ width: widthPx, height: heightPx, data: rgba })
  return new Uint8Array(await picture.getBuffer('image/jpeg', { quality: 95 }))
}

/** A picture with something in it, so that its files have ordinary sizes. */
export function gradient(widthPx: number, heightPx: number): Raster {
  const rgba = new Uint8ClampedArray(widthPx * heightPx * 4)
  for (let at = 0; at < widthPx * heightPx; at++) {
    const [x, y] = [at % widthPx, Math.floor(at / widthPx)]
    rgba.set([x * 255 / widthPx, y * 255 / heightPx, 128 + 100 * Math.sin(x / 9) * Math.cos(y / 7), 255], at * 4)
  }
  return { widthPx, heightPx, rgba }
}

/** The points of a file, decoded. */
export async function pointsOf(bytes: Uint8Array): Promise<{ widthPx: number, heightPx: number, at: (x: number, y: number) => number[] }> {
  const { bitmap } = await Jimp.fromBuffer(Buffer.from(bytes))
  return {
    widthPx: bitmap.width,
    heightPx: bitmap.height,
    at: (x, y) => [...bitmap.data.subarray((y * bitmap.width + x) * 4, (y * bitmap.width + x) * 4 + 3)],
  }
}
