import { defineStore } from 'pinia'
import { computed } from 'vue'
import { useSave } from '~/composables/useSave'
import { isoOf } from '~/utils/offline/journal'
import { useJournalStore } from './journal'

/** What happened to one's records while one was away: comments, values kept twice, refused deletions. */
export const useNoticesStore = defineStore('notices', () => {
  const journal = useJournalStore()
  const { save } = useSave()

  const unseen = computed(() => [...journal.shelves.notice.values()]
    .filter(notice => notice.data.seenAt === null)
    .sort((left, right) => right.data.at.localeCompare(left.data.at)))

  /** Marks notices as read, on all of the person's phones. */
  async function markSeen(ids: string[]): Promise<void> {
    if (ids.length === 0) return
    const seenAt = isoOf(journal.phone?.around.now() ?? 0)
    await save(ids.map(id => ({ kind: 'patch', entityType: 'notice', entityId: id, fields: { seenAt } })))
  }

  return { unseen, markSeen }
})
