import { keys } from './keys'
import type { Phone } from './phone'
import { StorageFull } from './ports'

/** Width of the copies that are kept to be seen without signal, px. */
const KEPT_WIDTH = 640
const TIMEOUT_MILLISECONDS = 20_000

/** Finds the bytes of a photo, on this phone first. Null when they are nowhere to be had. */
export async function findPicture(phone: Phone, photoId: string, sha256: string, stored: boolean): Promise<Blob | null> {
  const snapshot = await phone.storage.read({ keys: [keys.bytes(sha256), keys.picture(photoId)] })
  const own = snapshot.get(keys.bytes(sha256)) ?? snapshot.get(keys.picture(photoId))
  if (own instanceof ArrayBuffer) return new Blob([own], { type: 'image/jpeg' })
  if (!stored) return null
  const bytes = await fetchPicture(photoId)
  if (!bytes) return null
  await keepPicture(phone, photoId, bytes)
  return new Blob([bytes], { type: 'image/jpeg' })
}

async function fetchPicture(photoId: string): Promise<ArrayBuffer | null> {
  try {
    const response = await fetch(`/api/photos/${photoId}/${KEPT_WIDTH}`, { signal: AbortSignal.timeout(TIMEOUT_MILLISECONDS) })
    return response.ok ? await response.arrayBuffer() : null
  } catch {
    return null
  }
}

/** A full phone does without the copy: it can be had again, what a person wrote cannot. */
async function keepPicture(phone: Phone, photoId: string, bytes: ArrayBuffer): Promise<void> {
  try {
    await phone.storage.transact({}, () => ({ result: null, put: [[keys.picture(photoId), bytes]] }))
  } catch (error) {
    if (!(error instanceof StorageFull)) throw error
  }
}
