import { defineStore } from 'pinia'
import { computed } from 'vue'
import type { Comment } from '#shared/domain/comment.schema'
import { useSave } from '~/composables/useSave'
import type { SaveOutcome, View } from '~/types/view'
import { isoOf } from '~/utils/offline/journal'
import { useJournalStore } from './journal'

/** Comments, which work without signal as everything else does. */
export const useCommentsStore = defineStore('comments', () => {
  const journal = useJournalStore()
  const { save, newId } = useSave()

  const byEntry = computed(() => {
    const groups = new Map<string, View<Comment>[]>()
    for (const comment of journal.shelves.comment.values()) {
      const group = groups.get(comment.data.entryId)
      if (group) group.push(comment)
      else groups.set(comment.data.entryId, [comment])
    }
    for (const group of groups.values()) group.sort((left, right) => left.data.writtenAt.localeCompare(right.data.writtenAt))
    return groups
  })

  const ofEntry = (entryId: string): View<Comment>[] => byEntry.value.get(entryId) ?? []

  const byId = (id: string): View<Comment> | null => journal.shelves.comment.get(id) ?? null

  const add = (plantId: string, entryId: string, text: string): Promise<SaveOutcome> => save([{
    kind: 'create',
    entityType: 'comment',
    entityId: newId(),
    fields: { plantId, entryId, text, writtenAt: isoOf(journal.phone?.around.now() ?? 0) },
  }])
  const remove = (id: string): Promise<SaveOutcome> => save([{ kind: 'delete', entityType: 'comment', entityId: id, fields: {} }])

  return { ofEntry, byId, add, remove }
})
