import { randomUUID } from 'node:crypto'
import { createReadStream } from 'node:fs'
import type { ReadStream } from 'node:fs'
import { mkdir, open, readFile, rename, rm, stat } from 'node:fs/promises'
import { dirname, join } from 'node:path'
import { sha256Schema } from '#shared/domain/primitives'

/**
 * Photos on disk, by the checksum of what the phone sent and by longest side:
 * `<uploadsDir>/<first two digits>/<sha256>-<side>.jpg`. A name that exists
 * holds a whole picture, even after a power cut: bytes are written and flushed
 * under another name on the same filesystem, renamed, and the folder flushed.
 */
export type PhotoFile = { side: number, bytes: Uint8Array }

export function photoFilePath(uploadsDir: string, sha256: string, side: number): string {
  if (!sha256Schema.safeParse(sha256).success) throw new RangeError('a photo file is named by a SHA-256 checksum')
  return join(uploadsDir, sha256.slice(0, 2), `${sha256}-${side}.jpg`)
}

export function uploadTempDir(uploadsDir: string): string {
  return join(uploadsDir, 'tmp')
}

/** Writes all files or, after a failure, leaves none of those it brought. */
export async function writePhotoFiles(uploadsDir: string, sha256: string, files: PhotoFile[]): Promise<void> {
  const moves = files.map(({ side, bytes }) => ({
    bytes,
    from: join(uploadTempDir(uploadsDir), randomUUID()),
    to: photoFilePath(uploadsDir, sha256, side),
  }))
  const brought: string[] = []
  try {
    await mkdir(uploadTempDir(uploadsDir), { recursive: true })
    await makeFolder(uploadsDir, dirname(photoFilePath(uploadsDir, sha256, 0)))
    for (const { from, bytes } of moves) await writeFlushed(from, bytes)
    for (const { from, to } of moves) {
      await rename(from, to)
      brought.push(to)
    }
    for (const folder of new Set(moves.map(({ to }) => dirname(to)))) await flushFolder(folder)
  } catch (error) {
    await removeFiles([...brought, ...moves.map(({ from }) => from)])
    throw error
  }
}

/** The bytes of every side asked for, or null when one is missing. */
export async function readPhotoFiles(uploadsDir: string, sha256: string, sides: readonly number[]): Promise<PhotoFile[] | null> {
  try {
    return await Promise.all(sides.map(async side => ({ side, bytes: await readFile(photoFilePath(uploadsDir, sha256, side)) })))
  } catch (error) {
    if (isMissing(error)) return null
    throw error
  }
}

/** A picture to be sent: what its headers need before a byte is read. Null when it is not there. */
export type PhotoFileInfo = { byteLength: number, etag: string, open: () => ReadStream }

export async function findPhotoFile(uploadsDir: string, sha256: string, side: number): Promise<PhotoFileInfo | null> {
  const path = photoFilePath(uploadsDir, sha256, side)
  try {
    const { size, mtimeMs } = await stat(path)
    const etag = `"${sha256.slice(0, 32)}-${side}-${size.toString(36)}-${Math.floor(mtimeMs).toString(36)}"`
    return { byteLength: size, etag, open: () => createReadStream(path) }
  } catch (error) {
    if (isMissing(error)) return null
    throw error
  }
}

export async function removePhotoFiles(uploadsDir: string, sha256: string, sides: readonly number[]): Promise<void> {
  await removeFiles(sides.map(side => photoFilePath(uploadsDir, sha256, side)))
}

/** What a server that was killed in the middle of an upload left behind. To be called at boot, before requests. */
export async function clearUploadTemp(uploadsDir: string): Promise<void> {
  await rm(uploadTempDir(uploadsDir), { recursive: true, force: true })
  await mkdir(uploadTempDir(uploadsDir), { recursive: true })
}

async function makeFolder(uploadsDir: string, folder: string): Promise<void> {
  const firstMade = await mkdir(folder, { recursive: true })
  if (firstMade) await flushFolder(uploadsDir)
}

async function writeFlushed(path: string, bytes: Uint8Array): Promise<void> {
  const file = await open(path, 'wx', 0o600)
  try {
    await file.writeFile(bytes)
    await file.sync()
  } finally {
    await file.close()
  }
}

/** Without this a power cut may undo the rename although the bytes are on disk. */
async function flushFolder(path: string): Promise<void> {
  const folder = await open(path, 'r')
  try {
    await folder.sync()
  } finally {
    await folder.close()
  }
}

async function removeFiles(paths: string[]): Promise<void> {
  await Promise.all(paths.map(path => rm(path, { force: true })))
}

function isMissing(error: unknown): boolean {
  return error instanceof Error && 'code' in error && error.code === 'ENOENT'
}
