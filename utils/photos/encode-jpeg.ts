import type { DecodedPicture } from './decode-picture'
import { PhotoProblem } from './photo-problem'

const JPEG = 'image/jpeg'

export type CanvasSize = { widthPx: number, heightPx: number }

/** A drawing made once and encoded as often as needed. It holds pixels alone: no EXIF, no place. */
export type Drawing = { encode: (quality: number) => Promise<Blob>, close: () => void }

export function drawPicture(picture: DecodedPicture, { widthPx, heightPx }: CanvasSize): Drawing {
  return typeof OffscreenCanvas === 'undefined'
    ? drawOnElement(picture, widthPx, heightPx)
    : drawOffscreen(picture, widthPx, heightPx)
}

function drawOffscreen(picture: DecodedPicture, width: number, height: number): Drawing {
  const canvas = new OffscreenCanvas(width, height)
  draw(canvas.getContext('2d'), picture, width, height)
  return {
    encode: async quality => checkType(await canvas.convertToBlob({ type: JPEG, quality })),
    close: () => release(canvas),
  }
}

function drawOnElement(picture: DecodedPicture, width: number, height: number): Drawing {
  const canvas = Object.assign(document.createElement('canvas'), { width, height })
  draw(canvas.getContext('2d'), picture, width, height)
  return {
    encode: async quality => checkType(await new Promise<Blob | null>(resolve => canvas.toBlob(resolve, JPEG, quality))),
    close: () => release(canvas),
  }
}

function draw(
  context: CanvasRenderingContext2D | OffscreenCanvasRenderingContext2D | null,
  { source }: DecodedPicture,
  width: number,
  height: number,
): void {
  // A browser that has no memory for the canvas hands out no context.
  if (!context) throw new PhotoProblem('out-of-memory')
  context.fillStyle = '#fff' // transparent points would turn black in a JPEG
  context.fillRect(0, 0, width, height)
  context.imageSmoothingQuality = 'high'
  context.drawImage(source, 0, 0, width, height)
}

/** A browser answers with a PNG when it cannot make the type it was asked for. */
function checkType(blob: Blob | null): Blob {
  if (!blob || blob.size === 0) throw new PhotoProblem('out-of-memory')
  if (blob.type !== JPEG) throw new PhotoProblem('not-encoded')
  return blob
}

/** Some phones keep a canvas's memory until it is made tiny. */
function release(canvas: HTMLCanvasElement | OffscreenCanvas): void {
  canvas.width = 1
  canvas.height = 1
}
