import { createHash } from 'node:crypto'
import { readFile } from 'node:fs/promises'
import type { IncomingMessage } from 'node:http'
import { PHOTO_WIDTHS } from '#shared/domain/photo.schema'
import type { PhotoWidth } from '#shared/domain/photo.schema'
import { checkPicture } from '#server/photos/check-picture'
import { photoChecksumMismatch } from '#server/photos/photo-errors'
import { findPhotoFile, readPhotoFiles, removePhotoFiles, writePhotoFiles } from '#server/photos/photo-files'
import type { PhotoFile, PhotoFileInfo } from '#server/photos/photo-files'
import { processPhoto } from '#server/photos/process-photo'
import type { PhotoMaker } from '#server/photos/process-photo'
import { withReceivedUpload } from '#server/photos/receive-upload'
import type { ReceivedUpload } from '#server/photos/receive-upload'

/** The blurred picture shown until the real one is there; a file like the others, so that a repeated upload costs no decoding. */
export const PLACEHOLDER_SIDE_PX = 24
/** Every file of a photo, by longest side, largest first. */
export const PHOTO_FILE_SIDES: readonly number[] = [...PHOTO_WIDTHS, PLACEHOLDER_SIDE_PX]

type StoredFile = { sha256: string, bytes: number }
/** What the disk holds now: checksum and length of each width, and the placeholder as base64. */
export type StoredPhoto = { widths: Record<PhotoWidth, StoredFile>, placeholder: string }

type StoreRequest = ReceivedUpload & { uploadsDir: string, expectedSha256: string }

/**
 * Receives the form of a request and stores its photo. Whether the sender may,
 * and which checksum the record names, is settled before a byte is read.
 */
export function receivePhoto(request: IncomingMessage, uploadsDir: string, expectedSha256: string): Promise<StoredPhoto> {
  return withReceivedUpload(request, uploadsDir, upload => storePhoto({ ...upload, uploadsDir, expectedSha256 }))
}

const underWay = new Map<string, Promise<StoredPhoto>>()

/**
 * Puts an upload on disk in every width. The same bytes again, even at the same
 * time, are fine and cheap. When it returns, the files survive a power cut.
 */
export async function storePhoto(request: StoreRequest, make: PhotoMaker = processPhoto): Promise<StoredPhoto> {
  const { sha256, expectedSha256 } = request
  if (sha256 !== expectedSha256) throw photoChecksumMismatch()
  const running = underWay.get(sha256) ?? store(request, make)
  underWay.set(sha256, running)
  try {
    return await running
  } finally {
    underWay.delete(sha256)
  }
}

/** Null when the server does not hold that photo. */
export function findStoredPhoto(uploadsDir: string, sha256: string, width: PhotoWidth): Promise<PhotoFileInfo | null> {
  return findPhotoFile(uploadsDir, sha256, width)
}

/** Removes every file of a photo. Two records may share them: only when no record names the checksum any more. */
export async function removeStoredPhoto(uploadsDir: string, sha256: string): Promise<void> {
  await removePhotoFiles(uploadsDir, sha256, PHOTO_FILE_SIDES)
}

async function store({ uploadsDir, filePath, sha256 }: StoreRequest, make: PhotoMaker): Promise<StoredPhoto> {
  const there = await readPhotoFiles(uploadsDir, sha256, PHOTO_FILE_SIDES)
  if (there) return describe(there)
  const bytes = new Uint8Array(await readFile(filePath))
  const files = await make(bytes, checkPicture(bytes), PHOTO_FILE_SIDES)
  await writePhotoFiles(uploadsDir, sha256, files)
  return describe(files)
}

function describe(files: PhotoFile[]): StoredPhoto {
  const bytesOf = (side: number): Uint8Array => {
    const file = files.find(candidate => candidate.side === side)
    if (!file) throw new Error(`the worker made no picture of ${side} px`)
    return file.bytes
  }
  const stored = (width: PhotoWidth): StoredFile => ({
    sha256: createHash('sha256').update(bytesOf(width)).digest('hex'),
    bytes: bytesOf(width).byteLength,
  })
  return {
    widths: { 1280: stored(1280), 640: stored(640), 320: stored(320) },
    placeholder: Buffer.from(bytesOf(PLACEHOLDER_SIDE_PX)).toString('base64'),
  }
}
