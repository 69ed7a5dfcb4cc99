import { PHOTO_PIXELS_MAX } from '#shared/domain/photo.schema'
import type { ImageSize } from '#shared/utils/image-size'
import type { Rendition } from './make-renditions'
import { createPhotoPool } from './photo-pool'
import type { PhotoPool } from './photo-pool'
import { findPhotoWorker } from './photo-worker-file'

/** Makes the files of one picture, whose size has been checked. `bytes` move to the maker and are empty afterwards. */
export type PhotoMaker = (bytes: Uint8Array<ArrayBuffer>, size: ImageSize, sides: readonly number[]) => Promise<Rendition[]>

let pool: PhotoPool | undefined

/** Makes them in this server's worker thread, which starts with the first picture and ends when it has been idle. */
export const processPhoto: PhotoMaker = (bytes, size, sides) => {
  pool ??= createPhotoPool({ workerFile: findPhotoWorker(import.meta.url) })
  return pool.run({ bytes, sides, pixelsMax: PHOTO_PIXELS_MAX }, size)
}

/** Ends the worker thread; for an orderly shutdown. */
export async function closePhotoWorker(): Promise<void> {
  const closing = pool
  pool = undefined
  await closing?.close()
}
