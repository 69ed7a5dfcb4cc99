import { defineStore } from 'pinia'
import { computed } from 'vue'
import { emptyEntryFields, liesInFuture } from '#shared/domain/entry.schema'
import type { Entry, EntryFields } from '#shared/domain/entry.schema'
import type { PhotoSubject } from '#shared/domain/photo.schema'
import type { ChangeRequest } from '#shared/sync/outbox'
import { useSave } from '~/composables/useSave'
import type { PreparedPhoto, SaveOutcome, View } from '~/types/view'
import { isoOf } from '~/utils/offline/journal'
import { useJournalStore } from './journal'

/** A photo chosen for an entry, with what it shows. */
export type ChosenPhoto = { subject: PhotoSubject, prepared: PreparedPhoto }

/** Visits. */
export const useEntriesStore = defineStore('entries', () => {
  const journal = useJournalStore()
  const { save, newId } = useSave()

  const newestFirst = (left: View<Entry>, right: View<Entry>) => (
    right.data.occurredAt.localeCompare(left.data.occurredAt) || right.id.localeCompare(left.id)
  )
  const byPlant = computed(() => {
    const groups = new Map<string, View<Entry>[]>()
    for (const entry of journal.shelves.entry.values()) {
      const group = groups.get(entry.data.plantId)
      if (group) group.push(entry)
      else groups.set(entry.data.plantId, [entry])
    }
    for (const group of groups.values()) group.sort(newestFirst)
    return groups
  })

  const ofPlant = (plantId: string): View<Entry>[] => byPlant.value.get(plantId) ?? []
  const latest = (plantId: string): View<Entry> | null => ofPlant(plantId)[0] ?? null
  const byId = (id: string): View<Entry> | null => journal.shelves.entry.get(id) ?? null

  /** Saves one visit with its photos, in one step on the phone. */
  async function create(fields: EntryFields, photos: ChosenPhoto[]): Promise<SaveOutcome> {
    if (liesInFuture(fields.occurredAt, journal.phone?.around.now() ?? 0)) {
      return { ok: false, message: 'This visit lies in the future. Set when it happened; nothing was lost.', issues: [{ path: 'occurredAt', message: 'lies in the future' }] }
    }
    const entryId = newId()
    const withIds = photos.map(photo => ({ ...photo, photoId: newId() }))
    return save([
      { kind: 'create', entityType: 'entry', entityId: entryId, fields: { ...fields } },
      ...withIds.map((photo): ChangeRequest => photoRequest(photo.photoId, entryId, fields.plantId, photo)),
    ], {
      photos: withIds.map(bytesOf),
      endDraftOf: fields.plantId,
    })
  }

  /** Saves "Looked, no change" for now. A draft that is open for the plant stays. */
  function look(plantId: string): Promise<SaveOutcome> {
    const now = isoOf(journal.phone?.around.now() ?? 0)
    const fields: EntryFields = { ...emptyEntryFields, plantId, occurredAt: now, recordedAt: now, lookedNoChange: true }
    return save([{ kind: 'create', entityType: 'entry', entityId: newId(), fields }])
  }

  /** Changes a visit, and adds photos to it. */
  async function change(id: string, fields: Partial<EntryFields>, added: ChosenPhoto[] = []): Promise<SaveOutcome> {
    const entry = byId(id)
    if (!entry) return { ok: false, message: 'This visit is not there any more. Nothing was changed.', issues: [] }
    const withIds = added.map(photo => ({ ...photo, photoId: newId() }))
    const requests: ChangeRequest[] = withIds.map(photo => photoRequest(photo.photoId, id, entry.data.plantId, photo))
    if (Object.keys(fields).length > 0) requests.unshift({ kind: 'patch', entityType: 'entry', entityId: id, fields: { ...fields } })
    if (requests.length === 0) return { ok: true, id }
    const outcome = await save(requests, { photos: withIds.map(bytesOf) })
    return outcome.ok ? { ok: true, id } : outcome
  }
  const remove = (id: string): Promise<SaveOutcome> => save([{ kind: 'delete', entityType: 'entry', entityId: id, fields: {} }])

  return { ofPlant, latest, byId, create, look, change, remove }
})

function bytesOf({ photoId, prepared }: ChosenPhoto & { photoId: string }): { photoId: string, sha256: string, bytes: ArrayBuffer } {
  return { photoId, sha256: prepared.sha256, bytes: prepared.bytes }
}

function photoRequest(photoId: string, entryId: string, plantId: string, { subject, prepared }: ChosenPhoto): ChangeRequest {
  const { sha256, widthPx, heightPx, takenAt, bytes } = prepared
  return {
    kind: 'create',
    entityType: 'photo',
    entityId: photoId,
    fields: { plantId, entryId, subject, sha256, byteLength: bytes.byteLength, widthPx, heightPx, takenAt },
  }
}
