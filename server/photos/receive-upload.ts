import { randomUUID } from 'node:crypto'
import type { IncomingMessage } from 'node:http'
import { mkdir, rm } from 'node:fs/promises'
import { join } from 'node:path'
import formidable, { errors as formErrors } from 'formidable'
import { PHOTO_BYTES_MAX } from '#shared/domain/photo.schema'
import { photoEmpty, photoFormUnreadable, photoTooLarge } from './photo-errors'
import { uploadTempDir } from './photo-files'

/** A photo as it arrived: on the uploads' filesystem, with the checksum taken while it streamed in. */
export type ReceivedUpload = { filePath: string, sha256: string, byteLength: number }

/** Boundaries and part headers around the photo itself. */
const FORM_OVERHEAD_BYTES = 16 * 1024
/** A sender who is refused may finish this much, so that the answer reaches it. */
const DRAIN_BYTES_MAX = 4 * PHOTO_BYTES_MAX

const TOO_LARGE_CODES = [formErrors.biggerThanMaxFileSize, formErrors.biggerThanTotalMaxFileSize]

/**
 * Receives a form with exactly one file, `photo`, hands it to `use` and removes
 * it afterwards, whatever happened.
 */
export async function withReceivedUpload<T>(
  request: IncomingMessage,
  uploadsDir: string,
  use: (upload: ReceivedUpload) => Promise<T>,
): Promise<T> {
  const folder = join(uploadTempDir(uploadsDir), randomUUID())
  try {
    checkHeaders(request)
    await mkdir(folder, { recursive: true })
    return await use(await receive(request, folder))
  } finally {
    drain(request)
    // A folder of its own: the form parser can leave files behind when it fails.
    await rm(folder, { recursive: true, force: true, maxRetries: 3 })
  }
}

function checkHeaders({ headers }: IncomingMessage): void {
  if (!headers['content-type']?.startsWith('multipart/form-data')) throw photoFormUnreadable()
  if (Number(headers['content-length'] ?? 0) > PHOTO_BYTES_MAX + FORM_OVERHEAD_BYTES) throw photoTooLarge()
}

async function receive(request: IncomingMessage, folder: string): Promise<ReceivedUpload> {
  const form = formidable({
    uploadDir: folder,
    hashAlgorithm: 'sha256',
    maxFiles: 1,
    maxFileSize: PHOTO_BYTES_MAX,
    maxFields: 0,
    maxFieldsSize: 1_024,
  })
  const [, files] = await form.parse(request).catch(rethrowTyped)
  const [photo, ...others] = files.photo ?? []
  if (!photo?.hash || others.length > 0) throw photoFormUnreadable()
  return { filePath: photo.filepath, sha256: String(photo.hash), byteLength: photo.size }
}

function rethrowTyped(error: unknown): never {
  const code = error instanceof Error && 'code' in error ? error.code : undefined
  if (TOO_LARGE_CODES.some(tooLarge => tooLarge === code)) throw photoTooLarge()
  if (code === formErrors.noEmptyFiles) throw photoEmpty()
  // The parser's own codes are numbers; a full disk or a missing folder is a fault of ours.
  if (typeof code === 'string') throw error
  throw photoFormUnreadable()
}

/** A refused request would stay paused, and the sender would wait for it instead of reading the answer. */
function drain(request: IncomingMessage): void {
  if (request.complete || request.destroyed) return
  let drained = 0
  request.removeAllListeners('data')
  request.on('data', (chunk: Buffer) => {
    drained += chunk.length
    if (drained > DRAIN_BYTES_MAX) request.destroy()
  })
  request.resume()
}
