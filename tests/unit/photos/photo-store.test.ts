import { createHash } from 'node:crypto'
import { mkdtemp, readFile, readdir, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { PHOTO_WIDTHS } from '#shared/domain/photo.schema'
import { makeRenditions } from '#server/photos/make-renditions'
import { photoFilePath } from '#server/photos/photo-files'
import type { PhotoMaker } from '#server/photos/process-photo'
import { findStoredPhoto, PHOTO_FILE_SIDES, removeStoredPhoto, storePhoto } from '#server/services/photo-store'
import { gradient, jpegOf } from '~/tests/support/photos/encode-picture'
import { pngHeader, pngOf } from '~/tests/support/photos/build-png'

const patience = { timeout: 60_000 }
let picture: Uint8Array
let uploadsDir: string
let filePath: string
let made = 0

/** The worker's own work without its thread. */
const make: PhotoMaker = async (bytes, _size, sides) => {
  made += 1
  const result = await makeRenditions({ bytes, sides, pixelsMax: 1e6 })
  if (!result.ok) throw new Error(result.reason)
  return result.renditions
}

function sha256(bytes: Uint8Array): string {
  return createHash('sha256').update(bytes).digest('hex')
}

function store(bytes = picture, expectedSha256 = sha256(bytes)) {
  return storePhoto({ uploadsDir, filePath, sha256: sha256(bytes), byteLength: bytes.length, expectedSha256 }, make)
}

beforeAll(async () => {
  picture = await jpegOf(gradient(700, 500))
})
beforeEach(async () => {
  uploadsDir = await mkdtemp(join(tmpdir(), 'photo-store-'))
  filePath = join(uploadsDir, 'as-received')
  await writeFile(filePath, picture)
  made = 0
})
afterEach(() => rm(uploadsDir, { recursive: true }))

async function storedNames(): Promise<string[]> {
  return (await readdir(uploadsDir, { recursive: true })).filter(name => name.endsWith('.jpg'))
}

describe('storing a photo', patience, () => {
  it('reports of each width what the disk holds', async () => {
    const { widths } = await store()
    for (const width of PHOTO_WIDTHS) {
      const onDisk = await readFile(photoFilePath(uploadsDir, sha256(picture), width))
      expect(widths[width]).toEqual({ sha256: sha256(onDisk), bytes: onDisk.length })
      expect(await findStoredPhoto(uploadsDir, sha256(picture), width)).toMatchObject({ byteLength: onDisk.length })
    }
  })

  it('gives a JPEG as placeholder', async () => {
    const { placeholder } = await store()
    expect([...Buffer.from(placeholder, 'base64').subarray(0, 3)]).toEqual([0xFF, 0xD8, 0xFF])
    expect(placeholder.length).toBeLessThan(1_400)
  })

  it('does the work once for the same bytes, later or at the same time, and answers the same', async () => {
    const [first, atTheSameTime] = await Promise.all([store(), store()])
    const later = await store()
    expect(made).toBe(1)
    expect(atTheSameTime).toEqual(first)
    expect(later).toEqual(first)
  })

  it('does the work again when a file is missing', async () => {
    const first = await store()
    await rm(photoFilePath(uploadsDir, sha256(picture), 320))
    expect(await store()).toEqual(first)
    expect(made).toBe(2)
    expect(await storedNames()).toHaveLength(PHOTO_FILE_SIDES.length)
  })

  it('keeps nothing of bytes that changed on their way', async () => {
    await expect(store(picture, 'e'.repeat(64))).rejects.toMatchObject({ status: 422, code: 'photo_checksum_mismatch' })
    expect(await storedNames()).toEqual([])
  })

  it('decodes nothing that has too many points', async () => {
    const bomb = pngOf(pngHeader(30_000, 30_000))
    await writeFile(filePath, bomb)
    await expect(store(bomb)).rejects.toMatchObject({ status: 413, code: 'photo_too_many_pixels' })
    expect(made).toBe(0)
  })

  it('can be tried again after a failure', async () => {
    await writeFile(filePath, picture.subarray(0, 2_000))
    await expect(store()).rejects.toMatchObject({ code: 'photo_cut_off' })
    await writeFile(filePath, picture)
    await expect(store()).resolves.toHaveProperty('placeholder')
  })

  it('is undone by removing it', async () => {
    await store()
    await removeStoredPhoto(uploadsDir, sha256(picture))
    expect(await storedNames()).toEqual([])
    expect(await findStoredPhoto(uploadsDir, sha256(picture), 640)).toBeNull()
  })
})
