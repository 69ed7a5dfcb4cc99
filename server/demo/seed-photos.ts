import { createHash } from 'node:crypto'
import { mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { useStorage } from '#imports'
import { checkPicture } from '#server/photos/check-picture'
import { storePhoto } from '#server/services/photo-store'
import { noteStored } from '#server/services/photos'
import { syncDependencies } from '#server/services/sync/dependencies'
import type { Op } from '#shared/sync/protocol'
import { op } from './plan'
import type { PlannedPhoto } from './plan'

type Album = { accountId: string, photos: PlannedPhoto[] }

/** How many photos go by between two words about it. */
const SAY_EVERY = 10

export async function isPhotoStored(photoId: string): Promise<boolean> {
  const photo = await syncDependencies().repository.find('photo', photoId)
  return photo !== null && photo.data.storedAt !== null
}

/** Stores the drawn photos the way an upload is stored. */
export async function plantPhotos(
  albums: Album[], uploadsDir: string, say: (done: number, all: number) => void, push: (accountId: string, ops: Op[]) => Promise<void>,
): Promise<void> {
  const all = albums.flatMap(({ accountId, photos }) => photos.map(photo => ({ accountId, photo })))
  const folder = await mkdtemp(join(tmpdir(), 'stillroot-demo-'))
  try {
    for (const [index, { accountId, photo }] of all.entries()) {
      if (index % SAY_EVERY === 0) say(index, all.length)
      await plantPhoto(accountId, photo, folder, uploadsDir, push)
    }
  } finally {
    await rm(folder, { recursive: true, force: true })
  }
}

async function plantPhoto(
  accountId: string, photo: PlannedPhoto, folder: string, uploadsDir: string, push: (accountId: string, ops: Op[]) => Promise<void>,
): Promise<void> {
  const bytes = await readAsset(photo.file)
  const sha256 = createHash('sha256').update(bytes).digest('hex')
  const { widthPx, heightPx } = checkPicture(bytes)
  await push(accountId, [op('photo', photo.id, { ...photo.fields, sha256, byteLength: bytes.byteLength, widthPx, heightPx })])
  const filePath = join(folder, `${photo.id}.jpg`)
  await writeFile(filePath, bytes)
  const stored = await storePhoto({ filePath, sha256, byteLength: bytes.byteLength, uploadsDir, expectedSha256: sha256 })
  await noteStored(syncDependencies(), accountId, photo.id, stored)
  await rm(filePath)
}

/** @throws Error when a photo of the demo is missing from the build */
async function readAsset(file: string): Promise<Uint8Array> {
  const raw = await useStorage('assets:server').getItemRaw<Uint8Array>(`demo:${file}`)
  if (!raw) throw new Error(`the demo photo ${file} is missing from this build`)
  return new Uint8Array(raw)
}
