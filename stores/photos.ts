import { defineStore } from 'pinia'
import { computed } from 'vue'
import type { Photo, PhotoSubject } from '#shared/domain/photo.schema'
import { useSave } from '~/composables/useSave'
import type { SaveOutcome, View } from '~/types/view'
import { useJournalStore } from './journal'

/** Photos of visits. Their pictures are found by `usePicture`. */
export const usePhotosStore = defineStore('photos', () => {
  const journal = useJournalStore()
  const { save } = useSave()

  const byEntry = computed(() => {
    const groups = new Map<string, View<Photo>[]>()
    for (const photo of journal.shelves.photo.values()) {
      const group = groups.get(photo.data.entryId)
      if (group) group.push(photo)
      else groups.set(photo.data.entryId, [photo])
    }
    for (const group of groups.values()) group.sort((left, right) => left.id.localeCompare(right.id))
    return groups
  })
  const ofEntry = (entryId: string): View<Photo>[] => byEntry.value.get(entryId) ?? []
  const byId = (id: string): View<Photo> | null => journal.shelves.photo.get(id) ?? null
  /** True while the picture itself waits on this phone. */
  const isUploading = (photoId: string): boolean => journal.waiting.uploads.some(item => item.photoId === photoId)

  const changeSubject = (id: string, subject: PhotoSubject): Promise<SaveOutcome> => (
    save([{ kind: 'patch', entityType: 'photo', entityId: id, fields: { subject } }])
  )
  const remove = (id: string): Promise<SaveOutcome> => save([{ kind: 'delete', entityType: 'photo', entityId: id, fields: {} }])

  return { ofEntry, byId, isUploading, changeSubject, remove }
})
