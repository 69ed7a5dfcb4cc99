import { navigateTo } from '#imports'
import { useEntriesStore } from '~/stores/entries'
import { useSyncStore } from '~/stores/sync'
import { useSavedWord } from './useSavedWord'

/** From a form back to the timeline, where the entry just saved is in sight. */
export function useSavedEntry() {
  const word = useSavedWord()
  const sync = useSyncStore()
  const entries = useEntriesStore()
  const later = () => (sync.reason === 'no-signal' ? ' It will be sent when there is signal.' : '')

  async function showSaved(plantId: string, entryId: string): Promise<void> {
    word.value = `Saved on this phone.${later()}`
    // The form is left behind for good: Back must not bring it up again.
    await navigateTo({ path: `/plants/${plantId}`, hash: `#entry-${entryId}` }, { replace: true })
  }

  /** Deletes an entry. What went wrong, or null; the page that asked is gone by the time it is done. */
  async function removeEntry(plantId: string, entryId: string): Promise<string | null> {
    const outcome = await entries.remove(entryId)
    if (!outcome.ok) return outcome.message
    word.value = `Deleted on this phone.${later()}`
    await navigateTo(`/plants/${plantId}`, { replace: true })
    return null
  }

  return { showSaved, removeEntry }
}
