import { defineStore } from 'pinia'
import { computed } from 'vue'
import { useSave } from '~/composables/useSave'
import type { Conflict } from '#shared/domain/conflict.schema'
import type { SaveOutcome, View } from '~/types/view'
import { useJournalStore } from './journal'

/** Fields with two kept values, until somebody chooses. */
export const useConflictsStore = defineStore('conflicts', () => {
  const journal = useJournalStore()
  const { save } = useSave()

  const open = computed(() => [...journal.shelves.conflict.values()]
    .filter(conflict => conflict.data.resolvedAt === null)
    .sort((left, right) => right.data.at.localeCompare(left.data.at)))
  const openOf = (entityId: string): View<Conflict>[] => open.value
    .filter(conflict => conflict.data.entityId === entityId)

  const choose = (id: string, choice: 'standing' | 'other'): Promise<SaveOutcome> => (
    save([{ kind: 'resolve', entityType: 'conflict', entityId: id, fields: { choice } }])
  )

  return { open, openOf, choose }
})
