import { ref } from 'vue'
import { useJournalStore } from '~/stores/journal'
import { keys, prefixes } from '~/utils/offline/keys'

/** The bytes of a draft's photos: in memory for saving, and on the phone so that a closed page does not lose them. */
export function useDraftPhotoBytes(draftId: string) {
  const journal = useJournalStore()
  const inMemory = new Map<string, ArrayBuffer>()
  /** True when the phone had no room: the photo is then lost with the page. */
  const unkept = ref(false)
  const storeKey = (photoKey: string) => keys.draftPhoto(draftId, photoKey)

  async function keep(photoKey: string, bytes: ArrayBuffer): Promise<void> {
    inMemory.set(photoKey, bytes)
    try {
      await journal.phone?.storage.transact({}, () => ({ result: null, put: [[storeKey(photoKey), bytes]] }))
    } catch {
      unkept.value = true
    }
  }

  async function forget(photoKeys: string[]): Promise<void> {
    for (const key of photoKeys) inMemory.delete(key)
    await journal.phone?.storage.transact({}, () => ({ result: null, remove: photoKeys.map(storeKey) })).catch(() => undefined)
  }

  /** The bytes of the photos a draft names; what no draft names any more is removed. */
  async function restore(photoKeys: string[]): Promise<Map<string, ArrayBuffer>> {
    const prefix = prefixes.draftPhotosOf(draftId)
    const snapshot = await journal.phone?.storage.read({ prefixes: [prefix] })
    for (const [key, value] of snapshot?.under(prefix) ?? []) {
      const photoKey = key.slice(prefix.length)
      if (photoKeys.includes(photoKey) && value instanceof ArrayBuffer) inMemory.set(photoKey, value)
      else await forget([photoKey])
    }
    return inMemory
  }

  return {
    unkept,
    keep,
    forget,
    restore,
    bytesOf: (photoKey: string) => inMemory.get(photoKey),
    forgetAll: () => forget([...inMemory.keys()]),
  }
}
