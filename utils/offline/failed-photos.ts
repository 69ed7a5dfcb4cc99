import { keys, prefixes } from './keys'
import type { JournalStorage, StoredPair } from './ports'
import { readUploads } from './stored-shapes'
import type { UploadItem } from './stored-shapes'

/** Puts a photo that was refused back among those that wait. */
export async function sendPhotoAgain(storage: JournalStorage, item: UploadItem): Promise<void> {
  await storage.transact({}, () => ({
    result: null, put: [[keys.upload(item.photoId), { ...item, code: null, message: null }]] satisfies StoredPair[],
  }))
}

/**
 * Lets the bytes of a photo that was refused go. Only a person may ask for that.
 * They stay while another photo of the same picture waits.
 */
export async function dropPhoto(storage: JournalStorage, item: UploadItem): Promise<void> {
  await storage.transact({ prefixes: [prefixes.upload] }, (snapshot) => {
    const shared = readUploads(snapshot).some(other => other.sha256 === item.sha256 && other.photoId !== item.photoId)
    return { result: null, remove: [keys.upload(item.photoId), ...(shared ? [] : [keys.bytes(item.sha256)])] }
  })
}
