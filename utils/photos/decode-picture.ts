import { PhotoProblem } from './photo-problem'

/** Pixels ready to be drawn, already upright. `close` gives their memory back. */
export type DecodedPicture = { source: CanvasImageSource, widthPx: number, heightPx: number, close: () => void }

/** Turns the picture upright as its EXIF says. Some browsers open only as an image element what they refuse as a bitmap. */
export async function decodePicture(file: Blob): Promise<DecodedPicture> {
  try {
    const bitmap = await createImageBitmap(file, { imageOrientation: 'from-image' })
    return { source: bitmap, widthPx: bitmap.width, heightPx: bitmap.height, close: () => bitmap.close() }
  } catch (error) {
    if (error instanceof RangeError) throw new PhotoProblem('out-of-memory', error)
    return decodeAsElement(file)
  }
}

async function decodeAsElement(file: Blob): Promise<DecodedPicture> {
  const url = URL.createObjectURL(file)
  const image = new Image()
  image.src = url
  try {
    await image.decode()
  } catch (error) {
    URL.revokeObjectURL(url)
    throw new PhotoProblem('damaged', error)
  }
  return { source: image, widthPx: image.naturalWidth, heightPx: image.naturalHeight, close: () => URL.revokeObjectURL(url) }
}
