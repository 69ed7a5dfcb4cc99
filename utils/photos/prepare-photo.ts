import { PHOTO_BYTES_MAX, PHOTO_SIDE_MAX_PX } from '#shared/domain/photo.schema'
import { readJpegSize, readPngSize } from '#shared/utils/image-size'
import { sniffImageType } from '#shared/utils/sniff-image-type'
import type { ImageType } from '#shared/utils/sniff-image-type'
import type { PreparedPhoto } from '~/types/view'
import { decodePicture } from './decode-picture'
import type { DecodedPicture } from './decode-picture'
import { drawPicture } from './encode-jpeg'
import type { CanvasSize } from './encode-jpeg'
import { readTakenAt } from './exif-time'
import { PhotoProblem } from './photo-problem'
import { sha256Hex } from './sha256'

/** EXIF and the frame header stand at the beginning; the rest is read by the decoder alone. */
const HEAD_BYTES = 1024 * 1024
const SOURCE_BYTES_MAX = 80 * 1024 * 1024
/** 108-megapixel phone cameras exist; decoded, that is 432 MB. */
const SOURCE_PIXELS_MAX = 110_000_000
/** The first that fits is taken; lower ones are for pictures of pure noise. */
const QUALITIES = [0.82, 0.7, 0.55]

let last: Promise<unknown> = Promise.resolve()

/**
 * Makes of any picture the browser can open an upright JPEG of at most
 * 2,048 px without EXIF and place, with the checksum of exactly its bytes.
 * One at a time: a phone has memory for one decoded picture. Throws PhotoProblem.
 */
export function preparePhoto(file: Blob): Promise<PreparedPhoto> {
  const turn = last.then(() => prepare(file))
  last = turn.catch(() => undefined)
  return turn
}

async function prepare(file: Blob): Promise<PreparedPhoto> {
  const head = await readHead(file)
  const type = sniffImageType(head)
  refuseEarly(file, head, type)
  const picture = await decodePicture(file).catch((problem: unknown) => {
    throw type === 'heic' ? new PhotoProblem('heic', problem) : problem
  })
  try {
    const size = fit(picture)
    const bytes = await encode(picture, size)
    return { bytes, sha256: await sha256Hex(bytes), ...size, takenAt: type === 'jpeg' ? readTakenAt(head) : null }
  } finally {
    picture.close()
  }
}

async function readHead(file: Blob): Promise<Uint8Array> {
  try {
    return new Uint8Array(await file.slice(0, HEAD_BYTES).arrayBuffer())
  } catch (error) {
    throw new PhotoProblem('unreadable', error)
  }
}

function refuseEarly(file: Blob, head: Uint8Array, type: ImageType): void {
  if (type === 'other') throw new PhotoProblem('not-a-picture')
  const size = type === 'jpeg' ? readJpegSize(head) : type === 'png' ? readPngSize(head) : null
  const pixels = size ? size.widthPx * size.heightPx : 0
  if (file.size > SOURCE_BYTES_MAX || pixels > SOURCE_PIXELS_MAX) throw new PhotoProblem('too-large')
}

/** Never enlarges. */
function fit({ widthPx, heightPx }: DecodedPicture): CanvasSize {
  const factor = Math.min(1, PHOTO_SIDE_MAX_PX / Math.max(widthPx, heightPx))
  return { widthPx: Math.max(1, Math.round(widthPx * factor)), heightPx: Math.max(1, Math.round(heightPx * factor)) }
}

async function encode(picture: DecodedPicture, size: CanvasSize): Promise<ArrayBuffer> {
  const drawing = drawPicture(picture, size)
  try {
    for (const quality of QUALITIES) {
      const blob = await drawing.encode(quality)
      if (blob.size <= PHOTO_BYTES_MAX) return await blob.arrayBuffer()
    }
    throw new PhotoProblem('too-large')
  } finally {
    drawing.close()
  }
}
