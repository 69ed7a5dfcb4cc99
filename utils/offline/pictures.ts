import { keys, prefixes } from './keys'
import type { Phone } from './phone'
import { StorageFull } from './ports'
import type { Snapshot } from './ports'
import { readBases } from './stored-shapes'

/** Width of a picture that fills the screen, px. */
const LARGE_WIDTH = 1_280
/** Width of the copies that are kept to be seen without signal, px. */
const KEPT_WIDTH = 640
/** Most copies kept. */
const KEPT_MAX = 400
const TIMEOUT_MILLISECONDS = 20_000

/** Finds the bytes of a photo, on this phone first. Null when they are nowhere to be had. */
export async function findPicture(phone: Phone, photoId: string, sha256: string, stored: boolean): Promise<Blob | null> {
  const snapshot = await phone.storage.read({ keys: [keys.bytes(sha256), keys.picture(photoId)] })
  const own = snapshot.get(keys.bytes(sha256)) ?? snapshot.get(keys.picture(photoId))
  if (own instanceof ArrayBuffer) return new Blob([own], { type: 'image/jpeg' })
  if (!stored) return null
  const bytes = await fetchPicture(photoId, KEPT_WIDTH)
  if (!bytes) return null
  await keepPicture(phone, photoId, bytes)
  return new Blob([bytes], { type: 'image/jpeg' })
}

/** A larger picture than the kept copy, for a full screen. Null without signal, and where the phone has its own. */
export async function findLargePicture(phone: Phone, photoId: string, sha256: string): Promise<Blob | null> {
  if (await hasOwnBytes(phone, sha256)) return null
  const bytes = await fetchPicture(photoId, LARGE_WIDTH)
  return bytes && new Blob([bytes], { type: 'image/jpeg' })
}

async function fetchPicture(photoId: string, width: number): Promise<ArrayBuffer | null> {
  try {
    const response = await fetch(`/api/photos/${photoId}/${width}`, { signal: AbortSignal.timeout(TIMEOUT_MILLISECONDS) })
    return response.ok ? await response.arrayBuffer() : null
  } catch {
    return null
  }
}

/**
 * Fetches the pictures that this phone does not hold yet, newest first, so that
 * they can be seen without signal. Stops at the first that cannot be had.
 */
export async function fetchMissingPictures(phone: Pick<Phone, 'storage'>): Promise<void> {
  const snapshot = await phone.storage.read({ keys: [keys.keptPictures], prefixes: [prefixes.baseOf('photo')] })
  const kept = new Set(keptOf(snapshot))
  const wanted = readBases(snapshot, prefixes.baseOf('photo'))
    .filter(({ state, data }) => state === 'live' && data?.stored === true)
    .sort((left, right) => right.id.localeCompare(left.id))
    .slice(0, KEPT_MAX)
  for (const { id, data } of wanted) {
    if (kept.has(id) || await hasOwnBytes(phone, String(data?.sha256))) continue
    const bytes = await fetchPicture(id, KEPT_WIDTH)
    if (!bytes || !await keepPicture(phone, id, bytes)) return
  }
}

/**
 * Makes room on a full phone: copies can be had again, what a person writes
 * cannot. Tells whether there was anything to let go.
 */
export async function forgetKeptPictures({ storage }: Pick<Phone, 'storage'>): Promise<boolean> {
  return storage.transact({ keys: [keys.keptPictures] }, (snapshot) => {
    const kept = keptOf(snapshot)
    return { result: kept.length > 0, remove: [keys.keptPictures, ...kept.map(keys.picture)] }
  })
}

async function hasOwnBytes({ storage }: Pick<Phone, 'storage'>, sha256: string): Promise<boolean> {
  return (await storage.read({ keys: [keys.bytes(sha256)] })).get(keys.bytes(sha256)) !== undefined
}

function keptOf(snapshot: Snapshot): string[] {
  const kept = snapshot.get(keys.keptPictures)
  return Array.isArray(kept) ? kept.map(String) : []
}

/**
 * Keeps a copy, and lets the longest kept go when there are too many. A full
 * phone does without: a copy can be had again, what a person wrote cannot.
 */
async function keepPicture({ storage }: Pick<Phone, 'storage'>, photoId: string, bytes: ArrayBuffer): Promise<boolean> {
  try {
    await storage.transact({ keys: [keys.keptPictures] }, (snapshot) => {
      const kept = [...keptOf(snapshot).filter(id => id !== photoId), photoId]
      const leaving = kept.slice(0, Math.max(0, kept.length - KEPT_MAX))
      return {
        result: null,
        put: [[keys.picture(photoId), bytes], [keys.keptPictures, kept.slice(leaving.length)]],
        remove: leaving.map(keys.picture),
      }
    })
    return true
  } catch (error) {
    if (error instanceof StorageFull) return false
    throw error
  }
}
