import { ref, watch } from 'vue'
import type { Ref } from 'vue'
import type * as z from 'zod/mini'
import { useJournalStore } from '~/stores/journal'
import { keys } from '~/utils/offline/keys'

/**
 * Keeps what is typed into a form, on every change, so that a phone that goes
 * dark in the rain loses nothing. The draft ends when its entry is saved.
 *
 * @param plantId the plant the form is for
 * @param form the form's fields
 * @param schema what a kept draft must look like to be taken up again
 */
export function useLogDraft<T extends object>(plantId: string, form: Ref<T>, schema: z.ZodMiniType<T>) {
  const journal = useJournalStore()
  const restored = ref(false)
  let writing: Promise<unknown> = Promise.resolve()
  let ended = false

  async function restore(): Promise<void> {
    const snapshot = await journal.phone?.storage.read({ keys: [keys.draft(plantId)] })
    const kept = schema.safeParse(snapshot?.get(keys.draft(plantId)))
    if (kept.success) {
      form.value = kept.data
      restored.value = true
    }
    watch(form, keep, { deep: true })
  }

  /** One write after the other, each with the newest state. */
  function keep(): void {
    const value: unknown = JSON.parse(JSON.stringify(form.value))
    writing = writing.then(() => (ended ? undefined : journal.phone?.storage.transact({}, () => ({
      result: null, put: [[keys.draft(plantId), value]],
    })))).catch(() => undefined)
  }

  /** Call before the entry is saved: nothing may write the draft back after that. */
  async function end(): Promise<void> {
    ended = true
    await writing
  }

  /** The entry was not saved after all. */
  function resume(): void {
    ended = false
    keep()
  }

  async function discard(): Promise<void> {
    await end()
    await journal.phone?.storage.transact({}, () => ({ result: null, remove: [keys.draft(plantId)] }))
  }

  return { restored, restore, end, resume, discard }
}
