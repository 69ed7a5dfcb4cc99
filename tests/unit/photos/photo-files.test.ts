import { mkdir, mkdtemp, readdir, rm, stat, utimes, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { clearUploadTemp, findPhotoFile, photoFilePath, readPhotoFiles, removePhotoFiles, uploadTempDir, writePhotoFiles } from '#server/photos/photo-files'

const SHA = `ab${'0'.repeat(62)}`
const FILES = [{ side: 1_280, bytes: Uint8Array.of(1, 2, 3) }, { side: 320, bytes: Uint8Array.of(4) }]
let uploads: string

beforeEach(async () => {
  uploads = await mkdtemp(join(tmpdir(), 'photo-files-'))
})
afterEach(() => rm(uploads, { recursive: true }))

async function everyFile(): Promise<string[]> {
  const entries = await readdir(uploads, { recursive: true, withFileTypes: true })
  return entries.filter(entry => entry.isFile()).map(entry => entry.name).sort()
}

describe('photo files', () => {
  it('stand under the checksum, readable by this server alone, with nothing beside them', async () => {
    await writePhotoFiles(uploads, SHA, FILES)
    expect(await everyFile()).toEqual([`${SHA}-1280.jpg`, `${SHA}-320.jpg`])
    expect(photoFilePath(uploads, SHA, 320)).toBe(join(uploads, 'ab', `${SHA}-320.jpg`))
    expect((await stat(photoFilePath(uploads, SHA, 320))).mode & 0o077).toBe(0)
  })

  it('can be written again over themselves', async () => {
    await writePhotoFiles(uploads, SHA, FILES)
    await writePhotoFiles(uploads, SHA, [{ side: 320, bytes: Uint8Array.of(7, 8) }])
    expect(await readPhotoFiles(uploads, SHA, [1_280, 320])).toEqual([
      { side: 1_280, bytes: Buffer.from([1, 2, 3]) }, { side: 320, bytes: Buffer.from([7, 8]) },
    ])
  })

  it('count as missing when one is missing', async () => {
    await writePhotoFiles(uploads, SHA, FILES)
    expect(await readPhotoFiles(uploads, SHA, [1_280, 640, 320])).toBeNull()
  })

  it('leave nothing behind when the second of them cannot take its place', async () => {
    await mkdir(join(photoFilePath(uploads, SHA, 320), 'in-the-way'), { recursive: true })
    await expect(writePhotoFiles(uploads, SHA, FILES)).rejects.toThrow()
    expect(await everyFile()).toEqual([])
  })

  it('leave nothing behind when their folder cannot be made', async () => {
    await writeFile(join(uploads, 'ab'), 'a file where the folder should be')
    await expect(writePhotoFiles(uploads, SHA, FILES)).rejects.toThrow()
    expect(await everyFile()).toEqual(['ab'])
  })

  it('are removed together, whether all are there or not', async () => {
    await writePhotoFiles(uploads, SHA, FILES)
    await removePhotoFiles(uploads, SHA, [1_280, 640, 320])
    expect(await everyFile()).toEqual([])
  })

  it.each(['../../etc/passwd', SHA.toUpperCase(), SHA.slice(1), `${SHA}/..`, ''])('are never looked for under "%s"', async (name) => {
    expect(() => photoFilePath(uploads, name, 320)).toThrow(RangeError)
    await expect(findPhotoFile(uploads, name, 320)).rejects.toThrow(RangeError)
  })
})

describe('a photo file to be sent', () => {
  it('is described before it is read', async () => {
    await writePhotoFiles(uploads, SHA, FILES)
    const found = await findPhotoFile(uploads, SHA, 1_280)
    expect(found?.byteLength).toBe(3)
    expect(Buffer.concat(await found!.open().toArray())).toEqual(Buffer.from([1, 2, 3]))
  })

  it('keeps its tag while it stays the same and gets another when it changes', async () => {
    await writePhotoFiles(uploads, SHA, FILES)
    const tag = async (side: number) => (await findPhotoFile(uploads, SHA, side))?.etag
    const before = await tag(1_280)
    expect(before).toMatch(/^"[\w-]+"$/)
    expect(await tag(1_280)).toBe(before)
    expect(await tag(320)).not.toBe(before)
    await utimes(photoFilePath(uploads, SHA, 1_280), 1_000, 1_000)
    expect(await tag(1_280)).not.toBe(before)
  })

  it('is null when it is not there', async () => {
    expect(await findPhotoFile(uploads, SHA, 640)).toBeNull()
  })
})

describe('what a killed server left of its uploads', () => {
  it('is cleared at the next start, and photos stay', async () => {
    await writePhotoFiles(uploads, SHA, FILES)
    await mkdir(join(uploadTempDir(uploads), 'half'), { recursive: true })
    await writeFile(join(uploadTempDir(uploads), 'half', 'an upload'), 'half of a photo')
    await clearUploadTemp(uploads)
    expect(await everyFile()).toEqual([`${SHA}-1280.jpg`, `${SHA}-320.jpg`])
    expect(await readdir(uploadTempDir(uploads))).toEqual([])
  })
})
